import { problem } from '#core/errors.ts'
import type { Problem } from '#core/glossary.ts'
import type { Entry } from './entries.ts'

/** Subjects of every report that the file does not name itself. */
const RESERVED: ReadonlyMap<string, string> = new Map([
  ['installation', 'the installation as a whole'],
  ['earthing', 'the earthing arrangement'],
])

function where(entry: Entry): string {
  return entry.path.join('.')
}

/**
 * Names that stand for two things. Keys cannot repeat inside one section (the reader refuses that), so only names
 * across sections are looked at. `<changeover>.load` is the backed-up side and so is taken as well.
 *
 * @returns one problem with code `duplicate-name` for the second and each later use of a name, at that use
 */
export function duplicateNames(entries: readonly Entry[], changeover: string): Problem[] {
  const taken = new Map<string, string>(RESERVED)
  taken.set(`${changeover}.load`, `the backed-up side of the changeover \`${changeover}\``)
  const problems: Problem[] = []
  for (const entry of entries) {
    const holder = taken.get(entry.id)
    if (holder === undefined) {
      taken.set(entry.id, `the ${entry.kind} at \`${where(entry)}\``)
      continue
    }
    const message = `\`${entry.id}\` already names ${holder}. Give this ${entry.kind} a name of its own.`
    problems.push(problem('duplicate-name', entry.path, message))
  }
  return problems
}
