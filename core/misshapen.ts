import type { Path, Problem } from './glossary.ts'
import type { Install } from './install.ts'
import { normalise } from './normalise/normalise.ts'
import { problemList } from './read/problem-list.ts'
import type { Certain } from './read/read.ts'
import { checkShape } from './shape/shape.ts'
import { buildTopology } from './topology/build.ts'
import { skeletonOf } from './topology/skeleton.ts'

/** A problem on the way to the problems of a tree, or undefined where there is none. */
type BookProblem = (install: Install) => Problem | undefined

function sameWay(one: Path, other: Path, length: number): boolean {
  return one.slice(0, length).join('\n') === other.slice(0, length).join('\n')
}

/** Whether a value is already found to be wrong: itself, something in it, or the whole that could not be understood. */
function isKnown({ code, path }: Problem, known: readonly Problem[]): boolean {
  return known.some(({ code: other, path: at }) => {
    if (at.length >= path.length) {
      if (sameWay(at, path, path.length)) return true
    }
    if (code === 'out-of-range' || other === 'unknown-key') return false
    const inside = at.length === path.length - 1 || (other === 'conflicting-keys' && at.length === path.length)
    return inside && sameWay(at, path, path.length - 1)
  })
}

/** Under a section that is misspelt there may be any name, and a name that cannot be one stands for another. */
function leavesNamesInDoubt({ code, path }: Problem): boolean {
  if (code === 'unknown-key') return path.length === 1
  return path.length === 2 && (code === 'pattern' || code === 'reserved-key')
}

/** Names and references, and the rule book, of a tree that is not in shape. */
function namesOf(tree: unknown, shape: readonly Problem[], book: BookProblem): Problem[] {
  if (shape.some(leavesNamesInDoubt)) return []
  const skeleton = skeletonOf(tree)
  if (skeleton === undefined) return []
  const wrongBook = book(skeleton)
  return [...buildTopology(skeleton).problems, ...(wrongBook ? [wrongBook] : [])]
}

/**
 * Everything that is wrong with a tree that is not in shape: shape, ranges, names and references; one problem a place.
 *
 * @param tree the file's values
 * @param book tells what is wrong with the rule book that a file asks for
 * @param reading where single places of the tree are in doubt: what reading found, with their places; a place that was
 *   told gets no second problem
 * @returns at most as many problems as are shown of one file, and then how many more
 */
export function everyProblem(
  tree: unknown,
  book: BookProblem,
  reading?: { readonly problems: readonly Problem[]; readonly certain: Certain },
): Problem[] {
  const list = problemList()
  for (const one of reading?.problems ?? []) list.add(() => one)
  const shape = checkShape(tree)
  const ranges = normalise(tree).problems.filter((one) => !isKnown(one, shape))
  const names = namesOf(tree, shape, book).filter((one) => !isKnown(one, [...shape, ...ranges]))
  for (const one of [...shape, ...ranges, ...names]) {
    if (reading?.certain.told(one)) continue
    list.add(() => (reading ? { ...one, range: reading.certain.locate(one.path) } : one))
  }
  return list.all()
}
