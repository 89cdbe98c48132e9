import type { Logger } from 'pino'

/**
 * Ends the process in good order at SIGTERM or SIGINT, at once at the second; and at anything that nobody caught, since
 * a process in an unknown state must not go on. Whoever watches over it starts it again.
 */
export function stopOnSignal(log: Logger, end: () => Promise<void>): void {
  let stopping = false
  const stop = (signal: string): void => {
    if (stopping) process.exit(1)
    stopping = true
    log.info({ event: 'stopping', signal }, 'stopping')
    end().then(
      () => process.exit(0),
      (error: unknown) => {
        log.error({ event: 'stop-failed', err: error }, 'could not stop in good order')
        process.exit(1)
      },
    )
  }
  process.on('SIGTERM', stop)
  process.on('SIGINT', stop)
  const crash = (error: unknown): void => {
    log.fatal({ event: 'crash', err: error }, 'unexpected failure')
    process.exit(1)
  }
  process.on('uncaughtException', crash)
  process.on('unhandledRejection', crash)
}
