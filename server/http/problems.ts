/**
 * Everything that the server answers instead of what was asked, as RFC 9457 problems: the list is closed. `help` is what
 * the address under `type` shows.
 */
export const PROBLEMS = {
  'bad-request': {
    status: 400,
    title: 'The request is not understood',
    help: 'Something in the address, the query or the body is missing or has a form that is not expected here. `errors` says where.',
  },
  'not-signed-in': {
    status: 401,
    title: 'Sign in first',
    help: 'The session has ended, or there was none. Sign in and send the same request again; nothing was changed.',
  },
  'sign-in-failed': {
    status: 401,
    title: 'Address, password or code is wrong',
    help: 'Check all of them. After several tries the next one has to wait.',
  },
  'not-allowed': {
    status: 403,
    title: 'Not allowed',
    help: 'You may see this, but not do it. `detail` gives the reason.',
  },
  'cross-site': {
    status: 403,
    title: 'The request came from another site',
    help: 'Requests that change something must come from the pages of this server, with the token that the session hands out.',
  },
  'password-needed': {
    status: 403,
    title: 'The password is needed again',
    help: 'This step counts in law or changes how you sign in. Send your password along, and the code of your second factor where you have one.',
  },
  'not-found': { status: 404, title: 'Nothing here', help: 'There is nothing at this address that you can see.' },
  'method-not-allowed': {
    status: 405,
    title: 'This cannot be done at this address',
    help: 'The header Allow lists what can.',
  },
  conflict: {
    status: 409,
    title: 'Not in this state',
    help: 'Things have moved on since the page was loaded, or a step would be taken twice. Load the newest state and decide again.',
  },
  blocked: { status: 409, title: 'Something stands in the way', help: '`blockers` lists what must be settled first.' },
  'still-running': {
    status: 409,
    title: 'The same request is still at work',
    help: 'Wait a moment and send it again with the same key.',
  },
  gone: {
    status: 410,
    title: 'No longer here',
    help: 'The link was used already, or its time has run out. Ask for a new one.',
  },
  'version-stale': {
    status: 412,
    title: 'Somebody was faster',
    help: 'The thing has changed since you read it. `current` is its version now; look at the change before you send yours again.',
  },
  'too-large': { status: 413, title: 'Too large', help: '`detail` says how much is taken.' },
  'wrong-type': {
    status: 415,
    title: 'This kind of content is not taken here',
    help: 'The header Accept lists what is.',
  },
  'file-refused': {
    status: 422,
    title: 'The file cannot be taken',
    help: '`errors` lists every place, with line and column, and what to do about it. Nothing was stored.',
  },
  'key-reused': {
    status: 422,
    title: 'The key was used for another request',
    help: 'An Idempotency-Key belongs to one request. Take a new one for another.',
  },
  'version-missing': {
    status: 428,
    title: 'Say which version you mean',
    help: 'Send the header If-Match with the ETag of what you read, so that nobody’s change is lost.',
  },
  'too-many': { status: 429, title: 'Too many requests', help: 'Wait for the seconds in Retry-After.' },
  internal: {
    status: 500,
    title: 'Something went wrong here',
    help: 'The fault is ours and has been logged under `request`. Nothing half-done was kept.',
  },
  damaged: {
    status: 500,
    title: 'The record is damaged',
    help: 'What is stored is not what was written: it was changed or lost outside the server. It is not handed out; the nightly check tells the administrator where.',
  },
  unavailable: {
    status: 503,
    title: 'Not available right now',
    help: 'The database or the file storage does not answer. Nothing was changed; try again in a moment.',
  },
} as const satisfies Readonly<Record<string, { status: number; title: string; help: string }>>

export type ProblemCode = keyof typeof PROBLEMS

/** One thing that is wrong with what was sent: where (JSON Pointer, and line and column in a file), and what to do. */
export interface FieldError {
  readonly pointer: string
  readonly message: string
  readonly code?: string
  readonly line?: number
  readonly column?: number
}

/** A refusal, as a value: what `run` returns when it does not do what was asked. */
export interface Refused {
  readonly refused: ProblemCode
  readonly detail?: string
  readonly errors?: readonly FieldError[]
  /** Further members of the problem. */
  readonly more?: Readonly<Record<string, unknown>>
  readonly headers?: Readonly<Record<string, string>>
}

export function refuse(code: ProblemCode, detail?: string, more: Omit<Refused, 'refused' | 'detail'> = {}): Refused {
  return detail === undefined ? { refused: code, ...more } : { refused: code, detail, ...more }
}

export const tooMany = (seconds: number): Refused =>
  refuse('too-many', `Wait ${seconds} seconds.`, { headers: { 'retry-after': String(seconds) } })

export const isRefused = (value: object): value is Refused => 'refused' in value

/** The body of a problem as RFC 9457 has it. */
export function problemBody(refused: Refused, request: string): Readonly<Record<string, unknown>> {
  const { status, title } = PROBLEMS[refused.refused]
  return {
    type: `/problems/${refused.refused}`,
    title,
    status,
    ...(refused.detail === undefined ? {} : { detail: refused.detail }),
    instance: `/requests/${request}`,
    ...(refused.errors === undefined ? {} : { errors: refused.errors }),
    ...refused.more,
  }
}
