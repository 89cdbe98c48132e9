import { refuse } from '#server/http/problems.ts'
import { route } from '#server/http/route.ts'
import { countWaiting, listFailed, retryFailed } from '#server/queries/failed-jobs.ts'

const FAILED_SCHEMA = {
  type: 'object',
  properties: {
    id: { type: 'string', format: 'uuid' },
    queue: { type: 'string' },
    about: { type: 'object' },
    reason: { type: 'string' },
    tries: { type: 'integer' },
    created_at: { type: 'string', format: 'date-time' },
    failed_at: { type: ['string', 'null'], format: 'date-time' },
  },
  required: ['id', 'queue', 'about', 'reason', 'tries', 'created_at', 'failed_at'],
} as const

/** The message of what a handler threw, as the queue has kept it. */
function reasonOf(output: unknown): string {
  if (typeof output !== 'object' || output === null || !('message' in output)) return 'No reason was kept.'
  return String(output.message)
}

const listRoute = route({
  id: 'list-jobs',
  method: 'get',
  path: '/jobs',
  summary: 'Jobs that were given up, with the reason, and how many wait',
  tag: 'jobs',
  policy: { action: 'job.manage' },
  limit: 'read',
  answers: {
    200: {
      type: 'object',
      properties: {
        failed: { type: 'array', items: FAILED_SCHEMA },
        waiting: {
          type: 'array',
          items: {
            type: 'object',
            properties: { queue: { type: 'string' }, count: { type: 'integer' } },
            required: ['queue', 'count'],
          },
        },
      },
      required: ['failed', 'waiting'],
    },
  },
  async run({ tx, actor }) {
    const failed = await listFailed(tx, actor.organisation)
    return {
      body: {
        failed: failed.map(({ id, queue, data, output, retry_count, created_on, completed_on }) => ({
          id,
          queue,
          about: data,
          reason: reasonOf(output),
          tries: retry_count + 1,
          created_at: created_on.toISOString(),
          failed_at: completed_on?.toISOString() ?? null,
        })),
        waiting: await countWaiting(tx, actor.organisation),
      },
    }
  },
})

const retryRoute = route({
  id: 'retry-job',
  method: 'post',
  path: '/jobs/:job/retry',
  summary: 'Puts a job that was given up back on its queue',
  tag: 'jobs',
  body: { type: 'object', properties: {}, additionalProperties: false },
  policy: { action: 'job.manage' },
  limit: 'write',
  answers: { 204: null },
  async run({ tx, actor, params }) {
    return (await retryFailed(tx, actor.organisation, params['job'] ?? '')) ? {} : refuse('not-found')
  },
})

export const JOB_ROUTES = [listRoute, retryRoute]
