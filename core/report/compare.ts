import type { Judged } from '#core/engine.ts'
import type { Sheet, SheetValue, State, Verdict } from '#core/glossary.ts'
import { fieldsOf } from '#core/sheets/plans.ts'
import { sure } from './sure.ts'

/** A value that differs between two files. */
export interface ValueChange {
  readonly subject: string
  readonly state: State | null
  readonly name: string
  readonly unit: string
  readonly before: SheetValue | undefined
  readonly after: SheetValue | undefined
}

/** A verdict that differs between two files. */
export interface VerdictChange {
  readonly rule: string
  readonly subject: string
  readonly state: State | null
  readonly before: Verdict | undefined
  readonly after: Verdict | undefined
}

/** What differs between two files, by meaning: layout, order of keys and spelling of units do not count. */
export interface Comparison {
  readonly verdicts: readonly VerdictChange[]
  readonly values: readonly ValueChange[]
}

const same = (a: unknown, b: unknown): boolean => JSON.stringify(a) === JSON.stringify(b)

const stated = (values: Sheet['values']): string[] => Object.keys(values).filter((name) => values[name] !== undefined)

function changesIn(
  subject: Sheet,
  state: State | null,
  before: Sheet['values'] = {},
  after: Sheet['values'] = {},
): ValueChange[] {
  const fields = fieldsOf(subject.subject)
  const names = [...new Set([...stated(before), ...stated(after)])]
  return names
    .filter((name) => !same(before[name], after[name]))
    .map((name) => ({
      subject: subject.id,
      state,
      name,
      unit: sure(fields.get(name), `The field ${name}`).unit,
      before: before[name],
      after: after[name],
    }))
}

function sheetChanges(either: Sheet, before: Sheet | undefined, after: Sheet | undefined): ValueChange[] {
  return [
    ...changesIn(either, null, before?.values, after?.values),
    ...changesIn(either, 'grid', before?.inState.grid, after?.inState.grid),
    ...changesIn(either, 'island', before?.inState.island, after?.inState.island),
  ]
}

function verdictChanges(before: Judged, after: Judged): VerdictChange[] {
  const key = ({ rule, subject, state }: Pick<VerdictChange, 'rule' | 'subject' | 'state'>): string =>
    `${rule}\n${subject}\n${state ?? ''}`
  const old = new Map(before.findings.map((finding) => [key(finding), finding]))
  const made = new Map(after.findings.map((finding) => [key(finding), finding]))
  return [...new Map([...old, ...made])].flatMap(([name, either]) => {
    const [was, is] = [old.get(name), made.get(name)]
    if (was?.verdict === is?.verdict) return []
    return [
      { rule: either.rule, subject: either.subject, state: either.state, before: was?.verdict, after: is?.verdict },
    ]
  })
}

const sheetsById = ({ sheets }: Judged) => new Map(sheets.map((sheet) => [sheet.id, sheet]))

/** Compares two judged files by subject, value and verdict. */
export function compare(before: Judged, after: Judged): Comparison {
  const [old, made] = [sheetsById(before), sheetsById(after)]
  return {
    verdicts: verdictChanges(before, after),
    values: [...new Map([...old, ...made])].flatMap(([id, sheet]) => sheetChanges(sheet, old.get(id), made.get(id))),
  }
}
