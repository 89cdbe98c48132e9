import type { Sheet, SheetValue, State } from '#core/glossary.ts'
import type { Parameters } from '#core/quantities/parameters.ts'
import { fieldsOf } from '#core/sheets/plans.ts'
import { labelOf, STATE_WORDS } from './label.ts'
import { shown } from './value.ts'

/** What a rule's words are filled from. */
export interface WordScene {
  readonly sheet: Sheet
  readonly state: State | null
  readonly parameters: Parameters
  /** Units of the book's parameters. */
  readonly units: Readonly<Record<string, string>>
}

/** Fills one part of a rule's words. */
export type Printer = (scene: WordScene) => string

function fieldValue({ sheet, state }: WordScene, name: string): SheetValue | undefined {
  return (state === null ? undefined : sheet.inState[state][name]) ?? sheet.values[name]
}

function parameterShown({ parameters, units }: WordScene, name: string): string {
  const value = (parameters as unknown as Readonly<Record<string, SheetValue | null>>)[name]
  return shown(value ?? undefined, units[name] ?? '')
}

function fieldShown(scene: WordScene, name: string): string {
  return shown(fieldValue(scene, name), fieldsOf(scene.sheet.subject).get(name)?.unit ?? '')
}

const PLAIN: ReadonlyMap<string, Printer> = new Map<string, Printer>([
  ['name', ({ sheet }) => labelOf(sheet)],
  ['state', ({ state }) => (state === null ? 'in either state' : STATE_WORDS[state])],
])

/** A field of the sheet, or `book.` and a parameter of the book. */
const FIELD = /^(?:show|list) "(?:(book)\.)?([A-Za-z0-9_.]+)"$/

function expression(inside: string): Printer {
  const plain = PLAIN.get(inside)
  if (plain) return plain
  const [, book, name] = FIELD.exec(inside) ?? []
  if (name === undefined) throw new Error(`A rule's words use {{${inside}}}, which nothing fills.`)
  return book === undefined ? (scene) => fieldShown(scene, name) : (scene) => parameterShown(scene, name)
}

/**
 * Makes a rule's words ready to be filled from a sheet. They know `{{name}}`, `{{state}}`, `{{show "field"}}` and
 * `{{list "field"}}`, a parameter of the book being `book.` and its name; `lint.ts` holds every rule to that.
 *
 * @param template as the rule's record has it
 * @throws Error for any other expression: the rule was not looked at when its book was made
 */
export function printerOf(template: string): Printer {
  // Split by what it captures, the list alternates between text and the inside of an expression.
  const parts = template.split(/\{\{\s*([^}]*?)\s*\}\}/)
  const printers = parts.map((part, index) => (index % 2 === 0 ? () => part : expression(part)))
  return (scene) => {
    let text = ''
    for (const print of printers) text += print(scene)
    return text
  }
}
