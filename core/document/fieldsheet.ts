import type { Judged } from '#core/engine.ts'
import type { Sheet, State } from '#core/glossary.ts'
import { shown } from '#core/texts/value.ts'
import type { Block, Row, Section } from './model.ts'
import { printed } from './scene.ts'
import { CAUTIONS } from './sections/findings.ts'

const BOX =
  '<svg role="img" aria-label="box for the reading" viewBox="0 0 100 16" width="100%"><rect x="1" y="1" width="98" height="14" rx="1.5" stroke="#6d8494" stroke-width="0.9" fill="none"/></svg>'

interface Point {
  readonly subject: string
  readonly what: string
  readonly limit: string
  /** The reading that the file has already. */
  readonly taken: string
}

const bySubject = (judged: Judged, subject: Sheet['subject']): readonly Sheet[] =>
  judged.sheets.filter((sheet) => sheet.subject === subject)

function point(sheet: Sheet, name: string, what: string, limit: string, state?: State): Point {
  const taken = printed(sheet, name, state)
  return { subject: sheet.id, what, limit, taken: taken === '–' ? '' : taken }
}

const most = (sheet: Sheet, name: string, unit: string): string =>
  sheet.values[name] === undefined ? 'no limit known' : `at most ${shown(sheet.values[name], unit)}`
const least = (sheet: Sheet, name: string, unit: string): string =>
  sheet.values[name] === undefined ? 'no limit known' : `at least ${shown(sheet.values[name], unit)}`

function dead(judged: Judged): Point[] {
  return [
    ...bySubject(judged, 'earthing').map((sheet) =>
      point(
        sheet,
        'electrode_resistance',
        'Resistance of the electrode',
        sheet.values['electrode_limit'] === undefined ? 'write it down' : most(sheet, 'electrode_limit', 'Ω'),
      ),
    ),
    ...bySubject(judged, 'circuit').flatMap((sheet) => [
      point(
        sheet,
        'continuity',
        'Continuity R1 + R2',
        `near ${printed(sheet, 'continuity_expected')}, ${most(sheet, 'continuity_highest', 'Ω')}`,
      ),
      point(
        sheet,
        'insulation',
        `Insulation at ${printed(sheet, 'insulation_test_voltage')}`,
        least(sheet, 'insulation_minimum', 'MΩ'),
      ),
      point(sheet, 'polarity', 'Polarity', 'correct'),
    ]),
    ...bySubject(judged, 'bus').map((sheet) =>
      point(
        sheet,
        'measured_across',
        'Across the pair of the meter’s link, power off',
        `near ${printed(sheet, 'termination_expected')}`,
      ),
    ),
    ...bySubject(judged, 'string').flatMap((sheet) => [
      point(sheet, 'polarity', 'Polarity of the string', 'correct'),
      point(
        sheet,
        'voc',
        'Open-circuit voltage',
        sheet.values['voc_expected'] === undefined ? 'with cell temperature' : `near ${printed(sheet, 'voc_expected')}`,
      ),
      point(
        sheet,
        'isc',
        'Short-circuit current',
        sheet.values['isc_expected'] === undefined ? 'with irradiance' : `near ${printed(sheet, 'isc_expected')}`,
      ),
      point(sheet, 'irradiance', 'Irradiance in the plane', 'at least 400 W/m²'),
      point(sheet, 'cell_temperature', 'Cell temperature', 'write it down'),
      point(
        sheet,
        'insulation',
        `Insulation at ${printed(sheet, 'insulation_test_voltage')}`,
        least(sheet, 'insulation_minimum', 'MΩ'),
      ),
    ]),
  ]
}

function residual(sheet: Sheet, state: State): Point[] {
  return [
    point(sheet, 'half', 'Half the rated residual current', 'no trip', state),
    point(
      sheet,
      'rated',
      'Rated residual current',
      `${sheet.values['time_minimum_rated'] === undefined ? '' : `${least(sheet, 'time_minimum_rated', 'ms')}, `}${most(sheet, 'time_limit_rated', 'ms')}`,
      state,
    ),
    point(sheet, 'five_times', 'Five times', most(sheet, 'time_limit_five_times', 'ms'), state),
    point(
      sheet,
      'ramp',
      'Rising residual current',
      `${printed(sheet, 'ramp_minimum')} to ${printed(sheet, 'ramp_maximum')}`,
      state,
    ),
  ]
}

function live(judged: Judged, state: State): Point[] {
  const [whole] = bySubject(judged, 'installation')
  const lines = whole?.values['phases'] === 3 ? ['L1', 'L2', 'L3'] : ['L1']
  const band = whole
    ? `${shown(whole.values['voltage_floor'], 'V')} to ${shown(whole.values['voltage_ceiling'], 'V')}`
    : ''
  return [
    ...(whole ? lines.map((line) => point(whole, `voltage_${line}`, `Voltage ${line} to neutral`, band, state)) : []),
    ...(whole
      ? [
          point(
            whole,
            'frequency',
            'Frequency',
            `${shown(whole.values['frequency_floor'], 'Hz')} to ${shown(whole.values['frequency_ceiling'], 'Hz')}`,
            state,
          ),
          point(whole, 'neutral_to_earth', 'Neutral to earth', 'near 0 V', state),
        ]
      : []),
    ...(whole && lines.length === 3
      ? [
          point(
            whole,
            'rotation',
            'Direction of rotation',
            state === 'grid' ? 'write it down' : 'as on the grid',
            state,
          ),
        ]
      : []),
    ...(whole && state === 'island'
      ? [point(whole, 'link_resistance', 'Link between neutral and earth', 'well below 1 Ω', state)]
      : []),
    ...bySubject(judged, 'circuit')
      .filter(
        (sheet) =>
          sheet.inState[state]['live'] === true &&
          (state === 'grid' || sheet.values['island_disconnection'] === 'overcurrent'),
      )
      .map((sheet) => point(sheet, 'loop', 'Fault-loop impedance', most(sheet, 'loop_limit_measured', 'Ω'), state)),
    ...bySubject(judged, 'residual-current device')
      .filter((sheet) => sheet.inState[state]['live'] === true)
      .flatMap((sheet) => residual(sheet, state)),
  ]
}

