import { strToU8 } from 'fflate'

/** XYZ of the sRGB primaries and white, adapted to D50 by Bradford, as ICC s15Fixed16 numbers (IEC 61966-2-1; ICC.1:2001-04). */
const WHITE = [0.9642, 1, 0.8249] as const
const RED = [0.436066, 0.222488, 0.013916] as const
const GREEN = [0.385147, 0.716873, 0.097076] as const
const BLUE = [0.143066, 0.060608, 0.714096] as const
const STEPS = 1024

const signature = (view: DataView, at: number, text: string): void =>
  strToU8(text).forEach((code, index) => view.setUint8(at + index, code))

const xyz = (values: readonly [number, number, number]): Uint8Array => {
  const view = new DataView(new ArrayBuffer(20))
  signature(view, 0, 'XYZ ')
  values.forEach((value, index) => view.setInt32(8 + index * 4, Math.round(value * 65536)))
  return new Uint8Array(view.buffer)
}

/** The transfer function of IEC 61966-2-1, 5.2, from encoded value to linear light, both 0 to 1. */
const linear = (value: number): number => (value <= 0.04045 ? value / 12.92 : ((value + 0.055) / 1.055) ** 2.4)

const curve = (): Uint8Array => {
  const view = new DataView(new ArrayBuffer(12 + STEPS * 2))
  signature(view, 0, 'curv')
  view.setUint32(8, STEPS)
  for (let i = 0; i < STEPS; i++) view.setUint16(12 + i * 2, Math.round(linear(i / (STEPS - 1)) * 65535))
  return new Uint8Array(view.buffer)
}

const text = (words: string): Uint8Array => {
  const view = new DataView(new ArrayBuffer(8 + words.length + 1))
  signature(view, 0, 'text')
  signature(view, 8, words)
  return new Uint8Array(view.buffer)
}

/** ICC version 2 `desc`: the ASCII name, then an empty Unicode and an empty Macintosh name. */
const description = (words: string): Uint8Array => {
  const view = new DataView(new ArrayBuffer(12 + words.length + 1 + 8 + 3 + 67))
  signature(view, 0, 'desc')
  view.setUint32(8, words.length + 1)
  signature(view, 12, words)
  return new Uint8Array(view.buffer)
}

const header = (view: DataView, size: number): void => {
  view.setUint32(0, size)
  view.setUint32(8, 0x02100000)
  signature(view, 12, 'mntrRGB XYZ ')
  const date = [1999, 6, 3, 0, 0, 0]
  date.forEach((part, index) => view.setUint16(24 + index * 2, part))
  signature(view, 36, 'acsp')
  WHITE.forEach((value, index) => view.setInt32(68 + index * 4, Math.round(value * 65536)))
}

/**
 * An ICC version 2 display profile of sRGB, made from its published numbers, for the output intent that PDF/A asks for.
 *
 * @returns the profile's bytes, the same on every call
 * @source IEC 61966-2-1:1999 (primaries, transfer function); ICC.1:2001-04 (file format, version 2 because PDF 1.4 knows no later one)
 */
export const srgbProfile = (): Uint8Array => {
  const tone = curve()
  const tags: [string, Uint8Array][] = [
    ['desc', description('sRGB IEC61966-2.1')],
    ['cprt', text('No rights reserved')],
    ['wtpt', xyz(WHITE)],
    ['rXYZ', xyz(RED)],
    ['gXYZ', xyz(GREEN)],
    ['bXYZ', xyz(BLUE)],
    ['rTRC', tone],
    ['gTRC', tone],
    ['bTRC', tone],
  ]
  const places = new Map<Uint8Array, number>()
  let end = 128 + 4 + tags.length * 12
  for (const [, data] of tags) {
    if (places.has(data)) continue
    places.set(data, end)
    end += (data.length + 3) & ~3
  }
  const view = new DataView(new ArrayBuffer(end))
  header(view, end)
  view.setUint32(128, tags.length)
  const bytes = new Uint8Array(view.buffer)
  tags.forEach(([name, data], index) => {
    const at = Number(places.get(data))
    signature(view, 132 + index * 12, name)
    view.setUint32(136 + index * 12, at)
    view.setUint32(140 + index * 12, data.length)
    bytes.set(data, at)
  })
  return bytes
}
