import type { Line } from '#core/glossary.ts'
import type { Inverter } from '#core/install.ts'
import type { Scene } from './quantity.ts'

/**
 * Lines that an inverter feeds: all on three phases or on a single-phase supply, else its own; all where it does not say.
 */
export function linesFed({ phases, line }: Inverter, { topology }: Scene): readonly Line[] {
  return phases === 3 || topology.lines.length === 1 || line === undefined ? topology.lines : [line]
}

/**
 * Highest apparent power in VA that an inverter gives on one line in the island: as stated, else an equal share of its
 * continuous power, or of its rated power where that is all that is known.
 *
 * @source a German trade text on backup supplies: each phase gives one third
 */
export function phaseLimit({ phases, rated_power, island }: Inverter): number {
  return island?.per_phase ?? (island?.continuous ?? rated_power) / phases
}

/** The inverter of that name, where it feeds the island. */
export function islandInverter(id: string, { install, topology }: Scene): Inverter | undefined {
  return topology.inverters.island.includes(id) ? install.inverters?.[id] : undefined
}

/** Inverters that feed a line of the island. */
export function sourcesOf(line: Line, scene: Scene): Inverter[] {
  const { island } = scene.topology.inverters
  return Object.entries(scene.install.inverters ?? {})
    .filter(([id, inverter]) => island.includes(id) && linesFed(inverter, scene).includes(line))
    .map(([, inverter]) => inverter)
}

/**
 * Part of a line's load that an inverter carries, 0 to 1: sources on one line share it by what they can give there.
 *
 * @source sources with the same droop in per unit share in proportion to their ratings (from memory)
 */
export function shareOf(inverter: Inverter, line: Line, scene: Scene): number {
  if (!linesFed(inverter, scene).includes(line)) return 0
  const together = sourcesOf(line, scene).reduce((sum, source) => sum + phaseLimit(source), 0)
  return phaseLimit(inverter) / together
}
