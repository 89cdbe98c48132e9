import { secondPerson } from '#core/policy/can.ts'
import { type Blocker, blockers } from '#core/review/blockers.ts'
import { type Decision, decisionsOf } from '#core/review/decisions.ts'
import type { Tx } from '#server/db.ts'
import { type AcceptanceRow, listAcceptances } from '#server/queries/acceptances.ts'
import type { Report } from '#server/queries/reports.ts'
import { listStandings } from '#server/queries/threads.ts'
import { claimsOf } from './claims.ts'
import { type JudgedRevision, ownRevision } from './judged-revision.ts'

/** A limitation or departure with what the reviewer has said on exactly these words. */
export interface Decided extends Decision {
  readonly said: AcceptanceRow | null
}

/** How a report stands in review: what is to be decided, what was, and what still keeps it from being issued. */
export interface ReviewStanding {
  readonly revision: JudgedRevision
  readonly decisions: readonly Decided[]
  readonly blockers: readonly Blocker[]
}

/** What the registers of the house contradict. A file without a day of inspection is held against the day it came. */
async function contradicted(
  tx: Tx,
  organisation: string,
  { judged }: JudgedRevision,
  { updated_at }: Report,
): Promise<Blocker[]> {
  const claims = await claimsOf(tx, organisation, judged, updated_at)
  return claims
    .filter(({ severity }) => severity === 'failure')
    .map(({ anchor, message }) => ({ kind: 'register', anchor, message }))
}

/** Weighs the newest revision. A decision by somebody who has come to have a hand in the report since does not count. */
export async function reviewStanding(tx: Tx, organisation: string, report: Report): Promise<ReviewStanding> {
  const revision = await ownRevision(tx, organisation, report.report_id, report.revision)
  const all = await listAcceptances(tx, organisation, report.report_id)
  const counting = all.filter(
    ({ decided_by, decided_by_name, decided_by_licence }) =>
      secondPerson({ person: decided_by, name: decided_by_name, licence: decided_by_licence }, report.facts).allowed,
  )
  const threads = await listStandings(tx, organisation, report.report_id)
  const acceptances = counting.map(({ anchor, words_sha256, accepted }) => ({
    anchor,
    wordsSha256: words_sha256,
    accepted,
  }))
  const said = ({ anchor, wordsSha256 }: Decision): AcceptanceRow | null =>
    counting.findLast((one) => one.anchor === anchor && one.words_sha256 === wordsSha256) ?? null
  return {
    revision,
    decisions: decisionsOf(revision.judged).map((decision) => ({ ...decision, said: said(decision) })),
    blockers: [
      ...blockers(revision.judged, acceptances, threads),
      ...(await contradicted(tx, organisation, revision, report)),
    ],
  }
}
