import type { FieldWords } from '#core/sheets/plan.ts'
import { nearest } from '#core/texts/nearest.ts'
import { needsOf, readsOf } from './needs.ts'
import type { RuleRecord, SheetSchema } from './rule.ts'

/** What a rule may name. */
export interface Vocabulary {
  /** Fields of a subject's sheets. */
  readonly fieldsOf: (subject: RuleRecord['subject']) => ReadonlyMap<string, FieldWords>
  /** Fields that hold in one state only. */
  readonly stateFieldsOf: (subject: RuleRecord['subject']) => ReadonlySet<string>
  readonly parameters: ReadonlySet<string>
}

const EXPRESSION = /\{\{([^}]*)\}\}/g
const FIELD_EXPRESSION = /^(?:show|list) "([A-Za-z0-9_.]+)"$/
const PLAIN_EXPRESSION: ReadonlySet<string> = new Set(['name', 'state'])

interface Named {
  readonly fields: readonly string[]
  readonly parameters: readonly string[]
  readonly faults: readonly string[]
}

/** What a template names: fields, parameters, and expressions that it must not use. */
function namedIn(part: string, template: string): Named {
  const expressions = [...template.matchAll(EXPRESSION)].map(([, inside = '']) => inside.trim())
  const names = expressions.map((inside) => FIELD_EXPRESSION.exec(inside)?.[1])
  const faults = expressions
    .filter((inside, index) => names[index] === undefined && !PLAIN_EXPRESSION.has(inside))
    .map(
      (inside) =>
        `${part} uses {{${inside}}}; a template knows {{name}}, {{state}}, {{show "field"}} and {{list "field"}}.`,
    )
  const found = names.flatMap((name) => name ?? [])
  return {
    fields: found.filter((name) => !name.startsWith('book.')),
    parameters: found.filter((name) => name.startsWith('book.')).map((name) => name.slice('book.'.length)),
    faults,
  }
}

/** Parameters that a schema reaches: `{ $data: /book/unbalance }` and properties of `book`. */
function parametersIn(schema: unknown): string[] {
  if (Array.isArray(schema)) return schema.flatMap(parametersIn)
  if (typeof schema !== 'object' || schema === null) return []
  return Object.entries(schema).flatMap(([key, value]) => {
    if (key === '$data')
      return typeof value === 'string' && value.startsWith('/book/') ? [value.slice('/book/'.length)] : []
    if (key === 'book')
      return [...Object.keys((value as { properties?: object }).properties ?? {}), ...parametersIn(value)]
    return parametersIn(value)
  })
}

function fieldsIn(schema: SheetSchema | undefined, record: RuleRecord): string[] {
  if (!schema) return []
  const required = Array.isArray(schema['required'])
    ? schema['required'].filter((name) => typeof name === 'string')
    : []
  return [...readsOf({ ...record, must: schema }), ...required].filter((name) => name !== 'book')
}

function unknownField(name: string, record: RuleRecord, known: ReadonlyMap<string, FieldWords>): string {
  const hint = nearest(name, [...known.keys()])
  return `There is no field ${name} on the sheet of a ${record.subject}${hint === undefined ? '.' : `: did you mean ${hint}?`}`
}

/**
 * What is wrong with a rule that its schema cannot see: names that no sheet and no book has, and fields of one state in
 * a rule that is judged in none.
 */
export function lintRule(record: RuleRecord, { fieldsOf, stateFieldsOf, parameters }: Vocabulary): string[] {
  const words = [namedIn('says', record.says), namedIn('do', record.do)]
  const judged = [...fieldsIn(record.when, record), ...fieldsIn(record.must, record), ...needsOf(record)]
  const fields = [...new Set([...judged, ...(record.at ?? []), ...words.flatMap((named) => named.fields)])]
  const known = fieldsOf(record.subject)
  const inState = stateFieldsOf(record.subject)
  const reached = [
    ...new Set([
      ...parametersIn(record.when),
      ...parametersIn(record.must),
      ...words.flatMap((named) => named.parameters),
    ]),
  ]
  return [
    ...words.flatMap((named) => named.faults),
    ...fields.filter((name) => !known.has(name)).map((name) => unknownField(name, record, known)),
    ...(record.state === 'none' ? fields.filter((name) => inState.has(name)) : []).map(
      (name) => `${name} holds in one state, and the rule is judged in none: set state to grid, island or each.`,
    ),
    ...reached.filter((name) => !parameters.has(name)).map((name) => `The book has no parameter ${name}.`),
  ]
}
