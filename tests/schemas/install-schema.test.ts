import { Ajv2020 } from 'ajv/dist/2020.js'
import { checkSync } from 'recheck'
import { describe, expect, it } from 'vitest'
import { resolved } from '#core/shape/place.ts'
import { installSchema } from '#core/shape/schema.ts'
import { ANNOTATIONS, type SchemaNode } from '#core/shape/schema-node.ts'
import { SETTINGS } from '#tools/schema/compile.ts'
import { eachSchema } from '#tools/schema/map-schema.ts'

const schema = installSchema()
const all = [...eachSchema(schema)].filter(({ at }) => !/\/(?:if|then|else|not|propertyNames)\b/.test(at))
/** Every property that a file can have, with what it refers to merged in. */
const properties = all
  .filter(({ at }) => /\/properties\/[^/]+$/.test(at) || at.endsWith('/items'))
  .map(({ node, at }) => ({ at, node, whole: resolved(node, schema) }))

function failing(
  test: (node: SchemaNode) => boolean,
  among: readonly { at: string; whole: SchemaNode }[] = properties,
) {
  return among.filter(({ whole }) => !test(whole)).map(({ at }) => at)
}

function typesOf(node: SchemaNode): readonly string[] {
  return [node.type ?? []].flat()
}

describe('every property explains itself', () => {
  it('and there are as many as the format has', () => expect(properties.length).toBeGreaterThan(230))
  it('by a title', () => expect(failing(({ title }) => (title ?? '').length > 0)).toEqual([]))
  it('by a description that is a sentence', () => {
    expect(failing(({ description }) => /^[A-Z].*\.$/.test(description ?? ''))).toEqual([])
  })
  it('by at least one example', () => expect(failing(({ examples }) => (examples ?? []).length > 0)).toEqual([]))
  it('by its unit, which its description names, where it is a quantity', () => {
    const quantities = properties.filter(({ whole }) => whole['x-quantity'] ?? whole['x-reading'])
    expect(quantities.length).toBeGreaterThan(110)
    expect(failing((whole) => whole['x-unit'] !== undefined, quantities)).toEqual([])
    const unnamed = (whole: SchemaNode) => (whole.description ?? '').includes(unitInWords(whole['x-unit'] ?? ''))
    expect(failing(unnamed, quantities)).toEqual([])
  })
  it('by a meaning for each allowed value, where it gives meanings', () => {
    const told = properties.filter(({ whole }) => whole['x-meanings'])
    expect(told.length).toBeGreaterThan(8)
    expect(failing((whole) => whole['x-meanings']?.length === whole.enum?.length, told)).toEqual([])
  })
})

/** `mA/Ah` is written out as `mA per Ah`. */
function unitInWords(unit: string): string {
  return unit.replace('mA/Ah', 'mA per Ah')
}

describe('the examples in the schema', () => {
  it('are accepted at their own place', () => {
    const ajv = new Ajv2020(SETTINGS)
    ajv.addVocabulary([...ANNOTATIONS])
    const wrong = properties.flatMap(({ node, at }) => {
      const validate = ajv.compile({ ...node, $defs: schema.$defs })
      return (node.examples ?? []).filter((example) => !validate(example)).map((example) => ({ at, example }))
    })
    expect(wrong).toEqual([])
  }, 60_000)
})

describe('nothing in the schema is without a bound', () => {
  it('no text, no list, no map, no block with free keys', () => {
    const nodes = all.map(({ node, at }) => ({ at, whole: resolved(node, schema) }))
    const free = (whole: SchemaNode) =>
      typesOf(whole).includes('string') && !whole.enum && whole.maxLength === undefined
    expect(failing((whole) => !free(whole), nodes)).toEqual([])
    expect(failing((whole) => !typesOf(whole).includes('array') || whole.maxItems !== undefined, nodes)).toEqual([])
    expect(failing((whole) => !typesOf(whole).includes('object') || bounded(whole), nodes)).toEqual([])
  })
  it('no union that a validator has to guess at', () => {
    const words = JSON.stringify(schema)
    for (const keyword of ['anyOf', 'oneOf', '$dynamicRef', 'unevaluatedProperties', 'unevaluatedItems']) {
      expect(words).not.toContain(`"${keyword}"`)
    }
  })
  it('no list of blocks that must differ, which takes quadratic time', () => {
    const lists = all.map(({ node, at }) => ({ at, whole: node })).filter(({ whole }) => whole.uniqueItems)
    expect(lists.length).toBeGreaterThan(0)
    expect(failing((whole) => typesOf(resolved(whole.items ?? {}, schema)).includes('string'), lists)).toEqual([])
  })
  it('no pattern that is not anchored or that a hostile text can slow down', () => {
    const patterns = new Set([...eachSchema(schema)].flatMap(({ node }) => node.pattern ?? []))
    expect(patterns.size).toBeGreaterThan(25)
    for (const pattern of patterns) {
      expect(pattern).toMatch(/^\^.*\$$/)
      expect(checkSync(pattern, 'u').status, pattern).toBe('safe')
    }
  }, 120_000)
})

function bounded({ additionalProperties, maxProperties, propertyNames }: SchemaNode): boolean {
  return (
    additionalProperties === false ||
    (maxProperties !== undefined && maxProperties <= 2000 && propertyNames !== undefined)
  )
}
