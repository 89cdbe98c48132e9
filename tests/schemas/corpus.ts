import { readdirSync, readFileSync } from 'node:fs'
import { parse, stringify } from 'yaml'

const FOLDER = new URL('../../examples/', import.meta.url)

export interface Sample {
  readonly name: string
  readonly text: string
  readonly tree: unknown
}

/** The example files, as they are shipped. */
export const EXAMPLES: readonly Sample[] = readdirSync(FOLDER)
  .filter((name) => name.endsWith('.skerry.yaml'))
  .sort()
  .map((name) => {
    const text = readFileSync(new URL(name, FOLDER), 'utf8')
    return { name, text, tree: parse(text) as unknown }
  })

export function example(name: string): Sample {
  const found = EXAMPLES.find((sample) => sample.name === `${name}.skerry.yaml`)
  if (!found) throw new Error(`There is no example ${name}`)
  return found
}

type Way = (string | number)[]

/** A copy of the tree with one value put in place of another; undefined takes the key away. */
export function changed(tree: unknown, way: Way, value: unknown): unknown {
  const copy = structuredClone(tree)
  const key = way.at(-1)
  let at = copy as Record<string | number, unknown>
  for (const step of way.slice(0, -1)) at = at[step] as Record<string | number, unknown>
  if (key === undefined) return value
  if (value === undefined) delete at[key]
  else at[key] = value
  return copy
}

/** One change at every place of the tree, by turns another kind of change, so that all kinds meet all kinds of place. */
export function mutants(tree: unknown): Sample[] {
  return placesOf(tree).map((way, index) => {
    const change = CHANGES[index % CHANGES.length] ?? null
    const mutant = changed(tree, way, change?.value)
    return { name: `${way.join('/')}: ${change?.name}`, text: stringify(mutant), tree: mutant }
  })
}

const CHANGES: readonly { name: string; value: unknown }[] = [
  { name: 'nothing', value: null },
  { name: 'a text', value: 'abc' },
  { name: 'a negative number', value: -3.5 },
  { name: 'taken away', value: undefined },
  { name: 'a list', value: [1] },
  { name: 'a block', value: { not_tested: 'no access' } },
  { name: 'true', value: true },
  { name: 'a decimal comma', value: '1,5 m' },
  { name: 'an unknown block', value: { colour: 'red' } },
  { name: 'an empty text', value: '' },
  { name: 'a large number', value: 1e12 },
]

function placesOf(tree: unknown, way: Way = []): Way[] {
  if (typeof tree !== 'object' || tree === null) return []
  return Object.entries(tree).flatMap(([key, value]) => {
    const here = [...way, Array.isArray(tree) ? Number(key) : key]
    return [here, ...placesOf(value, here)]
  })
}
