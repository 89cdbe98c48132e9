import { type Fault, faultAt } from '#core/errors.ts'
import type { Problem } from '#core/glossary.ts'
import { type Parsed, parseQuantity, parseReading } from '#core/read/quantity.ts'
import { parseCable, parseDevice } from '#core/read/shorthand.ts'
import { isObject } from '#core/shape/locate.ts'
import { rangeFault } from '#core/shape/range.ts'
import type { ObjectPlan, Plan, QuantityPlan, ReadingPlan, ShorthandPlan } from './plan.ts'
import { remembered } from './remembered.ts'

/** Where the walk is, and what it found. The path grows and shrinks with the walk. */
export interface Walk {
  readonly path: (string | number)[]
  readonly problems: Problem[]
}

/**
 * Follows the plan through a value and gives the normalised one.
 *
 * @param value as the file has it
 * @param plan what is to be done at this place
 * @param at where this is; problems are added to it
 * @returns the new value; undefined where it cannot be used, a problem then says why
 */
export function walk(value: unknown, plan: Plan, at: Walk): unknown {
  switch (plan.as) {
    case 'quantity':
      return quantity(value, plan, at)
    case 'reading':
      return isObject(value) ? value : reading(value, plan, at)
    case 'device':
      return shorthand(
        remembered(plan, value, () => parseDevice(value)),
        plan,
        at,
      )
    case 'cable':
      return shorthand(
        remembered(plan, value, () => parseCable(value)),
        plan,
        at,
      )
    case 'object':
      return isObject(value) ? block(value, plan, at) : value
    case 'map':
      return isObject(value) ? each(value, plan.each, at) : value
    case 'list':
      return Array.isArray(value) ? value.map((item, index) => step(item, index, plan.each, at)) : value
  }
}

function quantity(value: unknown, plan: QuantityPlan, at: Walk): number | undefined {
  const read = remembered(plan, value, () => parseQuantity(value, plan.kind, plan.unit))
  if (!read.ok) return refuse(read, at)
  const fault = rangeFault(read.value, plan.bounds, plan.unit)
  return fault ? refuse(fault, at) : read.value
}

function reading(value: unknown, plan: ReadingPlan, at: Walk): unknown {
  const read = remembered(plan, value, () => parseReading(value, plan.kind, plan.unit))
  if (!read.ok) return refuse(read, at)
  const fault = read.value.noTrip ? undefined : rangeFault(read.value.value, plan.bounds, plan.unit)
  return fault ? refuse(fault, at) : read.value
}

/** A device or cable that was read, its quantities held to the range of their places. */
function shorthand(read: Parsed<object>, { keys }: ShorthandPlan, at: Walk): unknown {
  if (!read.ok) return refuse(read, at)
  for (const [key, value] of Object.entries(read.value)) {
    const plan = Object.hasOwn(keys, key) ? keys[key] : undefined
    if (plan) step(value, key, plan, at)
  }
  return read.value
}

function block(value: Readonly<Record<string, unknown>>, { keys, defaults }: ObjectPlan, at: Walk): unknown {
  const result: Record<string, unknown> = { ...defaults }
  for (const key of Object.keys(value)) {
    const plan = Object.hasOwn(keys, key) ? keys[key] : undefined
    const now = plan ? step(value[key], key, plan, at) : value[key]
    if (now !== undefined) result[key] = now
  }
  return result
}

function each(value: Readonly<Record<string, unknown>>, plan: Plan, at: Walk): unknown {
  const result: Record<string, unknown> = {}
  for (const key of Object.keys(value)) result[key] = step(value[key], key, plan, at)
  return result
}

function step(value: unknown, key: string | number, plan: Plan, at: Walk): unknown {
  at.path.push(key)
  const result = walk(value, plan, at)
  at.path.pop()
  return result
}

function refuse(fault: Fault, at: Walk): undefined {
  at.problems.push(faultAt(fault, [...at.path]))
  return undefined
}
