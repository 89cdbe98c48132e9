import type { Install } from '#core/install.ts'

interface Content {
  /** Where it would stand in the report. */
  readonly anchor: string
  readonly has: (install: Install) => boolean
  readonly message: string
}

/**
 * What a report must say beside its results, after ISO/IEC 17025:2017, 7.8.2.1 (customer, dates of the test, who is
 * answerable for it), as far as the install file may leave it out: the schema asks for the rest.
 */
const CONTENT: readonly Content[] = [
  {
    anchor: 'site/customer',
    has: ({ site }) => site.customer !== undefined,
    message: 'The report must name the customer: enter site.customer.',
  },
  {
    anchor: 'report/inspected',
    has: ({ report }) => report.inspected !== undefined,
    message: 'The report must state the days of the inspection: enter report.inspected.',
  },
  {
    anchor: 'person/tested_by',
    has: ({ people }) => people?.tested_by !== undefined,
    message: 'The report must name who tested: enter people.tested_by.',
  },
]

/** What a report must say, and a file does not. */
export function missingContent(install: Install): Pick<Content, 'anchor' | 'message'>[] {
  return CONTENT.filter(({ has }) => !has(install)).map(({ anchor, message }) => ({ anchor, message }))
}
