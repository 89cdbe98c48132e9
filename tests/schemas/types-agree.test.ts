import { fileURLToPath } from 'node:url'
import ts from 'typescript'
import { describe, expect, it } from 'vitest'
import { resolved } from '#core/shape/place.ts'
import { installSchema } from '#core/shape/schema.ts'
import type { SchemaNode } from '#core/shape/schema-node.ts'

interface Rewritten {
  readonly gone: readonly string[]
  readonly always: readonly string[]
}

/** What shorthand turns into: keys of the file that go, keys that always come. */
const PLAIN: Rewritten = { gone: [], always: [] }
const SHORTHAND: Readonly<Record<'device' | 'cable', Rewritten>> = {
  device: { gone: ['breaker', 'fuse'], always: ['kind', 'curve', 'rated'] },
  cable: { gone: ['type'], always: ['line', 'cores', 'material', 'conductor_class'] },
}

const schema = installSchema()
const program = ts.createProgram([fileURLToPath(new URL('../../core/install.ts', import.meta.url))], {
  strict: true,
  exactOptionalPropertyTypes: true,
  target: ts.ScriptTarget.ES2023,
  module: ts.ModuleKind.NodeNext,
  moduleResolution: ts.ModuleResolutionKind.NodeNext,
  allowImportingTsExtensions: true,
  noEmit: true,
})
const checker = program.getTypeChecker()

function installType(): ts.Type {
  const source = program.getSourceFiles().find(({ fileName }) => fileName.endsWith('/core/install.ts'))
  const found = source?.statements.find((node) => ts.isInterfaceDeclaration(node) && node.name.text === 'Install')
  if (!found) throw new Error('core/install.ts declares no Install')
  return checker.getTypeAtLocation(found)
}

let compared = 0

/** Every difference between a place of the schema and its type, in words. */
function differences(type: ts.Type, node: SchemaNode, at: string): string[] {
  compared++
  const whole = resolved(node, schema)
  if (whole['x-quantity']) return type.flags & ts.TypeFlags.Number ? [] : [`${at}: a quantity, but ${nameOf(type)}`]
  if (whole['x-reading']) return nameOf(type) === 'Measured' ? [] : [`${at}: a reading, but ${nameOf(type)}`]
  if (whole.enum ?? whole.const) return differentValues(type, [whole.enum ?? whole.const ?? []].flat(), at)
  if (whole.items) return differences(elementOf(type), whole.items, `${at}[]`)
  if (whole.additionalProperties) return differences(mappedOf(type), whole.additionalProperties, `${at}.*`)
  if (whole.properties) return differentKeys(type, whole, at)
  const wanted =
    whole.type === 'boolean'
      ? ts.TypeFlags.Boolean
      : whole.type === 'string'
        ? ts.TypeFlags.String
        : ts.TypeFlags.Number
  return type.flags & wanted ? [] : [`${at}: ${String(whole.type)}, but ${nameOf(type)}`]
}

function nameOf(type: ts.Type): string {
  return type.aliasSymbol?.name ?? checker.typeToString(type)
}

function differentValues(type: ts.Type, values: readonly (string | number)[], at: string): string[] {
  const members = type.isUnion() ? type.types : [type]
  const typed = members.flatMap((member) => (member.isLiteral() ? [String(member.value)] : [nameOf(member)])).sort()
  const allowed = values.map(String).sort()
  return typed.join('|') === allowed.join('|') ? [] : [`${at}: ${allowed.join('|')}, but ${typed.join('|')}`]
}

function elementOf(type: ts.Type): ts.Type {
  return checker.getIndexTypeOfType(type, ts.IndexKind.Number) ?? checker.getNeverType()
}

function mappedOf(type: ts.Type): ts.Type {
  return checker.getIndexTypeOfType(type, ts.IndexKind.String) ?? checker.getNeverType()
}

interface Key {
  readonly types: ts.Type[]
  optional: boolean
}

/** Keys of a type; of a union, the keys of all its members, those of some only being optional. */
function keysOf(type: ts.Type): Map<string, Key> {
  const members = type.isUnion() ? type.types : [type]
  const keys = new Map<string, Key>()
  for (const member of members) {
    for (const property of member.getProperties()) {
      const key = keys.get(property.name) ?? { types: [], optional: false }
      key.types.push(checker.getNonNullableType(checker.getTypeOfSymbol(property)))
      key.optional ||= (property.flags & ts.SymbolFlags.Optional) !== 0
      keys.set(property.name, key)
    }
  }
  for (const key of keys.values()) key.optional ||= key.types.length < members.length
  return keys
}

function differentKeys(type: ts.Type, whole: SchemaNode, at: string): string[] {
  const shorthand = whole['x-shorthand']
  const { gone, always } = shorthand ? SHORTHAND[shorthand] : PLAIN
  const required = [...always, ...(whole.required ?? [])]
  const inSchema = new Map(Object.entries(whole.properties ?? {}).filter(([key]) => !gone.includes(key)))
  const inType = keysOf(type)
  const found: string[] = []
  for (const [key, node] of inSchema) {
    const typed = inType.get(key)
    if (!typed) found.push(`${at}.${key}: only in the schema`)
    else if (typed.optional === required.includes(key)) found.push(`${at}.${key}: needed in one, optional in the other`)
    else if (node) found.push(...typed.types.flatMap((one) => differences(one, node, `${at}.${key}`)))
  }
  for (const key of inType.keys()) {
    if (!inSchema.has(key) && !always.includes(key)) found.push(`${at}.${key}: only in the type`)
  }
  return found
}

describe('the schema and the type of a normalised file', () => {
  it('know the same keys, need the same ones, and agree on what each holds', () => {
    expect(differences(installType(), schema, 'install')).toEqual([])
    expect(compared).toBeGreaterThan(250)
  })

  it('and a key, a unit of value or a need that one of them lacks would be seen', () => {
    const { skerry, report, ...properties } = schema.properties ?? {}
    const other: SchemaNode = {
      ...schema,
      properties: { ...properties, skerry: { type: 'string' }, colour: { type: 'string' }, report: report || {} },
      required: ['skerry', 'report', 'site', 'supply'],
    }
    expect(skerry).toBeDefined()
    expect(differences(installType(), other, 'install')).toEqual([
      'install.changeover: needed in one, optional in the other',
      'install.skerry: string, but 1',
      'install.colour: only in the schema',
    ])
  })
})
