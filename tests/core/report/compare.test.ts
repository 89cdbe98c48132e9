import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { check, type Judged } from '#core/engine.ts'
import { SHIPPED_BOOKS, shippedBook } from '#core/judge/shipped.ts'
import { compare } from '#core/report/compare.ts'

const bakery = readFileSync('examples/alder-mill-bakery.skerry.yaml', 'utf8')

function judged(text: string): Judged {
  const result = check(text, { find: shippedBook, names: SHIPPED_BOOKS })
  if (result.kind !== 'judged') throw new Error(result.problems.map(({ message }) => message).join('\n'))
  return result
}

const compared = (text: string) => compare(judged(bakery), judged(text))

describe('two files', () => {
  it('that mean the same do not differ, however they are written', () => {
    expect(
      compared(
        bakery
          .replace('0.55 ohm', '550 mΩ')
          .replace(
            'cable: { type: 3G2.5, insulation: pvc, method: C, length: 18 m,',
            'cable: { length: 18 m, method: C, insulation: pvc, type: 3G2.5,',
          ),
      ),
    ).toEqual({ verdicts: [], values: [] })
  })

  it('differ by value and state, and by the verdicts that flipped', () => {
    const { verdicts, values } = compared(bakery.replace('loop: { grid: 0.35 ohm }', 'loop: { grid: 2.35 ohm }'))
    expect(values).toContainEqual({ subject: 'K7', state: 'grid', name: 'loop', unit: 'Ω', before: 0.35, after: 2.35 })
    expect(verdicts).toContainEqual({
      rule: 'loop-was-read-on-the-grid',
      subject: 'K7',
      state: 'grid',
      before: 'meets',
      after: 'fails',
    })
  })

  it('differ by what one of them has and the other has not', () => {
    const without = bakery.replace(/ {2}K7:\n(?: {4}.*\n)+/, '').replace(/ {4}K7: .*\n/, '')
    const gone = compared(without)
    expect(gone.values.find(({ subject, name }) => subject === 'K7' && name === 'serves')).toMatchObject({
      before: 'Deck oven',
      after: undefined,
    })
    expect(gone.verdicts.some(({ subject, after }) => subject === 'K7' && after === undefined)).toBe(true)
    const come = compare(judged(without), judged(bakery))
    expect(come.values.find(({ subject, name }) => subject === 'K7' && name === 'serves')).toMatchObject({
      before: undefined,
      after: 'Deck oven',
    })
  })
})
