import { createHash } from 'node:crypto'
import supertest from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { outside } from '#server/db.ts'
import { type Browser, type House, openHouse, PASSWORD, source } from '#tests/server/house.ts'
import { act, approved, issue, upload, well } from '#tests/server/life.ts'
import { pdfOf, sealWith } from '#tests/server/sealed.ts'

let house: House
let installer: Browser
let reviewer: Browser
const dairy = source('fell-side-dairy')
const farm = source('tern-farm-tt')
const pdf = pdfOf(dairy)
const sha256 = createHash('sha256').update(pdf).digest('hex')
const reports: string[] = []

beforeAll(async () => {
  house = await openHouse()
  const organisation = await house.organisation('PUB')
  installer = await house.signIn(await house.member(organisation, ['installer']))
  reviewer = await house.signIn(await house.member(organisation, ['reviewer']))
  for (const text of [dairy, dairy, farm]) {
    const report = await approved(installer, reviewer, text)
    well(await issue(reviewer, report))
    reports.push(report)
  }
  const { documents } = well(await reviewer.get('/api/register?prefix=PUB-2026-0001')).body
  await sealWith(house, organisation, documents[0].document, pdf)
  const correction = well(
    await installer
      .post(`/api/reports/${reports[1]}/correct`)
      .set('if-match', well(await installer.get(`/api/reports/${reports[1]}`)).headers['etag'] ?? '')
      .set('idempotency-key', crypto.randomUUID())
      .send({ reason: 'Another fuse was fitted.' }),
  ).body.id
  well(await act(installer, correction, 'submit'))
  const { decisions } = well(await reviewer.get(`/api/reports/${correction}/review`)).body
  for (const { anchor, words_sha256 } of decisions)
    well(
      await reviewer
        .post(`/api/reports/${correction}/acceptances`)
        .send({ anchor, words_sha256, accepted: true, reason: 'agreed' }),
    )
  well(await act(reviewer, correction, 'approve'))
  well(await issue(reviewer, correction))
  well(await act(reviewer, reports[2] ?? '', 'withdraw', { reason: 'Wrong building.', password: PASSWORD }))
}, 60_000)
afterAll(() => house.close())

const anybody = () => supertest(house.app)
const check = (query: string) => anybody().get(`/api/public/check?${query}`)

describe('the public check', () => {
  it('knows nothing of a number that was not issued, of a draft, or of a file that was changed', async () => {
    const draft = well(await upload(installer, dairy.replace('FM-2026-066', 'FM-2026-999'))).body
    const flipped = Buffer.from(pdf)
    flipped[1000] = (flipped[1000] ?? 0) ^ 1
    const wrong = createHash('sha256').update(flipped).digest('hex')
    const queries = [
      'number=PUB-2026-0099',
      `number=${draft.reference}`,
      `number=${draft.id}`,
      'number=%25',
      `sha256=${wrong}`,
    ]
    for (const query of queries) {
      const answer = await check(query)
      expect(answer.status).toBe(200)
      expect(answer.body).toEqual({
        status: 'unknown',
        number: null,
        issued_by: null,
        issued_at: null,
        replaced_by: null,
        ended_at: null,
        sealed: null,
        pdf_sha256: null,
      })
    }
  })

  it('knows a sealed document by its number, however it is typed, and by its file', async () => {
    const byNumber = (await check('number=+pub-2026-0001+')).body
    expect(byNumber).toEqual({
      status: 'valid',
      number: 'PUB-2026-0001',
      issued_by: 'Electrical works PUB',
      issued_at: '2026-11-02T09:00:00.000Z',
      replaced_by: null,
      ended_at: null,
      sealed: true,
      pdf_sha256: sha256,
    })
    expect((await check(`sha256=${sha256.toUpperCase()}`)).body).toEqual(byNumber)
  })

  it('tells what took the place of a document, and that one was taken back', async () => {
    expect((await check('number=PUB-2026-0002')).body).toMatchObject({
      status: 'replaced',
      replaced_by: 'PUB-2026-0004',
    })
    expect((await check('number=PUB-2026-0003')).body).toMatchObject({ status: 'withdrawn', replaced_by: null })
    expect((await check('number=PUB-2026-0004')).body).toMatchObject({
      status: 'valid',
      sealed: false,
      pdf_sha256: null,
    })
  })

  it('has one shape and the same headers for what is there and what is not', async () => {
    const known = await check('number=PUB-2026-0001')
    const unknown = await check('number=PUB-2026-9999')
    const shape = ({ headers, body }: typeof known) => ({
      headers: Object.keys(headers)
        .filter((name) => name !== 'content-length')
        .toSorted(),
      keys: Object.keys(body),
    })
    expect(shape(unknown)).toEqual(shape(known))
  })

  it('refuses both questions at once, none, and what is no hash', async () => {
    for (const query of [
      '',
      `number=PUB-2026-0001&sha256=${sha256}`,
      'sha256=abc',
      'number=PUB-2026-0001&organisation=1',
    ])
      expect((await check(query)).status).toBe(400)
  })

  it('answers as fast for what is not there as for what is', async () => {
    const times = { known: [] as number[], unknown: [] as number[] }
    const paths = { known: 'PUB-2026-0001', unknown: 'PUB-2026-0777' }
    await anybody().get('/healthz')
    const limits = () => house.services.db('rate_limits').delete()
    for (let round = 0; round < 40; round += 1) {
      if (round % 15 === 0) await limits()
      for (const kind of ['known', 'unknown'] as const) {
        const begun = process.hrtime.bigint()
        expect((await check(`number=${paths[kind]}`)).status).toBe(200)
        times[kind].push(Number(process.hrtime.bigint() - begun) / 1e6)
      }
    }
    const median = (list: number[]) => list.toSorted((a, b) => a - b)[Math.floor(list.length / 2)] ?? 0
    const [known, unknown] = [median(times.known), median(times.unknown)]
    expect(Math.abs(known - unknown)).toBeLessThan(Math.max(2, 0.25 * Math.max(known, unknown)))
  })

  it('is rationed by address, and says how long to wait', async () => {
    const answers = []
    for (let count = 0; count < 65; count += 1) answers.push(await check('number=PUB-2026-0001'))
    const refused = answers.filter(({ status }) => status === 429)
    expect(refused.length).toBeGreaterThan(0)
    expect(Number(refused[0]?.headers['retry-after'])).toBeGreaterThan(0)
    await house.services.db('rate_limits').delete()
  })
})

describe('whoever is outside', () => {
  it('reads no row of any table behind the check, and only the columns of the gate', async () => {
    await outside(house.services.db, async (tx) => {
      for (const table of ['documents', 'reports', 'seals', 'register_entries', 'organisations', 'revisions', 'people'])
        expect(await tx(table).select('organisation_id')).toEqual([])
      const { rows } = await tx.raw('select * from public_document(?, null)', ['PUB-2026-0001'])
      expect(Object.keys(rows[0]).toSorted()).toEqual(
        ['ended_at', 'issued_at', 'number', 'organisation', 'pdf_sha256', 'replaced_by', 'sealed', 'state'].toSorted(),
      )
      const none = await tx.raw('select * from public_document(null, null)')
      expect(none.rows).toEqual([])
    })
  })
})
