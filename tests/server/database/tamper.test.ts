import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { inOrganisation } from '#server/db.ts'
import { drain } from '#tests/server/drain.ts'
import { type Browser, type House, openHouse, source } from '#tests/server/house.ts'
import { act, approved, decideAll, issue, remark, upload, well } from '#tests/server/life.ts'

let house: House
let organisation: string
let installer: Browser
let reviewer: Browser

/** What is kept as it was written. */
const APPEND_ONLY = [
  'revisions',
  'acceptances',
  'files',
  'documents',
  'seals',
  'register_entries',
  'register_nodes',
  'checkpoints',
  'audit_events',
] as const

beforeAll(async () => {
  house = await openHouse()
  organisation = await house.organisation('TAM')
  installer = await house.signIn(await house.member(organisation, ['installer']))
  reviewer = await house.signIn(await house.member(organisation, ['reviewer']))
  well(await issue(reviewer, await approved(installer, reviewer, source('fell-side-dairy'))))
  await drain(house.services)
})
afterAll(() => house.close())

const attempt = (sql: string): Promise<unknown> =>
  inOrganisation(house.services.db, organisation, async (tx) => await tx.raw(sql))

describe.each(APPEND_ONLY)('%s', (table) => {
  it.each([
    ['changed', `update ${table} set organisation_id = organisation_id`],
    ['deleted', `delete from ${table}`],
    ['emptied', `truncate ${table} cascade`],
  ])('cannot be %s by the running server', async (_word, sql) => {
    await expect(attempt(sql)).rejects.toThrow(/permission denied|kept as it was written/)
  })

  it('cannot have its triggers taken off by the running server', async () => {
    await expect(attempt(`alter table ${table} disable trigger all`)).rejects.toThrow(/must be owner/)
    await expect(attempt(`set session_replication_role = replica`)).rejects.toThrow(/permission denied/)
  })
})

describe('what was issued', () => {
  it.each([
    [
      'another number',
      `update reports set number = 'TAM-2026-0002' where state = 'issued'`,
      /a number once given stays/,
    ],
    ['another revision', `update reports set revision = revision + 1 where state = 'issued'`, /keeps its revision/],
    [
      'another state',
      `update reports set state = 'draft', number = null where state = 'issued'`,
      /cannot go from issued to draft/,
    ],
    [
      'no place among the reports',
      `update reports set discarded_at = now() where state = 'issued'`,
      /keeps its revision/,
    ],
    ['no row', `delete from reports where state = 'issued'`, /permission denied/],
    ['another author', 'update reports set created_by = reviewer_id', /permission denied/],
  ])('gets %s from nobody', async (_what, sql, words) => {
    await expect(attempt(sql)).rejects.toThrow(words)
  })

  it('keeps the counter from being made anew', async () => {
    await expect(attempt('delete from counters')).rejects.toThrow(/permission denied/)
    await expect(attempt('delete from register_heads')).rejects.toThrow(/permission denied/)
    await expect(
      attempt(
        `insert into audit_events (organisation_id, sequence, at, action, subject, body) values ('${organisation}', 1, now(), 'x', 'x', 'x')`,
      ),
    ).rejects.toThrow(/permission denied/)
  })
})

describe('what was said', () => {
  it('stays as it was said once it is published', async () => {
    const report = well(await upload(installer, source('fell-side-dairy'))).body.id
    well(await act(installer, report, 'submit'))
    await decideAll(reviewer, report)
    well(await remark(reviewer, report, 'remark'))
    well(await act(reviewer, report, 'review', { decision: 'remarks' }))
    const words = /stays as it was said/
    await expect(attempt(`update remarks set body = 'something else'`)).rejects.toThrow(words)
    await expect(attempt('delete from remarks')).rejects.toThrow(words)
    await expect(attempt('delete from threads')).rejects.toThrow(words)
  })
})
