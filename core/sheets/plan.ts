import type { Measured, Path, SheetValue, State, Subject } from '#core/glossary.ts'
import type { UncertaintyKind } from '#core/install/record.ts'
import type { Quantity, Scene } from '#core/quantities/quantity.ts'

/** How a sheet field is printed and explained. */
export interface FieldWords {
  /** As rules name it: `cable_length`. */
  readonly name: string
  /** As printed: `A`, `Ω`, `mm²`; empty for words, counts and factors. */
  readonly unit: string
  /** In a few words: `Length of the cable`. */
  readonly title: string
}

/** A value from the file, or one that follows from names and tree alone. */
export interface EnteredField<Item> extends FieldWords {
  /** Where it stands, relative to the subject's own place; or from the top of the file, for what stands apart from it. */
  readonly at: Path | ((item: Item) => Path)
  readonly value: (item: Item, scene: Scene) => SheetValue | undefined
}

/** A value that holds in one state, under the same name for both. */
export interface StateField<Item> extends FieldWords {
  /** Where it stands, relative to the subject's own place; or from the top of the file. */
  readonly at: Path | ((item: Item, state: State) => Path)
  readonly value: (item: Item, scene: Scene, state: State) => SheetValue | undefined
}

/** A reading off an instrument. Its path is from the top of the file, since readings stand apart from what they are of. */
export interface MeasuredField<Item> extends FieldWords {
  readonly kind: UncertaintyKind
  readonly path: (item: Item) => Path
  readonly reading: (item: Item, scene: Scene) => Measured | undefined
}

/** A reading taken in each state. */
export interface StateMeasuredField<Item> extends FieldWords {
  readonly kind: UncertaintyKind
  readonly path: (item: Item, state: State) => Path
  readonly reading: (item: Item, scene: Scene, state: State) => Measured | undefined
}

/** How the sheets of one kind of subject are made. */
export interface SheetPlan<Item> {
  readonly subject: Subject
  readonly items: (scene: Scene) => readonly Item[]
  readonly id: (item: Item) => string
  readonly path: (item: Item, scene: Scene) => Path
  /** The instrument that the readings of this item were taken with. */
  readonly instrument?: (item: Item, scene: Scene) => string | undefined
  readonly entered: readonly EnteredField<Item>[]
  readonly inState?: readonly StateField<Item>[]
  readonly measured?: readonly MeasuredField<Item>[]
  readonly measuredInState?: readonly StateMeasuredField<Item>[]
  readonly quantities?: readonly Quantity<Item>[]
}

/** One row of an `entered` list. */
export function entered<Item>(
  name: string,
  unit: string,
  title: string,
  at: EnteredField<Item>['at'],
  value: EnteredField<Item>['value'],
): EnteredField<Item> {
  return { name, unit, title, at, value }
}
