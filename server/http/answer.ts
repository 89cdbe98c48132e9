import { Readable } from 'node:stream'
import { pipeline as pump } from 'node:stream/promises'
import type { Response } from 'express'
import type { Logger } from 'pino'
import { isDatabaseDown } from './failures.ts'
import { PROBLEMS, problemBody, type Refused, refuse } from './problems.ts'
import type { Answer } from './route.ts'

/** A whole answer, ready to be sent or kept. */
export interface Ready {
  readonly status: number
  readonly headers: Readonly<Record<string, string>>
  readonly body: string
}

const JSON_TYPE = 'application/json; charset=utf-8'

export const etag = (version: number): string => `"${version}"`

/** Turns what a route gave back into status, headers and text. Answers with bytes are sent as they are. */
export function ready(answer: Answer): Ready {
  const empty = answer.body === undefined
  return {
    status: answer.status ?? (empty ? 204 : 200),
    headers: {
      ...(empty ? {} : { 'content-type': JSON_TYPE }),
      ...(answer.version === undefined ? {} : { etag: etag(answer.version) }),
      ...answer.headers,
    },
    body: empty ? '' : JSON.stringify(answer.body),
  }
}

export function send(response: Response, { status, headers, body }: Ready): void {
  response.status(status).set(headers)
  if (body === '') response.end()
  else response.send(body)
}

export async function sendBytes(response: Response, answer: Answer, bytes: Uint8Array | Readable): Promise<void> {
  response.status(answer.status ?? 200).set({
    'content-type': answer.type ?? 'application/octet-stream',
    'content-security-policy': "sandbox; default-src 'none'",
    ...(answer.version === undefined ? {} : { etag: etag(answer.version) }),
    ...answer.headers,
  })
  if (bytes instanceof Uint8Array) response.set('content-length', String(bytes.byteLength))
  await pump(bytes instanceof Uint8Array ? Readable.from([bytes]) : bytes, response)
}

export function sendProblem(response: Response, refused: Refused, request: string): void {
  const { status } = PROBLEMS[refused.refused]
  response
    .status(status)
    .set({ 'content-type': 'application/problem+json; charset=utf-8', ...refused.headers })
    .send(JSON.stringify(problemBody(refused, request)))
}

/** What a client is told of an exception: that the database is away, or that the fault is ours; the rest goes to the log. */
export function sendFailure(response: Response, error: unknown, request: string, log: Logger): void {
  const down = isDatabaseDown(error)
  log[down ? 'warn' : 'error']({ event: down ? 'unavailable' : 'failure', request, err: error }, 'request failed')
  // Nothing can be said any more once an answer has begun: the cut connection says it.
  if (response.headersSent) {
    response.destroy()
    return
  }
  sendProblem(
    response,
    down ? refuse('unavailable', undefined, { headers: { 'retry-after': '2' } }) : refuse('internal'),
    request,
  )
}
