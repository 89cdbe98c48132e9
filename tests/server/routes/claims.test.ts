import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { type Browser, type House, openHouse, source } from '#tests/server/house.ts'
import { act, upload, well } from '#tests/server/life.ts'

let house: House
let administrator: Browser
let installer: Browser

// Inspected from 21 to 22 April 2026; T1 0417-A calibrated 2026-03-02, T2 91-07 calibrated 2025-11-04; all poles.
const dairy = source('fell-side-dairy')
const T1 = { serial: '0417-A', kind: 'multifunction tester', calibrated_on: '2026-03-02', due_on: '2027-03-02' }
const T2 = { serial: '91-07', kind: 'PV tester', calibrated_on: '2025-11-04', due_on: '2026-11-04' }
const DEMAND = { operator: 'Fennmark Grid', separation: 'all poles', stated_in: 'Sheet 7', valid_from: '2025-01-01' }

beforeAll(async () => {
  house = await openHouse()
})
beforeEach(async () => {
  const organisation = await house.organisation()
  administrator = await house.signIn(await house.member(organisation, ['administrator']))
  installer = await house.signIn(await house.member(organisation, ['installer']))
})
afterAll(() => house.close())

const enter = async (instrument: object) => well(await administrator.post('/api/instruments').send(instrument)).body
const demand = async (more: object) =>
  well(await administrator.post('/api/conditions').send({ ...DEMAND, ...more })).body

async function claims(text = dairy): Promise<{ claim: string; subject: string }[]> {
  const { id } = well(await upload(installer, text)).body
  return well(await installer.get(`/api/reports/${id}/claims`)).body.claims
}

const told = async (text = dairy) => (await claims(text)).map(({ claim, subject }) => `${subject} ${claim}`)

describe('what a file says, held against the registers', () => {
  it('knows neither instruments nor operator while the registers are empty', async () => {
    expect(await told()).toEqual([
      'T1 instrument-not-in-register',
      'T2 instrument-not-in-register',
      'supply operator-not-in-register',
    ])
  })

  it('finds nothing where both say the same', async () => {
    await enter(T1)
    await enter(T2)
    await demand({})
    expect(await claims()).toEqual([])
  })

  it('tells other dates than those of the register, at their place in the file', async () => {
    await enter({ ...T1, due_on: '2026-09-02' })
    await enter(T2)
    await demand({})
    const line = dairy.split('\n').findIndex((text) => text.includes('serial: "0417-A"')) + 1
    expect(await claims()).toMatchObject([
      {
        claim: 'instrument-other-calibration',
        severity: 'failure',
        anchor: 'instrument/T1',
        path: '/instruments/T1',
        line,
      },
    ])
  })

  it('tells an instrument that no calibration covers on the last day of the inspection', async () => {
    await enter(T1)
    await enter({ ...T2, due_on: '2026-04-21' })
    await demand({})
    expect(await told()).toEqual(['T2 instrument-other-calibration', 'T2 instrument-not-calibrated'])
  })

  it('counts calibrations of the day, not only the newest', async () => {
    const { id } = await enter(T1)
    const { serial: _, ...next } = { ...T1, calibrated_on: '2027-02-20', due_on: '2028-02-20' }
    well(await administrator.post(`/api/instruments/${id}/versions`).set('if-match', '"1"').send(next))
    await enter(T2)
    await demand({})
    expect(await claims()).toEqual([])
  })

  it('takes a later version of the same calibration as its correction', async () => {
    const { id } = await enter(T1)
    const { serial: _, ...mended } = { ...T1, due_on: '2026-04-01' }
    well(await administrator.post(`/api/instruments/${id}/versions`).set('if-match', '"1"').send(mended))
    await enter(T2)
    await demand({})
    expect(await told()).toEqual(['T1 instrument-other-calibration', 'T1 instrument-not-calibrated'])
  })

  it('tells an instrument that was retired before the inspection, and not one retired after', async () => {
    const first = await enter(T1)
    const second = await enter(T2)
    await demand({})
    const retire = (id: string) =>
      administrator
        .post(`/api/instruments/${id}/retire`)
        .set('if-match', '"1"')
        .send({ retired: true, reason: 'broken' })
    house.now = new Date('2026-04-20T12:00:00Z')
    well(await retire(first.id))
    house.now = new Date('2026-11-02T09:00:00Z')
    well(await retire(second.id))
    expect(await told()).toEqual(['T1 instrument-retired'])
  })

  it('tells another separation than the operator demanded on that day', async () => {
    await enter(T1)
    await enter(T2)
    const { id } = await demand({ separation: 'line poles' })
    expect(await claims()).toMatchObject([
      { claim: 'separation-other', severity: 'caution', anchor: 'supply/separation' },
    ])
    const later = { separation: 'all poles', stated_in: 'Sheet 9', valid_from: '2026-04-23' }
    well(await administrator.post(`/api/conditions/${id}/versions`).set('if-match', '"1"').send(later))
    expect(await told()).toEqual(['supply separation-other'])
    const earlier = { ...later, valid_from: '2026-04-22' }
    well(await administrator.post(`/api/conditions/${id}/versions`).set('if-match', '"2"').send(earlier))
    expect(await told()).toEqual([])
  })

  it('stops a file that opens the lines only, or says nothing, where all poles are demanded', async () => {
    await enter(T1)
    await enter(T2)
    await demand({})
    const lines = dairy.replace('required: all poles', 'required: line poles')
    expect(await claims(lines)).toMatchObject([{ claim: 'separation-other', severity: 'failure' }])
    const nothing = dairy.replace(/ {2}separation: .*\n/, '')
    expect(await claims(nothing)).toMatchObject([{ claim: 'separation-not-stated', severity: 'failure' }])
  })

  it('keeps a report from being approved while it contradicts a register', async () => {
    const reviewer = await house.signIn(await house.member(administrator.member.organisation, ['reviewer']))
    const { id } = await enter({ ...T1, due_on: '2026-09-02' })
    const report = well(await upload(installer, dairy)).body.id
    well(await act(installer, report, 'submit'))
    const standing = async () =>
      well(await reviewer.get(`/api/reports/${report}/review`)).body.blockers.filter(
        ({ kind }: { kind: string }) => kind === 'register',
      )
    expect(await standing()).toMatchObject([{ anchor: 'instrument/T1', message: expect.stringContaining('0417-A') }])
    expect((await act(reviewer, report, 'approve')).status).toBe(409)
    const { serial: _, ...mended } = T1
    well(await administrator.post(`/api/instruments/${id}/versions`).set('if-match', '"1"').send(mended))
    expect(await standing()).toEqual([])
  })
})
