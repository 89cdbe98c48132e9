import type { PlacedRule, ResolvedBook } from './book.ts'
import { hashOf } from './canonical.ts'
import { needsOf, readsOf, whenSchema } from './needs.ts'
import type { RuleRecord, SheetSchema } from './rule.ts'
import type { StoredBook, StoredRule } from './shipped.ts'

/** The name under which a rule's words and page are kept: two books may hold different rules of one name. */
export const keyOf = ({ from, record }: PlacedRule): string => `${from}/${record.id}`

/** The first source that a rule names, as it is printed beside a finding. */
export function firstCite({ cites }: RuleRecord): string {
  const [first] = cites
  return [first?.publication, first?.clause].filter((part) => part !== undefined).join(', ')
}

/** A rule as the judge's list holds it; `nameOf` names the compiled form of each schema. */
export function storedRule(rule: PlacedRule, nameOf: (schema: SheetSchema) => string): StoredRule {
  const { record } = rule
  return {
    key: keyOf(rule),
    id: record.id,
    subject: record.subject,
    state: record.state,
    severity: record.severity,
    needs: needsOf(record),
    reads: readsOf(record),
    at: record.at ?? readsOf(record),
    when: record.when ? nameOf(whenSchema(record.when)) : null,
    must: nameOf(record.must),
  }
}

/** A book as the judge's list holds it; `placeOf` gives each rule's place in the list of rules. */
export function storedBook(book: ResolvedBook, placeOf: (key: string) => number): StoredBook {
  const parameters = Object.entries(book.parameters)
  return {
    id: book.id,
    title: book.title,
    version: book.version,
    hash: hashOf(book),
    // A book is held to its base's names when it is resolved, and the base's are held to this type by a test.
    parameters: Object.fromEntries(
      parameters.map(([name, { value }]) => [name, value]),
    ) as unknown as StoredBook['parameters'],
    units: Object.fromEntries(parameters.map(([name, { unit }]) => [name, unit ?? ''])),
    rules: book.rules.map((rule) => placeOf(keyOf(rule))),
  }
}
