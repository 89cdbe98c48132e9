import { LINES, type Line, type State } from '#core/glossary.ts'
import type { StateReadings } from '#core/install/readings.ts'
import type { Install } from '#core/install.ts'
import { installationFamily } from '#core/quantities/installation.ts'
import type { Scene } from '#core/quantities/quantity.ts'
import { inspectionFields } from './inspection.ts'
import { intervalFields } from './interval.ts'
import { islandFields } from './island.ts'
import { entered, type SheetPlan, type StateMeasuredField } from './plan.ts'

function stateOf({ install }: Scene, state: State): StateReadings | undefined {
  const readings = install.readings?.states?.[state]
  return readings && !('not_tested' in readings) ? readings : undefined
}

const statePath = (state: State, ...rest: string[]) => ['readings', 'states', state, ...rest]

const voltageOf = (line: Line): StateMeasuredField<Install> => ({
  name: `voltage_${line}`,
  unit: 'V',
  title: `Voltage ${line} to neutral`,
  kind: 'voltage',
  path: (_, state) => statePath(state, 'voltage', line),
  reading: (_, scene, state) => stateOf(scene, state)?.voltage?.[line],
})

/** Where the first defect of the inspection stands. */
function firstWithDefect({ inspection = [] }: Install): (string | number)[] {
  const index = inspection.findIndex(({ result }) => result === 'defect')
  return index === -1 ? ['inspection'] : ['inspection', index, 'result']
}

function itemsWith(install: Install, result: string): string[] {
  return (install.inspection ?? []).filter((entry) => entry.result === result).map(({ item }) => item)
}

/** Names that the two halves of the file hold apart: what was installed and never tested shows here. */
function untested(ids: Iterable<string>, tested: Readonly<Record<string, unknown>> | undefined): string[] {
  return [...ids].filter((id) => !Object.hasOwn(tested ?? {}, id))
}

