import { randomBytes, randomUUID } from 'node:crypto'
import fc from 'fast-check'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { bytesOf } from '#server/files/bytes.ts'
import { CHUNK, type Checked, missing, type Upload, wholeOf } from '#server/files/upload.ts'
import { uploadWords } from '#server/files/upload-words.ts'
import { type Uploads, uploads } from '#server/files/uploads.ts'
import { OURS, sha256 } from './keys.ts'
import { LIMIT, type Opened, openDisk } from './stores.ts'
import { uploadLogInMemory } from './upload-log.ts'

const ME = { organisation: OURS, uploader: 'alder' }
const HOUR = 3_600_000

let opened: Opened
beforeAll(async () => {
  opened = await openDisk()
})
afterAll(() => opened.close())

function desk(): { readonly desk: Uploads; readonly pass: (ms: number) => void } {
  let time = Date.parse('2026-05-04T08:00:00Z')
  const now = (): Date => new Date(time)
  const made = uploads({
    log: uploadLogInMemory(),
    store: opened.store,
    now,
    newId: randomUUID,
    limit: LIMIT,
    lifetime: 24 * HOUR,
  })
  return {
    desk: made,
    pass: (ms) => {
      time += ms
    },
  }
}

const declaredFor = (bytes: Uint8Array) => ({ name: 'board.jpg', size: bytes.length, sha256: sha256(bytes) })

function value(checked: Checked<Upload>): Upload {
  if (!checked.ok) throw new Error(uploadWords(checked.problem))
  return checked.value
}

const problem = (checked: Checked<Upload>) => (checked.ok ? 'taken' : checked.problem)

const partAt = (bytes: Uint8Array, offset: number): Uint8Array => bytes.subarray(offset, offset + CHUNK)

const stored = async (upload: Upload): Promise<string | undefined> => {
  const bytes = await bytesOf(opened.store, wholeOf(upload), LIMIT)
  return bytes && sha256(bytes)
}

