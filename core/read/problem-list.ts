import { problem } from '../errors.ts'
import type { Problem } from '../glossary.ts'
import { MAX_PROBLEMS } from './limits.ts'

/** Collects problems up to a bound and counts the rest. */
export interface ProblemList {
  /** The problem is only made when it is kept: finding its place costs time, and a bad file can hold very many. */
  readonly add: (make: () => Problem) => void
  readonly all: () => Problem[]
}

/** A new, empty list. `all` ends with one sentence about how many more there are, where there are more. */
export function problemList(): ProblemList {
  const kept: Problem[] = []
  let more = 0
  return {
    add(make) {
      if (kept.length < MAX_PROBLEMS) kept.push(make())
      else more++
    },
    all() {
      if (more === 0) return kept
      const message = `${more} more problems are not shown: mend these ${MAX_PROBLEMS} first.`
      return [...kept, problem('too-many-problems', [], message)]
    },
  }
}
