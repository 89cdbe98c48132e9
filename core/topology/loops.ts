import { problem } from '#core/errors.ts'
import type { Problem } from '#core/glossary.ts'
import type { Install } from '#core/install.ts'
import type { Entry } from './entries.ts'
import { feederId } from './feeders.ts'

/**
 * Rings in `fed_from`: things that in the end feed themselves, so that nothing connects them to the supply.
 *
 * @param entries the tree's entries, one whose `fed_from` names nothing ends its way there
 * @returns one problem with code `loop` for each ring, at the ring's first member in the order of the file, with the whole ring in its message
 */
export function loops(entries: readonly Entry[], install: Install): Problem[] {
  const byId = new Map(entries.map((entry) => [entry.id, entry]))
  const above = ({ fedFrom }: Entry) => (fedFrom === undefined ? undefined : byId.get(feederId(fedFrom, install)))
  const walked = new Set<Entry>()
  const problems: Problem[] = []
  for (const start of entries) {
    const trail = new Set<Entry>()
    let entry: Entry | undefined = start
    while (entry && !walked.has(entry)) {
      walked.add(entry)
      trail.add(entry)
      entry = above(entry)
    }
    if (entry && trail.has(entry)) problems.push(ringProblem(entry, [...trail]))
  }
  return problems
}

function ringProblem(first: Entry, trail: readonly Entry[]): Problem {
  const ring = trail.slice(trail.indexOf(first))
  const names = [...ring, first].map(({ id }) => `\`${id}\``)
  const message = `This ring feeds itself, each fed from the next: ${names.join(' ← ')}. Feed one of them from the supply side.`
  return problem('loop', [...first.path, 'fed_from'], message)
}
