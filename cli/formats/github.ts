import type { FileResult, ShownFinding } from '#cli/result.ts'
import { atFailureLevel } from '#core/report/told.ts'
import type { Format } from './format.ts'
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

function ofKind(kind: Kind, all: readonly (readonly [FileResult, ShownFinding])[]): string[] {
  const own = all.filter(([, finding]) => kindOf(finding) === kind)
  const rest = own.length - CAP
  return [
    ...own.slice(0, CAP).map(([{ file }, finding]) => annotation(kind, file, finding)),
    ...(rest > 0 ? [`::${kind}::and ${rest} more like this; the log lists all`] : []),
  ]
}

/** Annotations for a pull request, worst first, with every place in the log as well. */
export const github: Format = (results) => {
  const all = results.flatMap((result) => result.findings.map((finding) => [result, finding] as const))
  const log = all.map(([{ file }, { range, verdict, rule, message }]) =>
    visible(`${file}:${range.line}:${range.column}: ${verdict}: ${message} (${rule})`),
  )
  return `${[...(['error', 'warning', 'notice'] as const).flatMap((kind) => ofKind(kind, all)), ...log].join('\n')}\n`
}
