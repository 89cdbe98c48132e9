import fc from 'fast-check'
import sharp from 'sharp'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { takenAt } from '#server/files/exif-time.ts'
import { type PhotoLab, photoLab } from '#server/files/photo.ts'
import type { Photo } from '#server/files/photo-answer.ts'
import { photoWords } from '#server/files/photo-words.ts'
import { tagsOf } from '#tests/judges/exiftool.ts'
import { asStored, type Orientation, type Pixels } from './hostile-pictures.ts'
import { sha256 } from './keys.ts'
import { type Built, builtProgram } from './photo-program.ts'

let built: Built
let lab: PhotoLab
beforeAll(async () => {
  built = await builtProgram()
  lab = photoLab(built.program)
})
afterAll(() => built.remove())

async function developed(bytes: Uint8Array): Promise<Photo> {
  const answer = await lab.develop(bytes)
  if (!answer.ok) throw new Error(photoWords(answer.problem))
  return answer.photo
}

/** Four fields of different colour, wider than high: no turn or mirror of it looks like another. */
const COLOURS = { red: [200, 30, 30], green: [30, 160, 30], blue: [30, 30, 200], yellow: [220, 210, 40] } as const

function fourFields(width: number, height: number): Pixels {
  const data = Buffer.alloc(width * height * 3)
  for (let y = 0; y < height; y += 1) {
    for (let x = 0; x < width; x += 1) {
      const upper = x < width / 2 ? COLOURS.red : COLOURS.green
      const lower = x < width / 2 ? COLOURS.blue : COLOURS.yellow
      data.set(y < height / 2 ? upper : lower, (y * width + x) * 3)
    }
  }
  return { width, height, data }
}

async function colourAt(bytes: Buffer, across: number, down: number): Promise<string> {
  const { data, info } = await sharp(bytes).raw().toBuffer({ resolveWithObject: true })
  const at = (Math.floor(info.height * down) * info.width + Math.floor(info.width * across)) * info.channels
  const distance = (colour: readonly number[]): number =>
    colour.reduce((sum, value, index) => sum + Math.abs(value - (data[at + index] ?? 0)), 0)
  const byDistance = Object.entries(COLOURS).sort(([, a], [, b]) => distance(a) - distance(b))
  return byDistance[0]?.[0] ?? 'none'
}

const raw = ({ data, width, height }: Pixels) => sharp(data, { raw: { width, height, channels: 3 } })

const WITH_PLACE = {
  IFD0: { Make: 'Camera of the test', ImageDescription: 'cellar of Alder Mill' },
  IFD2: { DateTimeOriginal: '2026:05:04 10:15:30', BodySerialNumber: '12345' },
  IFD3: {
    GPSLatitudeRef: 'N',
    GPSLatitude: '51/1 30/1 3230/100',
    GPSLongitudeRef: 'E',
    GPSLongitude: '0/1 7/1 4366/100',
  },
}

