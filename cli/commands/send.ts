import { baseName, endWith, isTerminal, print, readBytes, say } from '#cli/io.ts'
import { ask, findServer, type Reply, type Server } from '#cli/server.ts'
import { sha256 } from '#core/paper/sha256.ts'

/** A report as the server answers with it, as far as sending needs it. */
interface SentReport {
  readonly id: string
  readonly reference: string
  readonly state: string
  readonly revision: number
  readonly version: number
}

interface FieldError {
  readonly message: string
  readonly line?: number
  readonly column?: number
}

const hex = (bytes: Uint8Array): string => Array.from(bytes, (byte) => byte.toString(16).padStart(2, '0')).join('')

const isRecord = (value: unknown): value is Record<string, unknown> => typeof value === 'object' && value !== null

const isReport = (value: unknown): value is SentReport =>
  isRecord(value) && typeof value['id'] === 'string' && typeof value['revision'] === 'number'

const errorsOf = (body: unknown): readonly FieldError[] =>
  isRecord(body) && Array.isArray(body['errors']) ? (body['errors'] as readonly FieldError[]) : []

const wordsOf = (body: unknown): string => {
  if (!isRecord(body)) return ''
  const { title, detail } = body
  return [title, detail].filter((text) => typeof text === 'string').join('. ')
}

/** What the server refused, in the form of every other complaint: file, line, column, what to do. */
function refusal(file: string, reply: Reply): string {
  if (reply.status === 0)
    return `${file}: the server does not answer (${'reason' in reply ? reply.reason : ''}). Try again later: what arrived is not sent twice.`
  const body = 'body' in reply ? reply.body : undefined
  const errors = errorsOf(body)
  if (errors.length === 0)
    return `${file}: ${wordsOf(body) || `the server answered with ${reply.status}`}.`.replace(/\.\.$/, '.')
  return errors
    .map(({ message, line, column }) => `${file}${line === undefined ? '' : `:${line}:${column ?? 1}`}: ${message}`)
    .join('\n')
}

type Sent = { readonly ok: true; readonly report: SentReport } | { readonly ok: false; readonly reply: Reply }

const sourceRequest = (bytes: Uint8Array, headers: Readonly<Record<string, string>>): RequestInit => ({
  method: 'POST',
  body: bytes as Uint8Array<ArrayBuffer>,
  headers: { 'content-type': 'application/yaml', ...headers },
})

function sent(reply: Reply): Sent {
  return 'body' in reply && (reply.status === 200 || reply.status === 201) && isReport(reply.body)
    ? { ok: true, report: reply.body }
    : { ok: false, reply }
}

/** A report that is sent again under its reference is mended, not doubled, while it may still change. */
async function sendOne(server: Server, file: string, bytes: Uint8Array): Promise<Sent> {
  const name = encodeURIComponent(baseName(file))
  const hash = hex(sha256(bytes))
  const created = await ask(
    server,
    `/api/reports?file_name=${name}&same_reference=refuse`,
    sourceRequest(bytes, { 'idempotency-key': `send ${hash}` }),
  )
  const existing =
    'body' in created && created.status === 409 && isRecord(created.body) ? created.body['existing'] : undefined
  if (!isReport(existing)) return sent(created)
  return sent(
    await ask(
      server,
      `/api/reports/${existing.id}/revisions?file_name=${name}`,
      sourceRequest(bytes, { 'idempotency-key': `send ${hash} ${existing.id}`, 'if-match': `"${existing.version}"` }),
    ),
  )
}

/** Sends files to the server; each becomes a report, or the next revision of the one with its reference. */
export async function send(
  files: readonly string[],
  options: { readonly server?: string; readonly tokenFile?: string },
): Promise<void> {
  const found = findServer(options)
  if (!found.ok) {
    say(`${found.message}\n`)
    return endWith(2)
  }
  let worst = 0
  for (const [index, file] of files.entries()) {
    if (files.length > 1 && isTerminal('stderr')) say(`sending ${index + 1} of ${files.length}: ${file}\n`)
    worst = Math.max(worst, await sendAndTell(found.server, file))
  }
  endWith(worst)
}

/** 0 sent, 1 refused, 2 not readable or no answer. */
async function sendAndTell(server: Server, file: string): Promise<number> {
  const read = readBytes(file)
  if (!read.ok) {
    say(`${read.message}\n`)
    return 2
  }
  const outcome = await sendOne(server, file, read.bytes)
  if (!outcome.ok) {
    say(`${refusal(file, outcome.reply)}\n`)
    return outcome.reply.status === 0 ? 2 : 1
  }
  const { id, reference, state, revision } = outcome.report
  print(`${server.address}/reports/${id}  ${reference}, revision ${revision}, ${state}\n`)
  return 0
}
