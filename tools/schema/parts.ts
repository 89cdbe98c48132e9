import { readdir, readFile } from 'node:fs/promises'
import { fileURLToPath } from 'node:url'
import type { SchemaNode } from '#core/shape/schema-node.ts'

/** Folder of the project. */
export const PROJECT = fileURLToPath(new URL('../../', import.meta.url))
export const INSTALL_ID = 'urn:skerry:install:1'

/** The install file's schema as it is written: the top, and its parts by their name (`board`, `cable`, …). */
export interface SchemaParts {
  readonly top: SchemaNode
  readonly parts: ReadonlyMap<string, SchemaNode>
}

/** Reads the schema and its parts from `schemas/`. The parts come in the order of their names. */
export async function readParts(): Promise<SchemaParts> {
  const folder = `${PROJECT}schemas/parts/`
  const files = (await readdir(folder)).filter((name) => name.endsWith('.schema.json')).sort()
  const parts = new Map<string, SchemaNode>()
  for (const file of files) {
    const part = await readSchema(`${folder}${file}`)
    const name = file.slice(0, -'.schema.json'.length)
    if (part.$id !== `${INSTALL_ID}:${name}`) throw new Error(`${file}: $id must be ${INSTALL_ID}:${name}`)
    parts.set(name, part)
  }
  return { top: await readSchema(`${PROJECT}schemas/install.schema.json`), parts }
}

async function readSchema(path: string): Promise<SchemaNode> {
  return JSON.parse(await readFile(path, 'utf8')) as SchemaNode
}