describe('a photo made anew', () => {
  it.each([1, 2, 3, 4, 5, 6, 7, 8] as const)(
    'stands upright, however the camera was held: orientation %i',
    async (orientation: Orientation) => {
      const stored = asStored(fourFields(300, 200), orientation)
      const sent = await raw(stored).jpeg().withMetadata({ orientation }).toBuffer()
      expect(tagsOf(sent)['EXIF:Orientation']).toBe(orientation)
      const { stored: picture } = await developed(sent)
      expect([picture.width, picture.height]).toEqual([300, 200])
      const corners = [
        [0.25, 0.25],
        [0.75, 0.25],
        [0.25, 0.75],
        [0.75, 0.75],
      ] as const
      const colours = await Promise.all(corners.map(([across, down]) => colourAt(picture.bytes, across, down)))
      expect(colours).toEqual(['red', 'green', 'blue', 'yellow'])
    },
  )

  it('has lost where it was taken, with what, and all that was written in it', async () => {
    const sent = await raw(fourFields(400, 300)).withExif(WITH_PLACE).jpeg().toBuffer()
    const before = tagsOf(sent)
    expect(before['EXIF:GPSLatitude']).toBeCloseTo(51.509, 2)
    expect(before['EXIF:DateTimeOriginal']).toBe('2026:05:04 10:15:30')
    const photo = await developed(sent)
    for (const { bytes } of [photo.stored, photo.paper]) {
      const groups = Object.keys(tagsOf(bytes)).map((name) => name.split(':')[0])
      expect(new Set(groups)).toEqual(new Set(['SourceFile', 'ExifTool', 'File', 'Composite']))
    }
    expect(photo.taken).toBe('2026-05-04T10:15:30')
  })

  it('is at most 2560 pixels long for the screen and 1600 for paper, keeps its shape, and is never enlarged', async () => {
    const large = await developed(await raw(fourFields(4_000, 3_000)).png().toBuffer())
    expect([large.stored.width, large.stored.height]).toEqual([2_560, 1_920])
    expect([large.paper.width, large.paper.height]).toEqual([1_600, 1_200])
    const small = await developed(await raw(fourFields(90, 60)).webp().toBuffer())
    expect([small.stored.width, small.stored.height, small.paper.width]).toEqual([90, 60, 90])
  })

  it('is the same bytes each time', async () => {
    const sent = await raw(fourFields(3_000, 2_000)).jpeg().toBuffer()
    const [first, second] = await Promise.all([developed(sent), developed(sent)])
    expect(sha256(first.stored.bytes)).toBe(sha256(second.stored.bytes))
    expect(sha256(first.paper.bytes)).toBe(sha256(second.paper.bytes))
  })

  it.each([
    ['inks', () => raw(fourFields(200, 100)).toColourspace('cmyk').jpeg()],
    ['grey', () => raw(fourFields(200, 100)).greyscale().jpeg()],
    ['a wide range of colours', () => raw(fourFields(200, 100)).withIccProfile('p3').jpeg()],
    ['16 bits', () => raw(fourFields(200, 100)).toColourspace('rgb16').png()],
    ['a palette', () => raw(fourFields(200, 100)).png({ palette: true })],
  ])('is plain sRGB or grey for paper, also when it came in %s', async (_, made) => {
    const { paper } = await developed(await made().toBuffer())
    const { space, channels, icc } = await sharp(paper.bytes).metadata()
    expect(['srgb', 'b-w']).toContain(space)
    expect([1, 3]).toContain(channels)
    expect(icc).toBeUndefined()
  })

  it('is white where it was transparent', async () => {
    const clear = { width: 40, height: 40, channels: 4, background: { r: 0, g: 0, b: 0, alpha: 0 } } as const
    const { stored } = await developed(await sharp({ create: clear }).png().toBuffer())
    expect([...(await sharp(stored.bytes).raw().toBuffer()).subarray(0, 3)]).toEqual([255, 255, 255])
  })
})

describe('the time that a camera tells', () => {
  it.each(['0000:00:00 00:00:00', '2026:13:45 10:00:00', '2026:02:30 10:00:00', 'yesterday'])(
    'is nothing where it is %j',
    async (time) => {
      const sent = await raw(fourFields(20, 20))
        .withExif({ IFD2: { DateTimeOriginal: time } })
        .jpeg()
        .toBuffer()
      const { exif } = await sharp(sent).metadata()
      expect(exif && takenAt(exif)).toBeNull()
    },
  )

  it('is nothing where the camera tells none', async () => {
    expect((await developed(await raw(fourFields(20, 20)).jpeg().toBuffer())).taken).toBeNull()
  })

  it('is read without harm from any bytes', async () => {
    const sent = await raw(fourFields(20, 20)).withExif(WITH_PLACE).jpeg().toBuffer()
    const { exif = Buffer.alloc(0) } = await sharp(sent).metadata()
    expect(takenAt(exif)).toBe('2026-05-04T10:15:30')
    const form = /^\d{4}-\d\d-\d\dT\d\d:\d\d:\d\d$/
    fc.assert(
      fc.property(fc.array(fc.tuple(fc.nat(), fc.nat({ max: 255 })), { maxLength: 8 }), fc.nat(), (changes, length) => {
        const spoilt = Buffer.from(exif.subarray(0, length % 4 === 0 ? length % exif.length : exif.length))
        for (const [at, value] of changes) if (spoilt.length > 0) spoilt[at % spoilt.length] = value
        const taken = takenAt(spoilt)
        expect(taken === null || form.test(taken)).toBe(true)
      }),
      { numRuns: 2_000 },
    )
  })
})
