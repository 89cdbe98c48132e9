import type { Path } from '../glossary.ts'
import { isBlock } from './block.ts'

/**
 * A copy of a tree with one value set; blocks and lists on the way are made where they are missing.
 *
 * @param tree as `read` gives it
 * @param path where the value goes; an index may be one past the end of its list
 * @param value the new value
 */
export function withValue(tree: unknown, path: Path, value: unknown): unknown {
  const [name, ...rest] = path
  if (name === undefined) return value
  if (typeof name === 'number') {
    const list: unknown[] = Array.isArray(tree) ? [...tree] : []
    list[name] = withValue(list[name], rest, value)
    return list
  }
  const block = isBlock(tree) ? tree : {}
  return { ...block, [name]: withValue(block[name], rest, value) }
}

/** Whether two trees hold the same values; the order of keys does not matter. */
export function sameTree(one: unknown, other: unknown): boolean {
  if (Array.isArray(one)) {
    return (
      Array.isArray(other) && one.length === other.length && one.every((item, index) => sameTree(item, other[index]))
    )
  }
  if (!isBlock(one)) return Object.is(one, other)
  if (!isBlock(other)) return false
  const keys = Object.keys(one)
  return (
    keys.length === Object.keys(other).length &&
    keys.every((key) => Object.hasOwn(other, key) && sameTree(one[key], other[key]))
  )
}
