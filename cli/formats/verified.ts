import { VERSION } from '#cli/version.ts'
import type { Check } from '#core/register/signing.ts'
import type { Difference } from '#core/verify/recompute.ts'
import type { ReportVerdict } from '#core/verify/verify-report.ts'
import { type Ink, inks } from './ink.ts'
import { visible } from './visible.ts'
import { wrapped } from './wrap.ts'

/** As many differences are shown one by one; JSON has all of them. */
const MOST = 20
/** A value in a difference is cut behind so many signs. */
const LONGEST = 120

function mark({ holds, open }: Check, ink: Ink): string {
  if (!holds) return ink.alarm('✗')
  return open ? ink.lamp('○') : ink.sound('✓')
}

const short = (text: string): string => (text.length > LONGEST ? `${text.slice(0, LONGEST)}…` : text)

function differenceLines(differences: readonly Difference[]): string[] {
  if (differences.length === 0) return []
  const shown = differences
    .slice(0, MOST)
    .flatMap(({ about, issued, now }) => [
      `  ${visible(about)}`,
      `    issued: ${visible(short(issued))}`,
      `    now:    ${visible(short(now))}`,
    ])
  const more = differences.length > MOST ? [`  and ${differences.length - MOST} more: see --format json`] : []
  return ['', 'Differences:', ...shown, ...more]
}

function summary(checks: readonly Check[]): string {
  const wrong = checks.filter(({ holds }) => !holds).length
  const open = checks.filter((check) => check.holds && check.open).length
  const rest = open === 0 ? '' : ` ${open} of them could not be settled (○).`
  if (wrong > 0)
    return `Do not rely on this file: ${wrong} of ${checks.length} checks ${wrong === 1 ? 'does' : 'do'} not hold.${rest}`
  return `It holds, in ${checks.length} checks.${rest}`
}

function title(file: string, { number, issuedAt, sealedAt }: ReportVerdict): string {
  const parts = [number, issuedAt && `issued ${issuedAt}`, sealedAt && `sealed ${sealedAt}`].filter(
    (part) => part !== undefined,
  )
  return visible(parts.length === 0 ? file : `${file}: ${parts.join(', ')}`)
}

/** Each check in words for a person at a terminal. */
export function verifiedText(
  file: string,
  verdict: ReportVerdict,
  { colour, width }: { readonly colour: boolean; readonly width: number },
): string {
  const ink = inks(colour)
  const checks = verdict.checks.map(
    (check) => `${mark(check, ink)} ${wrapped(visible(check.says), width - 2).join('\n  ')}`,
  )
  const lines = [
    ink.strong(title(file, verdict)),
    `SHA-256 ${verdict.sha256}`,
    '',
    ...checks,
    ...differenceLines(verdict.differences),
    '',
    ink.strong(summary(verdict.checks)),
  ]
  return `${lines.join('\n')}\n`
}

/** The same for programs. */
export function verifiedJson(
  file: string,
  { checks, differences, sha256, number, issuedAt, sealedAt }: ReportVerdict,
): string {
  const result = {
    version: VERSION,
    file,
    sha256,
    number: number ?? null,
    issued_at: issuedAt ?? null,
    sealed_at: sealedAt ?? null,
    holds: checks.every(({ holds }) => holds),
    checks: checks.map(({ id, holds, open = false, says }) => ({ id, holds, open, says })),
    differences,
  }
  return `${JSON.stringify(result, null, 2)}\n`
}
