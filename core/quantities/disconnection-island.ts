import type { Line } from '#core/glossary.ts'
import { faultCurrent } from './loop-impedance.ts'
import { islandConductors, loopReading } from './loop-route.ts'
import type { Scene } from './quantity.ts'

/** The line that an inverter feeds; undefined where a single-phase inverter on three lines does not say which. */
function feeds(id: string, line: Line, { install, topology }: Scene): boolean | undefined {
  const inverter = install.inverters?.[id]
  if (inverter?.phases === 3 || topology.lines.length === 1) return true
  return inverter?.line === undefined ? undefined : inverter.line === line
}

/**
 * Current in A that the island's inverters can feed into a fault on one line: the sum of their stated fault currents.
 * Undefined where one of them states none, or does not say which line it feeds; no universal figure exists.
 *
 * @source the inverter's datasheet; IEC 60364-4-41:2005+A1:2017, 419 (from memory)
 */
export function inverterFaultCurrent(line: Line, scene: Scene): number | undefined {
  const { inverters } = scene.topology
  if (inverters.island.length === 0) return undefined
  let sum = 0
  for (const id of inverters.island) {
    const here = feeds(id, line, scene)
    const current = scene.install.inverters?.[id]?.island?.fault_current
    if (here === undefined || current === undefined) return undefined
    sum += here ? current : 0
  }
  return sum
}

/** The loop in Ω that limits a fault in the island: the reading, else the conductors' resistance, else unknown. */
export function islandLoop(id: string, scene: Scene): number | undefined {
  return loopReading(id, 'island', scene) ?? islandConductors(id, scene)
}

/**
 * Smallest fault current in A of a circuit's lines in the island: what the inverters can feed, and no more than U0 drives
 * through the loop where the loop is known.
 *
 * @returns undefined for a circuit that is dead in the island, and where the inverters' fault current is not known
 */
export function islandFaultCurrent(id: string, lines: readonly Line[], scene: Scene): number | undefined {
  if (!scene.topology.live(id, 'island')) return undefined
  const fed = lines.map((line) => inverterFaultCurrent(line, scene))
  const known = fed.filter((current) => current !== undefined)
  if (known.length < fed.length || known.length === 0) return undefined
  const loop = islandLoop(id, scene)
  const drawn = loop === undefined ? Number.POSITIVE_INFINITY : faultCurrent(scene.install.supply.nominal.voltage, loop)
  return Math.min(drawn, ...known)
}

/**
 * Longest time in s until the island's inverters have shut down on a fault; undefined where one of them states none.
 */
export function shutdownTime({ install, topology }: Scene): number | undefined {
  const times = topology.inverters.island.map((id) => install.inverters?.[id]?.island?.shuts_down_within)
  const known = times.filter((time) => time !== undefined)
  return known.length === 0 || known.length < times.length ? undefined : Math.max(...known)
}
