import Handlebars from 'handlebars'
import type { PlacedRule } from '#core/judge/book.ts'
import { firstCite, keyOf } from '#core/judge/stored.ts'

/** JavaScript of the rules' words, precompiled: an object of functions by rule key. */
export function precompileWords(rules: readonly PlacedRule[]): string {
  const entries = rules.map((rule) => {
    const { title, says, do: what } = rule.record
    const cite = firstCite(rule.record)
    return `${JSON.stringify(keyOf(rule))}:{title:${JSON.stringify(title)},cite:${JSON.stringify(cite)},says:${spec(says)},do:${spec(what)}}`
  })
  return `export default {\n${entries.join(',\n')}\n}\n`
}

function spec(template: string): string {
  const source = Handlebars.precompile(template, {
    strict: false,
    noEscape: true,
    knownHelpersOnly: true,
    knownHelpers: { name: true, state: true, show: true, list: true },
  })
  return `()=>(${source})`
}
