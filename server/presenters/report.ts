import type { Report, ReportRow } from '#server/queries/reports.ts'

/** The shape of a report in answers; the OpenAPI document shows it. */
export const REPORT_SCHEMA = {
  type: 'object',
  properties: {
    id: { type: 'string', format: 'uuid' },
    state: { type: 'string' },
    reference: { type: 'string' },
    title: { type: 'string' },
    place: { type: 'string' },
    purpose: { type: ['string', 'null'] },
    inspected_on: { type: ['string', 'null'], format: 'date' },
    due_on: { type: ['string', 'null'], format: 'date' },
    outcome: { type: 'string' },
    revision: { type: 'integer' },
    number: { type: ['string', 'null'] },
    corrects: { type: ['string', 'null'], format: 'uuid' },
    correction_reason: { type: ['string', 'null'] },
    created_by: { type: 'string', format: 'uuid' },
    reviewer: { type: ['string', 'null'], format: 'uuid' },
    version: { type: 'integer' },
    created_at: { type: 'string', format: 'date-time' },
    updated_at: { type: 'string', format: 'date-time' },
  },
  required: ['id', 'state', 'reference', 'title', 'outcome', 'revision', 'version'],
  additionalProperties: false,
} as const

export function presentReport(row: ReportRow) {
  return {
    id: row.report_id,
    state: row.state,
    reference: row.reference,
    title: row.title,
    place: row.place,
    purpose: row.purpose,
    inspected_on: row.inspected_on,
    due_on: row.due_on,
    outcome: row.outcome,
    revision: row.revision,
    number: row.number,
    corrects: row.corrects,
    correction_reason: row.correction_reason,
    created_by: row.created_by,
    reviewer: row.reviewer_id,
    version: row.version,
    created_at: row.created_at.toISOString(),
    updated_at: row.updated_at.toISOString(),
  }
}

/** One report with everybody who had a hand in it: what the policy decides by, so that the browser can tell the reason. */
export const REPORT_WITH_HANDS_SCHEMA = {
  ...REPORT_SCHEMA,
  properties: {
    ...REPORT_SCHEMA.properties,
    uploaders: { type: 'array', items: { type: 'string', format: 'uuid' } },
    workers: {
      type: 'array',
      items: {
        type: 'object',
        properties: { name: { type: 'string' }, licence: { type: ['string', 'null'] } },
        required: ['name', 'licence'],
      },
    },
  },
  required: [...REPORT_SCHEMA.required, 'uploaders', 'workers'],
} as const

export function presentReportWithHands(report: Report) {
  const { uploaders, workers } = report.facts
  return { ...presentReport(report), uploaders, workers }
}
