import { createHash } from 'node:crypto'
import { describe, expect, it } from 'vitest'
import { encodeUtf8, hashOf } from '#core/judge/canonical.ts'
import { SHIPPED_BOOKS, shippedBook } from '#core/judge/shipped.ts'
import { resolvedBooks } from '#tools/rules/generate.ts'

describe('the books that ship', () => {
  it('are the base and its national overlays', () => {
    expect(SHIPPED_BOOKS.toSorted()).toEqual(['au', 'de', 'gb', 'iec'])
  })

  it.each(SHIPPED_BOOKS)('%s gives every parameter a value, and each rule compiled checks', (id) => {
    const book = shippedBook(id)
    expect(Object.keys(book?.parameters ?? {})).toEqual(Object.keys(shippedBook('iec')?.parameters ?? {}))
    expect(book?.rules.every(({ must }) => typeof must === 'function')).toBe(true)
  })

  it('are found by their name only', () => {
    expect(shippedBook('atlantis')).toBeUndefined()
    expect(shippedBook('toString')).toBeUndefined()
  })
})

describe('the hash of a book', () => {
  it('is the one that the running book carries', async () => {
    for (const book of await resolvedBooks()) expect(shippedBook(book.id)?.hash).toBe(hashOf(book))
  })

  it('does not depend on the order of keys, and changes with any word', async () => {
    const [book] = await resolvedBooks()
    if (!book) throw new Error('There is no book.')
    const turned = Object.fromEntries(Object.entries(book).toReversed()) as unknown as typeof book
    expect(hashOf(turned)).toBe(hashOf(book))
    expect(hashOf({ ...book, note: `${book.note} ` })).not.toBe(hashOf(book))
  })

  it.each(['', 'abc', 'Ω ≤ 0.5 µA – 龍 🜁'])('encodes %j as UTF-8, as Node.js does', (text) => {
    expect(createHash('sha256').update(encodeUtf8(text)).digest('hex')).toBe(
      createHash('sha256').update(text, 'utf8').digest('hex'),
    )
  })
})
