import type { Path, State } from '#core/glossary.ts'
import type { EnteredField, MeasuredField, SheetPlan, StateField, StateMeasuredField } from './plan.ts'

/** Tells where a field stands: `path` is the subject's own place. */
export type Places<Item> = (name: string, state: State | null, item: Item, path: Path) => Path

const byName = <Field extends { readonly name: string }>(fields: readonly Field[] = []): ReadonlyMap<string, Field> =>
  new Map(fields.map((field) => [field.name, field]))

function made<Item>(plan: SheetPlan<Item>): Places<Item> {
  const entered: ReadonlyMap<string, EnteredField<Item>> = byName(plan.entered)
  const measured: ReadonlyMap<string, MeasuredField<Item>> = byName(plan.measured)
  const inState: ReadonlyMap<string, StateField<Item>> = byName(plan.inState)
  const measuredInState: ReadonlyMap<string, StateMeasuredField<Item>> = byName(plan.measuredInState)
  const placeInState = (name: string, state: State, item: Item, path: Path): Path | undefined => {
    const reading = measuredInState.get(name)
    if (reading) return reading.path(item, state)
    const field = inState.get(name)
    return field && (typeof field.at === 'function' ? field.at(item, state) : [...path, ...field.at])
  }
  return (name, state, item, path) => {
    const special = state === null ? undefined : placeInState(name, state, item, path)
    if (special) return special
    const reading = measured.get(name)
    if (reading) return reading.path(item)
    const field = entered.get(name)
    if (!field) return path
    return typeof field.at === 'function' ? field.at(item) : [...path, ...field.at]
  }
}

const known = new Map<unknown, unknown>()

/** Where the fields of a plan stand; worked out once for each plan, and asked only for what is told. */
export function placesOf<Item>(plan: SheetPlan<Item>): Places<Item> {
  const places = (known.get(plan) as Places<Item> | undefined) ?? made(plan)
  known.set(plan, places)
  return places
}
