import ruleWords, { type RuleWords } from '#core/generated/rule-words.js'
import { type Printer, printerOf, type WordScene } from './fill.ts'

/** What a finding says, and what to do about it. */
export interface FindingWords {
  readonly says: string
  readonly do: string
}

const own = new Map<string, RuleWords>()
const printers = new WeakMap<RuleWords, { readonly says: Printer; readonly do: Printer }>()

function wordsOf(key: string): RuleWords {
  const words = own.get(key) ?? ruleWords[key]
  if (!words) throw new Error(`The words of the rule ${key} are missing: generate the rules again.`)
  return words
}

/** Fills the words of a rule from a sheet. */
export function ruleWordsFor(key: string, scene: WordScene): FindingWords {
  const words = wordsOf(key)
  const ready = printers.get(words) ?? { says: printerOf(words.says), do: printerOf(words.do) }
  printers.set(words, ready)
  return { says: ready.says(scene), do: ready.do(scene) }
}

/** What a rule says must hold. */
export function ruleTitle(key: string): string {
  return wordsOf(key).title
}

/** Where a rule comes from, by the first source that it names: `IEC 60364-6:2016, 6.4.3.2`. */
export function ruleCite(key: string): string {
  return wordsOf(key).cite
}

/** Adds the words of a rule of one's own, when its book is read. */
export function learnWords(key: string, words: RuleWords): void {
  own.set(key, words)
}
