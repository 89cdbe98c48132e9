import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { solarNoon, sunPosition, sunset } from '#core/quantities/sun.ts'
import { airMass, clearSkyIrradiance, directIrradiance } from '#core/quantities/sun-irradiance.ts'

const fennmark = { latitude: 47.31, longitude: 9.64 }

describe('where the sun stands', () => {
  test('the published case of NREL’s algorithm (NREL/TP-560-34302): zenith 50.111622°, azimuth 194.340241°', () => {
    const place = { latitude: 39.742476, longitude: -105.1786 }
    const { elevation, azimuth } = sunPosition(new Date('2003-10-17T12:30:30-07:00'), place)
    // The library takes another refraction and no parallax: measured 0.0041° and 0.0012° apart.
    expect(Math.abs(90 - elevation - 50.111622)).toBeLessThan(0.005)
    expect(Math.abs(azimuth - 194.340241)).toBeLessThan(0.002)
  })

  test('highest at noon by the sun, and then in the south', () => {
    const noon = solarNoon('2026-10-12', fennmark)
    const at = sunPosition(noon, fennmark)
    expect(at.azimuth).toBeCloseTo(180, 1)
    for (const minutes of [-30, 30]) {
      const other = sunPosition(new Date(noon.getTime() + minutes * 60_000), fennmark)
      expect(other.elevation).toBeLessThan(at.elevation)
    }
  })

  test('noon falls on the place’s own day, wherever it lies', () => {
    fc.assert(
      fc.property(fc.double({ min: -180, max: 180, noNaN: true }), (longitude) => {
        const noon = solarNoon('2026-03-20', { latitude: 0, longitude })
        const local = new Date(noon.getTime() + (longitude / 15) * 3_600_000)
        // The equation of time is below 17 minutes.
        return Math.abs(local.getTime() - Date.UTC(2026, 2, 20, 12)) < 17 * 60_000
      }),
    )
  })

  test('sunset comes after noon; in the polar summer there is none', () => {
    const noon = solarNoon('2026-10-12', fennmark)
    const set = sunset('2026-10-12', fennmark)
    expect((set?.getTime() ?? 0) - noon.getTime()).toBeGreaterThan(5 * 3_600_000)
    expect(set && sunPosition(set, fennmark).elevation).toBeCloseTo(-0.35, 1)
    expect(sunset('2026-06-21', { latitude: 75, longitude: 20 })).toBeUndefined()
  })
})

describe('irradiance under a clear sky', () => {
  test('seven tenths of 1353 W/m² get through at air mass 1: a public course on photovoltaics', () => {
    expect(directIrradiance(1)).toBeCloseTo(947.1, 9)
  })

  test('at air mass 1.5 within a tenth of the reference spectrum, 900 W/m² direct and 1000 in all: ASTM G173, from memory', () => {
    expect(Math.abs(directIrradiance(1.5) / 900 - 1)).toBeLessThan(0.1)
    expect(Math.abs((1.1 * directIrradiance(1.5)) / 1000 - 1)).toBeLessThan(0.1)
  })

  test('air mass by Kasten and Young: 1 in the zenith, about 2 at 30°, about 38 at the horizon', () => {
    expect(airMass(90)).toBeCloseTo(1, 3)
    expect(airMass(30)).toBeCloseTo(1.994, 3)
    expect(airMass(0)).toBeCloseTo(37.9, 1)
  })

  test('facing the sun: direct light and the sky that the plane sees', () => {
    const irradiance = clearSkyIrradiance({ elevation: 60, azimuth: 170 }, { tilt: 30, azimuth: 170 })
    expect(irradiance).toBeCloseTo(directIrradiance(airMass(60)) * (1 + (0.1 * (1 + Math.cos(Math.PI / 6))) / 2), 6)
  })

  test('with the sun behind it a steep plane sees only the sky; at night it sees nothing', () => {
    const behind = clearSkyIrradiance({ elevation: 10, azimuth: 0 }, { tilt: 90, azimuth: 180 })
    expect(behind).toBeCloseTo(0.05 * directIrradiance(airMass(10)), 6)
    expect(clearSkyIrradiance({ elevation: 0, azimuth: 90 }, { tilt: 0, azimuth: 0 })).toBe(0)
    expect(clearSkyIrradiance({ elevation: -5, azimuth: 90 }, { tilt: 0, azimuth: 0 })).toBe(0)
  })

  test('never negative, never above the direct light and its tenth', () => {
    const angle = (min: number, max: number) => fc.double({ min, max, noNaN: true })
    fc.assert(
      fc.property(angle(-90, 90), angle(0, 360), angle(0, 90), angle(0, 360), (elevation, azimuth, tilt, facing) => {
        const irradiance = clearSkyIrradiance({ elevation, azimuth }, { tilt, azimuth: facing })
        return irradiance >= 0 && irradiance <= 1.1 * 1353 * 0.7 + 1
      }),
    )
  })
})
