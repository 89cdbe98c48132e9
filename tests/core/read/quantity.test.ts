import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { parseQuantity, parseReading, printQuantity, printReading } from '#core/read/quantity.ts'

describe('quantities in the unit of their place', () => {
  it.each([
    ['0.42 ohm', 'resistance', 'ohm', 0.42],
    ['0.42 Ω', 'resistance', 'ohm', 0.42],
    ['0.42 \u2126', 'resistance', 'ohm', 0.42],
    ['420 mΩ', 'resistance', 'ohm', 0.42],
    ['420 mohm', 'resistance', 'ohm', 0.42],
    ['1.2kΩ', 'resistance', 'ohm', 1200],
    ['480 MΩ', 'insulation', 'Mohm', 480],
    ['480 Mohm', 'insulation', 'Mohm', 480],
    ['1.2 GΩ', 'insulation', 'Mohm', 1200],
    ['500 kΩ', 'insulation', 'Mohm', 0.5],
    ['2.5 mm²', 'area', 'mm²', 2.5],
    ['2.5mm2', 'area', 'mm²', 2.5],
    ['2.5 mm^2', 'area', 'mm²', 2.5],
    ['1.8 s', 'time', 's', 1.8],
    ['24 ms', 'time', 'ms', 24],
    ['0.024 s', 'time', 'ms', 24],
    ['500 µs', 'time', 'ms', 0.5],
    ['500 \u03bcs', 'time', 'ms', 0.5],
    ['2 min', 'time', 's', 120],
    ['1.1 min', 'time', 'ms', 66000],
    ['0.5 h', 'time', 'min', 30],
    ['90 s', 'time', 'min', 1.5],
    ['20 %', 'percentage', '%', 20],
    ['20%', 'percentage', '%', 20],
    ['20\u00a0%', 'percentage', '%', 20],
    ['20\u2009%', 'percentage', '%', 20],
    ['20\u202f%', 'percentage', '%', 20],
    ['\u221212 °C', 'temperature', '°C', -12],
    ['–12 °C', 'temperature', '°C', -12],
    ['-12 degC', 'temperature', '°C', -12],
    ['+31 C', 'temperature', '°C', 31],
    ['31 ºC', 'temperature', '°C', 31],
    ['31 \u2103', 'temperature', '°C', 31],
    ['-0.27 %/K', 'coefficient', '%/K', -0.27],
    ['-0.27 %/°C', 'coefficient', '%/K', -0.27],
    ['10 kVA', 'apparent-power', 'VA', 10000],
    ['3.33 kVA', 'apparent-power', 'VA', 3330],
    ['1.4 kW', 'power', 'W', 1400],
    ['9.6 kWh', 'energy', 'Wh', 9600],
    ['200 Ah', 'capacity', 'Ah', 200],
    ['2.1 kA', 'current', 'A', 2100],
    ['30 mA', 'current', 'mA', 30],
    ['0.03 A', 'residual-current', 'mA', 30],
    ['712 W/m²', 'irradiance', 'W/m²', 712],
    ['712 W/m2', 'irradiance', 'W/m²', 712],
    ['0.712 kW/m2', 'irradiance', 'W/m²', 712],
    ['50.0 Hz', 'frequency', 'Hz', 50],
    ['170 °', 'angle', '°', 170],
    ['170deg', 'angle', '°', 170],
    ['2.0x', 'factor', '', 2],
    ['2 ×', 'factor', '', 2],
    ['0.85', 'factor', '', 0.85],
    ['18000 A²s', 'let-through', 'A²s', 18000],
    ['18 kA2s', 'let-through', 'A²s', 18000000],
    ['5 mA/Ah', 'gas-current', 'mA/Ah', 5],
    ['210 m', 'length', 'm', 210],
    ['22000 mm', 'length', 'm', 22],
    ['1e3 V', 'voltage', 'V', 1000],
    ['.5 kV', 'voltage', 'V', 500],
    ['5. V', 'voltage', 'V', 5],
    ['230', 'voltage', 'V', 230],
    [230, 'voltage', 'V', 230],
    ['-0 V', 'voltage', 'V', 0],
    ['  230   V ', 'voltage', 'V', 230],
  ])('%s as %s in %s', (value, kind, unit, expected) => {
    expect(parseQuantity(value, kind, unit)).toEqual({ ok: true, value: expected })
  })

  it.each([
    ['1,5 ohm', 'resistance', 'ohm', 'decimal-comma', 'write 1.5 ohm.'],
    ['0,005 ohm', 'resistance', 'ohm', 'decimal-comma', 'write 0.005 ohm.'],
    ['1,000 V', 'voltage', 'V', 'decimal-comma', 'write 1.000 V or 1000 V.'],
    ['1.234,5 V', 'voltage', 'V', 'decimal-comma', 'write 1234.5 V.'],
    ['1.234,500 V', 'voltage', 'V', 'decimal-comma', 'write 1234.500 V.'],
    ['1,234.5 V', 'voltage', 'V', 'decimal-comma', 'write 1234.5 V.'],
    ['1,234,567 V', 'voltage', 'V', 'decimal-comma', 'write 1234567 V.'],
    ['10 000 V', 'voltage', 'V', 'number-separator', 'write 10000 V.'],
    ['10’000 V', 'voltage', 'V', 'number-separator', 'write 10000 V.'],
    ['012 V', 'voltage', 'V', 'number-leading-zero', 'write 12.'],
    ['1234567890123456 V', 'voltage', 'V', 'number-too-precise', '16 digits'],
    ['1e999 V', 'voltage', 'V', 'number-not-finite', 'beyond the range'],
    [Number.NaN, 'voltage', 'V', 'number-not-finite', '230 V'],
    [
      '20 A',
      'voltage',
      'V',
      'unit-of-wrong-kind',
      'is a current, and this place takes a voltage: write it in V, mV or kV, for example 230 V.',
    ],
    ['20 mm', 'area', 'mm²', 'unit-of-wrong-kind', 'is a length'],
    ['-12 °', 'temperature', '°C', 'unit-of-wrong-kind', 'is an angle'],
    ['5 A', 'factor', '', 'unit-of-wrong-kind', 'write it without a unit, for example 2.0x'],
    ['20 volts', 'voltage', 'V', 'unit-unknown', 'The unit “volts” is not known'],
    ['20 V/m', 'voltage', 'V', 'unit-unknown', 'in V, mV or kV'],
    ['10 KVA', 'apparent-power', 'VA', 'unit-unknown', 'write 10 kVA.'],
    ['50 hz', 'frequency', 'Hz', 'unit-unknown', 'write 50 Hz.'],
    ['0.4 Ohm', 'resistance', 'ohm', 'unit-unknown', 'write 0.4 Ω.'],
    ['abc', 'voltage', 'V', 'not-a-quantity', '“abc” is not a voltage: write a number, for example 230 V.'],
    ['', 'voltage', 'V', 'not-a-quantity', '230 V'],
    ['V 230', 'voltage', 'V', 'not-a-quantity', '230 V'],
    [`1${' '.repeat(10)}${'x'.repeat(80)}`, 'voltage', 'V', 'not-a-quantity', '230 V'],
    [null, 'time', 's', 'not-a-quantity', 'This is not a time'],
    [true, 'time', 's', 'not-a-quantity', '1.8 s'],
    [['1 s'], 'time', 's', 'not-a-quantity', '1.8 s'],
  ])('%s is refused as %s in %s: %s', (value, kind, unit, code, words) => {
    expect(parseQuantity(value, kind, unit)).toEqual({ ok: false, code, message: expect.stringContaining(words) })
  })

  it('a place with a kind or unit that does not exist is a mistake of the schema', () => {
    expect(() => parseQuantity(1, 'weight', 'kg')).toThrow('no kind of quantity named weight')
    expect(() => parseQuantity(1, 'voltage', 'A')).toThrow('The unit A is not one of voltage')
  })

  it('moves the decimal point exactly: what was typed in one unit is what is typed in the other', () => {
    const digits = fc.integer({ min: -999_999_999, max: 999_999_999 })
    fc.assert(
      fc.property(digits, fc.integer({ min: 0, max: 6 }), (whole, places) => {
        const typed = (shift: number) => Number(`${whole}e${shift - places}`)
        const text = (whole / 10 ** places).toFixed(places)
        fc.pre(Number(text) === typed(0))
        const plus = (value: number) => ({ ok: true, value: value === 0 ? 0 : value })
        expect(parseQuantity(`${text} s`, 'time', 'ms')).toEqual(plus(typed(3)))
        expect(parseQuantity(`${text} kΩ`, 'insulation', 'Mohm')).toEqual(plus(typed(-3)))
        expect(parseQuantity(`${text} mΩ`, 'resistance', 'ohm')).toEqual(plus(typed(-3)))
      }),
    )
  })

  it.each([
    ['voltage', 'V'],
    ['current', 'mA'],
    ['insulation', 'Mohm'],
    ['area', 'mm²'],
    ['temperature', '°C'],
    ['coefficient', '%/K'],
    ['factor', ''],
    ['let-through', 'A²s'],
    ['irradiance', 'W/m²'],
    ['gas-current', 'mA/Ah'],
    ['angle', '°'],
    ['time', 'h'],
  ])('%s in %s is read back as it was printed', (kind, unit) => {
    fc.assert(
      fc.property(fc.double({ noNaN: true, min: -1e15, max: 1e15 }), (any) => {
        const value = Number(any.toPrecision(15))
        fc.pre(Math.abs(value) > 1e-300)
        expect(parseQuantity(printQuantity(value, unit), kind, unit)).toEqual({ ok: true, value })
      }),
    )
  })
})

