import type { Reading, Span } from '#core/glossary.ts'
import type { Instrument, UncertaintyKind } from '#core/install/record.ts'
import table from '#schemas/tables/uncertainty.json' with { type: 'json' }

/** A relative uncertainty and where it comes from. */
export interface Uncertainty {
  /** % of the reading */
  readonly percent: number
  /** The instrument, a part of IEC 61557, or `none stated` */
  readonly source: string
}

const WIDEST: Readonly<Record<UncertaintyKind, Uncertainty>> = table.rows

/**
 * Relative uncertainty of a kind of measurement in %: what the instrument states, else the widest that the standard for
 * such instruments permits, else 0.
 *
 * @source IEC 61557-2, -3, -4; -5 and -6 from memory
 */
export function uncertaintyOf(kind: UncertaintyKind, instrument?: Instrument): Uncertainty {
  const stated = instrument?.uncertainty?.[kind]
  return stated === undefined ? WIDEST[kind] : { percent: stated, source: 'stated by the instrument' }
}

/**
 * The interval in which the true value of a reading lies, in the reading's unit: value ± u.
 *
 * A reading beyond the instrument's range is open on that side: `>999` reaches from 999 less its uncertainty to
 * infinity, `<0.05` from 0 to 0.05 and its uncertainty. A device that did not trip has an infinite time at both ends.
 *
 * @param reading any finite value, below zero too (a temperature)
 */
export function spanOf(reading: Reading, kind: UncertaintyKind, instrument?: Instrument): Span {
  const { value, bound, noTrip } = reading
  if (noTrip) return { low: Number.POSITIVE_INFINITY, high: Number.POSITIVE_INFINITY }
  const half = (Math.abs(value) * uncertaintyOf(kind, instrument).percent) / 100
  if (bound === 'above') return { low: value - half, high: Number.POSITIVE_INFINITY }
  if (bound === 'below') return { low: 0, high: value + half }
  return { low: value - half, high: value + half }
}
