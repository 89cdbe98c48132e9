import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { anchorOf, LONGEST_ANCHOR } from '#core/report/anchor.ts'
import { carry } from '#core/review/carry.ts'
import { LONGEST_QUOTE, quotation, quotations } from '#core/review/quote.ts'
import { anchorsOf, exampleText, judgedText, modelOf } from '../report/judged.ts'

const text = exampleText('fell-side-dairy')
const placesOf = (changed: string) => quotations(modelOf(judgedText(changed)))
const before = placesOf(text)
const loop = [...before.keys()].filter((anchor) => /^circuit\/K1\b/.test(anchor))

const quoted = (anchor: string) => ({ anchor, quoted: before.get(anchor) ?? '' })

describe('a remark on a reading', () => {
  it('is orphaned when its circuit is gone from the file', () => {
    expect(carry({ anchor: 'circuit/K99', quoted: 'whatever stood there' }, before)).toBe('orphaned')
  })

  it('stays where it is through an edit elsewhere, though every line moves', () => {
    const after = placesOf(`# One more line at the top.\n${text}`)
    expect(loop.length).toBeGreaterThan(0)
    for (const anchor of loop) expect(carry(quoted(anchor), after)).toBe('kept')
  })

  it('is told apart when the value that it is about has changed', () => {
    const after = placesOf(text.replace('customer: M. Fell', 'customer: M. Fell and daughters'))
    expect(carry(quoted('site/customer'), after)).toBe('changed')
    expect(carry(quoted('site/name'), after)).toBe('kept')
  })

  it('is orphaned when its place is left out, and found again when it comes back', () => {
    const without = placesOf(text.replace(/^ {2}customer: .*\n/m, '').replace('premises: agricultural\n', '\n'))
    expect(carry(quoted('site/premises'), without)).toBe('orphaned')
    expect(carry(quoted('site/premises'), placesOf(text))).toBe('kept')
  })
})

describe('quotations', () => {
  it('know every place of the report that has a name', () => {
    const named = anchorsOf(modelOf(judgedText(text)))
    expect(named.length).toBeGreaterThan(100)
    for (const anchor of named) expect(before.has(anchor), anchor).toBe(true)
  })

  it('are short enough to be kept, whatever stands there', () => {
    for (const words of before.values()) expect(words.length).toBeLessThanOrEqual(LONGEST_QUOTE)
    for (const anchor of before.keys()) expect(anchor.length).toBeLessThanOrEqual(LONGEST_ANCHOR)
  })

  it('hold no drawing and no line of the file', () => {
    for (const words of before.values()) expect(words).not.toMatch(/<svg|file, line \d/)
  })
})

describe('properties', () => {
  it('a long text that differs anywhere is quoted differently', () => {
    fc.assert(
      fc.property(fc.string({ minLength: 1, maxLength: 6000 }), fc.nat(), (words, at) => {
        const place = at % words.length
        const other = `${words.slice(0, place)}${words[place] === 'a' ? 'b' : 'a'}${words.slice(place + 1)}`
        expect(quotation(words)).not.toBe(quotation(other))
        expect(quotation(words).length).toBeLessThanOrEqual(LONGEST_QUOTE)
      }),
    )
  })

  it('carrying depends on the words alone: kept exactly where they are the same', () => {
    const place = fc.record({ anchor: fc.constantFrom('a', 'b', 'c'), quoted: fc.constantFrom('1', '2') })
    const places = fc
      .dictionary(fc.constantFrom('a', 'b', 'c'), fc.constantFrom('1', '2'))
      .map((found) => new Map(Object.entries(found)))
    fc.assert(
      fc.property(place, places, (held, found) => {
        const expected = !found.has(held.anchor)
          ? 'orphaned'
          : found.get(held.anchor) === held.quoted
            ? 'kept'
            : 'changed'
        expect(carry(held, found)).toBe(expected)
      }),
    )
  })

  it('a name that is too long is cut, and still one of its own', () => {
    const [one, other] = [anchorOf('a'.repeat(400)), anchorOf('a'.repeat(401))]
    expect(one).toHaveLength(257)
    expect(one).not.toBe(other)
  })

  it('names are never too long, and different parts give different names', () => {
    const parts = fc.array(
      fc.string({ maxLength: 200 }).filter((part) => !part.includes('/')),
      { minLength: 1, maxLength: 5 },
    )
    fc.assert(
      fc.property(parts, parts, (one, other) => {
        expect(anchorOf(...one).length).toBeLessThanOrEqual(LONGEST_ANCHOR)
        expect(anchorOf(...one) === anchorOf(...other)).toBe(one.join('/') === other.join('/'))
      }),
    )
  })
})
