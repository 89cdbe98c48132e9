import type { SheetValue } from '#core/glossary.ts'
import type { Install } from '#core/install.ts'
import type { Parameters } from '#core/quantities/parameters.ts'
import type { Family, Scene } from '#core/quantities/quantity.ts'
import { buildTopology } from '#core/topology/build.ts'

/** Values of the IEC book, as far as circuits need them, and plain ones for the rest. */
export const parameters: Parameters = {
  loop_voltage_factor: 1,
  loop_reading_factor: 2 / 3,
  copper_resistivity: 0.0225,
  aluminium_resistivity: 0.036,
  conductor_reactance: 0.00008,
  voltage_drop_lighting: 3,
  voltage_drop_other: 5,
  touch_voltage: 50,
  electrode_stable: 200,
  additional_residual: 30,
  delayed_minimum_double: 60,
  changeover_neutral: 'switched',
  island_electrode: true,
  earthing_conductor_minimum: 6,
  bonding_minimum: 6,
  bonding_minimum_combined: 10,
  interface_u_high: null,
  interface_u_low: null,
  interface_f_high: null,
  interface_f_low: null,
  reconnect_after: null,
  unbalance: null,
  fuse_currents: 'IEC 60269-1',
  array_band: 'factor',
  array_band_factor: 1.25,
  string_fuse_floor: 1.5,
  string_fuse_ceiling: 2.4,
  array_current_factor: 1.25,
  string_spread: 5,
  ventilation_factor: 0.05,
}

export function sceneOf(install: Install, changed: Partial<Parameters> = {}): Scene {
  const { topology } = buildTopology(install)
  if (!topology) throw new Error('no tree of supply')
  return { install, topology, parameters: { ...parameters, ...changed } }
}

/** All quantities of a family for one item, in the family's order, as the sheets compute them. */
export function compute<Item>(family: Family<Item>, item: Item, scene: Scene): Record<string, SheetValue | undefined> {
  const known: Record<string, SheetValue | undefined> = {}
  for (const quantity of family.quantities) known[quantity.name] = quantity.compute(item, scene, known)
  return known
}
