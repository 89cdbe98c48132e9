import pages from '#core/generated/rule-pages.js'
import type { PlacedRule, ResolvedBook } from './book.ts'

/** A rule in full, under the key that its book's list gives it. */
export interface RulePage extends PlacedRule {
  readonly key: string
}

/** Everything that is told of a book beside its rules. */
export type BookPage = Omit<ResolvedBook, 'rules'> & { readonly keys: readonly string[] }

interface Library {
  readonly rules: Map<string, RulePage>
  readonly books: Map<string, BookPage>
}

let library: Library | undefined

/** The pages are parsed when the first one is asked for: a file without findings never needs them. */
function opened(): Library {
  if (library) return library
  const { rules, books } = pages()
  library = {
    rules: new Map(rules.map((rule) => [rule.key, rule])),
    books: new Map(books.map((book) => [book.id, book])),
  }
  return library
}

/** The rule under a key, in full. */
export function rulePage(key: string): RulePage {
  const page = opened().rules.get(key)
  if (!page) throw new Error(`The page of the rule ${key} is missing: generate the rules again.`)
  return page
}

/** Every rule of every book at hand. */
export const rulePages = (): readonly RulePage[] => [...opened().rules.values()]

/** A book at hand, without its rules. */
export const bookPage = (id: string): BookPage | undefined => opened().books.get(id)

/** Every book at hand. */
export const bookPages = (): readonly BookPage[] => [...opened().books.values()]

/** Puts a book of one's own on the shelf of pages. */
export function shelve(book: BookPage, rules: readonly RulePage[]): void {
  const { rules: all, books } = opened()
  for (const rule of rules) all.set(rule.key, rule)
  books.set(book.id, book)
}