function transfers(judged: Judged): Point[] {
  const three = judged.install.supply.nominal.phases === 3
  const poles = three ? ['L1', 'L2', 'L3', 'N'] : ['L1', 'N']
  const found = bySubject(judged, 'transfer')
  const [toIsland, toGrid] = (['island', 'grid'] as const).map((state) =>
    found.find(({ values }) => values['to'] === state),
  )
  const taken = (sheet: Sheet | undefined, name: string): string =>
    sheet && printed(sheet, name) !== '–' ? printed(sheet, name) : ''
  return [
    {
      subject: 'to the island',
      what: 'Open the supply upstream of the changeover: dark after',
      limit: 'write it down',
      taken: taken(toIsland, 'dark_after'),
    },
    {
      subject: 'to the island',
      what: 'Supply restored after',
      limit: 'write it down',
      taken: taken(toIsland, 'restored_after'),
    },
    ...poles.map((pole) => ({
      subject: 'to the island',
      what: `Voltage left on the grid terminal ${pole}`,
      limit: 'near 0 V, at most 50 V',
      taken: taken(toIsland, `grid_${pole}`),
    })),
    {
      subject: 'to the grid',
      what: 'Close the supply: transfer after',
      limit: `at least ${shown(judged.book.parameters.reconnect_after ?? undefined, 's')}`,
      taken: taken(toGrid, 'observed'),
    },
    { subject: 'to the grid', what: 'Interruption', limit: 'write it down', taken: taken(toGrid, 'gap') },
    {
      subject: 'in the island',
      what: 'Largest start: lowest voltage and frequency',
      limit: `at least ${shown(judged.install.supply.nominal.voltage * 0.85, 'V')}`,
      taken: '',
    },
  ]
}

function table(anchor: string, caption: string, points: readonly Point[]): Block {
  const rows = points.map(
    ({ subject, what, limit, taken }, index): Row => ({
      anchor: `${anchor}/${subject}/${index}`,
      head: subject,
      cells: [{ text: what }, { text: limit }, taken === '' ? { svg: BOX } : { text: `${taken} ✓` }],
      look: '',
    }),
  )
  return {
    anchor,
    table: {
      caption,
      columns: [
        { title: 'Point', width: '14%', look: '' },
        { title: 'Test', width: '36%', look: '' },
        { title: 'Held against', width: '27%', look: '' },
        { title: 'Reading', width: '23%', look: '' },
      ],
      rows,
    },
  }
}

const step = (anchor: string, title: string, words: string, points: readonly Point[], newPage?: true): Section => ({
  anchor,
  title,
  blocks: [{ anchor: `${anchor}/words`, paragraph: words }, table(`${anchor}/points`, title, points)],
  ...(newPage && { newPage }),
})

/** The sheet for the site: each test point in the order of the tests, the limit that it is held against, and a box. */
export function fieldsheetModel(judged: Judged): readonly Section[] {
  return [
    {
      anchor: 'cautions',
      title: 'Before you start',
      blocks: [
        { anchor: 'cautions/list', caution: CAUTIONS },
        {
          anchor: 'cautions/who',
          table: {
            caption: 'Who, when, with what',
            columns: [
              { title: '', width: '13%', look: '' },
              { title: 'Name', width: '27%', look: '' },
              { title: 'Date', width: '20%', look: '' },
              { title: 'Instrument and serial number', width: '40%', look: '' },
            ],
            rows: [
              {
                anchor: 'cautions/who/row',
                head: 'Tested by',
                cells: [{ svg: BOX }, { svg: BOX }, { svg: BOX }],
                look: '',
              },
            ],
          },
        },
      ],
    },
    step(
      'dead',
      'Dead',
      'All sources off, locked and proved dead. Take electronics and surge protection off before the insulation test. If a test fails, mend it and repeat those before it that it may have spoilt.',
      dead(judged),
    ),
    step(
      'grid',
      'On the grid',
      'Energise in order: grid, inverter, battery, array; the makers’ order comes first.',
      live(judged, 'grid'),
    ),
    step(
      'transfer',
      'Changeover, both ways',
      'Open the supply upstream of the changeover, not at the inverter. Before anything else prove that every grid terminal is dead.',
      transfers(judged),
    ),
    step(
      'island',
      'In the island',
      'A reading taken on the grid never stands in for the island. Prove the link between neutral and earth first.',
      live(judged, 'island'),
    ),
  ]
}
