import { sha256 } from '@noble/hashes/sha2.js'
import { concatBytes, utf8ToBytes } from '@noble/hashes/utils.js'
import canonicalize from 'canonicalize'
import { hashOfLeaf } from './merkle.ts'

interface Common {
  /** Whose register it is. Checkpoints of this register carry the same name as their origin. */
  readonly organisation: string
  /** Place in the organisation's register, from 0, without gaps. */
  readonly sequence: number
  /** Number of the document. */
  readonly number: string
  readonly revision: number
  /** SHA-256 of the install file, in hex. */
  readonly source_sha256: string
  /** SHA-256 of the computed quantities as they are embedded in the document, in hex. */
  readonly facts_sha256: string
  /** RFC 3339 in UTC: `2026-10-21T09:30:00Z`. */
  readonly at: string
}

/** A document got its number. */
export interface IssuedEntry extends Common {
  readonly kind: 'issued'
  /** Number of the document that this one replaces, and why. */
  readonly replaces?: string
  readonly reason?: string
}

/** Its PDF was sealed. */
export interface SealedEntry extends Common {
  readonly kind: 'sealed'
  /** SHA-256 of the sealed file, in hex. */
  readonly pdf_sha256: string
}

/** Another document took its place. */
export interface ReplacedEntry extends Common {
  readonly kind: 'replaced'
  readonly replaced_by: string
  readonly reason: string
}

/** It was taken back, with nothing in its place. */
export interface WithdrawnEntry extends Common {
  readonly kind: 'withdrawn'
  readonly reason: string
}

/** One line of the register: something that happened to a document. */
export type RegisterEntry = IssuedEntry | SealedEntry | ReplacedEntry | WithdrawnEntry

/** What the chain of a register starts from. */
export const CHAIN_START: Uint8Array = new Uint8Array(32)

/** Keeps a link of the chain from ever being read as a leaf (0x00) or a node (0x01) of the tree. */
const LINK = Uint8Array.of(2)

/**
 * The one form of an entry that is hashed, stored and handed out.
 *
 * @throws Error where a text holds half of a surrogate pair, which has no UTF-8
 * @source RFC 8785 (JSON Canonicalization Scheme)
 */
export function canonicalEntry(entry: RegisterEntry): string {
  return String(canonicalize(entry))
}

/**
 * Hash of an entry as a leaf of the register's tree: SHA-256 over 0x00 and the canonical form in UTF-8.
 *
 * @returns 32 bytes
 * @source RFC 9162, 2.1.1
 */
export function leafHash(entry: RegisterEntry): Uint8Array {
  return hashOfLeaf(utf8ToBytes(canonicalEntry(entry)))
}

/**
 * The next link of the chain, which ties each entry to all before it: SHA-256 over 0x02, the link before, and the leaf.
 *
 * @param previous the link before, 32 bytes; `CHAIN_START` for the first entry
 * @param leaf what `leafHash` gave, 32 bytes
 */
export function chainHash(previous: Uint8Array, leaf: Uint8Array): Uint8Array {
  return sha256(concatBytes(LINK, previous, leaf))
}
