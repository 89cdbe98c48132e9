import type { Path } from '#core/glossary.ts'

/**
 * The stated reason why something on the way to a place in the file was not tested, if there is one.
 *
 * A reason covers everything below it: `K1: { not_tested: "no access" }` covers each reading of K1.
 *
 * @param tree the file as read or normalised
 * @param path the place of the missing reading
 */
export function limitationAt(tree: unknown, path: Path): string | undefined {
  let here: unknown = tree
  for (const key of path) {
    if (typeof here !== 'object' || here === null) return undefined
    here = (here as Record<string | number, unknown>)[key]
    if (typeof here !== 'object' || here === null) return undefined
    const reason = (here as Record<string, unknown>)['not_tested']
    if (typeof reason === 'string') return reason
  }
  return undefined
}
