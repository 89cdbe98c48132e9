import type { Judged } from '#core/engine.ts'
import type { Claim } from '#core/review/claim.ts'
import { pointerOf } from '#server/commands/judge-source.ts'

export const CLAIM_SCHEMA = {
  type: 'object',
  properties: {
    claim: { type: 'string' },
    subject: { type: 'string' },
    anchor: { type: 'string' },
    severity: { type: 'string', enum: ['failure', 'caution', 'note'] },
    message: { type: 'string' },
    remedy: { type: 'string' },
    path: { type: 'string' },
    line: { type: 'integer' },
    column: { type: 'integer' },
  },
  required: ['claim', 'subject', 'anchor', 'severity', 'message', 'remedy', 'path', 'line', 'column'],
} as const

export function presentClaim(claim: Claim, { locate }: Pick<Judged, 'locate'>) {
  const { path, ...told } = claim
  const { line, column } = locate(path)
  return { ...told, path: pointerOf(path), line, column }
}
