import { environment, homeFolder, readText } from './io.ts'

/** A server to send to, and the token that opens it. */
export interface Server {
  readonly address: string
  readonly token: string
}

export type ServerResult =
  | { readonly ok: true; readonly server: Server }
  | { readonly ok: false; readonly message: string }

/** Where the token is looked for, when no other place is named. A flag would show it to everybody on the machine. */
const tokenFiles = (): string[] => {
  const config = environment('XDG_CONFIG_HOME') ?? `${homeFolder()}/.config`
  return [`${config}/skerry/token`]
}

const HOW = 'Make a token under your name in the browser, and put it into a file that only you can read'

function findToken(
  file: string | undefined,
): { readonly ok: true; readonly token: string } | { readonly ok: false; readonly message: string } {
  const inEnvironment = environment('SKERRY_TOKEN')
  if (file === undefined && inEnvironment) return { ok: true, token: inEnvironment.trim() }
  const [place = ''] = file === undefined ? tokenFiles() : [file]
  const read = readText(place)
  if (read.ok) return { ok: true, token: read.text.trim() }
  if (file !== undefined) return { ok: false, message: read.message }
  return { ok: false, message: `There is no token. ${HOW}: ${place}, or name it with --token-file or SKERRY_TOKEN.` }
}

function addressOf(given: string): string | undefined {
  if (!URL.canParse(given)) return undefined
  const { protocol, origin } = new URL(given)
  return protocol === 'https:' || protocol === 'http:' ? origin : undefined
}

/** The server and token that flags, environment and the user's folder name, in this order. */
export function findServer({
  server,
  tokenFile,
}: {
  readonly server?: string
  readonly tokenFile?: string
}): ServerResult {
  const given = server ?? environment('SKERRY_SERVER')
  if (given === undefined)
    return {
      ok: false,
      message: 'Which server? Name it with --server or SKERRY_SERVER, such as https://reports.example.',
    }
  const address = addressOf(given)
  if (address === undefined)
    return { ok: false, message: `“${given}” is not the address of a server, such as https://reports.example.` }
  const token = findToken(tokenFile)
  if (!token.ok) return token
  if (!/^skerry_[\w-]{20,}$/.test(token.token))
    return { ok: false, message: `What was found is not a token of Skerry. ${HOW}.` }
  return { ok: true, server: { address, token: token.token } }
}

/** What the server said: an answer of any status, or that there was none. */
export type Reply =
  | {
      readonly status: number
      readonly body: unknown
      readonly etag: string | null
      readonly retryAfter: number | null
    }
  | { readonly status: 0; readonly reason: string }

const PATIENCE_MS = 30_000
const TRIES = 6

const pause = (ms: number): Promise<void> => new Promise((resolve) => setTimeout(resolve, ms))

/** Waits double as long after each try, and as long as the server asks for. */
const waitFor = (attempt: number, reply: Reply): number =>
  'retryAfter' in reply && reply.retryAfter !== null ? reply.retryAfter * 1000 : Math.min(500 * 2 ** attempt, 8000)

/** Not now, but perhaps in a moment. */
const worthAnotherTry = ({ status }: Reply): boolean =>
  status === 0 || status === 429 || status === 502 || status === 503 || status === 504

async function once({ address, token }: Server, path: string, request: RequestInit): Promise<Reply> {
  try {
    const answer = await fetch(`${address}${path}`, {
      ...request,
      headers: { ...request.headers, authorization: `Bearer ${token}` },
      redirect: 'error',
      signal: AbortSignal.timeout(PATIENCE_MS),
    })
    const text = await answer.text()
    const isJson = /\bjson\b/.test(answer.headers.get('content-type') ?? '')
    const seconds = Number(answer.headers.get('retry-after'))
    return {
      status: answer.status,
      body: isJson ? JSON.parse(text) : text,
      etag: answer.headers.get('etag'),
      retryAfter: Number.isFinite(seconds) && seconds > 0 ? Math.min(seconds, 60) : null,
    }
  } catch (error) {
    const cause = error instanceof Error && error.cause instanceof Error ? error.cause.message : ''
    return { status: 0, reason: cause || (error instanceof Error ? error.message : String(error)) }
  }
}

/**
 * Asks the server, again where it may help. What is sent carries a key of its own, so that sending it again does nothing
 * twice: a broken line in the middle of an answer loses nothing.
 */
export async function ask(server: Server, path: string, request: RequestInit = {}): Promise<Reply> {
  let reply = await once(server, path, request)
  for (let attempt = 0; attempt + 1 < TRIES && worthAnotherTry(reply); attempt++) {
    await pause(waitFor(attempt, reply))
    reply = await once(server, path, request)
  }
  return reply
}
