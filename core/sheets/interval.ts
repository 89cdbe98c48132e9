import type { Install } from '#core/install.ts'
import table from '#schemas/tables/periodic-intervals.json' with { type: 'json' }
import { type EnteredField, entered } from './plan.ts'

/** Years between verifications that are usual for the premises; undefined where the guidance names no such premises. */
function usualInterval({ site }: Install): number | undefined {
  const rows: Readonly<Record<string, number>> = table.rows
  return site.premises === undefined ? undefined : rows[site.premises]
}

/** The same day some years later. Dates in ISO 8601 sort as they run, so a 29th of February may stay one. */
function yearsAfter(day: string, years: number): string {
  return `${Number(day.slice(0, 4)) + years}${day.slice(4)}`
}

function dueTooLate(install: Install): boolean | undefined {
  const { inspected, next_due } = install.report
  const years = usualInterval(install)
  if (inspected === undefined || next_due === undefined || years === undefined) return undefined
  return next_due > yearsAfter(inspected.to ?? inspected.from, years)
}

/** What the rules see of the time until the next verification. */
export const intervalFields: readonly EnteredField<Install>[] = [
  entered('usual_interval', 'years', 'Usual interval between verifications', ['site', 'premises'], usualInterval),
  entered('next_due_too_late', '', 'The next verification falls later than usual', ['report', 'next_due'], dueTooLate),
]
