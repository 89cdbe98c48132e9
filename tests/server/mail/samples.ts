import type { MailKind } from '#server/mail/kinds.ts'
import type { MailViews, ReviewView } from '#server/mail/views.ts'

const REPORT = { reference: 'ALD-7', title: 'Alder Mill bakery' } as const
const AT = new Date('2026-05-04T10:15:30Z')

const REVIEW: ReviewView = {
  report: REPORT,
  by: 'Rowan Heath',
  summary: 'Nearly there.',
  remarks: [
    { about: 'circuit K1 (Cold store)', words: 'Which of the two readings is in the island?' },
    { about: 'the earthing', words: 'Photo of the electrode is missing.' },
  ],
  page: '/reports/7',
}

/** One of each kind, as the record would fill it. */
export const SAMPLES: { readonly [Kind in MailKind]: MailViews[Kind] } = {
  invitation: { by: 'Rowan Heath', roles: ['installer', 'reviewer'], until: AT, page: '/invitation/abc' },
  'password reset': { until: AT, page: '/password/abc' },
  'account notice': { what: 'The password was changed', at: AT, page: '/account' },
  'review asked': { report: REPORT, by: 'Wren Marsh', failing: 2, page: '/reports/7' },
  'review submitted': REVIEW,
  'report returned': REVIEW,
  'report approved': { ...REVIEW, summary: null, remarks: [] },
  'report issued': {
    report: REPORT,
    number: 'FEN-2026-0007',
    by: 'Rowan Heath',
    page: '/reports/7',
    checkPage: '/check',
  },
  'report replaced': {
    report: REPORT,
    number: 'FEN-2026-0007',
    newNumber: 'FEN-2026-0009',
    by: 'Rowan Heath',
    reason: 'Circuit K3 was named wrongly.',
    page: '/reports/7',
  },
  'report withdrawn': {
    report: REPORT,
    number: 'FEN-2026-0007',
    by: 'Rowan Heath',
    reason: 'Tested with an instrument out of calibration.',
    page: '/reports/7',
  },
  'calibration due': {
    instruments: [
      { name: 'Loop tester', serial: 'L-1', due: '2026-05-01', overdue: true },
      { name: 'Insulation tester', serial: 'I-2', due: '2026-06-01', overdue: false },
    ],
    page: '/instruments',
  },
  'verification due': {
    installations: [
      { title: 'Heron Ford', place: 'Fennmark', number: 'FEN-2022-0003', due: '2026-06-30', overdue: false },
    ],
    page: '/register',
  },
  checkpoint: { size: 1_207, root: 'ab'.repeat(32), at: AT, page: '/register' },
}

export const KINDS = Object.keys(SAMPLES) as MailKind[]
