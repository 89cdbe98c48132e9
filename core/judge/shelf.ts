import type { Shelf } from '../engine.ts'
import { SHIPPED_BOOKS, type ShippedBook, shippedBook } from './shipped.ts'

/** The shipped rule books, each read once. */
export function shippedShelf(): Shelf {
  const kept = new Map<string, ShippedBook | undefined>()
  return {
    names: SHIPPED_BOOKS,
    find: (id) => {
      if (!kept.has(id)) kept.set(id, shippedBook(id))
      return kept.get(id)
    },
  }
}
