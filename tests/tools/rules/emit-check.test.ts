import { createRequire } from 'node:module'
import { Ajv2020 } from 'ajv/dist/2020.js'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { AJV_RULE_SETTINGS } from '#core/judge/ajv-settings.ts'
import { whenSchema } from '#core/judge/needs.ts'
import type { SheetSchema } from '#core/judge/rule.ts'
import { emitCheck } from '#tools/rules/emit-check.ts'
import { resolvedBooks } from '#tools/rules/generate.ts'

/** The validator's own comparison. */
const { default: equal } = createRequire(import.meta.url)('ajv/dist/runtime/equal.js')

type Sheet = Record<string, unknown>

/** Values of every type, among which a keyword must find its own. */
const ANY: readonly unknown[] = [undefined, null, true, false, 0, 1, Number.NaN, Infinity, '', 'a', [], ['a'], { a: 1 }]

/** A literal of a schema with what lies just beside it. */
function around(literal: unknown): unknown[] {
  if (typeof literal === 'number') return [literal - 0.01, literal, literal + 0.01]
  return typeof literal === 'string' ? [literal, [literal], ['x', literal]] : [literal]
}

/** The fields that a keyword names. */
const FIELDS: Readonly<Record<string, (given: unknown) => readonly string[]>> = {
  $data: (given) => String(given).split('/'),
  properties: (given) => Object.keys(given as object),
  required: (given) => given as string[],
}

function named(schema: unknown, fields: Set<string>, literals: Set<unknown>): void {
  if (typeof schema !== 'object' || schema === null) {
    for (const value of around(schema)) literals.add(value)
    return
  }
  for (const [key, value] of Object.entries(schema)) {
    for (const name of FIELDS[key]?.(value) ?? []) fields.add(name)
    named(value, fields, literals)
  }
}

function sheetsFor(schema: SheetSchema): fc.Arbitrary<Sheet> {
  const [fields, literals] = [new Set<string>(), new Set<unknown>()]
  named(schema, fields, literals)
  const value = fc.constantFrom(...ANY, ...literals)
  const flat = fc.record(Object.fromEntries([...fields].map((name) => [name, value])))
  return fc.tuple(flat, flat).map(([sheet, book]) => ({ ...sheet, book }))
}

/** The emitted expression as a function, the way `compile-checks.ts` writes it. */
function emitted(schema: SheetSchema): ((sheet: Sheet) => unknown) | undefined {
  const code = emitCheck(schema)
  if (code === undefined) return undefined
  const check = new Function('equal', 's', `return ${code}`)
  return (sheet) => check(equal, sheet)
}

const ajv = new Ajv2020(AJV_RULE_SETTINGS)

function expectSame(schema: SheetSchema, runs: number): void {
  const validate = ajv.compile({ ...schema })
  const check = emitted(schema)
  if (!check) throw new Error(`Nothing is written for ${JSON.stringify(schema)}.`)
  fc.assert(
    fc.property(sheetsFor(schema), (sheet) => {
      if (check(sheet) !== validate(sheet)) throw new Error(`The validator says ${validate(sheet)}.`)
    }),
    { numRuns: runs },
  )
}

const field = (schema: SheetSchema): SheetSchema => ({ properties: { field: schema } })

/** As text, since an object with 'then' looks like a promise. */
const CONDITIONS: readonly SheetSchema[] = JSON.parse(`[
  { "if": { "required": ["field"] }, "then": { "required": ["other"] }, "else": { "properties": { "field": { "const": 1 } } } },
  { "if": { "properties": { "field": { "const": 1 } } }, "then": { "required": ["field"] } }
]`)

describe('the code that is written for a schema', () => {
  it('judges as the validator does, for every schema of the books', async () => {
    const books = await resolvedBooks()
    const records = books.flatMap(({ rules }) => rules.map(({ record }) => record))
    const schemas = records.flatMap(({ when, must }) => (when ? [whenSchema(when), must] : [must]))
    const different = new Map(schemas.map((schema) => [JSON.stringify(schema), schema]))
    expect(different.size).toBeGreaterThan(200)
    const written = [...different.values()].filter((schema) => emitCheck(schema) !== undefined)
    expect(written.length).toBeGreaterThan(different.size * 0.9)
    for (const schema of written) expectSame(schema, 60)
  })

  it.each([
    field({ maximum: { $data: '/other' } }),
    field({ minimum: { $data: '/book/other' } }),
    field({ exclusiveMaximum: 4 }),
    field({ exclusiveMinimum: { $data: '/other' } }),
    field({ const: { $data: '/other' } }),
    field({ const: null }),
    field({ enum: ['a', 1, null] }),
    field({ type: 'array', minItems: 1, maxItems: 1 }),
    field({ contains: { const: 'a' } }),
    field({ items: { contains: { minimum: 1 } } }),
    field({ items: { enum: ['a', 'b'] } }),
    field({ minLength: 2 }),
    field({ pattern: '^[ab]+$' }),
    field({ not: { anyOf: [{ const: 1 }, { pattern: 'a' }] } }),
    field({ properties: { inner: { const: 'a' } }, required: ['inner'] }),
    { allOf: [field({ minimum: 0 }), { required: ['other'] }] },
    {},
    ...CONDITIONS,
  ])('judges as the validator does: %j', (schema) => {
    expectSame(schema, 400)
  })

  it.each([
    [{ properties: { field: { multipleOf: 2 } } }],
    [{ properties: { field: { maximum: { $data: '1/other' } } } }],
    [{ not: { dependentRequired: { field: ['other'] } } }],
    [{ anyOf: [{ uniqueItems: true }] }],
  ])('is left to the validator where a keyword is not known: %j', (schema) => {
    expect(emitCheck(schema)).toBeUndefined()
  })
})
