import type { RuleRecord, SheetSchema } from './rule.ts'

const isSchema = (value: unknown): value is SheetSchema =>
  typeof value === 'object' && value !== null && !Array.isArray(value)

/** The field at the head of an absolute `$data` pointer: `/loop_limit` and `/book/unbalance` give `loop_limit` and `book`. */
function headOf(pointer: unknown): string[] {
  return typeof pointer === 'string' && pointer.startsWith('/') ? [pointer.split('/')[1] ?? ''] : []
}

function dataFields(value: unknown): string[] {
  if (Array.isArray(value)) return value.flatMap(dataFields)
  if (!isSchema(value)) return []
  return Object.entries(value).flatMap(([key, inner]) => (key === '$data' ? headOf(inner) : dataFields(inner)))
}

function namedFields(schema: SheetSchema): string[] {
  const properties = isSchema(schema['properties']) ? schema['properties'] : {}
  const all = Array.isArray(schema['allOf']) ? schema['allOf'].filter(isSchema) : []
  return [...Object.keys(properties), ...dataFields(properties), ...all.flatMap(namedFields)]
}

const CHOICES = ['anyOf', 'oneOf', 'not', 'if', 'then', 'else'] as const

function chosenFields(schema: SheetSchema): string[] {
  const inner = CHOICES.flatMap((keyword) => [schema[keyword]].flat()).filter(isSchema)
  const all = Array.isArray(schema['allOf']) ? schema['allOf'].filter(isSchema) : []
  return [...inner.flatMap((choice) => [...namedFields(choice), ...chosenFields(choice)]), ...all.flatMap(chosenFields)]
}

const fields = (names: readonly string[]): string[] => [...new Set(names)].filter((name) => name !== 'book')

/** The fields without which a rule cannot be shown: its own list, or every field that `must` names outside a choice. */
export function needsOf(record: RuleRecord): string[] {
  return record.needs ? [...record.needs] : fields(namedFields(record.must))
}

/** Every field that `must` looks at, within choices too. */
export function readsOf(record: RuleRecord): string[] {
  return fields([...namedFields(record.must), ...chosenFields(record.must)])
}

/** `when` with the meaning that rules give it: a field named under `properties` must be there. */
export function whenSchema(when: SheetSchema): SheetSchema {
  const properties = isSchema(when['properties']) ? Object.keys(when['properties']) : []
  const required = Array.isArray(when['required']) ? when['required'] : []
  return { ...when, required: [...new Set([...required, ...properties])] }
}
