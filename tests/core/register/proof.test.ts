import { bytesToHex } from '@noble/hashes/utils.js'
import { describe, expect, it } from 'vitest'
import { signCheckpoint } from '#core/register/checkpoint.ts'
import { leafHash } from '#core/register/entry.ts'
import { readerOf, rootOf } from '#core/register/merkle.ts'
import { makeProof, type Proof, parseProof, verifyProof } from '#core/register/proof.ts'
import { entries, ORGANISATION, sealedEntry } from './entries.ts'
import { freshKeys } from './keys.ts'

const keys = freshKeys()
const SIZE = 11
const register = entries(SIZE)
const leaves = register.map(leafHash)
const certificate = '-----BEGIN CERTIFICATE-----\n'

async function proofOf(sequence: number, origin = ORGANISATION): Promise<Proof> {
  const head = { origin, size: SIZE, root: bytesToHex(rootOf(leaves)), at: '2026-10-21T18:00:00Z' }
  const entry = register[sequence]
  if (!entry) throw new Error(`no entry ${sequence}`)
  return makeProof(entry, await signCheckpoint(head, keys.sign), certificate, readerOf(leaves))
}

const failing = async (proof: Proof, verify = keys.verify): Promise<string[]> =>
  (await verifyProof(proof, verify)).filter(({ holds }) => !holds).map(({ id }) => id)

describe('a proof does not hold', () => {
  it.each([
    [
      'for an entry that was changed',
      (proof: Proof): Proof => ({ ...proof, entry: { ...proof.entry, number: 'FEN-2026-0099' } }),
      ['register-place'],
    ],
    ['for another entry', (proof: Proof): Proof => ({ ...proof, entry: sealedEntry(5) }), ['register-place']],
    ['for another place than the entry names', (proof: Proof): Proof => ({ ...proof, index: 4 }), ['register-place']],
    ['for another size than the checkpoint has', (proof: Proof): Proof => ({ ...proof, size: 12 }), ['register-place']],
    [
      'with a path that leads elsewhere',
      (proof: Proof): Proof => ({ ...proof, path: proof.path.toReversed() }),
      ['register-place'],
    ],
    [
      'with a checkpoint that was changed',
      (proof: Proof): Proof => ({ ...proof, checkpoint: proof.checkpoint.replace('T18', 'T17') }),
      ['register-checkpoint'],
    ],
    [
      'with a text that is no checkpoint',
      (proof: Proof): Proof => ({ ...proof, checkpoint: 'none' }),
      ['register-checkpoint'],
    ],
  ])('%s', async (_, change, expected) => expect(await failing(change(await proofOf(3)))).toEqual(expected))

  it('for the key of somebody else', async () => {
    expect(await failing(await proofOf(3), freshKeys().verify)).toEqual(['register-checkpoint'])
  })

  it("with a checkpoint of somebody else's register", async () => {
    expect(await failing(await proofOf(3, 'skerry.test/organisations/other'))).toEqual(['register-owner'])
  })
})

describe('a proof file is refused', () => {
  it.each([
    ['that is no JSON', () => 'proof'],
    ['that is a list', () => '[]'],
    ['of a version to come', (text: string) => text.replace('skerry-proof/1', 'skerry-proof/2')],
    ['with a key that nobody knows', (text: string) => text.replace('"index"', '"note": 1, "index"')],
    ['without its path', (text: string) => text.replace('"path"', '"way"')],
    ['with a hash in capitals', (text: string) => text.replace(/"aa/, '"AA')],
    ['with a sealed entry that names no file', (text: string) => text.replace(/,"pdf_sha256":"c*"/, '')],
  ])('%s', async (_, change) => {
    const text = JSON.stringify(await proofOf(3))
    expect(parseProof(change(text))).toMatchObject({ ok: false, message: expect.stringContaining('no proof file') })
  })

  it.each([
    ['a document that replaces another for no reason', { replaces: 'FEN-2026-0001' }],
    ['an issued document with the hash of a file that is not sealed yet', { pdf_sha256: 'c'.repeat(64) }],
    ['a withdrawal for no reason', { kind: 'withdrawn' }],
    ['a replacement by nothing', { kind: 'replaced', reason: 'a reading was of another circuit' }],
    ['a revision before the first', { revision: 0 }],
    ['a day without an hour', { at: '2026-10-21' }],
  ])('with %s', async (_, change) => {
    const proof = await proofOf(2)
    expect(parseProof(JSON.stringify(proof)).ok).toBe(true)
    expect(parseProof(JSON.stringify({ ...proof, entry: { ...proof.entry, ...change } })).ok).toBe(false)
  })

  it('where the program itself fails, the failure is not taken for a bad file', () => {
    const broken = new Proxy(
      {},
      {
        get: () => {
          throw new TypeError('broken')
        },
      },
    )
    expect(() => parseProof(broken as unknown as string)).toThrow('broken')
  })
})

describe('a proof', () => {
  it.each(register.map(({ sequence }) => sequence))(
    'of entry %d holds, also after it was written and read',
    async (sequence) => {
      const proof = await proofOf(sequence)
      const read = parseProof(JSON.stringify(proof))
      expect(read).toEqual({ ok: true, proof })
      expect(await failing(proof)).toEqual([])
    },
  )

  it('says in words what it shows', async () => {
    const says = (await verifyProof(await proofOf(3), keys.verify)).map((check) => check.says).join('\n')
    expect(says).toContain('number 4 of the 11')
    expect(says).toContain('2026-10-21T18:00:00Z')
  })

  it('is not made where the checkpoint does not cover the entry', async () => {
    const head = {
      origin: ORGANISATION,
      size: 3,
      root: bytesToHex(rootOf(leaves.slice(0, 3))),
      at: '2026-10-21T18:00:00Z',
    }
    const signed = await signCheckpoint(head, keys.sign)
    expect(() => makeProof(sealedEntry(3), signed, certificate, readerOf(leaves))).toThrow('not one of 3')
    expect(() => makeProof(sealedEntry(3), 'none', certificate, readerOf(leaves))).toThrow('no checkpoint')
  })
})
