import { execFileSync } from 'node:child_process'
import { mkdtempSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { describe, expect, it } from 'vitest'
import {
  checkpointBody,
  parseCheckpoint,
  type SignedCheckpoint,
  signCheckpoint,
  verifyCheckpoint,
} from '#core/register/checkpoint.ts'
import { ORGANISATION } from './entries.ts'
import { freshKeys } from './keys.ts'

const keys = freshKeys()
const head = { origin: ORGANISATION, size: 12, root: '5d'.repeat(32), at: '2026-10-21T09:30:00Z' }

async function signed(change = {}): Promise<SignedCheckpoint> {
  const read = parseCheckpoint(await signCheckpoint({ ...head, ...change }, keys.sign))
  if (!read.ok) throw new Error(read.message)
  return read.checkpoint
}

describe('a checkpoint is refused', () => {
  it.each([
    ['signed with another key', async () => verifyCheckpoint(await signed(), freshKeys().verify)],
    [
      'whose body was changed',
      async () => verifyCheckpoint({ ...(await signed()), body: checkpointBody({ ...head, size: 13 }) }, keys.verify),
    ],
    [
      'whose signature belongs to another',
      async () =>
        verifyCheckpoint({ ...(await signed()), signature: (await signed({ size: 13 })).signature }, keys.verify),
    ],
  ])('%s', async (_, verified) => expect(await verified()).toBe(false))

  const lines = (): Promise<string> => signCheckpoint(head, keys.sign)
  it.each([
    ['without its last line feed', (text: string) => text.trimEnd()],
    ['with a line behind it', (text: string) => `${text}note added later\n`],
    ['with a line before it', (text: string) => `note\n${text}`],
    ['with lines as another system ends them', (text: string) => text.replaceAll('\n', '\r\n')],
    ['of a version to come', (text: string) => text.replace('checkpoint 1', 'checkpoint 2')],
    ['with a size in another spelling', (text: string) => text.replace('size 12', 'size 012')],
    ['with a root cut short', (text: string) => text.replace('root 5d', 'root ')],
    ['with a time of no zone', (text: string) => text.replace('00Z', '00')],
    ['without a signature', (text: string) => text.replace(/signature .*\n/, '')],
    ['with a signature that is no base64', (text: string) => text.replace(/signature .*/, 'signature ====')],
    ['with a signature of the wrong form', (text: string) => text.replace(/signature .*/, 'signature AAAA')],
    ['of nothing', () => ''],
  ])('%s', async (_, change) => {
    const read = parseCheckpoint(change(await lines()))
    expect(read).toMatchObject({ ok: false, message: expect.stringContaining('no checkpoint of a register') })
  })

  it('before it is signed, where it could not be read back', async () => {
    await expect(signCheckpoint({ ...head, origin: 'two\nlines' }, keys.sign)).rejects.toThrow(RangeError)
    await expect(signCheckpoint({ ...head, size: -1 }, keys.sign)).rejects.toThrow(RangeError)
    await expect(signCheckpoint(head, async () => new Uint8Array(63))).rejects.toThrow('64 bytes')
  })
})

describe('a checkpoint', () => {
  it('is read back as it was signed', async () => {
    const read = await signed({ at: '2026-10-21T09:30:00.123456Z', origin: 'Fährmann & Söhne' })
    expect(read).toMatchObject({ ...head, at: '2026-10-21T09:30:00.123456Z', origin: 'Fährmann & Söhne' })
    expect(await verifyCheckpoint(read, keys.verify)).toBe(true)
  })

  it('is verified by OpenSSL without Skerry', async () => {
    const folder = mkdtempSync(join(tmpdir(), 'checkpoint-'))
    const text = await signCheckpoint(head, keys.sign)
    const [, body = '', signature = ''] = /^(.*\n)signature (.*)\n$/s.exec(text) ?? []
    writeFileSync(join(folder, 'key.pem'), keys.publicKey.export({ type: 'spki', format: 'pem' }))
    writeFileSync(join(folder, 'signature'), Buffer.from(signature, 'base64'))
    const verify = (content: string): string => {
      writeFileSync(join(folder, 'body'), content)
      const words = ['dgst', '-sha256', '-verify', 'key.pem', '-signature', 'signature', 'body']
      return execFileSync('openssl', words, { cwd: folder, encoding: 'utf8' })
    }
    expect(verify(body)).toBe('Verified OK\n')
    expect(() => verify(body.replace('size 12', 'size 13'))).toThrow()
  })
})
