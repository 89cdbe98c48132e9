import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { inOrganisation } from '#server/db.ts'
import { type Browser, type House, openHouse, source, whole } from '#tests/server/house.ts'
import { upload, well } from '#tests/server/life.ts'
import { asOwner } from '#tests/server/tamper.ts'

let house: House
let organisation: string
let administrator: Browser
let installer: Browser
let stranger: Browser

beforeAll(async () => {
  house = await openHouse()
  stranger = await house.signIn(await house.member(await house.organisation(), ['administrator']))
})
beforeEach(async () => {
  organisation = await house.organisation()
  administrator = await house.signIn(await house.member(organisation, ['administrator']))
  installer = await house.signIn(await house.member(organisation, ['installer']))
  for (let count = 0; count < 3; count += 1) well(await upload(installer, source('alder-mill-bakery')))
})
afterAll(() => house.close())

const verify = async (query = '') => well(await administrator.get(`/api/audit/verify${query}`)).body
const tamper = (work: Parameters<typeof asOwner>[3]) =>
  asOwner(house, organisation, ['audit_events', 'audit_heads'], work)

describe('the audit trail', () => {
  it('is read by auditors and administrators of the house only', async () => {
    expect((await installer.get('/api/audit')).status).toBe(403)
    const foreign = well(await stranger.get('/api/audit')).body.events
    expect(foreign.every(({ person }: { person: { id: string } | null }) => person?.id === stranger.member.id)).toBe(
      true,
    )
  })

  it('lists the newest first, by action, person, subject and time, page by page', async () => {
    const all = well(await administrator.get('/api/audit')).body.events
    const sequences = all.map(({ sequence }: { sequence: number }) => sequence)
    expect(sequences).toEqual([...sequences].sort((a, b) => b - a))
    const uploads = well(await administrator.get(`/api/audit?action=create-report&person=${installer.member.id}`)).body
    expect(uploads.events).toHaveLength(3)
    expect(uploads.events[0]).toMatchObject({ roles: ['installer'], person: { name: installer.member.name } })
    const page = well(await administrator.get('/api/audit?action=create-report&limit=2')).body
    const rest = well(await administrator.get(`/api/audit?action=create-report&limit=2&after=${page.next}`)).body
    expect([...page.events, ...rest.events]).toEqual(uploads.events)
    expect(rest.next).toBeNull()
    expect(well(await administrator.get('/api/audit?to=2026-11-02T09:00:00Z')).body.events).toEqual([])
    expect((await administrator.get('/api/audit?person=nobody')).status).toBe(400)
  })

  it('goes out as a table, which leaves an event of its own', async () => {
    const table = (await whole(administrator.get('/api/audit.csv?action=create-report'))).toString('utf8')
    expect(table.trimEnd().split('\r\n')).toHaveLength(4)
    expect(well(await administrator.get('/api/audit?action=export-audit-events')).body.events).toHaveLength(1)
  })
})

describe('the chain of the trail', () => {
  it('holds while nobody tampers', async () => {
    const verdict = await verify()
    expect(verdict).toMatchObject({ ok: true, broken: null })
    expect(verdict.events).toBe(verdict.last)
    expect(verdict.events).toBeGreaterThan(3)
  })

  it('cannot be written by the running server, not even to mend it', async () => {
    await expect(
      inOrganisation(house.services.db, organisation, (tx) => tx('audit_events').update({ action: 'nothing' })),
    ).rejects.toThrow()
    await expect(
      inOrganisation(house.services.db, organisation, (tx) => tx('audit_heads').update({ last: 0 })),
    ).rejects.toThrow(/permission denied/)
  })

  it('shows a changed text, a changed column, a removed event and a swapped pair', async () => {
    const attacks: readonly [number, Parameters<typeof asOwner>[3]][] = [
      [
        2,
        (tx) =>
          tx.raw(
            `update audit_events set body = replace(body, '"address":"', '"address":"1') where organisation_id = ? and sequence = 2`,
            [organisation],
          ),
      ],
      [
        3,
        (tx) => tx('audit_events').where({ organisation_id: organisation, sequence: 3 }).update({ action: 'nothing' }),
      ],
      [2, (tx) => tx('audit_events').where({ organisation_id: organisation, sequence: 2 }).delete()],
      [1, (tx) => tx('audit_events').where({ organisation_id: organisation, sequence: 1 }).delete()],
      [
        2,
        (tx) =>
          tx.raw(
            `update audit_events a set body = b.body, hash = b.hash from audit_events b
             where a.organisation_id = :o and b.organisation_id = :o
               and ((a.sequence = 2 and b.sequence = 3) or (a.sequence = 3 and b.sequence = 2))`,
            { o: organisation },
          ),
      ],
    ]
    const kept = await inOrganisation(house.services.db, organisation, (tx) =>
      tx('audit_events').where({ organisation_id: organisation }).orderBy('sequence').select('*'),
    )
    for (const [sequence, attack] of attacks) {
      expect((await verify()).ok).toBe(true)
      await tamper(attack)
      expect(await verify()).toMatchObject({ ok: false, broken: { sequence } })
      await tamper(async (tx) => {
        await tx('audit_events').where({ organisation_id: organisation }).delete()
        await tx('audit_events').insert(kept)
      })
    }
  })

  it('shows a tail that was cut, also with the head rewound when a link was noted before', async () => {
    const { last, hash } = await verify()
    await tamper((tx) => tx('audit_events').where({ organisation_id: organisation, sequence: last }).delete())
    expect(await verify()).toMatchObject({ ok: false, broken: { sequence: last } })
    await tamper((tx) =>
      tx.raw(
        `update audit_heads h set last = e.sequence, hash = e.hash from audit_events e
         where e.organisation_id = h.organisation_id and h.organisation_id = ? and e.sequence = ?`,
        [organisation, last - 1],
      ),
    )
    expect((await verify()).ok).toBe(true)
    const noted = await verify(`?known_sequence=${last}&known_hash=${hash}`)
    expect(noted).toMatchObject({ ok: false, broken: { sequence: last } })
  })

  it('shows a trail that was written anew from some event on, when a link was noted before', async () => {
    const { last, hash } = await verify()
    await tamper(async (tx) => {
      const rows = await tx('audit_events').where({ organisation_id: organisation }).orderBy('sequence').select('*')
      await tx('audit_events').where({ organisation_id: organisation }).delete()
      await tx('audit_heads').where({ organisation_id: organisation }).update({ last: 0, hash: '' })
      await tx.raw('alter table audit_events enable trigger chain')
      for (const { hash: _, sequence: place, ...row } of rows) {
        const body = place === 2 ? row.body.replace('"details"', '"details2"') : row.body
        await tx('audit_events').insert({ ...row, body })
      }
      await tx.raw('alter table audit_events disable trigger chain')
    })
    expect((await verify()).ok).toBe(true)
    expect(await verify(`?known_sequence=${last}&known_hash=${hash}`)).toMatchObject({
      ok: false,
      broken: { sequence: last },
    })
  })
})
