import type { Role } from '#core/policy/roles.ts'
import type { ReportState } from '#core/policy/states.ts'

/** What a path's first parameter names; each is made in both organisations. */
export type Subject =
  | 'report'
  | 'upload'
  | 'attachment'
  | 'thread'
  | 'draft'
  | 'person'
  | 'instrument'
  | 'condition'
  | 'document'

/**
 * Who may call a route, written down here by hand and not taken from the code that decides: a change of the policy has to
 * be made twice, and by somebody who means it.
 */
export interface Cell {
  /** Nobody needs to be signed in. */
  readonly public?: true
  readonly roles: readonly Role[]
  /** States in which a report lets it happen; every state where none are given. */
  readonly states?: readonly ReportState[]
  /** States that roles other than these see: an auditor sees what is issued. */
  readonly auditorSees?: readonly ReportState[]
  /** Who had a hand in the report may not, even with the role: four eyes. */
  readonly fourEyes?: true
  readonly subject?: Subject
  /** What is asked for is not there in this scene, so that who may ask is told so. */
  readonly absent?: true
  /** Only its author sees it: whoever may not do it is told that there is nothing. */
  readonly hidden?: true
  readonly body?: Readonly<Record<string, unknown>>
}

const ALL = ['installer', 'reviewer', 'auditor', 'administrator'] as const
const WRITERS = ['installer', 'reviewer'] as const
const REVIEWER = ['reviewer'] as const
const ADMIN = ['administrator'] as const
const ISSUED = ['issued', 'replaced', 'withdrawn'] as const
const EARLY = ['draft', 'returned'] as const

const own: Cell = { roles: ALL }
const read = { roles: ALL, auditorSees: ISSUED, subject: 'report' } as const
const attach = { roles: WRITERS, states: EARLY } as const
/** An upload belongs to who began it, here an installer. */
const mine = { roles: ['installer'], hidden: true, subject: 'upload' } as const
const annotate = { roles: REVIEWER, states: ['in review', 'approved'], fourEyes: true, subject: 'report' } as const
const PASSWORD = 'a long password for tests only'
const NOTHING = '3f000000-0000-4000-8000-000000000000'
const SHA = 'a'.repeat(64)
const INSTRUMENT = { kind: 'earth tester', calibrated_on: '2026-01-10', due_on: '2027-01-10' }
const CONDITION = { separation: 'all poles', stated_in: 'Terms of connection, 4.2', valid_from: '2026-01-01' }