describe('readings', () => {
  it.each([
    ['180 MΩ', 'insulation', 'Mohm', { value: 180 }],
    [180, 'insulation', 'Mohm', { value: 180 }],
    ['>999 MΩ', 'insulation', 'Mohm', { value: 999, bound: 'above' }],
    ['> 999 MΩ', 'insulation', 'Mohm', { value: 999, bound: 'above' }],
    ['≥ 1 GΩ', 'insulation', 'Mohm', { value: 1000, bound: 'above' }],
    ['>=1 GΩ', 'insulation', 'Mohm', { value: 1000, bound: 'above' }],
    ['<0.05 ohm', 'resistance', 'ohm', { value: 0.05, bound: 'below' }],
    ['≤0.05 ohm', 'resistance', 'ohm', { value: 0.05, bound: 'below' }],
    ['<= 50 mΩ', 'resistance', 'ohm', { value: 0.05, bound: 'below' }],
    ['>999', 'insulation', 'Mohm', { value: 999, bound: 'above' }],
    ['180 MΩ at 1000 V', 'insulation', 'Mohm', { value: 180, at: 1000 }],
    ['>999 MΩ at 0.5 kV', 'insulation', 'Mohm', { value: 999, bound: 'above', at: 500 }],
    ['no trip', 'time', 'ms', { value: Number.POSITIVE_INFINITY, noTrip: true }],
    ['No\u00a0trip ', 'time', 'ms', { value: Number.POSITIVE_INFINITY, noTrip: true }],
    ['24 ms', 'time', 'ms', { value: 24 }],
    ['-5 °C', 'temperature', '°C', { value: -5 }],
  ])('%s', (value, kind, unit, reading) => {
    expect(parseReading(value, kind, unit)).toEqual({ ok: true, value: reading })
  })

  it.each([
    ['no trip', 'voltage', 'V', 'reading-no-trip', 'residual-current device'],
    ['no trip', 'time', 's', 'reading-no-trip', 'write a time here'],
    ['0.3 ohm at 500 V', 'resistance', 'ohm', 'reading-test-voltage', 'leave out “at 500 V”'],
    ['180 MΩ at 1000 ohm', 'insulation', 'Mohm', 'unit-of-wrong-kind', 'takes a voltage'],
    ['180 MΩ at ', 'insulation', 'Mohm', 'unit-unknown', '“MΩ at” is not known'],
    ['OL', 'insulation', 'Mohm', 'reading-bound', '">999 MΩ"'],
    ['> O.L', 'resistance', 'ohm', 'reading-bound', '">199 ohm"'],
    ['∞ MΩ', 'insulation', 'Mohm', 'reading-bound', 'the end of the instrument’s range'],
    ['>1,5 MΩ', 'insulation', 'Mohm', 'decimal-comma', 'write 1.5 MΩ'],
    ['>', 'insulation', 'Mohm', 'not-a-quantity', '480 MΩ'],
    ['>>5 MΩ', 'insulation', 'Mohm', 'not-a-quantity', '480 MΩ'],
    [null, 'insulation', 'Mohm', 'not-a-quantity', '480 MΩ'],
    ['20 A', 'insulation', 'Mohm', 'unit-of-wrong-kind', 'takes an insulation resistance'],
  ])('%s as %s in %s is refused: %s', (value, kind, unit, code, words) => {
    expect(parseReading(value, kind, unit)).toEqual({ ok: false, code, message: expect.stringContaining(words) })
  })

  it('are read back as they were printed', () => {
    const value = fc.integer({ min: 0, max: 1e6 }).map((whole) => whole / 1000)
    const reading = fc.record(
      { value, bound: fc.constantFrom('above' as const, 'below' as const), at: fc.constantFrom(250, 500, 1000) },
      { requiredKeys: ['value'] },
    )
    fc.assert(
      fc.property(reading, (any) => {
        expect(parseReading(printReading(any, 'Mohm'), 'insulation', 'Mohm')).toEqual({ ok: true, value: any })
      }),
    )
    expect(printReading({ value: Number.POSITIVE_INFINITY, noTrip: true }, 'ms')).toBe('no trip')
  })
})
