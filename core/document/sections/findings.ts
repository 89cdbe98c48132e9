import type { Citation } from '#core/glossary.ts'
import type { UncertaintyKind } from '#core/install.ts'
import { bookPage, rulePage } from '#core/judge/pages.ts'
import { uncertaintyOf } from '#core/quantities/uncertainty.ts'
import { atFailureLevel, countVerdicts, type ToldFinding } from '#core/report/told.ts'
import { STATE_WORDS } from '#core/texts/label.ts'
import { type Block, badge, type FindingBlock, type Row, type Section } from '../model.ts'
import type { ReportScene } from '../scene.ts'

const cited = ({ publication, clause, note }: Citation): string =>
  [publication, clause, note].filter((part) => part !== undefined).join(', ')

const anchorOf = ({ rule, subject, state }: ToldFinding): string => `rule/${rule}/${subject}/${state ?? 'either'}`

function findingBlock(finding: ToldFinding, file: string): FindingBlock {
  const { rule, key, subject, state, verdict, severity, message, remedy, range } = finding
  const record = key === null ? undefined : rulePage(key).record
  const word = verdict === 'fails' && severity !== 'failure' ? `${severity}: fails` : verdict
  return {
    badge: badge(verdict, word),
    about: state === null ? subject : `${subject} ${STATE_WORDS[state]}`,
    title: record?.title ?? message,
    message: message.startsWith(record?.title ?? '\n')
      ? message.slice((record?.title ?? '').length + 1).trim()
      : message,
    remedy,
    sources: record ? record.cites.map(cited).join('; ') : '',
    rule,
    place: `${file}, line ${range.line}`,
  }
}

const ORDER: readonly ((finding: ToldFinding) => boolean)[] = [
  atFailureLevel,
  ({ verdict, severity }) => verdict.startsWith('fails') && severity === 'caution',
  ({ verdict }) => verdict === 'limited',
  ({ verdict }) => verdict === 'meets, inside the uncertainty',
  ({ verdict, severity }) => verdict.startsWith('fails') && severity === 'note',
]

/** Everything that is not simply met, worst first, each with its words, its rule and its source. */
export function findings({ told, file }: ReportScene): Section {
  const worded = told.filter(({ verdict }) => verdict !== 'not shown')
  const rank = (finding: ToldFinding): number => {
    const found = ORDER.findIndex((matches) => matches(finding))
    return found === -1 ? ORDER.length : found
  }
  const blocks: Block[] = worded
    .toSorted((a, b) => rank(a) - rank(b))
    .map((finding) => ({ anchor: anchorOf(finding), finding: findingBlock(finding, file) }))
  const open = told.filter(({ verdict }) => verdict === 'not shown')
  const rows = open.map(
    (finding): Row => ({
      anchor: anchorOf(finding),
      head: finding.state === null ? finding.subject : `${finding.subject} ${STATE_WORDS[finding.state]}`,
      cells: [{ text: finding.message }, { text: finding.rule }],
      look: '',
    }),
  )
  const table: Block[] =
    rows.length === 0
      ? []
      : [
          {
            anchor: 'findings/not-shown',
            table: {
              caption: 'Not shown: a reading or an entry is missing',
              columns: [
                { title: 'Subject', width: '17%', look: '' },
                { title: 'What must hold, and what is missing', width: '55%', look: '' },
                { title: 'Rule', width: '28%', look: '' },
              ],
              rows,
            },
          },
        ]
  const none: Block[] =
    blocks.length + rows.length === 0 ? [{ anchor: 'findings/none', paragraph: 'Every rule that applies is met.' }] : []
  return { anchor: 'findings', title: 'Findings', blocks: [...none, ...blocks, ...table] }
}

/** Departures: rules not met on purpose. */
export function departures({ told, judged }: ReportScene): Section | undefined {
  const stated = judged.install.departures ?? []
  if (stated.length === 0) return undefined
  const rows = stated.map(({ rule, subject, reason, agreed_by, on }): Row => {
    const found = told.find((finding) => finding.rule === rule && finding.subject === subject && finding.departure)
    return {
      anchor: `departure/${rule}/${subject}`,
      head: subject,
      cells: [
        { text: rule },
        { text: reason },
        { text: `${agreed_by}, ${on}` },
        { text: found ? 'waits for the reviewer' : 'not needed: the rule is met or does not apply' },
      ],
      look: '',
    }
  })
  return {
    anchor: 'departures',
    title: 'Departures',
    blocks: [
      {
        anchor: 'departures/list',
        table: {
          caption: 'Rules not met on purpose',
          columns: [
            { title: 'Subject', width: '10%', look: '' },
            { title: 'Rule', width: '24%', look: '' },
            { title: 'Reason', width: '32%', look: '' },
            { title: 'Agreed', width: '15%', look: '' },
            { title: 'Standing', width: '19%', look: '' },
          ],
          rows,
        },
      },
    ],
  }
}

const KINDS: readonly (readonly [UncertaintyKind, string])[] = [
  ['insulation', 'insulation'],
  ['loop', 'loop'],
  ['continuity', 'continuity'],
  ['electrode', 'electrode'],
  ['residual_time', 'trip time'],
  ['residual_current', 'trip current'],
]

