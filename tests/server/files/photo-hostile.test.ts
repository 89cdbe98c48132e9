import { execFileSync } from 'node:child_process'
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { gzipSync } from 'node:zlib'
import sharp from 'sharp'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { type PhotoLab, photoLab } from '#server/files/photo.ts'
import type { PhotoAnswer } from '#server/files/photo-answer.ts'
import { PHOTO_LIMITS } from '#server/files/photo-limits.ts'
import type { PhotoProgram } from '#server/files/photo-process.ts'
import { photoWords } from '#server/files/photo-words.ts'
import { emptyPng, pngChunk, pngHead, SIGNATURE } from './hostile-pictures.ts'
import { type Built, builtProgram } from './photo-program.ts'

let built: Built
let lab: PhotoLab
beforeAll(async () => {
  built = await builtProgram()
  lab = photoLab(built.program)
})
afterAll(() => built.remove())

const problem = (answer: PhotoAnswer) => (answer.ok ? 'taken' : answer.problem)
const refused = async (bytes: Uint8Array) => problem(await lab.develop(bytes))

const picture = sharp({ create: { width: 640, height: 480, channels: 3, background: '#3a5' } })
const noisy = sharp({
  create: {
    width: 640,
    height: 480,
    channels: 3,
    background: '#3a5',
    noise: { type: 'gaussian', mean: 120, sigma: 40 },
  },
})

/** The program told to say, when it ends, the most memory that it held, in kibibytes. */
const telling = (program: PhotoProgram): PhotoProgram => ({
  ...program,
  args: [
    '--import',
    `data:text/javascript,process.on('exit',()=>process.stderr.write(String(process.resourceUsage().maxRSS)))`,
    ...program.args,
  ],
})

function memoryFor(bytes: Uint8Array): number {
  const { args } = telling(built.program)
  const folder = mkdtempSync(join(tmpdir(), 'skerry-photo-'))
  try {
    writeFileSync(join(folder, 'in'), bytes)
    const script = `exec "$@" < ${join(folder, 'in')} 2> ${join(folder, 'rss')} > /dev/null`
    execFileSync('sh', ['-c', script, 'sh', process.execPath, ...args])
    return Number(readFileSync(join(folder, 'rss'), 'utf8'))
  } finally {
    rmSync(folder, { recursive: true })
  }
}

describe('a file that is no photo', () => {
  it.each([
    ['nothing', Buffer.alloc(0), { code: 'empty' }],
    ['more than 15 MB', Buffer.alloc(PHOTO_LIMITS.bytes + 1), { code: 'too-large', bytes: PHOTO_LIMITS.bytes + 1 }],
    [
      'a drawing with script',
      Buffer.from('<svg xmlns="http://www.w3.org/2000/svg"><script>1</script></svg>'),
      { code: 'not-a-photo', kind: 'SVG' },
    ],
    [
      'a drawing behind a declaration',
      Buffer.from('\n<?xml version="1.0"?>\n<svg width="9"/>'),
      { code: 'not-a-photo', kind: 'SVG' },
    ],
    ['a packed drawing', gzipSync('<svg/>'), { code: 'not-a-photo', kind: 'of an unknown kind' }],
    ['a page', Buffer.from('<!DOCTYPE html><html><img></html>'), { code: 'not-a-photo', kind: 'HTML or XML' }],
    ['a PDF', Buffer.from('%PDF-1.7\n'), { code: 'not-a-photo', kind: 'PDF' }],
    ['a zip', Buffer.from('PK\x03\x04 and more'), { code: 'not-a-photo', kind: 'zip' }],
    ['a file of words', Buffer.from('photo: board.jpg\n'), { code: 'not-a-photo', kind: 'text' }],
    ['noise', Buffer.from([0, 1, 2, 3]), { code: 'not-a-photo', kind: 'of an unknown kind' }],
  ])('is refused: %s', async (_, bytes, expected) => {
    expect(await refused(bytes)).toEqual(expected)
  })

  it.each(['gif', 'tiff', 'avif'] as const)('is refused: a picture as %s', async (format) => {
    expect(await refused(await picture.clone().toFormat(format).toBuffer())).toEqual({
      code: 'not-a-photo',
      kind: format.toUpperCase(),
    })
  })
})

describe('a photo as HEIC', () => {
  it('is refused with a way out, since the installed picture library does not read it', async () => {
    const folder = mkdtempSync(join(tmpdir(), 'skerry-heic-'))
    const [from, to] = [join(folder, 'in.png'), join(folder, 'out.heic')]
    await picture.clone().png().toFile(from)
    execFileSync('heif-enc', [from, '-o', to], { stdio: 'ignore' })
    const heic = readFileSync(to)
    rmSync(folder, { recursive: true })
    const answer = await lab.develop(heic)
    expect(problem(answer)).toEqual({ code: 'not-readable-here', kind: 'HEIC' })
    expect(answer.ok ? '' : photoWords(answer.problem)).toContain('as JPEG')
    await expect(sharp(heic).toBuffer()).rejects.toThrow()
  })
})

