import type { Sheet, State } from '#core/glossary.ts'
import type { FieldWords, SheetPlan } from './plan.ts'
import { PLANS } from './plans.ts'

interface Field {
  readonly name: string
  readonly title: string
  /** What it is computed from, where it is. */
  readonly from: readonly string[]
}

/** The fields of a sheet by name, and what is entered also by its place in the file: `cable.method`. */
function fieldsByName(plan: SheetPlan<unknown>): ReadonlyMap<string, Field> {
  const fields = new Map<string, Field>()
  const lists: readonly (readonly FieldWords[] | undefined)[] = [
    plan.entered,
    plan.inState,
    plan.measured,
    plan.measuredInState,
  ]
  for (const { name, title } of lists.flatMap((list) => list ?? [])) fields.set(name, { name, title, from: [] })
  for (const { name, title, from } of plan.quantities ?? []) fields.set(name, { name, title, from })
  for (const { name, title, at } of plan.entered) {
    const place = typeof at === 'function' ? '' : at.join('.')
    if (!fields.has(place)) fields.set(place, { name, title, from: [] })
  }
  return fields
}

const known = new Map<string, ReadonlyMap<string, Field>>()

function fieldsOf(subject: Sheet['subject']): ReadonlyMap<string, Field> {
  const made = known.get(subject)
  if (made) return made
  const plan = PLANS.find((candidate) => candidate.subject === subject)
  const fields = plan ? fieldsByName(plan as SheetPlan<unknown>) : new Map<string, Field>()
  known.set(subject, fields)
  return fields
}

/**
 * What somebody would have to enter or read for a missing field to be there: `capacity` lacks the cable's insulation and
 * the way it is laid, not a capacity.
 *
 * @param name the missing field
 * @param state in which it is asked for
 * @returns titles of missing entries and readings; the field's own where none of its inputs on the sheet is missing
 */
export function lacking(sheet: Sheet, name: string, state: State | null): readonly string[] {
  const fields = fieldsOf(sheet.subject)
  const isThere = (field: Field): boolean =>
    sheet.values[field.name] !== undefined || (state !== null && sheet.inState[state][field.name] !== undefined)
  const search = (wanted: string, on: ReadonlySet<string>): readonly string[] => {
    const field = fields.get(wanted)
    if (field === undefined || isThere(field) || on.has(field.name)) return []
    const deeper = field.from.flatMap((input) => search(input, new Set([...on, field.name])))
    return deeper.length > 0 ? deeper : [field.title]
  }
  const found = [...new Set(search(name, new Set()))]
  return found.length > 0 ? found : [fields.get(name)?.title ?? name]
}
