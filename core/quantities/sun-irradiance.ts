import type { PvArray } from '#core/install.ts'
import sky from '#schemas/tables/clear-sky.json' with { type: 'json' }
import type { SunPosition } from './sun.ts'

const radians = (degrees: number): number => (degrees * Math.PI) / 180

/**
 * Air mass that sunlight passes, relative to the zenith.
 *
 * @param elevation ° above the horizon, 0 to 90
 * @source Kasten and Young (1989)
 */
export function airMass(elevation: number): number {
  const { factor, shift, exponent } = sky.airMass
  return 1 / (Math.sin(radians(elevation)) + factor * (elevation + shift) ** exponent)
}

/**
 * Irradiance in W/m² square to the sun under a clear sky at sea level: 1353 · 0.7^(AM^0.678).
 *
 * @param mass air mass, 1 or more
 * @source Meinel and Meinel (1976), as printed in a public course on photovoltaics
 */
export function directIrradiance(mass: number): number {
  return sky.beyond * sky.transmission ** (mass ** sky.exponent)
}

/**
 * Irradiance in W/m² in the plane of an array under a clear sky: the direct light at its angle, and one tenth of it from
 * the part of the sky that the plane sees. No haze, no horizon, no shade, no light from the ground.
 *
 * @returns 0 while the sun is down
 * @source Meinel and Meinel (1976) for direct and diffuse light; angle of incidence by geometry
 */
export function clearSkyIrradiance(
  { elevation, azimuth }: SunPosition,
  { tilt, azimuth: facing }: NonNullable<PvArray['orientation']>,
): number {
  if (elevation <= 0) return 0
  const direct = directIrradiance(airMass(elevation))
  const [height, slope] = [radians(elevation), radians(tilt)]
  const straight =
    Math.sin(height) * Math.cos(slope) + Math.cos(height) * Math.sin(slope) * Math.cos(radians(azimuth - facing))
  return direct * Math.max(0, straight) + (sky.diffuse * direct * (1 + Math.cos(slope))) / 2
}
