import { type Ink, inks } from '#cli/formats/ink.ts'
import { rulePageText } from '#cli/formats/rule-page.ts'
import { colourOf, endWith, print, say } from '#cli/io.ts'
import { bookPage, bookPages, rulePage, rulePages } from '#core/judge/pages.ts'
import { nearest } from '#core/texts/nearest.ts'

function list(book: string, ink: Ink): string {
  const pages = (bookPage(book)?.keys ?? []).map(rulePage)
  const chapters = [...new Set(pages.map(({ chapter }) => chapter))]
  const blocks = chapters.map((chapter) => {
    const own = pages.filter((rule) => rule.chapter === chapter)
    const rows = own.map(({ record }) => `  ${record.id}\n    ${ink.faint(`${record.title} (${record.severity})`)}`)
    return `${ink.strong(chapter)}\n${rows.join('\n')}\n`
  })
  return `${blocks.join('\n')}\n${pages.length} rules in the book ${book}. skerry explain RULE prints one.\n`
}

function fault(message: string): void {
  say(`${message}\n`)
  endWith(2)
}

function meant(word: string, known: readonly string[]): string {
  const hint = nearest(word, known)
  return hint === undefined ? '.' : `: did you mean ${hint}?`
}

/** Prints a rule's page, or the list of rules. */
export function explain(
  rule: string | undefined,
  { format, book }: { readonly format: string; readonly book: string },
): void {
  const ink = inks(colourOf('stdout'))
  const shelf = bookPage(book)
  if (!shelf) {
    const ids = bookPages().map(({ id }) => id)
    return fault(`There is no rule book ${book}${meant(book, ids)} At hand: ${ids.join(', ')}.`)
  }
  if (rule === undefined)
    return print(
      format === 'json'
        ? `${JSON.stringify({ ...shelf, rules: shelf.keys.map(rulePage) }, null, 2)}\n`
        : list(book, ink),
    )
  const pages = [...shelf.keys.map(rulePage), ...rulePages()]
  const found = pages.find(({ record }) => record.id === rule)
  if (found) return print(format === 'json' ? `${JSON.stringify(found, null, 2)}\n` : `${rulePageText(found, ink)}\n`)
  const ids = pages.map(({ record }) => record.id)
  fault(`There is no rule ${rule}${meant(rule, ids)} skerry explain lists all.`)
}
