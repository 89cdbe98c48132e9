import { displayName } from '#server/files/names.ts'

/** Names that Windows gives to devices, with any ending. */
const DEVICES = /^(?:con|prn|aux|nul|com\d|lpt\d)(?:\.|$)/i

/** Signs that some file system takes for something else. */
const REFUSED = /[<>:"|?*]/g

/** One part of a path inside an archive that every unpacker writes as it stands, below its own folder. */
function part(sent: string): string {
  const name = displayName(sent.replaceAll('/', '_').replaceAll('\\', '_'))
    .replace(REFUSED, '_')
    .replace(/[. ]+$/, '')
  if (name === '') return 'unnamed'
  return DEVICES.test(name) ? `_${name}` : name
}

/** A path inside an archive from the names of its folders and its file. */
export const zipPath = (parts: readonly string[]): string => parts.map(part).join('/')

/** The path with a number before its ending, for the second and later of the same name. */
function numbered(path: string, number: number): string {
  const [, stem = path, ending = ''] = /^(.*[^/])(\.[A-Za-z0-9]{1,10})$/.exec(path) ?? []
  return `${stem} (${number})${ending}`
}

/** Makes paths differ, also where a file system does not tell capitals from small letters. Keeps their order. */
export function distinct(paths: readonly string[]): string[] {
  const taken = new Set<string>()
  return paths.map((path) => {
    let free = path
    for (let number = 2; taken.has(free.toLowerCase()); number += 1) free = numbered(path, number)
    taken.add(free.toLowerCase())
    return free
  })
}
