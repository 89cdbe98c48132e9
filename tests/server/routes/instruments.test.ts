import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { type Browser, type House, openHouse, whole } from '#tests/server/house.ts'
import { well } from '#tests/server/life.ts'

let house: House
let administrator: Browser
let installer: Browser
let stranger: Browser

const TESTER = { serial: '0417-A', kind: 'multifunction tester', calibrated_on: '2026-03-02', due_on: '2027-03-02' }

beforeAll(async () => {
  house = await openHouse()
  const organisation = await house.organisation()
  administrator = await house.signIn(await house.member(organisation, ['administrator']))
  installer = await house.signIn(await house.member(organisation, ['installer']))
  stranger = await house.signIn(await house.member(await house.organisation(), ['administrator']))
})
afterAll(() => house.close())

const enter = async (more: object = {}) =>
  well(await administrator.post('/api/instruments').send({ ...TESTER, serial: crypto.randomUUID(), ...more }))

describe('the register of instruments', () => {
  it('is written by administrators only', async () => {
    const answer = await installer.post('/api/instruments').send(TESTER)
    expect(answer.status).toBe(403)
    expect(answer.body.detail).toBe('This takes the role of administrator.')
  })

  it('refuses a calibration that falls due before it was made, and one of a kind of measurement that is none', async () => {
    const early = await administrator.post('/api/instruments').send({ ...TESTER, due_on: '2026-03-02' })
    expect(early.status).toBe(400)
    expect(early.body.errors[0].pointer).toBe('/due_on')
    const odd = await administrator.post('/api/instruments').send({ ...TESTER, uncertainty: { humidity: 3 } })
    expect(odd.status).toBe(400)
  })

  it('has each serial number once', async () => {
    await enter({ serial: 'TWICE' })
    const again = await administrator.post('/api/instruments').send({ ...TESTER, serial: 'TWICE' })
    expect(again.status).toBe(409)
  })

  it('writes a new calibration only over the version that was read', async () => {
    const { body } = await enter()
    const path = `/api/instruments/${body.id}/versions`
    const { serial: _, ...next } = { ...TESTER, calibrated_on: '2027-02-20', due_on: '2028-02-20' }
    expect((await administrator.post(path).send(next)).status).toBe(428)
    const first = well(await administrator.post(path).set('if-match', '"1"').send(next))
    expect(first.body).toMatchObject({ version: 2, due_on: '2028-02-20' })
    const late = await administrator.post(path).set('if-match', '"1"').send(next)
    expect(late.status).toBe(412)
    expect(late.body.current).toBe(2)
  })

  it('keeps every version readable, with who wrote it', async () => {
    const { body } = await enter({ certificate: 'C-1', uncertainty: { loop: 3 } })
    const { serial: _, ...next } = { ...TESTER, calibrated_on: '2027-02-20', due_on: '2028-02-20', certificate: 'C-2' }
    well(await administrator.post(`/api/instruments/${body.id}/versions`).set('if-match', '"1"').send(next))
    const shown = well(await installer.get(`/api/instruments/${body.id}`))
    expect(shown.headers['etag']).toBe('"2"')
    expect(shown.body.history).toMatchObject([
      { version: 2, certificate: 'C-2', calibrated_on: '2027-02-20' },
      { version: 1, certificate: 'C-1', calibrated_on: '2026-03-02', uncertainty: { loop: 3 } },
    ])
    expect(shown.body.history[0].written_by.name).toBe(administrator.member.name)
  })

  it('retires an instrument and brings it back, never twice', async () => {
    const { body } = await enter()
    const act = (retired: boolean) =>
      administrator
        .post(`/api/instruments/${body.id}/retire`)
        .set('if-match', '"1"')
        .send({ retired, reason: 'Fell into the weir.' })
    expect(well(await act(true)).body.retired_at).toBe('2026-11-02T09:00:00.000Z')
    expect((await act(true)).status).toBe(409)
    expect(well(await act(false)).body.retired_at).toBeNull()
  })

  it('shows nothing of another house', async () => {
    const { body } = await enter()
    const foreign = await stranger.get(`/api/instruments/${body.id}`)
    const missing = await stranger.get(`/api/instruments/${crypto.randomUUID()}`)
    expect(foreign.status).toBe(404)
    expect({ ...foreign.body, instance: '' }).toEqual({ ...missing.body, instance: '' })
    expect(well(await stranger.get('/api/instruments?retired=all')).body.instruments).toEqual([])
  })

  it('is listed by due date, page by page, filtered by due date and by use', async () => {
    for (const year of ['2031', '2030', '2032'])
      await enter({ kind: 'page tester', calibrated_on: '2029-01-01', due_on: `${year}-05-01` })
    const seen: string[] = []
    let after: string | null = ''
    while (after !== null) {
      const query: string = `search=page+tester&limit=1${after === '' ? '' : `&after=${encodeURIComponent(after)}`}`
      const page = well(await installer.get(`/api/instruments?${query}`)).body
      seen.push(...page.instruments.map(({ due_on }: { due_on: string }) => due_on))
      after = page.next
    }
    expect(seen).toEqual(['2030-05-01', '2031-05-01', '2032-05-01'])
    const due = well(await installer.get('/api/instruments?search=page+tester&due_before=2031-05-01')).body.instruments
    expect(due).toHaveLength(1)
    expect((await installer.get('/api/instruments?after=bm9uc2Vuc2U')).status).toBe(400)
  })

  it('goes out as a table in which no cell is computed', async () => {
    await enter({ serial: '=1+1', note: 'on loan, "for now"' })
    const table = (await whole(installer.get('/api/instruments.csv?retired=all'))).toString('utf8')
    expect(table).toContain("'=1+1,multifunction tester,2026-03-02,2027-03-02")
    expect(table).toContain('"on loan, ""for now"""')
  })
})

describe('the register of operators’ conditions', () => {
  const DEMAND = { separation: 'all poles', stated_in: 'Connection conditions 2025, sheet 7', valid_from: '2025-01-01' }

  it('has each operator once, however it is spelt in capitals', async () => {
    well(await administrator.post('/api/conditions').send({ operator: 'Tarn Grid', ...DEMAND }))
    expect((await administrator.post('/api/conditions').send({ operator: 'TARN GRID', ...DEMAND })).status).toBe(409)
    expect((await installer.post('/api/conditions').send({ operator: 'Own Grid', ...DEMAND })).status).toBe(403)
  })

  it('keeps what was demanded before', async () => {
    const { id } = well(await administrator.post('/api/conditions').send({ operator: 'Moor Grid', ...DEMAND })).body
    const next = { ...DEMAND, separation: 'line poles', valid_from: '2026-07-01' }
    well(await administrator.post(`/api/conditions/${id}/versions`).set('if-match', '"1"').send(next))
    const shown = well(await installer.get(`/api/conditions/${id}`)).body
    expect(shown).toMatchObject({ version: 2, separation: 'line poles' })
    expect(shown.history.map(({ separation }: { separation: string }) => separation)).toEqual([
      'line poles',
      'all poles',
    ])
    const table = (await whole(installer.get('/api/conditions.csv?search=moor'))).toString('utf8')
    expect(table).toContain('Moor Grid,line poles')
  })
})
