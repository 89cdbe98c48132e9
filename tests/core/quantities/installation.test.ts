import { describe, expect, test } from 'vitest'
import type { StringReadings } from '#core/install/readings.ts'
import type { Install } from '#core/install.ts'
import { installationFamily } from '#core/quantities/installation.ts'
import { solarNoon, sunPosition } from '#core/quantities/sun.ts'
import { bakery } from '../topology/bakery.ts'
import { compute, sceneOf } from './circuit-scene.ts'

const position = { latitude: 47.31, longitude: 9.64 }
const quantities = (install: Install) => compute(installationFamily, install, sceneOf(install))

describe('counts', () => {
  test('the bakery: one link on the grid, one in the island; two circuits live on, one does not', () => {
    expect(quantities(bakery)).toMatchObject({
      neutral_earth_links: { grid: 1, island: 1 },
      backed_up_circuits: 2,
      grid_only_circuits: 1,
    })
  })

  test('a link that stays closed makes two on the grid; none at all leaves the island without', () => {
    const withLink = (neutral_link: 'fixed' | 'none') => ({
      ...bakery,
      changeover: { ...bakery.changeover, neutral_link },
    })
    expect(quantities(withLink('fixed')).neutral_earth_links).toEqual({ grid: 2, island: 1 })
    expect(quantities(withLink('none')).neutral_earth_links).toEqual({ grid: 1, island: 0 })
  })
})

describe('fault current through the changeover', () => {
  const supplied = (supply: Partial<Install['supply']>): Install => ({
    ...bakery,
    supply: { ...bakery.supply, ...supply },
  })

  test('the grid’s 2.1 kA outweigh the inverter’s 24 A', () => {
    expect(quantities(bakery).through_fault_current).toBe(2100)
  })

  test('a loop that drives more than the stated fault current counts', () => {
    expect(quantities(supplied({ loop_impedance: { value: 0.1 } })).through_fault_current).toBeCloseTo(2300, 9)
  })

  test('a weak grid: the inverter’s own current counts', () => {
    const { loop_impedance: _none, ...supply } = { ...bakery.supply, fault_current: { value: 20 } }
    expect(quantities({ ...bakery, supply }).through_fault_current).toBe(24)
  })

  test('an inverter that does not state its own takes nothing away', () => {
    const INV = { fed_from: 'CO.load', phases: 3, rated_power: 10_000 } as const
    expect(quantities({ ...bakery, inverters: { INV } }).through_fault_current).toBe(2100)
  })

  test('not read, or beyond the instrument: not known', () => {
    const { fault_current: _none, ...supply } = bakery.supply
    expect(quantities({ ...bakery, supply }).through_fault_current).toBeUndefined()
    const beyond = supplied({ fault_current: { value: 20_000, bound: 'above' } })
    expect(quantities(beyond).through_fault_current).toBeUndefined()
  })
})

describe('height of the sun at the inspection', () => {
  const at = (strings: readonly (StringReadings | { not_tested: string })[]): Install => ({
    ...bakery,
    site: { ...bakery.site, position },
    report: { ...bakery.report, inspected: { from: '2026-10-12' } },
    readings: { arrays: { A1: { not_tested: 'locked' }, A2: { strings } } },
  })

  test('at the first string reading that states its time', () => {
    const strings = [{ not_tested: 'roof wet' }, { voc: { value: 600 } }, { taken: '2026-10-12T11:40+02:00' }]
    const expected = sunPosition(new Date('2026-10-12T09:40:00Z'), position).elevation
    expect(quantities(at(strings)).sun_elevation).toBe(expected)
  })

  test('else at noon by the sun on the first day: 90° less latitude and declination', () => {
    const elevation = quantities(at([])).sun_elevation
    expect(elevation).toBe(sunPosition(solarNoon('2026-10-12', position), position).elevation)
    // Declination on 12 October: about −7.5°.
    expect(elevation).toBeCloseTo(90 - 47.31 - 7.5, 0)
  })

  test('no position, or no date: not known', () => {
    const { position: _none, ...site } = at([]).site
    expect(quantities({ ...at([]), site }).sun_elevation).toBeUndefined()
    expect(quantities({ ...at([{ taken: '2026-10-12T11:40+02:00' }]), site }).sun_elevation).toBeUndefined()
    expect(quantities({ ...bakery, site: { ...bakery.site, position } }).sun_elevation).toBeUndefined()
  })
})
