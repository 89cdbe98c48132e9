import type { Device } from '#core/install.ts'
import breakers from '#schemas/tables/breaker-bands.json' with { type: 'json' }
import fuses from '#schemas/tables/fuse-currents.json' with { type: 'json' }
import british from '#schemas/tables/fuse-impedances-bs88.json' with { type: 'json' }
import type { Parameters } from './parameters.ts'

type Rows = Readonly<Record<string, Readonly<Record<string, number>> | undefined>>

const FUSE_ROWS: Rows = fuses.rows
const BRITISH_ROWS: Rows = british.rows

/**
 * Current Ia in A that operates a device within a time: for a breaker the upper end of its instantaneous band, whatever
 * the time; for a fuse gG the table of the rule book.
 *
 * @param time required disconnection time in s; the fuse tables hold 0.4 s and 5 s only
 * @param table the rule book's `fuse_currents`
 * @returns undefined for a fuse at another time or of a rating that the table does not hold
 * @source IEC 60898-1 (B 5, C 10, D 20 times the rating); gG by a loop tester's manual, p. 28, after IEC 60269-1; BS
 *   88-2 from the impedances of BS 7671:2018, Tables 41.2 and 41.4, as read on a reference page
 */
export function operatingCurrent(device: Device, time: number, table: Parameters['fuse_currents']): number | undefined {
  if (device.kind === 'breaker') return breakers.instantaneous[device.curve] * device.rated
  if (table === 'IEC 60269-1') return FUSE_ROWS[String(time)]?.[String(device.rated)]
  const impedance = BRITISH_ROWS[String(time)]?.[String(device.rated)]
  return impedance === undefined ? undefined : (british.factor * british.voltage) / impedance
}

/**
 * Conventional operating current I2 in A: 1.45 times the rating of a breaker; of a fuse gG 1.6 times from 16 A,
 * 1.9 times from 6 A; undefined below.
 *
 * @source IEC 60898-1; IEC 60364-4-43, 433.1 (fuses from 16 A from memory)
 */
export function conventionalOperatingCurrent(device: Device): number | undefined {
  if (device.kind === 'breaker') return breakers.conventional.operating * device.rated
  const band = fuses.conventional.bands.find(({ from }) => device.rated >= from)
  return band === undefined ? undefined : band.factor * device.rated
}
