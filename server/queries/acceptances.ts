import type { Tx } from '#server/db.ts'

export interface AcceptanceRow {
  readonly anchor: string
  readonly words: string
  readonly words_sha256: string
  readonly accepted: boolean
  readonly reason: string
  readonly revision: number
  readonly decided_by: string
  readonly decided_by_name: string
  readonly decided_by_licence: string | null
  readonly decided_at: Date
}

/** Every decision on a report's limitations and departures, in the order in which they were made. */
export async function listAcceptances(tx: Tx, organisation: string, report: string): Promise<AcceptanceRow[]> {
  return await tx('acceptances as a')
    .join('people as p', (on) => on.on('p.organisation_id', 'a.organisation_id').andOn('p.person_id', 'a.decided_by'))
    .where({ 'a.organisation_id': organisation, 'a.report_id': report })
    .orderBy('a.sequence')
    .select<AcceptanceRow[]>(
      'a.anchor',
      'a.words',
      'a.words_sha256',
      'a.accepted',
      'a.reason',
      'a.revision',
      'a.decided_by',
      'p.name as decided_by_name',
      'p.licence as decided_by_licence',
      'a.decided_at',
    )
}

export interface NewAcceptance {
  readonly organisation: string
  readonly report: string
  readonly revision: number
  readonly anchor: string
  readonly words: string
  readonly wordsSha256: string
  readonly accepted: boolean
  readonly reason: string
  readonly person: string
  readonly now: Date
}

export async function insertAcceptance(tx: Tx, acceptance: NewAcceptance): Promise<void> {
  await tx('acceptances').insert({
    organisation_id: acceptance.organisation,
    report_id: acceptance.report,
    revision: acceptance.revision,
    anchor: acceptance.anchor,
    words: acceptance.words,
    words_sha256: acceptance.wordsSha256,
    accepted: acceptance.accepted,
    reason: acceptance.reason,
    decided_by: acceptance.person,
    decided_at: acceptance.now,
  })
}
