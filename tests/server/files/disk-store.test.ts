import { spawn } from 'node:child_process'
import { once } from 'node:events'
import { mkdir, mkdtemp, readdir, rm, stat, symlink, utimes, writeFile } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { setTimeout as wait } from 'node:timers/promises'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { bytesOf } from '#server/files/bytes.ts'
import { collected, keyFor, OURS } from './keys.ts'
import { LIMIT, type Opened, openDisk } from './stores.ts'

describe('a folder of objects', () => {
  let opened: Opened
  beforeAll(async () => {
    opened = await openDisk()
  })
  afterAll(() => opened.close())

  it('does not follow a planted link, neither of a folder nor of a file', async () => {
    const elsewhere = await mkdtemp(join(tmpdir(), 'skerry-elsewhere-'))
    const bytes = Buffer.from('planted')
    const key = keyFor(bytes, 'source', 'planted')
    await symlink(elsewhere, join(opened.folder, 'planted'))
    await expect(opened.store.put(key, bytes)).rejects.toThrow('link to another place')
    expect(await readdir(elsewhere, { recursive: true })).toEqual([])
    await rm(join(opened.folder, 'planted'))

    await writeFile(join(elsewhere, 'secret'), bytes)
    await mkdir(join(opened.folder, 'planted', 'source'), { recursive: true })
    await symlink(join(elsewhere, 'secret'), join(opened.folder, key))
    await expect(opened.store.get(key)).rejects.toThrow(/ELOOP/)
    await rm(elsewhere, { recursive: true })
  })

  it('keeps its files to itself, and read-only', async () => {
    const bytes = Buffer.from('issued')
    await opened.store.put(keyFor(bytes, 'document'), bytes)
    const file = join(opened.folder, keyFor(bytes, 'document'))
    expect((await stat(file)).mode & 0o777).toBe(0o440)
    expect((await stat(join(opened.folder, OURS))).mode & 0o777).toBe(0o700)
  })

  it('passes over what lies in it and is no object', async () => {
    await writeFile(join(opened.folder, OURS, 'document', 'notes.txt'), 'x')
    const listed = await collected(opened.store.list({ organisation: OURS, kind: 'document' }))
    expect(listed).toHaveLength(1)
  })

  it('sweeps temporary files of writers that died, and leaves those of writers at work', async () => {
    const aside = (name: string): string => join(opened.folder, '.partial', name)
    const old = new Date('2026-01-01T00:00:00Z')
    await writeFile(aside('dead'), 'x')
    await utimes(aside('dead'), old, old)
    await writeFile(aside('at-work'), 'x')
    expect(await opened.store.sweep(new Date('2026-01-02T00:00:00Z'))).toBe(1)
    expect(await readdir(join(opened.folder, '.partial'))).toEqual(['at-work'])
  })

  it('shows only whole objects, however often a writer is killed in the middle', async () => {
    for (let round = 0; round < 10; round += 1) {
      const writer = spawn(process.execPath, ['--import', 'tsx', 'tests/server/files/endless-writer.ts', opened.folder])
      await once(writer.stdout, 'data')
      await wait(5 + round * 7)
      writer.kill('SIGKILL')
      await once(writer, 'close')
    }
    const objects = await collected(opened.store.list({ organisation: OURS, kind: 'source' }))
    expect(objects.length).toBeGreaterThan(0)
    for (const { key } of objects) expect((await bytesOf(opened.store, key, LIMIT))?.length).toBe(150_000)
    await opened.store.sweep(new Date(Date.now() + 60_000))
    expect(await readdir(join(opened.folder, '.partial'))).toEqual([])
  })
})
