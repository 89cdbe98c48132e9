import { describe, expect, it } from 'vitest'
import type { Path } from '#core/glossary.ts'
import { checkShape } from '#core/shape/shape.ts'
import { changed, example } from '../../schemas/corpus.ts'

const bakery = example('alder-mill-bakery').tree

/** What is told when one value of a right file is put in place of another. */
function told(path: (string | number)[], value: unknown): string[] {
  return checkShape(changed(bakery, path, value)).map((one) => `${one.path.join('/')}: ${one.message}`)
}

function batteryOf(tree: unknown): unknown {
  return (tree as { batteries: { BAT: unknown } }).batteries.BAT
}

describe('a value', () => {
  it.each<[string, Path, unknown, string]>([
    [
      'a number where text belongs',
      ['instruments', 'T1', 'serial'],
      417,
      '“Serial number” is the number 417, but takes text: write "417", in quotes.',
    ],
    [
      'one value where a list belongs',
      ['circuits', 'K1', 'phases'],
      'L1',
      '“Phases” is the text “L1”, but takes a list: write [ L1 ].',
    ],
    [
      'nothing',
      ['circuits', 'K1', 'load'],
      null,
      '“Load” is empty, but takes a block of keys: write { power: 1.4 kW, power_factor: 0.85, start: 2.0x }.',
    ],
    [
      'a list for a quantity',
      ['changeover', 'rated_current'],
      [35],
      '“Rated current” is a list, but takes a number in A, or text with its unit: write 35 A.',
    ],
    [
      'a block for a factor',
      ['circuits', 'K1', 'load', 'start'],
      {},
      '“Starting current” is a block of keys, but takes a number: write 2.0x.',
    ],
    [
      'true for a reading',
      ['supply', 'loop_impedance'],
      true,
      '“External loop impedance” is “true”, but takes a reading in Ω, or { not_tested: the reason }: write 0.24 ohm.',
    ],
    [
      'a number for a cable',
      ['circuits', 'K1', 'cable'],
      2.5,
      '“Cable” is the number 2.5, but takes a cable in short or in long: write 5G10.',
    ],
    [
      'text for a whole number',
      ['changeover', 'poles'],
      '4',
      '“Poles” is the text “4”, but takes a whole number: write 4.',
    ],
    [
      'text for true or false',
      ['circuits', 'K2', 'sockets'],
      'yes',
      '“Sockets” is the text “yes”, but takes true or false: write true.',
    ],
    [
      'a misspelt word',
      ['supply', 'earthing'],
      'TNS',
      '“Earthing system” is the text “TNS”, but takes only TN-S · TN-C-S · TT: write TN-S.',
    ],
    [
      'a number that is not offered',
      ['supply', 'nominal', 'phases'],
      2,
      '“Phases” is the number 2, but takes only 1 · 3: write one of them.',
    ],
    ['another version of the format', ['skerry'], 2, '“Format” is the number 2, but takes only 1: write one of them.'],
    [
      'a decimal comma',
      ['supply', 'loop_impedance'],
      '0,24 ohm',
      '“0,24 ohm” has a comma, and numbers are written with a decimal point: write 0.24 ohm.',
    ],
    [
      'a unit of another kind',
      ['changeover', 'rated_current'],
      '35 V',
      '“35 V” is a voltage, and this place takes a current: write it in A, mA or kA, for example 16 A.',
    ],
    [
      'a device that is none',
      ['supply', 'main_protection'],
      'GG63',
      '“GG63” is not a protective device that is known: write gG 63.',
    ],
    [
      'a breaker that is none',
      ['circuits', 'K1', 'device'],
      { breaker: 'b16' },
      '“b16” is not a protective device that is known: write B16.',
    ],
    [
      'a cable that is none',
      ['circuits', 'K1', 'cable', 'type'],
      '3G2,5',
      '“3G2,5” is not a cable that is known: write 3G2.5, with a decimal point.',
    ],
    [
      'a size that is none',
      ['circuits', 'K1', 'cable'],
      '3G3',
      '3 mm² is not a size of IEC 60228: write 2.5 or 4 mm².',
    ],
    [
      'a name with a blank',
      ['boards', 'EB', 'fed_from'],
      'the RCD',
      '“Fed from” cannot be “the RCD”: write it like supply.',
    ],
    [
      'a number below the range',
      ['circuits', 'K1', 'cable', 'length'],
      -3,
      '-3 m cannot be right here, the value is more than 0: correct it.',
    ],
    [
      'a number beyond the range',
      ['inverters', 'INV', 'settings', 'held_back_charge'],
      140,
      '140 % cannot be right here, the value is 100 or less: correct it.',
    ],
    ['a negative count', ['arrays', 'A1', 'strings'], 0, '0 cannot be right here, the value is 1 or more: correct it.'],
    [
      'a text that is too long',
      ['report', 'reference'],
      'x'.repeat(61),
      '“Reference” has 61 characters: shorten it to 60.',
    ],
    [
      'an empty text',
      ['site', 'name'],
      '',
      '“Name” is an empty text: write it, such as Alder Mill Bakery, or remove the key.',
    ],
    [
      'an empty list',
      ['circuits', 'K1', 'phases'],
      [],
      '“Phases” is an empty list: write at least one entry, such as [ L1 ].',
    ],
    [
      'a line named twice',
      ['circuits', 'K1', 'phases'],
      ['L1', 'L1'],
      '“Phases” names the same thing twice: remove one of them.',
    ],
    [
      'too long a list',
      ['site', 'address'],
      Array(9).fill('x'),
      '“Address” holds more than 8 entries: shorten it to that.',
    ],
    [
      'more entries than the format takes',
      ['batteries'],
      Object.fromEntries(Array.from({ length: 51 }, (_, index) => [`B${index}`, batteryOf(bakery)])),
      '“Batteries” holds more than 50 entries: shorten it to that.',
    ],
    [
      'text that could be read but is not in the usual form',
      ['circuits', 'K1', 'cable'],
      '3G2.50',
      '“Cable” cannot be “3G2.50”: write it like 5G10.',
    ],
    [
      'a reason that is missing',
      ['supply', 'fault_current'],
      {},
      '“Prospective fault current” lacks not_tested: add it, such as not_tested: Rain on the array.',
    ],
  ])('%s is told in words', (_, path, value, message) => {
    const problems = checkShape(changed(bakery, [...path], value))
    expect(problems.map((one) => one.message)).toEqual([message])
  })
})

