import type { Judged } from '#core/engine.ts'
import type { SheetValue } from '#core/glossary.ts'
import type { Quantity } from '#core/quantities/quantity.ts'
import { PLANS } from '#core/sheets/plans.ts'

/** One computed quantity, with what it takes to check it by hand. */
export interface Fact {
  readonly value: SheetValue
  readonly unit: string
  readonly formula: string
  readonly source: string
  readonly from: readonly string[]
}

/** Quantities by subject id, then by name. */
export type Facts = Readonly<Record<string, Readonly<Record<string, Fact>>>>

type AnyQuantity = Pick<Quantity<never>, 'name' | 'unit' | 'formula' | 'source' | 'from'>

const quantitiesOf = (subject: string): readonly AnyQuantity[] =>
  PLANS.find((plan) => plan.subject === subject)?.quantities ?? []

/** The quantities as they are embedded in a report: the text whose hash stands in the register. */
export function factsText(judged: Pick<Judged, 'sheets'>): string {
  return `${JSON.stringify(factsOf(judged), null, 2)}\n`
}

/** Every quantity that could be computed from a file. One whose inputs are missing is left out: nothing is guessed. */
export function factsOf({ sheets }: Pick<Judged, 'sheets'>): Facts {
  const facts = sheets.map(({ subject, id, values }) => {
    const known = quantitiesOf(subject).flatMap(({ name, unit, formula, source, from }) => {
      const value = values[name]
      return value === undefined ? [] : [[name, { value, unit, formula, source, from }] as const]
    })
    return [id, Object.fromEntries(known)] as const
  })
  return Object.fromEntries(facts.filter(([, known]) => Object.keys(known).length > 0))
}
