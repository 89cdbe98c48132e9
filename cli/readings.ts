import type { Path } from '#core/glossary.ts'
import type { Install } from '#core/install.ts'
import type { Edit } from '#core/read/edit.ts'
import { nearest } from '#core/texts/nearest.ts'
import { parseCsv, type Row } from './csv.ts'

export type EditsResult =
  | { readonly ok: true; readonly edits: readonly Edit[] }
  | { readonly ok: false; readonly faults: readonly string[] }

const COLUMNS = ['path', 'subject', 'reading', 'state', 'value'] as const
type Column = (typeof COLUMNS)[number]

const DECIMAL_COMMA = /^([<>]?\s*-?\d+),(\d+)(?=\s|$|[^\d,])/

/** A reading as the file takes it: a spreadsheet's decimal comma becomes a point. */
const mended = (value: string): string => value.replace(DECIMAL_COMMA, '$1.$2')

const indexed = (part: string): string | number => (/^\d+$/.test(part) ? Number(part) : part)

/** Where the readings of one kind of subject stand, or why they cannot be placed; undefined for another kind. */
type Placing = (install: Install, subject: string, reading: string, state: string) => Path | string | undefined

const PLACINGS: readonly Placing[] = [
  ({ circuits = {} }, subject, reading, state) =>
    Object.hasOwn(circuits, subject)
      ? ['readings', 'circuits', subject, reading, ...(state === '' ? [] : [state])]
      : undefined,
  ({ residual_current = {} }, subject, reading, state) => {
    if (!Object.hasOwn(residual_current, subject)) return undefined
    return state === ''
      ? `${subject} is tested in each state: name grid or island.`
      : ['readings', 'residual_current', subject, state, reading]
  },
  ({ arrays = {} }, subject, reading) => {
    const [array = '', string] = subject.split('/')
    return string !== undefined && Object.hasOwn(arrays, array)
      ? ['readings', 'arrays', array, 'strings', Number(string) - 1, reading]
      : undefined
  },
  (_install, subject, reading) =>
    subject === 'grid' || subject === 'island' ? ['readings', 'states', subject, ...reading.split('.')] : undefined,
]

function placeOf(install: Install, subject: string, reading: string, state: string): Path | string {
  for (const placing of PLACINGS) {
    const place = placing(install, subject, reading, state)
    if (place !== undefined) return place
  }
  const hint = nearest(subject, [
    ...Object.keys(install.circuits ?? {}),
    ...Object.keys(install.residual_current ?? {}),
  ])
  return `there is no circuit, residual-current device or string ${subject}${hint === undefined ? '.' : `: did you mean ${hint}?`}`
}

function editOf(row: Row, places: ReadonlyMap<Column, number>, install: Install): Edit | string {
  const cell = (name: Column): string => row.cells[places.get(name) ?? -1] ?? ''
  const value = cell('value')
  if (value === '') return `line ${row.line}: the value is empty.`
  const path =
    cell('path') === ''
      ? placeOf(install, cell('subject'), cell('reading'), cell('state'))
      : cell('path').split('.').map(indexed)
  if (typeof path === 'string') return `line ${row.line}: ${path}`
  if (path[0] !== 'readings')
    return `line ${row.line}: ${path.join('.')} is no reading; only places under readings are filled.`
  return { path, text: mended(value) }
}

/** Rows for a place that another row has filled before: nobody can tell which of the two is right. */
function twice(rows: readonly Row[], made: readonly (Edit | string)[]): string[] {
  const first = new Map<string, number>()
  return made.flatMap((edit, index) => {
    const line = rows[index]?.line ?? 0
    if (typeof edit === 'string') return []
    const place = edit.path.join('.')
    const before = first.get(place)
    if (before !== undefined) return [`line ${line}: ${place} has a value in line ${before} already.`]
    first.set(place, line)
    return []
  })
}

/** The readings of a CSV file as edits of an install file; all of them, or everything that is wrong with them. */
export function readingEdits(csv: string, install: Install): EditsResult {
  const [head, ...rows] = parseCsv(csv)
  if (!head)
    return { ok: false, faults: ['the file is empty: a head line is wanted, such as subject,reading,state,value.'] }
  const names = head.cells.map((name) => name.toLowerCase())
  const places = new Map(
    COLUMNS.flatMap((name) => (names.includes(name) ? [[name, names.indexOf(name)] as const] : [])),
  )
  const complete = places.has('value') && (places.has('path') || (places.has('subject') && places.has('reading')))
  if (!complete)
    return {
      ok: false,
      faults: [
        `line 1: the head line reads ${head.cells.join(', ')}; wanted are path,value or subject,reading,state,value.`,
      ],
    }
  const made = rows.map((row) =>
    row.cells.slice(head.cells.length).some((cell) => cell !== '')
      ? `line ${row.line}: ${row.cells.length} cells, where the head line has ${head.cells.length}: put a value that has a comma in it in quotes.`
      : editOf(row, places, install),
  )
  const faults = [...made.filter((edit) => typeof edit === 'string'), ...twice(rows, made)]
  if (faults.length > 0) return { ok: false, faults }
  return { ok: true, edits: made.filter((edit) => typeof edit !== 'string') }
}
