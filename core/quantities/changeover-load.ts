import type { Line } from '#core/glossary.ts'
import type { Circuit, Inverter } from '#core/install.ts'
import { circuitPower } from './circuit-design-current.ts'
import type { Scene } from './quantity.ts'

/** What a changeover opens towards the grid. */
export type SwitchedPoles = 'all poles' | 'line poles' | 'not all lines'

/**
 * What a changeover opens by its count of poles: all poles with the neutral (four on three-phase, two on
 * single-phase), the line poles only, or not even all lines.
 *
 * @param phases line conductors of the supply
 * @source IET Wiring Matters 84 (March 2021); common practice for three poles on three-phase
 */
export function switchedPoles(poles: number, phases: number): SwitchedPoles {
  if (poles > phases) return 'all poles'
  return poles === phases ? 'line poles' : 'not all lines'
}

/**
 * Rated current in A of all inverters on the backed-up side together, on the line where it is largest: what may flow
 * back to the grid through the changeover.
 *
 * @returns undefined where there is none, or a single-phase inverter on three lines does not say its line
 */
export function inverterCurrent({ install, topology }: Scene): number | undefined {
  const { lines, nodes } = topology
  const inverters = Object.entries(install.inverters ?? {})
    .filter(([id]) => nodes.get(id)?.backedUp)
    .map(([, inverter]) => inverter)
  const oneLine = ({ phases }: Inverter) => phases === 1 && lines.length > 1
  if (inverters.length === 0 || inverters.some((inverter) => oneLine(inverter) && inverter.line === undefined)) {
    return undefined
  }
  const share = (inverter: Inverter, line: Line) => {
    if (!oneLine(inverter)) return inverter.rated_power / lines.length
    return inverter.line === line ? inverter.rated_power : 0
  }
  const powers = lines.map((line) => inverters.reduce((sum, inverter) => sum + share(inverter, line), 0))
  return Math.max(...powers) / install.supply.nominal.voltage
}

function backedUpCircuits({ install, topology }: Scene): [string, Circuit][] {
  return Object.entries(install.circuits ?? {}).filter(([id]) => topology.live(id, 'island'))
}

/** Active power in W of the backed-up circuits whose load is stated. */
export function backedUpPower(scene: Scene): number {
  const voltage = scene.install.supply.nominal.voltage
  return backedUpCircuits(scene).reduce((sum, [, circuit]) => sum + (circuitPower(circuit, voltage) ?? 0), 0)
}

/** Ids of the backed-up circuits whose load is not stated. */
export function circuitsWithoutLoad(scene: Scene): string[] {
  return backedUpCircuits(scene)
    .filter(([, { load }]) => load?.power === undefined && load?.current === undefined)
    .map(([id]) => id)
}
