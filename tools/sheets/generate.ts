import { writeFile } from 'node:fs/promises'
import { pathToFileURL } from 'node:url'
import { fieldsOf, PLANS, stateFieldsOf } from '#core/sheets/plans.ts'

const PROJECT = new URL('../../', import.meta.url).pathname

const TYPES = `import type { SheetValue, SheetValues, Subject } from '#core/glossary.ts'
type Values = Record<string, SheetValue | undefined>
/** How the sheets of a subject are made. Written out field by field, all of a kind look alike to the engine and are quick to make, read and copy. */
export interface SheetShape {
  /** All fields that do not depend on the state, with nothing in them. */
  readonly common: () => Values
  /** All fields of a state, with nothing in them. */
  readonly inState: () => Values
  /** What the rules see: the common fields, those of a state over them, and the book's parameters. */
  readonly seen: <Book>(common: SheetValues, inState: SheetValues, book: Book) => Record<string, SheetValue | Book | undefined>
}
declare const shapes: Readonly<Record<Subject, SheetShape>>
export default shapes
`

const blank = (names: readonly string[]): string => `()=>({${names.map((name) => `${name}:void 0`).join(',')}})`

function shapeOf(subject: (typeof PLANS)[number]['subject']): string {
  const inState = stateFieldsOf(subject)
  const names = [...fieldsOf(subject).keys()]
  const seen = names.map((name) => (inState.has(name) ? `${name}:t.${name}??s.${name}` : `${name}:s.${name}`))
  const common = blank(names.filter((name) => !inState.has(name)))
  return `${JSON.stringify(subject)}:{common:${common},inState:${blank([...inState])},seen:(s,t,book)=>({${[...seen, 'book'].join(',')}})}`
}

/** The shapes of all sheets as functions: path in the project, and content. Writes nothing. */
export function generateSheets(): Record<string, string> {
  const shapes = PLANS.map(({ subject }) => shapeOf(subject))
  return {
    'core/generated/sheet-shapes.js': `export default {\n${shapes.join(',\n')}\n}\n`,
    'core/generated/sheet-shapes.d.ts': TYPES,
  }
}

async function main(): Promise<void> {
  for (const [path, content] of Object.entries(generateSheets())) {
    await writeFile(`${PROJECT}${path}`, content)
    process.stderr.write(`wrote ${path} (${content.length} characters)\n`)
  }
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? '').href) await main()
