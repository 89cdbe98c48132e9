import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { type Browser, type House, openHouse, source, whole } from '#tests/server/house.ts'

let house: House
let installer: Browser
let auditor: Browser

const upload = (browser: Browser, text: string, key: string = crypto.randomUUID()) =>
  browser
    .post('/api/reports?file_name=site.skerry.yaml')
    .set('content-type', 'application/yaml')
    .set('idempotency-key', key)
    .send(text)

beforeAll(async () => {
  house = await openHouse()
  const organisation = await house.organisation()
  installer = await house.signIn(await house.member(organisation, ['installer']))
  auditor = await house.signIn(await house.member(organisation, ['auditor']))
})
afterAll(() => house.close())

describe('a new report', () => {
  it('is refused with every place that is wrong, and nothing is stored', async () => {
    const answer = await upload(installer, 'skerry: 1\nreport: { reference: X }\n')
    expect(answer.status).toBe(422)
    expect(answer.type).toBe('application/problem+json')
    expect(answer.body.errors.length).toBeGreaterThan(1)
    expect(answer.body.errors[0]).toMatchObject({ line: expect.any(Number), column: expect.any(Number) })
    const list = await installer.get('/api/reports')
    expect(list.body.reports).toEqual([])
  })

  it('is refused to an auditor, with the reason', async () => {
    const answer = await upload(auditor, source('alder-mill-bakery'))
    expect(answer.status).toBe(403)
    expect(answer.body.detail).toBe('This takes the role of installer or reviewer.')
  })

  it('is stored as it came, once, however often it is sent', async () => {
    const text = source('alder-mill-bakery')
    const first = await upload(installer, text, 'the same key')
    expect(first.status).toBe(201)
    const again = await upload(installer, text, 'the same key')
    expect(again.status).toBe(201)
    expect(again.body).toEqual(first.body)
    expect(again.headers['idempotency-replayed']).toBe('true')
    const other = await upload(installer, source('tern-farm-tt'), 'the same key')
    expect(other.status).toBe(422)
    const stored = await whole(installer.get(`/api/reports/${first.body.id}/revisions/1/source`))
    expect(stored.toString()).toBe(text)
  })
})
