import { describe, expect, it } from 'vitest'
import { factsOf } from '#core/report/facts.ts'
import { judgedBase, judgedExample } from './judged.ts'

describe('the facts of a file', () => {
  it('each have a value, a unit, a formula, a source and where they come from', () => {
    const facts = Object.values(factsOf(judgedExample('alder-mill-bakery'))).flatMap((known) => Object.values(known))
    expect(facts.length).toBeGreaterThan(120)
    for (const { value, unit, formula, source, from } of facts) {
      expect(value).toBeDefined()
      expect(typeof unit).toBe('string')
      expect(formula.length).toBeGreaterThan(2)
      expect(source.length).toBeGreaterThan(3)
      expect(Array.isArray(from)).toBe(true)
    }
  })

  it('stand under subject and quantity: circuit, string, meter, installation', () => {
    const facts = factsOf(judgedExample('alder-mill-bakery'))
    expect(facts['K1']?.['design_current']).toMatchObject({ unit: 'A', value: expect.closeTo(7.161, 3) })
    expect(facts['A1/1']?.['voc_expected']).toMatchObject({ unit: 'V', value: expect.closeTo(648.52, 2) })
    expect(facts['M1']?.['termination_expected']).toMatchObject({ unit: 'Ω', value: 60 })
    expect(facts['installation']?.['neutral_earth_links']).toMatchObject({ value: { grid: 1, island: 1 } })
  })

  it('leave out what cannot be computed: nothing is guessed', () => {
    const facts = factsOf(judgedBase({ remove: ['circuits.K1.load', 'site.lowest_temperature'] }))
    expect(facts['K1']).not.toHaveProperty('design_current')
    expect(facts['A1']).not.toHaveProperty('voc_maximum')
    expect(Object.values(facts).filter((known) => Object.keys(known).length === 0)).toEqual([])
  })
})