describe('a bomb', () => {
  it('of 900 million pixels in 100 kB is refused by its header, in little memory', async () => {
    const bomb = await emptyPng({ width: 30_000, height: 30_000, bits: 1, colour: 0 })
    expect(bomb.length).toBeLessThan(200_000)
    expect(await refused(bomb)).toEqual({ code: 'too-many-pixels', width: 30_000, height: 30_000 })
    expect(memoryFor(bomb)).toBeLessThan(150_000)
  })

  it('of 144 million pixels in colour is refused by its header, in little memory', async () => {
    const bomb = await emptyPng({ width: 12_000, height: 12_000, bits: 8, colour: 2 })
    expect(bomb.length).toBeLessThan(500_000)
    expect(await refused(bomb)).toEqual({ code: 'too-many-pixels', width: 12_000, height: 12_000 })
    expect(memoryFor(bomb)).toBeLessThan(150_000)
  })

  it('just inside the limit, in the deepest colours, is read in less than 300 MB', async () => {
    const heavy = await emptyPng({ width: 7_000, height: 7_000, bits: 16, colour: 6 })
    expect((await lab.develop(heavy)).ok).toBe(true)
    expect(memoryFor(heavy)).toBeLessThan(300_000)
  })

  it('one pixel beyond the limit is refused', async () => {
    const over = await emptyPng({ width: 50_000_001, height: 1, bits: 1, colour: 0 })
    expect(await refused(over)).toMatchObject({ code: 'too-many-pixels' })
  })

  it('that promises more pixels than it holds, or a header of nonsense, is damaged', async () => {
    const head = { width: 5_000, height: 5_000, bits: 8, colour: 2 } as const
    const small = await emptyPng({ width: 10, height: 10, bits: 8, colour: 2 })
    const body = small.subarray(SIGNATURE.length + 25)
    expect(await refused(Buffer.concat([SIGNATURE, pngHead(head), body]))).toEqual({ code: 'damaged' })
    const nonsense = pngHead({ ...head, width: 0 })
    expect(await refused(Buffer.concat([SIGNATURE, nonsense, body]))).toEqual({ code: 'damaged' })
    expect(await refused(Buffer.concat([SIGNATURE, pngChunk('IDAT', Buffer.alloc(9))]))).toEqual({ code: 'damaged' })
  })

  it('thrown twenty times at once leaves this process small, and a photo is read after them', async () => {
    const bomb = await emptyPng({ width: 30_000, height: 30_000, bits: 1, colour: 0 })
    const before = process.memoryUsage().rss
    const answers = await Promise.all(Array.from({ length: 20 }, () => lab.develop(bomb)))
    for (const answer of answers) expect(problem(answer)).toMatchObject({ code: 'too-many-pixels' })
    expect(process.memoryUsage().rss - before).toBeLessThan(100e6)
    expect((await lab.develop(await picture.clone().jpeg().toBuffer())).ok).toBe(true)
  })
})

describe('a photo that was cut off', () => {
  it.each(['jpeg', 'png', 'webp'] as const)('as %s is refused as damaged, wherever the cut', async (format) => {
    const whole = await noisy.clone().toFormat(format).toBuffer()
    for (const percent of [1, 20, 50, 90, 99]) {
      const cut = whole.subarray(0, Math.max(16, (whole.length * percent) / 100))
      expect(await refused(cut), `${percent} %`).toEqual({ code: 'damaged' })
    }
  })
})

describe('a picture that moves', () => {
  it('is refused as WebP', async () => {
    const frames = ['red', 'blue'].map((background) =>
      sharp({ create: { width: 20, height: 20, channels: 3, background } })
        .png()
        .toBuffer(),
    )
    const moving = await sharp(await Promise.all(frames), { join: { animated: true } })
      .webp()
      .toBuffer()
    expect(await refused(moving)).toEqual({ code: 'moving' })
  })

  it('is refused as PNG', async () => {
    const still = await emptyPng({ width: 20, height: 20, bits: 8, colour: 2 })
    const head = SIGNATURE.length + 25
    const control = pngChunk('acTL', Buffer.from([0, 0, 0, 2, 0, 0, 0, 0]))
    expect(await refused(Buffer.concat([still.subarray(0, head), control, still.subarray(head)]))).toEqual({
      code: 'moving',
    })
  })
})

describe('a photo with something else inside', () => {
  const PAYLOAD = '<script>alert(document.domain)</script>'

  it.each(['jpeg', 'png', 'webp'] as const)('as %s comes out as a photo only', async (format) => {
    const clean = await picture.clone().toFormat(format).toBuffer()
    const zip = Buffer.from('PK\x05\x06', 'latin1')
    const behind = Buffer.concat([clean, Buffer.from(PAYLOAD), zip, Buffer.alloc(18)])
    const answer = await lab.develop(behind)
    if (!answer.ok) throw new Error(photoWords(answer.problem))
    for (const { bytes } of [answer.photo.stored, answer.photo.paper]) {
      expect(bytes.includes('script')).toBe(false)
      expect(bytes.includes(zip)).toBe(false)
    }
  })

  it('loses comments, descriptions and profiles', async () => {
    const told = await picture
      .clone()
      .withExif({ IFD0: { ImageDescription: PAYLOAD, Copyright: PAYLOAD } })
      .withIccProfile('p3')
      .jpeg()
      .toBuffer()
    expect(told.includes('script')).toBe(true)
    const answer = await lab.develop(told)
    expect(answer.ok && answer.photo.stored.bytes.includes('script')).toBe(false)
    expect(answer.ok && (await sharp(answer.photo.stored.bytes).metadata()).icc).toBeUndefined()
  })
})
