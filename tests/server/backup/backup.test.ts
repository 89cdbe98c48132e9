import { appendFileSync, existsSync, mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest'
import { backUp } from '#server/backup/backup.ts'
import { sha256Of } from '#server/backup/manifest.ts'
import { restore } from '#server/backup/restore.ts'
import { openDatabase } from '#server/db.ts'
import { diskStore } from '#server/files/disk-store.ts'
import { objectKey } from '#server/files/object-key.ts'
import { checkOrganisation } from '#server/jobs/check-records.ts'
import { dropDatabase, emptyDatabase } from '#server/setup/databases.ts'
import { type House, openHouse, source } from '#tests/server/house.ts'
import { postgresBin } from '#tools/setup/postgres.mjs'

const bin = postgresBin()
const now = new Date('2026-11-02T02:00:00Z')

let house: House
let organisation: string
let folder: string
let photo: Buffer

const elsewhere = (name: string) =>
  diskStore({ root: join(folder, name), newId: () => crypto.randomUUID(), limit: 1 << 24 })

beforeAll(async () => {
  house = await openHouse()
  folder = mkdtempSync(join(tmpdir(), 'skerry-backup-'))
  organisation = await house.organisation()
  const installer = await house.signIn(await house.member(organisation, ['installer']))
  for (const name of ['alder-mill-bakery', 'tern-farm-tt'])
    await installer
      .post('/api/reports?file_name=site.skerry.yaml')
      .set('content-type', 'application/yaml')
      .set('idempotency-key', `backup ${name}`)
      .send(source(name))
  photo = Buffer.from('the bytes of a photo')
  await house.services.store.put(objectKey({ organisation, kind: 'photo', sha256: sha256Of(photo) }), photo)
})
afterAll(async () => {
  rmSync(folder, { recursive: true })
  await house.close()
})

const make = (name: string, url = house.addresses.backup) =>
  backUp({ url, bin, store: house.services.store, folder: join(folder, name), now })

describe('a backup', () => {
  it('is refused under a role whose dump would have no rows, and leaves no folder behind', async () => {
    await expect(make('fenced', house.addresses.web)).rejects.toThrow('bound by row-level security')
    expect(existsSync(join(folder, 'fenced'))).toBe(false)
  })

  it('that was changed or cut off is not restored', async () => {
    await make('spoilt')
    appendFileSync(join(folder, 'spoilt', 'database.dump'), 'x')
    const target = await emptyDatabase(inject('postgres'), 'restore_spoilt')
    const options = {
      owner: target.owner,
      reader: target.backup,
      bin,
      store: elsewhere('spoilt-files'),
      folder: join(folder, 'spoilt'),
    }
    await expect(restore(options)).rejects.toThrow('changed or cut off')
    await dropDatabase(inject('postgres'), 'restore_spoilt')
  })

  it('is not restored over a database that holds something', async () => {
    await make('second')
    const options = {
      owner: house.addresses.owner,
      reader: house.addresses.backup,
      bin,
      store: elsewhere('none'),
      folder: join(folder, 'second'),
    }
    await expect(restore(options)).rejects.toThrow('not empty')
  })

  it('comes back whole: rows, files, chain, fences', async () => {
    const manifest = await make('good')
    expect(manifest.rows).toMatchObject({ organisations: 1, people: 1, reports: 2, revisions: 2 })
    expect(manifest.files).toEqual([`${organisation}/photo/${sha256Of(photo)}`])
    const target = await emptyDatabase(inject('postgres'), 'restore_good')
    const store = elsewhere('restored-files')
    await restore({ owner: target.owner, reader: target.backup, bin, store, folder: join(folder, 'good') })
    const db = openDatabase({ url: target.web, pool: 2, name: 'restored' })
    try {
      expect(await checkOrganisation({ db, store }, organisation)).toEqual([])
      expect(await db('reports').select('report_id')).toEqual([])
      await expect(db('audit_events').delete()).rejects.toThrow('permission denied')
    } finally {
      await db.destroy()
      await dropDatabase(inject('postgres'), 'restore_good')
    }
  })
})
