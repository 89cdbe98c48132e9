import { type Refused, refuse } from './problems.ts'

/** The bytes of an install file that was sent as a body; undefined when there are none. */
export function sourceBytes(body: unknown): Uint8Array | undefined {
  return body instanceof Uint8Array && body.length > 0 ? body : undefined
}

export const NO_SOURCE: Refused = refuse('bad-request', 'The body is empty; send the install file.')
