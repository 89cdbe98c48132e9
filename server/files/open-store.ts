import { randomUUID } from 'node:crypto'
import { resolve } from 'node:path'
import type { Env } from '#server/env.ts'
import { diskStore } from './disk-store.ts'
import { s3Client } from './s3-client.ts'
import { s3Store } from './s3-store.ts'
import type { ObjectStore } from './store.ts'

/** Largest object: an issued report with many photos stays far below. */
const LIMIT = 128 * 1024 * 1024

/** The object storage that the configuration names: a bucket, or a folder of the local disk. */
export function openStore(env: Env): ObjectStore {
  if (env.S3_BUCKET === '') return diskStore({ root: resolve(env.DATA_DIR), newId: randomUUID, limit: LIMIT })
  const client = s3Client({
    region: env.S3_REGION,
    accessKeyId: env.S3_ACCESS_KEY_ID,
    secretAccessKey: env.S3_SECRET_ACCESS_KEY,
    pathStyle: env.S3_ENDPOINT !== '',
    ...(env.S3_ENDPOINT === '' ? {} : { endpoint: env.S3_ENDPOINT }),
  })
  return s3Store({ client, bucket: env.S3_BUCKET, limit: LIMIT })
}
