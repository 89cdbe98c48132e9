import { exists, filesBelow, folderOf, isFolder, isInstallFile, pathFromHere, wholePath } from './io.ts'
import type { Watched } from './watching.ts'

/** The files that the words on the command line mean, and the words that mean none. */
export interface Selection {
  readonly files: readonly string[]
  readonly unmatched: readonly string[]
}

const MAGIC = /[*?[\]{}]/

/** What the parts of a glob mean; a bracket that nothing closes is a character like any other. */
const PARTS = /\*\*\/?|\*|\?|\{[^{}]*\}|\[!?[^[\]/]+\]|[.+^$()|\\[\]{}]/g

/** A range that runs backwards has nothing in it; its signs stand for themselves. */
const characters = (inside: string): string =>
  inside
    .replace(/^!/, '^')
    .replaceAll('\\', '\\\\')
    .replace(/(.)-(.)/g, (range, first: string, last: string) => (first <= last ? range : `${first}\\-${last}`))

function meaning(part: string): string {
  if (part === '**/') return '(?:[^/]+/)*'
  if (part === '**') return '.*'
  if (part === '*') return '[^/]*'
  if (part === '?') return '[^/]'
  if (part.length > 1 && part.startsWith('{')) return `(?:${part.slice(1, -1).split(',').map(sourceOf).join('|')})`
  if (part.length > 1 && part.startsWith('[')) return `[${characters(part.slice(1, -1))}]`
  return `\\${part}`
}

const sourceOf = (glob: string): string => glob.replace(PARTS, meaning)

/** A glob as a regular expression: `**`, `*`, `?`, `[abc]`, `[!abc]` and `{a,b}`. */
export function globPattern(glob: string): RegExp {
  return new RegExp(`^${sourceOf(glob)}$`)
}

/** The folder above the first part of a glob that matches more than itself. */
function rootOf(glob: string): string {
  const parts = glob.split('/')
  const first = parts.findIndex((part) => MAGIC.test(part))
  return parts.slice(0, first).join('/') || (glob.startsWith('/') ? '/' : '.')
}

function expand(word: string): readonly string[] {
  if (word === '-' || (exists(word) && !isFolder(word))) return [word]
  if (isFolder(word)) return filesBelow(word)
  if (!MAGIC.test(word)) return []
  const root = rootOf(word)
  if (!isFolder(root)) return []
  const pattern = globPattern(word.replace(/^\.\//, ''))
  return filesBelow(root, (path) => pattern.test(path))
}

/** Where files can come up that the words mean: folders with all below them, the folder of a file for that file alone. */
export function watchedFor(words: readonly string[]): readonly Watched[] {
  return words.flatMap((word): Watched[] => {
    if (word === '-') return []
    if (isFolder(word)) return [{ folder: word, deep: true, wanted: isInstallFile }]
    if (exists(word) || !MAGIC.test(word)) {
      const whole = wholePath(word)
      return [{ folder: folderOf(whole), deep: false, wanted: (path) => path === whole }]
    }
    const [root, pattern] = [rootOf(word), globPattern(word.replace(/^\.\//, ''))]
    const matches = (path: string): boolean => pattern.test(word.startsWith('/') ? path : pathFromHere(path))
    return isFolder(root) ? [{ folder: root, deep: true, wanted: matches }] : []
  })
}

/** Expands files, folders and globs, each file once and in the order of the words. */
export function select(words: readonly string[]): Selection {
  const found = words.map((word) => [word, expand(word)] as const)
  return {
    files: [...new Set(found.flatMap(([, files]) => files))],
    unmatched: found.filter(([, files]) => files.length === 0).map(([word]) => word),
  }
}
