import { mkdir, writeFile } from 'node:fs/promises'
import { dirname } from 'node:path'
import { pathToFileURL } from 'node:url'
import { type PlacedRule, type ResolvedBook, resolveBook } from '#core/judge/book.ts'
import type { SheetSchema } from '#core/judge/rule.ts'
import { firstCite, keyOf, storedBook, storedRule } from '#core/judge/stored.ts'
import { compileChecks } from './compile-checks.ts'
import { readBooks } from './read-books.ts'

const PROJECT = new URL('../../', import.meta.url).pathname
const ROOT = `${PROJECT}schemas/rules`

/** Every book that ships, resolved; throws with every problem of a book that does not resolve. */
export async function resolvedBooks(root = ROOT): Promise<ResolvedBook[]> {
  const folders = await readBooks(root)
  return [...folders.keys()].map((id) => {
    const resolution = resolveBook(id, folders)
    if (resolution.ok) return resolution.book
    throw new Error(resolution.problems.map(({ book, message }) => `${book}: ${message}`).join('\n'))
  })
}

/** Names for schemas, the same one for the same content. */
function namer(): { readonly nameOf: (schema: SheetSchema) => string; readonly named: Map<string, SheetSchema> } {
  const names = new Map<string, string>()
  const named = new Map<string, SheetSchema>()
  return {
    named,
    nameOf: (schema) => {
      const content = JSON.stringify(schema)
      const name = names.get(content) ?? `c${names.size}`
      names.set(content, name)
      named.set(name, schema)
      return name
    },
  }
}

const lazyJson = (value: unknown): string => `() => JSON.parse(${JSON.stringify(JSON.stringify(value))})`

/** Everything that is generated from the rule books: path in the project, and content. Writes nothing. */
export async function generateRules(root = ROOT): Promise<Record<string, string>> {
  const books = await resolvedBooks(root)
  const rules = [...new Map(books.flatMap((book) => book.rules).map((rule) => [keyOf(rule), rule])).values()]
  const { nameOf, named } = namer()
  const list = rules.map((rule) => storedRule(rule, nameOf))
  const places = new Map(rules.map((rule, place) => [keyOf(rule), place]))
  const shelves = books.map(
    (book) => `  ${JSON.stringify(book.id)}: ${lazyJson(storedBook(book, (key) => places.get(key) ?? -1))},`,
  )
  const pages = { books, rules: rules.map((rule) => ({ key: keyOf(rule), ...rule })) }
  return {
    'core/generated/books.js': `export const RULES = ${lazyJson(list)}\nexport const BOOKS = {\n${shelves.join('\n')}\n}\n`,
    'core/generated/books.d.ts': BOOK_TYPES,
    'core/generated/rule-checks.js': await compileChecks(named),
    'core/generated/rule-checks.d.ts': checkTypes(named.keys()),
    'core/generated/rule-words.js': wordsOf(rules),
    'core/generated/rule-words.d.ts': WORD_TYPES,
    'core/generated/rule-pages.js': `export default ${lazyJson({ ...pages, books: books.map(({ rules: own, ...book }) => ({ ...book, keys: own.map(keyOf) })) })}\n`,
    'core/generated/rule-pages.d.ts': PAGE_TYPES,
  }
}

function checkTypes(names: Iterable<string>): string {
  return [...names].map((name) => `export declare const ${name}: (values: object) => boolean\n`).join('')
}

const BOOK_TYPES = `import type { StoredBook, StoredRule } from '#core/judge/shipped.ts'
export declare const RULES: () => readonly StoredRule[]
export declare const BOOKS: Readonly<Record<string, () => StoredBook>>
`

/** The rules' words as one object by rule key. */
function wordsOf(rules: readonly PlacedRule[]): string {
  const entries = rules.map((rule) => {
    const { title, says, do: what } = rule.record
    return `${JSON.stringify(keyOf(rule))}:${JSON.stringify({ title, cite: firstCite(rule.record), says, do: what })}`
  })
  return `export default {\n${entries.join(',\n')}\n}\n`
}

const WORD_TYPES = `/** What is printed of a rule: \`says\` and \`do\` are templates, which \`core/texts/fill.ts\` fills. */
export interface RuleWords { readonly title: string; readonly cite: string; readonly says: string; readonly do: string }
/** By rule key. */
declare const words: Readonly<Record<string, RuleWords>>
export default words
`

const PAGE_TYPES = `import type { BookPage, RulePage } from '#core/judge/pages.ts'
/** Every rule in full, and every book with its rules by key. */
declare const pages: () => { readonly books: readonly BookPage[]; readonly rules: readonly RulePage[] }
export default pages
`

async function main(): Promise<void> {
  for (const [path, content] of Object.entries(await generateRules())) {
    await mkdir(dirname(`${PROJECT}${path}`), { recursive: true })
    await writeFile(`${PROJECT}${path}`, content)
    process.stderr.write(`wrote ${path} (${content.length} characters)\n`)
  }
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? '').href) await main()