/** Every route of the API, by its id. A route that is not here fails the test. */
export const ACCESS: Readonly<Record<string, Cell>> = {
  'show-session': { public: true, roles: ALL },
  'sign-in': { public: true, roles: ALL, body: { email: 'nobody@fennmark.example', password: 'x' } },
  'sign-out': own,
  'list-sessions': own,
  'end-session': { ...own, absent: true },
  'end-other-sessions': own,
  'show-link': { public: true, roles: ALL, body: { link: 'x'.repeat(43) } },
  'choose-password': { public: true, roles: ALL, body: { link: 'x'.repeat(43), new_password: 'x' } },
  'ask-for-reset': { public: true, roles: ALL, body: { email: 'nobody@fennmark.example' } },
  'change-password': { roles: ALL, body: { password: PASSWORD, new_password: 'x' } },
  'offer-second-factor': { roles: ALL, body: { password: PASSWORD } },
  'set-second-factor': { roles: ALL, body: { password: PASSWORD, secret: 'A'.repeat(32), new_code: '000000' } },
  'remove-second-factor': { roles: ALL, body: { password: PASSWORD, code: '' } },
  'list-tokens': own,
  'create-token': { roles: ALL, body: { name: 'van', scopes: ['report.read'], days: 1, password: PASSWORD } },
  'revoke-token': { ...own, absent: true },
  'list-people': { roles: ['installer', 'reviewer', 'administrator'] },
  'show-person': { roles: ADMIN, subject: 'person' },
  'invite-person': { roles: ADMIN, body: { email: 'somebody@fennmark.example', name: 'L. Birk', roles: [] } },
  'change-person': { roles: ADMIN, subject: 'person', body: { name: 'L. Birk' } },
  'invite-again': { roles: ADMIN, subject: 'person' },
  'end-sessions-of-person': { roles: ADMIN, subject: 'person' },
  'list-reports': own,
  'show-report': read,
  'create-report': { roles: WRITERS },
  'list-revisions': read,
  'create-revision': { roles: WRITERS, states: EARLY, subject: 'report' },
  'show-source': read,
  'show-model': read,
  'list-findings': read,
  'compare-revisions': read,
  'show-draft': read,
  'submit-report': { roles: WRITERS, states: EARLY, subject: 'report' },
  'recall-report': { roles: WRITERS, states: ['in review'], subject: 'report' },
  'discard-report': { roles: WRITERS, states: EARLY, subject: 'report' },
  'assign-reviewer': {
    roles: ['installer', 'reviewer', 'administrator'],
    states: ['draft', 'in review', 'returned', 'approved'],
    subject: 'report',
    body: { reviewer: null },
  },
  'list-threads': read,
  'begin-thread': { ...annotate, body: { anchor: 'site/nothing', kind: 'remark', body: 'A remark.' } },
  'answer-thread': { roles: WRITERS, subject: 'thread', body: { body: 'An answer.' } },
  'assign-thread': { roles: WRITERS, subject: 'thread', body: { assigned_to: null } },
  'resolve-thread': { roles: REVIEWER, fourEyes: true, subject: 'thread' },
  'reopen-thread': { roles: REVIEWER, fourEyes: true, subject: 'thread' },
  'delete-thread': { roles: REVIEWER, hidden: true, subject: 'draft' },
  'rewrite-remark': { roles: REVIEWER, hidden: true, subject: 'draft', body: { body: 'Another remark.' } },
  'delete-remark': { roles: REVIEWER, hidden: true, subject: 'draft' },
  'show-review': read,
  'submit-review': { ...annotate, body: { decision: 'remarks' } },
  'return-report': { ...annotate, body: { summary: 'Mend it.' } },
  'approve-report': { ...annotate, states: ['in review'] },
  'decide-departure': {
    ...annotate,
    states: ['in review'],
    body: { anchor: 'site/nothing', words_sha256: SHA, accepted: true, reason: 'agreed' },
  },
  'issue-report': { ...annotate, states: ['approved'], body: { password: PASSWORD } },
  'correct-report': { roles: WRITERS, states: ['issued'], subject: 'report', body: { reason: 'a wrong reading' } },
  'withdraw-report': {
    roles: ['reviewer', 'administrator'],
    states: ['issued'],
    subject: 'report',
    body: { reason: 'the wrong building', password: PASSWORD },
  },
  'show-document': { roles: ALL, subject: 'report', absent: true },
  'download-document': { roles: ALL, subject: 'report', absent: true },
  'show-proof': { roles: ALL, subject: 'report', absent: true },
  'list-jobs': { roles: ADMIN },
  'retry-job': { roles: ADMIN, absent: true, body: {} },
  'check-file': { roles: WRITERS },
  'begin-upload': { ...attach, subject: 'report', body: { name: 'a.jpg', size: 10, sha256: SHA } },
  'list-uploads': read,
  'show-upload': mine,
  'send-part': mine,
  'complete-upload': mine,
  'list-attachments': read,
  // The row is there, its bytes are not.
  'show-photo': { roles: ALL, auditorSees: ISSUED, subject: 'attachment' },
  'remove-attachment': { ...attach, subject: 'attachment' },
  'list-claims': read,
  'list-instruments': own,
  'export-instruments': own,
  'show-instrument': { roles: ALL, subject: 'instrument' },
  'create-instrument': { roles: ADMIN, body: { serial: 'S-1', ...INSTRUMENT } },
  'write-instrument-version': { roles: ADMIN, subject: 'instrument', body: INSTRUMENT },
  'retire-instrument': { roles: ADMIN, subject: 'instrument', body: { retired: true, reason: 'it fell' } },
  'list-conditions': own,
  'export-conditions': own,
  'show-condition': { roles: ALL, subject: 'condition' },
  'create-condition': { roles: ADMIN, body: { operator: 'Fennmark Grid', ...CONDITION } },
  'write-condition-version': { roles: ADMIN, subject: 'condition', body: CONDITION },
  'list-mail-switches': own,
  'switch-mail': { roles: ALL, body: { kind: 'report issued', on: true } },
  'list-mails': { roles: ADMIN },
  'list-due': own,
  'search-register': own,
  'export-register': own,
  'show-register-document': { roles: ALL, subject: 'document' },
  // Sealed by the worker, which does not run in this scene.
  'download-register-pdf': { roles: ALL, subject: 'document', absent: true },
  'download-register-source': { roles: ALL, subject: 'document' },
  'download-register-proof': { roles: ALL, subject: 'document', absent: true },
  'download-register-archive': { roles: ALL, absent: true, body: { documents: [NOTHING] } },
  'draw-sample': { roles: ['auditor', 'administrator'], body: { size: 1 } },
  'recompute-documents': { roles: ['auditor', 'administrator'], absent: true, body: { documents: [NOTHING] } },
  'list-checkpoints': own,
  'show-consistency': { roles: ALL, absent: true },
  'list-audit-events': { roles: ['auditor', 'administrator'] },
  'export-audit-events': { roles: ['auditor', 'administrator'] },
  'verify-audit-events': { roles: ['auditor', 'administrator'] },
  'check-document': { public: true, roles: ALL },
}
