import type { Cable } from '#core/install.ts'
import capacities from '#schemas/tables/current-carrying-capacity.json' with { type: 'json' }
import groups from '#schemas/tables/grouping-factors.json' with { type: 'json' }

type Rows<Cell> = Readonly<Record<string, Cell | undefined>>
const CAPACITIES: Rows<Rows<Rows<number>>> = capacities.rows
const FACTORS: Rows<readonly number[]> = groups.rows

/** °C: highest operating temperature of the conductor, IEC 60364-5-52, Table 52.1. */
const HIGHEST = { pvc: 70, xlpe: 90 } as const

function inGround(method: Cable['method']): boolean {
  return method === 'D1' || method === 'D2'
}

/** °C that the capacity table is made for: 20 in the ground, 30 in air (IEC 60364-5-52, B.52.2 to B.52.5). */
export function referenceTemperature(method: Cable['method']): number {
  return inGround(method) ? 20 : 30
}

/**
 * Tabulated capacity in A of one conductor of a cable that lies alone at the reference temperature.
 *
 * @param loaded count of current-carrying conductors
 * @returns undefined where insulation or method is not stated, for aluminium, and for sizes outside 1.5 to 95 mm²
 * @source IEC 60364-5-52:2009, Tables B.52.2 to B.52.5, as transcribed
 */
export function tabulatedCapacity(cable: Cable, loaded: 2 | 3): number | undefined {
  const { insulation, method, material, line } = cable
  if (material !== 'copper' || insulation === undefined || method === undefined) return undefined
  return CAPACITIES[`${insulation} ${loaded}`]?.[String(line)]?.[method]
}

/**
 * Factor for the ambient temperature: √((θmax − θa)/(θmax − θref)), rounded to two decimals as tabulated.
 *
 * @param ambient θa in °C; tabulated from 10 °C, to 60 °C (PVC) or 80 °C (XLPE)
 * @returns 1 where no temperature is stated; undefined where θmax is unknown, or reached by the ambient temperature
 * @source IEC 60364-5-52:2009, Tables B.52.14 and B.52.15; the formula gives every cell of both
 */
export function ambientFactor({ ambient, insulation, method }: Cable): number | undefined {
  if (ambient === undefined) return 1
  if (insulation === undefined) return undefined
  const highest = HIGHEST[insulation]
  if (ambient >= highest) return undefined
  return Math.round(100 * Math.sqrt((highest - ambient) / (highest - referenceTemperature(method)))) / 100
}

/**
 * Factor for circuits that lie together. A count between two columns of the table takes the next larger column. Cables
 * in the ground take the rows for touching cables or ducts, however their group is described.
 *
 * @returns 1 where no group is stated; undefined beyond the end of a row that still falls
 * @source IEC 60364-5-52:2009, Tables B.52.17 to B.52.19, as transcribed
 */
export function groupingFactor({ grouped, method }: Cable): number | undefined {
  if (grouped === undefined) return 1
  const arrangement =
    method === 'D1' ? 'buried in ducts, touching' : method === 'D2' ? 'buried direct, touching' : grouped.as
  const row = FACTORS[arrangement]
  const column = groups.counts.findIndex((count) => count >= grouped.circuits)
  const cell = column < 0 ? undefined : row?.[column]
  return cell ?? (groups.flat.includes(arrangement) ? row?.at(-1) : undefined)
}

/**
 * Current-carrying capacity Iz in A as installed: It × Ca × Cg.
 *
 * @source IEC 60364-5-52, 523; factors multiplied as in a training body's text on reducing capacity
 */
export function capacity(tabulated: number, ambient: number, grouping: number): number {
  return tabulated * ambient * grouping
}

/** Iz of a cable straight from its description; undefined where one of its three factors is. */
export function cableCapacity(cable: Cable, loaded: 2 | 3): number | undefined {
  const tabulated = tabulatedCapacity(cable, loaded)
  const ambient = ambientFactor(cable)
  const grouping = groupingFactor(cable)
  if (tabulated === undefined || ambient === undefined || grouping === undefined) return undefined
  return capacity(tabulated, ambient, grouping)
}
