import { expect, test } from 'vitest'
import type { Install, Inverter } from '#core/install.ts'
import { installationPlan } from '#core/sheets/installation.ts'
import { sceneOf } from '../quantities/circuit-scene.ts'
import { bakery, plainCircuit } from '../topology/bakery.ts'

function field(name: string, install: Install) {
  return installationPlan.entered.find((row) => row.name === name)?.value(install, sceneOf(install))
}

const inverter = (more: Partial<Inverter>): Inverter => ({
  fed_from: 'CO.load',
  phases: 3,
  rated_power: 10_000,
  ...more,
})

test('an island set to 230 V is looked at below 218.5 V and above 241.5 V', () => {
  const install = { ...bakery, inverters: { INV: inverter({ settings: { island_voltage: 230 } }) } }
  expect(field('island_voltage', install)).toBe(230)
  expect(field('island_voltage_floor', install)).toBeCloseTo(218.5, 9)
  expect(field('island_voltage_ceiling', install)).toBeCloseTo(241.5, 9)
})

test('only an inverter of the island sets its voltage, and the first that states one speaks', () => {
  const outside = inverter({ fed_from: 'MB', settings: { island_voltage: 240 } })
  const silent = inverter({})
  const speaking = inverter({ settings: { island_voltage: 220 } })
  expect(field('island_voltage', { ...bakery, inverters: { A: outside, B: silent, C: speaking } })).toBe(220)
  expect(field('island_voltage_floor', { ...bakery, inverters: { A: outside, B: silent } })).toBeUndefined()
})

test('what must run is named only where it lives on in the island', () => {
  const load = { power: 100, must_run: true }
  const circuits = {
    K1: plainCircuit('EB', { load }),
    K2: plainCircuit('EB', { load: { power: 100 } }),
    K3: plainCircuit('EB'),
    K7: plainCircuit('MB', { load }),
  }
  expect(field('must_run_circuits', { ...bakery, circuits })).toEqual(['K1'])
})
