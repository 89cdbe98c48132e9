/** What is printed of a rule: `says` and `do` are templates, which `core/texts/fill.ts` fills. */
export interface RuleWords { readonly title: string; readonly cite: string; readonly says: string; readonly do: string }
/** By rule key. */
declare const words: Readonly<Record<string, RuleWords>>
export default words
