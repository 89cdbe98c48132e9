import { countVerdicts, toldFindings } from '#core/report/told.ts'
import { judgeSource } from '#server/commands/judge-source.ts'
import { refuse } from '#server/http/problems.ts'
import { route } from '#server/http/route.ts'
import { NO_SOURCE, sourceBytes } from '#server/http/source-body.ts'
import { FINDING_SCHEMA, presentFinding } from '#server/presenters/finding.ts'

const checkRoute = route({
  id: 'check-file',
  method: 'post',
  path: '/check',
  summary: 'Judges an install file and stores nothing',
  tag: 'reports',
  accepts: 'source',
  policy: { action: 'report.create' },
  scope: 'report.send',
  limit: 'write',
  audited: false,
  answers: {
    200: {
      type: 'object',
      properties: {
        version: { type: 'string' },
        rulebook: { type: 'object' },
        outcome: { type: 'string' },
        findings: { type: 'array', items: FINDING_SCHEMA },
        counts: { type: 'object' },
      },
      required: ['version', 'rulebook', 'outcome', 'findings', 'counts'],
    },
  },
  async run({ body }) {
    const source = sourceBytes(body)
    if (source === undefined) return NO_SOURCE
    const result = judgeSource(source)
    if (!result.ok) return refuse('file-refused', undefined, { errors: result.errors })
    const { judged, lifted } = result
    return {
      body: {
        version: lifted.software,
        rulebook: lifted.rulebook,
        outcome: lifted.outcome,
        findings: toldFindings(judged, false).map(presentFinding),
        counts: countVerdicts(judged.findings),
      },
    }
  },
})

export const CHECK_ROUTES = [checkRoute]
