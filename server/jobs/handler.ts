import type { Services } from '#server/services.ts'
import type { JobData, Queue } from './jobs.ts'

/**
 * Does one job. It may be called twice with the same data, also at the same time: a worker that dies leaves its job to
 * another, so the effect is made sure to happen once, and what it throws is tried again.
 */
export type Handler<Q extends Queue> = (services: Services, data: JobData[Q]) => Promise<void>
