import { execFileSync } from 'node:child_process'
import { randomBytes } from 'node:crypto'
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { Readable, Writable } from 'node:stream'
import { buffer } from 'node:stream/consumers'
import { pipeline } from 'node:stream/promises'
import { setTimeout as wait } from 'node:timers/promises'
import { describe, expect, it } from 'vitest'
import { type ZipEntry, zipStream } from '#server/exports/zip.ts'
import { distinct, zipPath } from '#server/exports/zip-names.ts'
import { python } from '#tests/judges/python.ts'
import { sha256 } from '#tests/server/files/keys.ts'

const ISSUED = new Date('2026-05-04T10:15:30Z')

const entry = (path: readonly string[], bytes: Uint8Array, date = ISSUED): ZipEntry => ({
  path,
  date,
  open: () => Promise.resolve(Readable.from([bytes])),
})

const zipped = (entries: readonly ZipEntry[]): Promise<Buffer> => buffer(zipStream(entries))

/** What unzip makes of an archive: its words, or its failure as an exception. */
function unzipTest(archive: Uint8Array): string {
  const folder = mkdtempSync(join(tmpdir(), 'skerry-zip-'))
  try {
    writeFileSync(join(folder, 'a.zip'), archive)
    return execFileSync('unzip', ['-t', join(folder, 'a.zip')], { encoding: 'utf8', stdio: 'pipe' })
  } finally {
    rmSync(folder, { recursive: true })
  }
}

const LIST = `
import sys, io, json, zipfile, hashlib
z = zipfile.ZipFile(io.BytesIO(sys.stdin.buffer.read()))
print(json.dumps([[i.filename, list(i.date_time), hashlib.sha256(z.read(i)).hexdigest(), i.external_attr >> 16] for i in z.infolist()]))`

describe('an archive of documents', () => {
  it('is whole for two other programs, in the order of its names, with the times of the record', async () => {
    const [one, two] = [randomBytes(100_000), randomBytes(3)]
    const archive = await zipped([entry(['2026', 'FEN-2026-0002.pdf'], two), entry(['2026', 'FEN-2026-0001.pdf'], one)])
    expect(unzipTest(archive)).toContain('No errors detected')
    expect(python(LIST, archive)).toEqual([
      ['2026/FEN-2026-0001.pdf', [2026, 5, 4, 10, 15, 30], sha256(one), 0o100644],
      ['2026/FEN-2026-0002.pdf', [2026, 5, 4, 10, 15, 30], sha256(two), 0o100644],
    ])
  })

  it('is the same bytes for the same documents, in whatever order they come', async () => {
    const entries = Array.from({ length: 20 }, (_, index) => entry([`${index}.pdf`], randomBytes(1_000 + index)))
    const first = await zipped(entries)
    expect((await zipped([...entries].reverse())).equals(first)).toBe(true)
  })

  it('may hold nothing, an empty document, and a date before zip knew dates', async () => {
    expect(python(LIST, await zipped([]))).toEqual([])
    const archive = await zipped([entry(['a.txt'], Buffer.alloc(0), new Date(0))])
    expect(unzipTest(archive)).toContain('No errors detected')
    expect(python(LIST, archive)).toMatchObject([['a.txt', [1980, 1, 1, 0, 0, 0], expect.any(String), 0o100644]])
  })

  it('holds a thousand documents, one open at a time', async () => {
    let open = 0
    let most = 0
    const entries = Array.from({ length: 1_000 }, (_, index) => ({
      path: [`${index}.pdf`],
      date: ISSUED,
      open: () => {
        open += 1
        most = Math.max(most, open)
        const source = Readable.from([Buffer.from(String(index))])
        source.once('close', () => {
          open -= 1
        })
        return Promise.resolve(source)
      },
    }))
    const archive = await zipped(entries)
    expect(unzipTest(archive)).toContain('No errors detected')
    expect(most).toBeLessThanOrEqual(2)
    expect(open).toBe(0)
  })

  it.each([
    ['cannot be opened', () => Promise.reject(new Error('gone from the store'))],
    [
      'breaks off at once',
      () =>
        Promise.resolve(
          new Readable({
            read() {
              this.destroy(new Error('gone from the store'))
            },
          }),
        ),
    ],
    [
      'breaks off in the middle',
      () =>
        Promise.resolve(
          Readable.from(
            (async function* () {
              yield randomBytes(100_000)
              throw new Error('gone from the store')
            })(),
          ),
        ),
    ],
  ])('breaks off where a document %s, and no program takes it for whole', async (_, open) => {
    const chunks: Buffer[] = []
    const stream = zipStream([
      entry(['1.pdf'], randomBytes(200_000)),
      { path: ['2.pdf'], date: ISSUED, open },
      entry(['3.pdf'], Buffer.from('x')),
    ])
    await expect(async () => {
      for await (const chunk of stream) chunks.push(chunk)
    }).rejects.toThrow('gone from the store')
    expect(() => unzipTest(Buffer.concat(chunks))).toThrow()
  })

  it('is read from the store no faster than the reader takes it, and closes what is open when the reader leaves', async () => {
    let read = 0
    const endless = new Readable({
      read() {
        read += 65_536
        this.push(Buffer.alloc(65_536))
      },
    })
    const never = {
      path: ['b.pdf'],
      date: ISSUED,
      open: () => Promise.reject(new Error('opened after the reader left')),
    }
    const stream = zipStream([{ path: ['a.bin'], date: ISSUED, open: () => Promise.resolve(endless) }, never])
    let taken = 0
    const slow = new Writable({
      highWaterMark: 1,
      write(chunk: Buffer, _encoding, done) {
        taken += chunk.length
        if (taken > 2_000_000) return done(new Error('the reader left'))
        setTimeout(done, 1)
      },
    })
    await expect(pipeline(stream, slow)).rejects.toThrow('the reader left')
    await wait(20)
    expect(read).toBeLessThan(taken + 5_000_000)
    expect(endless.destroyed).toBe(true)
    const before = read
    await wait(20)
    expect(read).toBe(before)
  })

  it('closes a document that was being opened when the reader left', async () => {
    const late = Readable.from([Buffer.from('x')])
    const stream = zipStream([{ path: ['a'], date: ISSUED, open: () => wait(30).then(() => late) }])
    stream.destroy()
    await wait(60)
    expect(late.destroyed).toBe(true)
  })
})

describe('a path in an archive', () => {
  it.each([
    [['..', '..', 'etc', 'passwd'], 'unnamed/unnamed/etc/passwd'],
    [['/etc/passwd'], '_etc_passwd'],
    [['C:\\x.pdf'], 'C__x.pdf'],
    [['a/../../b.pdf'], 'a_.._.._b.pdf'],
    [['con.pdf'], '_con.pdf'],
    [['a:b*c?.pdf'], 'a_b_c_.pdf'],
    [['report.pdf. . '], 'report.pdf'],
    [['bad\u202Efdp.exe'], 'badfdp.exe'],
  ] as const)('%j becomes %s', (parts, path) => {
    expect(zipPath(parts)).toBe(path)
  })

  it('is given to one document only, also where capitals do not count', () => {
    expect(distinct(['a.pdf', 'A.PDF', 'a (2).pdf', 'a.pdf', 'b'])).toEqual([
      'a.pdf',
      'A (2).PDF',
      'a (2) (2).pdf',
      'a (3).pdf',
      'b',
    ])
  })
})
