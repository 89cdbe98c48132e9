import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { type Browser, type House, openHouse, source, whole } from '#tests/server/house.ts'
import { act, etagOf, key, revise, upload, well } from '#tests/server/life.ts'

let house: House
let installer: Browser
let reviewer: Browser
let auditor: Browser
let stranger: Browser
const dairy = source('fell-side-dairy')
const mended = dairy.replace('customer: M. Fell', 'customer: M. Fell and daughters')

beforeAll(async () => {
  house = await openHouse()
  const organisation = await house.organisation()
  installer = await house.signIn(await house.member(organisation, ['installer']))
  reviewer = await house.signIn(await house.member(organisation, ['reviewer']))
  auditor = await house.signIn(await house.member(organisation, ['auditor']))
  stranger = await house.signIn(await house.member(await house.organisation(), ['installer', 'reviewer']))
})
afterAll(() => house.close())

const draft = async (): Promise<string> => well(await upload(installer, dairy)).body.id

describe('a new revision', () => {
  it('is refused in review, and leaves the report as it was', async () => {
    const report = await draft()
    well(await act(installer, report, 'submit'))
    const answer = await revise(installer, report, mended)
    expect(answer.status).toBe(409)
    expect((await installer.get(`/api/reports/${report}`)).body.revision).toBe(1)
  })

  it('is refused to whoever read an older version, so that nobody’s upload is lost', async () => {
    const report = await draft()
    const stale = await etagOf(installer, report)
    well(await revise(installer, report, mended))
    const answer = await installer
      .post(`/api/reports/${report}/revisions?file_name=a.yaml`)
      .set('content-type', 'application/yaml')
      .set('idempotency-key', key())
      .set('if-match', stale)
      .send(dairy)
    expect(answer.status).toBe(412)
    expect(answer.body.current).toBe(2)
  })

  it('is refused without a version, and without a key', async () => {
    const report = await draft()
    const bare = installer.post(`/api/reports/${report}/revisions?file_name=a.yaml`).set('content-type', 'text/yaml')
    expect((await bare.set('idempotency-key', key()).send(mended)).status).toBe(428)
    const keyless = await installer
      .post(`/api/reports/${report}/revisions?file_name=a.yaml`)
      .set('content-type', 'text/yaml')
      .set('if-match', await etagOf(installer, report))
      .send(mended)
    expect(keyless.status).toBe(400)
  })

  it('of another organisation’s report is the revision of nothing', async () => {
    const report = await draft()
    const answer = await stranger
      .post(`/api/reports/${report}/revisions?file_name=a.yaml`)
      .set('content-type', 'text/yaml')
      .set('idempotency-key', key())
      .set('if-match', '"1"')
      .send(mended)
    expect(answer.status).toBe(404)
  })

  it('that cannot be judged is refused with its places, and not stored', async () => {
    const report = await draft()
    const answer = await revise(installer, report, dairy.replace('earthing: TN-S', 'earthing: TNS'))
    expect(answer.status).toBe(422)
    expect(answer.body.errors[0]).toMatchObject({ pointer: '/supply/earthing' })
    expect((await installer.get(`/api/reports/${report}/revisions`)).body.revisions).toHaveLength(1)
  })

  it('of the same bytes stores nothing', async () => {
    const report = await draft()
    const answer = await revise(installer, report, dairy)
    expect(answer.status).toBe(200)
    expect(answer.body).toMatchObject({ revision: 1, version: 1 })
  })

  it('is kept beside the older ones, byte for byte', async () => {
    const report = await draft()
    expect((await revise(installer, report, mended)).status).toBe(201)
    const { revisions } = (await installer.get(`/api/reports/${report}/revisions`)).body
    expect(revisions.map(({ revision }: { revision: number }) => revision)).toEqual([2, 1])
    for (const [number, text] of [dairy, mended].entries()) {
      const stored = await whole(installer.get(`/api/reports/${report}/revisions/${number + 1}/source`))
      expect(stored.toString()).toBe(text)
    }
  })
})

