import { randomUUID } from 'node:crypto'

/** What the server answered, once it did. */
export interface Answer {
  readonly status: number
  readonly etag: string
  readonly body: Readonly<Record<string, unknown>>
}

export interface Sending {
  readonly method?: 'GET' | 'POST'
  readonly json?: object
  readonly source?: string
  readonly etag?: string
}

const PATIENCE_MS = 120_000
const PAUSE_MS = 150
/** Answers that say: not now, the same request again. */
const AGAIN = new Set([502, 503, 429])

const pause = (): Promise<void> => new Promise((resolve) => setTimeout(resolve, PAUSE_MS))

/** A person at a browser who sends again, under the same key, until there is an answer. */
export class Client {
  #cookie = ''
  #csrf = ''

  constructor(
    readonly address: string,
    /** Is told of each request that changes something, right before it is sent. */
    readonly sending: () => void,
  ) {}

  async signIn(email: string, password: string): Promise<void> {
    await this.send('/api/session')
    const signed = await this.send('/api/session', { method: 'POST', json: { email, password } })
    if (signed.status !== 200) throw new Error(`${email} cannot sign in: ${JSON.stringify(signed.body)}`)
    this.#csrf = String(signed.body['csrf'])
  }

  /** Sends until there is an answer; a refusal that the story does not expect ends it. */
  async send(path: string, sending: Sending = {}): Promise<Answer> {
    const key = randomUUID()
    const until = Date.now() + PATIENCE_MS
    for (;;) {
      const answer = await this.#once(path, sending, key)
      if (answer !== undefined && !AGAIN.has(answer.status) && !stillRunning(answer)) return answer
      if (Date.now() > until) throw new Error(`${path}: no answer in ${PATIENCE_MS} ms.`)
      await pause()
    }
  }

  /** The same for a step that must succeed. */
  async do(path: string, sending: Sending = {}): Promise<Answer> {
    const answer = await this.send(path, sending)
    if (answer.status >= 300)
      throw new Error(`${path} was refused with ${answer.status}: ${JSON.stringify(answer.body)}`)
    return answer
  }

  async #once(path: string, { method = 'GET', json, source, etag }: Sending, key: string): Promise<Answer | undefined> {
    if (method === 'POST') this.sending()
    try {
      const answer = await fetch(`${this.address}${path}`, {
        method,
        headers: {
          cookie: this.#cookie,
          'x-csrf-token': this.#csrf,
          'idempotency-key': key,
          ...(etag !== undefined && { 'if-match': etag }),
          ...(method === 'POST' && { 'content-type': source === undefined ? 'application/json' : 'application/yaml' }),
        },
        ...(method === 'POST' && { body: source ?? JSON.stringify(json ?? {}) }),
        signal: AbortSignal.timeout(20_000),
      })
      const [cookie] = (answer.headers.getSetCookie()[0] ?? '').split(';')
      if (cookie !== undefined && cookie !== '') this.#cookie = cookie
      const text = await answer.text()
      return {
        status: answer.status,
        etag: answer.headers.get('etag') ?? '',
        body: text === '' ? {} : JSON.parse(text),
      }
    } catch (error) {
      // Whoever would have answered was killed: nobody knows what became of the request, so it is sent again.
      if (error instanceof Error) return undefined
      throw error
    }
  }
}

const stillRunning = ({ body }: Answer): boolean => body['type'] === '/problems/still-running'
