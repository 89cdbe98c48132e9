import { describe, expect, it } from 'vitest'
import { CONDUCTOR_SIZES, parseCable, parseDevice } from '#core/read/shorthand.ts'

describe('protective devices', () => {
  it.each([
    ['B16', { kind: 'breaker', curve: 'B', rated: 16 }],
    ['C 32', { kind: 'breaker', curve: 'C', rated: 32 }],
    ['D10 A', { kind: 'breaker', curve: 'D', rated: 10 }],
    ['C0.5', { kind: 'breaker', curve: 'C', rated: 0.5 }],
    ['gG 35', { kind: 'fuse', curve: 'gG', rated: 35 }],
    [' gG35 ', { kind: 'fuse', curve: 'gG', rated: 35 }],
    [
      { breaker: 'B16', breaking: '6 kA' },
      { kind: 'breaker', curve: 'B', rated: 16, breaking: 6000 },
    ],
    [
      { breaker: 'B16', let_through: '18000 A²s' },
      { kind: 'breaker', curve: 'B', rated: 16, let_through: 18000 },
    ],
    [
      { breaking: 50000, fuse: 'gG 32' },
      { kind: 'fuse', curve: 'gG', rated: 32, breaking: 50000 },
    ],
  ])('%j', (value, device) => {
    expect(parseDevice(value)).toEqual({ ok: true, value: device })
  })

  it.each([
    ['b16', 'device-unknown', 'write B16', undefined],
    ['16B', 'device-unknown', 'write B16', undefined],
    ['gl 35', 'device-unknown', 'write gG 35', undefined],
    ['K16', 'device-unknown', 'write a breaker as B16, C32 or D10, a fuse as gG 35', undefined],
    ['B', 'device-unknown', 'write a breaker as B16', undefined],
    ['16', 'device-unknown', 'write a breaker as B16', undefined],
    ['B0', 'device-unknown', 'has no rated current', undefined],
    [16, 'device-unknown', 'This is not a protective device', undefined],
    [null, 'device-unknown', 'This is not a protective device', undefined],
    [['B16'], 'device-unknown', 'This is not a protective device', undefined],
    [{}, 'device-unknown', 'either a breaker or a fuse', undefined],
    [{ breaker: 'B16', fuse: 'gG 35' }, 'device-unknown', '{ fuse: gG 35, breaking: 50 kA }', undefined],
    [{ breaker: 'x' }, 'device-unknown', '“x” is not a protective device', ['breaker']],
    [{ breaker: 'gG 35' }, 'device-unknown', 'write “fuse” before it', ['breaker']],
    [{ fuse: 'gG 35', breaking: '6 kV' }, 'unit-of-wrong-kind', 'takes a current', ['breaking']],
    [{ fuse: 'gG 35', let_through: '6,5' }, 'decimal-comma', 'write 6.5', ['let_through']],
    [
      { fuse: 'gG 35', curve: 'B' },
      'unknown-key',
      '“curve” is not known here: write breaker, fuse, breaking or let_through',
      ['curve'],
    ],
  ])('%j is refused', (value, code, words, at) => {
    expect(parseDevice(value)).toMatchObject({
      ok: false,
      code,
      message: expect.stringContaining(words),
      ...(at && { at }),
    })
  })
})

