/** A table that goes along when an organisation moves. */
export interface PortableTable {
  readonly name: string
  /** Columns that stay: what lets people in is made anew where they arrive. */
  readonly withheld?: readonly string[]
  /** Rows refer to rows of the same table: all are written by one statement, whose end is when references are checked. */
  readonly whole?: true
}

/** In the order in which rows refer to each other. A test holds the list to the catalog: no table is forgotten. */
export const PORTABLE: readonly PortableTable[] = [
  { name: 'organisations' },
  { name: 'people', withheld: ['password_hash', 'totp_secret', 'totp_last_step', 'recovery_hashes'] },
  { name: 'reports', whole: true },
  { name: 'revisions' },
  { name: 'reviews' },
  { name: 'threads' },
  { name: 'remarks' },
  { name: 'acceptances' },
  { name: 'files' },
  { name: 'attachments' },
  { name: 'counters' },
  { name: 'documents', whole: true },
  { name: 'seals' },
  { name: 'register_entries' },
  { name: 'register_nodes' },
  { name: 'register_heads' },
  { name: 'checkpoints' },
  { name: 'audit_events' },
  { name: 'audit_heads' },
  { name: 'mails' },
  { name: 'instruments' },
  { name: 'instrument_versions' },
  { name: 'conditions' },
  { name: 'condition_versions' },
]

/** Tables with an organisation's rows that stay: links and tokens let people in, the rest is under way and passes. */
export const LEFT_BEHIND: readonly string[] = ['links', 'tokens', 'idempotency_keys', 'uploads']
