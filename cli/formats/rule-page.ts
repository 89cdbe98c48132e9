import type { Citation } from '#core/glossary.ts'
import type { ParameterRecord } from '#core/judge/book.ts'
import { type BookPage, bookPages, type RulePage } from '#core/judge/pages.ts'
import type { RuleExample } from '#core/judge/rule.ts'
import { shown } from '#core/texts/value.ts'
import type { Ink } from './ink.ts'
import { wrapped } from './wrap.ts'

const WIDTH = 96

const cited = ({ publication, clause, note }: Citation): string =>
  `${publication}${clause === undefined ? '' : `, ${clause}`}${note === undefined ? '' : ` (${note})`}`

function example({ subject, state, set, remove, gives, note }: RuleExample): string {
  const patch = [
    ...Object.entries(set ?? {}).map(([path, value]) => `${path}: ${JSON.stringify(value)}`),
    ...(remove ?? []).map((path) => `without ${path}`),
  ]
  const about = `${subject}${state === undefined ? '' : ` (${state})`}`
  return `${gives}, ${about}: ${patch.join('; ') || 'the base file as it is'}${note === undefined ? '' : `. ${note}`}`
}

/** Each line hangs under its first word where it takes several. */
function part(title: string, lines: readonly string[], ink: Ink): string[] {
  if (lines.length === 0) return []
  const hung = lines.flatMap((line) =>
    wrapped(line, WIDTH - 4).map((text, index) => `${index === 0 || lines.length === 1 ? '  ' : '    '}${text}`),
  )
  return [ink.faint(title), ...hung, '']
}

const indented = (value: unknown): string[] =>
  JSON.stringify(value, null, 2)
    .split('\n')
    .map((line) => `  ${line}`)

/** The names of the book's parameters that a rule reaches for. */
function parameterNames({ record: { when, must } }: RulePage): string[] {
  const found = JSON.stringify([when, must]).matchAll(/"\/book\/(\w+)/g)
  return [...new Set([...found].flatMap(([, name]) => name ?? []))]
}

const stated = ({ value, unit }: ParameterRecord): string => (value === null ? 'none' : shown(value, unit ?? ''))

/** One line for each value that a parameter has, with the books that set it so. */
function parameter(name: string, books: readonly BookPage[]): string[] {
  const lines = new Map<string, string[]>()
  for (const { id, parameters } of books) {
    const found = parameters[name]
    if (!found) continue
    const line = `${found.title ?? name}: ${stated(found)} (${found.source})`
    lines.set(line, [...(lines.get(line) ?? []), id])
  }
  return [...lines].map(([line, ids]) => `${ids.join(', ')}: ${line}`)
}

const switchedOff = ({ record }: RulePage, books: readonly BookPage[]): string[] =>
  books.flatMap(({ id, off }) => off.filter(({ rule }) => rule === record.id).map(({ reason }) => `${id}: ${reason}`))

/** Everything that is known of a rule, for a terminal. */
export function rulePageText(page: RulePage, ink: Ink): string {
  const { key, record, chapter, from } = page
  const books = bookPages()
  const using = books.filter(({ keys }) => keys.includes(key))
  const place = `${record.id} · ${record.severity} · ${record.subject} · state ${record.state}`
  return [
    ink.strong(record.title),
    ink.faint(`${place} · chapter ${chapter} of ${from} · in the books ${using.map(({ id }) => id).join(', ')}`),
    '',
    ...part('why', [record.why], ink),
    ...part('caution', record.caution === undefined ? [] : [record.caution], ink),
    ...part('it says', [record.says], ink),
    ...part('what to do', [record.do], ink),
    ...part('sources', record.cites.map(cited), ink),
    ...part(
      'parameters',
      parameterNames(page).flatMap((name) => parameter(name, using)),
      ink,
    ),
    ...(record.when ? [ink.faint('applies when'), ...indented(record.when), ''] : []),
    ink.faint('must hold'),
    ...indented(record.must),
    '',
    ...part('examples', record.examples.map(example), ink),
    ...part(
      'replaces the base rule because',
      [record.replaces_because].filter((reason) => reason !== undefined),
      ink,
    ),
    ...part('switched off', switchedOff(page, books), ink),
  ].join('\n')
}
