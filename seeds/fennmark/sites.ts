import { readFileSync } from 'node:fs'
import { calibrationOn } from './calibrations.ts'

/** A made-up installation: an example's file under another name and on other days. */
export interface Site {
  readonly example: string
  readonly reference: string
  readonly name: string
  readonly street: string
  /** The last day of the inspection. */
  readonly on: string
}

const DAY = 86_400_000

const dayNumber = (date: string): number => Date.parse(`${date}T00:00:00Z`) / DAY
const dateOf = (day: number): string => new Date(day * DAY).toISOString().slice(0, 10)
const quoted = (text: string): string => `"${text.replaceAll('"', '\\"')}"`

const INSPECTED = /inspected: \{ from: (\d{4}-\d\d-\d\d)(?:, to: (\d{4}-\d\d-\d\d))? \}/

const CALIBRATED = /(serial: "([^"]+)", calibrated: )\d{4}-\d\d-\d\d(, due: )\d{4}-\d\d-\d\d/g

/** The install file of a site: every date moved alike, and the instruments' as the register has them on that day. */
export function fileOf({ example, reference, name, street, on }: Site): string {
  const text = readFileSync(new URL(`../../examples/${example}.skerry.yaml`, import.meta.url), 'utf8')
  const [, from = on, to = from] = INSPECTED.exec(text) ?? []
  const days = dayNumber(on) - dayNumber(to)
  return text
    .replaceAll(/\b20\d\d-\d\d-\d\d\b/g, (date) => dateOf(dayNumber(date) + days))
    .replaceAll(CALIBRATED, (_, before: string, serial: string, between: string) => {
      const { calibrated, due } = calibrationOn(serial, on)
      return `${before}${calibrated}${between}${due}`
    })
    .replace(/^( {2}reference: ).*$/m, `$1${reference}`)
    .replace(/^( {2}name: ).*$/m, `$1${quoted(name)}`)
    .replace(/^( {2}address: ).*$/m, `$1[ ${quoted(street)}, Fennmark ]`)
}

/** A moment some days after a date, at an hour of the day. */
export const after = (date: string, days: number, hour: number): Date =>
  new Date((dayNumber(date) + days) * DAY + hour * 3_600_000)
