import type Handlebars from 'handlebars'
import runtime from 'handlebars/runtime.js'
import ruleWords from '#core/generated/rule-words.js'
import { registerHelpers, type WordScene } from './helpers.ts'

/** What a finding says, and what to do about it. */
export interface FindingWords {
  readonly says: string
  readonly do: string
}

/** Fills one part of a rule's words. */
export type Printer = (scene: WordScene) => string

/** The package declares no types for its runtime: it is the full engine without the compiler. */
const engine = (runtime as unknown as typeof Handlebars).create()
registerHelpers(engine)
const printers = new Map<string, Printer>()
const own = new Map<string, { readonly title: string; readonly cite: string }>()

function printer(key: string, part: 'says' | 'do'): Printer {
  const name = `${key} ${part}`
  const known = printers.get(name)
  if (known) return known
  const words = ruleWords[key]
  if (!words) throw new Error(`The words of the rule ${key} are missing: generate the rules again.`)
  const made = engine.template(words[part]())
  printers.set(name, made)
  return made
}

/** Fills the words of a shipped rule from a sheet. */
export function ruleWordsFor(key: string, scene: WordScene): FindingWords {
  return { says: printer(key, 'says')(scene), do: printer(key, 'do')(scene) }
}

/** What a rule says must hold. */
export function ruleTitle(key: string): string {
  return headOf(key).title
}

/** Where a rule comes from, by the first source that it names: `IEC 60364-6:2016, 6.4.3.2`. */
export function ruleCite(key: string): string {
  return headOf(key).cite
}

function headOf(key: string): { readonly title: string; readonly cite: string } {
  const head = own.get(key) ?? ruleWords[key]
  if (!head) throw new Error(`The words of the rule ${key} are missing: generate the rules again.`)
  return head
}

/** Adds the words of a rule of one's own, compiled when its book was read. */
export function learnWords(
  key: string,
  {
    title,
    cite,
    says,
    do: what,
  }: { readonly title: string; readonly cite: string; readonly says: Printer; readonly do: Printer },
): void {
  own.set(key, { title, cite })
  printers.set(`${key} says`, says)
  printers.set(`${key} do`, what)
}
