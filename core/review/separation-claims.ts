import type { Install } from '#core/install.ts'
import type { Claim } from './claim.ts'

/** What an operator demands from a day on, in the order in which it was written. */
export interface KnownDemand {
  readonly separation: 'all poles' | 'line poles' | 'not stated'
  readonly statedIn: string
  readonly validFrom: string
}

/** The demand that holds on a day: the one valid from the latest day up to it, and of several the one written last. */
export function demandOn(day: string, demands: readonly KnownDemand[]): KnownDemand | undefined {
  return demands
    .filter(({ validFrom }) => validFrom <= day)
    .reduce<KnownDemand | undefined>(
      (best, one) => (best === undefined || one.validFrom >= best.validFrom ? one : best),
      undefined,
    )
}

type Words = Pick<Claim, 'claim' | 'severity' | 'message' | 'remedy'>

const NOT_STATED_REMEDY = 'Enter supply.separation with the demand and where it is stated.'

function wordsOn({ supply }: Install, demand: KnownDemand): Words | undefined {
  const { separation, statedIn, validFrom } = demand
  if (separation === 'not stated') return undefined
  const demanded = `${supply.operator} demands that ${separation} are opened (${statedIn}, valid from ${validFrom})`
  const said = supply.separation?.required
  if (said === undefined)
    return {
      claim: 'separation-not-stated',
      severity: 'failure',
      message: `${demanded}; the file does not say so.`,
      remedy: NOT_STATED_REMEDY,
    }
  if (said === separation) return undefined
  return {
    claim: 'separation-other',
    // Who opens the neutral too, where the lines would do, has kept the demand; the source is still to be looked up.
    severity: said === 'all poles' ? 'caution' : 'failure',
    message: `${demanded}; the file says ${said}.`,
    remedy: 'Look it up in the conditions themselves, and mend the file or the register.',
  }
}

/**
 * Holds the separation that a file names against what the register of the house has of its operator.
 *
 * @param install the normalised file
 * @param demands everything that the register has of this operator; nothing when it is not in it
 * @param today counts where the file names no day of inspection
 */
export function separationClaims(install: Install, demands: readonly KnownDemand[], today: string): Claim[] {
  const { inspected } = install.report
  const day = inspected?.to ?? inspected?.from ?? today
  const demand = demandOn(day, demands)
  const words: Words | undefined =
    demand === undefined
      ? {
          claim: 'operator-not-in-register',
          severity: 'note',
          message: `The register of the house has nothing that ${install.supply.operator} demanded on ${day}.`,
          remedy: 'An administrator enters the operator’s conditions.',
        }
      : wordsOn(install, demand)
  if (words === undefined) return []
  return [{ ...words, subject: 'supply', anchor: 'supply/separation', path: ['supply', 'separation'] }]
}
