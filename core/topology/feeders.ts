import { problem } from '#core/errors.ts'
import type { Problem } from '#core/glossary.ts'
import type { Install } from '#core/install.ts'
import { nearest } from '#core/texts/nearest.ts'
import type { Entry } from './entries.ts'

/** Kinds of the tree that others can be fed from; circuits and inverters are ends of it. */
const FEEDERS: ReadonlySet<Entry['kind']> = new Set([
  'supply',
  'board',
  'overcurrent device',
  'changeover',
  'residual-current device',
])

/** How many known names a message lists. */
const SHOWN = 8

/** The id behind a name in `fed_from`: `CO.load` and `CO` both mean the backed-up side of changeover `CO`. */
export function feederId(name: string, install: Install): string {
  const { id } = install.changeover
  return name === `${id}.load` ? id : name
}

/** Ends a sentence on an unknown name: the nearest known one, or the list of what would do. */
export function suggestion(name: string, candidates: readonly string[]): string {
  const close = nearest(name, candidates)
  if (close !== undefined) return `Did you mean \`${close}\`?`
  if (candidates.length === 0) return 'The file names none yet: add it, or take the reference out.'
  const shown = candidates.slice(0, SHOWN).map((candidate) => `\`${candidate}\``)
  const rest = candidates.length - shown.length
  return `Known are: ${shown.join(', ')}${rest > 0 ? ` and ${rest} more` : ''}.`
}

/**
 * References in `fed_from` that lead nowhere: `dangling-name` for a name that nothing has, `not-a-feeder` for a name
 * of something that feeds nothing (a circuit, an inverter, an array, an instrument …).
 *
 * @param entries everything of the file that has a name
 */
export function feederProblems(entries: readonly Entry[], install: Install): Problem[] {
  // Where two things share a name, the first one keeps it: the clash is reported apart.
  const kinds = new Map(entries.map(({ id, kind }): [string, Entry['kind']] => [id, kind]).toReversed())
  const candidates = entries.filter(({ kind }) => FEEDERS.has(kind)).map(({ id }) => id)
  return entries.flatMap(({ id, kind, path, fedFrom }): Problem[] => {
    if (fedFrom === undefined) return []
    const feeder = kinds.get(feederId(fedFrom, install))
    if (feeder !== undefined && FEEDERS.has(feeder)) return []
    const place = [...path, 'fed_from']
    if (feeder === undefined) {
      const others = [...candidates, `${install.changeover.id}.load`].filter((candidate) => candidate !== id)
      const message = `The ${kind} \`${id}\` is fed from \`${fedFrom}\`, but nothing has that name. ${suggestion(fedFrom, others)}`
      return [problem('dangling-name', place, message)]
    }
    const message = `\`${id}\` is fed from \`${fedFrom}\`, which is ${article(feeder)} and feeds nothing. Name the board or device that feeds \`${id}\`.`
    return [problem('not-a-feeder', place, message)]
  })
}

function article(kind: string): string {
  return `${/^[aeiou]/.test(kind) ? 'an' : 'a'} ${kind}`
}
