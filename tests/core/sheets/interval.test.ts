import { describe, expect, test } from 'vitest'
import type { Install } from '#core/install.ts'
import { installationPlan } from '#core/sheets/installation.ts'
import { sceneOf } from '../quantities/circuit-scene.ts'
import { bakery } from '../topology/bakery.ts'

function field(name: string, install: Install) {
  return installationPlan.entered.find((row) => row.name === name)?.value(install, sceneOf(install))
}

function inspected(
  from: string,
  to: string | undefined,
  next_due: string,
  premises: NonNullable<Install['site']['premises']> = 'commercial',
): Install {
  const days = to === undefined ? { from } : { from, to }
  return { ...bakery, site: { ...bakery.site, premises }, report: { ...bakery.report, inspected: days, next_due } }
}

describe('the next verification against the usual interval: five years for commercial premises', () => {
  test('the interval runs from the last day of the inspection', () => {
    expect(field('usual_interval', bakery)).toBe(5)
    expect(field('next_due_too_late', inspected('2026-10-12', '2026-10-13', '2031-10-13'))).toBe(false)
    expect(field('next_due_too_late', inspected('2026-10-12', '2026-10-13', '2031-10-14'))).toBe(true)
  })

  test('an inspection of one day runs from that day', () => {
    expect(field('next_due_too_late', inspected('2026-10-12', undefined, '2031-10-13'))).toBe(true)
  })

  test('from the 29th of February the end of February is in time and the first of March is not', () => {
    expect(field('next_due_too_late', inspected('2028-02-29', undefined, '2033-02-28'))).toBe(false)
    expect(field('next_due_too_late', inspected('2028-02-29', undefined, '2033-03-01'))).toBe(true)
  })

  test('public premises, on which the sources differ, and premises that are not stated have no usual interval', () => {
    const install = inspected('2026-10-12', undefined, '2099-01-01', 'public')
    expect(field('usual_interval', install)).toBeUndefined()
    expect(field('next_due_too_late', install)).toBeUndefined()
    const { premises: _left, ...site } = install.site
    expect(field('next_due_too_late', { ...install, site })).toBeUndefined()
  })

  test('without a date there is nothing to compare', () => {
    expect(field('next_due_too_late', bakery)).toBeUndefined()
    const { next_due: _left, ...report } = inspected('2026-10-12', undefined, '2031-10-12').report
    expect(field('next_due_too_late', { ...bakery, report })).toBeUndefined()
  })
})
