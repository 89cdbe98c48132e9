import { describe, expect, it } from 'vitest'
import { table, tables } from '#core/report/blocks.ts'
import { cableLaid, cableName, deviceName, deviceText, residualName } from '#core/report/devices.ts'
import { distinct } from '#core/report/names.ts'
import { fillPage } from '#core/report/page.ts'
import {
  amount,
  amountOr,
  daysText,
  decimals,
  few,
  held,
  hoursText,
  printed,
  readingText,
  readingWithUnit,
  rounded,
} from '#core/report/print.ts'

const plain = (text: string): string => text.replaceAll('\u00a0', ' ')

describe('numbers as printed', () => {
  it.each([
    [2100, 'A', '2.1 kA'],
    [999, 'A', '999 A'],
    [3840, 'Wh', '3.84 kWh'],
    [1000, 'V', '1000 V'],
    [0.00008, 'Ω/m', '0.00008 Ω/m'],
    [0.0225, 'Ω·mm²/m', '0.0225 Ω·mm²/m'],
    [-12, '°C', '−12 °C'],
    [1.5, '', '1.5'],
  ])('%d %s is %s', (value, unit, words) => {
    expect(plain(amount(value, unit))).toBe(words)
  })

  it('a number and its unit are never parted', () => {
    expect(amount(6.2, 'Ω')).toBe('6.2\u00a0Ω')
    expect(held('reads 0.4 MΩ; 1 mm² is 50 % at 3 m, but 4 men')).toBe(
      'reads 0.4\u00a0MΩ; 1\u00a0mm² is 50\u00a0% at 3\u00a0m, but 4 men',
    )
  })

  it('a computed value has three digits that count, four from a hundred on', () => {
    expect(plain(printed(7.161125, 'A'))).toBe('7.16 A')
    expect(plain(printed(725.054, 'V'))).toBe('725.1 V')
    expect(printed(Number.POSITIVE_INFINITY, 'ms')).toBe('no trip')
    expect(printed(['K1', 'K2'], '')).toBe('K1 and K2')
    expect(printed(undefined, 'A')).toBe('–')
  })

  it('what is not known is a dash or a word', () => {
    expect(amountOr(undefined, 'A')).toBe('–')
    expect(amountOr(undefined, 'A', 'not stated')).toBe('not stated')
    expect(rounded(undefined, 2)).toBe('–')
  })

  it('a reading keeps the decimals that it was taken with', () => {
    expect(decimals(0.1, 2)).toBe('0.10')
    expect(decimals(0.954, 2)).toBe('0.954')
    expect(decimals(1 / 3, 2)).toBe('0.3333')
    expect(decimals(1 / 3, 5)).toBe('0.33333')
  })

  it('a reading beyond the instrument, without a trip, or not taken says so', () => {
    expect(readingText({ value: 999, bound: 'above' }, 0)).toBe('>999')
    expect(readingText({ value: 0.05, bound: 'below' }, 2)).toBe('<0.05')
    expect(readingText({ value: Number.POSITIVE_INFINITY, noTrip: true }, 0)).toBe('no trip')
    expect(readingText({ not_tested: 'rain' }, 0)).toBe('not tested')
    expect(readingText(undefined, 0)).toBe('–')
    expect(plain(readingWithUnit({ value: 180, at: 1000 }, 'MΩ', 0))).toBe('180 MΩ at 1000 V')
    expect(plain(readingWithUnit({ value: 0.24 }, 'Ω', 2))).toBe('0.24 Ω')
    expect(readingWithUnit({ value: Number.POSITIVE_INFINITY, noTrip: true }, 'ms', 0)).toBe('no trip')
  })
})

describe('days and hours as printed', () => {
  it('days of one month share it', () => {
    expect(plain(daysText({ from: '2026-10-12', to: '2026-10-13' }))).toBe('12 to 13 October 2026')
    expect(plain(daysText({ from: '2026-09-30', to: '2026-10-01' }))).toBe('30 September 2026 to 1 October 2026')
    expect(plain(daysText({ from: '2026-09-30' }))).toBe('30 September 2026')
    expect(daysText(undefined)).toBe('not yet inspected')
  })

  it('hours have minutes as long as they matter', () => {
    expect(plain(hoursText(7.296))).toBe('7 h 18 min')
    expect(plain(hoursText(6))).toBe('6 h')
    expect(plain(hoursText(72.4))).toBe('72 h')
    expect(hoursText(Number.POSITIVE_INFINITY)).toBe('without end')
  })
})

