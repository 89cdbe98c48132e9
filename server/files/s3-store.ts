import { pipeline, Readable } from 'node:stream'
import {
  DeleteObjectCommand,
  GetObjectCommand,
  HeadObjectCommand,
  PutObjectCommand,
  paginateListObjectsV2,
  type S3Client,
  S3ServiceException,
} from '@aws-sdk/client-s3'
import { foldersWithin } from './folders-within.ts'
import { takeIn } from './intake.ts'
import { KINDS, type Kind, type ObjectKey, objectKey, partsOf, readKey } from './object-key.ts'
import type { ObjectFacts, ObjectStore } from './store.ts'
import { verified } from './verified.ts'

export interface S3StoreOptions {
  readonly client: S3Client
  readonly bucket: string
  /** Largest object in bytes; one being stored is held in memory until its hash is known. */
  readonly limit: number
}

/** Objects in a bucket. An object shows only when the service has the whole of it, so one request stores it. */
export function s3Store({ client, bucket, limit }: S3StoreOptions): ObjectStore {
  const at = (key: ObjectKey) => ({ Bucket: bucket, Key: key })
  const pages = (prefix: string) => paginateListObjectsV2({ client }, { Bucket: bucket, Prefix: prefix })

  return {
    async put(key, body) {
      const { kind, sha256 } = partsOf(key)
      const chunks: Uint8Array[] = []
      const stored = await takeIn(key, body, limit, (chunk) => {
        chunks.push(chunk)
      })
      if (!stored.ok) return stored
      await client.send(
        new PutObjectCommand({
          ...at(key),
          Body: Buffer.concat(chunks),
          ContentLength: stored.size,
          ContentType: KINDS[kind],
          // The service compares it with what arrived.
          ChecksumSHA256: Buffer.from(sha256, 'hex').toString('base64'),
        }),
      )
      return stored
    },

    async get(key) {
      const { kind } = partsOf(key)
      const found = await unlessMissing(client.send(new GetObjectCommand(at(key))))
      if (!found) return undefined
      if (!(found.Body instanceof Readable)) throw new Error('The object storage answered without a body.')
      // The caller hears of errors from the stream that it is given.
      const stream = pipeline(found.Body, verified(key), () => undefined)
      return { ...factsFrom(key, kind, found.ContentLength, found.LastModified), stream }
    },

    async head(key) {
      const { kind } = partsOf(key)
      const found = await unlessMissing(client.send(new HeadObjectCommand(at(key))))
      return found && factsFrom(key, kind, found.ContentLength, found.LastModified)
    },

    async delete(key) {
      partsOf(key)
      await client.send(new DeleteObjectCommand(at(key)))
    },

    // One request stores an object, so none is ever left half written.
    sweep: () => Promise.resolve(0),

    async *list(within) {
      // Folder by folder: not all services sort hyphen and slash alike.
      for (const folder of foldersWithin(within)) {
        for await (const { Contents = [] } of pages(`${folder}/`)) {
          for (const { Key = '', Size, LastModified } of Contents) {
            const parts = readKey(Key)
            if (parts) yield factsFrom(objectKey(parts), parts.kind, Size, LastModified)
          }
        }
      }
    },
  }
}

function factsFrom(key: ObjectKey, kind: Kind, size: number | undefined, written: Date | undefined): ObjectFacts {
  if (size === undefined || written === undefined)
    throw new Error('The object storage answered without size or time of an object.')
  return { key, size, type: KINDS[kind], written }
}

async function unlessMissing<Result>(work: Promise<Result>): Promise<Result | undefined> {
  try {
    return await work
  } catch (error) {
    if (error instanceof S3ServiceException && error.$metadata.httpStatusCode === 404) {
      if (error.name === 'NoSuchBucket') throw error
      return undefined
    }
    throw error
  }
}
