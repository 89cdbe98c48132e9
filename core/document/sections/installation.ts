import type { Sheet } from '#core/glossary.ts'
import { islandBudget } from '#core/quantities/budget.ts'
import { fieldsOf } from '#core/sheets/plans.ts'
import { shown } from '#core/texts/value.ts'
import { singleLine } from '../diagram/single-line.ts'
import type { Block, Particular, Section } from '../model.ts'
import { budgetCurve } from '../plots/budget-curve.ts'
import { printed, type ReportScene, sheetsOf } from '../scene.ts'

/** Terms and details of the fields named, those without a value left out. */
export function particulars(sheet: Sheet, names: readonly string[]): Particular[] {
  const fields = fieldsOf(sheet.subject)
  return names
    .filter((name) => sheet.values[name] !== undefined)
    .map((name) => ({ term: fields.get(name)?.title ?? name, detail: printed(sheet, name) }))
}

const given = (term: string, detail: string | undefined): Particular[] =>
  detail === undefined || detail === '' ? [] : [{ term, detail }]

function ofSubject(
  scene: ReportScene,
  subject: Sheet['subject'],
  title: (sheet: Sheet) => string,
  names: readonly string[],
): Block[] {
  return sheetsOf(scene, subject).flatMap((sheet) => {
    const rows = particulars(sheet, names)
    const anchor = `${subject}/${sheet.id}`
    return rows.length === 0
      ? []
      : [
          { anchor, heading: title(sheet) },
          { anchor: `${anchor}/particulars`, particulars: rows },
        ]
  })
}

/** Site, parties, supply and earthing: what was verified, and for whom. */
export function premises(scene: ReportScene): Section {
  const { site, report, people, supply } = scene.judged.install
  const person = (role: 'designed_by' | 'installed_by' | 'tested_by'): string | undefined => {
    const found = people?.[role]
    return (
      found &&
      [found.name, found.company, found.licence && `licence ${found.licence}`]
        .filter((part) => part !== undefined)
        .join(', ')
    )
  }
  const dates =
    report.inspected &&
    (report.inspected.to ? `${report.inspected.from} to ${report.inspected.to}` : report.inspected.from)
  return {
    anchor: 'premises',
    title: 'Installation and supply',
    blocks: [
      {
        anchor: 'premises/particulars',
        particulars: [
          ...given('Site', [site.name, ...site.address].join(', ')),
          ...given('Customer', site.customer),
          ...given('Premises', site.premises),
          ...given('Purpose', report.purpose),
          ...given('Inspected', dates),
          ...given('Next verification', report.next_due),
          ...given('Extent', report.extent),
          ...given('Grid operator', supply.operator),
          ...given('Designed by', person('designed_by')),
          ...given('Installed by', person('installed_by')),
          ...given('Tested by', person('tested_by')),
        ],
      },
      ...ofSubject(scene, 'supply', () => 'Supply', [
        'earthing_system',
        'voltage',
        'phases',
        'frequency',
        'main_kind',
        'main_rated',
        'main_breaking',
        'loop_impedance',
        'fault_current',
        'separation_required',
        'separation_stated_in',
      ]),
      ...ofSubject(scene, 'earthing', () => 'Earthing and bonding', [
        'electrode_kind',
        'electrode_resistance',
        'earthing_conductor',
        'earthing_conductor_minimum',
        'bonding_count',
        'bonding_smallest',
        'bonding_minimum',
        'bonding_continuity',
      ]),
    ],
  }
}

/** The diagram in both states. */
export function diagram({ judged }: ReportScene): Section {
  const { install, topology } = judged
  const width = '100%'
  return {
    anchor: 'diagram',
    title: 'Single-line diagram',
    newPage: true,
    blocks: [
      {
        anchor: 'diagram/grid',
        figure: {
          svg: singleLine(install, topology, 'grid'),
          width,
          caption:
            'On the grid. Live parts in ink; the link between neutral and earth that is closed in this state is marked N–PE.',
        },
      },
      {
        anchor: 'diagram/island',
        figure: {
          svg: singleLine(install, topology, 'island'),
          width,
          caption:
            'In the island. Dead parts are pale and dashed; the grid contact is open; the lamp’s colour marks the source.',
        },
      },
    ],
  }
}

