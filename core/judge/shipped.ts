import { BOOKS, RULES } from '#core/generated/books.js'
import * as checks from '#core/generated/rule-checks.js'
import type { Check, Rule, RuleBook } from './rule.ts'

/** A rule in the generated list: its record without words, its schemas by the names of the compiled checks. */
export interface StoredRule extends Omit<Rule, 'when' | 'must'> {
  readonly key: string
  readonly when: string | null
  readonly must: string
}

/** A book in the generated list: its rules by their place in the list of rules. */
export interface StoredBook extends Omit<RuleBook, 'rules'> {
  readonly rules: readonly number[]
  readonly units: Readonly<Record<string, string>>
}

const compiled = checks as Readonly<Record<string, Check>>

function checkNamed(name: string): Check {
  const check = compiled[name]
  if (!check) throw new Error(`The compiled check ${name} is missing: generate the rules again.`)
  return check
}

/** Ids of the books that come with Skerry. */
export const SHIPPED_BOOKS: readonly string[] = Object.keys(BOOKS)

/** A rule with the key under which its words and its page are kept. */
export interface ShippedRule extends Rule {
  readonly key: string
}

/** A rule book that comes with Skerry, with the units of its parameters. */
export interface ShippedBook extends RuleBook {
  readonly rules: readonly ShippedRule[]
  readonly units: Readonly<Record<string, string>>
}

/** The shipped book of a name, its rules compiled when Skerry was built; undefined for any other name. */
export function shippedBook(id: string): ShippedBook | undefined {
  const stored = Object.hasOwn(BOOKS, id) ? BOOKS[id]?.() : undefined
  if (!stored) return undefined
  const all = RULES()
  const rules = stored.rules.flatMap((place) => {
    const rule = all[place]
    return rule
      ? [{ ...rule, when: rule.when === null ? undefined : checkNamed(rule.when), must: checkNamed(rule.must) }]
      : []
  })
  return { ...stored, rules }
}
