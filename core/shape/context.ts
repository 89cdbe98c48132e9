import type { Path } from '#core/glossary.ts'
import type { SchemaNode } from './schema-node.ts'

/** A place of the file with an error: what stands there and what the schema says about it. */
export interface Place {
  readonly path: Path
  readonly value: unknown
  readonly place: SchemaNode
  readonly schema: SchemaNode
}
