import { base64Of, bytesFrom } from '#core/register/base64.ts'

const BLOCK = /-----BEGIN CERTIFICATE-----\r?\n([A-Za-z0-9+/=\r\n]+?)\r?\n-----END CERTIFICATE-----/g

/** The certificates of a PEM text, as DER, in their order; other blocks and words between them are left out. */
export function certificatesFrom(pem: string): Uint8Array[] {
  return [...pem.matchAll(BLOCK)].flatMap(([, base64 = '']) => bytesFrom(base64.replaceAll(/\s/g, '')) ?? [])
}

/** A certificate as PEM. */
export function pemOf(certificate: Uint8Array): string {
  const lines = base64Of(certificate).match(/.{1,64}/g) ?? []
  return `-----BEGIN CERTIFICATE-----\n${lines.join('\n')}\n-----END CERTIFICATE-----\n`
}
