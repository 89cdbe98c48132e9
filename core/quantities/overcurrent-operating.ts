import type { Device } from '#core/install.ts'
import breakers from '#schemas/tables/breaker-bands.json' with { type: 'json' }
import fuses from '#schemas/tables/fuse-currents.json' with { type: 'json' }

const FUSE_ROWS: Readonly<Record<string, Readonly<Record<string, number>> | undefined>> = fuses.rows

/**
 * Current Ia in A that operates a device within a time: for a breaker the upper end of its instantaneous band, whatever
 * the time; for a fuse gG the table.
 *
 * @param time required disconnection time in s; the fuse table holds 0.4 s and 5 s only
 * @returns undefined for a fuse at another time or of a rating that the table does not hold
 * @source IEC 60898-1 (B 5, C 10, D 20 times the rating); gG by a loop tester's manual, p. 28, after IEC 60269-1
 */
export function operatingCurrent(device: Device, time: number): number | undefined {
  if (device.kind === 'breaker') return breakers.instantaneous[device.curve] * device.rated
  return FUSE_ROWS[String(time)]?.[String(device.rated)]
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
