import { createPublicKey, generateKeyPairSync, type KeyObject, sign } from 'node:crypto'
import type { Sign } from '#core/register/signing.ts'
import { type CertificatePlan, type Issuer, makeCertificate, nameOf } from '#server/seal/make-certificate.ts'

/** Someone with a key and a certificate, and those that lead to the root. */
export interface Person extends Issuer {
  readonly sign: Sign
  readonly certificates: readonly [Uint8Array, ...Uint8Array[]]
}

export const FROM = new Date('2026-01-01T00:00:00Z')
export const UNTIL = new Date('2031-01-01T00:00:00Z')

function signer(privateKey: KeyObject): Sign {
  return async (data) => new Uint8Array(sign('sha256', data, { key: privateKey, dsaEncoding: 'ieee-p1363' }))
}

/** A person certified by another, or by itself. */
export function person(
  name: string,
  role: CertificatePlan['role'],
  above?: Person,
  change: Partial<CertificatePlan> = {},
): Person {
  const pair = generateKeyPairSync('ec', { namedCurve: 'P-256' })
  const holder = { name: nameOf('Fenn & Moor Islanding', name), publicKey: createPublicKey(pair.privateKey) }
  const issuer = above ?? { ...holder, privateKey: pair.privateKey }
  const own = makeCertificate({ holder, issuer, role, from: FROM, until: UNTIL, ...change })
  return {
    ...holder,
    privateKey: pair.privateKey,
    sign: signer(pair.privateKey),
    certificates: [own, ...(above?.certificates ?? [])],
  }
}

export const root = person('Root', 'authority')
export const sealer = person('Seal', 'seal', root)
