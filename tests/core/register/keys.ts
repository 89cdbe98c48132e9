import { generateKeyPairSync, type KeyObject, sign, verify } from 'node:crypto'
import type { Sign, Verify } from '#core/register/signing.ts'

const FORM = 'ieee-p1363'

/** A fresh key pair on P-256, as the register's functions take it. */
export interface Keys {
  readonly sign: Sign
  readonly verify: Verify
  readonly publicKey: KeyObject
}

export function freshKeys(): Keys {
  const { privateKey, publicKey } = generateKeyPairSync('ec', { namedCurve: 'P-256' })
  return {
    publicKey,
    sign: async (data) => sign('sha256', data, { key: privateKey, dsaEncoding: FORM }),
    verify: async (data, signature) => verify('sha256', data, { key: publicKey, dsaEncoding: FORM }, signature),
  }
}
