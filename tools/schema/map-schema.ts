import type { SchemaNode } from '#core/shape/schema-node.ts'

/** Keywords whose value is one schema. */
const ONE = ['items', 'additionalProperties', 'propertyNames', 'not', 'if', 'then', 'else'] as const
/** Keywords whose value is an object of schemas. */
const MANY = ['properties', '$defs'] as const

type Draft = { -readonly [K in keyof SchemaNode]: SchemaNode[K] }

/** A copy of the schema in which every schema below it went through `change`, the innermost first. */
export function mapSchema(node: SchemaNode, change: (node: SchemaNode) => SchemaNode): SchemaNode {
  const copy: Draft = { ...node }
  for (const keyword of ONE) {
    const inner = node[keyword]
    if (inner) copy[keyword] = mapSchema(inner, change)
  }
  if (node.properties) copy.properties = mapEach(node.properties, change)
  if (node.$defs) copy.$defs = mapDefinitions(node.$defs, change)
  return change(copy)
}

function mapEach(
  properties: Readonly<Record<string, SchemaNode | false>>,
  change: (node: SchemaNode) => SchemaNode,
): Record<string, SchemaNode | false> {
  return Object.fromEntries(Object.entries(properties).map(([key, inner]) => [key, inner && mapSchema(inner, change)]))
}

function mapDefinitions(
  definitions: Readonly<Record<string, SchemaNode>>,
  change: (node: SchemaNode) => SchemaNode,
): Record<string, SchemaNode> {
  return Object.fromEntries(Object.entries(definitions).map(([key, inner]) => [key, mapSchema(inner, change)]))
}

/** Every schema in the tree, each before what is inside it, with the way to it in words. */
export function* eachSchema(node: SchemaNode, at = '#'): Generator<{ node: SchemaNode; at: string }> {
  yield { node, at }
  for (const keyword of ONE) {
    const inner = node[keyword]
    if (inner) yield* eachSchema(inner, `${at}/${keyword}`)
  }
  for (const keyword of MANY) {
    for (const [key, inner] of Object.entries(node[keyword] ?? {})) {
      if (inner) yield* eachSchema(inner, `${at}/${keyword}/${key}`)
    }
  }
}
