import { parseCheckpoint } from '#core/register/checkpoint.ts'
import { derFromRaw } from '#core/register/ecdsa.ts'
import { type Proof, verifyProof } from '#core/register/proof.ts'
import type { Check } from '#core/register/signing.ts'
import { verifySignature } from '#core/seal/algorithms.ts'
import { type KnownCertificate, readCertificate } from '#core/seal/certificate.ts'
import { OID } from '#core/seal/names.ts'
import { certificatesFrom } from '#core/seal/pem.ts'
import { followChain } from '#core/seal/trust.ts'
import type { SealVerdict, Trust } from '#core/seal/verify-seal.ts'

/**
 * Whom the keeper of the register must lead to: those who are trusted, or else those whom the seal itself leads to, so
 * that both are of one house.
 */
function anchors<Key>(
  { certificate, chain = [] }: SealVerdict,
  { certificates }: Trust<Key>,
): readonly KnownCertificate[] {
  if (certificates) return certificates.flatMap((der) => readCertificate(der) ?? [])
  return certificate ? [certificate, ...chain] : []
}

async function keeperCheck<Key>(
  own: KnownCertificate,
  others: readonly KnownCertificate[],
  at: string,
  seal: SealVerdict,
  trust: Trust<Key>,
): Promise<Check> {
  const question = { own, others, trusted: anchors(seal, trust), at: new Date(at), subtle: trust.subtle }
  const { holds, says } = await followChain(question)
  return {
    id: 'register-keeper',
    holds,
    says: holds && !trust.certificates ? 'The register is kept by the house that sealed the report.' : says,
  }
}

/**
 * Verifies a place in the register: the proof itself, and who signed it.
 *
 * @param seal what the seal of the report said
 */
export async function registerChecks<Key>(
  proof: Proof,
  seal: SealVerdict,
  trust: Trust<Key>,
): Promise<readonly Check[]> {
  const [own, ...others] = certificatesFrom(proof.certificate).map(readCertificate)
  const parsed = parseCheckpoint(proof.checkpoint)
  const known = others.filter((certificate) => certificate !== undefined)
  if (!own || known.length !== others.length || !parsed.ok) {
    return [{ id: 'register-checkpoint', holds: false, says: 'The proof names nobody who signed its checkpoint.' }]
  }
  const { key } = own
  const checks = await verifyProof(proof, async (data, raw) => {
    const signed = { key, algorithm: OID.ecdsaSha256, data, signature: derFromRaw(raw) }
    return (await verifySignature(signed, trust.subtle)) === 'holds'
  })
  return [...checks, await keeperCheck(own, known, parsed.checkpoint.at, seal, trust)]
}