describe('cables', () => {
  const copper = { material: 'copper', conductor_class: 2 }

  it.each([
    ['3G2.5', { line: 2.5, neutral: 2.5, protective: 2.5, cores: 3 }],
    ['5G6', { line: 6, neutral: 6, protective: 6, cores: 5 }],
    ['5 g 6 mm²', { line: 6, neutral: 6, protective: 6, cores: 5 }],
    ['4G16', { line: 16, protective: 16, cores: 4 }],
    ['2G1.5', { line: 1.5, protective: 1.5, cores: 2 }],
    ['7G1.5', { line: 1.5, neutral: 1.5, protective: 1.5, cores: 7 }],
    ['4X10', { line: 10, neutral: 10, cores: 4 }],
    ['4x10', { line: 10, neutral: 10, cores: 4 }],
    ['4×10 mm2', { line: 10, neutral: 10, cores: 4 }],
    ['3x16', { line: 16, cores: 3 }],
    ['2x0.75', { line: 0.75, neutral: 0.75, cores: 2 }],
    ['1x300', { line: 300, cores: 1 }],
    [{ type: '5G10' }, { line: 10, neutral: 10, protective: 10, cores: 5 }],
    [
      { line: '2.5 mm²', neutral: 2.5, protective: '1.5 mm2', cores: 3 },
      { line: 2.5, neutral: 2.5, protective: 1.5, cores: 3 },
    ],
    [
      { line: 16, cores: 1, material: 'aluminium', conductor_class: 1 },
      { line: 16, cores: 1, material: 'aluminium', conductor_class: 1 },
    ],
  ])('%j', (value, cable) => {
    expect(parseCable(value)).toEqual({ ok: true, value: { ...copper, ...cable } })
  })

  it('with how it is laid', () => {
    const value = {
      type: '3G2.5',
      insulation: 'pvc',
      method: 'B2',
      length: '1800 cm',
      ambient: '30 °C',
      grouped: { circuits: 2, as: 'single layer' },
    }
    expect(parseCable(value)).toEqual({
      ok: true,
      value: {
        ...copper,
        line: 2.5,
        neutral: 2.5,
        protective: 2.5,
        cores: 3,
        insulation: 'pvc',
        method: 'B2',
        length: 18,
        ambient: 30,
        grouped: { circuits: 2, as: 'single layer' },
      },
    })
  })

  it.each([
    ['3G2,5', 'cable-unknown', 'write 3G2.5, with a decimal point', undefined],
    ['2.5', 'cable-unknown', 'write cores and size as 3G2.5, 5G6 or 4x10', undefined],
    ['3H2.5', 'cable-unknown', '“3H2.5” is not a cable', undefined],
    ['0G2.5', 'cable-unknown', 'write cores and size', undefined],
    ['1G2.5', 'cable-unknown', 'no core for a line', undefined],
    [3, 'cable-unknown', 'This is not a cable', undefined],
    ['3G3', 'size-not-standard', '3 mm² is not a size of IEC 60228: write 2.5 or 4 mm².', undefined],
    ['3G0.1', 'size-not-standard', 'write 0.5 mm²', undefined],
    ['3G400', 'size-not-standard', 'write 300 mm²', undefined],
    [{ type: '3G3', length: 5 }, 'size-not-standard', 'write 2.5 or 4 mm²', ['type']],
    [{ line: 3, cores: 3 }, 'size-not-standard', 'write 2.5 or 4 mm²', ['line']],
    [{ line: 2.5, neutral: '2.5 m', cores: 3 }, 'unit-of-wrong-kind', 'is a length', ['neutral']],
    [{ line: 2.5 }, 'missing-key', '“cores” is missing', undefined],
    [{ cores: 3 }, 'missing-key', '“line” is missing', undefined],
    [{ line: 2.5, cores: 2.5 }, 'wrong-type', 'not a whole number', ['cores']],
    [{ line: 2.5, cores: 0 }, 'wrong-type', 'for example 3', ['cores']],
    [{ type: '3G2.5', cores: 3 }, 'unknown-key', '“cores” is not known here', ['cores']],
    [{ type: '3G2.5', insulation: 'PVC' }, 'not-allowed-value', 'write pvc or xlpe', ['insulation']],
    [{ type: '3G2.5', conductor_class: '2' }, 'not-allowed-value', 'write 1, 2 or 5', ['conductor_class']],
    [{ type: '3G2.5', length: '18 s' }, 'unit-of-wrong-kind', 'is a time', ['length']],
    [{ type: '3G2.5', grouped: 2 }, 'missing-key', '{ circuits: 2, as: single layer }', ['grouped']],
    [{ type: '3G2.5', grouped: { circuits: 2 } }, 'missing-key', 'two keys', ['grouped']],
    [{ type: '3G2.5', grouped: { circuits: 2, as: 'heap' } }, 'not-allowed-value', 'write bunched,', ['grouped', 'as']],
    [
      { type: '3G2.5', grouped: { circuits: '2', as: 'bunched' } },
      'wrong-type',
      'whole number',
      ['grouped', 'circuits'],
    ],
  ])('%j is refused', (value, code, words, at) => {
    expect(parseCable(value)).toMatchObject({
      ok: false,
      code,
      message: expect.stringContaining(words),
      ...(at && { at }),
    })
  })

  it('every size of the list is accepted', () => {
    for (const line of CONDUCTOR_SIZES) expect(parseCable(`3G${line}`)).toMatchObject({ ok: true, value: { line } })
  })
})
