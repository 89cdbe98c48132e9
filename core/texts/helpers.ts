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

/** The templating engine's functions that the helpers need: its full build and its runtime have both. */
export interface Templating {
  registerHelper(name: string, helper: (this: WordScene, ...given: unknown[]) => string): void
}

function fieldValue({ sheet, state }: WordScene, name: string): SheetValue | undefined {
  return (state === null ? undefined : sheet.inState[state][name]) ?? sheet.values[name]
}

function show(scene: WordScene, name: string): string {
  if (name.startsWith('book.')) {
    const parameter = name.slice('book.'.length)
    const value = (scene.parameters as unknown as Readonly<Record<string, SheetValue | null>>)[parameter]
    return shown(value ?? undefined, scene.units[parameter] ?? '')
  }
  return shown(fieldValue(scene, name), fieldsOf(scene.sheet.subject).get(name)?.unit ?? '')
}

/** Teaches a templating engine the helpers of the rules' words: `{{name}}`, `{{state}}`, `{{show "field"}}`, `{{list "field"}}`. */
export function registerHelpers(engine: Templating): void {
  engine.registerHelper('name', function () {
    return labelOf(this.sheet)
  })
  engine.registerHelper('state', function () {
    return this.state === null ? 'in either state' : STATE_WORDS[this.state]
  })
  engine.registerHelper('show', function (field) {
    return show(this, String(field))
  })
  engine.registerHelper('list', function (field) {
    return show(this, String(field))
  })
}
