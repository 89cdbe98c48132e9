import type { FileResult, ShownFinding } from '#cli/result.ts'
import type { Severity, Verdict } from '#core/glossary.ts'
import { STATE_WORDS } from '#core/texts/label.ts'
import { between, type Format, type FormatScene } from './format.ts'
import { type Ink, inks } from './ink.ts'
import { visible } from './visible.ts'
import { wrapped } from './wrap.ts'

const SHAPES: Readonly<Record<Verdict, string>> = {
  fails: '✗',
  'fails, inside the uncertainty': '!',
  'meets, inside the uncertainty': '≈',
  'not shown': '○',
  limited: '△',
  meets: '✓',
  'not applicable': '·',
}

const CAUTION =
  'Verification is work for skilled persons. Local codes and licensed practice come before anything printed here.'

/** How many findings without a reading are told one by one unless asked for all. */
const FEW = 4

function word({ verdict, severity, departure }: ShownFinding): string {
  if (departure) return 'departs'
  return verdict === 'fails' && severity !== 'failure' ? severity : verdict
}

function inkOf({ verdict, severity, departure }: ShownFinding, ink: Ink): (text: string) => string {
  if (departure || verdict === 'limited' || verdict === 'not shown') return ink.water
  if (!verdict.startsWith('fails')) return ink.lamp
  const bySeverity: Record<Severity, (text: string) => string> = {
    failure: ink.alarm,
    caution: ink.lamp,
    note: ink.water,
  }
  return bySeverity[severity]
}

/** The line that a finding points to, with a caret under the place; long lines are cut around it. */
function excerpt({ line, range }: ShownFinding, width: number, ink: Ink): string[] {
  if (line.trim() === '') return []
  const room = Math.max(30, width - 10)
  const from = range.column > room - 10 ? range.column - Math.floor(room / 2) : 0
  const shown = `${from > 0 ? '…' : ''}${line.slice(from > 0 ? from + 1 : from, from + room)}${line.length > from + room ? '…' : ''}`
  const length = range.endLine === range.line ? Math.max(1, range.endColumn - range.column) : 1
  const at = range.column - 1 - from
  const marks = '‾'.repeat(Math.max(1, Math.min(length, shown.length - at)))
  return [
    `${ink.faint(`${String(range.line).padStart(5)} │`)} ${shown}`,
    `${ink.faint('      │')} ${' '.repeat(at)}${ink.lamp(marks)}`,
  ]
}

function told(finding: ShownFinding, file: string, { width, verbose }: FormatScene, ink: Ink): string {
  const { rule, subject, state, message, remedy, cite, range, departure } = finding
  const paint = inkOf(finding, ink)
  const about = [subject, ...(state === null ? [] : [STATE_WORDS[state]])].join(' ')
  const head = `${paint(`${SHAPES[finding.verdict]} ${word(finding)}`)}  ${ink.strong(about)}  ${ink.faint(rule)}`
  const related = verbose
    ? finding.related.map(({ range: place }) => ink.faint(`    see also ${file}:${place.line}:${place.column}`))
    : []
  return [
    `${head}  ${ink.faint(`${file}:${range.line}:${range.column}`)}`,
    ...wrapped(message, width - 4).map((text) => `  ${text}`),
    ...(remedy === '' ? [] : wrapped(remedy, width - 6).map((text, index) => `  ${index === 0 ? '→' : ' '} ${text}`)),
    ...(cite === '' ? [] : wrapped(`source: ${cite}`, width - 4).map((text) => ink.faint(`  ${text}`))),
    ...(departure
      ? wrapped(
          `Departs on purpose: ${departure.reason} (agreed by ${departure.agreed_by} on ${departure.on}).`,
          width - 4,
        ).map((text) => `  ${text}`)
      : []),
    ...excerpt(finding, width, ink),
    ...related,
    '',
  ].join('\n')
}

/** Readings that are still to be taken, in one block. */
function open(findings: readonly ShownFinding[], scene: FormatScene, ink: Ink): string {
  if (findings.length === 0) return ''
  const lines = findings.slice(0, scene.verbose ? findings.length : FEW).map(({ subject, state, message, range }) => {
    const about = [subject, ...(state === null ? [] : [STATE_WORDS[state]])].join(' ')
    return wrapped(`line ${range.line}, ${about}: ${message}`, scene.width - 4)
      .map((text, index) => `  ${index === 0 ? '' : '  '}${text}`)
      .join('\n')
  })
  const rest = findings.length - lines.length
  const more =
    rest > 0 ? [ink.faint(`  and ${rest} more; -v lists all, skerry fieldsheet prints them for the site`)] : []
  return [ink.water(`○ not shown  ${findings.length} rules lack a reading or an entry`), ...lines, ...more, ''].join(
    '\n',
  )
}

