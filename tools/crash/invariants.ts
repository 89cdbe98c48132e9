import { inOrganisation } from '#server/db.ts'
import { checkOrganisation } from '#server/jobs/check-records.ts'
import { proofOf } from '#server/register/proof.ts'
import type { Services } from '#server/services.ts'
import type { Told } from './story.ts'

/** Mails of one story: asked for review, told of it, told of the issue; twice, since it issues two reports. */
const MAILS_A_STORY = 6

interface Row {
  readonly number: string
  readonly document_id: string
  readonly report_id: string
  readonly state: string
  readonly sealed: boolean
}

async function rowsOf(services: Services, organisation: string): Promise<Row[]> {
  return await inOrganisation(services.db, organisation, (tx) =>
    tx('documents as d')
      .join('reports as r', (on) => on.on('r.organisation_id', 'd.organisation_id').andOn('r.report_id', 'd.report_id'))
      .leftJoin('seals as s', (on) =>
        on.on('s.organisation_id', 'd.organisation_id').andOn('s.document_id', 'd.document_id'),
      )
      .where('d.organisation_id', organisation)
      .orderBy('d.sequence')
      .select('d.number', 'd.document_id', 'd.report_id', 'r.state', tx.raw('s.document_id is not null as sealed')),
  )
}

/** Everything that is not as it must be after all that was killed; empty when all holds. */
export async function broken(services: Services, organisation: string, told: readonly Told[]): Promise<string[]> {
  const found: string[] = []
  const must = (holds: boolean, words: string): void => {
    if (!holds) found.push(words)
  }
  for (const { where, what } of await checkOrganisation(services, organisation)) found.push(`${where}: ${what}`)

  const rows = await rowsOf(services, organisation)
  const known = new Map(
    told.flatMap(
      ({ old, fresh }) =>
        [
          [old.number, old.report],
          [fresh.number, fresh.report],
        ] as const,
    ),
  )
  must(known.size === told.length * 2, 'two reports were told the same number')
  must(rows.length === known.size, `${known.size} numbers were told, ${rows.length} documents are there`)
  for (const { number, report_id } of rows)
    must(known.get(number) === report_id, `${number} was told of another report`)
  rows.forEach(({ number }, place) => {
    must(number.endsWith(`-${String(place + 1).padStart(4, '0')}`), `${number} stands where number ${place + 1} should`)
  })
  const state = new Map(rows.map((row) => [row.report_id, row.state]))
  for (const { old, fresh } of told) {
    must(state.get(old.report) === 'replaced', `${old.number} is ${state.get(old.report)}`)
    must(state.get(fresh.report) === 'issued', `${fresh.number} is ${state.get(fresh.report)}`)
  }
  for (const { number, sealed } of rows) must(sealed, `${number} has no seal`)

  await inOrganisation(services.db, organisation, async (tx) => {
    for (const { document_id, number } of rows)
      for (const kind of ['issued', 'sealed'] as const)
        must(
          (await proofOf(tx, organisation, document_id, kind)) !== undefined,
          `${number} has no proof that it was ${kind}`,
        )
    const reports = await tx('reports').where({ organisation_id: organisation }).count('* as count').first()
    must(reports?.['count'] === known.size, `${String(reports?.['count'])} reports are there, ${known.size} were begun`)
    const mails: { kind: string; state: string; attempts: number }[] = await tx('mails')
      .where({ organisation_id: organisation })
      .whereNot('kind', 'checkpoint')
      .select('kind', 'state', 'attempts')
    must(
      mails.length === told.length * MAILS_A_STORY,
      `${mails.length} mails instead of ${told.length * MAILS_A_STORY}`,
    )
    for (const mail of mails)
      must(mail.state === 'kept' && mail.attempts === 1, `a mail is ${mail.state} after ${mail.attempts} attempts`)
    const left = await tx('pgboss.job')
      .whereNot('state', 'completed')
      .whereIn('name', ['seal-document', 'send-mail', 'send-checkpoint'])
      .select('name', 'state')
    for (const job of left) found.push(`a job of ${job.name} is ${job.state}`)
  })
  return found
}

/** How many sealed files no row knows: a worker that dies between file and row leaves one, and nothing else may. */
export async function strays(services: Services, organisation: string): Promise<number> {
  const rows: { pdf_sha256: string }[] = await inOrganisation(services.db, organisation, (tx) =>
    tx('seals').where({ organisation_id: organisation }).select('pdf_sha256'),
  )
  const known = new Set(rows.map(({ pdf_sha256 }) => pdf_sha256))
  let count = 0
  for await (const { key } of services.store.list({ organisation, kind: 'document' }))
    if (!known.has(key.slice(key.lastIndexOf('/') + 1))) count += 1
  return count
}
