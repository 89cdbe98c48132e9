import type { SchemaNode } from '#core/shape/schema-node.ts'
import { mapSchema } from './map-schema.ts'
import { INSTALL_ID, type SchemaParts } from './parts.ts'

/**
 * One file out of the schema's parts: each part, and each definition inside one, becomes an entry of `$defs`
 * (`board`, `words-id`), and every reference points there. What nothing refers to is left out.
 */
export function bundle({ top, parts }: SchemaParts): SchemaNode {
  const definitions = new Map<string, SchemaNode>()
  for (const [name, part] of parts) {
    const { $defs, $schema: _schema, $id: _id, ...body } = part
    definitions.set(
      name,
      mapSchema(body, (node) => pointed(node, name)),
    )
    for (const [inner, definition] of Object.entries($defs ?? {})) {
      definitions.set(
        `${name}-${inner}`,
        mapSchema(definition, (node) => pointed(node, name)),
      )
    }
  }
  const body = mapSchema(top, (node) => pointed(node, ''))
  return { ...body, $defs: reachable(body, definitions) }
}

/** The node with its reference turned to the bundle's `$defs`. */
function pointed(node: SchemaNode, part: string): SchemaNode {
  if (node.$ref === undefined) return node
  return { ...node, $ref: `#/$defs/${definitionName(node.$ref, part)}` }
}

function definitionName(reference: string, part: string): string {
  const [document = '', pointer = ''] = reference.split('#')
  const name = document === '' ? part : document.slice(INSTALL_ID.length + 1)
  return pointer === '' ? name : `${name}-${pointer.slice('/$defs/'.length)}`
}

/** The definitions that the schema needs, in the order of their names. */
function reachable(body: SchemaNode, definitions: ReadonlyMap<string, SchemaNode>): Record<string, SchemaNode> {
  const found = new Map<string, SchemaNode>()
  const visit = (node: SchemaNode): SchemaNode => {
    const name = node.$ref?.slice('#/$defs/'.length)
    if (name === undefined || found.has(name)) return node
    const definition = definitions.get(name)
    if (!definition) throw new Error(`The schema refers to ${node.$ref}, which does not exist`)
    found.set(name, definition)
    mapSchema(definition, visit)
    return node
  }
  mapSchema(body, visit)
  return Object.fromEntries([...found].sort(([a], [b]) => (a < b ? -1 : 1)))
}
