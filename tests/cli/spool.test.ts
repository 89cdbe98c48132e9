import { mkdtempSync, readdirSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import fc from 'fast-check'
import { afterAll, describe, expect, it, vi } from 'vitest'
import { indented, listFrame } from '#cli/formats/format.ts'
import { Spool } from '#cli/spool.ts'

const folder = mkdtempSync(join(tmpdir(), 'skerry-spool-'))
afterAll(() => rmSync(folder, { recursive: true, force: true }))

const readBack = (spool: Spool): Buffer => Buffer.concat([...spool.pieces()].map((piece) => Buffer.from(piece)))

describe('a spool', () => {
  it('gives back what it was given, little or much, whatever the letters', () => {
    fc.assert(
      fc.property(
        fc.array(fc.string({ unit: 'grapheme', maxLength: 40 }), { maxLength: 30 }),
        fc.nat(2),
        (texts, large) => {
          const spool = new Spool()
          const given = texts.flatMap((text) => [text, 'x'.repeat(large * 700_000)])
          for (const text of given) spool.add(text)
          expect(readBack(spool).equals(Buffer.from(given.join('')))).toBe(true)
        },
      ),
      { numRuns: 25 },
    )
  })

  it('leaves nothing behind on the disk, read back or not', () => {
    vi.stubEnv('TMPDIR', folder)
    const spool = new Spool()
    for (let part = 0; part < 9; part += 1) spool.add('Ω'.repeat(1_000_000))
    expect(readdirSync(folder)).toEqual([])
    expect(readBack(spool).toString()).toBe('Ω'.repeat(9_000_000))
    const forgotten = new Spool()
    forgotten.add('x'.repeat(5_000_000))
    forgotten.end()
    expect(readdirSync(folder)).toEqual([])
    vi.unstubAllEnvs()
  })
})

describe('a document around a list that was printed before it', () => {
  const value = fc.jsonValue({ maxDepth: 3 })

  it('is the same text as printing it whole', () => {
    fc.assert(
      fc.property(value, fc.array(value, { maxLength: 4 }), (head, files) => {
        const whole = `${JSON.stringify({ head, files }, null, 2)}\n`
        const { head: above, tail } = listFrame({ head, files: [] }, 'files', 2, files.length > 0)
        expect(above + files.map((file) => indented(file, 4)).join(',\n') + tail).toBe(whole)
      }),
    )
  })
})
