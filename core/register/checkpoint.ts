import { strToU8 } from 'fflate'
import { base64Of, bytesFrom } from './base64.ts'
import { derFromRaw, rawFromDer } from './ecdsa.ts'
import type { Sign, Verify } from './signing.ts'

/** How far a register had come: its size and root at a time. */
export interface Checkpoint {
  /** Whose register it is. */
  readonly origin: string
  readonly size: number
  /** Root of the tree over all entries, in hex. */
  readonly root: string
  /** RFC 3339 in UTC. */
  readonly at: string
}

/** A checkpoint as it was read from a signed text. */
export interface SignedCheckpoint extends Checkpoint {
  /** The lines that are signed. */
  readonly body: string
  /** r and s. */
  readonly signature: Uint8Array
}

export type CheckpointResult =
  | { readonly ok: true; readonly checkpoint: SignedCheckpoint }
  | { readonly ok: false; readonly message: string }

const HEAD = 'skerry checkpoint 1'
const LINES = new RegExp(
  `^(?<body>${HEAD}\norigin (?<origin>[^\n\r]{1,200})\nsize (?<size>0|[1-9][0-9]{0,14})\nroot (?<root>[0-9a-f]{64})\nat (?<at>[0-9]{4}-[0-9]{2}-[0-9]{2}T[0-9]{2}:[0-9]{2}:[0-9]{2}(?:\\.[0-9]{1,6})?Z)\n)signature (?<signature>[A-Za-z0-9+/=]+)\n$`,
)

/** The lines of a checkpoint that are signed. Each ends with a line feed. */
export function checkpointBody({ origin, size, root, at }: Checkpoint): string {
  return `${HEAD}\norigin ${origin}\nsize ${size}\nroot ${root}\nat ${at}\n`
}

/**
 * Signs a checkpoint. The text can be checked without Skerry: the lines before the last, and the base64 of the last in
 * DER, are what `openssl dgst -sha256 -verify` takes.
 *
 * @param sign ECDSA P-256 with SHA-256
 * @throws RangeError where the checkpoint could not be read back, such as a line feed in the origin
 */
export async function signCheckpoint(checkpoint: Checkpoint, sign: Sign): Promise<string> {
  const body = checkpointBody(checkpoint)
  const text = `${body}signature ${base64Of(derFromRaw(await sign(strToU8(body))))}\n`
  const read = parseCheckpoint(text)
  if (!read.ok) throw new RangeError(read.message)
  return text
}

/** Reads a signed checkpoint; nothing is said yet about who signed it. */
export function parseCheckpoint(text: string): CheckpointResult {
  const { body = '', origin = '', size, root = '', at = '', signature = '' } = LINES.exec(text)?.groups ?? {}
  const der = bytesFrom(signature)
  const raw = der && rawFromDer(der)
  if (!raw) {
    return {
      ok: false,
      message: `This is no checkpoint of a register: it has six lines, “${HEAD}”, origin, size, root, at, and a signature in base64.`,
    }
  }
  return { ok: true, checkpoint: { body, origin, size: Number(size), root, at, signature: raw } }
}

/** Whether the checkpoint was signed with the key that `verify` was made for. */
export async function verifyCheckpoint({ body, signature }: SignedCheckpoint, verify: Verify): Promise<boolean> {
  return verify(strToU8(body), signature)
}
