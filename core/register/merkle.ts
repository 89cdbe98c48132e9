import { sha256 } from '@noble/hashes/sha2.js'
import { concatBytes } from '@noble/hashes/utils.js'

/** 32 bytes of SHA-256. */
export type Hash = Uint8Array

const LEAF = Uint8Array.of(0)
const NODE = Uint8Array.of(1)

/** Root of a register without entries. */
export const EMPTY_ROOT: Hash = sha256(new Uint8Array())

/**
 * Hash of a leaf: SHA-256 over 0x00 and its bytes.
 *
 * @source RFC 9162, 2.1.1
 */
export function hashOfLeaf(bytes: Uint8Array): Hash {
  return sha256(concatBytes(LEAF, bytes))
}

/**
 * Hash of a node: SHA-256 over 0x01 and its two children.
 *
 * @source RFC 9162, 2.1.1
 */
export function hashOfNode(left: Hash, right: Hash): Hash {
  return sha256(concatBytes(NODE, left, right))
}

/** A full subtree: `2 ** level` leaves from leaf `index * 2 ** level` on. Leaves are those of level 0. */
export interface NodePlace {
  readonly level: number
  readonly index: number
}

/** Looks up the hash of a full subtree: from memory, or from what the register stores. */
export type NodeReader = (place: NodePlace) => Hash

/** Leaves from `start` up to and without `end`. */
export interface Span {
  readonly start: number
  readonly end: number
}

/** The largest power of two below a size of at least 2: where RFC 9162 divides a tree. */
export function splitOf(size: number): number {
  let split = 1
  while (split * 2 < size) split *= 2
  return split
}

/**
 * The full subtrees that a span is made of, from left to right: at most two for each level.
 *
 * @param span starts where the tree divides (0, or the start of a subtree of RFC 9162)
 */
export function nodesOf({ start, end }: Span): NodePlace[] {
  const places: NodePlace[] = []
  let at = start
  while (at < end) {
    let [level, width] = [0, 1]
    while (width * 2 <= end - at) [level, width] = [level + 1, width * 2]
    places.push({ level, index: at / width })
    at += width
  }
  return places
}

/** Root over full subtrees from left to right: the last two are joined until one is left. */
export function rootOfPeaks(peaks: readonly Hash[]): Hash {
  return peaks.length === 0 ? EMPTY_ROOT : peaks.reduceRight((right, left) => hashOfNode(left, right))
}

/** Root over a span. */
export function rootOfSpan(span: Span, read: NodeReader): Hash {
  return rootOfPeaks(nodesOf(span).map(read))
}

/** Reads full subtrees from all leaf hashes, each computed once. */
export function readerOf(leaves: readonly Hash[]): NodeReader {
  const known = new Map<string, Hash>()
  const read: NodeReader = ({ level, index }) => {
    if (level === 0) {
      const leaf = leaves[index]
      if (!leaf) throw new RangeError(`There is no leaf ${index} among ${leaves.length}.`)
      return leaf
    }
    const name = `${level}/${index}`
    const hash =
      known.get(name) ??
      hashOfNode(read({ level: level - 1, index: index * 2 }), read({ level: level - 1, index: index * 2 + 1 }))
    known.set(name, hash)
    return hash
  }
  return read
}

/**
 * Root of the tree over leaf hashes.
 *
 * @source RFC 9162, 2.1.1
 */
export function rootOf(leaves: readonly Hash[]): Hash {
  return rootOfSpan({ start: 0, end: leaves.length }, readerOf(leaves))
}
