import { createHash, randomUUID } from 'node:crypto'
import { ROLES, type Role } from '#core/policy/roles.ts'
import { REPORT_STATES, type ReportState } from '#core/policy/states.ts'
import { inOrganisation, type Tx } from '#server/db.ts'
import type { Subject } from './access.ts'
import { type Browser, type House, openHouse, PASSWORD, source } from './house.ts'
import { act, approved, decideAll, issue, revise, upload, well } from './life.ts'

/** One organisation with a person of each role, one with a hand in every report, and a report in each state. */
export interface Side {
  readonly organisation: string
  readonly browsers: Readonly<Record<Role, Browser>>
  /** Installer and reviewer in one person, who uploaded every report. */
  readonly hand: Browser
  readonly reports: ReadonlyMap<ReportState, string>
}

export interface Scene {
  readonly house: House
  readonly ours: Side
  readonly theirs: Side
}

type Way = (hand: Browser, reviewer: Browser, text: string) => Promise<string>

const issued: Way = async (hand, reviewer, text) => {
  const report = await approved(hand, reviewer, text)
  well(await issue(reviewer, report))
  return report
}

/** How a report comes into each state: the database lets no step be left out. */
const WAYS: Readonly<Record<ReportState, Way>> = {
  draft: async (hand, _reviewer, text) => well(await upload(hand, text)).body.id,
  async 'in review'(hand, reviewer, text) {
    const report = await WAYS.draft(hand, reviewer, text)
    well(await act(hand, report, 'submit'))
    return report
  },
  async returned(hand, reviewer, text) {
    const report = await WAYS['in review'](hand, reviewer, text)
    well(await act(reviewer, report, 'return', { summary: 'Mend it.' }))
    return report
  },
  approved,
  issued,
  async replaced(hand, reviewer, text) {
    const report = await issued(hand, reviewer, text)
    const { id } = well(await act(hand, report, 'correct', { reason: 'A wrong address.' })).body
    well(await revise(hand, id, text.replace('Fell Side 3', 'Fell Side 5')))
    well(await act(hand, id, 'submit'))
    await decideAll(reviewer, id)
    well(await act(reviewer, id, 'approve'))
    well(await issue(reviewer, id))
    return report
  },
  async withdrawn(hand, reviewer, text) {
    const report = await issued(hand, reviewer, text)
    well(await act(reviewer, report, 'withdraw', { reason: 'The wrong building.', password: PASSWORD }))
    return report
  },
}

async function reportsOf(hand: Browser, reviewer: Browser): Promise<ReadonlyMap<ReportState, string>> {
  const reports = new Map<ReportState, string>()
  for (const state of REPORT_STATES) {
    const text = source('fell-side-dairy').replace(/reference: .*/, `reference: "AC ${state}"`)
    reports.set(state, await WAYS[state](hand, reviewer, text))
  }
  return reports
}

async function sideOf(house: House): Promise<Side> {
  const organisation = await house.organisation()
  const signedIn = async (role: Role) => [role, await house.signIn(await house.member(organisation, [role]))] as const
  const entries = await Promise.all(ROLES.map(signedIn))
  const hand = await house.signIn(await house.member(organisation, ['installer', 'reviewer']))
  const browsers = Object.fromEntries(entries) as Record<Role, Browser>
  return { organisation, browsers, hand, reports: await reportsOf(hand, browsers.reviewer) }
}

export async function openScene(): Promise<Scene> {
  const house = await openHouse()
  return { house, ours: await sideOf(house), theirs: await sideOf(house) }
}

type Maker = (tx: Tx, side: Side) => Promise<Readonly<Record<string, string>>>

const own = ({ organisation }: Side) => ({ organisation_id: organisation })

const reportIn = ({ reports }: Side, state: ReportState): string => reports.get(state) ?? ''

