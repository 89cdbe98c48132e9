import { randomBytes } from 'node:crypto'
import { chmod, readdir, readFile, writeFile } from 'node:fs/promises'
import { join } from 'node:path'
import { Readable } from 'node:stream'
import { buffer } from 'node:stream/consumers'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { bytesOf } from '#server/files/bytes.ts'
import { type ObjectKey, objectKey } from '#server/files/object-key.ts'
import { reconcile } from '#server/files/reconcile.ts'
import { DamagedObject } from '#server/files/store.ts'
import { sweepPassing } from '#server/files/sweep.ts'
import { collected, keyFor, OURS, sha256 } from './keys.ts'
import { LIMIT, type Opened, openDisk, openS3 } from './stores.ts'

const STORES = [
  { name: 'a folder of the disk', open: openDisk },
  { name: 'an S3 service', open: openS3 },
] as const

/** Every file behind a store, so that nothing visible and nothing left over can be told apart. */
async function filesBehind({ folder }: Opened): Promise<string[]> {
  const found = await readdir(folder, { recursive: true, withFileTypes: true })
  return found.filter((entry) => entry.isFile()).map((entry) => join(entry.parentPath, entry.name))
}

/** Text that tries to be a key. */
const HOSTILE = [
  '',
  '/',
  '..',
  '../../etc/passwd',
  `../source/${'a'.repeat(64)}`,
  `fennmark/../source/${'a'.repeat(64)}`,
  `fennmark/source/../../${'a'.repeat(64)}`,
  `fennmark/source/${'a'.repeat(64)}/..`,
  `fennmark/source/${'a'.repeat(63)}`,
  `fennmark/source/${'A'.repeat(64)}`,
  `fennmark/source/${'a'.repeat(64)}\0.jpg`,
  `fennmark/source/${'a'.repeat(64)}\n`,
  `fennmark/__proto__/${'a'.repeat(64)}`,
  `fennmark/constructor/${'a'.repeat(64)}`,
  `.partial/source/${'a'.repeat(64)}`,
  `fenn%2fmark/source/${'a'.repeat(64)}`,
  `fennmark\\source\\${'a'.repeat(64)}`,
  `FENNMARK/source/${'a'.repeat(64)}`,
  `-fennmark/source/${'a'.repeat(64)}`,
  `fennmark//${'a'.repeat(64)}`,
]

