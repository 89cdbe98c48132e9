import { createPrivateKey, randomBytes, randomUUID, sign as signWith } from 'node:crypto'
import { link, mkdir, readFile, rm, stat, writeFile } from 'node:fs/promises'
import { join } from 'node:path'
import type { Sign } from '#core/register/signing.ts'
import { selfSigned } from './self-signed.ts'

/** Who signs checkpoints and seals documents: the key stays inside. */
export interface Signer {
  readonly sign: Sign
  /** PEM of the certificate, then of those that lead to its root. */
  readonly certificate: string
  /** PKCS #8 in DER, for what seals documents. */
  readonly key: Uint8Array
}

/** One file holds key and certificates: nobody can ever read one of a pair and the other of another. */
const FILE = 'seal.pem'
const CERTIFICATES = /-----BEGIN CERTIFICATE-----[\s\S]*?-----END CERTIFICATE-----\n?/g
const KEY = /-----BEGIN (?:EC )?PRIVATE KEY-----[\s\S]*?-----END (?:EC )?PRIVATE KEY-----/
const FORM = 'ieee-p1363'

async function made(folder: string, house: string, now: Date): Promise<void> {
  const { key, certificate } = await selfSigned(house, now, randomBytes(16))
  await mkdir(folder, { recursive: true, mode: 0o700 })
  const fresh = join(folder, `.${randomUUID()}`)
  await writeFile(fresh, `${certificate}${key}`, { mode: 0o600, flush: true })
  try {
    await link(fresh, join(folder, FILE))
  } catch (error) {
    // Another process was faster: its key is the one.
    if (!(error instanceof Error && 'code' in error && error.code === 'EEXIST')) throw error
  } finally {
    await rm(fresh)
  }
}

async function found(file: string): Promise<string | undefined> {
  try {
    const { mode } = await stat(file)
    if ((mode & 0o077) !== 0)
      throw new Error(`${file} can be read by others: take their rights away (chmod 600), and the key counts as seen.`)
    return await readFile(file, 'utf8')
  } catch (error) {
    if (error instanceof Error && 'code' in error && error.code === 'ENOENT') return undefined
    throw error
  }
}

/**
 * Opens the key that signs for this server; where there is none, one is made with a certificate of its own.
 *
 * @param folder holds `seal.pem`: certificates and the private key (P-256) in PEM
 * @param house whose certificate it is, if it has to be made
 */
export async function openSigner(folder: string, house: string, now: Date): Promise<Signer> {
  const file = join(folder, FILE)
  if ((await found(file)) === undefined) await made(folder, house, now)
  const text = (await found(file)) ?? ''
  const [pem] = KEY.exec(text) ?? []
  const certificate = (text.match(CERTIFICATES) ?? []).join('')
  if (pem === undefined || certificate === '')
    throw new Error(`${file} must hold a certificate and its private key in PEM.`)
  const key = createPrivateKey(pem)
  if (key.asymmetricKeyDetails?.namedCurve !== 'prime256v1') throw new Error(`${file}: the key must be on P-256.`)
  return {
    sign: async (data) => signWith('sha256', data, { key, dsaEncoding: FORM }),
    certificate,
    key: key.export({ format: 'der', type: 'pkcs8' }),
  }
}