/** What the rules see of the installation as a whole. */
export const installationPlan: SheetPlan<Install> = {
  subject: 'installation',
  items: ({ install }) => [install],
  id: () => 'installation',
  path: () => [],
  quantities: installationFamily.quantities,
  entered: [
    ...inspectionFields,
    ...intervalFields,
    ...islandFields,
    entered('reference', '', 'Reference of the report', ['report', 'reference'], ({ report }) => report.reference),
    entered('purpose', '', 'Purpose', ['report', 'purpose'], ({ report }) => report.purpose),
    entered(
      'inspected_from',
      '',
      'First day of the inspection',
      ['report', 'inspected', 'from'],
      ({ report }) => report.inspected?.from,
    ),
    entered(
      'inspected_to',
      '',
      'Last day of the inspection',
      ['report', 'inspected', 'to'],
      ({ report }) => report.inspected?.to ?? report.inspected?.from,
    ),
    entered(
      'inspected_backwards',
      '',
      'The last day comes before the first',
      ['report', 'inspected', 'to'],
      ({ report: { inspected } }) => (inspected?.to === undefined ? undefined : inspected.to < inspected.from),
    ),
    entered('next_due', '', 'Next verification due', ['report', 'next_due'], ({ report }) => report.next_due),
    entered(
      'next_due_before_inspection',
      '',
      'The next verification falls before this one',
      ['report', 'next_due'],
      ({ report }) =>
        report.next_due === undefined || report.inspected === undefined
          ? undefined
          : report.next_due <= report.inspected.from,
    ),
    entered('extent', '', 'What the report covers', ['report', 'extent'], ({ report }) => report.extent),
    entered('premises', '', 'Kind of premises', ['site', 'premises'], ({ site }) => site.premises),
    entered('customer', '', 'Customer', ['site', 'customer'], ({ site }) => site.customer),
    entered(
      'phases',
      '',
      'Line conductors of the supply',
      ['supply', 'nominal', 'phases'],
      ({ supply }) => supply.nominal.phases,
    ),
    entered(
      'nominal_voltage',
      'V',
      'Nominal voltage',
      ['supply', 'nominal', 'voltage'],
      ({ supply }) => supply.nominal.voltage,
    ),
    entered(
      'nominal_frequency',
      'Hz',
      'Nominal frequency',
      ['supply', 'nominal', 'frequency'],
      ({ supply }) => supply.nominal.frequency,
    ),
    entered('earthing_system', '', 'Earthing system', ['supply', 'earthing'], ({ supply }) => supply.earthing),
    entered(
      'voltage_floor',
      'V',
      'Nominal voltage less 15 %',
      ['supply', 'nominal', 'voltage'],
      ({ supply }) => supply.nominal.voltage * 0.85,
    ),
    entered(
      'voltage_ceiling',
      'V',
      'Nominal voltage and 10 %',
      ['supply', 'nominal', 'voltage'],
      ({ supply }) => supply.nominal.voltage * 1.1,
    ),
    entered(
      'frequency_floor',
      'Hz',
      'Nominal frequency less 2 %',
      ['supply', 'nominal', 'frequency'],
      ({ supply }) => supply.nominal.frequency * 0.98,
    ),
    entered(
      'frequency_ceiling',
      'Hz',
      'Nominal frequency and 2 %',
      ['supply', 'nominal', 'frequency'],
      ({ supply }) => supply.nominal.frequency * 1.02,
    ),
    entered(
      'found',
      '',
      'Has readings or an inspection',
      ['readings'],
      (install) => install.readings !== undefined || install.inspection !== undefined,
    ),
    entered('has_array', '', 'Has photovoltaics', ['arrays'], ({ arrays }) => Object.keys(arrays ?? {}).length > 0),
    entered(
      'has_battery',
      '',
      'Has a battery',
      ['batteries'],
      ({ batteries }) => Object.keys(batteries ?? {}).length > 0,
    ),
    entered('has_meter', '', 'Has a meter at the connection point', ['meter'], ({ meter }) => meter !== undefined),
    entered(
      'has_residual_current',
      '',
      'Has residual-current protection',
      ['residual_current'],
      ({ residual_current }) => Object.keys(residual_current ?? {}).length > 0,
    ),
    entered(
      'island_sources',
      '',
      'Inverters that feed the island',
      ['inverters'],
      (_, { topology }) => topology.inverters.island,
    ),
    entered('circuits_untested', '', 'Circuits without readings', ['readings', 'circuits'], ({ circuits, readings }) =>
      untested(Object.keys(circuits ?? {}), readings?.circuits),
    ),
    entered(
      'residual_untested',
      '',
      'Residual-current devices without readings',
      ['readings', 'residual_current'],
      ({ residual_current, readings }) => untested(Object.keys(residual_current ?? {}), readings?.residual_current),
    ),
    entered('arrays_untested', '', 'Arrays without readings', ['readings', 'arrays'], ({ arrays, readings }) =>
      untested(Object.keys(arrays ?? {}), readings?.arrays),
    ),
    entered('inspected_items', '', 'Inspection items', ['inspection'], ({ inspection }) =>
      inspection?.map(({ item }) => item),
    ),
    entered('items_with_defect', '', 'Inspection items with a defect', firstWithDefect, (install) =>
      itemsWith(install, 'defect'),
    ),
    entered('items_not_inspected', '', 'Inspection items not inspected', ['inspection'], (install) =>
      itemsWith(install, 'not inspected'),
    ),
    entered('items_with_photo', '', 'Inspection items with a photo', ['inspection'], ({ inspection }) =>
      (inspection ?? []).filter(({ photo }) => photo !== undefined).map(({ item }) => item),
    ),
    entered('defects_without_note', '', 'Defects without a note', ['inspection'], ({ inspection }) =>
      (inspection ?? [])
        .filter(({ result, note }) => result === 'defect' && note === undefined)
        .map(({ item }) => item),
    ),
    entered(
      'transfers_to_island',
      '',
      'Transfers to the island that were tried',
      ['readings', 'transfers'],
      ({ readings }) => (readings?.transfers ?? []).filter(({ to }) => to === 'island').length,
    ),
    entered(
      'transfers_to_grid',
      '',
      'Transfers to the grid that were tried',
      ['readings', 'transfers'],
      ({ readings }) => (readings?.transfers ?? []).filter(({ to }) => to === 'grid').length,
    ),
    entered(
      'load_steps',
      '',
      'Load steps tried in the island',
      ['readings', 'load_steps'],
      ({ readings }) => readings?.load_steps?.length ?? 0,
    ),
    entered(
      'rotation_changes',
      '',
      'The direction of rotation differs between the states',
      ['readings', 'states'],
      (_, scene) => {
        const [grid, island] = [stateOf(scene, 'grid')?.rotation, stateOf(scene, 'island')?.rotation]
        return grid === undefined || island === undefined ? undefined : grid !== island
      },
    ),
    entered(
      'has_tester',
      '',
      'The person who tested is named',
      ['people', 'tested_by'],
      ({ people }) => people?.tested_by !== undefined,
    ),
    entered(
      'has_installer',
      '',
      'The person who installed is named',
      ['people', 'installed_by'],
      ({ people }) => people?.installed_by !== undefined,
    ),
    entered(
      'tested_by_installer',
      '',
      'Tested by the person who installed',
      ['people', 'tested_by'],
      ({ people }) => people?.tested_by?.name === people?.installed_by?.name,
    ),
    entered(
      'handed_over',
      '',
      'Handed over to the customer',
      ['handover'],
      ({ handover }) => handover?.explained_to !== undefined,
    ),
    entered('documents', '', 'Documents handed over', ['handover', 'documents'], ({ handover }) => handover?.documents),
    entered('links_between_boards', '', 'Second ways of supply', ['links'], ({ links }) => Object.keys(links ?? {})),
    entered('instruments_named', '', 'Instruments', ['instruments'], ({ instruments }) =>
      Object.keys(instruments ?? {}),
    ),
  ],
  inState: [
    {
      name: 'rotation',
      unit: '',
      title: 'Direction of rotation',
      at: ['readings', 'states'],
      value: (_, scene, state) => stateOf(scene, state)?.rotation,
    },
    {
      name: 'links_closed',
      unit: '',
      title: 'Links between neutral and earth',
      at: ['changeover', 'neutral_link'],
      value: (_, { topology }, state) => topology.neutralEarthLinks[state].length,
    },
    {
      name: 'has_source',
      unit: '',
      title: 'Has a source',
      at: ['inverters'],
      value: (_, { topology }, state) => state === 'grid' || topology.inverters.island.length > 0,
    },
  ],
  measuredInState: [
    ...LINES.map(voltageOf),
    {
      name: 'frequency',
      unit: 'Hz',
      title: 'Frequency',
      kind: 'frequency',
      path: (_, state) => statePath(state, 'frequency'),
      reading: (_, scene, state) => stateOf(scene, state)?.frequency,
    },
    {
      name: 'neutral_to_earth',
      unit: 'V',
      title: 'Voltage between neutral and earth',
      kind: 'voltage',
      path: (_, state) => statePath(state, 'neutral_to_earth'),
      reading: (_, scene, state) => stateOf(scene, state)?.neutral_to_earth,
    },
    {
      name: 'link_resistance',
      unit: 'Ω',
      title: 'Resistance of the link between neutral and earth',
      kind: 'continuity',
      path: (_, state) => statePath(state, 'link_resistance'),
      reading: (_, scene, state) => stateOf(scene, state)?.link_resistance,
    },
  ],
}
