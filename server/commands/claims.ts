import type { Judged } from '#core/engine.ts'
import { groupedBy } from '#core/report/grouped-by.ts'
import type { Claim } from '#core/review/claim.ts'
import { instrumentClaims, type KnownInstrument } from '#core/review/instrument-claims.ts'
import { separationClaims } from '#core/review/separation-claims.ts'
import type { Tx } from '#server/db.ts'
import { conditionsOf } from '#server/queries/conditions.ts'
import { type InstrumentRow, instrumentsBySerial } from '#server/queries/instruments.ts'

const dayOf = (at: Date): string => at.toISOString().slice(0, 10)

function knownInstruments(rows: readonly InstrumentRow[]): KnownInstrument[] {
  return [...groupedBy(rows, ({ serial }) => serial)].map(([serial, versions]) => {
    const [{ retired_at: retired }] = versions
    return {
      serial,
      retiredOn: retired === null ? null : dayOf(retired),
      calibrations: versions.map(({ calibrated_on, due_on }) => ({ calibratedOn: calibrated_on, dueOn: due_on })),
    }
  })
}

/**
 * What a judged file says of instruments and of the operator's demand, held against the registers of the house. A claim
 * of severity `failure` keeps the report from being issued.
 *
 * @param now counts as the day of inspection where the file names none
 */
export async function claimsOf(
  tx: Tx,
  organisation: string,
  { install }: Pick<Judged, 'install'>,
  now: Date,
): Promise<Claim[]> {
  const serials = Object.values(install.instruments ?? {}).map(({ serial }) => serial.trim())
  const instruments = await instrumentsBySerial(tx, organisation, serials)
  const conditions = await conditionsOf(tx, organisation, install.supply.operator)
  const demands = conditions.map(({ separation, stated_in, valid_from }) => ({
    separation,
    statedIn: stated_in,
    validFrom: valid_from,
  }))
  return [
    ...instrumentClaims(install, knownInstruments(instruments)),
    ...separationClaims(install, demands, dayOf(now)),
  ]
}
