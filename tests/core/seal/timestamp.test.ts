import { afterAll, describe, expect, it } from 'vitest'
import { der, leading, partsOf, TAG } from '#core/seal/der.ts'
import { PdfFile } from '#core/seal/pdf-file.ts'
import { placeholderOf } from '#core/seal/placeholder.ts'
import { readCms } from '#core/seal/read-cms.ts'
import { seal } from '#core/seal/seal.ts'
import { verifyTimestamp } from '#core/seal/timestamp.ts'
import { timestampRequest, tokenFrom } from '#core/seal/timestamp-request.ts'
import { type Authority, openAuthority } from '../../judges/timestamp-authority.ts'
import { root } from './people.ts'
import { examined, sealOptions } from './sealed.ts'

const RSA = (bits: number) => ({ key: ['-newkey', `rsa:${bits}`] })
const opened: Authority[] = []
const open = (...shape: Parameters<typeof openAuthority>): Authority => {
  const authority = openAuthority(...shape)
  opened.push(authority)
  return authority
}
afterAll(() => {
  for (const authority of opened) authority.close()
})

const authority = open()
const signature = Uint8Array.from({ length: 70 }, (_, at) => at)
const tokenOf = async ({ answer }: Authority, over = signature): Promise<Uint8Array> =>
  tokenFrom(await answer(timestampRequest(over)))
const verified = (token: Uint8Array, over = signature) => verifyTimestamp(token, over, crypto.subtle)

describe('a time stamp is refused', () => {
  it('over another signature', async () => {
    expect(await verified(await tokenOf(authority), signature.toReversed())).toMatchObject({
      holds: false,
      says: 'The time stamp is over another signature.',
    })
  })

  it('with any bit of it changed', { timeout: 60_000 }, async () => {
    const token = await tokenOf(authority)
    const missed: number[] = []
    for (const at of token.keys()) {
      for (const bit of [at % 8, (at * 5 + 3) % 8]) {
        const changed = token.map((byte, index) => (index === at ? byte ^ (1 << bit) : byte))
        if ((await verified(changed)).holds) missed.push(at)
      }
    }
    expect(missed).toEqual([])
  })

  it('by a key that is too weak', { timeout: 60_000 }, async () => {
    expect(await verified(await tokenOf(open(RSA(2048))))).toMatchObject({
      holds: false,
      says: expect.stringContaining('too weak'),
    })
  })

  it('by a hash that is no longer strong', async () => {
    expect(await verified(await tokenOf(open({ digest: 'sha1' })))).toMatchObject({
      holds: false,
      says: expect.stringContaining('not one that Skerry accepts'),
    })
  })

  it.each([
    ['nothing', new Uint8Array()],
    ['something else', der(TAG.sequence, der(TAG.integer, Uint8Array.of(1)))],
  ])('that is %s', async (_, token) => expect((await verified(token)).holds).toBe(false))
})

describe('an authority that', () => {
  const answering = (...status: number[]) =>
    der(TAG.sequence, der(TAG.sequence, der(TAG.integer, Uint8Array.from(status))))

  it.each([
    ['refuses', answering(2), 'refused (status 2)'],
    ['grants nothing', answering(0), 'refused (status 0)'],
    ['answers with something else', Uint8Array.from([1, 2, 3]), 'did not answer with a response of RFC 3161'],
    ['answers with a status of no number', answering(), 'refused (status )'],
  ])('%s stops the sealing with words', async (_, response, words) => {
    await expect(seal({ ...sealOptions, timestamp: async () => response })).rejects.toThrow(words)
  })
})

describe('a seal with a time stamp', () => {
  it('holds, says when it was seen and by whom, and whether that authority is trusted', {
    timeout: 60_000,
  }, async () => {
    const pdf = await seal({ ...sealOptions, timestamp: authority.answer })
    const stampOf = async (trusted: readonly Uint8Array[]) =>
      (await examined(pdf, trusted)).checks.find(({ id }) => id === 'time-stamp')
    const stated = await stampOf([...root.certificates, authority.root])
    expect(stated).toMatchObject({
      holds: true,
      says: expect.stringContaining('O=Fennmark Time, CN=Clock saw the seal at'),
    })
    expect(stated?.says).toContain('Its authority is trusted here.')
    expect(await stampOf(root.certificates)).toMatchObject({
      holds: true,
      open: true,
      says: expect.stringContaining('not among those named'),
    })
    expect((await examined(pdf)).checks.filter(({ holds }) => !holds)).toEqual([])
  })

  it('is found wanting when the time stamp is that of another seal', async () => {
    const other = await tokenOf(authority)
    const response = der(TAG.sequence, der(TAG.sequence, der(TAG.integer, Uint8Array.of(0))), other)
    const pdf = await seal({ ...sealOptions, timestamp: async () => response })
    expect((await examined(pdf)).checks.filter(({ holds }) => !holds)).toEqual([
      { id: 'time-stamp', holds: false, says: 'The time stamp is over another signature.' },
    ])
  })

  it('carries it beside the signature', async () => {
    const pdf = await seal({ ...sealOptions, timestamp: authority.answer })
    const cms = leading(placeholderOf(new PdfFile(pdf)).hole.bytes)?.whole ?? new Uint8Array()
    const token = readCms(cms)?.timestamp
    expect(token && partsOf(leading(token))).toHaveLength(2)
  })

  it.each([
    ['RSA of 3072 bits', RSA(3072)],
    [
      'ECDSA on P-384 with SHA-384',
      { key: ['-newkey', 'ec', '-pkeyopt', 'ec_paramgen_curve:P-384'], digest: 'sha384' as const },
    ],
  ])('may come from an authority with %s', { timeout: 60_000 }, async (_, shape) => {
    const strong = open(shape)
    expect(await verified(await tokenOf(strong))).toMatchObject({ holds: true })
  })
})
