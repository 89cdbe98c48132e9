import type { StringReadings } from '#core/install/readings.ts'
import type { Install } from '#core/install.ts'
import { inverterFaultCurrent } from './disconnection-island.ts'
import { faultCurrent } from './loop-impedance.ts'
import { usable } from './loop-reading.ts'
import type { Family, Scene } from './quantity.ts'
import { solarNoon, sunPosition } from './sun.ts'

/** Largest fault current in A that the changeover may have to carry; undefined where the supply's was not read. */
function throughFault(scene: Scene): number | undefined {
  const { nominal, fault_current, loop_impedance } = scene.install.supply
  const prospective = usable(fault_current)
  if (prospective === undefined) return undefined
  const loop = usable(loop_impedance)
  const toEarth = loop === undefined ? 0 : faultCurrent(nominal.voltage, loop)
  const island = scene.topology.lines.map((line) => inverterFaultCurrent(line, scene) ?? 0)
  return Math.max(prospective, toEarth, ...island)
}

function stringReadings({ readings }: Install): StringReadings[] {
  return Object.values(readings?.arrays ?? {}).flatMap(({ strings = [] }) =>
    strings.flatMap((string) => ('not_tested' in string ? [] : string)),
  )
}

/** The moment of the first string reading that states one, else noon by the sun on the first day of the inspection. */
function momentOfInspection(install: Install): Date | undefined {
  const taken = stringReadings(install).find((string) => string.taken !== undefined)?.taken
  if (taken !== undefined) return new Date(taken)
  const { position } = install.site
  const day = install.report.inspected?.from
  return position === undefined || day === undefined ? undefined : solarNoon(day, position)
}

function sunElevation(install: Install): number | undefined {
  const { position } = install.site
  const moment = momentOfInspection(install)
  return position === undefined || moment === undefined ? undefined : sunPosition(moment, position).elevation
}

/** Everything computed for the installation as a whole. */
export const installationFamily: Family<Install> = {
  subject: 'installation',
  quantities: [
    {
      name: 'neutral_earth_links',
      unit: '',
      title: 'Closed links between neutral and earth in each state',
      formula: 'count of links that are closed and connected to the neutral in use',
      source: 'IET Wiring Matters 84 (2021); IEC 60364-5-55, 551.4.3.2.1, as quoted there',
      from: [
        'supply.earthing',
        'changeover.neutral_link',
        'changeover.poles',
        'boards.neutral_link',
        'inverters.neutral_link',
      ],
      compute: (_install, { topology }) => ({
        grid: topology.neutralEarthLinks.grid.length,
        island: topology.neutralEarthLinks.island.length,
      }),
    },
    {
      name: 'through_fault_current',
      unit: 'A',
      title: 'Largest fault current that the changeover may have to carry',
      formula:
        'largest of the prospective fault current at the origin, U0 / Ze, and what the inverters feed on one line',
      source: 'IEC 60364-5-53, 536 (conditional short-circuit current), from memory',
      from: [
        'supply.fault_current',
        'supply.loop_impedance',
        'supply.nominal.voltage',
        'inverters.island.fault_current',
      ],
      compute: (_install, scene) => throughFault(scene),
    },
    {
      name: 'sun_elevation',
      unit: '°',
      title: 'Height of the sun at the inspection',
      formula: 'at the first string reading that states its time, else at noon by the sun on the first day',
      source: 'suncalc 2.0.2 after Meeus, Astronomical Algorithms',
      from: ['site.position', 'readings.arrays.strings.taken', 'report.inspected.from'],
      compute: sunElevation,
    },
    {
      name: 'backed_up_circuits',
      unit: '',
      title: 'Count of circuits that live on in the island',
      formula: 'circuits below the changeover',
      source: 'the tree of supply',
      from: ['circuits', 'fed_from'],
      compute: (_install, { topology }) => topology.circuits.backedUp.length,
    },
    {
      name: 'grid_only_circuits',
      unit: '',
      title: 'Count of circuits that are dead in the island',
      formula: 'circuits not below the changeover',
      source: 'the tree of supply',
      from: ['circuits', 'fed_from'],
      compute: (_install, { topology }) => topology.circuits.gridOnly.length,
    },
  ],
}
