import type { EarthingArrangement } from '#core/install/earthing.ts'
import { knownNumber } from './circuit-item.ts'
import { bondingMinimum, earthingConductorMinimum, electrodeLimit } from './earthing-minimum.ts'
import type { Family, Scene } from './quantity.ts'

function residualCurrents({ install }: Scene): number[] {
  const devices = Object.values(install.residual_current ?? {}).map(({ residual }) => residual)
  const inCircuits = Object.values(install.circuits ?? {}).flatMap(
    ({ residual_current }) => residual_current?.residual ?? [],
  )
  return [...devices, ...inCircuits]
}

/** Everything computed for the earthing arrangement. */
export const earthingFamily: Family<EarthingArrangement> = {
  subject: 'earthing',
  quantities: [
    {
      name: 'earthing_conductor_minimum',
      unit: 'mm²',
      title: 'Smallest earthing conductor',
      formula: 'by the rule book; 16 mm² with lightning protection',
      source: 'IEC 60364-5-54, 542.3.1, as in the Korean transcription',
      from: ['book.earthing_conductor_minimum', 'earthing.lightning_protection'],
      compute: ({ lightning_protection }, { parameters }) =>
        earthingConductorMinimum(parameters.earthing_conductor_minimum, lightning_protection ?? false),
    },
    {
      name: 'bonding_minimum',
      unit: 'mm²',
      title: 'Smallest main bonding conductor',
      formula: 'half the earthing conductor, at least by the rule book, 25 mm² is enough',
      source: 'IEC 60364-5-54, 544.1.1',
      from: ['earthing.earthing_conductor', 'supply.earthing', 'book.bonding_minimum', 'book.bonding_minimum_combined'],
      compute: ({ earthing_conductor }, { install, parameters }) => {
        if (earthing_conductor === undefined) return undefined
        const { bonding_minimum, bonding_minimum_combined } = parameters
        return bondingMinimum(earthing_conductor, install.supply.earthing, bonding_minimum, bonding_minimum_combined)
      },
    },
    {
      name: 'largest_residual',
      unit: 'mA',
      title: 'Largest rated residual current of the file',
      formula: 'largest over residual-current devices and circuits with such protection',
      source: 'the file',
      from: ['residual_current', 'circuits.residual_current'],
      compute: (_earthing, scene) => {
        const currents = residualCurrents(scene)
        return currents.length === 0 ? undefined : Math.max(...currents)
      },
    },
    {
      name: 'electrode_limit',
      unit: 'Ω',
      title: 'Highest resistance of the electrode for the least sensitive device',
      formula: 'UL / IΔn',
      source: 'IEC 60364-4-41, 411.5.3',
      from: ['largest_residual', 'book.touch_voltage'],
      compute: (_earthing, { parameters }, known) => {
        const residual = knownNumber(known, 'largest_residual')
        return residual === undefined ? undefined : electrodeLimit(parameters.touch_voltage, residual)
      },
    },
  ],
}
