import { equal } from './bytes.ts'
import {
  type Hash,
  hashOfNode,
  type NodePlace,
  type NodeReader,
  nodesOf,
  rootOfSpan,
  type Span,
  splitOf,
} from './merkle.ts'

/** A span beside the way from a leaf up to the root; `side` is where it stands. */
interface Beside extends Span {
  readonly side: 'left' | 'right'
}

/** What stands beside the way from a leaf to the root, from the leaf upwards. */
function besides(index: number, size: number): Beside[] {
  const found: Beside[] = []
  let [start, end] = [0, size]
  while (end - start > 1) {
    const middle = start + splitOf(end - start)
    if (index < middle) {
      found.push({ start: middle, end, side: 'right' })
      end = middle
    } else {
      found.push({ start, end: middle, side: 'left' })
      start = middle
    }
  }
  return found.reverse()
}

function within(index: number, size: number): boolean {
  return Number.isSafeInteger(index) && Number.isSafeInteger(size) && index >= 0 && index < size
}

/** Refuses a place that the register does not have. */
function mustLieWithin(index: number, size: number): void {
  if (!within(index, size)) throw new RangeError(`Entry ${index} is not one of ${size}.`)
}

/** The stored subtrees that `inclusionPath` will ask for. */
export function nodesOfInclusion(index: number, size: number): NodePlace[] {
  mustLieWithin(index, size)
  return besides(index, size).flatMap(nodesOf)
}

/**
 * Proof that a leaf stands in a tree.
 *
 * @param index place of the leaf, from 0
 * @param size number of leaves of the tree
 * @param read gives the subtrees named by `nodesOfInclusion`
 * @returns hashes from the leaf upwards
 * @throws RangeError where the leaf is not in the tree
 * @source RFC 9162, 2.1.3.1
 */
export function inclusionPath(index: number, size: number, read: NodeReader): Hash[] {
  mustLieWithin(index, size)
  return besides(index, size).map((span) => rootOfSpan(span, read))
}

export interface Inclusion {
  readonly leaf: Hash
  readonly index: number
  readonly size: number
  readonly path: readonly Hash[]
  readonly root: Hash
}

/**
 * Whether a path leads from a leaf at its place to the root of a tree of that size. Sizes near each other can
 * ask for paths of one shape: the size is proved by the checkpoint that signs it together with the root, not by the path.
 *
 * @source RFC 9162, 2.1.3.2
 */
export function includes({ leaf, index, size, path, root }: Inclusion): boolean {
  if (!within(index, size)) return false
  const spans = besides(index, size)
  if (spans.length !== path.length) return false
  const reached = path.reduce(
    (hash, other, step) => (spans[step]?.side === 'left' ? hashOfNode(other, hash) : hashOfNode(hash, other)),
    leaf,
  )
  return equal(reached, root)
}
