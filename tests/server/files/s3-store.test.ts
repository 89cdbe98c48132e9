import { createServer, type RequestListener } from 'node:http'
import type { AddressInfo } from 'node:net'
import { afterEach, describe, expect, it } from 'vitest'
import { s3Client } from '#server/files/s3-client.ts'
import { s3Store } from '#server/files/s3-store.ts'
import type { ObjectStore } from '#server/files/store.ts'
import { collected, keyFor, OURS } from './keys.ts'

const open: (() => Promise<void>)[] = []
afterEach(async () => {
  for (const close of open.splice(0)) await close()
})

/** A store over a service that answers as it is told. */
async function storeOver(answer: RequestListener): Promise<ObjectStore> {
  const server = createServer(answer)
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve))
  open.push(
    () =>
      new Promise((resolve) => {
        server.closeAllConnections()
        server.close(() => resolve())
      }),
  )
  const { port } = server.address() as AddressInfo
  return storeAt(`http://127.0.0.1:${port}`)
}

function storeAt(endpoint: string): ObjectStore {
  const settings = { endpoint, region: 'local', accessKeyId: 'a', secretAccessKey: 'b', pathStyle: true }
  const client = s3Client(settings, { connection: 300, idle: 300, request: 1_000 })
  return s3Store({ client, bucket: 'skerry', limit: 1_000 })
}

const BYTES = Buffer.from('issued')
const KEY = keyFor(BYTES, 'document')

const everyCall = (store: ObjectStore): Record<string, () => Promise<unknown>> => ({
  put: () => store.put(KEY, BYTES),
  get: () => store.get(KEY),
  head: () => store.head(KEY),
  delete: () => store.delete(KEY),
  list: () => collected(store.list({ organisation: OURS, kind: 'document' })),
})

async function expectFailures(store: ObjectStore): Promise<void> {
  const start = performance.now()
  for (const [name, call] of Object.entries(everyCall(store))) await expect(call(), name).rejects.toThrow()
  expect(performance.now() - start).toBeLessThan(15_000)
}

describe('an object storage that fails', () => {
  it('is told as a failure, never as an object that is not there: nobody listens', async () => {
    await expectFailures(storeAt('http://127.0.0.1:9'))
  })

  it('is told as a failure: it answers nothing', async () => {
    await expectFailures(await storeOver(() => undefined))
  })

  it('is told as a failure: it is broken', async () => {
    await expectFailures(await storeOver((_, response) => response.writeHead(500).end()))
  })

  it('is told as a failure: it refuses us', async () => {
    await expectFailures(await storeOver((_, response) => response.writeHead(403).end()))
  })

  it('is told as a failure: there is no such bucket', async () => {
    const words = '<Error><Code>NoSuchBucket</Code><Message>no</Message></Error>'
    const store = await storeOver((_, response) =>
      response.writeHead(404, { 'content-type': 'application/xml' }).end(words),
    )
    await expect(store.get(KEY)).rejects.toThrow()
    await expect(store.put(KEY, BYTES)).rejects.toThrow()
  })

  it('does not hand out an object that stops coming in the middle', async () => {
    const store = await storeOver((_, response) => {
      response.writeHead(200, { 'content-length': '6', 'last-modified': 'Mon, 04 May 2026 10:15:30 GMT' })
      response.write('iss')
    })
    const object = await store.get(KEY)
    const arrived: Buffer[] = []
    await expect(async () => {
      for await (const chunk of object?.stream ?? []) arrived.push(chunk)
    }).rejects.toThrow()
    expect(Buffer.concat(arrived).length).toBeLessThan(3)
  })
})

describe('what is sent to an object storage', () => {
  it('carries its length, its hash, and the type of its kind', async () => {
    const seen: Record<string, unknown>[] = []
    const store = await storeOver((request, response) => {
      const chunks: Buffer[] = []
      request.on('data', (chunk: Buffer) => chunks.push(chunk))
      request.on('end', () => {
        seen.push({
          method: request.method,
          url: request.url,
          body: Buffer.concat(chunks).toString(),
          ...request.headers,
        })
        response.writeHead(200).end()
      })
    })
    await store.put(KEY, BYTES)
    expect(seen).toHaveLength(1)
    expect(seen[0]).toMatchObject({
      method: 'PUT',
      body: 'issued',
      'content-length': '6',
      'content-type': 'application/pdf',
      'x-amz-checksum-sha256': Buffer.from(KEY.split('/')[2] ?? '', 'hex').toString('base64'),
    })
    expect(seen[0]?.['url']).toMatch(new RegExp(`^/skerry/${KEY}(\\?|$)`))
  })
})
