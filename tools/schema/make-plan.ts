import type { Plan } from '#core/normalise/plan.ts'
import type { Bounds } from '#core/shape/range.ts'
import type { SchemaNode } from '#core/shape/schema-node.ts'

/**
 * What the normaliser has to do, derived from the bundled schema: only the places that need work are in it.
 * Equal parts are one constant, so that the module stays small.
 */
export function makePlan(bundled: SchemaNode): Plan {
  const plan = planOf(bundled, bundled.$defs ?? {})
  if (!plan) throw new Error('The schema names no quantity')
  return plan
}

function planOf(node: SchemaNode, definitions: Readonly<Record<string, SchemaNode>>): Plan | undefined {
  const whole = merged(node, definitions)
  const unit = whole['x-unit']
  const kind = whole['x-quantity']
  if (kind !== undefined && unit !== undefined) return { as: 'quantity', kind, unit, bounds: boundsOf(whole) }
  const reading = whole['x-reading']
  if (reading !== undefined && unit !== undefined)
    return { as: 'reading', kind: reading, unit, bounds: boundsOf(whole) }
  if (whole.items) {
    const each = planOf(whole.items, definitions)
    return each && { as: 'list', each }
  }
  if (whole.additionalProperties) {
    const each = planOf(whole.additionalProperties, definitions)
    return each && { as: 'map', each }
  }
  return whole.properties && objectPlan(whole, whole.properties, definitions)
}

function objectPlan(
  whole: SchemaNode,
  properties: NonNullable<SchemaNode['properties']>,
  definitions: Readonly<Record<string, SchemaNode>>,
): Plan | undefined {
  const keys: Record<string, Plan> = {}
  const defaults: Record<string, string | number> = {}
  for (const [key, property] of Object.entries(properties)) {
    if (property === false) continue
    const plan = planOf(property, definitions)
    if (plan) keys[key] = plan
    if (property.default !== undefined) defaults[key] = property.default
  }
  const hasDefaults = Object.keys(defaults).length > 0
  const shorthand = whole['x-shorthand']
  if (!shorthand && !hasDefaults && Object.keys(keys).length === 0) return undefined
  return { as: shorthand ?? 'object', keys, ...(hasDefaults ? { defaults } : {}) }
}

/** The schema at a place, with what it refers to; its own words win. */
function merged(node: SchemaNode, definitions: Readonly<Record<string, SchemaNode>>): SchemaNode {
  if (node.$ref === undefined) return node
  const target = definitions[node.$ref.slice('#/$defs/'.length)]
  if (!target) throw new Error(`The schema refers to ${node.$ref}, which does not exist`)
  return { ...merged(target, definitions), ...node }
}

function boundsOf({ minimum, exclusiveMinimum, maximum }: SchemaNode): Bounds {
  return {
    ...(minimum === undefined ? {} : { minimum }),
    ...(exclusiveMinimum === undefined ? {} : { exclusiveMinimum }),
    ...(maximum === undefined ? {} : { maximum }),
  }
}
