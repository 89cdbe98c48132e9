import type { Checked, Judged } from '#core/engine.ts'
import type { Departure, Finding, Path, Problem, Range, Severity, Sheet, State, Verdict } from '#core/glossary.ts'
import { lacking } from '#core/sheets/lacking.ts'
import { joined } from '#core/texts/value.ts'
import { ruleCite, ruleTitle, ruleWordsFor } from '#core/texts/words.ts'
import { sure } from './sure.ts'

/** A place in the file. */
export interface Place {
  readonly path: Path
  readonly range: Range
}

/** A finding in words and with its place: what every format prints. */
export interface ToldFinding extends Place {
  /** A rule's name, or the code of a problem that kept the file from being judged. */
  readonly rule: string
  /** Where the rule's page is; none for a problem. */
  readonly key: string | null
  readonly subject: string
  readonly state: State | null
  readonly verdict: Verdict
  readonly severity: Severity
  readonly message: string
  /** What to do about it; empty where the message says it, or where there is nothing to do. */
  readonly remedy: string
  /** The first source that the rule names; empty for a problem. */
  readonly cite: string
  readonly related: readonly Place[]
  readonly departure?: Departure
}

export type Counts = Readonly<Record<Verdict, number>>

const START: Range = { line: 1, column: 1, endLine: 1, endColumn: 1, offset: 0, endOffset: 0 }

const NO_VERDICTS: Counts = {
  meets: 0,
  'meets, inside the uncertainty': 0,
  'fails, inside the uncertainty': 0,
  fails: 0,
  'not shown': 0,
  limited: 0,
  'not applicable': 0,
}

/** How many findings there are of each verdict. */
export function countVerdicts(findings: readonly { readonly verdict: Verdict }[]): Counts {
  const counts: Record<Verdict, number> = { ...NO_VERDICTS }
  for (const { verdict } of findings) counts[verdict] += 1
  return counts
}

/** Sections of the file whose entries are named by a key of their own. */
const NAMED_SECTIONS: ReadonlySet<string> = new Set([
  'boards',
  'overcurrent',
  'residual_current',
  'inverters',
  'arrays',
  'batteries',
  'circuits',
  'instruments',
  'links',
])

/** The id under which a problem stands, or the section of the file that it is in. */
function subjectAt(path: Path): string {
  const [section, id] = path[0] === 'readings' ? path.slice(1) : path
  if (section === undefined) return 'file'
  return NAMED_SECTIONS.has(String(section)) && id !== undefined ? String(id) : String(section)
}

function toldProblem(
  { code, path, range, message }: Problem,
  locate: ((path: Path) => Range) | undefined,
): ToldFinding {
  return {
    rule: code,
    key: null,
    subject: subjectAt(path),
    state: null,
    verdict: 'fails',
    severity: 'failure',
    message,
    remedy: '',
    cite: '',
    path,
    range: range ?? locate?.(path) ?? START,
    related: [],
  }
}

/** What is missing, by the names that the sheet gives its fields: what has to be entered or read, not what follows from it. */
function missingWords({ missing, state }: Finding, sheet: Sheet): string {
  const titles = missing.flatMap((name) => lacking(sheet, name, state))
  return joined([...new Set(titles)].map(insideSentence))
}

/** `Length of the cable` inside a sentence; signs of quantities such as `Ze` stay as they are. */
function insideSentence(title: string): string {
  return /^[A-Z][a-z]/.test(title) ? title.charAt(0).toLowerCase() + title.slice(1) : title
}

function messageOf(finding: Finding, sheet: Sheet, key: string, judged: Judged): { message: string; remedy: string } {
  const title = ruleTitle(key)
  const { book } = judged
  if (finding.reason !== undefined) return { message: `${title}. Not tested: ${finding.reason}.`, remedy: '' }
  switch (finding.verdict) {
    case 'fails':
    case 'fails, inside the uncertainty': {
      const words = ruleWordsFor(key, { sheet, state: finding.state, parameters: book.parameters, units: book.units })
      return { message: words.says, remedy: words.do }
    }
    case 'meets, inside the uncertainty':
      return { message: `${title}. It holds as read, but not over the whole uncertainty of the reading.`, remedy: '' }
    case 'not shown':
      return { message: `${title}. Not shown without: ${missingWords(finding, sheet)}.`, remedy: '' }
    default:
      return { message: `${title}.`, remedy: '' }
  }
}

/** Places findings in words; `all` tells also what is met and what does not apply. */
function toldJudged(judged: Judged, all: boolean): ToldFinding[] {
  const { findings, sheets, book, locate } = judged
  const bySubject = new Map(sheets.map((sheet) => [sheet.id, sheet]))
  const keys = new Map(book.rules.map(({ id, key }) => [id, key]))
  const ranges = new Map<string, Range>()
  const place = (path: Path): Place => {
    const name = path.join('\n')
    const range = ranges.get(name) ?? locate(path)
    ranges.set(name, range)
    return { path, range }
  }
  return findings
    .filter(({ verdict }) => all || (verdict !== 'meets' && verdict !== 'not applicable'))
    .map((finding) => {
      const { rule, subject, state, verdict, severity, departure } = finding
      const sheet = sure(bySubject.get(subject), `The sheet of ${subject}`)
      const key = sure(keys.get(rule), `The rule ${rule}`)
      return {
        rule,
        key,
        subject,
        state,
        verdict,
        severity,
        ...messageOf(finding, sheet, key, judged),
        cite: ruleCite(key),
        ...place(finding.path),
        related: finding.related.map(place),
        ...(departure && { departure }),
      }
    })
}

/** The findings of a checked file in words, in the order of the file. */
export function toldFindings(checked: Checked, all = false): ToldFinding[] {
  const told =
    checked.kind === 'judged'
      ? toldJudged(checked, all)
      : checked.problems.map((problem) =>
          toldProblem(problem, checked.kind === 'misshapen' ? checked.locate : undefined),
        )
  return told.toSorted((a, b) => a.range.offset - b.range.offset)
}

/** Whether a finding stops a report: it fails, at failure level, and no departure covers it. */
export function atFailureLevel({
  verdict,
  severity,
  departure,
}: Pick<ToldFinding, 'verdict' | 'severity' | 'departure'>): boolean {
  return severity === 'failure' && !departure && (verdict === 'fails' || verdict === 'fails, inside the uncertainty')
}

const STRICT: ReadonlySet<Verdict> = new Set([
  'not shown',
  'meets, inside the uncertainty',
  'fails, inside the uncertainty',
])

/** The same when asked to be strict: also what is not shown, and what lies inside the uncertainty. */
export function atStrictLevel(finding: Pick<ToldFinding, 'verdict' | 'severity' | 'departure'>): boolean {
  return atFailureLevel(finding) || (finding.severity === 'failure' && STRICT.has(finding.verdict))
}