describe.each(STORES)('objects in $name', ({ open }) => {
  let opened: Opened
  beforeAll(async () => {
    opened = await open()
  })
  afterAll(() => opened.close())

  it.each(HOSTILE)('go nowhere by the text %j', async (text) => {
    const { store } = opened
    const hostile = text as ObjectKey
    const before = await filesBehind(opened)
    await expect(store.put(hostile, Buffer.from('x'))).rejects.toThrow('Not the key')
    await expect(store.get(hostile)).rejects.toThrow('Not the key')
    await expect(store.head(hostile)).rejects.toThrow('Not the key')
    await expect(store.delete(hostile)).rejects.toThrow('Not the key')
    expect(await filesBehind(opened)).toEqual(before)
  })

  it('are refused when the bytes are not what the key names, and leave nothing behind', async () => {
    const key = keyFor(Buffer.from('what was announced'))
    const other = Buffer.from('what came instead')
    const before = await filesBehind(opened)
    for (const body of [other, Readable.from([other])])
      expect(await opened.store.put(key, body)).toEqual({ ok: false, reason: 'other content', sha256: sha256(other) })
    expect(await opened.store.head(key)).toBeUndefined()
    expect(await filesBehind(opened)).toEqual(before)
  })

  it('are refused above the limit, and one byte below it is taken', async () => {
    const [most, over] = [randomBytes(LIMIT), randomBytes(LIMIT + 1)]
    expect(await opened.store.put(keyFor(over), over)).toEqual({ ok: false, reason: 'too large', limit: LIMIT })
    expect(await opened.store.head(keyFor(over))).toBeUndefined()
    expect(await opened.store.put(keyFor(most), most)).toEqual({ ok: true, size: LIMIT })
  })

  it.each([0, 1, 50, 99])('show nothing of a stream that breaks off after %i %%', async (percent) => {
    const bytes = randomBytes(200_000)
    const before = await filesBehind(opened)
    async function* broken(): AsyncGenerator<Buffer> {
      yield bytes.subarray(0, (bytes.length * percent) / 100)
      throw new Error('the line went dead')
    }
    await expect(opened.store.put(keyFor(bytes), Readable.from(broken()))).rejects.toThrow('the line went dead')
    expect(await opened.store.head(keyFor(bytes))).toBeUndefined()
    expect(await filesBehind(opened)).toEqual(before)
  })

  it('never arrive whole when they were altered or cut where they lie', async () => {
    const bytes = randomBytes(300_000)
    const key = keyFor(bytes, 'document')
    await opened.store.put(key, bytes)
    const behind = (await filesBehind(opened)).filter((file) => file.includes(sha256(bytes)))
    const file = (await Promise.all(behind.map(async (path) => ({ path, size: (await readFile(path)).length }))))
      .filter(({ size }) => size === bytes.length)
      .map(({ path }) => path)[0]
    if (file === undefined) throw new Error('The object has no file behind it.')
    await chmod(file, 0o600)
    for (const spoilt of [Buffer.concat([bytes.subarray(0, -1), Buffer.from([0])]), bytes.subarray(0, 250_000)]) {
      await writeFile(file, spoilt)
      const object = await opened.store.get(key)
      let arrived = 0
      await expect(async () => {
        for await (const chunk of object?.stream ?? []) arrived += chunk.length
      }).rejects.toThrow(DamagedObject)
      expect(arrived).toBeLessThan(spoilt.length)
      await expect(bytesOf(opened.store, key, LIMIT)).rejects.toThrow(DamagedObject)
    }
    expect(await opened.store.put(key, bytes)).toEqual({ ok: true, size: bytes.length })
    expect((await bytesOf(opened.store, key, LIMIT))?.equals(bytes)).toBe(true)
  })

  it.each([0, 1, 65_536, 300_001])('come back byte for byte: %i bytes, whole or as a stream', async (size) => {
    const bytes = randomBytes(size)
    const key = keyFor(bytes, 'photo')
    async function* pieces(): AsyncGenerator<Buffer> {
      for (let at = 0; at < size; at += 7_001) yield bytes.subarray(at, at + 7_001)
    }
    for (const body of [bytes, Readable.from(pieces())]) {
      expect(await opened.store.put(key, body)).toEqual({ ok: true, size })
      const object = await opened.store.get(key)
      expect(object).toMatchObject({ key, size, type: 'image/jpeg' })
      expect((await buffer(object?.stream ?? Readable.from([]))).equals(bytes)).toBe(true)
    }
  })

  it('may be stored by many at once: one object, whole', async () => {
    const bytes = randomBytes(100_000)
    const key = keyFor(bytes, 'attachment')
    const all = await Promise.all(Array.from({ length: 8 }, () => opened.store.put(key, Readable.from([bytes]))))
    expect(all).toEqual(Array.from({ length: 8 }, () => ({ ok: true, size: bytes.length })))
    expect(await collected(opened.store.list({ organisation: OURS, kind: 'attachment' }))).toHaveLength(1)
  })

  it('are not missed: nothing is found, and deleting nothing is content', async () => {
    const key = keyFor(randomBytes(8), 'facts', 'nobody')
    expect(await opened.store.get(key)).toBeUndefined()
    expect(await opened.store.head(key)).toBeUndefined()
    await opened.store.delete(key)
    const bytes = randomBytes(9)
    await opened.store.put(keyFor(bytes), bytes)
    await opened.store.delete(keyFor(bytes))
    expect(await opened.store.head(keyFor(bytes))).toBeUndefined()
  })

  it('are listed in the order of their keys, within one organisation and kind, and no other that begins alike', async () => {
    const put = async (organisation: string, kind: 'photo' | 'photo-paper'): Promise<ObjectKey> => {
      const bytes = randomBytes(10)
      await opened.store.put(keyFor(bytes, kind, organisation), bytes)
      return keyFor(bytes, kind, organisation)
    }
    const ours = [await put('tern', 'photo'), await put('tern', 'photo-paper'), await put('tern', 'photo')]
    for (const neighbour of ['tern-hill', 'tern0']) await put(neighbour, 'photo')
    const keys = async (within: Parameters<typeof opened.store.list>[0]) =>
      (await collected(opened.store.list(within))).map(({ key }) => key)
    expect(await keys({ organisation: 'tern' })).toEqual([...ours].sort())
    expect(await keys({ organisation: 'tern', kind: 'photo' })).toEqual([ours[0], ours[2]].sort())
    expect(await keys({ organisation: 'ter' })).toEqual([])
    await expect(keys({ organisation: '../tern' })).rejects.toThrow('organisation')
  })

  it('are told apart from the record: what lacks a file, what lacks a row', async () => {
    const [kept, lost, stray] = [randomBytes(11), randomBytes(12), randomBytes(13)]
    const key = (bytes: Uint8Array): ObjectKey => keyFor(bytes, 'document', 'osier')
    for (const bytes of [kept, stray]) await opened.store.put(key(bytes), bytes)
    const rows = [key(kept), key(kept), key(lost)].sort()
    const differences = (before: Date) =>
      collected(reconcile(opened.store, { organisation: 'osier' }, Readable.from(rows), before))
    const later = new Date(Date.now() + 60_000)
    const expected = [
      { is: 'missing', key: key(lost) },
      { is: 'unrecorded', key: key(stray), size: 13, written: expect.any(Date) },
    ]
    expect(await differences(later)).toHaveLength(2)
    expect(await differences(later)).toEqual(expect.arrayContaining(expected))
    expect(await differences(new Date(0))).toEqual([expected[0]])
  })

  it('of uploads that nobody finished are swept by age, and nothing else', async () => {
    const [part, whole, photo] = [randomBytes(21), randomBytes(22), randomBytes(23)]
    await opened.store.put(keyFor(part, 'chunk', 'heron'), part)
    await opened.store.put(keyFor(whole, 'upload', 'heron'), whole)
    await opened.store.put(keyFor(photo, 'photo', 'heron'), photo)
    expect(await sweepPassing(opened.store, 'heron', new Date(0))).toBe(0)
    expect(await sweepPassing(opened.store, 'heron', new Date(Date.now() + 60_000))).toBe(2)
    const left = await collected(opened.store.list({ organisation: 'heron' }))
    expect(left.map(({ key }) => key)).toEqual([keyFor(photo, 'photo', 'heron')])
  })
})

describe('a key', () => {
  it('refuses parts that could lead elsewhere', () => {
    const sha = 'a'.repeat(64)
    expect(() => objectKey({ organisation: '../x', kind: 'photo', sha256: sha })).toThrow('organisation')
    expect(() => objectKey({ organisation: 'x', kind: 'toString' as 'photo', sha256: sha })).toThrow('kind')
    expect(() => objectKey({ organisation: 'x', kind: 'photo', sha256: '../a' })).toThrow('SHA-256')
  })
})