async function remarked(tx: Tx, side: Side, published_at: Date | null): Promise<Record<string, string>> {
  const [thread, remark, report] = [randomUUID(), randomUUID(), reportIn(side, 'in review')]
  const author_id = side.browsers.reviewer.member.id
  await tx('threads').insert({
    ...own(side),
    thread_id: thread,
    report_id: report,
    anchor: 'site/customer',
    quoted: 'A customer',
    kind: 'remark',
    opened_on: 1,
    placed_on: 1,
    opened_by: author_id,
    published_at,
  })
  await tx('remarks').insert({
    ...own(side),
    remark_id: remark,
    thread_id: thread,
    author_id,
    body: 'A.',
    published_at,
  })
  return { report, thread, remark }
}

/** A fresh one of each thing that a path can name, for every cell anew: some cells take it away. */
const MAKERS: Readonly<Record<Exclude<Subject, 'report'>, Maker>> = {
  async person(tx, side) {
    const person = randomUUID()
    await tx('people').insert({
      ...own(side),
      person_id: person,
      email: `${person}@fennmark.example`,
      name: 'E. Moss',
      roles: ['installer'],
    })
    return { person }
  },
  async instrument(tx, side) {
    const instrument = randomUUID()
    await tx('instruments').insert({ ...own(side), instrument_id: instrument, serial: instrument })
    await tx('instrument_versions').insert({
      ...own(side),
      instrument_id: instrument,
      version: 1,
      kind: 'earth tester',
      calibrated_on: '2026-01-10',
      due_on: '2027-01-10',
      written_by: side.hand.member.id,
    })
    return { instrument }
  },
  async condition(tx, side) {
    const condition = randomUUID()
    await tx('conditions').insert({ ...own(side), condition_id: condition, operator: condition })
    await tx('condition_versions').insert({
      ...own(side),
      condition_id: condition,
      version: 1,
      separation: 'all poles',
      stated_in: 'Terms of connection, 4.2',
      valid_from: '2026-01-01',
      written_by: side.hand.member.id,
    })
    return { condition }
  },
  async document(tx, side) {
    const row = await tx('documents')
      .where({ ...own(side), report_id: reportIn(side, 'issued') })
      .first<{ document_id: string } | undefined>('document_id')
    if (row === undefined) throw new Error('The issued report has no document.')
    return { document: row.document_id }
  },
  thread: (tx, side) => remarked(tx, side, new Date()),
  draft: (tx, side) => remarked(tx, side, null),
  async upload(tx, side) {
    const id = randomUUID()
    await tx('uploads').insert({
      ...own(side),
      upload_id: id,
      report_id: reportIn(side, 'draft'),
      name: 'a.jpg',
      size: 10,
      sha256: createHash('sha256').update(id).digest('hex'),
      parts: '[]',
      person_id: side.browsers.installer.member.id,
      expires_at: new Date('2099-01-01'),
    })
    return { upload: id, report: reportIn(side, 'draft') }
  },
  async attachment(tx, side) {
    const [file, attachment] = [randomUUID(), randomUUID()]
    const sha256 = createHash('sha256').update(file).digest('hex')
    await tx('files').insert({
      ...own(side),
      file_id: file,
      sha256,
      received_sha256: sha256,
      kind: 'photo',
      type: 'image/jpeg',
      bytes: 10,
      created_by: side.hand.member.id,
    })
    await tx('attachments').insert({
      ...own(side),
      attachment_id: attachment,
      report_id: reportIn(side, 'draft'),
      file_id: file,
      name: `${attachment}.jpg`,
      added_by: side.hand.member.id,
    })
    return { attachment }
  },
}

/** The ids that a path needs to name something of one side. */
export async function namesOf(house: House, side: Side, subject: Subject, state?: ReportState) {
  if (subject === 'report') return { report: reportIn(side, state ?? 'draft') }
  return await inOrganisation(house.services.db, side.organisation, (tx) => MAKERS[subject](tx, side))
}
