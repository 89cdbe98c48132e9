/** What a stored object is; its media type follows from this, never from what an uploader says. */
export const KINDS = {
  /** An install file, byte for byte as uploaded. */
  source: 'application/yaml',
  /** Computed quantities and verdicts of a revision. */
  facts: 'application/json',
  /** A photo for the screen, made anew from what was uploaded. */
  photo: 'image/jpeg',
  /** The same photo for paper. */
  'photo-paper': 'image/jpeg',
  /** Anything else that belongs to a report; handed out as a download only. */
  attachment: 'application/octet-stream',
  /** An issued report. */
  document: 'application/pdf',
  /** Proof of a report's place in the register. */
  proof: 'application/json',
  /** A part of an upload that is under way; swept by age. */
  chunk: 'application/octet-stream',
  /** A whole upload that is not yet worked on; swept by age. */
  upload: 'application/octet-stream',
} as const

export type Kind = keyof typeof KINDS

/** Kinds that nothing in the record refers to: they may go when they are old. */
export const PASSING_KINDS = ['chunk', 'upload'] as const satisfies readonly Kind[]

declare const made: unique symbol

/** Where an object lies: `<organisation>/<kind>/<sha256>`. Made by `objectKey` only. */
export type ObjectKey = string & { readonly [made]: true }

export interface KeyParts {
  readonly organisation: string
  readonly kind: Kind
  readonly sha256: string
}

const ORGANISATION = /^[a-z0-9](?:[a-z0-9-]{0,62}[a-z0-9])?$/
const SHA256 = /^[0-9a-f]{64}$/

const isKind = (text: string): text is Kind => Object.hasOwn(KINDS, text)

/** The key of an object; throws where a part could name any other place. */
export function objectKey({ organisation, kind, sha256 }: KeyParts): ObjectKey {
  if (!ORGANISATION.test(organisation)) throw new Error('An object key needs the id of an organisation.')
  if (!isKind(kind)) throw new Error('An object key needs a known kind.')
  if (!SHA256.test(sha256)) throw new Error('An object key needs a SHA-256 in 64 small hexadecimal digits.')
  return `${organisation}/${kind}/${sha256}` as ObjectKey
}

/** The parts of a text in the form of a key, or nothing. */
export function readKey(text: string): KeyParts | undefined {
  const [organisation = '', kind = '', sha256 = '', ...more] = text.split('/')
  if (more.length > 0 || !ORGANISATION.test(organisation) || !isKind(kind) || !SHA256.test(sha256)) return undefined
  return { organisation, kind, sha256 }
}

/** The parts of a key. Every store asks this first, so that a text that only claims to be a key goes nowhere. */
export function partsOf(key: ObjectKey): KeyParts {
  const parts = readKey(key)
  if (!parts) throw new Error('Not the key of an object.')
  return parts
}

/** Whether a text could be the id of an organisation in a key. */
export const isOrganisation = (text: string): boolean => ORGANISATION.test(text)
