/**
 * The candidate that a mistyped word most likely means: the one with the fewest slips of the pen (a letter too many,
 * too few, wrong, or two swapped), as long as there is at most one slip for every three letters.
 *
 * @param word what was written; capitals and small letters count as equal
 * @param candidates what is allowed
 * @returns the nearest candidate, the first of equals; undefined where none is near
 */
export function nearest(word: string, candidates: readonly string[]): string | undefined {
  const written = word.toLowerCase()
  const limit = Math.max(1, Math.floor(written.length / 3))
  let best: string | undefined
  let bestSlips = limit + 1
  for (const candidate of candidates) {
    if (Math.abs(candidate.length - written.length) >= bestSlips) continue
    const slips = distance(written, candidate.toLowerCase())
    if (slips >= bestSlips) continue
    best = candidate
    bestSlips = slips
  }
  return best
}

const UNREACHED: readonly number[] = []

/**
 * Damerau-Levenshtein distance in its optimal-string-alignment form: the number of insertions, deletions,
 * substitutions and swaps of neighbours that turn one word into the other, no letter touched twice.
 *
 * @param from a word of at most some hundred letters; the work grows with the product of both lengths
 * @param to the other word
 */
export function distance(from: string, to: string): number {
  let beforeLast: number[] = []
  let last = Array.from({ length: to.length + 1 }, (_, index) => index)
  for (let row = 1; row <= from.length; row++) {
    const current = [row]
    for (let column = 1; column <= to.length; column++) {
      const same = from[row - 1] === to[column - 1]
      const swapped = from[row - 1] === to[column - 2] && from[row - 2] === to[column - 1]
      current[column] = Math.min(
        at(last, column) + 1,
        at(current, column - 1) + 1,
        at(last, column - 1) + (same ? 0 : 1),
        at(swapped ? beforeLast : UNREACHED, column - 2) + 1,
      )
    }
    beforeLast = last
    last = current
  }
  return at(last, to.length)
}

/** A cell of the table; beyond its edge nothing can be reached. */
function at(row: readonly number[], column: number): number {
  return row[column] ?? Number.POSITIVE_INFINITY
}
