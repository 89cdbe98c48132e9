import type { SchemaNode } from '#core/shape/schema-node.ts'
import { mapSchema } from './map-schema.ts'

/** A schema in draft-07, with the annotations that editors show. */
export interface Draft07Node extends Omit<SchemaNode, '$defs'> {
  readonly definitions?: Readonly<Record<string, SchemaNode>>
  readonly allOf?: readonly SchemaNode[]
  readonly markdownDescription?: string
  readonly enumDescriptions?: readonly string[]
  readonly patternErrorMessage?: string
}

/**
 * The draft-07 twin of the bundled schema, for editors. Draft-07 ignores what stands beside `$ref`: a reference to a
 * plain value is replaced by what it refers to, one to an object moves into `allOf`. Nothing is judged differently.
 */
export function makeDraft07(bundled: SchemaNode): Draft07Node {
  const definitions = bundled.$defs ?? {}
  const twin = mapSchema({ ...bundled, $id: `${bundled.$id}:draft-07` }, (node) =>
    editorWords(unfold(node, definitions)),
  )
  const { $defs: _all, $schema: _schema, ...body } = twin
  const kept = Object.entries(twin.$defs ?? {}).filter(([name]) => !isLeaf(definitions[name]))
  return { $schema: 'http://json-schema.org/draft-07/schema#', ...body, definitions: Object.fromEntries(kept) }
}

function unfold(node: SchemaNode, definitions: Readonly<Record<string, SchemaNode>>): SchemaNode {
  if (node.$ref === undefined) return node
  const { $ref, ...beside } = node
  const name = $ref.slice('#/$defs/'.length)
  const target = definitions[name]
  if (target && isLeaf(target)) return { ...target, ...beside }
  return { ...beside, allOf: [{ $ref: `#/definitions/${name}` }] } as SchemaNode
}

/** Whether a schema holds no reference and no keys of its own, but for a reading's `not_tested`. */
function isLeaf(node: SchemaNode | undefined): boolean {
  if (!node) return false
  return node['x-reading'] !== undefined || (!node.properties && !node.items && !node.additionalProperties)
}

function editorWords(node: SchemaNode): Draft07Node {
  const { 'x-meanings': meanings, description, ...rest } = node
  const unit = node['x-unit']
  const inUnit = unit ? `\n\nUnit: \`${unit}\`` : ''
  const example = node.examples?.find((one) => typeof one === 'string')
  return {
    ...rest,
    ...(description === undefined ? {} : { description, markdownDescription: description + inUnit }),
    ...(node.pattern && example !== undefined ? { patternErrorMessage: `Write it like ${example}.` } : {}),
    ...(meanings === undefined ? {} : { enumDescriptions: meanings }),
  }
}
