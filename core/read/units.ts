/** What a unit is worth in the first unit of its kind: `times` × 10^`power`. */
export interface Unit {
  readonly power: number
  readonly times: number
}

interface Kind {
  /** As it stands in a sentence. */
  readonly name: string
  /** By spelling, as `canonical` writes it; the first ones are shown as what is allowed. */
  readonly units: Readonly<Record<string, Unit>>
  /** As a person would write it. */
  readonly example: string
}

/** A unit that differs from the first one by a power of ten. */
function ten(power: number): Unit {
  return { power, times: 1 }
}

const CURRENTS = { A: ten(0), mA: ten(-3), kA: ten(3), µA: ten(-6) }
const OHMS = { ohm: ten(0), mohm: ten(-3), kohm: ten(3), Mohm: ten(6), Gohm: ten(9), µohm: ten(-6) }

/**
 * The kinds of quantity and their units. Names and symbols of units follow the SI Brochure, 9th edition (2019), tables 4,
 * 7 and 8; `var`, horsepower and the like are left out because no place of the file takes them.
 */
const KINDS = {
  voltage: { name: 'a voltage', units: { V: ten(0), mV: ten(-3), kV: ten(3) }, example: '230 V' },
  current: { name: 'a current', units: CURRENTS, example: '16 A' },
  'residual-current': { name: 'a residual current', units: CURRENTS, example: '30 mA' },
  resistance: { name: 'a resistance', units: OHMS, example: '0.42 ohm' },
  insulation: { name: 'an insulation resistance', units: OHMS, example: '480 MΩ' },
  power: { name: 'a power', units: { W: ten(0), kW: ten(3), MW: ten(6), mW: ten(-3) }, example: '1.4 kW' },
  'apparent-power': { name: 'an apparent power', units: { VA: ten(0), kVA: ten(3), MVA: ten(6) }, example: '10 kVA' },
  energy: { name: 'an energy', units: { Wh: ten(0), kWh: ten(3), MWh: ten(6) }, example: '9.6 kWh' },
  capacity: { name: 'a battery capacity', units: { Ah: ten(0), mAh: ten(-3) }, example: '200 Ah' },
  time: {
    name: 'a time',
    units: {
      s: ten(0),
      ms: ten(-3),
      min: { power: 0, times: 60 },
      h: { power: 0, times: 3600 },
      µs: ten(-6),
    },
    example: '1.8 s',
  },
  length: { name: 'a length', units: { m: ten(0), cm: ten(-2), mm: ten(-3), km: ten(3) }, example: '18 m' },
  area: { name: 'a cross-section', units: { mm2: ten(0), cm2: ten(2) }, example: '2.5 mm²' },
  temperature: { name: 'a temperature', units: { '°C': ten(0), C: ten(0), degC: ten(0) }, example: '-12 °C' },
  coefficient: {
    name: 'a temperature coefficient',
    units: { '%/K': ten(0), '%/°C': ten(0), '%/C': ten(0) },
    example: '-0.27 %/K',
  },
  percentage: { name: 'a percentage', units: { '%': ten(0) }, example: '40 %' },
  frequency: { name: 'a frequency', units: { Hz: ten(0), kHz: ten(3), mHz: ten(-3) }, example: '50 Hz' },
  irradiance: { name: 'an irradiance', units: { 'W/m2': ten(0), 'kW/m2': ten(3) }, example: '712 W/m²' },
  angle: { name: 'an angle', units: { '°': ten(0), deg: ten(0) }, example: '30 °' },
  factor: { name: 'a factor', units: { '': ten(0), x: ten(0) }, example: '2.0x' },
  'let-through': { name: 'a let-through energy', units: { A2s: ten(0), kA2s: ten(6) }, example: '18000 A²s' },
  'gas-current': { name: 'a gassing current', units: { 'mA/Ah': ten(0), 'A/Ah': ten(3) }, example: '5 mA/Ah' },
} as const satisfies Readonly<Record<string, Kind>>

const BY_NAME: ReadonlyMap<string, Kind> = new Map(Object.entries(KINDS))

/**
 * The kind of that name.
 *
 * @param kind as the schema names it
 * @throws Error when there is none: the schema is then wrong, not the file
 */
export function kindOf(kind: string): Kind {
  const found = BY_NAME.get(kind)
  if (found === undefined) throw new Error(`There is no kind of quantity named ${kind}`)
  return found
}

/** The kind that a unit belongs to; the first one where several share it, none for what is no unit. */
export function kindWithUnit(unit: string): Kind | undefined {
  return [...BY_NAME.values()].find((kind) => Object.hasOwn(kind.units, unit))
}

/**
 * A unit of the kind that differs from a misspelt one by capital letters only: `KV` for `kV`. A capital in front is a
 * factor of a thousand million between milli and mega, so the one that begins alike goes first: `MOhm` is `MΩ`.
 */
export function sameButForCapitals(kind: Kind, unit: string): string | undefined {
  const alike = Object.keys(kind.units).filter((known) => known.toLowerCase() === unit.toLowerCase())
  return alike.find((known) => known.charAt(0) === unit.charAt(0)) ?? alike[0]
}

/** The units of a kind as they are printed, the usual ones only; none for a factor. */
export function usualUnits(kind: Kind): string[] {
  const units = Object.keys(kind.units).filter((unit) => !/^(?:x?$|µ)/.test(unit))
  return units.map(printed)
}

/** Spellings that are canonical as they stand. */
const CANONICAL = /^[A-Za-z0-9%/]*$/

/**
 * One spelling for each unit: the ohm sign and the Greek letter (both are in use, the Unicode standard makes them equal),
 * both micro signs, the degree sign and its look-alike, and superscripts written as digits.
 */
export function canonical(unit: string): string {
  if (CANONICAL.test(unit)) return unit
  return unit
    .replace(/[\u03a9\u2126]/g, 'ohm')
    .replace(/[\u03bc]/g, 'µ')
    .replace(/[\u00ba\u02da]/g, '°')
    .replace(/\u2103/g, '°C')
    .replace(/\^?2|\u00b2/g, '2')
    .replace(/^\u00d7$/, 'x')
}

/** A unit as a person would print it: `mm²` for `mm2`. */
export function printed(unit: string): string {
  return unit.replace('ohm', 'Ω').replace('2', '²')
}
