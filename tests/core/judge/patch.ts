import { readFileSync } from 'node:fs'
import { load } from 'js-yaml'
import { stringify } from 'yaml'
import type { RuleExample } from '#core/judge/rule.ts'

const BASE = readFileSync(new URL('../../../schemas/rules/base.skerry.yaml', import.meta.url), 'utf8')

type Block = Record<string, unknown>

const isBlock = (value: unknown): value is Block => typeof value === 'object' && value !== null

function descend(tree: Block, keys: readonly string[]): Block {
  let here = tree
  for (const key of keys) {
    const next = here[key]
    if (isBlock(next)) here = next
    else {
      const made: Block = {}
      here[key] = made
      here = made
    }
  }
  return here
}

/** A dotted path; a part with dots of its own stands between backticks. */
const parts = (path: string): string[] => path.split('.')

/** The base file with an example's patch, as text. */
export function patched({ set = {}, remove = [] }: Pick<RuleExample, 'set' | 'remove'>): string {
  const tree = load(BASE) as Block
  for (const path of remove) {
    const keys = parts(path)
    const last = keys.at(-1) ?? ''
    const parent = descend(tree, keys.slice(0, -1))
    if (!Object.hasOwn(parent, last)) throw new Error(`The base file has no ${path} to take out.`)
    if (Array.isArray(parent)) parent.splice(Number(last), 1)
    else delete parent[last]
  }
  for (const [path, value] of Object.entries(set)) {
    const keys = parts(path)
    descend(tree, keys.slice(0, -1))[keys.at(-1) ?? ''] = value
  }
  return stringify(tree)
}
