import { isOrganisation, KINDS } from './object-key.ts'
import type { Within } from './store.ts'

/** The folders `<organisation>/<kind>` within, in the order in which their keys sort: a hyphen comes before the slash. */
export function foldersWithin({ organisation, kind }: Within): string[] {
  if (!isOrganisation(organisation)) throw new Error('A list of objects needs the id of an organisation.')
  const kinds = Object.keys(KINDS).filter((name) => (kind ?? name) === name)
  const folders = kinds.map((name) => `${organisation}/${name}/`).sort()
  return folders.map((folder) => folder.slice(0, -1))
}
