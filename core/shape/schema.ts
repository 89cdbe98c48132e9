import text from '#core/generated/install-schema.js'
import type { SchemaNode } from './schema-node.ts'

let parsed: SchemaNode | undefined

/** The install file's schema as one file, parsed when it is first needed: a file without errors never needs it. */
export function installSchema(): SchemaNode {
  parsed ??= JSON.parse(text()) as SchemaNode
  return parsed
}
