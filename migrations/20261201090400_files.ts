import type { Knex } from 'knex'

/** Photos and attachments, and uploads that have not arrived whole. The bytes are in the object storage. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table files (
      organisation_id uuid not null references organisations,
      file_id uuid not null default gen_random_uuid(),
      sha256 text not null check (sha256 ~ '^[0-9a-f]{64}$'),
      kind text not null check (kind in ('photo', 'paper photo', 'attachment')),
      type text not null,
      bytes bigint not null check (bytes > 0),
      width integer,
      height integer,
      -- The hash of what the client sent, before it was re-encoded.
      received_sha256 text not null check (received_sha256 ~ '^[0-9a-f]{64}$'),
      created_by uuid not null,
      created_at timestamptz not null default now(),
      primary key (organisation_id, file_id),
      unique (organisation_id, sha256, kind),
      foreign key (organisation_id, created_by) references people
    );
    create index files_by_received on files (organisation_id, received_sha256);
    call fence('files');
    call append_only('files');

    create table attachments (
      organisation_id uuid not null,
      attachment_id uuid not null default gen_random_uuid(),
      report_id uuid not null,
      file_id uuid not null,
      -- The same photo made small enough for paper.
      paper_file_id uuid,
      name text not null check (length(name) between 1 and 120),
      anchor text check (length(anchor) <= 300),
      taken_at timestamptz,
      added_by uuid not null,
      added_at timestamptz not null default now(),
      removed_at timestamptz,
      primary key (organisation_id, attachment_id),
      foreign key (organisation_id, report_id) references reports,
      foreign key (organisation_id, file_id) references files,
      foreign key (organisation_id, paper_file_id) references files,
      foreign key (organisation_id, added_by) references people
    );
    create unique index one_name_a_report on attachments (organisation_id, report_id, name) where removed_at is null;
    call fence('attachments');
    grant select, insert on attachments to skerry_app;
    grant update (removed_at, anchor) on attachments to skerry_app;

    create table uploads (
      organisation_id uuid not null references organisations,
      upload_id uuid not null default gen_random_uuid(),
      person_id uuid not null,
      report_id uuid not null,
      name text not null check (length(name) between 1 and 120),
      anchor text check (length(anchor) <= 300),
      taken_at timestamptz,
      sha256 text not null check (sha256 ~ '^[0-9a-f]{64}$'),
      size bigint not null check (size between 1 and 15728640),
      -- The hash of each part that has come, by its place; null for those that are missing.
      parts jsonb not null,
      -- open: parts are missing; complete: all of it is here; attached: the photo is part of the report; refused: it is none.
      state text not null default 'open' check (state in ('open', 'complete', 'attached', 'refused')),
      refusal text,
      attachment_id uuid,
      expires_at timestamptz not null,
      created_at timestamptz not null default now(),
      primary key (organisation_id, upload_id),
      foreign key (organisation_id, person_id) references people,
      foreign key (organisation_id, report_id) references reports,
      foreign key (organisation_id, attachment_id) references attachments,
      check ((state = 'attached') = (attachment_id is not null)),
      check ((state = 'refused') = (refusal is not null))
    );
    create index uploads_by_report on uploads (organisation_id, report_id, created_at);
    create index uploads_by_expiry on uploads (expires_at) where state = 'open';
    call fence('uploads');
    grant select, insert, update, delete on uploads to skerry_app;
  `)
}

export async function down(): Promise<void> {
  throw new Error('Migrations go forward only.')
}
