import type { FileResult, ShownFinding } from '#cli/result.ts'
import { atFailureLevel, atStrictLevel } from '#core/report/told.ts'
import { between, type Format, type FormatScene } from './format.ts'

const ENTITIES: Readonly<Record<string, string>> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;' }

/** Text that XML 1.0 can hold. */
const escaped = (text: string): string =>
  text.replace(/[\u0000-\u0008\u000b\u000c\u000e-\u001f]/g, '').replace(/[&<>"]/g, (mark) => ENTITIES[mark] ?? mark)

function testCase(file: string, finding: ShownFinding, { strict }: FormatScene): string {
  const { rule, subject, state, verdict, message, remedy, range } = finding
  const name = escaped([rule, subject, ...(state === null ? [] : [state])].join(' '))
  const head = `    <testcase name="${name}" classname="${escaped(file)}"`
  const stops = strict ? atStrictLevel(finding) : atFailureLevel(finding)
  const place = `${file}:${range.line}:${range.column}`
  if (stops)
    return `${head}>\n      <failure type="${escaped(verdict)}" message="${escaped(message)}">${escaped(`${place}\n${message}\n${remedy}`)}</failure>\n    </testcase>`
  if (verdict === 'limited' || verdict === 'not shown')
    return `${head}>\n      <skipped message="${escaped(message)}"/>\n    </testcase>`
  return `${head}/>`
}

function suite(result: FileResult, scene: FormatScene): string {
  const { file, findings } = result
  const failures = findings.filter(scene.strict ? atStrictLevel : atFailureLevel).length
  const skipped = findings.filter(
    (finding) =>
      !(scene.strict ? atStrictLevel : atFailureLevel)(finding) &&
      (finding.verdict === 'limited' || finding.verdict === 'not shown'),
  ).length
  const cases =
    findings.length === 0
      ? [`    <testcase name="check" classname="${escaped(file)}"/>`]
      : findings.map((finding) => testCase(file, finding, scene))
  return `  <testsuite name="${escaped(file)}" tests="${cases.length}" failures="${failures}" errors="0" skipped="${skipped}">\n${cases.join('\n')}\n  </testsuite>`
}

/** For build servers: a file is a suite, a finding a test case. */
export const junit: Format = (scene) => {
  const separator = between('\n')
  return {
    take: (result) => `${separator()}${suite(result, scene)}`,
    frame: () => ({ head: '<?xml version="1.0" encoding="UTF-8"?>\n<testsuites>\n', tail: '\n</testsuites>\n' }),
  }
}
