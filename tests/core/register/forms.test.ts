import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { base64Of, bytesFrom } from '#core/register/base64.ts'
import { derFromRaw, rawFromDer } from '#core/register/ecdsa.ts'
import { freshKeys } from './keys.ts'

const bytes = fc.uint8Array({ maxLength: 200 })
const raw = fc.uint8Array({ minLength: 64, maxLength: 64 })

describe('base64', () => {
  it.each(['A', 'AA=', 'AAA', 'AA==AA==', 'AA A', 'AA-_', '=', 'AAAA='])('refuses %s', (text) =>
    expect(bytesFrom(text)).toBeUndefined(),
  )

  it('is what Node writes, and is read back', () => {
    fc.assert(
      fc.property(bytes, (given) => {
        const text = base64Of(given)
        expect(text).toBe(Buffer.from(given).toString('base64'))
        expect(bytesFrom(text)).toEqual(given)
      }),
    )
  })
})

describe('a signature in DER', () => {
  const good = derFromRaw(new Uint8Array(64).fill(0x81))

  it.each([
    ['empty', []],
    ['of another kind', [0x31, ...good.slice(1)]],
    ['with bytes behind it', [...good, 0]],
    ['cut short', good.slice(0, -1)],
    ['with a length in the long form', [0x30, 0x81, good.length - 2, ...good.slice(2)]],
    ['with a number of another kind', [0x30, 6, 0x03, 1, 1, 0x02, 1, 1]],
    ['with a number of no bytes', [0x30, 5, 0x02, 0, 0x02, 1, 1]],
    ['with a number that goes past the end', [0x30, 3, 0x02, 9, 1]],
    ['with a number below zero', [0x30, 6, 0x02, 1, 0x80, 0x02, 1, 1]],
    ['with a needless zero', [0x30, 7, 0x02, 2, 0, 1, 0x02, 1, 1]],
    ['with one number', [0x30, 3, 0x02, 1, 1]],
    ['with three numbers', [0x30, 9, 0x02, 1, 1, 0x02, 1, 1, 0x02, 1, 1]],
    ['with a number too large for the curve', [0x30, 38, 0x02, 33, ...new Array(33).fill(1), 0x02, 1, 1]],
    ['with a body of no bytes', [0x30, 0]],
  ])('%s is refused', (_, der) => expect(rawFromDer(Uint8Array.from(der))).toBeUndefined())

  it('is written and read back for all numbers, also such with zeros in front', () => {
    fc.assert(
      fc.property(raw, fc.nat({ max: 64 }), (given, zeros) => {
        const number = given.map((byte, at) => (at < zeros ? 0 : byte))
        expect(rawFromDer(derFromRaw(number))).toEqual(number)
      }),
    )
  })

  it('holds numbers of other curves where asked', () => {
    const der = Uint8Array.of(0x30, 6, 0x02, 1, 5, 0x02, 1, 7)
    expect(rawFromDer(der, 48)).toHaveLength(96)
  })

  it('is of the length that keys make', async () => {
    expect(await freshKeys().sign(new Uint8Array(3))).toHaveLength(64)
  })
})
