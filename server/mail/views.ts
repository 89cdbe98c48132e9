/** The path of a page of ours, with its leading slash; the address before it comes from the configuration only. */
export type Path = `/${string}`

/** A calendar day, `2026-05-04`. */
export type Day = string

export interface ReportName {
  readonly reference: string
  readonly title: string
}

/** A remark, by the name of what it is about. */
export interface RemarkView {
  readonly about: string
  readonly words: string
}

/** What a reviewer said in one review. */
export interface ReviewView {
  readonly report: ReportName
  readonly by: string
  readonly summary: string | null
  readonly remarks: readonly RemarkView[]
  readonly page: Path
}

interface DueView {
  readonly due: Day
  readonly overdue: boolean
}

interface EndView {
  readonly report: ReportName
  readonly number: string
  readonly by: string
  readonly reason: string
  readonly page: Path
}

/** What each kind of mail is filled from. Text may hold anything that people write; it is never read as a template. */
export interface MailViews {
  readonly invitation: {
    readonly by: string
    readonly roles: readonly string[]
    readonly until: Date
    readonly page: Path
  }
  readonly 'password reset': { readonly until: Date; readonly page: Path }
  readonly 'account notice': {
    /** What happened, as the beginning of a sentence: `The password was changed`. */
    readonly what: string
    readonly at: Date
    readonly page: Path
  }
  readonly 'review asked': {
    readonly report: ReportName
    readonly by: string
    /** How many findings are at failure level. */
    readonly failing: number
    readonly page: Path
  }
  readonly 'review submitted': ReviewView
  readonly 'report returned': ReviewView
  readonly 'report approved': ReviewView
  readonly 'report issued': {
    readonly report: ReportName
    readonly number: string
    readonly by: string
    readonly page: Path
    /** Where anybody can check the PDF. */
    readonly checkPage: Path
  }
  readonly 'report replaced': EndView & { readonly newNumber: string }
  readonly 'report withdrawn': EndView
  readonly 'calibration due': {
    readonly instruments: readonly (DueView & { readonly name: string; readonly serial: string })[]
    readonly page: Path
  }
  readonly 'verification due': {
    readonly installations: readonly (DueView & {
      readonly title: string
      readonly place: string
      /** The report of the last verification. */
      readonly number: string
    })[]
    readonly page: Path
  }
  readonly checkpoint: {
    /** How many entries the register holds. */
    readonly size: number
    readonly root: string
    readonly at: Date
    readonly page: Path
  }
}
