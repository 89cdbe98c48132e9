import type { Install } from '#core/install.ts'
import type { Claim } from './claim.ts'

/** A calibration as the house's register has it; dates are `YYYY-MM-DD`. */
export interface KnownCalibration {
  readonly calibratedOn: string
  readonly dueOn: string
}

/** An instrument of the register, with all its calibrations in the order in which they were written. */
export interface KnownInstrument {
  readonly serial: string
  /** Day on which it was taken out of use. */
  readonly retiredOn: string | null
  readonly calibrations: readonly KnownCalibration[]
}

/** What was written last about each day of calibration: a later version with the same day corrects an earlier one. */
function standing({ calibrations }: KnownInstrument): readonly KnownCalibration[] {
  return [...new Map(calibrations.map((one) => [one.calibratedOn, one])).values()]
}

type Named = NonNullable<Install['instruments']>[string]
type Words = Pick<Claim, 'claim' | 'severity' | 'message' | 'remedy'>

function otherDates(said: Named, known: KnownInstrument): Words | undefined {
  const standings = standing(known)
  if (standings.some(({ calibratedOn, dueOn }) => calibratedOn === said.calibrated && dueOn === said.due))
    return undefined
  const list = standings.map(({ calibratedOn, dueOn }) => `${calibratedOn} (due ${dueOn})`).join(', ')
  return {
    claim: 'instrument-other-calibration',
    severity: 'failure',
    message: `The file says calibrated ${said.calibrated}, due ${said.due}; the register says ${list}.`,
    remedy: 'Compare with the certificate, and mend the file or the register.',
  }
}

function notCalibrated(day: string | null, known: KnownInstrument): Words | undefined {
  const covers = ({ calibratedOn, dueOn }: KnownCalibration): boolean =>
    day === null || (calibratedOn <= day && day <= dueOn)
  if (standing(known).some(covers)) return undefined
  return {
    claim: 'instrument-not-calibrated',
    severity: 'failure',
    message: `By the register, no calibration of it covers ${day}, the day of the inspection.`,
    remedy: 'Test again with an instrument in calibration, or enter the calibration that is missing in the register.',
  }
}

function retired(day: string | null, { retiredOn }: KnownInstrument): Words | undefined {
  if (day === null || retiredOn === null || day <= retiredOn) return undefined
  return {
    claim: 'instrument-retired',
    severity: 'failure',
    message: `It was taken out of use on ${retiredOn}, before the inspection on ${day}.`,
    remedy: 'Find out which instrument was used, and name that one.',
  }
}

const UNKNOWN: Words = {
  claim: 'instrument-not-in-register',
  severity: 'caution',
  message: 'The register of the house has no instrument with this serial number.',
  remedy: 'Check the serial number; if it is right, an administrator enters the instrument.',
}

/**
 * Holds the instruments that a file names against the register of the house.
 *
 * @param install the normalised file
 * @param known instruments of the register with the serial numbers that the file names
 */
export function instrumentClaims({ instruments = {}, report }: Install, known: readonly KnownInstrument[]): Claim[] {
  const first = report.inspected?.from ?? null
  const last = report.inspected?.to ?? first
  return Object.entries(instruments).flatMap(([id, said]) => {
    const found = known.find(({ serial }) => serial === said.serial.trim())
    const words =
      found === undefined
        ? [UNKNOWN]
        : [
            otherDates(said, found),
            // Calibrated on the first day and fallen due by the last is not calibrated throughout.
            notCalibrated(first, found) ?? notCalibrated(last, found),
            retired(last, found),
          ].filter((one) => one !== undefined)
    return words.map((one) => ({
      ...one,
      message: `${id} (serial ${said.serial}): ${one.message}`,
      subject: id,
      anchor: `instrument/${id}`,
      path: ['instruments', id],
    }))
  })
}
