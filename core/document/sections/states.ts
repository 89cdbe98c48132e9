import { type Block, badge, type Cell, type Row, type Section } from '../model.ts'
import { bare, printed, type ReportScene, sheetsOf, worstOf } from '../scene.ts'

const POLES = ['L1', 'L2', 'L3', 'N'] as const

function voltages(scene: ReportScene): Block[] {
  const [sheet] = sheetsOf(scene, 'installation')
  if (sheet?.values['found'] !== true) return []
  const phases = Number(sheet.values['phases'])
  const lines = phases === 3 ? (['L1', 'L2', 'L3'] as const) : (['L1'] as const)
  const names = [
    ...lines.map((line) => [`voltage_${line}`, `Voltage ${line} to neutral`] as const),
    ['frequency', 'Frequency'] as const,
    ...(phases === 3 ? [['rotation', 'Direction of rotation'] as const] : []),
    ['neutral_to_earth', 'Neutral to earth'] as const,
    ['link_resistance', 'Link between neutral and earth'] as const,
    ['links_closed', 'Links closed'] as const,
  ]
  const rows = names.map(
    ([name, title]): Row => ({
      anchor: `state/${name}`,
      head: title,
      cells: (['grid', 'island'] as const).map((state): Cell => ({ text: printed(sheet, name, state), look: 'num' })),
      look: '',
    }),
  )
  return [
    {
      anchor: 'states/readings',
      table: {
        caption: 'Readings at the backed-up board',
        columns: [
          { title: 'Reading', width: '50%', look: '' },
          { title: 'on the grid', width: '25%', look: 'num' },
          { title: 'in the island', width: '25%', look: 'num' },
        ],
        rows,
      },
    },
  ]
}

function transfers(scene: ReportScene): Block[] {
  const sheets = sheetsOf(scene, 'transfer')
  if (sheets.length === 0) return []
  const rows = sheets.map((sheet): Row => {
    const toIsland = sheet.values['to'] === 'island'
    const poles = POLES.filter((pole) => sheet.values[`grid_${pole}`] !== undefined).map(
      (pole) => `${pole} ${bare(sheet, `grid_${pole}`)} V`,
    )
    const verdict = worstOf(scene, sheet.id)
    const cells: Cell[] = [
      { text: printed(sheet, 'cause') },
      {
        text: toIsland
          ? `dark after ${printed(sheet, 'dark_after')}, restored after ${printed(sheet, 'restored_after')}`
          : `after ${printed(sheet, 'observed')}, gap ${printed(sheet, 'gap')}`,
      },
      { text: toIsland ? poles.join(', ') || '–' : 'does not apply' },
      { badge: badge(verdict) },
    ]
    return {
      anchor: `transfer/${sheet.id}`,
      head: `to the ${String(sheet.values['to'])}`,
      cells,
      look: verdict.startsWith('fails') ? 'row-fails' : toIsland ? 'row-island' : '',
    }
  })
  return [
    {
      anchor: 'states/transfers',
      table: {
        caption: 'Transfers',
        columns: [
          { title: 'Transfer', width: '14%', look: '' },
          { title: 'Brought about by', width: '24%', look: '' },
          { title: 'Times', width: '25%', look: '' },
          { title: 'Left on the grid terminals', width: '22%', look: '' },
          { title: 'Verdict', width: '15%', look: '' },
        ],
        rows,
      },
    },
  ]
}

function loadSteps(scene: ReportScene): Block[] {
  const sheets = sheetsOf(scene, 'load step')
  if (sheets.length === 0) return []
  const rows = sheets.map(
    (sheet): Row => ({
      anchor: sheet.id.replace(' ', '-'),
      head: printed(sheet, 'step'),
      cells: [
        { text: bare(sheet, 'lowest_voltage'), look: 'num' },
        { text: bare(sheet, 'lowest_frequency'), look: 'num' },
        { text: printed(sheet, 'tripped') },
      ],
      look: '',
    }),
  )
  return [
    {
      anchor: 'states/load-steps',
      table: {
        caption: 'Load steps in the island',
        columns: [
          { title: 'Step', width: '52%', look: '' },
          { title: 'Lowest voltage, V', width: '17%', look: 'num' },
          { title: 'Lowest frequency, Hz', width: '18%', look: 'num' },
          { title: 'Tripped', width: '13%', look: '' },
        ],
        rows,
      },
    },
  ]
}

/** Readings in both states, and the way between them. */
export function states(scene: ReportScene): Section | undefined {
  const blocks = [...voltages(scene), ...transfers(scene), ...loadSteps(scene)]
  return blocks.length === 0
    ? undefined
    : { anchor: 'states', title: 'On the grid, in the island, and between', blocks }
}

/** The list of what was looked at. */
export function inspection({ judged }: ReportScene): Section | undefined {
  const { inspection: items = [], handover } = judged.install
  if (items.length === 0 && !handover) return undefined
  const rows = items.map(
    ({ item, result, note, photo }): Row => ({
      anchor: `inspection/${item}`,
      head: item,
      cells: [
        {
          badge:
            result === 'good'
              ? badge('meets', 'good')
              : result === 'defect'
                ? badge('fails', 'defect')
                : badge('limited', result),
        },
        { text: [note, photo && `photo ${photo}`].filter(Boolean).join('; ') || '–' },
      ],
      look: result === 'defect' ? 'row-fails' : '',
    }),
  )
  const told =
    handover &&
    [
      handover.explained_to &&
        `Explained to ${handover.explained_to}${handover.on === undefined ? '' : ` on ${handover.on}`}.`,
      handover.documents && `Handed over: ${handover.documents.join(', ')}.`,
    ]
      .filter(Boolean)
      .join(' ')
  return {
    anchor: 'inspection',
    title: 'Inspection and handover',
    blocks: [
      ...(rows.length === 0
        ? []
        : [
            {
              anchor: 'inspection/list',
              table: {
                caption: 'What was looked at',
                columns: [
                  { title: 'Item', width: '40%', look: '' as const },
                  { title: 'Result', width: '18%', look: '' as const },
                  { title: 'Note', width: '42%', look: '' as const },
                ],
                rows,
              },
            },
          ]),
      ...(told ? [{ anchor: 'inspection/handover', paragraph: told }] : []),
    ],
  }
}
