import { quote } from '#core/read/words.ts'
import type { SchemaNode } from './schema-node.ts'

/** What was found, as it may stand in a sentence. */
export function found(value: unknown): string {
  if (value === null || value === undefined) return 'empty'
  if (Array.isArray(value)) return 'a list'
  if (typeof value === 'object') return 'a block of keys'
  if (typeof value === 'string') return `the text ${quote(value)}`
  if (typeof value === 'number') return `the number ${value}`
  return `“${value}”`
}

/** `a`, `a and b`, `a, b and c`. */
export function listed(words: readonly (string | number)[]): string {
  if (words.length < 2) return words.join('')
  return `${words.slice(0, -1).join(', ')} and ${words.at(-1)}`
}

/** How the place is called in a sentence. */
export function titleOf(place: SchemaNode): string {
  return `“${place.title ?? 'this place'}”`
}

/** The first example of the place, as it is written in the file. */
export function exampleOf(place: SchemaNode): string {
  return asYaml(place.examples?.[0])
}

/** A value in YAML's flow style. */
function asYaml(value: unknown): string {
  if (Array.isArray(value)) return value.length === 0 ? '[]' : `[ ${value.map(asYaml).join(', ')} ]`
  if (typeof value !== 'object' || value === null) return String(value)
  const entries = Object.entries(value).map(([key, inner]) => `${key}: ${asYaml(inner)}`)
  return entries.length === 0 ? '…' : `{ ${entries.join(', ')} }`
}
