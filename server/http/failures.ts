/** Codes of the network and of PostgreSQL that mean: not now. */
const DOWN_CODES = new Set([
  'ECONNREFUSED',
  'ECONNRESET',
  'EPIPE',
  'ETIMEDOUT',
  'ENOTFOUND',
  '57P01', // the administrator ended the connection
  '57P02', // crash of another server process
  '57P03', // the database is starting up
  '53300', // too many connections
  '55P03', // a lock was not to be had in time
  '57014', // the statement took too long
  '08000',
  '08003',
  '08006',
  'OVERLOADED', // more waits for its turn than we keep waiting
])

const DOWN_WORDS =
  /Timeout acquiring a connection|Connection terminated|timeout expired|Client has encountered a connection error|Connection ended unexpectedly/

/** Whether an exception says that the database does not answer, rather than that something is wrong with us. */
export function isDatabaseDown(error: unknown): boolean {
  if (!(error instanceof Error)) return false
  const code = 'code' in error && typeof error.code === 'string' ? error.code : ''
  return DOWN_CODES.has(code) || DOWN_WORDS.test(error.message) || ('cause' in error && isDatabaseDown(error.cause))
}
