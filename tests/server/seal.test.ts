import { X509Certificate } from 'node:crypto'
import { chmodSync, mkdtempSync, readdirSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs'
import { createServer } from 'node:http'
import type { AddressInfo } from 'node:net'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { signCheckpoint } from '#core/register/checkpoint.ts'
import { certificatesFrom } from '#core/seal/pem.ts'
import { seal } from '#core/seal/seal.ts'
import { openSigner } from '#server/seal/signer.ts'
import { timestampFrom } from '#server/seal/timestamp.ts'
import { examined, unsealed } from '../core/seal/sealed.ts'
import { openAuthority } from '../judges/timestamp-authority.ts'

const NOW = new Date('2026-10-21T09:00:00Z')
const HOUSE = 'skerry.test'
let folder: string
beforeEach(() => {
  folder = join(mkdtempSync(join(tmpdir(), 'skerry-keys-')), 'keys')
})
afterEach(() => rmSync(join(folder, '..'), { recursive: true }))

const kept = (): string => join(folder, 'seal.pem')
const edited = (change: (text: string) => string): void => writeFileSync(kept(), change(readFileSync(kept(), 'utf8')))

describe('a key is not used', () => {
  it.each([
    ['that others can read', () => chmodSync(kept(), 0o644), 'can be read by others'],
    [
      'without a certificate',
      () => edited((text) => text.replaceAll(/-----BEGIN CERT[\s\S]*?-----END CERT.*-----\n/g, '')),
      'must hold a certificate and its private key',
    ],
    [
      'that is missing',
      () => edited((text) => text.replace(/-----BEGIN PRIV[\s\S]*/, '')),
      'must hold a certificate and its private key',
    ],
    [
      'of another certificate',
      () =>
        edited((text) =>
          text.replace(
            /-----BEGIN PRIV[\s\S]*/,
            /-----BEGIN PRIV[\s\S]*/.exec(readFileSync(join(folder, 'root.pem'), 'utf8'))?.[0] ?? '',
          ),
        ),
      'not that of the key',
    ],
  ])('%s', async (_, spoil, words) => {
    await openSigner(folder, HOUSE, NOW)
    spoil()
    await expect(openSigner(folder, HOUSE, NOW)).rejects.toThrow(words)
  })

  it('whose certificate ended', async () => {
    await openSigner(folder, HOUSE, NOW)
    await expect(openSigner(folder, HOUSE, new Date('2032-01-01T00:00:00Z'))).rejects.toThrow(
      'Put a new one in its place',
    )
  })
})

describe('the key of a house', () => {
  it('is made once, with a root of its own, for the owner only, whoever starts at the same time', async () => {
    const all = await Promise.all(Array.from({ length: 5 }, () => openSigner(folder, HOUSE, NOW)))
    expect(new Set(all.map(({ certificate }) => certificate)).size).toBe(1)
    expect(readdirSync(folder).toSorted()).toEqual(['root.pem', 'seal.pem'])
    for (const file of readdirSync(folder)) expect(statSync(join(folder, file)).mode & 0o777).toBe(0o600)
    expect(statSync(folder).mode & 0o777).toBe(0o700)
  })

  it('comes under its root, names the house, and lasts five years', async () => {
    const { certificates, root } = await openSigner(folder, HOUSE, NOW)
    const [own, above] = certificates.map((der) => new X509Certificate(der))
    expect(own?.subject).toBe('O=Skerry\nCN=skerry.test')
    expect(own?.validTo).toMatch(/ 2031 /)
    expect(above && own?.verify(above.publicKey)).toBe(true)
    expect(above?.ca).toBe(true)
    expect(above?.toString()).toBe(root)
  })

  it('keeps its root when the house is called otherwise', async () => {
    await openSigner(folder, HOUSE, NOW)
    rmSync(kept())
    const { certificates } = await openSigner(folder, 'other.test', NOW)
    const [own, above] = certificates.map((der) => new X509Certificate(der))
    expect(own?.issuer).toBe(above?.subject)
    expect(own?.subject).toContain('other.test')
  })

  it('seals, and signs checkpoints', async () => {
    const { sign, certificates, root } = await openSigner(folder, HOUSE, NOW)
    const pdf = await seal({ pdf: unsealed, sign, certificates, at: '2026-10-21T09:30:00Z' })
    expect((await examined(pdf, certificatesFrom(root))).checks.filter(({ holds }) => !holds)).toEqual([])
    const head = { origin: 'FEN', size: 0, root: '0'.repeat(64), at: '2026-10-21T09:30:00Z' }
    expect(await signCheckpoint(head, sign)).toContain('origin FEN\n')
  })
})

/** A time-stamp authority behind HTTP, or one that answers with a code alone. */
async function served(code: number, answer: (request: Uint8Array) => Promise<Uint8Array>) {
  const server = createServer((request, response) => {
    const parts: Buffer[] = []
    request.on('data', (part: Buffer) => parts.push(part))
    request.on('end', () => {
      void answer(Buffer.concat(parts)).then((bytes) =>
        response.writeHead(code, { 'content-type': request.headers['content-type'] ?? '' }).end(bytes),
      )
    })
  })
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve))
  const { port } = server.address() as AddressInfo
  return { url: `http://127.0.0.1:${port}/`, close: () => server.close() }
}

describe('a time-stamp authority over HTTP', () => {
  it('stamps a seal', async () => {
    const authority = openAuthority()
    const { url, close } = await served(200, authority.answer)
    const { sign, certificates, root } = await openSigner(folder, HOUSE, NOW)
    const pdf = await seal({
      pdf: unsealed,
      sign,
      certificates,
      at: '2026-10-21T09:30:00Z',
      timestamp: timestampFrom(url),
    })
    const { checks } = await examined(pdf, [...certificatesFrom(root), authority.root])
    expect(checks.find(({ id }) => id === 'time-stamp')).toMatchObject({ holds: true })
    close()
    authority.close()
  })

  it.each([
    ['fails', 503, new Uint8Array(), 'answered with 503'],
    ['answers far too much', 200, new Uint8Array(70_000), 'answered with 70000 bytes'],
  ])('that %s stops the sealing', async (_, code, bytes, words) => {
    const { url, close } = await served(code, async () => bytes)
    await expect(timestampFrom(url)(new Uint8Array(3))).rejects.toThrow(words)
    close()
  })
})
