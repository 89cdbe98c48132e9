import type { Judged } from '#core/engine.ts'
import { ruleTitle } from '#core/texts/words.ts'

/** What each rule of a file's book says must hold, by the rule's name; a rule that the book does not have is told by its name. */
export function titlesOf({ book }: Pick<Judged, 'book'>): (rule: string) => string {
  const titles = new Map(book.rules.map(({ id, key }) => [id, ruleTitle(key)]))
  return (rule) => titles.get(rule) ?? rule
}
