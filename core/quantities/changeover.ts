import type { Changeover } from '#core/install.ts'
import { distributionCableQuantities } from './cable-distribution.ts'
import { backedUpPower, circuitsWithoutLoad, inverterCurrent, switchedPoles } from './changeover-load.ts'
import { highestLostNeutral } from './changeover-lost-neutral.ts'
import { loadsByLine, mostLoadedLine } from './circuit-network.ts'
import { faultCurrentAlong } from './loop-impedance.ts'
import { usable } from './loop-reading.ts'
import { resistanceToDevice } from './loop-route.ts'
import { upstreamDevice } from './overcurrent-upstream.ts'
import type { Family } from './quantity.ts'

/** Everything computed for the changeover. */
export const changeoverFamily: Family<Changeover> = {
  subject: 'changeover',
  quantities: [
    {
      name: 'upstream_rating',
      unit: 'A',
      title: 'Rating of the overcurrent device upstream',
      formula: 'the nearest overcurrent device above, else the main protection',
      source: 'IEC 60364-5-53, 536.4.3.2, as quoted in a trade body bulletin (2019)',
      from: ['fed_from', 'overcurrent', 'supply.main_protection'],
      compute: ({ id }, scene) => upstreamDevice(id, scene).rated,
    },
    {
      name: 'through_current',
      unit: 'A',
      title: 'Load of the backed-up side on its most loaded line',
      formula: 'largest over the lines of Σ design currents of backed-up circuits whose load is stated',
      source: 'own choice, without diversity',
      from: ['circuits', 'fed_from'],
      compute: ({ id }, scene) => mostLoadedLine(id, scene).current,
    },
    {
      name: 'circuits_without_load',
      unit: '',
      title: 'Backed-up circuits whose load is not stated',
      formula: 'backed-up circuits without power and current',
      source: 'own choice',
      from: ['circuits', 'fed_from'],
      compute: (_changeover, scene) => circuitsWithoutLoad(scene),
    },
    {
      name: 'switched_poles',
      unit: '',
      title: 'What it opens towards the grid',
      formula: 'all poles with a pole more than the supply has lines, line poles with as many',
      source: 'IET Wiring Matters 84 (2021): two poles on single-phase, four on three-phase',
      from: ['poles', 'supply.nominal.phases'],
      compute: ({ poles }, { install }) => switchedPoles(poles, install.supply.nominal.phases),
    },
    {
      name: 'inverter_current',
      unit: 'A',
      title: 'Rated current of the backed-up inverters on their most loaded line',
      formula: 'largest over the lines of Σ rated power / (lines · U0)',
      source: 'definition of apparent power',
      from: ['inverters.rated_power', 'inverters.phases', 'inverters.line', 'supply.nominal.voltage'],
      compute: (_changeover, scene) => inverterCurrent(scene),
    },
    {
      name: 'backed_up_power',
      unit: 'W',
      title: 'Stated load of the backed-up side',
      formula: 'Σ active power of backed-up circuits',
      source: 'definition of active power',
      from: ['circuits', 'fed_from'],
      compute: (_changeover, scene) => backedUpPower(scene),
    },
    {
      name: 'lost_neutral_voltage',
      unit: 'V',
      title: 'Highest voltage at backed-up loads if the neutral is lost',
      formula: 'largest |Ei − Σ(E · Y) / ΣY| over the loaded lines, Y = P / U0²',
      source: 'nodal analysis (Millman); loads taken as resistances in star',
      from: ['circuits', 'fed_from', 'supply.nominal.voltage'],
      compute: ({ id }, scene) => {
        const loads = loadsByLine(id, scene)
        const currents = scene.topology.lines.map((line) => loads[line]?.active ?? 0)
        return currents.length === 3 ? highestLostNeutral(scene.install.supply.nominal.voltage, currents) : undefined
      },
    },
    {
      name: 'backed_up_circuits',
      unit: '',
      title: 'Circuits that live on in the island',
      formula: 'circuits below the changeover',
      source: 'the tree of supply',
      from: ['fed_from'],
      compute: (_changeover, { topology }) => topology.circuits.backedUp,
    },
    {
      name: 'grid_only_circuits',
      unit: '',
      title: 'Circuits that are dead in the island',
      formula: 'circuits not below the changeover',
      source: 'the tree of supply',
      from: ['fed_from'],
      compute: (_changeover, { topology }) => topology.circuits.gridOnly,
    },
    {
      name: 'fault_current_at_device',
      unit: 'A',
      title: 'Prospective fault current at the changeover',
      formula: 'U0 / √((U0 / Ipf)² + (ΣR)²), R of line and better return of the cables above, cold',
      source: 'Z = √(ΣR² + ΣX²): short-circuit study after IEC 60909; source taken as reactive, on the safe side',
      from: ['supply.fault_current', 'supply.nominal.voltage', 'fed_from'],
      compute: ({ id }, scene) => {
        const origin = usable(scene.install.supply.fault_current)
        const resistance = resistanceToDevice(id, scene)
        if (origin === undefined || resistance === undefined) return undefined
        return faultCurrentAlong(scene.install.supply.nominal.voltage, origin, resistance)
      },
    },
    ...distributionCableQuantities<Changeover>(({ id }) => id),
  ],
}