describe('looking at a report', () => {
  it('shows an auditor nothing before it is issued', async () => {
    const report = await draft()
    for (const view of ['', '/model', '/findings', '/revisions', '/draft.pdf'])
      expect((await auditor.get(`/api/reports/${report}${view}`)).status).toBe(403)
  })

  it('gives the document model of any revision, and 404 for one that is not there', async () => {
    const report = await draft()
    well(await revise(installer, report, mended))
    const [first, newest, none] = await Promise.all(
      ['?revision=1', '', '?revision=3'].map((query) => installer.get(`/api/reports/${report}/model${query}`)),
    )
    expect(JSON.stringify(first?.body.model)).not.toContain('M. Fell and daughters')
    expect(JSON.stringify(newest?.body.model)).toContain('M. Fell and daughters')
    expect(none?.status).toBe(404)
  })

  it('gives the findings with their lines', async () => {
    const { body } = well(await reviewer.get(`/api/reports/${await draft()}/findings`))
    expect(body.outcome).toBe('meets')
    expect(body.counts.limited).toBe(2)
    expect(body.findings.every(({ line }: { line: number }) => line > 1)).toBe(true)
  })

  it('compares two revisions by meaning', async () => {
    const report = await draft()
    const worse = dairy.replace('fault_current: 1.4 kA', 'fault_current: 1.5 kA')
    well(await revise(installer, report, worse))
    const { body } = well(await reviewer.get(`/api/reports/${report}/compare?from=1&to=2`))
    expect(body.values).toContainEqual(expect.objectContaining({ before: 1400, after: 1500, unit: 'A' }))
    const same = well(await reviewer.get(`/api/reports/${report}/compare?from=2&to=2`))
    expect(same.body).toMatchObject({ verdicts: [], values: [] })
  })

  it('draws a draft as PDF', async () => {
    const pdf = await whole(reviewer.get(`/api/reports/${await draft()}/draft.pdf`))
    expect(pdf.subarray(0, 5).toString()).toBe('%PDF-')
    expect(pdf.length).toBeGreaterThan(50_000)
  })
})

describe('checking a file', () => {
  const check = (text: string) => installer.post('/api/check').set('content-type', 'application/yaml').send(text)

  it('tells what is wrong and stores nothing', async () => {
    const before = (await installer.get('/api/reports?limit=100')).body.reports.length
    expect((await check('skerry: 1\n')).status).toBe(422)
    const { body } = well(await check(source('alder-mill-bakery')))
    expect(body.outcome).toBe('fails')
    expect((await installer.get('/api/reports?limit=100')).body.reports).toHaveLength(before)
  })
})

describe('steps before review', () => {
  it('go one after the other: a report that is in review is not sent there again', async () => {
    const report = await draft()
    expect((await act(installer, report, 'recall')).status).toBe(409)
    well(await act(installer, report, 'submit'))
    expect((await act(installer, report, 'submit')).status).toBe(409)
    expect(well(await act(installer, report, 'recall')).body.state).toBe('draft')
  })

  it('ask only who may be the second person', async () => {
    const report = await draft()
    const own = await act(installer, report, 'submit', { reviewer: installer.member.id })
    expect(own.status).toBe(409)
    expect(own.body.detail).toMatch(/role of reviewer/)
    const outsider = await act(installer, report, 'submit', { reviewer: stranger.member.id })
    expect(outsider.status).toBe(400)
    const answer = well(await act(installer, report, 'submit', { reviewer: reviewer.member.id }))
    expect(answer.body).toMatchObject({ state: 'in review', reviewer: reviewer.member.id })
  })

  it('take a discarded report out of everybody’s sight', async () => {
    const report = await draft()
    const discard = installer.delete(`/api/reports/${report}`).set('if-match', await etagOf(installer, report))
    expect((await discard).status).toBe(204)
    expect((await installer.get(`/api/reports/${report}`)).status).toBe(404)
  })
})
