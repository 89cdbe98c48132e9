import { execFileSync } from 'node:child_process'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { drawSample, populationHash } from '#core/register/sample.ts'

const NUMBERS = Array.from({ length: 40 }, (_, place) => `FEN-2026-${String(place + 1).padStart(4, '0')}`)

const shell = (script: string): string =>
  execFileSync('bash', ['-c', script], { encoding: 'utf8', input: NUMBERS.join('\n') }).trim()

describe('a sample', () => {
  // The words of the method, followed with nothing but the tools of every Linux machine.
  it('is drawn the same by somebody with sha256sum and sort', () => {
    const script = `while read -r n || [ -n "$n" ]; do echo "$(printf 'seed-2026\\n%s' "$n" | sha256sum | cut -d' ' -f1) $n"; done | LC_ALL=C sort | head -5 | cut -d' ' -f2`
    expect(drawSample(NUMBERS, 'seed-2026', 5)).toEqual(shell(script).split('\n'))
  })

  it('names its population by a hash that anybody can make', () => {
    expect(populationHash(NUMBERS.toReversed())).toBe(
      shell("{ cat; echo; } | LC_ALL=C sort | sha256sum | cut -d' ' -f1"),
    )
  })

  it('does not depend on the order of the population, has no number twice, and grows by adding', () => {
    fc.assert(
      fc.property(fc.uniqueArray(fc.string({ minLength: 1 })), fc.string(), fc.nat(30), (population, seed, size) => {
        const drawn = drawSample(population, seed, size)
        expect(drawn).toHaveLength(Math.min(size, population.length))
        expect(new Set(drawn).size).toBe(drawn.length)
        expect(drawSample(population.toReversed(), seed, size)).toEqual(drawn)
        expect(drawSample(population, seed, size + 1).slice(0, drawn.length)).toEqual(drawn)
      }),
    )
  })

  it('takes each number about as often as any other, over many seeds', () => {
    const taken = new Map(NUMBERS.map((number) => [number, 0]))
    for (let seed = 0; seed < 2000; seed += 1)
      for (const number of drawSample(NUMBERS, `seed ${seed}`, 4)) taken.set(number, (taken.get(number) ?? 0) + 1)
    // Each is expected 200 times with a standard deviation of some 13.4.
    for (const times of taken.values()) expect(Math.abs(times - 200)).toBeLessThan(70)
  })
})
