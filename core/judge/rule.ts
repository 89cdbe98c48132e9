import type { Citation, Severity, State, Subject } from '#core/glossary.ts'
import type { Parameters } from '#core/quantities/parameters.ts'

/** Says whether a sheet's values meet a compiled JSON Schema. */
export type Check = (values: object) => boolean

/** When a rule is judged: in one state, in each of them, or in none in particular. */
export type RuleState = State | 'each' | 'none'

/** A rule ready to judge: its record without its words. */
export interface Rule {
  readonly id: string
  readonly subject: Subject
  readonly state: RuleState
  readonly severity: Severity
  /** Fields whose absence makes the verdict `not shown`. */
  readonly needs: readonly string[]
  /** Fields that `must` reads, among which the measured ones carry an uncertainty. */
  readonly reads: readonly string[]
  /** Fields that a finding points to, the first one foremost. */
  readonly at: readonly string[]
  readonly when: Check | undefined
  readonly must: Check
}

/** A rule book ready to judge by. */
export interface RuleBook {
  readonly id: string
  readonly title: string
  readonly version: string
  /** SHA-256, in hex, over the book as resolved: all its records and parameters. */
  readonly hash: string
  readonly parameters: Parameters
  readonly rules: readonly Rule[]
}

/** JSON Schema over a sheet, as it stands in a record. */
export type SheetSchema = { readonly [keyword: string]: unknown }

/** An example of a record: a patch on the base file, and the verdict that it gives. */
export interface RuleExample {
  readonly subject: string
  readonly state?: State
  readonly set?: Readonly<Record<string, unknown>>
  readonly remove?: readonly string[]
  readonly gives: 'meets' | 'fails' | 'not shown' | 'limited' | 'not applicable'
  readonly note?: string
}

/** A rule as it is written: `schemas/rule.schema.json`. */
export interface RuleRecord {
  readonly id: string
  readonly title: string
  readonly subject: Subject
  readonly state: RuleState
  readonly severity: Severity
  readonly when?: SheetSchema
  readonly must: SheetSchema
  readonly needs?: readonly string[]
  readonly at?: readonly string[]
  readonly says: string
  readonly do: string
  readonly why: string
  readonly caution?: string
  readonly cites: readonly Citation[]
  readonly examples: readonly RuleExample[]
  /** In an overlay: why this record takes the place of the base's rule of the same name. */
  readonly replaces_because?: string
}