describe('names as printed', () => {
  it('many become a count', () => {
    expect(few(['a', 'b', 'c'], 3)).toBe('a, b, c')
    expect(few(['a', 'b', 'c', 'd'], 2)).toBe('a, b and 2 more')
  })

  it('the same name twice is told apart', () => {
    expect(distinct(['water pipe', 'gas pipe', 'water pipe'])).toEqual(['water pipe', 'gas pipe', 'water pipe/2'])
  })

  it('devices and cables are in the trade’s short form', () => {
    expect(deviceName({ kind: 'breaker', curve: 'B', rated: 16 })).toBe('B16')
    expect(plain(deviceText({ kind: 'fuse', curve: 'gG', rated: 63, breaking: 50000 }))).toBe('fuse gG 63 A, 50 kA')
    expect(deviceText({ kind: 'breaker', curve: 'C', rated: 32 })).toBe('breaker C32')
    expect(plain(residualName({ type: 'A', residual: 300, delay: 'S' }))).toBe('A 300 mA S')
    expect(plain(residualName({ type: 'B', residual: 30 }))).toBe('B 30 mA')
    const copper = { line: 2.5, cores: 3, material: 'copper', conductor_class: 1 } as const
    expect(cableName({ ...copper, neutral: 2.5, protective: 2.5 })).toBe('3G2.5')
    expect(cableName({ ...copper, cores: 2 })).toBe('2×2.5')
    expect(plain(cableName({ ...copper, material: 'aluminium', neutral: 2.5, protective: 1.5 }))).toBe(
      '2.5 + 2.5 + 1.5 mm² Al',
    )
    expect(
      plain(
        cableLaid({
          ...copper,
          insulation: 'xlpe',
          method: 'E',
          length: 18,
          ambient: 40,
          grouped: { circuits: 3, as: 'bunched' },
        }),
      ),
    ).toBe('XLPE, method E, 18 m, 40 °C, 3 bunched')
    expect(cableLaid(copper)).toBe('')
  })
})

describe('tables', () => {
  const rows = (count: number) =>
    Array.from({ length: count }, (_, index) => ({ anchor: `row/${index}`, head: { text: String(index) }, cells: [] }))
  const columns = [{ label: 'Row' }]

  it('small groups stay in one table, empty ones are left out', () => {
    const [only, ...others] = tables(
      't',
      columns,
      [
        { title: 'A', rows: rows(2) },
        { title: 'B', rows: [] },
        { title: 'C', rows: rows(8) },
      ],
      'Rows',
    )
    expect(others).toEqual([])
    expect(only?.groups.map(({ title }) => title)).toEqual(['A', 'C'])
  })

  it('large groups become tables of their own, so that their head repeats', () => {
    const found = tables('t', columns, [{ title: 'A', rows: rows(9) }, { rows: rows(1) }], 'Rows')
    expect(found.map(({ caption }) => caption)).toEqual(['Rows · A', 'Rows'])
    expect(new Set(found.map(({ anchor }) => anchor)).size).toBe(2)
  })

  it('nothing makes no table', () => {
    expect(tables('t', columns, [{ rows: [] }])).toEqual([])
    expect(table('t', columns, [])).not.toHaveProperty('caption')
  })
})

describe('filling a page', () => {
  const model = (text: string) => ({
    site: text,
    purpose: text,
    reference: 'x_1',
    titleLines: [text],
    front: [],
    sections: [
      {
        number: 1,
        title: 'T',
        anchor: 'a',
        blocks: [{ kind: 'prose', anchor: 'p', title: 'I_b of R_1', paragraphs: [text] }],
      },
    ],
    end: 'End',
  })

  it.each([
    '{{constructor}}',
    '{{{site}}}',
    '<b>bold</b>',
    '${7*7}',
    '<%=7*7%>',
    '{{#with this}}{{lookup . "constructor"}}{{/with}}',
    '&amp;',
    `"'\`=`,
  ])('keeps %s literal', (text) => {
    const html = fillPage('report', model(text))
    expect(html).not.toContain('<b>')
    const decoded = html
      .replaceAll('&lt;', '<')
      .replaceAll('&gt;', '>')
      .replaceAll('&quot;', '"')
      .replaceAll('&#x27;', "'")
      .replaceAll('&#x60;', '`')
      .replaceAll('&#x3D;', '=')
      .replaceAll('&amp;', '&')
    expect(decoded.split(text)).toHaveLength(5)
  })

  it('lowers what follows an underscore in words of our own only', () => {
    const html = fillPage('report', model('a_b'))
    expect(html).toContain('I<sub>b</sub> of R<sub>1</sub>')
    expect(html).toContain('<h1>a_b</h1>')
  })

  it('looks up nothing that a model inherits', () => {
    const inherited = Object.create({ site: 'inherited' }) as object
    expect(fillPage('report', Object.assign(inherited, { sections: [], front: [] }))).not.toContain('inherited')
  })

  it('knows no other page', () => {
    expect(() => fillPage('letter' as 'report', {})).toThrow('There is no page letter')
  })
})
