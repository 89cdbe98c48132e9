import type { Route } from '#server/http/route.ts'
import { ATTACHMENT_ROUTES } from './attachments.ts'
import { AUDIT_ROUTES } from './audit.ts'
import { CHECK_ROUTES } from './check.ts'
import { CHECKPOINT_ROUTES } from './checkpoints.ts'
import { CLAIM_ROUTES } from './claims.ts'
import { CONDITION_ROUTES } from './conditions.ts'
import { DOCUMENT_ROUTES } from './documents.ts'
import { DUE_ROUTES } from './due.ts'
import { INSTRUMENT_WRITE_ROUTES } from './instrument-writes.ts'
import { INSTRUMENT_ROUTES } from './instruments.ts'
import { ISSUE_ROUTES } from './issue.ts'
import { JOB_ROUTES } from './jobs.ts'
import { MAIL_ROUTES } from './mails.ts'
import { PASSWORD_ROUTES } from './passwords.ts'
import { PEOPLE_ROUTES } from './people.ts'
import { PUBLIC_ROUTES } from './public.ts'
import { REGISTER_ROUTES } from './register.ts'
import { REGISTER_FILE_ROUTES } from './register-files.ts'
import { SAMPLE_ROUTES } from './register-sample.ts'
import { REMARK_ROUTES } from './remarks.ts'
import { REPORT_STEP_ROUTES } from './report-steps.ts'
import { VIEW_ROUTES } from './report-views.ts'
import { REPORT_ROUTES } from './reports.ts'
import { REVIEW_ROUTES } from './review.ts'
import { REVISION_ROUTES } from './revisions.ts'
import { SECOND_FACTOR_ROUTES } from './second-factor.ts'
import { SESSION_ROUTES } from './session.ts'
import { THREAD_ROUTES } from './threads.ts'
import { TOKEN_ROUTES } from './tokens.ts'
import { UPLOAD_ROUTES } from './uploads.ts'

/** Every route of the API. What is not here does not exist; the OpenAPI document and the access matrix are made from it. */
export const ROUTES: readonly Route[] = [
  ...SESSION_ROUTES,
  ...PASSWORD_ROUTES,
  ...SECOND_FACTOR_ROUTES,
  ...TOKEN_ROUTES,
  ...PEOPLE_ROUTES,
  ...MAIL_ROUTES,
  ...REPORT_ROUTES,
  ...REVISION_ROUTES,
  ...VIEW_ROUTES,
  ...REPORT_STEP_ROUTES,
  ...THREAD_ROUTES,
  ...REMARK_ROUTES,
  ...REVIEW_ROUTES,
  ...ISSUE_ROUTES,
  ...DOCUMENT_ROUTES,
  ...JOB_ROUTES,
  ...CHECK_ROUTES,
  ...UPLOAD_ROUTES,
  ...ATTACHMENT_ROUTES,
  ...CLAIM_ROUTES,
  ...INSTRUMENT_ROUTES,
  ...INSTRUMENT_WRITE_ROUTES,
  ...CONDITION_ROUTES,
  ...DUE_ROUTES,
  // Names before ids: `/register/sample` is not the document “sample”.
  ...REGISTER_FILE_ROUTES,
  ...SAMPLE_ROUTES,
  ...REGISTER_ROUTES,
  ...CHECKPOINT_ROUTES,
  ...AUDIT_ROUTES,
  ...PUBLIC_ROUTES,
]
