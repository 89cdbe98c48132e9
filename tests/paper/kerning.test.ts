import { describe, expect, test } from 'vitest'
import { readKerning } from '#core/paper/kerning.ts'
import { fonts } from './fonts.ts'

/** The glyphs of letters in IBM Plex Sans and Source Sans 3, found through each font's own `cmap`. */
const glyphOf = (bytes: Uint8Array, sign: string): number => {
  const view = new DataView(bytes.buffer, bytes.byteOffset)
  const name = (at: number) => String.fromCharCode(...bytes.subarray(at, at + 4))
  let table = 0
  for (let record = 12; table === 0; record += 16) if (name(record) === 'cmap') table = view.getUint32(record + 8)
  for (let entry = table + 4; ; entry += 8) {
    const map = table + view.getUint32(entry + 4)
    if (view.getUint16(map) !== 4) continue
    const segments = view.getUint16(map + 6)
    const code = sign.charCodeAt(0)
    for (let i = 0; i < segments; i += 2) {
      if (view.getUint16(map + 14 + i) < code) continue
      const start = view.getUint16(map + 16 + segments + i)
      const delta = view.getUint16(map + 16 + 2 * segments + i)
      const range = map + 16 + 3 * segments + i
      const offset = view.getUint16(range)
      return offset === 0 ? (code + delta) & 0xffff : view.getUint16(range + offset + 2 * (code - start))
    }
  }
}

const kern = (bytes: Uint8Array, pair: string): number =>
  readKerning(bytes)(glyphOf(bytes, pair.charAt(0)), glyphOf(bytes, pair.charAt(1)))

/** A file with nothing but a GPOS table: Latin script, feature `kern`, one lookup of a type with one subtable. */
const gposOf = (type: number, subtable: readonly number[]): Uint8Array => {
  const tag = (name: string) => [0, 2].map((at) => (name.charCodeAt(at) << 8) | name.charCodeAt(at + 1))
  const script = [1, ...tag('latn'), 8, /* script */ 4, 0, /* language */ 0, 0xffff, 1, 0]
  const feature = [1, ...tag('kern'), 8, /* feature */ 0, 1, 0]
  const lookup = [1, 4, /* lookup */ type, 0, 1, 8, ...subtable]
  const header = [1, 0, 10, 10 + 2 * script.length, 10 + 2 * (script.length + feature.length)]
  const words = [...header, ...script, ...feature, ...lookup]
  const file = new Uint8Array(28 + 2 * words.length)
  const view = new DataView(file.buffer)
  view.setUint16(4, 1)
  file.set(new TextEncoder().encode('GPOS'), 12)
  view.setUint32(20, 28)
  words.forEach((word, index) => view.setUint16(28 + 2 * index, word & 0xffff))
  return file
}

describe('pair kerning', () => {
  // Read off the same files with fontkit 2.0.4's shaper, which gave equal values for all 32,799 pairs of 81 signs in the five fonts.
  test.each([
    ['regular', 'AV', -41],
    ['regular', 'To', -65],
    ['regular', 'P,', -100],
    ['regular', 'nn', 0],
    ['fallback', 'AV', -14],
    ['fallback', 'r.', -57],
  ] as const)('%s: %s', (name, pair, expected) => {
    expect(kern(fonts[name], pair)).toBe(expected)
  })

  test('every font moves A and V together', () => {
    for (const bytes of Object.values(fonts)) expect(kern(bytes, 'AV')).toBeLessThan(0)
  })

  test('a font without the table moves nothing', () => {
    expect(readKerning(new Uint8Array(12))(1, 2)).toBe(0)
  })

  test('an adjustment of single glyphs, and one that moves without an advance, move no pair', () => {
    const single = [1, 0, 0]
    const placed = [1, 12, 1, 0, 1, 18, 1, 1, 10, 0, 0, 0]
    expect(readKerning(gposOf(1, single))(10, 20)).toBe(0)
    expect(readKerning(gposOf(2, placed))(10, 20)).toBe(0)
  })

  test('classes may be listed glyph by glyph: a glyph outside the list is in class 0', () => {
    // Pairs by class: first glyphs 10 and 11 (classes 0 and 1), second glyphs 20 and 21 (classes 1 and 0).
    const pairs = [
      2, 24, 4, 0, 32, 42, 2, 2, 0, -7, 0, -30, /* coverage */ 1, 2, 10, 11, /* first */ 1, 10, 2, 0, 1, /* second */ 1,
      20, 1, 1,
    ]
    const kern = readKerning(gposOf(2, pairs))
    expect([kern(10, 20), kern(10, 21), kern(11, 20), kern(11, 99), kern(12, 20)]).toEqual([-7, 0, -30, 0, 0])
  })

  test('a font without Latin kerning moves nothing', () => {
    const file = new Uint8Array(64)
    const view = new DataView(file.buffer)
    view.setUint16(4, 1)
    file.set(new TextEncoder().encode('GPOS'), 12)
    view.setUint32(20, 28)
    view.setUint16(32, 10)
    expect(readKerning(file)(1, 2)).toBe(0)
  })
})
