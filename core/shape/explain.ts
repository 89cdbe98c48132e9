import { type Fault, faultAt } from '#core/errors.ts'
import type { ShapeError } from '#core/generated/install-validator.js'
import type { Path, Problem } from '#core/glossary.ts'
import { problemList } from '#core/read/problem-list.ts'
import { nearest } from '#core/texts/nearest.ts'
import type { Place } from './context.ts'
import { isObject, locate, valueAt } from './locate.ts'
import { placeAt } from './place.ts'
import type { SchemaNode } from './schema-node.ts'
import { faultOf, RANKS } from './table.ts'
import { missingKeys } from './words-keys.ts'

/** All that the validator said about one place. */
interface Group {
  readonly path: Path
  readonly place: Place
  readonly errors: [ShapeError, ...ShapeError[]]
}

/**
 * Turns what the validator said into the trade's words: one problem a place, in the order of the errors, at most
 * as many as are shown of one file. Where a mistyped key explains a missing one, only the mistyped one is told.
 *
 * @param errors of the validator, each with a JSON Pointer into `tree`
 * @param tree the file's values
 * @param schema the bundled schema, for titles, units, examples and allowed values
 */
export function explain(errors: readonly ShapeError[], tree: unknown, schema: SchemaNode): Problem[] {
  const groups = new Map<string, Group>()
  for (const error of errors) {
    // A failed branch comes with what failed in it.
    if (error.keyword !== 'if') gather(groups, error, tree, schema)
  }
  const problems = problemList()
  for (const group of groups.values()) {
    const fault = faultOfGroup(group)
    if (fault) problems.add(() => faultAt(fault, group.path))
  }
  return problems.all()
}

const TEXT_RULES: ReadonlySet<string> = new Set(['pattern', 'maxLength', 'not'])

function gather(groups: Map<string, Group>, error: ShapeError, tree: unknown, schema: SchemaNode): void {
  const at = locate(error.instancePath, tree)
  const value = valueAt(tree, at)
  // A rule for text that a block breaks is about one of its keys, and comes once more as `propertyNames`.
  if (TEXT_RULES.has(error.keyword) && isObject(value)) return
  const key = keyOf(error)
  const path = key === undefined ? at : [...at, key]
  const name = JSON.stringify(path)
  const known = groups.get(name)
  if (known) known.errors.push(error)
  else groups.set(name, { path, place: { path: at, value, place: placeAt(schema, at), schema }, errors: [error] })
}

/** The key that the error is about, where it is about a key. */
function keyOf({ keyword, params }: ShapeError): string | undefined {
  if (keyword === 'additionalProperties') return String(params.additionalProperty)
  if (keyword === 'propertyNames') return String(params.propertyName)
  return undefined
}

/** The most telling error of a place. */
function faultOfGroup({ place, errors }: Group): Fault | undefined {
  const worst = errors.reduce((a, b) => (rank(b) < rank(a) ? b : a))
  const { keyword } = worst
  if (keyword !== 'required' && keyword !== 'if') return faultOf(keyword, worst, place)
  const missing = errors.map((error) => String(error.params.missingProperty)).filter((key) => !mistyped(place, key))
  return missing.length === 0 ? undefined : missingKeys(place, missing)
}

function rank({ keyword }: ShapeError): number {
  return RANKS.indexOf(keyword)
}

/** Whether an unknown key of the same block is most likely meant to be this one. */
function mistyped({ place, value }: Place, key: string): boolean {
  const known = Object.keys({ ...place.properties })
  const written = Object.keys(value as object).filter((name) => !known.includes(name))
  return written.some((name) => nearest(name, known) === key)
}
