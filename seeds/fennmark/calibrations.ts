/** The instruments of the demonstration, each calibrated on the same day every year. */
export const INSTRUMENTS = [
  { serial: '0417-A', kind: 'multifunction installation tester', calibrated: '03-02' },
  { serial: '0533-C', kind: 'multifunction installation tester', calibrated: '01-19' },
  { serial: '88-31', kind: 'PV tester', calibrated: '05-20' },
  { serial: '91-07', kind: 'PV tester', calibrated: '11-04' },
  { serial: 'E-212', kind: 'earth tester', calibrated: '02-24' },
] as const

export const YEARS = [2023, 2024, 2025, 2026] as const

/** The calibration that an instrument had on a day, by its serial number. */
export function calibrationOn(serial: string, day: string): { readonly calibrated: string; readonly due: string } {
  const known = INSTRUMENTS.find((instrument) => instrument.serial === serial)
  if (known === undefined) throw new Error(`No instrument of the demonstration has the serial number ${serial}.`)
  const year = YEARS.findLast((one) => `${one}-${known.calibrated}` <= day)
  if (year === undefined) throw new Error(`${serial} was not calibrated before ${day}.`)
  return { calibrated: `${year}-${known.calibrated}`, due: `${year + 1}-${known.calibrated}` }
}