describe('a date', () => {
  const day = ['report', 'next_due']
  it.each(['2028-02-29', '2000-02-29', '2030-12-31'])('%s is in the calendar', (date) =>
    expect(told(day, date)).toEqual([]),
  )
  it.each([
    ['2026-02-30', '“2026-02-30” is not in the calendar, 2026-02 has 28 days: write the right day.'],
    ['2100-02-29', '“2100-02-29” is not in the calendar, 2100-02 has 28 days: write the right day.'],
    ['2026-06-31', '“2026-06-31” is not in the calendar, 2026-06 has 30 days: write the right day.'],
    ['2026-06-00', '“2026-06-00” is not in the calendar, 2026-06 has 30 days: write the right day.'],
    ['2026-13-01', '“2026-13-01” is not a date, there is no month 13: write it like 2030-10-12.'],
    ['2026-00-01', '“2026-00-01” is not a date, there is no month 00: write it like 2030-10-12.'],
    ['12.10.2030', '“12.10.2030” is not a date: write it like 2030-10-12.'],
  ])('%s is not', (date, message) => expect(told(day, date)).toEqual([`report/next_due: ${message}`]))
  it('and time needs an offset', () => {
    const taken = ['readings', 'arrays', 'A1', 'strings', 0, 'taken']
    expect(told(taken, '2026-10-12T11:40+02:00')).toEqual([])
    expect(told(taken, '2026-10-12 11:40')[0]).toMatch(
      /is not a date and time: write it like 2026-10-12T11:40\+02:00\.$/,
    )
  })
})
