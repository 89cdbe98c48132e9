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

/** Where a span of a consistency proof stands to what was joined before it. */
interface Beside extends Span {
  /** `seed`: it comes first. `left`: it belongs to both trees. `right`: to the larger one only. */
  readonly side: 'seed' | 'left' | 'right'
}

/** The spans of the proof, in its order: from the old tree's last full subtree up to the new tree's root. */
function besides(first: number, second: number): Beside[] {
  const found: Beside[] = []
  let [start, end, whole] = [0, second, true]
  while (first !== end) {
    const middle = start + splitOf(end - start)
    if (first <= middle) {
      found.push({ start: middle, end, side: 'right' })
      end = middle
    } else {
      found.push({ start, end: middle, side: 'left' })
      start = middle
      whole = false
    }
  }
  if (!whole) found.push({ start, end, side: 'seed' })
  return found.reverse()
}

function growing(first: number, second: number): boolean {
  return Number.isSafeInteger(first) && Number.isSafeInteger(second) && first >= 1 && first <= second
}

/** A register without entries is part of every other, and there is nothing to prove about it. */
function mustGrow(first: number, second: number): void {
  if (!growing(first, second)) throw new RangeError(`A register of ${second} entries cannot continue one of ${first}.`)
}

/** The stored subtrees that `consistencyPath` will ask for. */
export function nodesOfConsistency(first: number, second: number): NodePlace[] {
  mustGrow(first, second)
  return besides(first, second).flatMap(nodesOf)
}

/**
 * Proof that a tree continues an older one: its first leaves are those of the older one, unchanged.
 *
 * @param first size of the older tree, at least 1
 * @param second size of the newer one
 * @param read gives the subtrees named by `nodesOfConsistency`
 * @throws RangeError where the second is smaller than the first, or the first is empty
 * @source RFC 9162, 2.1.4.1
 */
export function consistencyPath(first: number, second: number, read: NodeReader): Hash[] {
  mustGrow(first, second)
  return besides(first, second).map((span) => rootOfSpan(span, read))
}

export interface Consistency {
  readonly first: number
  readonly firstRoot: Hash
  readonly second: number
  readonly secondRoot: Hash
  readonly path: readonly Hash[]
}

/**
 * Whether a path proves that the tree of the second root continues the tree of the first.
 *
 * @source RFC 9162, 2.1.4.2
 */
export function continues({ first, firstRoot, second, secondRoot, path }: Consistency): boolean {
  if (!growing(first, second)) return false
  const spans = besides(first, second)
  if (spans.length !== path.length) return false
  let [old, young] = [firstRoot, firstRoot]
  for (const [step, hash] of path.entries()) {
    const side = spans[step]?.side
    if (side === 'seed') [old, young] = [hash, hash]
    else if (side === 'left') [old, young] = [hashOfNode(hash, old), hashOfNode(hash, young)]
    else young = hashOfNode(young, hash)
  }
  return equal(old, firstRoot) && equal(young, secondRoot)
}
