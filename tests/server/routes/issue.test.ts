import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { inOrganisation } from '#server/db.ts'
import { type Browser, type House, openHouse, PASSWORD, source } from '#tests/server/house.ts'
import {
  act,
  approved,
  decideAll,
  etagOf,
  issue,
  key,
  patiently,
  remark,
  revise,
  upload,
  well,
} from '#tests/server/life.ts'
import { soundRegister } from '#tests/server/registers.ts'

let house: House
let organisation: string
let installer: Browser
let reviewer: Browser
let auditor: Browser
const dairy = source('fell-side-dairy')
const farm = source('tern-farm-tt')

beforeAll(async () => {
  house = await openHouse()
  organisation = await house.organisation('FEN')
  installer = await house.signIn(await house.member(organisation, ['installer']))
  reviewer = await house.signIn(await house.member(organisation, ['reviewer']))
  auditor = await house.signIn(await house.member(organisation, ['auditor']))
})
afterAll(() => house.close())

const numbers = async (): Promise<number[]> => {
  const rows = await inOrganisation(house.services.db, organisation, (tx) =>
    tx('documents').where({ organisation_id: organisation }).orderBy('sequence').select('sequence', 'number'),
  )
  for (const { sequence, number } of rows) expect(number).toBe(`FEN-2026-${String(sequence).padStart(4, '0')}`)
  return rows.map(({ sequence }: { sequence: number }) => sequence)
}

const gapFree = (count: number): number[] => Array.from({ length: count }, (_, index) => index + 1)

describe('issuing', () => {
  it('is refused without the password, with a wrong one, and to whoever uploaded', async () => {
    const report = await approved(installer, reviewer, dairy)
    expect((await act(reviewer, report, 'issue', {})).status).toBe(400)
    expect((await act(reviewer, report, 'issue', { password: 'not the right one at all' })).status).toBe(403)
    expect((await act(installer, report, 'issue', { password: PASSWORD })).status).toBe(403)
    expect(await numbers()).toEqual([])
    expect((await reviewer.get(`/api/reports/${report}`)).body).toMatchObject({ state: 'approved', number: null })
  })

  it('is refused before approval, and after approval once a correction was asked for', async () => {
    const report = well(await upload(installer, dairy)).body.id
    well(await act(installer, report, 'submit'))
    expect((await issue(reviewer, report)).status).toBe(409)
    await decideAll(reviewer, report)
    well(await act(reviewer, report, 'approve'))
    well(await remark(reviewer, report, 'correction'))
    well(await act(reviewer, report, 'review', { decision: 'remarks' }))
    const answer = await issue(reviewer, report)
    expect(answer.status).toBe(409)
    expect(answer.body.blockers.map(({ kind }: { kind: string }) => kind)).toEqual(['correction'])
    expect(await numbers()).toEqual([])
  })

  it('is refused while the accepted words cannot be printed, and takes no number', async () => {
    const report = well(await upload(installer, dairy)).body.id
    well(await act(installer, report, 'submit'))
    const [decision] = well(await reviewer.get(`/api/reports/${report}/review`)).body.decisions
    const { anchor, words_sha256 } = decision
    const accept = (reason: string) =>
      reviewer.post(`/api/reports/${report}/acceptances`).send({ anchor, words_sha256, accepted: true, reason })
    well(await accept('fine \u{1F44D}'))
    well(await act(reviewer, report, 'approve'))
    const answer = await issue(reviewer, report)
    expect(answer.status).toBe(409)
    expect(answer.body.detail).toMatch(/^It cannot be printed: /)
    expect(await numbers()).toEqual([])
  })

  it('gives the number, the document, the register entry and the jobs in one go, and the same answer under the same key', async () => {
    const report = await approved(installer, reviewer, dairy)
    const etag = await etagOf(reviewer, report)
    const send = () =>
      reviewer
        .post(`/api/reports/${report}/issue`)
        .set('if-match', etag)
        .set('idempotency-key', 'issue the dairy')
        .send({ password: PASSWORD })
    const first = well(await send())
    expect(first.body).toMatchObject({ state: 'issued', number: 'FEN-2026-0001' })
    const again = await send()
    expect(again.body).toEqual(first.body)
    expect(again.headers['idempotency-replayed']).toBe('true')
    const [entry] = await soundRegister(house.services, organisation)
    expect(entry).toMatchObject({ kind: 'issued', number: 'FEN-2026-0001', organisation: 'FEN', revision: 1 })
    const jobs = await inOrganisation(house.services.db, organisation, (tx) =>
      tx('pgboss.job').whereIn('name', ['seal-document', 'send-checkpoint']).select('name'),
    )
    expect(jobs.map(({ name }: { name: string }) => name).sort()).toEqual(['seal-document', 'send-checkpoint'])
    expect((await auditor.get(`/api/reports/${report}`)).status).toBe(200)
    expect((await revise(installer, report, farm)).status).toBe(409)
  })

  it('happens once, however many try at the same time', async () => {
    const report = await approved(installer, reviewer, farm)
    const etag = await etagOf(reviewer, report)
    const before = await numbers()
    const answers = await Promise.all(
      Array.from({ length: 50 }, () =>
        reviewer
          .post(`/api/reports/${report}/issue`)
          .set('if-match', etag)
          .set('idempotency-key', key())
          .send({ password: PASSWORD }),
      ),
    )
    const statuses = answers.map(({ status }) => status)
    expect(statuses.filter((status) => status === 200)).toHaveLength(1)
    expect(statuses.filter((status) => ![200, 409, 412, 503].includes(status))).toEqual([])
    expect(await numbers()).toEqual(gapFree(before.length + 1))
    await soundRegister(house.services, organisation)
  })

  it('of different reports by many at once leaves no gap and no double', async () => {
    const before = (await numbers()).length
    const count = 16
    const reports: string[] = []
    for (let made = 0; made < count; made++) reports.push(await approved(installer, reviewer, farm))
    const answers = await Promise.all(
      reports.map((report) => {
        const same = key()
        return patiently(() => issue(reviewer, report, same))
      }),
    )
    const given = answers.map((answer) => well(answer).body.number)
    expect(new Set(given).size).toBe(count)
    expect(await numbers()).toEqual(gapFree(before + count))
    await soundRegister(house.services, organisation)
  }, 120_000)
})

