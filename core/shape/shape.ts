import validate from '#core/generated/install-validator.js'
import type { Problem } from '#core/glossary.ts'
import { explain } from './explain.ts'
import { installSchema } from './schema.ts'
import type { SchemaNode } from './schema-node.ts'

/**
 * Judges the file as it is written against the install file's schema.
 *
 * @param tree the file's values: plain objects, lists, text, numbers, true, false, null
 * @param schema gives the bundled schema; asked only where there is something to explain
 * @returns nothing where the shape is right; otherwise one problem a place, at most 200 and then how many more
 */
export function checkShape(tree: unknown, schema: () => SchemaNode = installSchema): Problem[] {
  if (validate(tree)) return []
  return explain(validate.errors, tree, schema())
}

/**
 * Whether the shape is right, for whoever does not ask what is wrong.
 *
 * @param tree the file's values
 */
export function hasShape(tree: unknown): boolean {
  return validate(tree)
}
