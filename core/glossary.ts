/**
 * The nouns of Skerry, one word for one thing. A new noun goes here first.
 *
 * Electrical terms follow IEC 60050 (the International Electrotechnical Vocabulary); the words below are the project's own.
 */

/** The way to a value in the install file: keys and zero-based indexes from the top. `[]` is the whole file. */
export type Path = readonly (string | number)[]

/** A stretch of the file. Lines and columns count from 1 (columns in UTF-16 code units), offsets from 0; the end is exclusive. */
export interface Range {
  readonly line: number
  readonly column: number
  readonly endLine: number
  readonly endColumn: number
  readonly offset: number
  readonly endOffset: number
}

/** Something that keeps a file from being judged: where it is, what was found, what is allowed, what to do. */
export interface Problem {
  /** One of the closed list in `core/errors.ts`, kebab-case. */
  readonly code: string
  readonly path: Path
  /** Known for problems found in the text itself; otherwise looked up from `path` when it is shown. */
  readonly range?: Range
  /** One finished sentence, ending with what to do about it. */
  readonly message: string
}

/** The two states of the changeover: the building on the public grid, or on its own island. */
export type State = 'grid' | 'island'
export const STATES = ['grid', 'island'] as const satisfies readonly State[]

/** Line conductors, IEC 60445. */
export type Line = 'L1' | 'L2' | 'L3'
export const LINES = ['L1', 'L2', 'L3'] as const satisfies readonly Line[]

/** What was read off an instrument, in the unit that the schema names for the place. */
export interface Reading {
  readonly value: number
  /** `above` for `>999 MΩ`, `below` for `<0.05 Ω`: the instrument's range ended at `value`. */
  readonly bound?: 'above' | 'below'
  /** Test voltage in V, where the reading states one (`180 MΩ at 1000 V`). */
  readonly at?: number
  /** `no trip`: the residual-current device did not operate. `value` is then Infinity. */
  readonly noTrip?: true
}

/** A reading that is missing on purpose: a limitation that the report states. */
export interface NotTested {
  readonly not_tested: string
}

/** What stands in the place of a reading: the reading, or why there is none. */
export type Measured = Reading | NotTested

/** What a sheet field can hold. */
export type SheetValue = string | number | boolean | readonly SheetValue[] | { readonly [key: string]: SheetValue }

/** What a rule is about. */
export type Subject =
  | 'installation'
  | 'supply'
  | 'earthing'
  | 'changeover'
  | 'circuit'
  | 'residual-current device'
  | 'overcurrent device'
  | 'inverter'
  | 'array'
  | 'string'
  | 'battery'
  | 'meter'
  | 'bus'
  | 'instrument'
  | 'transfer'
  | 'load step'
  | 'person'

/** Values by field; undefined, or not there at all, where the file does not tell. */
export type SheetValues = Readonly<Record<string, SheetValue | undefined>>

/** Values of one subject, flat, as the rules see them. */
export interface Sheet {
  readonly subject: Subject
  /** `K1`, `A1/1`, `CO`, `installation`: unique over all subjects of a file. */
  readonly id: string
  /** Entered, computed and measured values that do not depend on the state. */
  readonly values: SheetValues
  /** Values that hold in one state only, under the same names for both. */
  readonly inState: Readonly<Record<State, SheetValues>>
  /** For measured fields: the interval in which the true value lies (common fields, then per state). */
  readonly spans: Readonly<Record<string, Span>>
  readonly spansInState: Readonly<Record<State, Readonly<Record<string, Span>>>>
  /** Where a field stands, or would stand, in the file; the subject's own place for one that stands nowhere. */
  readonly pathOf: (name: string, state: State | null) => Path
  /** Where the subject itself stands. */
  readonly path: Path
}

/** The interval of a measured value, both ends in the field's unit. */
export interface Span {
  readonly low: number
  readonly high: number
}

export type Severity = 'failure' | 'caution' | 'note'

export type Verdict =
  | 'meets'
  | 'meets, inside the uncertainty'
  | 'fails, inside the uncertainty'
  | 'fails'
  | 'not shown'
  | 'limited'
  | 'not applicable'

/** A publication, or the honest absence of one. */
export interface Citation {
  /** `IEC 60364-4-41:2005+A1:2017`, `common practice`, `from memory`. */
  readonly publication: string
  readonly clause?: string
  /** How the figure reached this book, when not from the publication itself. */
  readonly note?: string
}

/** One judged rule on one subject, in one state where the rule has one. */
export interface Finding {
  readonly rule: string
  readonly subject: string
  readonly state: State | null
  readonly verdict: Verdict
  readonly severity: Severity
  readonly path: Path
  /** Other places that the rule looked at. */
  readonly related: readonly Path[]
  /** Fields that are missing, for `not shown` and `limited`. */
  readonly missing: readonly string[]
  /** The stated reason, for `limited`. */
  readonly reason?: string
  /** Set when the file departs from this rule on purpose. */
  readonly departure?: Departure
}

/** A rule not met on purpose. */
export interface Departure {
  readonly rule: string
  readonly subject: string
  readonly reason: string
  readonly agreed_by: string
  readonly on: string
}
