import type { SheetValue, Subject } from '#core/glossary.ts'
import type { Install } from '#core/install.ts'
import type { Topology } from '#core/topology/topology.ts'
import type { Parameters } from './parameters.ts'

/** What every quantity may draw on: the whole file, its tree of supply, and the rule book's parameters. */
export interface Scene {
  readonly install: Install
  readonly topology: Topology
  readonly parameters: Parameters
}

/** Values computed earlier for the same subject, by quantity name. A name is missing where its inputs are. */
export type Known = Readonly<Record<string, SheetValue | undefined>>

/**
 * One computed value of one kind of subject. `compute` is called in the order of the family's list, so that later
 * quantities can draw on earlier ones through `known`; it returns undefined where an input is missing: nothing is guessed.
 */
export interface Quantity<Item> {
  readonly name: string
  /** As printed: `A`, `Ω`, `mm²`, `%`; empty for a count, a factor or a word. */
  readonly unit: string
  /** What the value is, in a few words: `Design current`. */
  readonly title: string
  /** The formula, as an apprentice would read it. */
  readonly formula: string
  /** Publication and clause, `common practice`, or `from memory`. */
  readonly source: string
  /** Inputs: places in the file (`load.power`), quantities (`capacity`), parameters (`book.loop_reading_factor`). */
  readonly from: readonly string[]
  readonly compute: (item: Item, scene: Scene, known: Known) => SheetValue | undefined
}

/** All quantities of one kind of subject. */
export interface Family<Item> {
  readonly subject: Subject
  readonly quantities: readonly Quantity<Item>[]
}
