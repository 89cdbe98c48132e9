import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { der, inside, leading, oid, partsOf, setOf, TAG } from '#core/seal/der.ts'
import { timeFrom } from '#core/seal/placeholder.ts'
import { readCms } from '#core/seal/read-cms.ts'

describe('an element is refused', () => {
  it.each([
    ['of no bytes', []],
    ['without a length', [0x30]],
    ['whose length has no end', [0x30, 0x80, 0, 0]],
    ['whose length is longer than it must be', [0x04, 0x81, 1, 7]],
    ['whose length begins with a zero', [0x04, 0x82, 0, 200, ...new Array(200).fill(0)]],
    ['whose length is cut', [0x04, 0x82, 1]],
    ['that is cut', [0x04, 3, 1, 2]],
    ['of a tag in several bytes', [0x1f, 0x81, 1, 0]],
    ['larger than any that is read', [0x04, 0x84, 0, 0, 0, 1, 7]],
  ])('%s', (_, bytes) => expect(leading(Uint8Array.from(bytes))).toBeUndefined())

  it('as a part of another, which then has none', () => {
    expect(partsOf(leading(Uint8Array.of(0x30, 3, 0x04, 9, 1)))).toEqual([])
    expect(partsOf(undefined)).toEqual([])
    expect(inside(Uint8Array.of(0x30, 0), 0, 0)).toBeUndefined()
  })
})

describe('an element', () => {
  it('is read as it was written, of any length', () => {
    fc.assert(
      fc.property(fc.array(fc.uint8Array({ maxLength: 400 }), { maxLength: 6 }), (contents) => {
        const whole = der(TAG.sequence, ...contents.map((content) => der(TAG.octets, content)))
        expect(partsOf(leading(whole)).map(({ content }) => content)).toEqual(contents)
        expect(leading(Uint8Array.from([...whole, 1, 2]))?.whole).toEqual(whole)
      }),
    )
    expect(leading(der(TAG.octets, new Uint8Array(70_000)))?.content).toHaveLength(70_000)
  })

  it('of a set stands in the order of bytes, the shorter first', () => {
    const [one, two, three] = [Uint8Array.of(4, 1, 9), Uint8Array.of(4, 2, 0, 0), Uint8Array.of(4, 1, 3)]
    expect(setOf(TAG.set, [two, one, three])).toEqual(Uint8Array.from([0x31, 10, ...three, ...one, ...two]))
    expect(setOf(TAG.set, [Uint8Array.of(4, 1), Uint8Array.of(4)])).toEqual(Uint8Array.of(0x31, 3, 4, 4, 1))
  })

  it('names things as OpenSSL does', () =>
    expect(Buffer.from(oid('1.2.840.113549.1.7.2')).toString('hex')).toBe('06092a864886f70d010702'))
})

describe('what is no signature', () => {
  it.each([
    ['nothing', []],
    ['a number', [2, 1, 1]],
    ['an empty one', [0x30, 0]],
  ])('is not read as one: %s', (_, bytes) => expect(readCms(Uint8Array.from(bytes))).toBeUndefined())
})

describe('a time', () => {
  it('is read only where it is in UTC', () => {
    const read = (text: string) => timeFrom(new Uint8Array(Buffer.from(text)))
    expect(read('D:20261021093005Z')).toBe('2026-10-21T09:30:05Z')
    expect(read("D:20261021093005+02'00")).toBeUndefined()
  })
})
