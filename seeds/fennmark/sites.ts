import { readFileSync } from 'node:fs'

/** A made-up installation: an example's file under another name and on other days. */
export interface Site {
  readonly example: string
  readonly reference: string
  readonly name: string
  readonly street: string
  /** How many days later (negative: earlier) everything in the file happened than in the example. */
  readonly days: number
}

const DAY = 86_400_000

const shifted = (date: string, days: number): string =>
  new Date(Date.parse(`${date}T00:00:00Z`) + days * DAY).toISOString().slice(0, 10)

const quoted = (text: string): string => `"${text.replaceAll('"', '\\"')}"`

/** The install file of a site: every date moved alike, so that calibrations stay as valid as they were. */
export function fileOf({ example, reference, name, street, days }: Site): string {
  const text = readFileSync(new URL(`../../examples/${example}.skerry.yaml`, import.meta.url), 'utf8')
  return text
    .replaceAll(/\b20\d\d-\d\d-\d\d\b/g, (date) => shifted(date, days))
    .replace(/^( {2}reference: ).*$/m, `$1${reference}`)
    .replace(/^( {2}name: ).*$/m, `$1${quoted(name)}`)
    .replace(/^( {2}address: ).*$/m, `$1[ ${quoted(street)}, Fennmark ]`)
}
