import type { Path, Sheet, SheetValue, Span, State } from '#core/glossary.ts'
import type { Parameters } from '#core/quantities/parameters.ts'
import type { Check } from './rule.ts'

/** A sheet as one rule sees it: the common fields, and those of one state over them. */
export interface View {
  readonly values: Record<string, SheetValue | Parameters>
  readonly spanOf: (name: string) => Span | undefined
  readonly pathOf: (name: string) => Path
  /** Which conditions hold here: many rules share one. */
  readonly applies: Map<Check, boolean>
}

/** The view of a sheet in a state (or in none), with the book's parameters under `book`. */
export function viewOf(sheet: Sheet, state: State | null, parameters: Parameters): View {
  if (state === null) {
    return {
      values: { ...sheet.values, book: parameters },
      spanOf: (name) => sheet.spans[name],
      pathOf: (name) => sheet.pathOf(name, null),
      applies: new Map(),
    }
  }
  return {
    values: { ...sheet.values, ...sheet.inState[state], book: parameters },
    spanOf: (name) => sheet.spansInState[state][name] ?? sheet.spans[name],
    pathOf: (name) => sheet.pathOf(name, state),
    applies: new Map(),
  }
}