/** The instruments, and how readings became verdicts. */
export function method({ judged, sourceHash, file }: ReportScene): Section {
  const { instruments = {} } = judged.install
  const { book } = judged
  const rows = Object.entries(instruments).map(
    ([id, { kind, serial, calibrated, due }]): Row => ({
      anchor: `instrument/${id}`,
      head: id,
      cells: [{ text: kind }, { text: serial }, { text: calibrated }, { text: due }],
      look: '',
    }),
  )
  const widths = KINDS.map(([kind, name]) => `${name} ±${uncertaintyOf(kind).percent} %`).join(', ')
  return {
    anchor: 'method',
    title: 'Instruments and method',
    blocks: [
      ...(rows.length === 0
        ? []
        : [
            {
              anchor: 'method/instruments',
              table: {
                caption: 'Instruments',
                columns: [
                  { title: 'Name', width: '10%', look: '' as const },
                  { title: 'Kind', width: '38%', look: '' as const },
                  { title: 'Serial number', width: '20%', look: '' as const },
                  { title: 'Calibrated', width: '16%', look: '' as const },
                  { title: 'Due', width: '16%', look: '' as const },
                ],
                rows,
              },
            },
          ]),
      {
        anchor: 'method/rule',
        paragraph: `Decision rule: simple acceptance. A reading meets its limit when it lies on the right side of it; at the limit itself the risk of a wrong decision is up to one half. Each reading is also judged at both ends of its uncertainty, and a verdict that would change there says so. Unless the instrument states its own, the widest that IEC 61557 permits is taken: ${widths}.`,
      },
      {
        anchor: 'method/book',
        paragraph: `Judged by the rule book ${book.id} ${book.version}, “${book.title}”, with the hash ${book.hash}. The file ${file} is embedded in this document as it was entered (SHA-256 ${sourceHash}), and so is every computed quantity with its formula and source. The results relate to the installation as it was found on the days stated.`,
      },
    ],
  }
}

/** Every rule that was judged, with its verdicts and its source. */
export function rules({ judged }: ReportScene): Section {
  const { book, findings: all } = judged
  const rows = book.rules.flatMap(({ id, key }): Row[] => {
    const { record } = rulePage(key)
    const counts = countVerdicts(all.filter(({ rule }) => rule === id))
    const words = (
      [
        'meets',
        'meets, inside the uncertainty',
        'fails, inside the uncertainty',
        'fails',
        'not shown',
        'limited',
      ] as const
    )
      .filter((verdict) => counts[verdict] > 0)
      .map((verdict) => `${counts[verdict]} ${verdict}`)
    return words.length === 0
      ? []
      : [
          {
            anchor: `rule/${id}`,
            head: record.title,
            cells: [{ text: words.join(', ') }, { text: record.cites.map(cited).join('; ') }],
            look: '',
          },
        ]
  })
  const idle = book.rules.length - rows.length
  return {
    anchor: 'rules',
    title: 'Rules judged',
    newPage: true,
    blocks: [
      {
        anchor: 'rules/words',
        paragraph: `${rows.length} rules of the book apply to this installation; ${idle} more do not.`,
      },
      {
        anchor: 'rules/list',
        table: {
          caption: 'What must hold, how often it did, and where it is written',
          columns: [
            { title: 'What must hold', width: '42%', look: '' },
            { title: 'Verdicts', width: '18%', look: '' },
            { title: 'Source', width: '40%', look: '' },
          ],
          rows,
        },
      },
    ],
  }
}

/** The book's parameters: the values on which countries differ. */
export function parameters({ judged }: ReportScene): Section {
  const page = bookPage(judged.book.id)
  const rows = Object.entries(page?.parameters ?? {}).map(
    ([name, { value, unit, title, source }]): Row => ({
      anchor: `parameter/${name}`,
      head: title ?? name,
      cells: [
        {
          text:
            value === null
              ? 'left to the operator'
              : `${typeof value === 'number' ? Number(value.toFixed(4)) : value}${unit === undefined || unit === '' ? '' : ` ${unit}`}`,
        },
        { text: source },
      ],
      look: '',
    }),
  )
  const off = page?.off ?? []
  return {
    anchor: 'parameters',
    title: 'Parameters of the rule book',
    blocks: [
      {
        anchor: 'parameters/list',
        table: {
          caption: 'Values on which countries and editions differ',
          columns: [
            { title: 'Parameter', width: '36%', look: '' },
            { title: 'Value', width: '17%', look: '' },
            { title: 'Source', width: '47%', look: '' },
          ],
          rows,
        },
      },
      ...(off.length === 0
        ? []
        : [
            {
              anchor: 'parameters/off',
              list: off.map(({ rule, reason, by }) => `${rule} is switched off by ${by}: ${reason}`),
            },
          ]),
    ],
  }
}

/** What whoever works here must know. */
export const CAUTIONS: readonly string[] = [
  'Two sources feed this building. Switching off the main switch does not make the boards dead: it starts the island. Test on both sides of the changeover, every pole, before touching.',
  'Photovoltaics are live in daylight and the battery is always live. Never open a d.c. connector under load; prove zero current with a clamp first.',
  'Work on such an installation is for skilled persons. Nobody works alone on live d.c.',
  'After an outage reset only as instructed. If the battery smells, hisses or smokes: leave, close the door, call the fire service.',
  'Local codes, the grid operator’s conditions and licensed practice come before anything in this report.',
]

/** The customary cautions. */
export const cautions = (): Section => ({
  anchor: 'cautions',
  title: 'Cautions',
  blocks: [{ anchor: 'cautions/list', caution: CAUTIONS }],
})
