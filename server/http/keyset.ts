import { type Refused, refuse } from './problems.ts'

/** Where a page of a list begins: the order's values of the last row of the page before. Opaque to who carries it. */
export const keysetText = (parts: readonly string[]): string => Buffer.from(JSON.stringify(parts)).toString('base64url')

/** Forms of values that lists are ordered by. */
export const FORMS = {
  id: /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/,
  date: /^\d{4}-\d{2}-\d{2}$/,
  time: /^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}:\d{2}\.\d{3}Z$/,
  count: /^\d{1,15}$/,
  text: /^[^\0]{1,300}$/,
} as const satisfies Readonly<Record<string, RegExp>>

const parsed = (text: string): unknown => {
  try {
    return JSON.parse(Buffer.from(text, 'base64url').toString('utf8'))
  } catch {
    return undefined
  }
}

/** Calendar days and moments may have the form and yet not be: PostgreSQL would refuse them. */
const happened = (form: keyof typeof FORMS, value: string): boolean =>
  (form !== 'date' && form !== 'time') || !Number.isNaN(Date.parse(value))

const REFUSED: Refused = refuse('bad-request', undefined, {
  errors: [{ pointer: '/after', message: 'Take the value of `next` of the page before.' }],
})

/** The values again, each in the form that the list's order has; a refusal for anything else. */
export function keysetOf(text: string, forms: readonly (keyof typeof FORMS)[]): readonly string[] | Refused {
  const value = parsed(text)
  if (!Array.isArray(value) || value.length !== forms.length) return REFUSED
  const parts: unknown[] = value
  const sound = parts.flatMap((part, place) => {
    const form = forms[place]
    return typeof part === 'string' && form !== undefined && FORMS[form].test(part) && happened(form, part)
      ? [part]
      : []
  })
  return sound.length === forms.length ? sound : REFUSED
}

export interface Page<Row> {
  readonly rows: readonly Row[]
  readonly next: string | null
}

/** Cuts rows to a page, of which one more than asked for was read, and says where the next one begins. */
export function pageOf<Row>(rows: readonly Row[], limit: number, orderOf: (row: Row) => readonly string[]): Page<Row> {
  const page = rows.slice(0, limit)
  const last = page.at(-1)
  return { rows: page, next: rows.length > limit && last !== undefined ? keysetText(orderOf(last)) : null }
}

/** What every list takes in its query. */
export const PAGE_QUERY = {
  after: { type: 'string', maxLength: 1000 },
  limit: { type: 'integer', minimum: 1, maximum: 100, default: 50 },
} as const
