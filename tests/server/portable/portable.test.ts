import { createHash } from 'node:crypto'
import { Writable } from 'node:stream'
import { strFromU8, strToU8, unzipSync, zipSync } from 'fflate'
import createKnex, { type Knex } from 'knex'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { verifyAudit } from '#server/commands/verify-audit.ts'
import { inOrganisation } from '#server/db.ts'
import { checkOrganisation } from '#server/jobs/check-records.ts'
import { sealDocument } from '#server/jobs/seal-document.ts'
import { exportOrganisation } from '#server/portable/export.ts'
import { importOrganisation } from '#server/portable/import.ts'
import { LEFT_BEHIND, PORTABLE } from '#server/portable/tables.ts'
import { ownerConfig } from '#server/setup/owner.ts'
import { type House, openHouse, source } from '#tests/server/house.ts'
import { act, approved, issue, upload, well } from '#tests/server/life.ts'
import { soundRegister } from '#tests/server/registers.ts'

let house: House
let empty: House
let owner: Knex
let arrival: Knex
let organisation: string
let other: string
let archive: Buffer
const files = () => unzipSync(archive)

async function livedIn(mark: string): Promise<string> {
  const id = await house.organisation(mark)
  const administrator = await house.signIn(await house.member(id, ['administrator']))
  const installer = await house.signIn(await house.member(id, ['installer']))
  const reviewer = await house.signIn(await house.member(id, ['reviewer']))
  const instrument = { serial: `S-${mark}`, kind: 'tester', calibrated_on: '2026-01-01', due_on: '2027-01-01' }
  well(await administrator.post('/api/instruments').send(instrument))
  const report = await approved(installer, reviewer, source('fell-side-dairy'))
  well(await issue(reviewer, report))
  well(await upload(installer, source('tern-farm-tt')))
  const { documents } = well(await reviewer.get('/api/register')).body
  await sealDocument(house.services, { organisation: id, document: documents[0].document })
  well(
    await act(reviewer, report, 'withdraw', { reason: 'Wrong building.', password: 'a long password for tests only' }),
  )
  return id
}

async function exported(from: Knex, store: House['services']['store'], mark: string): Promise<Buffer> {
  const chunks: Buffer[] = []
  const out = new Writable({
    write(chunk: Buffer, _encoding, done) {
      chunks.push(chunk)
      done()
    },
  })
  const manifest = await exportOrganisation({ owner: from, store, mark, now: house.now }, out)
  expect(manifest).toBeDefined()
  return Buffer.concat(chunks)
}

beforeAll(async () => {
  house = await openHouse()
  empty = await openHouse()
  owner = createKnex(ownerConfig(house.addresses.owner))
  arrival = createKnex(ownerConfig(empty.addresses.owner))
  organisation = await livedIn('MOVE')
  other = await livedIn('STAY')
  archive = await exported(owner, house.services.store, 'MOVE')
}, 90_000)
afterAll(async () => {
  await owner.destroy()
  await arrival.destroy()
  await house.close()
  await empty.close()
})

const bring = (bytes: Uint8Array) => importOrganisation({ owner: arrival, store: empty.services.store }, bytes)

describe('the archive of an organisation', () => {
  it('forgets no table that holds rows of organisations', async () => {
    const { rows } = await owner.raw(
      `select table_name from information_schema.columns where table_schema = 'public' and column_name = 'organisation_id'`,
    )
    const known = [...PORTABLE.map(({ name }) => name), ...LEFT_BEHIND]
    expect(known.toSorted()).toEqual(rows.map(({ table_name }: { table_name: string }) => table_name).toSorted())
  })

  it('holds nothing of another organisation, and nothing that lets people in', () => {
    const text = Object.values(files())
      .map((bytes) => Buffer.from(bytes).toString('latin1'))
      .join('\n')
    expect(text).toContain(organisation)
    for (const foreign of [other, 'STAY', '$argon2']) expect(text).not.toContain(foreign)
  })

  it('names counts and hashes that anybody can check', () => {
    const { tables } = JSON.parse(strFromU8(files()['manifest.json'] ?? new Uint8Array()))
    for (const [name, { rows, sha256 }] of Object.entries<{ rows: number; sha256: string }>(tables)) {
      const lines = Buffer.from(files()[`tables/${name}.jsonl`] ?? [])
      expect(createHash('sha256').update(lines).digest('hex')).toBe(sha256)
      expect(lines.toString().split('\n').length - 1).toBe(rows)
    }
    expect(tables.documents.rows).toBe(1)
  })

  it('of an unknown mark is none', async () => {
    const out = new Writable({ write: (_chunk, _encoding, done) => done() })
    const wish = { owner, store: house.services.store, mark: 'NOBODY', now: house.now }
    expect(await exportOrganisation(wish, out)).toBeUndefined()
  })
})

describe('importing', () => {
  it('refuses what was changed on the way, and leaves the instance empty', async () => {
    const people = strFromU8(files()['tables/people.jsonl'] ?? new Uint8Array())
    const changed = zipSync({ ...files(), 'tables/people.jsonl': strToU8(people.replace('installer', 'reviewer')) })
    expect(await bring(changed)).toMatchObject({ ok: false, problem: expect.stringContaining('people') })
    const pdf = Object.keys(files()).find((name) => name.startsWith('objects/document/')) ?? ''
    const bytes = Uint8Array.from(files()[pdf] ?? [])
    bytes[500] = (bytes[500] ?? 0) ^ 1
    expect(await bring(zipSync({ ...files(), [pdf]: bytes }))).toMatchObject({
      ok: false,
      problem: expect.stringContaining(pdf),
    })
    expect(await bring(strToU8('no archive'))).toMatchObject({ ok: false })
    const { rows } = await arrival.raw('select any_organisation() as any')
    expect(rows[0].any).toBe(false)
  })

  it('brings everything: the same hashes, chain, register and files', async () => {
    expect(await bring(archive)).toMatchObject({ ok: true })
    const again = unzipSync(await exported(arrival, empty.services.store, 'MOVE'))
    expect(again).toEqual(files())
    const trail = (at: House) => inOrganisation(at.services.db, organisation, (tx) => verifyAudit(tx, organisation))
    expect(await trail(empty)).toEqual(await trail(house))
    expect((await trail(empty)).ok).toBe(true)
    expect((await soundRegister(empty.services, organisation)).map(({ kind }) => kind)).toEqual([
      'issued',
      'sealed',
      'withdrawn',
    ])
    expect(await checkOrganisation(empty.services, organisation)).toEqual([])
  })

  it('is refused where an organisation is already', async () => {
    expect(await bring(archive)).toMatchObject({ ok: false, problem: expect.stringContaining('already') })
  })

  it('leaves the walls standing: what is kept as it was written still is', async () => {
    await expect(
      inOrganisation(empty.services.db, organisation, (tx) => tx('documents').update({ number: 'MOVE-2026-0009' })),
    ).rejects.toThrow()
    const { rows } = await arrival.raw(`select count(*)::int as off from pg_trigger where tgenabled = 'D'`)
    expect(rows[0].off).toBe(0)
  })
})
