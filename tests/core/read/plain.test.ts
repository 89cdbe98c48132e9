import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { resolvePlain } from '#core/read/plain.ts'

describe('values without quotes, YAML 1.2 core schema (clause 10.3.2)', () => {
  it.each([
    ['', null],
    ['~', null],
    ['null', null],
    ['Null', null],
    ['true', true],
    ['FALSE', false],
    ['0', 0],
    ['-0', 0],
    ['16', 16],
    ['+5', 5],
    ['-12', -12],
    ['.5', 0.5],
    ['5.', 5],
    ['0.42', 0.42],
    ['1e3', 1000],
    ['1.5E-3', 0.0015],
    ['123456789012345', 123456789012345],
    ['0.000000000000000123', 1.23e-16],
    ['0.10000000000000000000', 0.1],
    ['1000000000000000000000', 1e21],
  ])('%s is read as %s', (source, value) => {
    expect(resolvePlain(source)).toEqual({ value })
  })

  it.each([
    'yes',
    'no',
    'on',
    'off',
    'Yes',
    'NO',
    'y',
    'n',
    'tRUE',
    'nULL',
    '2026-10-12',
    '2026-10-12T10:00:00Z',
    '1,5',
    '0.42 ohm',
    '1.2.3',
    '3G2.5',
    'B16',
    '-',
    '.',
    '+',
    'e5',
    '1e',
    '0b11',
    '10:99',
    'FM-2026-031',
    '_1',
    '1_000 V',
    '.nano',
    'infinity',
    'NaN',
    'Note',
  ])('%s is text', (source) => {
    expect(resolvePlain(source)).toEqual({ value: source })
  })

  it.each([
    ['012', 'number-leading-zero', 'write 12, or put it in quotes ("012")'],
    ['-007.5', 'number-leading-zero', 'write -7.5,'],
    ['00', 'number-leading-zero', 'write 0,'],
    ['1234567890123456', 'number-too-precise', 'has 16 digits'],
    ['12345678901234567000', 'number-too-precise', 'has 17 digits'],
    ['0.1234567890123456789', 'number-too-precise', 'write 0.123456789012346,'],
    ['1234567890123456e400', 'number-too-precise', 'write fewer digits'],
    ['1e999', 'number-not-finite', 'beyond the range'],
    ['-1e999', 'number-not-finite', 'beyond the range'],
    ['1e-400', 'number-not-finite', 'beyond the range'],
    ['.inf', 'number-not-finite', '">999 MΩ"'],
    ['-.INF', 'number-not-finite', '">999 MΩ"'],
    ['.nan', 'number-not-finite', '">999 MΩ"'],
    [`5${'0'.repeat(300_000)}1`, 'number-too-precise', 'has 300002 digits'],
    ['1_000', 'number-separator', 'write 1000.'],
    ['-1_000.5', 'number-separator', 'write -1000.5.'],
    ['1:30', 'number-sexagesimal', 'read as 90 by some programs: write 90,'],
    ['-1:30:00', 'number-sexagesimal', 'write -5400,'],
    ['0x1F', 'number-radix', 'write 31.'],
    ['-0o17', 'number-radix', 'write -15.'],
  ])('%s is refused, and the mended text is shown', (source, code, words) => {
    expect(resolvePlain(source)).toEqual({ fault: { code, message: expect.stringContaining(words) } })
  })

  it('a long text that looks like a number is text, and is read at once', () => {
    const start = performance.now()
    for (const source of [`${'1_'.repeat(250_000)}x`, '1_'.repeat(250_000), `1${':1'.repeat(250_000)}`]) {
      expect(resolvePlain(source)).toEqual({ value: source })
    }
    expect(performance.now() - start).toBeLessThan(500)
  })

  it('keeps every number of up to fifteen digits', () => {
    fc.assert(
      fc.property(fc.double({ noNaN: true, noDefaultInfinity: true, min: -1e300, max: 1e300 }), (any) => {
        const value = Number(any.toPrecision(15))
        fc.pre(value === 0 || Math.abs(value) > 1e-300)
        expect(resolvePlain(String(value))).toEqual({ value: value === 0 ? 0 : value })
      }),
    )
  })
})
