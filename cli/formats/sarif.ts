import type { FileResult, ShownFinding } from '#cli/result.ts'
import { PROBLEM_CODES } from '#core/errors.ts'
import type { Citation } from '#core/glossary.ts'
import { encodeUtf8 } from '#core/judge/canonical.ts'
import { rulePage } from '#core/judge/pages.ts'
import { sha256 } from '#core/paper/sha256.ts'
import { atFailureLevel } from '#core/report/told.ts'
import { between, type Format, type Frame, indented, listFrame } from './format.ts'
import { pointer } from './pointer.ts'

const LEVELS = { failure: 'error', caution: 'warning', note: 'note' } as const

const cited = ({ publication, clause, note }: Citation): string =>
  [publication, clause, note].filter((part) => part !== undefined).join(', ')

type NamedRule = Pick<ShownFinding, 'rule' | 'key' | 'severity'>

function ruleOf({ rule, key, severity }: NamedRule): object {
  const name = rule
    .split('-')
    .map((word) => word.charAt(0).toUpperCase() + word.slice(1))
    .join('')
  if (key === null) {
    const meaning = (PROBLEM_CODES as Readonly<Record<string, string>>)[rule] ?? 'The file cannot be opened.'
    return {
      id: rule,
      // A name that is the id once more is none; ids of one word would make one.
      name: `${name}Problem`,
      shortDescription: { text: meaning },
      fullDescription: { text: meaning },
      help: { text: 'Mend the place that is shown. The message says what is allowed there.' },
      defaultConfiguration: { level: 'error' },
    }
  }
  const { record } = rulePage(key)
  return {
    id: rule,
    name,
    shortDescription: { text: `${record.title}.` },
    fullDescription: { text: record.why },
    help: { text: `${record.why}\nSources: ${record.cites.map(cited).join('; ')}.` },
    defaultConfiguration: { level: LEVELS[severity] },
    properties: { tags: [record.subject, `state ${record.state}`] },
  }
}

const region = ({ line, column, endLine, endColumn }: ShownFinding['range']): object => ({
  startLine: line,
  startColumn: column,
  endLine,
  endColumn: endLine === line ? Math.max(endColumn, column + 1) : endColumn,
})

/** A path as a URI reference: a whole one from the root, else relative to where the command ran. */
function uriOf(file: string): string {
  const path = encodeURI(file.replaceAll('\\', '/')).replaceAll('#', '%23').replaceAll('?', '%3F')
  if (path.startsWith('/')) return `file://${path}`
  // A colon in the first part would make a scheme of it.
  return /^[^/]*:/.test(path) ? `./${path}` : path
}

const location = (file: string, range: ShownFinding['range']): object => ({
  physicalLocation: { artifactLocation: { uri: uriOf(file) }, region: region(range) },
})

function levelOf(finding: ShownFinding): 'error' | 'warning' | 'note' {
  if (atFailureLevel(finding)) return 'error'
  if (finding.verdict === 'not shown' || finding.verdict === 'limited') return 'note'
  return finding.severity === 'note' ? 'note' : 'warning'
}

function fingerprint(file: string, { rule, subject, state }: ShownFinding): string {
  const bytes = sha256(encodeUtf8([file, rule, subject, state ?? ''].join('\n')))
  return Array.from(bytes.slice(0, 16), (byte) => byte.toString(16).padStart(2, '0')).join('')
}

function resultOf(file: string, finding: ShownFinding, places: ReadonlyMap<string, number>): object {
  const { rule, message, remedy, range, related, departure, path, subject, state, verdict } = finding
  return {
    ruleId: rule,
    ruleIndex: places.get(rule),
    level: levelOf(finding),
    message: { text: remedy === '' ? message : `${message} ${remedy}` },
    locations: [location(file, range)],
    ...(related.length > 0 && {
      relatedLocations: related.map((place, id) => ({ id, ...location(file, place.range) })),
    }),
    partialFingerprints: { 'skerryFinding/v1': fingerprint(file, finding) },
    ...(departure && {
      suppressions: [
        {
          kind: 'inSource',
          status: 'underReview',
          justification: `${departure.reason} (agreed by ${departure.agreed_by} on ${departure.on})`,
        },
      ],
    }),
    properties: { subject, state, verdict, path: pointer(path) },
  }
}

/** SARIF 2.1.0, for tools that collect findings. Of the files only the rules that they name are held. */
export const sarif: Format = ({ version }) => {
  const rules = new Map<string, NamedRule>()
  const places = new Map<string, number>()
  const separator = between(',\n')
  let unread = false
  const take = (result: FileResult): string => {
    unread ||= result.outcome === 'unreadable'
    for (const { rule, key, severity } of result.findings) {
      if (!places.has(rule)) places.set(rule, places.size)
      // The last finding of a rule speaks for its level, as a rule may be another one in another book.
      rules.set(rule, { rule, key, severity })
    }
    return result.findings
      .map((finding) => `${separator()}${indented(resultOf(result.file, finding, places), 8)}`)
      .join('')
  }
  const frame = (): Frame => {
    const driver = {
      name: 'Skerry',
      version,
      semanticVersion: version,
      informationUri: 'https://skerry.invalid/',
      rules: [...rules.values()].map(ruleOf),
    }
    const run = {
      tool: { driver },
      columnKind: 'utf16CodeUnits',
      invocations: [{ executionSuccessful: !unread }],
      results: [],
    }
    const log = { $schema: 'https://json.schemastore.org/sarif-2.1.0.json', version: '2.1.0', runs: [run] }
    return listFrame(log, 'results', 6, separator() !== '')
  }
  return { take, frame }
}