describe('an upload', () => {
  it.each([
    ['nothing', { size: 0 }, { code: 'empty' }],
    ['less than nothing', { size: -1 }, { code: 'empty' }],
    ['half a byte', { size: 0.5 }, { code: 'empty' }],
    ['one byte too many', { size: LIMIT + 1 }, { code: 'too-large', limit: LIMIT }],
    ['a hash of the wrong form', { sha256: '../../x' }, { code: 'bad-hash' }],
  ])('is not begun when it declares %s', async (_, change, expected) => {
    const declared = { ...declaredFor(Buffer.from('x')), ...change }
    expect(problem(await desk().desk.declare(ME, declared))).toEqual(expected)
  })

  it.each([
    ['beside the cuts', 1, CHUNK, { code: 'bad-offset', offset: 1 }],
    ['before the file', -CHUNK, CHUNK, { code: 'bad-offset', offset: -CHUNK }],
    ['behind the file', 3 * CHUNK, 1, { code: 'bad-offset', offset: 3 * CHUNK }],
    ['at no number', Number.NaN, 1, { code: 'bad-offset', offset: Number.NaN }],
    ['and is cut off', 0, CHUNK - 1, { code: 'bad-length', expected: CHUNK, found: CHUNK - 1 }],
    ['and is too long for the last', 2 * CHUNK, 11, { code: 'bad-length', expected: 10, found: 11 }],
  ])('refuses a part that begins %s', async (_, offset, length, expected) => {
    const bytes = randomBytes(2 * CHUNK + 10)
    const { desk: made } = desk()
    const { id } = value(await made.declare(ME, declaredFor(bytes)))
    expect(problem(await made.takePart(ME, id, offset, new Uint8Array(length)))).toEqual(expected)
  })

  it('is not there for another uploader or another organisation', async () => {
    const bytes = randomBytes(10)
    const { desk: made } = desk()
    const { id } = value(await made.declare(ME, declaredFor(bytes)))
    for (const other of [
      { ...ME, uploader: 'osier' },
      { ...ME, organisation: 'other' },
    ]) {
      expect(problem(await made.find(other, id))).toEqual({ code: 'unknown' })
      expect(problem(await made.takePart(other, id, 0, bytes))).toEqual({ code: 'unknown' })
      expect(problem(await made.complete(other, id))).toEqual({ code: 'unknown' })
    }
  })

  it('gives nobody a file for knowing its hash', async () => {
    const bytes = randomBytes(10)
    const { desk: made } = desk()
    const mine = value(await made.declare(ME, declaredFor(bytes)))
    await made.takePart(ME, mine.id, 0, bytes)
    await made.complete(ME, mine.id)
    const theirs = value(await made.declare({ ...ME, uploader: 'osier' }, declaredFor(bytes)))
    expect(theirs.state).toBe('open')
    expect(missing(theirs)).toEqual([0])
  })

  it('is not completed while parts are missing, and says which', async () => {
    const bytes = randomBytes(3 * CHUNK)
    const { desk: made } = desk()
    const { id } = value(await made.declare(ME, declaredFor(bytes)))
    await made.takePart(ME, id, CHUNK, partAt(bytes, CHUNK))
    expect(problem(await made.complete(ME, id))).toEqual({ code: 'incomplete', missing: [0, 2 * CHUNK] })
  })

  it('is not completed with other content, asks for all of it again, and then completes', async () => {
    const bytes = randomBytes(CHUNK + 5)
    const { desk: made } = desk()
    const upload = value(await made.declare(ME, declaredFor(bytes)))
    await made.takePart(ME, upload.id, 0, randomBytes(CHUNK))
    await made.takePart(ME, upload.id, CHUNK, partAt(bytes, CHUNK))
    expect(problem(await made.complete(ME, upload.id))).toEqual({ code: 'other-content' })
    expect(await stored(upload)).toBeUndefined()
    expect(missing(value(await made.find(ME, upload.id)))).toEqual([0, CHUNK])
    for (const offset of [0, CHUNK]) await made.takePart(ME, upload.id, offset, partAt(bytes, offset))
    expect(value(await made.complete(ME, upload.id)).state).toBe('complete')
    expect(await stored(upload)).toBe(upload.sha256)
  })

  it('is over when its time is over, and may be begun again', async () => {
    const bytes = randomBytes(10)
    const { desk: made, pass } = desk()
    const first = value(await made.declare(ME, declaredFor(bytes)))
    pass(24 * HOUR)
    expect(problem(await made.takePart(ME, first.id, 0, bytes))).toEqual({ code: 'expired' })
    expect(problem(await made.complete(ME, first.id))).toEqual({ code: 'expired' })
    expect(value(await made.declare(ME, declaredFor(bytes))).id).not.toBe(first.id)
  })

  it.each([10, 50, 90])('goes on after the line was cut at %i %%, with what is missing', async (percent) => {
    const bytes = randomBytes(900_000)
    const { desk: made } = desk()
    const begun = value(await made.declare(ME, declaredFor(bytes)))
    const sent = Math.floor((bytes.length * percent) / 100)
    for (let offset = 0; offset + CHUNK <= sent; offset += CHUNK)
      await made.takePart(ME, begun.id, offset, partAt(bytes, offset))
    const again = value(await made.declare(ME, declaredFor(bytes)))
    expect(again.id).toBe(begun.id)
    for (const offset of missing(again)) await made.takePart(ME, again.id, offset, partAt(bytes, offset))
    value(await made.complete(ME, again.id))
    expect(await stored(again)).toBe(sha256(bytes))
  })

  it('gives the declared file, whatever the order, repetition and parallel arrival of its parts', async () => {
    const order = fc.array(fc.nat({ max: 3 }), { maxLength: 12 })
    const size = fc.integer({ min: 1, max: 3 * CHUNK + 100 })
    await fc.assert(
      fc.asyncProperty(order, size, fc.boolean(), async (places, length, together) => {
        const bytes = randomBytes(length)
        const { desk: made } = desk()
        const { id } = value(await made.declare(ME, declaredFor(bytes)))
        const offsets = [...places, 3, 1, 2, 0].map((place) => place * CHUNK).filter((offset) => offset < length)
        const send = (offset: number) => made.takePart(ME, id, offset, partAt(bytes, offset))
        if (together) await Promise.all(offsets.map(send))
        else for (const offset of offsets) await send(offset)
        const done = await Promise.all([made.complete(ME, id), made.complete(ME, id)])
        for (const upload of done) expect(value(upload).state).toBe('complete')
        expect(await stored(value(await made.complete(ME, id)))).toBe(sha256(bytes))
        expect(value(await send(0)).state).toBe('complete')
      }),
      { numRuns: 25 },
    )
  })
})
