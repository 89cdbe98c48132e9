import { createHash } from 'node:crypto'
import { bytesToHex } from '@noble/hashes/utils.js'
import { describe, expect, it } from 'vitest'
import { CHAIN_START, canonicalEntry, chainHash, leafHash } from '#core/register/entry.ts'
import { issuedEntry } from './entries.ts'

const sha256 = (...parts: Uint8Array[]): string => createHash('sha256').update(Buffer.concat(parts)).digest('hex')

describe('an entry of the register', () => {
  const entry = issuedEntry(3)

  it('has one form, whatever the order of its keys', () => {
    const turned = Object.fromEntries(Object.entries(entry).reverse())
    expect(canonicalEntry({ ...entry, ...turned })).toBe(canonicalEntry(entry))
    expect(canonicalEntry(turned as typeof entry)).toBe(canonicalEntry(entry))
  })

  it('is written as RFC 8785 has it: keys in order, no spaces, absent keys left out', () => {
    const text = canonicalEntry({ ...entry, reason: 'Zs of “K2” was of K3', replaces: 'FEN-2026-0001' })
    const keys = [...text.matchAll(/"([a-z0-9_]+)":/g)].map(([, key]) => key)
    expect(keys).toEqual(keys.toSorted())
    expect(text).not.toMatch(/[:,] /)
    expect(text).toContain('"reason":"Zs of “K2” was of K3"')
    expect(canonicalEntry(entry)).not.toContain('reason')
  })

  it('is a leaf with 0x00 in front, over UTF-8', () => {
    const umlaut = { ...entry, organisation: 'Fährmann & Söhne' }
    expect(bytesToHex(leafHash(umlaut))).toBe(sha256(Buffer.of(0), Buffer.from(canonicalEntry(umlaut), 'utf8')))
  })

  it('is tied to all before it by a hash that is neither leaf nor node', () => {
    const leaf = leafHash(entry)
    const link = chainHash(CHAIN_START, leaf)
    expect(bytesToHex(link)).toBe(sha256(Buffer.of(2), Buffer.alloc(32), leaf))
    expect(bytesToHex(chainHash(link, leaf))).not.toBe(bytesToHex(link))
  })

  it('is refused with half a character in it, which has no UTF-8', () => {
    expect(() => canonicalEntry({ ...entry, reason: 'half \ud83d' })).toThrow('surrogate')
  })
})
