import { type Hash, hashOfNode, type NodePlace, rootOfPeaks } from './merkle.ts'

/** A register's tree cut down to what appending needs: its size, and its full subtrees from left to right. */
export interface Frontier {
  readonly size: number
  readonly peaks: readonly Hash[]
}

export const EMPTY_FRONTIER: Frontier = { size: 0, peaks: [] }

/** A frontier with one leaf more, and every full subtree that this leaf completed, for storing. */
export interface Appended extends Frontier {
  readonly nodes: readonly (NodePlace & { readonly hash: Hash })[]
}

/**
 * Appends a leaf: as many hashes as the size ends with ones in binary, on average one.
 *
 * @param frontier what was there before
 * @param leaf what `leafHash` gave
 */
export function append({ size, peaks }: Frontier, leaf: Hash): Appended {
  const rest = [...peaks]
  const nodes = [{ level: 0, index: size, hash: leaf }]
  let [hash, level, index] = [leaf, 0, size]
  while (index % 2 === 1) {
    const left = rest.pop()
    if (!left) throw new RangeError(`${peaks.length} peaks do not belong to a register of ${size} entries.`)
    hash = hashOfNode(left, hash)
    level += 1
    index = (index - 1) / 2
    nodes.push({ level, index, hash })
  }
  return { size: size + 1, peaks: [...rest, hash], nodes }
}

/** Root of the tree that a frontier stands for. */
export function rootOfFrontier({ peaks }: Frontier): Hash {
  return rootOfPeaks(peaks)
}
