import { describe, expect, it } from 'vitest'
import { buildCms } from '#core/seal/cms.ts'
import { leading } from '#core/seal/der.ts'
import { PdfFile } from '#core/seal/pdf-file.ts'
import { placeholderOf, rangesAround } from '#core/seal/placeholder.ts'
import { readCms } from '#core/seal/read-cms.ts'
import { seal } from '#core/seal/seal.ts'
import { page } from '../../paper/page.ts'
import { person, root, sealer } from './people.ts'
import { AT, examined, failing, latin1, patched, sealed, sealOptions, unsealed } from './sealed.ts'

const { hole } = placeholderOf(new PdfFile(sealed))
const cms = leading(hole.bytes)?.whole ?? new Uint8Array()
const text = latin1(sealed)
const bytesOf = (words: string): Uint8Array => new Uint8Array(Buffer.from(words, 'latin1'))
const flipped = (at: number, bit: number): Uint8Array => patched(sealed, at, [(sealed[at] ?? 0) ^ (1 << bit)])

/** The file with other words in the place of some, as long as they were. */
function said(before: string, after: string): Uint8Array {
  const at = text.indexOf(before)
  if (at === -1) throw new Error(`“${before}” is not in the file`)
  return patched(sealed, at, bytesOf(after.padEnd(before.length)))
}

/** The file with another signature in its hole. */
const holding = (content: Uint8Array): Uint8Array =>
  patched(
    sealed,
    hole.start + 1,
    bytesOf(
      Buffer.from(content)
        .toString('hex')
        .padEnd(hole.end - hole.start - 2, '0'),
    ),
  )

/** An update as other programs append it: an object anew, a table of its own, a trailer that names the one before. */
function updated(previous: boolean): Uint8Array {
  const table = /startxref\n(\d+)\n%%EOF\n$/.exec(text)?.[1] ?? ''
  const [, size = ''] = /\/Size (\d+)/.exec(text) ?? []
  const [, catalog = ''] = /\/Root (\d+) 0 R/.exec(text) ?? []
  const object = `${catalog} 0 obj\n<< /Type /Catalog >>\nendobj\n`
  const at = sealed.length + object.length
  const head = `xref\n0 1\n0000000000 65535 f \n${catalog} 1\n${String(sealed.length).padStart(10, '0')} 00000 n \n`
  const trailer = `trailer\n<< /Size ${size} /Root ${catalog} 0 R${previous ? ` /Prev ${table}` : ''} >>\n`
  return Buffer.concat([sealed, bytesOf(`${object}${head}${trailer}startxref\n${at}\n%%EOF\n`)])
}

const parts = readCms(cms)
if (!parts) throw new Error('the seal cannot be read')
const other = person('Other', 'seal', root)

