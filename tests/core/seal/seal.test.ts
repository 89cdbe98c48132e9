import { describe, expect, it } from 'vitest'
import { examined, failing, latin1, patched, sealed, unsealed } from './sealed.ts'

const hole = latin1(sealed).indexOf('/Contents <') + '/Contents '.length
const holeEnd = latin1(sealed).indexOf('>', hole)

/** A bit that turns one byte into another. */
const flipped = (at: number, bit: number): Uint8Array => patched(sealed, at, [(sealed[at] ?? 0) ^ (1 << bit)])

describe('a sealed file that was tampered with is found', () => {
  it('for a bit changed in any region of it', { timeout: 120_000 }, async () => {
    expect(await failing(sealed)).toEqual([])
    const every = Math.ceil(sealed.length / 400)
    const outside = Array.from({ length: 400 }, (_, step) => step * every + (step % every)).filter(
      (at) => at < sealed.length,
    )
    const within = Array.from({ length: 250 }, (_, step) => hole + step * 11).filter((at) => at < holeEnd)
    const missed: number[] = []
    for (const [turn, at] of [...outside, ...within, hole, holeEnd, sealed.length - 1].entries())
      if ((await failing(flipped(at, turn % 8))).length === 0) missed.push(at)
    expect(missed).toEqual([])
  })
})

describe('a sealed file', () => {
  it('is as long as it was before', () => expect(sealed).toHaveLength(unsealed.length))
  it('holds', async () => {
    const { checks, at, certificate } = await examined(sealed)
    expect(checks.filter(({ holds }) => !holds)).toEqual([])
    expect(at).toBe('2026-10-21T09:30:05Z')
    expect(certificate?.subject).toBe('O=Fenn & Moor Islanding, CN=Seal')
  })
})
