import { describe, expect, it } from 'vitest'
import { rulePage } from '#core/judge/pages.ts'
import { shippedShelf } from '#core/judge/shelf.ts'
import { SHIPPED_BOOKS } from '#core/judge/shipped.ts'
import { ruleCite, ruleTitle } from '#core/texts/words.ts'

describe('the shelf of shipped books', () => {
  it('has no book of another name, and says so each time', () => {
    const { find } = shippedShelf()
    expect([find('no-such-book'), find('no-such-book'), find('constructor')]).toEqual([undefined, undefined, undefined])
  })

  it('reads each book once', () => {
    const { find, names } = shippedShelf()
    expect(names).toEqual(SHIPPED_BOOKS)
    const book = find('iec')
    expect(book?.id).toBe('iec')
    expect(find('iec')).toBe(book)
  })
})

describe('a rule that no book has', () => {
  it('has neither page nor words: the generated files are older than the rules', () => {
    for (const ask of [rulePage, ruleTitle, ruleCite])
      expect(() => ask('iec/no-such-rule')).toThrow(/iec\/no-such-rule (?:is|are) missing: generate the rules again/)
  })
})
