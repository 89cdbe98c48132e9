import type { IssueFile } from '#core/report/issue.ts'

/** Whether a value is the record of an issue, as schemas/issue.schema.json has it. */
declare const validate: (value: unknown) => value is IssueFile
export default validate
