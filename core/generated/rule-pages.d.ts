import type { BookPage, RulePage } from '#core/judge/pages.ts'
/** Every rule in full, and every book with its rules by key. */
declare const pages: () => { readonly books: readonly BookPage[]; readonly rules: readonly RulePage[] }
export default pages