describe('a sealed file that was tampered with is found', () => {
  it('for a bit changed in any region of it', { timeout: 120_000 }, async () => {
    expect(await failing(sealed)).toEqual([])
    const every = Math.ceil(sealed.length / 400)
    const outside = Array.from({ length: 400 }, (_, step) => step * every + (step % every)).filter(
      (at) => at < sealed.length,
    )
    const within = Array.from({ length: cms.length }, (_, step) => hole.start + 1 + step * 2 + (step % 2))
    const edges = [hole.start, hole.end - 1, hole.end - 2, sealed.length - 1]
    const missed: number[] = []
    for (const [turn, at] of [...outside, ...within, ...edges].entries())
      if ((await failing(flipped(at, turn % 8))).length === 0) missed.push(at)
    expect(missed).toEqual([])
  })

  it.each([
    ['cut at its end', sealed.subarray(0, -1), ['seal-file']],
    ['cut in the middle', sealed.subarray(0, sealed.length >> 1), ['seal-file']],
    ['with a line feed behind it', Buffer.concat([sealed, bytesOf('\n')]), ['seal-file']],
    ['with a second end behind it', Buffer.concat([sealed, bytesOf('%%EOF\n')]), ['seal-file']],
    ['with an update appended', updated(true), ['seal-file']],
    ['with an update appended that hides the first', updated(false), ['seal-file']],
    ['with a byte in front of it', Buffer.concat([bytesOf(' '), sealed]), ['seal-file']],
    ['of another version', said('%PDF-1.7', '%PDF-1.6'), ['seal-file']],
    [
      'with ranges that leave more out',
      said(
        `[${rangesAround({ hole } as never, sealed.length).join(' ')}`,
        `[0 ${hole.start - 1} ${hole.end} ${sealed.length - hole.end}`,
      ),
      ['seal-covers-file', 'seal-digest'],
    ],
    [
      'with a range too many',
      said(`${sealed.length - hole.end}]  `, `${sealed.length - hole.end} 1]`),
      ['seal-covers-file', 'seal-digest'],
    ],
    ['with something hidden behind the signature', patched(sealed, hole.end - 3, bytesOf('ff')), ['seal-padding']],
    [
      'with the hole in capitals',
      patched(sealed, hole.start + 1, bytesOf(text.slice(hole.start + 1, hole.start + 65).toUpperCase())),
      ['seal-file'],
    ],
    ['with a hole that is empty', holding(new Uint8Array()), ['seal-signature']],
    [
      'with another kind of signature',
      said('ETSI.CAdES.detached', 'adbe.pkcs7.detached'),
      ['seal-covers-file', 'seal-digest'],
    ],
    ['with another time', said('/M (D:20261021093005Z)', '/M (D:20261021093006Z)'), ['seal-digest']],
    ['with no time', said('/M (D:20261021093005Z)', '/M (yesterday at nine)'), ['seal-digest', 'seal-certificate']],
    ['whose seal permits changes', said('/DocMDP ', '/DocMDX '), ['seal-file']],
    [
      'with the signature of somebody else',
      holding(buildCms({ ...parts, certificates: other.certificates })),
      ['seal-signature'],
    ],
    ['with no certificate', holding(buildCms(parts).subarray(0, 60)), ['seal-signature']],
    ['that never had a seal', page('<h1>Draft</h1>'), ['seal-file']],
    ['that was not sealed yet', unsealed, ['seal-covers-file', 'seal-signature']],
    ['that is none', bytesOf('%PDF-1.7\nnothing'), ['seal-file']],
  ])('%s', async (_, pdf, expected) => expect(await failing(new Uint8Array(pdf))).toEqual(expected))

  it('with a certificate along that leads nowhere', async () => {
    const stranger = person('Stranger', 'authority')
    const pdf = await seal({ ...sealOptions, certificates: [...sealer.certificates, ...stranger.certificates] })
    expect(await failing(pdf)).toEqual(['seal-certificate'])
  })
})

describe('a PDF is not sealed', () => {
  it.each([
    ['that keeps no room', { pdf: page('<h1>Draft</h1>') }, 'carries no seal'],
    ['by somebody whose certificate is none', { certificates: [new Uint8Array(3)] }, 'no X.509 certificate'],
    ['by nobody', { certificates: [] }, 'no X.509 certificate'],
    [
      'with more certificates than fit',
      { certificates: Array.from({ length: 40 }, () => sealer.certificates[0]) },
      'do not fit',
    ],
    ['at a time that is none', { at: 'yesterday, at about nine o’clock in the morning' }, 'does not fit'],
  ])('%s', async (_, change, words) => {
    await expect(seal({ ...sealOptions, ...change })).rejects.toThrow(words)
  })
})

describe('a sealed file', () => {
  it('is as long as it was before', () => expect(sealed).toHaveLength(unsealed.length))

  it('holds, and says when, and who sealed it', async () => {
    const { checks, at, certificate } = await examined(sealed)
    expect(checks.filter(({ holds }) => !holds)).toEqual([])
    expect(at).toBe(AT)
    expect(certificate?.subject).toBe('O=Fenn & Moor Islanding, CN=Seal')
  })

  it('says that trust is open where nobody was named as trusted', async () => {
    const { verifySeal } = await import('#core/seal/verify-seal.ts')
    const { checks } = await verifySeal(sealed, { certificates: undefined, subtle: crypto.subtle })
    expect(checks.filter(({ open }) => open)).toEqual([
      expect.objectContaining({
        id: 'seal-certificate',
        holds: true,
        says: expect.stringContaining('only as trustworthy as where it came from'),
      }),
    ])
  })

  it('can be sealed once more, which takes the place of the first', async () => {
    const again = await seal({ ...sealOptions, pdf: sealed, at: '2026-10-22T08:00:00Z' })
    expect(await failing(again)).toEqual([])
    expect((await examined(again)).at).toBe('2026-10-22T08:00:00Z')
  })

  it('passes a failure of the program on, and does not call it a bad file', async () => {
    const { verifySeal } = await import('#core/seal/verify-seal.ts')
    const subtle = {
      importKey: async () => {
        throw new Error('no such thing here')
      },
      verify: async () => false,
    }
    await expect(verifySeal(sealed, { certificates: undefined, subtle })).rejects.toThrow('no such thing here')
  })
})
