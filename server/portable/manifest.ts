import { Ajv2020, type JSONSchemaType } from 'ajv/dist/2020.js'
import type { Tx } from '#server/db.ts'
import type { Kind } from '#server/files/object-key.ts'
import type { Digest } from './rows.ts'

export const FORMAT = 'skerry-organisation/1'

/** What an archive holds: read first, and held against all the rest. */
export interface Manifest {
  readonly format: typeof FORMAT
  readonly organisation: string
  readonly mark: string
  readonly exported_at: string
  /** Migrations of the database that it comes from: it goes into one of the same schema only. */
  readonly migrations: readonly string[]
  readonly tables: Readonly<Record<string, Digest>>
  readonly objects: readonly { readonly kind: string; readonly sha256: string; readonly size: number }[]
}

const HASH = { type: 'string', pattern: '^[0-9a-f]{64}$' } as const

const SCHEMA: JSONSchemaType<Manifest> = {
  type: 'object',
  properties: {
    format: { type: 'string', const: FORMAT },
    organisation: { type: 'string', pattern: '^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$' },
    mark: { type: 'string' },
    exported_at: { type: 'string' },
    migrations: { type: 'array', items: { type: 'string' } },
    tables: {
      type: 'object',
      required: [],
      additionalProperties: {
        type: 'object',
        properties: { rows: { type: 'integer' }, sha256: HASH },
        required: ['rows', 'sha256'],
      },
    },
    objects: {
      type: 'array',
      items: {
        type: 'object',
        properties: { kind: { type: 'string' }, sha256: HASH, size: { type: 'integer' } },
        required: ['kind', 'sha256', 'size'],
      },
    },
  },
  required: ['format', 'organisation', 'mark', 'exported_at', 'migrations', 'tables', 'objects'],
  additionalProperties: false,
}

export const isManifest = new Ajv2020().compile(SCHEMA)

export const tablePath = (table: string): string => `tables/${table}.jsonl`
export const objectPath = ({ kind, sha256 }: { readonly kind: Kind | string; readonly sha256: string }): string =>
  `objects/${kind}/${sha256}`

export async function migrationsOf(tx: Tx): Promise<string[]> {
  const rows = await tx('knex_migrations').orderBy('name').select<{ name: string }[]>('name')
  return rows.map(({ name }) => name)
}
