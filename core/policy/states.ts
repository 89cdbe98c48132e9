/** The states of a report, from the first upload to the record that others rely on. */
export const REPORT_STATES = ['draft', 'in review', 'returned', 'approved', 'issued', 'replaced', 'withdrawn'] as const
export type ReportState = (typeof REPORT_STATES)[number]

/** Each step that changes a report's state: where it may start, and where it leads. */
export const STEPS = {
  submit: { from: ['draft', 'returned'], to: 'in review' },
  recall: { from: ['in review'], to: 'draft' },
  return: { from: ['in review', 'approved'], to: 'returned' },
  approve: { from: ['in review'], to: 'approved' },
  issue: { from: ['approved'], to: 'issued' },
  replace: { from: ['issued'], to: 'replaced' },
  withdraw: { from: ['issued'], to: 'withdrawn' },
} as const satisfies Readonly<Record<string, { readonly from: readonly ReportState[]; readonly to: ReportState }>>

export type Step = keyof typeof STEPS

/** Whether a step may start from a state. */
export function stepAllowed(step: Step, state: ReportState): boolean {
  const from: readonly ReportState[] = STEPS[step].from
  return from.includes(state)
}

/** States in which the file may still change: a new revision may be uploaded. */
export const WRITABLE: readonly ReportState[] = ['draft', 'returned']

/** States of a report that has a number and is part of the register. */
export const ISSUED: readonly ReportState[] = ['issued', 'replaced', 'withdrawn']
