import { createPrivateKey, type KeyObject, randomUUID, X509Certificate } from 'node:crypto'
import { link, mkdir, readFile, rm, stat, writeFile } from 'node:fs/promises'
import { dirname } from 'node:path'
import { certificatesFrom, pemOf } from '#core/seal/pem.ts'

/** A private key with the certificates that speak for it: its own first, then those that lead to its root. */
export interface KeyFile {
  readonly privateKey: KeyObject
  /** DER. */
  readonly certificates: readonly [Uint8Array, ...Uint8Array[]]
}

const FOR_OTHERS = 0o077

const hasCode = (error: unknown, code: string): boolean =>
  error instanceof Error && 'code' in error && error.code === code

/**
 * Keeps key and certificates in one file, which is there whole or not at all: nobody can ever read one of a pair and
 * the other of another, whoever else starts at the same time.
 */
export async function keepKeyFile(file: string, { privateKey, certificates }: KeyFile): Promise<void> {
  await mkdir(dirname(file), { recursive: true, mode: 0o700 })
  const fresh = `${file}.${randomUUID()}`
  const key = String(privateKey.export({ type: 'pkcs8', format: 'pem' }))
  await writeFile(fresh, `${certificates.map(pemOf).join('')}${key}`, { mode: 0o600, flush: true })
  try {
    await link(fresh, file)
  } catch (error) {
    // Another process was faster: its key is the one.
    if (!hasCode(error, 'EEXIST')) throw error
  } finally {
    await rm(fresh)
  }
}

async function textOf(file: string): Promise<string | undefined> {
  try {
    const { mode } = await stat(file)
    if ((mode & FOR_OTHERS) !== 0)
      throw new Error(`${file} can be read by others: take their rights away (chmod 600), and the key counts as seen.`)
    return await readFile(file, 'utf8')
  } catch (error) {
    if (hasCode(error, 'ENOENT')) return undefined
    throw error
  }
}

/**
 * Reads a file of a key and its certificates in PEM, in any order.
 *
 * @param now the first certificate must be valid then
 * @returns `undefined` where there is no such file
 */
export async function readKeyFile(file: string, now: Date): Promise<KeyFile | undefined> {
  const text = await textOf(file)
  if (text === undefined) return undefined
  const [own, ...rest] = certificatesFrom(text)
  if (!own || !text.includes('PRIVATE KEY-----'))
    throw new Error(`${file} must hold a certificate and its private key in PEM.`)
  const privateKey = createPrivateKey(text)
  if (privateKey.asymmetricKeyDetails?.namedCurve !== 'prime256v1')
    throw new Error(`${file}: the key must be on P-256.`)
  const certificate = new X509Certificate(own)
  if (!certificate.checkPrivateKey(privateKey))
    throw new Error(`${file}: the first certificate is not that of the key.`)
  const { validFrom, validTo } = certificate
  if (now < new Date(validFrom) || now > new Date(validTo))
    throw new Error(`${file}: its certificate is valid from ${validFrom} to ${validTo}. Put a new one in its place.`)
  return { privateKey, certificates: [own, ...rest] }
}
