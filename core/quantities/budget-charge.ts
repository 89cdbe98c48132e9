/** What the batteries of the island hold together. */
export interface Store {
  /** Wh at the start */
  readonly held: number
  /** Wh, full */
  readonly usable: number
  /** From charge to a.c. output, above 0, up to 1 */
  readonly efficiency: number
}

/** How a charge goes on. */
export interface Course {
  /** Wh at the start of each hour and at the end of the last: one more than there are hours */
  readonly charge: readonly number[]
  /** h until it first runs empty and no longer serves the load, with the fraction of the hour; undefined if never */
  readonly lasts: number | undefined
}

/**
 * Charge of a battery hour by hour: a surplus fills it up to its usable energy, a shortfall is drawn through its
 * efficiency. An empty battery takes up the next surplus; whether the inverter starts again by itself is not said.
 *
 * @param load W, constant
 * @param power W given in the hour that starts so many hours after the start
 * @param hours whole, 1 or more
 */
export function courseOf(store: Store, load: number, power: (hour: number) => number, hours: number): Course {
  const charge = [store.held]
  let now = store.held
  let lasts: number | undefined
  for (let hour = 0; hour < hours; hour += 1) {
    const surplus = power(hour) - load
    const change = surplus >= 0 ? surplus : surplus / store.efficiency
    if (change < 0 && now + change < 0) lasts ??= hour + now / -change
    now = Math.min(store.usable, Math.max(0, now + change))
    charge.push(now)
  }
  return { charge, lasts }
}
