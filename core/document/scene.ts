import type { Judged } from '#core/engine.ts'
import type { Sheet, SheetValue, State, Subject, Verdict } from '#core/glossary.ts'
import type { ToldFinding } from '#core/report/told.ts'
import { fieldsOf } from '#core/sheets/plans.ts'
import { shown } from '#core/texts/value.ts'

/** What the sections of a report draw on. */
export interface ReportScene {
  readonly judged: Judged
  readonly told: readonly ToldFinding[]
  readonly file: string
  readonly sourceHash: string
}

/** The sheets of one kind of subject, in the order of the file. */
export function sheetsOf({ judged }: ReportScene, subject: Subject): Sheet[] {
  return judged.sheets.filter((sheet) => sheet.subject === subject)
}

/** A field's value as it is printed, in a state where it has one; a dash where it is missing. */
export function printed(sheet: Sheet, name: string, state?: State): string {
  const value: SheetValue | undefined = (state && sheet.inState[state][name]) ?? sheet.values[name]
  if (value === undefined) return '–'
  return shown(value, fieldsOf(sheet.subject).get(name)?.unit ?? '')
}

/** The number alone, for a column whose head has the unit. */
export function bare(sheet: Sheet, name: string, state?: State): string {
  const value: SheetValue | undefined = (state && sheet.inState[state][name]) ?? sheet.values[name]
  return value === undefined ? '–' : shown(value, '')
}

/** A number on a sheet, for drawing. */
export function numberOn(sheet: Sheet, name: string, state?: State): number | undefined {
  const value = (state && sheet.inState[state][name]) ?? sheet.values[name]
  return typeof value === 'number' ? value : undefined
}

const WORST: readonly Verdict[] = [
  'fails',
  'fails, inside the uncertainty',
  'not shown',
  'limited',
  'meets, inside the uncertainty',
  'meets',
]

/** The worst verdict on a subject at failure level: what its row in a table says. */
export function worstOf({ judged }: ReportScene, id: string, state?: State): Verdict {
  const own = judged.findings.filter(
    (finding) =>
      finding.subject === id && finding.severity === 'failure' && (state === undefined || finding.state === state),
  )
  return WORST.find((verdict) => own.some((finding) => finding.verdict === verdict)) ?? 'not applicable'
}
