import { createPublicKey, generateKeyPairSync, sign as signWith } from 'node:crypto'
import { join } from 'node:path'
import type { Sign } from '#core/register/signing.ts'
import { readCertificate } from '#core/seal/certificate.ts'
import { pemOf } from '#core/seal/pem.ts'
import { type KeyFile, keepKeyFile, readKeyFile } from './key-file.ts'
import { type Issuer, makeCertificate, nameOf } from './make-certificate.ts'

/** Who signs checkpoints and seals documents: the key stays inside. */
export interface Signer {
  readonly sign: Sign
  /** PEM of the certificate, then of those that lead to its root. */
  readonly certificate: string
  /** The same as DER: what `seal` takes. */
  readonly certificates: readonly Uint8Array[]
  /** PEM of the last of them: what others name as trusted when they verify. */
  readonly root: string
}

/** Key and certificates that sign; one's own may be put in its place. */
const SEAL = 'seal.pem'
/** The authority of this installation, which issued them; only there where it was made here. */
const ROOT = 'root.pem'
const YEAR = 365.25 * 24 * 3600 * 1000
const YEARS = { authority: 20, seal: 5 } as const

const lasting = (role: keyof typeof YEARS, now: Date) => ({
  role,
  from: now,
  until: new Date(now.getTime() + YEARS[role] * YEAR),
})

function freshHolder(name: string): Issuer {
  return { name: nameOf('Skerry', name), ...generateKeyPairSync('ec', { namedCurve: 'P-256' }) }
}

/** Reads a key, or makes it first. */
async function opened(file: string, now: Date, make: () => Promise<KeyFile>): Promise<KeyFile> {
  const found = await readKeyFile(file, now)
  if (found) return found
  await keepKeyFile(file, await make())
  const kept = await readKeyFile(file, now)
  if (!kept) throw new Error(`${file} was there and is gone.`)
  return kept
}

function openRoot(folder: string, house: string, now: Date): Promise<KeyFile> {
  return opened(join(folder, ROOT), now, async () => {
    const holder = freshHolder(`Root of ${house}`)
    const certificate = makeCertificate({ holder, issuer: holder, ...lasting('authority', now) })
    return { privateKey: holder.privateKey, certificates: [certificate] }
  })
}

async function issued(folder: string, house: string, now: Date): Promise<KeyFile> {
  const { privateKey, certificates } = await openRoot(folder, house, now)
  const name = readCertificate(certificates[0])?.subjectName
  if (!name) throw new Error(`${join(folder, ROOT)} holds no certificate that can be read.`)
  const holder = freshHolder(house)
  const issuer = { name, publicKey: createPublicKey(privateKey), privateKey }
  const own = makeCertificate({ holder, issuer, ...lasting('seal', now) })
  return { privateKey: holder.privateKey, certificates: [own, ...certificates] }
}

/**
 * Opens the key that signs for this server. Where there is none, a root and a key under it are made: a demonstration can
 * start at once, and whoever verifies is handed the root. A key and certificate of one's own go into `seal.pem`.
 *
 * @param folder holds `seal.pem`: certificates and the private key (P-256) in PEM, for the owner's eyes only
 * @param house whose certificate it is, if it has to be made
 */
export async function openSigner(folder: string, house: string, now: Date): Promise<Signer> {
  const { privateKey, certificates } = await opened(join(folder, SEAL), now, () => issued(folder, house, now))
  return {
    sign: async (data) => new Uint8Array(signWith('sha256', data, { key: privateKey, dsaEncoding: 'ieee-p1363' })),
    certificate: certificates.map(pemOf).join(''),
    certificates,
    root: pemOf(certificates.at(-1) ?? certificates[0]),
  }
}