const counted = (count: number, one: string, many: string): string[] =>
  count === 0 ? [] : [`${count} ${count === 1 ? one : many}`]

/** What a file came to, in numbers: failures apart from cautions and notes. */
function tally({ counts, findings }: FileResult): string {
  const of = (severity: Severity): number =>
    findings.filter(
      (finding) => finding.verdict.startsWith('fails') && finding.severity === severity && !finding.departure,
    ).length
  return [
    ...counted(of('failure'), 'failure', 'failures'),
    ...counted(of('caution'), 'caution', 'cautions'),
    ...counted(of('note'), 'note', 'notes'),
    ...counted(counts['not shown'], 'not shown', 'not shown'),
    ...counted(counts.limited, 'limited', 'limited'),
    ...counted(counts.meets + counts['meets, inside the uncertainty'], 'met', 'met'),
  ].join(', ')
}

const CONCLUSIONS = {
  meets: 'Nothing fails.',
  incomplete: 'Nothing fails; not everything is shown.',
  fails: 'It cannot be issued as it stands.',
  unreadable: 'It cannot be read.',
} as const

function summary(result: FileResult, ink: Ink): string {
  const { outcome, book, findings } = result
  const departing = findings.some(({ departure }) => departure) ? '; departures wait for the reviewer' : ''
  const basis = book === null ? 'not judged: mend the file first' : `rule book ${book.id} ${book.version}${departing}`
  return `${ink.strong(CONCLUSIONS[outcome])} ${tally(result)} (${basis})`
}

function fileBlock(result: FileResult, scene: FormatScene, ink: Ink): string {
  const { file, findings } = result
  const closed = findings.filter(({ verdict }) => verdict !== 'not shown')
  if (scene.quiet) return `${file}: ${summary(result, ink)}\n`
  if (findings.length === 0) return `${ink.sound('✓')} ${file}: ${summary(result, ink)}\n`
  return [
    ink.strong(file),
    '',
    ...closed.map((finding) => told(finding, file, scene, ink)),
    open(
      findings.filter(({ verdict }) => verdict === 'not shown'),
      scene,
      ink,
    ),
    `${file}: ${summary(result, ink)}\n`,
  ]
    .filter((part, index) => part !== '' || index === 1)
    .join('\n')
}

/** Words of the program wrap at their spaces; whatever else is in them is shown as it is. */
const shownFinding = (finding: ShownFinding): ShownFinding => ({
  ...finding,
  subject: visible(finding.subject),
  message: visible(finding.message),
  remedy: visible(finding.remedy),
  line: visible(finding.line.replaceAll('\t', '⇥')),
})

const shown = (result: FileResult): FileResult => ({
  ...result,
  file: visible(result.file),
  findings: result.findings.map(shownFinding),
})

/** A result put in words where it was checked. */
export function worded(result: FileResult, scene: FormatScene): FileResult {
  return { ...result, findings: [], block: fileBlock(shown(result), scene, inks(scene.colour)) }
}

/** What stands below all files: how many there were, and the caution. */
export function closing(results: readonly Pick<FileResult, 'stops' | 'stopsStrictly'>[], scene: FormatScene): string {
  const bad = results.filter(({ stops, stopsStrictly }) => (scene.strict ? stopsStrictly : stops)).length
  const many = results.length > 1 ? `${results.length} files, ${bad} with something at failure level.\n` : ''
  return `${many}${scene.quiet ? '' : `${inks(scene.colour).faint(CAUTION)}\n`}`
}

/** For people at a terminal: grouped by file, worst news with its place, its words and what to do. */
export const text: Format = (scene) => {
  const ink = inks(scene.colour)
  const separator = between(scene.quiet ? '' : '\n')
  const ends: Pick<FileResult, 'stops' | 'stopsStrictly'>[] = []
  return {
    take: (result) => {
      ends.push({ stops: result.stops, stopsStrictly: result.stopsStrictly })
      return `${separator()}${result.block ?? fileBlock(shown(result), scene, ink)}`
    },
    frame: () => ({ head: '', tail: closing(ends, scene) }),
  }
}
