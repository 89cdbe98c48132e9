import type { Path, Problem } from '../glossary.ts'
import { valueAt } from '../shape/locate.ts'
import { isBlock } from './block.ts'
import { explain } from './explain.ts'
import { guard } from './guard.ts'
import { MAX_PROBLEMS } from './limits.ts'
import { cover, isCovered, type Mask, uncovered } from './masks.ts'
import { rangeOf } from './positions.ts'
import { type Certain, type Locate, type ReadResult, read } from './read.ts'

/** More rounds than kinds of problem that hide others: characters, syntax, tabs line by line, numbers. */
const ROUNDS = 24
/** Syntax errors of one word, which may come to light after another one of their line was covered. */
const OF_ONE_WORD: ReadonlySet<string> = new Set(['tab', 'bad-escape'])

/**
 * Reads a file to tell everything that is wrong with it, as far as what it says is certain: each problem is covered up
 * and the rest read on. Much slower than `read`; for a file that `read` refused.
 *
 * @param text the whole file
 * @returns as `read`; for a refused file all that reading finds, and what is `certain` of its values, if anything is
 */
export function readThoroughly(text: string): ReadResult {
  const found: Problem[] = []
  const masks: Mask[] = []
  let now = text
  let parsed = false
  for (let round = 0; round < ROUNDS; round++) {
    const result = read(now)
    if (result.ok) {
      if (found.length === 0) return result
      return { ok: false, problems: found, certain: certainOf(result.tree, result.locate, masks) }
    }
    const problems = fresh(result.brief ? syntaxErrors(now, result.problems) : result.problems, masks)
    // A syntax error that shows only now may be made by a cover: only those that cannot be are believed.
    if (result.brief && parsed && !problems.every(isOfOneWord(now))) break
    parsed ||= guard(now).length === 0
    found.push(...problems.map((one) => placed(text, { ...one, message: uncovered(one.message) })))
    const covered = found.length > MAX_PROBLEMS ? undefined : cover(now, problems, found.length)
    if (problems.length === 0 || covered === undefined) break
    now = covered.text
    masks.push(...covered.masks)
  }
  return { ok: false, problems: found }
}

/** A problem of the file as a whole is shown at its beginning; the count of those that are not shown has no place. */
function placed(text: string, one: Problem): Problem {
  if (one.range !== undefined || one.code === 'too-many-problems') return one
  return { ...one, range: rangeOf(text, 0, 0) }
}

/** A reader that has lost its place takes values for keys; keys that really stand twice are found once it can be read. */
function syntaxErrors(text: string, brief: readonly Problem[]): readonly Problem[] {
  const explained = explain(text).filter(({ code }) => code !== 'duplicate-key')
  return explained.length > 0 ? explained : brief
}

const isOfOneWord =
  (text: string) =>
  ({ code, range }: Problem): boolean =>
    OF_ONE_WORD.has(code) || (code === 'needs-quotes' && /[@`%]/.test(text.charAt(range?.offset ?? 0)))

function overlaps(masks: readonly Mask[], from: number, to: number): boolean {
  return masks.some(({ start, end }) => from < end && start < to)
}

/** Problems about what is not covered yet; two about the same stretch are one. */
function fresh(problems: readonly Problem[], masks: readonly Mask[]): Problem[] {
  const told: Mask[] = []
  return problems
    .toSorted((one, other) => length(other) - length(one))
    .filter(({ range }) => {
      if (range === undefined) return true
      const { offset: start, endOffset: end } = range
      if (overlaps([...masks, ...told], start, end)) return false
      told.push({ start, end })
      return true
    })
    .toSorted((one, other) => (one.range?.offset ?? 0) - (other.range?.offset ?? 0))
}

function length({ range }: Problem): number {
  return range === undefined ? 0 : range.endOffset - range.offset
}

function certainOf(tree: unknown, locate: Locate, masks: readonly Mask[]): Certain {
  const covers = (path: Path, part: 'key' | 'value'): boolean => {
    const { offset, endOffset } = locate(path, part)
    return overlaps(masks, offset, endOffset)
  }
  const told = ({ code, path }: Problem): boolean => {
    const value = valueAt(tree, path)
    // A key that is covered may be the one that is missing.
    if (code === 'missing-key') return isBlock(value) && Object.keys(value).some(isCovered)
    if (typeof path.at(-1) === 'string' && covers(path, 'key')) return true
    return (typeof value !== 'object' || value === null) && covers(path, 'value')
  }
  return { tree, locate, told }
}
