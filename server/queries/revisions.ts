import type { Tx } from '#server/db.ts'

/** A revision's bytes, with what they are called and hash to. */
export interface StoredSource {
  readonly source: Buffer
  readonly sha256: string
  readonly file_name: string
  readonly revision: number
  readonly software: string
  readonly rulebook_hash: string
}

export async function findSource(
  tx: Tx,
  organisation: string,
  report: string,
  revision: number,
): Promise<StoredSource | undefined> {
  return await tx('revisions')
    .where({ organisation_id: organisation, report_id: report, revision })
    .first<StoredSource | undefined>('source', 'sha256', 'file_name', 'revision', 'software', 'rulebook_hash')
}

export interface RevisionRow {
  readonly revision: number
  readonly sha256: string
  readonly file_name: string
  readonly bytes: number
  readonly uploaded_by: string
  readonly uploaded_by_name: string
  readonly uploaded_at: Date
  readonly rulebook_id: string
  readonly rulebook_version: string
  readonly rulebook_hash: string
  readonly software: string
  readonly outcome: string
  readonly counts: Readonly<Record<string, number>>
}

/** Every revision of a report, the newest first. */
export async function listRevisions(tx: Tx, organisation: string, report: string): Promise<RevisionRow[]> {
  return await tx('revisions as r')
    .join('people as p', (on) => on.on('p.organisation_id', 'r.organisation_id').andOn('p.person_id', 'r.uploaded_by'))
    .where({ 'r.organisation_id': organisation, 'r.report_id': report })
    .orderBy('r.revision', 'desc')
    .select<RevisionRow[]>(
      'r.revision',
      'r.sha256',
      'r.file_name',
      tx.raw('length(r.source) as bytes'),
      'r.uploaded_by',
      'p.name as uploaded_by_name',
      'r.uploaded_at',
      'r.rulebook_id',
      'r.rulebook_version',
      'r.rulebook_hash',
      'r.software',
      'r.outcome',
      'r.counts',
    )
}