describe('a correction', () => {
  it('is a report of its own that takes the old one’s place when it is issued, and not before', async () => {
    const old = await approved(installer, reviewer, dairy)
    const { number } = well(await issue(reviewer, old)).body
    expect((await act(auditor, old, 'correct', { reason: 'A wrong address.' })).status).toBe(403)
    const made = well(await act(installer, old, 'correct', { reason: 'A wrong address.' }))
    expect(made.body).toMatchObject({
      state: 'draft',
      corrects: old,
      correction_reason: 'A wrong address.',
      number: null,
    })
    expect((await act(installer, old, 'correct', { reason: 'Once more.' })).status).toBe(409)
    const fresh = made.body.id
    well(await revise(installer, fresh, dairy.replace('Fell Side 3', 'Fell Side 5')))
    well(await act(installer, fresh, 'submit'))
    await decideAll(reviewer, fresh)
    well(await act(reviewer, fresh, 'approve'))
    expect((await installer.get(`/api/reports/${old}`)).body.state).toBe('issued')
    const successor = well(await issue(reviewer, fresh)).body.number
    expect((await installer.get(`/api/reports/${old}`)).body).toMatchObject({ state: 'replaced', number })
    const entries = await soundRegister(house.services, organisation)
    expect(entries.at(-2)).toMatchObject({
      kind: 'issued',
      number: successor,
      replaces: number,
      reason: 'A wrong address.',
    })
    expect(entries.at(-1)).toMatchObject({ kind: 'replaced', number, replaced_by: successor })
  })

  it('finds nothing to replace once the old report was withdrawn', async () => {
    const old = await approved(installer, reviewer, farm)
    well(await issue(reviewer, old))
    const fresh = well(await act(installer, old, 'correct', { reason: 'A wrong reading.' })).body.id
    well(await act(installer, fresh, 'submit'))
    well(await act(reviewer, fresh, 'approve'))
    expect((await act(reviewer, old, 'withdraw', { reason: 'Taken back.' })).status).toBe(400)
    const before = await numbers()
    well(await act(reviewer, old, 'withdraw', { reason: 'Taken back.', password: PASSWORD }))
    const entries = await soundRegister(house.services, organisation)
    expect(entries.at(-1)).toMatchObject({ kind: 'withdrawn', reason: 'Taken back.' })
    expect((await issue(reviewer, fresh)).status).toBe(409)
    expect(await numbers()).toEqual(before)
  })
})

describe('the last wall', () => {
  it('refuses a document by whoever uploaded, and one that nobody approved', async () => {
    const report = await approved(installer, reviewer, farm)
    const unapproved = well(await upload(installer, farm)).body.id
    const document = (about: string, person: string) => ({
      organisation_id: organisation,
      number: 'FEN-2026-9999',
      year: 2026,
      sequence: 9999,
      report_id: about,
      revision: 1,
      issued_at: house.now,
      issued_by: person,
      source_sha256: 'ab'.repeat(32),
      facts_sha256: 'ab'.repeat(32),
      issue: '{}',
    })
    const insert = (about: string, person: string) =>
      inOrganisation(house.services.db, organisation, (tx) => tx('documents').insert(document(about, person)))
    await expect(insert(report, installer.member.id)).rejects.toThrow(/without a hand in it/)
    await expect(insert(unapproved, reviewer.member.id)).rejects.toThrow(/after its revision was approved/)
  })
})
