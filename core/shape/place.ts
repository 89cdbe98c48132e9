import type { Path } from '#core/glossary.ts'
import type { SchemaNode } from './schema-node.ts'

/**
 * What the bundled schema says about a place of the file: the schema there, with what it refers to merged in, so that
 * title, unit and examples of the place itself win. Empty where the schema knows no such place.
 */
export function placeAt(schema: SchemaNode, path: Path): SchemaNode {
  let place = resolved(schema, schema)
  for (const step of path) place = resolved(below(place, step), schema)
  return place
}

function below(place: SchemaNode, step: string | number): SchemaNode {
  if (typeof step === 'number') return place.items || {}
  const named = place.properties && Object.hasOwn(place.properties, step) && place.properties[step]
  return named || place.additionalProperties || {}
}

/** A schema with what it refers to merged in; its own words win. */
export function resolved(node: SchemaNode, schema: SchemaNode): SchemaNode {
  const target = node.$ref === undefined ? undefined : schema.$defs?.[node.$ref.slice('#/$defs/'.length)]
  return target ? { ...resolved(target, schema), ...node } : node
}
