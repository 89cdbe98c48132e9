import shapes from '#core/generated/sheet-shapes.js'
import type { Path, Sheet, SheetValue, SheetValues, Span, State } from '#core/glossary.ts'
import type { Parameters } from '#core/quantities/parameters.ts'

/** A sheet as one rule sees it: the common fields, and those of one state over them. */
export interface View {
  readonly values: Record<string, SheetValue | Parameters | undefined>
  readonly spanOf: (name: string) => Span | undefined
  readonly pathOf: (name: string) => Path
}

const NOTHING: SheetValues = {}

/** The view of a sheet in a state (or in none), with the book's parameters under `book`. */
export function viewOf(sheet: Sheet, state: State | null, parameters: Parameters): View {
  const { seen } = shapes[sheet.subject]
  if (state === null)
    return {
      values: seen(sheet.values, NOTHING, parameters),
      spanOf: (name) => sheet.spans[name],
      pathOf: (name) => sheet.pathOf(name, null),
    }
  return {
    values: seen(sheet.values, sheet.inState[state], parameters),
    spanOf: (name) => sheet.spansInState[state][name] ?? sheet.spans[name],
    pathOf: (name) => sheet.pathOf(name, state),
  }
}
