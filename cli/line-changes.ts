/** A line that goes, or one that comes, with its number in the text that it is of. */
export interface LineChange {
  readonly sign: '-' | '+'
  readonly number: number
  readonly text: string
}

/** How far ahead the two texts are looked at for the place where they agree again. */
const AHEAD = 200

/** How many lines to pass until both agree again: the same number in both, or only in the new one. */
function nextAgreement(
  old: readonly string[],
  made: readonly string[],
  at: number,
  to: number,
): { readonly gone: number; readonly come: number } {
  for (let count = 1; count <= AHEAD; count += 1) {
    if (old[at + count] === made[to + count]) return { gone: count, come: count }
    if (old[at] === made[to + count]) return { gone: 0, come: count }
  }
  return { gone: 1, come: 1 }
}

function numbered(sign: LineChange['sign'], lines: readonly string[], from: number, count: number): LineChange[] {
  return lines.slice(from, from + count).map((text, index) => ({ sign, number: from + index + 1, text }))
}

/**
 * What changed between two texts, line by line. Made for edits that change lines and put new ones in, which is all that
 * filling does; any other change comes out right, though not as briefly as it could be told.
 */
export function lineChanges(before: string, after: string): readonly LineChange[] {
  const [old, made] = [before.split('\n'), after.split('\n')]
  const changes: LineChange[] = []
  let [at, to] = [0, 0]
  while (at < old.length || to < made.length) {
    const same = old[at] === made[to]
    const { gone, come } = same ? { gone: 1, come: 1 } : nextAgreement(old, made, at, to)
    if (!same) {
      changes.push(...numbered('-', old, at, gone), ...numbered('+', made, to, come))
    }
    at += gone
    to += come
  }
  return changes
}
