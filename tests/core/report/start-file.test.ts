import { describe, expect, it } from 'vitest'
import { check } from '#core/engine.ts'
import { SHIPPED_BOOKS, shippedBook } from '#core/judge/shipped.ts'
import { startFile } from '#core/report/start-file.ts'
import { atFailureLevel, toldFindings } from '#core/report/told.ts'

const answers = {
  name: 'Marsh "House" #1',
  operator: 'Fennmark Grid',
  earthing: 'TN-S',
  phases: '3',
  rating: '35',
  rulebook: 'iec',
}

describe('a file to start from', () => {
  it.each([
    ['three-phase', answers],
    ['single-phase', { ...answers, phases: '1' }],
    ['TT', { ...answers, earthing: 'TT' }],
    ['63 A, for Germany', { ...answers, rating: '63', rulebook: 'de' }],
  ])('%s is right in shape and takes any name', (_, given) => {
    const result = check(startFile(given), { find: shippedBook, names: SHIPPED_BOOKS })
    if (result.kind !== 'judged') throw new Error(result.problems.map(({ message }) => message).join('\n'))
    expect(result.install.site.name).toBe(given.name)
  })

  it('lacks only what must be read off the inverter before its values are replaced', () => {
    const result = check(startFile(answers), { find: shippedBook, names: SHIPPED_BOOKS })
    const failing = toldFindings(result).filter(atFailureLevel)
    expect(failing.map(({ rule }) => rule)).toEqual(['interface-protection-is-on-record'])
  })
})
