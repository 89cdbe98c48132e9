import type { Finding } from '#core/glossary.ts'
import { STATE_WORDS } from '#core/texts/label.ts'
import { ruleTitle } from '#core/texts/words.ts'
import { anchorOf } from '../anchor.ts'
import { type Block, type Mark, type Notice, type Row, type Section, table } from '../blocks.ts'
import { about } from '../finding-blocks.ts'
import { groupedBy } from '../grouped-by.ts'
import { findingMark } from '../marks.ts'
import { few } from '../print.ts'
import type { ReportContext, ReportScene } from '../scene.ts'
import type { Standing } from '../standing.ts'

const count = (number: number, one: string, many: string): readonly string[] =>
  number === 0 ? [] : [`${number} ${number === 1 ? one : many}`]

function obstacles({ failing, notShown, limited, departing }: Standing): string[] {
  const blocking = notShown.filter(({ severity }) => severity === 'failure').length
  return [
    ...count(failing.length, 'rule is not met.', 'rules are not met.'),
    ...count(blocking, 'verdict lacks a reading or an entry.', 'verdicts lack a reading or an entry.'),
    ...count(limited.length, 'limitation waits for the reviewer.', 'limitations wait for the reviewer.'),
    ...count(departing.length, 'departure waits for the reviewer.', 'departures wait for the reviewer.'),
  ]
}

/** What stood in the way of an issued report, now that the reviewer has decided. */
function accepted({ limited, departing }: Standing): string[] {
  return [
    ...count(limited.length, 'limitation was accepted by the reviewer.', 'limitations were accepted by the reviewer.'),
    ...count(departing.length, 'departure was accepted by the reviewer.', 'departures were accepted by the reviewer.'),
  ]
}

function issuedNotice(standing: Standing, number: string): Notice {
  const meets = standing.word === 'meets'
  return {
    kind: 'notice',
    anchor: 'report/standing',
    box: meets ? 'box-note' : 'box-caution',
    title: meets
      ? `Issued under number ${number}: nothing fails and nothing is missing`
      : `Issued under number ${number}, which this rule book would not allow`,
    paragraphs: [],
    items: meets ? accepted(standing) : obstacles(standing),
  }
}

function titleOf({ word }: Standing, items: readonly string[]): string {
  if (word !== 'meets') return 'It cannot be issued as it stands'
  if (items.length === 0) return 'It can be issued: nothing fails and nothing is missing'
  return 'Nothing fails and nothing is missing; the reviewer decides on what is listed here'
}

function standingNotice(standing: Standing, { issue }: ReportContext): Notice {
  if (issue) return issuedNotice(standing, issue.number)
  const items = obstacles(standing)
  return {
    kind: 'notice',
    anchor: 'report/standing',
    box: standing.word === 'fails' ? 'box-caution' : 'box-note',
    title: titleOf(standing, items),
    paragraphs: [],
    items,
  }
}

const short = ({ subject, state }: Finding): string => (state === null ? subject : `${subject} ${STATE_WORDS[state]}`)

interface Line {
  readonly mark: Mark
  readonly where: string
  readonly name: string
  readonly title: string
}

/** One line for each rule, its subjects together. */
function ruleLines(scene: ReportScene, findings: readonly Finding[]): Line[] {
  const groups = groupedBy(findings, (finding) => `${finding.rule}/${findingMark(finding).word}`)
  return [...groups.values()].map((group) => {
    const [first] = group
    const subjects = group.map(short)
    const where = group.length === 1 ? about(scene, first) : few(subjects, 8)
    const title = ruleTitle(scene.ruleKey(first.rule))
    return { mark: findingMark(first), where, name: subjects.toSorted().join('+'), title }
  })
}

/** Lines about the same subjects and of the same verdict become one row. */
function lines(scene: ReportScene, findings: readonly Finding[]): Row[] {
  const rows = groupedBy(ruleLines(scene, findings), ({ mark, name }) => `${mark.word}/${name}`)
  return [...rows].map(([name, group]) => {
    const [first] = group
    const titles = group.map(({ title }) => `${title}.`).join(' ')
    return {
      anchor: anchorOf('summary', name),
      head: { mark: first.mark },
      cells: [{ text: first.where }, { text: titles }],
    }
  })
}

const COLUMNS = [
  { label: 'Verdict', width: 24 },
  { label: 'Where', width: 30 },
  { label: 'What must hold', width: 46 },
] as const

function asides({ insideUncertainty, cautions, notes }: Standing): string[] {
  return [
    ...count(
      insideUncertainty.length,
      'verdict is met as read, but not over the whole uncertainty of the reading.',
      'verdicts are met as read, but not over the whole uncertainty of the reading.',
    ),
    ...count(cautions.length, 'caution for the reviewer to weigh.', 'cautions for the reviewer to weigh.'),
    ...count(notes.length, 'note.', 'notes.'),
  ]
}

/** What fails, what is missing, and whether the report can be issued. */
export function summary(scene: ReportScene, standing: Standing): Section {
  const { failing, departing, notShown, limited } = standing
  const rows = lines(scene, [...failing, ...departing, ...notShown, ...limited])
  const beside = asides(standing)
  const words = `Besides: ${beside.join(' ')} Each stands in full under Findings.`
  const blocks: Block[] = [
    standingNotice(standing, scene.context),
    ...(rows.length > 0 ? [table('summary/list', COLUMNS, [{ rows }])] : []),
    ...(beside.length > 0 ? [{ kind: 'prose' as const, anchor: 'summary/asides', paragraphs: [words] }] : []),
  ]
  return { anchor: 'summary', title: 'Summary', blocks }
}
