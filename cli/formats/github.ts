import type { ShownFinding } from '#cli/result.ts'
import { atFailureLevel } from '#core/report/told.ts'
import { between, type Format } from './format.ts'
import { visible } from './visible.ts'

/** The service shows no more than this many of each kind for one step, and drops the rest without a word. */
const CAP = 10

type Kind = 'error' | 'warning' | 'notice'

function kindOf(finding: ShownFinding): Kind {
  if (atFailureLevel(finding)) return 'error'
  return finding.severity === 'note' || finding.verdict === 'limited' ? 'notice' : 'warning'
}

const inProperty = (text: string): string => inMessage(text).replaceAll(':', '%3A').replaceAll(',', '%2C')
const inMessage = (text: string): string => text.replaceAll('%', '%25').replaceAll('\r', '%0D').replaceAll('\n', '%0A')

function annotation(kind: Kind, file: string, { range, rule, message }: ShownFinding): string {
  const place = `file=${inProperty(file)},line=${range.line},col=${range.column},endLine=${range.endLine},endColumn=${range.endColumn},title=${inProperty(rule)}`
  return `::${kind} ${place}::${inMessage(message)}`
}

/** Annotations of one kind, so many as are shown, and how many there were. */
interface Shown {
  readonly lines: string[]
  count: number
}

const told = (kind: Kind, { lines, count }: Shown): string[] =>
  count > CAP ? [...lines, `::${kind}::and ${count - CAP} more like this; the log lists all`] : lines

/** Annotations for a pull request, worst first, with every place in the log as well. */
export const github: Format = () => {
  const kinds: Readonly<Record<Kind, Shown>> = {
    error: { lines: [], count: 0 },
    warning: { lines: [], count: 0 },
    notice: { lines: [], count: 0 },
  }
  const separator = between('\n')
  const logLine = (file: string, finding: ShownFinding): string => {
    const { range, verdict, rule, message } = finding
    const kind = kindOf(finding)
    const shown = kinds[kind]
    shown.count += 1
    if (shown.count <= CAP) shown.lines.push(annotation(kind, file, finding))
    return `${separator()}${visible(`${file}:${range.line}:${range.column}: ${verdict}: ${message} (${rule})`)}`
  }
  return {
    take: ({ file, findings }) => findings.map((finding) => logLine(file, finding)).join(''),
    frame: () => {
      const head = (['error', 'warning', 'notice'] as const).flatMap((kind) => told(kind, kinds[kind])).join('\n')
      return { head: head === '' ? '' : `${head}\n`, tail: '\n' }
    },
  }
}
