import { type SealOptions, seal } from '#core/seal/seal.ts'
import { type SealVerdict, verifySeal } from '#core/seal/verify-seal.ts'
import { page } from '../../paper/page.ts'
import { root, sealer } from './people.ts'

export const AT = '2026-10-21T09:30:05Z'

/** A page with room for a seal, and a file inside. */
export const unsealed: Uint8Array = page('<h1>Report</h1><p>Words.</p>', {
  seal: { name: 'Fenn & Moor Islanding', reason: 'Issue of report FEN-2026-0012' },
  attachments: [
    {
      name: 'Größe.yaml',
      type: 'application/yaml',
      bytes: new Uint8Array(Buffer.from('site: Fennmark\n')),
      relationship: 'Source',
      description: 'as entered',
      created: AT,
    },
  ],
})

export const sealOptions: SealOptions = { pdf: unsealed, sign: sealer.sign, certificates: sealer.certificates, at: AT }
export const sealed: Uint8Array = await seal(sealOptions)

/** What is found in a file by someone who trusts the root of Fennmark, or nobody, or somebody else. */
export function examined(
  pdf: Uint8Array,
  trusted: readonly Uint8Array[] | undefined = root.certificates,
): Promise<SealVerdict> {
  return verifySeal(pdf, { certificates: trusted, subtle: crypto.subtle })
}

/** Names of the checks that do not hold. */
export async function failing(pdf: Uint8Array, trusted?: readonly Uint8Array[]): Promise<string[]> {
  return (await examined(pdf, trusted ?? root.certificates)).checks.filter(({ holds }) => !holds).map(({ id }) => id)
}

/** The same file with other bytes from some place on. */
export function patched(pdf: Uint8Array, at: number, bytes: Iterable<number>): Uint8Array {
  const changed = pdf.slice()
  changed.set([...bytes], at)
  return changed
}

export const latin1 = (pdf: Uint8Array): string => Buffer.from(pdf).toString('latin1')
