import { createHash } from 'node:crypto'
import { check, type Judged } from '#core/engine.ts'
import type { Path } from '#core/glossary.ts'
import { shippedShelf } from '#core/judge/shelf.ts'
import { readThoroughly } from '#core/read/thorough.ts'
import { atFailureLevel, type Counts, countVerdicts, type ToldFinding, toldFindings } from '#core/report/told.ts'
import type { FieldError } from '#server/http/problems.ts'
import { VERSION } from '#server/version.ts'

/** How a judged file came out. `incomplete`: nothing fails, something is not shown. */
export type Outcome = 'meets' | 'incomplete' | 'fails'

/** A person whom a file names as having had a hand in the work. */
export interface Worker {
  readonly name: string
  readonly licence: string | null
}

/** What is kept of a judged file beside its bytes: lifted for lists, and enough to judge it again years later. */
export interface Lifted {
  readonly sha256: string
  readonly reference: string
  readonly title: string
  readonly place: string
  readonly operator: string
  readonly purpose: string
  readonly inspectedOn: string | null
  readonly dueOn: string | null
  readonly outcome: Outcome
  readonly counts: Counts
  readonly workers: readonly Worker[]
  readonly rulebook: { readonly id: string; readonly version: string; readonly hash: string }
  readonly software: string
}

export type JudgedSource =
  | { readonly ok: true; readonly judged: Judged; readonly lifted: Lifted; readonly text: string }
  | { readonly ok: false; readonly errors: readonly FieldError[] }

const shelf = shippedShelf()

const escaped = (part: string | number): string => String(part).replaceAll('~', '~0').replaceAll('/', '~1')

export const pointerOf = (path: Path): string => path.map((part) => `/${escaped(part)}`).join('')

const errorOf = ({ rule, path, range, message }: ToldFinding): FieldError => ({
  pointer: pointerOf(path),
  message,
  code: rule,
  line: range.line,
  column: range.column,
})

/** At most this many problems of one file are told. */
const MOST = 200

function workersOf({ install }: Judged): Worker[] {
  const { installed_by, tested_by } = install.people ?? {}
  return [installed_by, tested_by].flatMap((person) =>
    person === undefined ? [] : [{ name: person.name, licence: person.licence ?? null }],
  )
}

function outcomeOf(judged: Judged, counts: Counts): Outcome {
  if (judged.findings.some(atFailureLevel)) return 'fails'
  return counts['not shown'] > 0 ? 'incomplete' : 'meets'
}

function lift(judged: Judged, source: Uint8Array): Lifted {
  const { report, site, supply } = judged.install
  const counts = countVerdicts(judged.findings)
  const { id, version, hash } = judged.book
  return {
    sha256: createHash('sha256').update(source).digest('hex'),
    reference: report.reference,
    title: site.name,
    place: site.address.join(', '),
    operator: supply.operator,
    purpose: report.purpose,
    inspectedOn: report.inspected?.to ?? report.inspected?.from ?? null,
    dueOn: report.next_due ?? null,
    outcome: outcomeOf(judged, counts),
    counts,
    workers: workersOf(judged),
    rulebook: { id, version, hash },
    software: VERSION,
  }
}

/** Reads, computes and judges the bytes of an install file. One that cannot be judged gives every problem with its place. */
export function judgeSource(source: Uint8Array): JudgedSource {
  let text: string
  try {
    text = new TextDecoder('utf-8', { fatal: true }).decode(source)
  } catch {
    return {
      ok: false,
      errors: [
        {
          pointer: '',
          code: 'not-utf8',
          message: 'The bytes are not UTF-8 text. Save the file as UTF-8 and send it again.',
          line: 1,
          column: 1,
        },
      ],
    }
  }
  const quick = check(text, shelf)
  const checked = quick.kind === 'unreadable' ? check(text, shelf, readThoroughly) : quick
  if (checked.kind === 'judged') return { ok: true, judged: checked, lifted: lift(checked, source), text }
  const told = toldFindings(checked, false)
  return { ok: false, errors: told.slice(0, MOST).map(errorOf) }
}
