import { randomUUID } from 'node:crypto'
import { mkdtemp, rm } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import S3rver from 's3rver'
import { diskStore } from '#server/files/disk-store.ts'
import { s3Client } from '#server/files/s3-client.ts'
import { s3Store } from '#server/files/s3-store.ts'
import type { ObjectStore } from '#server/files/store.ts'

export const LIMIT = 1_000_000
const BUCKET = 'skerry'

export interface Opened {
  readonly store: ObjectStore
  /** The folder that lies behind the store. */
  readonly folder: string
  readonly close: () => Promise<void>
}

const newFolder = (): Promise<string> => mkdtemp(join(tmpdir(), 'skerry-store-'))

export async function openDisk(): Promise<Opened> {
  const folder = await newFolder()
  const store = diskStore({ root: folder, newId: randomUUID, limit: LIMIT })
  return { store, folder, close: () => rm(folder, { recursive: true }) }
}

/** A store over a local S3 server that shares no code with the client. */
export async function openS3(): Promise<Opened> {
  const folder = await newFolder()
  const server = new S3rver({
    address: '127.0.0.1',
    port: 0,
    silent: true,
    directory: folder,
    configureBuckets: [{ name: BUCKET }],
  })
  const { port } = await server.run()
  const client = s3Client({
    endpoint: `http://127.0.0.1:${port}`,
    region: 'local',
    accessKeyId: 'S3RVER',
    secretAccessKey: 'S3RVER',
    pathStyle: true,
  })
  const close = async (): Promise<void> => {
    client.destroy()
    await server.close()
    await rm(folder, { recursive: true })
  }
  return { store: s3Store({ client, bucket: BUCKET, limit: LIMIT }), folder, close }
}
