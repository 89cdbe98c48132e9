import type { Line } from '#core/glossary.ts'
import type { Circuit, Inverter } from '#core/install.ts'
import { circuitDesignCurrent } from './circuit-design-current.ts'
import { nominalVoltage } from './circuit-item.ts'
import { loadsByLine } from './circuit-network.ts'
import { shareOf, sourcesOf } from './inverter-lines.ts'
import type { Scene } from './quantity.ts'

/** A value for each line conductor of the supply. */
export type ByLine = Readonly<Partial<Record<Line, number>>>

/** Circuits that live on in the island. */
export function backedUpCircuits({ install, topology }: Scene): Circuit[] {
  return Object.entries(install.circuits ?? {})
    .filter(([id]) => topology.live(id, 'island'))
    .map(([, circuit]) => circuit)
}

/** Apparent power in VA of the backed-up loads on one line. */
function loadOn(line: Line, scene: Scene): number {
  const current = loadsByLine(scene.install.changeover.id, scene)[line]?.current ?? 0
  return current * nominalVoltage(scene)
}

/**
 * Apparent power in VA of the backed-up loads by line: U0 times the sum of their currents, a load on three lines in equal
 * parts. Loads that state neither power nor current are not in it. No diversity; currents add by their size.
 *
 * @source definition of apparent power; a German trade text: each phase must be checked by itself
 */
export function phaseLoads(scene: Scene): ByLine {
  return Object.fromEntries(scene.topology.lines.map((line) => [line, loadOn(line, scene)]))
}

/** Largest apparent power in VA that an inverter of the island carries on one line, its share of the load there. */
export function largestPhaseLoad(inverter: Inverter, scene: Scene): number {
  return Math.max(...scene.topology.lines.map((line) => loadOn(line, scene) * shareOf(inverter, line, scene)))
}

/** Difference in VA between the most and the least loaded line. */
export function unbalance(loads: ByLine): number {
  const values = Object.values(loads)
  return Math.max(...values) - Math.min(...values)
}

/** Lines with backed-up load that no inverter feeds in the island. */
export function unfedLines(scene: Scene): Line[] {
  return scene.topology.lines.filter((line) => loadOn(line, scene) > 0 && sourcesOf(line, scene).length === 0)
}

/** Current in A of a line at the worst start: everything else runs, and the load with the largest extra current starts. */
function startingOn(line: Line, scene: Scene): number {
  let running = 0
  let extra = 0
  for (const circuit of backedUpCircuits(scene).filter(({ phases }) => phases.includes(line))) {
    const current = circuitDesignCurrent(circuit, nominalVoltage(scene)) ?? 0
    running += current
    extra = Math.max(extra, ((circuit.load?.start ?? 1) - 1) * current)
  }
  return running + extra
}

/**
 * Highest current in A that an inverter of the island carries on one line while the hardest load starts.
 *
 * @source starting current k·I of a motor: pages of motor makers; the worst moment is own choice
 */
export function startingCurrent(inverter: Inverter, scene: Scene): number {
  return Math.max(...scene.topology.lines.map((line) => startingOn(line, scene) * shareOf(inverter, line, scene)))
}