/** The changeover, the sources behind it and the meter, as built and as set. */
export function sources(scene: ReportScene): Section {
  const { signals } = scene.judged.install.changeover
  return {
    anchor: 'sources',
    title: 'Changeover and sources',
    blocks: [
      ...ofSubject(scene, 'changeover', ({ id }) => `Changeover ${id}`, [
        'operation',
        'poles',
        'switched_poles',
        'rated_current',
        'upstream_rating',
        'through_current',
        'inverter_current',
        'fault_current_at_device',
        'short_circuit_rating',
        'neutral_link',
        'neutral_opens',
        'lost_neutral_voltage',
        'interlocks',
      ]),
      ...(signals === undefined || signals.length === 0
        ? []
        : [
            {
              anchor: 'changeover/signals',
              table: {
                caption: 'Signals between changeover and inverter',
                columns: [
                  { title: 'Signal', look: '' as const },
                  { title: 'Terminal as labelled', look: '' as const },
                  { title: 'Terminal as configured', look: '' as const },
                ],
                rows: signals.map(({ role, terminal, configured }) => ({
                  anchor: `changeover/signals/${role}`,
                  head: role,
                  cells: [{ text: terminal }, { text: configured }],
                  look: '' as const,
                })),
              },
            },
          ]),
      ...ofSubject(scene, 'inverter', ({ id }) => `Inverter ${id}`, [
        'phases',
        'rated_power',
        'island_continuous',
        'island_peak',
        'island_peak_time',
        'island_fault_current',
        'shuts_down_within',
        'residual_monitoring',
        'separation',
        'u_high',
        'u_low',
        'f_high',
        'f_low',
        'reconnect_after',
        'island_voltage',
        'held_back_charge',
        'low_charge_alarm',
        'country_profile',
      ]),
      ...ofSubject(scene, 'battery', ({ id }) => `Battery ${id}`, [
        'chemistry',
        'usable',
        'max_discharge',
        'efficiency',
        'place',
        'discharge_limit',
        'held_back_energy',
        'autonomy',
        'autonomy_must_run',
        'ventilation',
        'vent_opening',
      ]),
      ...ofSubject(scene, 'meter', ({ id }) => `Meter ${id}`, [
        'place',
        'rated_current',
        'direction',
        'neutral_reference',
      ]),
      ...ofSubject(scene, 'bus', () => 'Link of the meter', [
        'kind',
        'address',
        'terminated_at',
        'termination_expected',
        'measured_across',
        'length',
        'length_limit',
        'bias_voltage',
      ]),
    ],
  }
}

/** Whether the island bears its loads, and for how long. */
export function island(scene: ReportScene): Section {
  const { install, topology, book } = scene.judged
  const budget = islandBudget({ install, topology, parameters: book.parameters })
  const loads = sheetsOf(scene, 'inverter').filter(({ values }) => values['forms_island'] === true)
  const rows = loads.map((sheet) => ({
    anchor: `inverter/${sheet.id}/budget`,
    head: sheet.id,
    cells: ['phase_load', 'phase_limit', 'starting_current', 'phase_peak_limit', 'total_load'].map((name) => ({
      text: shown(sheet.values[name], fieldsOf('inverter').get(name)?.unit ?? ''),
    })),
    look: '' as const,
  }))
  const blocks: Block[] = [
    ...(rows.length === 0
      ? []
      : [
          {
            anchor: 'island/power',
            table: {
              caption: 'Power in the island',
              columns: [
                { title: 'Inverter', width: '10%', look: '' as const },
                { title: 'Load of each line', width: '30%', look: '' as const },
                ...['Limit a line', 'Largest start', 'Peak a line', 'Whole load'].map((title) => ({
                  title,
                  look: '' as const,
                })),
              ],
              rows,
            },
          },
        ]),
    ...(budget
      ? [
          {
            anchor: 'island/energy',
            figure: {
              svg: budgetCurve(budget),
              width: '100%',
              caption: `Charge over two days. ${budget.model} Solid: all backed-up loads without sun; dashed: what must run. ${budget.source}`,
            },
          },
        ]
      : []),
  ]
  return { anchor: 'island', title: 'The island’s budget', blocks }
}
