import { readFileSync } from 'node:fs'
import { Ajv2020 } from 'ajv/dist/2020.js'
import { describe, expect, it } from 'vitest'
import pages from '#core/generated/rule-pages.js'
import { lintRule } from '#core/judge/lint.ts'
import { fieldsOf, stateFieldsOf } from '#core/sheets/plans.ts'

const { books, rules } = pages()
const base = books.find(({ id }) => id === 'iec')
const parameters = new Set(Object.keys(base?.parameters ?? {}))
const validate = new Ajv2020({ allErrors: true }).compile(JSON.parse(readFileSync('schemas/rule.schema.json', 'utf8')))

describe.each(rules)('$key', ({ record }) => {
  it('has the shape of a rule', () => {
    expect(validate(record), JSON.stringify(validate.errors)).toBe(true)
  })

  it('names only fields and parameters that exist', () => {
    expect(lintRule(record, { fieldsOf, stateFieldsOf, parameters })).toEqual([])
  })
})

describe('the rule books', () => {
  it('hold at least a hundred rules in the base', () => {
    expect(base?.keys.length).toBeGreaterThanOrEqual(100)
  })

  it('use a name for one rule only, over all books, save where one replaces another', () => {
    const added = rules.filter(({ record }) => record.replaces_because === undefined).map(({ record }) => record.id)
    expect(added.length).toBe(new Set(added).size)
  })

  it.each(books)('$id gives a source for every parameter and every rule', ({ parameters: given, keys }) => {
    for (const [name, { source }] of Object.entries(given)) expect(source.length, name).toBeGreaterThan(10)
    const own = rules.filter(({ key }) => keys.includes(key))
    for (const { record } of own) expect(record.cites.length, record.id).toBeGreaterThan(0)
  })
})
