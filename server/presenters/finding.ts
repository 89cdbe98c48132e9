import { findingAnchor } from '#core/report/finding-blocks.ts'
import type { ToldFinding } from '#core/report/told.ts'
import { pointerOf } from '#server/commands/judge-source.ts'

const PLACE = {
  type: 'object',
  properties: { path: { type: 'string' }, line: { type: 'integer' }, column: { type: 'integer' } },
  required: ['path', 'line', 'column'],
} as const

/** A finding as the command line's JSON has it. */
export const FINDING_SCHEMA = {
  type: 'object',
  properties: {
    anchor: { type: 'string' },
    rule: { type: 'string' },
    subject: { type: 'string' },
    state: { type: ['string', 'null'] },
    verdict: { type: 'string' },
    severity: { type: 'string' },
    message: { type: 'string' },
    remedy: { type: 'string' },
    cite: { type: 'string' },
    path: { type: 'string' },
    line: { type: 'integer' },
    column: { type: 'integer' },
    related: { type: 'array', items: PLACE },
    departure: { type: 'object' },
  },
  required: ['rule', 'subject', 'verdict', 'severity', 'message', 'path', 'line', 'column', 'related'],
} as const

export function presentFinding({ path, range, related, ...told }: ToldFinding) {
  const { rule, subject, state, verdict, severity, message, remedy, cite, departure } = told
  return {
    anchor: findingAnchor(told),
    rule,
    subject,
    state,
    verdict,
    severity,
    message,
    remedy,
    cite,
    path: pointerOf(path),
    line: range.line,
    column: range.column,
    related: related.map((place) => ({
      path: pointerOf(place.path),
      line: place.range.line,
      column: place.range.column,
    })),
    ...(departure && { departure }),
  }
}
