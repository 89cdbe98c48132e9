import type { Path, Severity } from '#core/glossary.ts'

/** Something that a file says and that a register of the house knows otherwise, or not at all. */
export interface Claim {
  /** Which check: kebab-case, never reused. */
  readonly claim:
    | 'instrument-not-in-register'
    | 'instrument-retired'
    | 'instrument-other-calibration'
    | 'instrument-not-calibrated'
    | 'operator-not-in-register'
    | 'separation-not-stated'
    | 'separation-other'
  readonly subject: string
  /** The block of the report that says it. */
  readonly anchor: string
  /** `failure` keeps the report from being issued. */
  readonly severity: Severity
  readonly message: string
  readonly remedy: string
  readonly path: Path
}
