import { type Ink, inks } from '#cli/formats/ink.ts'
import { wrapped } from '#cli/formats/wrap.ts'
import { colourOf, endWith, print, say } from '#cli/io.ts'
import type { Citation } from '#core/glossary.ts'
import { bookPage, bookPages, type RulePage, rulePage, rulePages } from '#core/judge/pages.ts'
import type { RuleExample } from '#core/judge/rule.ts'
import { nearest } from '#core/texts/nearest.ts'

const WIDTH = 96

const cited = ({ publication, clause, note }: Citation): string =>
  `${publication}${clause === undefined ? '' : `, ${clause}`}${note === undefined ? '' : ` (${note})`}`

function example({ subject, state, set, remove, gives, note }: RuleExample): string {
  const patch = [
    ...Object.entries(set ?? {}).map(([path, value]) => `${path}: ${JSON.stringify(value)}`),
    ...(remove ?? []).map((path) => `without ${path}`),
  ]
  const about = `${subject}${state === undefined ? '' : ` (${state})`}`
  return `${gives.padEnd(14)} ${about}: ${patch.join('; ') || 'the base file as it is'}${note === undefined ? '' : `. ${note}`}`
}

const part = (title: string, lines: readonly string[], ink: Ink): string[] =>
  lines.length === 0
    ? []
    : [ink.faint(title), ...lines.flatMap((line) => wrapped(line, WIDTH - 2)).map((line) => `  ${line}`), '']

const indented = (value: unknown): string[] =>
  JSON.stringify(value, null, 2)
    .split('\n')
    .map((line) => `  ${line}`)

function page({ key, record, chapter, from }: RulePage, ink: Ink): string {
  const books = bookPages()
    .filter(({ keys }) => keys.includes(key))
    .map(({ id }) => id)
  return [
    `${ink.strong(record.title)}`,
    ink.faint(
      `${record.id} · ${record.severity} · ${record.subject} · state ${record.state} · chapter ${chapter} of ${from} · in the books ${books.join(', ')}`,
    ),
    '',
    ...part('why', [record.why], ink),
    ...part('caution', record.caution === undefined ? [] : [record.caution], ink),
    ...part('it says', [record.says], ink),
    ...part('what to do', [record.do], ink),
    ...part('sources', record.cites.map(cited), ink),
    ...(record.when ? [ink.faint('applies when'), ...indented(record.when), ''] : []),
    ink.faint('must hold'),
    ...indented(record.must),
    '',
    ...part('examples', record.examples.map(example), ink),
    ...part(
      'replaces the base rule because',
      record.replaces_because === undefined ? [] : [record.replaces_because],
      ink,
    ),
  ].join('\n')
}

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

/** Prints a rule's page, or the list of rules. */
export function explain(
  rule: string | undefined,
  { format, book }: { readonly format: string; readonly book: string },
): void {
  const ink = inks(colourOf('stdout'))
  const shelf = bookPage(book)
  if (!shelf)
    return fault(
      `There is no rule book ${book}. At hand: ${bookPages()
        .map(({ id }) => id)
        .join(', ')}.`,
    )
  if (rule === undefined)
    return print(
      format === 'json'
        ? `${JSON.stringify({ ...shelf, rules: shelf.keys.map(rulePage) }, null, 2)}\n`
        : list(book, ink),
    )
  const pages = [...shelf.keys.map(rulePage), ...rulePages()]
  const found = pages.find(({ record }) => record.id === rule)
  if (found) return print(format === 'json' ? `${JSON.stringify(found, null, 2)}\n` : `${page(found, ink)}\n`)
  const hint = nearest(
    rule,
    pages.map(({ record }) => record.id),
  )
  fault(`There is no rule ${rule}${hint === undefined ? '' : `: did you mean ${hint}?`} skerry explain lists all.`)
}
