import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { inOrganisation } from '#server/db.ts'
import { remind } from '#server/jobs/remind.ts'
import { type Browser, type House, openHouse, source } from '#tests/server/house.ts'
import { act, approved, issue, well } from '#tests/server/life.ts'

let house: House
let organisation: string
let administrator: Browser
let installer: Browser
let reviewer: Browser

// The house's clock stands at 2026-11-02.
const dairy = source('fell-side-dairy').replace('next_due: 2029-04-21', 'next_due: 2026-12-20')

beforeAll(async () => {
  house = await openHouse()
  organisation = await house.organisation('DUE')
  administrator = await house.signIn(await house.member(organisation, ['administrator']))
  installer = await house.signIn(await house.member(organisation, ['installer']))
  reviewer = await house.signIn(await house.member(organisation, ['reviewer']))
})
afterAll(() => house.close())

const mails = (): Promise<{ kind: string; to_person: string; dedupe_key: string }[]> =>
  inOrganisation(house.services.db, organisation, (tx) =>
    tx('mails')
      .where({ organisation_id: organisation })
      .whereLike('kind', '% due')
      .select('kind', 'to_person', 'dedupe_key'),
  )

async function instrument(serial: string, due_on: string): Promise<string> {
  const body = { serial, kind: 'loop tester', calibrated_on: '2025-01-01', due_on }
  return well(await administrator.post('/api/instruments').send(body)).body.id
}

describe('reminders', () => {
  it('go out once for each person, thing and stage, also when two workers run at once', async () => {
    const soon = await instrument('SOON', '2026-11-16')
    await instrument('FAR', '2027-06-01')
    await Promise.all([remind(house.services, {}), remind(house.services, {})])
    await remind(house.services, {})
    expect(await mails()).toEqual([
      {
        kind: 'calibration due',
        to_person: administrator.member.id,
        dedupe_key: `due/calibration/${soon}/2026-11-16/soon/${administrator.member.id}`,
      },
    ])
  })

  it('go out again at the next stage, and begin anew after a new calibration', async () => {
    const id = await instrument('NEXT', '2026-11-01')
    await remind(house.services, {})
    const body = { kind: 'loop tester', calibrated_on: '2026-11-02', due_on: '2026-12-30' }
    well(await administrator.post(`/api/instruments/${id}/versions`).set('if-match', '"1"').send(body))
    await remind(house.services, {})
    const keys = (await mails()).map(({ dedupe_key }) => dedupe_key).filter((key) => key.includes(id))
    expect(keys.map((key) => key.split('/').slice(3, 5).join(' ')).toSorted()).toEqual([
      '2026-11-01 overdue',
      '2026-12-30 ahead',
    ])
  })

  it('of a verification reach who made the report too, and stop once it is withdrawn', async () => {
    const report = await approved(installer, reviewer, dairy)
    await remind(house.services, {})
    expect((await mails()).filter(({ kind }) => kind === 'verification due')).toEqual([])
    well(await issue(reviewer, report))
    await remind(house.services, {})
    const told = (await mails()).filter(({ kind }) => kind === 'verification due')
    expect(told.map(({ to_person }) => to_person).toSorted()).toEqual(
      [administrator.member.id, installer.member.id].toSorted(),
    )
    const due = well(await installer.get('/api/due?kind=verification')).body.due
    expect(due).toMatchObject([{ id: report, mark: 'DUE-2026-0001', due_on: '2026-12-20', stage: 'ahead' }])
    well(
      await act(reviewer, report, 'withdraw', {
        reason: 'Wrong building.',
        password: 'a long password for tests only',
      }),
    )
    expect(well(await installer.get('/api/due?kind=verification')).body.due).toEqual([])
  })

  it('do not reach who has switched them off', async () => {
    await inOrganisation(house.services.db, organisation, (tx) =>
      tx('people')
        .where({ organisation_id: organisation, person_id: administrator.member.id })
        .update({ mail_switches: JSON.stringify({ 'calibration due': false }) }),
    )
    const before = (await mails()).length
    await instrument('SILENT', '2026-11-10')
    await remind(house.services, {})
    expect(await mails()).toHaveLength(before)
  })
})

describe('what falls due', () => {
  it('is listed the earliest first, page by page', async () => {
    const all = well(await installer.get('/api/due')).body.due
    expect(all.length).toBeGreaterThan(2)
    const days = all.map(({ due_on }: { due_on: string }) => due_on)
    expect(days).toEqual([...days].sort())
    const first = well(await installer.get('/api/due?limit=1')).body
    const second = well(await installer.get(`/api/due?limit=1&after=${first.next}`)).body
    expect([...first.due, ...second.due]).toEqual(all.slice(0, 2))
    expect(well(await installer.get('/api/due?until=2026-11-09')).body.due).toEqual([])
  })
})
