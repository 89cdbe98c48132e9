import type { PlacedRule, ResolvedBook } from '#core/judge/book.ts'
/** Every rule in full, and every book with its rules by key. */
declare const pages: () => {
  readonly books: readonly (Omit<ResolvedBook, 'rules'> & { readonly keys: readonly string[] })[]
  readonly rules: readonly (PlacedRule & { readonly key: string })[]
}
export default pages
