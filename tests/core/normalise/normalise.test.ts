import { describe, expect, it } from 'vitest'
import { INSTALL_PLAN } from '#core/generated/install-plan.ts'
import { normalise } from '#core/normalise/normalise.ts'
import { walk } from '#core/normalise/walk.ts'
import { changed, EXAMPLES, example } from '../../schemas/corpus.ts'

const bakery = example('alder-mill-bakery').tree
const { install } = normalise(bakery)

/** What is told of one value of a file that is right otherwise. */
function told(path: (string | number)[], value: unknown): string[] {
  return normalise(changed(bakery, path, value)).problems.map((one) => `${one.path.join('/')}: ${one.message}`)
}

describe('a quantity', () => {
  it('is in the unit that the schema names, whatever unit it was written in', () => {
    expect(install.supply.nominal).toEqual({ voltage: 230, phases: 3, frequency: 50 })
    expect(install.inverters?.INV?.rated_power).toBe(10_000)
    expect(install.inverters?.INV?.island?.per_phase).toBe(3330)
    expect(install.residual_current?.RCD1?.residual).toBe(30)
    expect(install.batteries?.BAT).toMatchObject({ usable: 9600, max_discharge: 5100, efficiency: 95 })
    expect(install.arrays?.A1?.module.voc_coefficient).toBe(-0.27)
    expect(install.circuits?.K1?.load).toEqual({
      power: 1400,
      power_factor: 0.85,
      start: 2,
      must_run: true,
      daily_energy: 9000,
    })
    expect(install.site.position).toEqual({ latitude: 47.31, longitude: 9.64, altitude: 210 })
  })
  it('without a unit is taken in the unit of its place', () => {
    expect(normalise(changed(bakery, ['changeover', 'rated_current'], 35)).install.changeover.rated_current).toBe(35)
    expect(
      normalise(changed(bakery, ['residual_current', 'RCD1', 'residual'], 30)).install.residual_current?.RCD1?.residual,
    ).toBe(30)
  })
})

describe('a reading', () => {
  it('keeps its bound, its test voltage, and that nothing tripped', () => {
    const { circuits, residual_current } = install.readings ?? {}
    expect(circuits?.K1?.insulation).toEqual({ value: 999, bound: 'above', at: 500 })
    expect(circuits?.K2?.loop?.grid).toEqual({ value: 0.61 })
    expect(residual_current?.RCD1?.grid).toEqual({
      half: { value: Number.POSITIVE_INFINITY, noTrip: true },
      rated: { value: 24 },
      five_times: { value: 17 },
      ramp: { value: 21 },
    })
    expect(install.supply.fault_current).toEqual({ value: 2100 })
  })
  it('that is missing on purpose keeps its reason', () => {
    const { install: dairy } = normalise(example('fell-side-dairy').tree)
    const string = dairy.readings?.arrays?.WEST?.strings?.[1]
    expect(string).toMatchObject({ irradiance: { not_tested: 'Rain and unsteady light' }, voc: { value: 662 } })
  })
})

describe('shorthand', () => {
  it('of a device is written out, in short and in long', () => {
    expect(install.supply.main_protection).toEqual({ kind: 'fuse', curve: 'gG', rated: 63 })
    expect(install.circuits?.K1?.device).toEqual({ kind: 'breaker', curve: 'C', rated: 16, breaking: 6000 })
    expect(install.overcurrent?.F35).toEqual({
      device: { kind: 'fuse', curve: 'gG', rated: 35 },
      breaking: 50_000,
      fed_from: 'MB',
    })
  })
  it('of a cable is written out, copper of class 2 where nothing is said', () => {
    const cable = { line: 2.5, neutral: 2.5, protective: 2.5, cores: 3, material: 'copper', conductor_class: 2 }
    expect(install.circuits?.K2?.cable).toEqual({ ...cable, insulation: 'pvc', method: 'B2', length: 22 })
    expect(normalise(changed(bakery, ['circuits', 'K2', 'cable'], '3G2.5')).install.circuits?.K2?.cable).toEqual(cable)
  })
  it('is not needed: a cable can name each conductor', () => {
    const { install: hall } = normalise(example('reed-hall-design').tree)
    expect(hall.circuits?.K3?.cable).toMatchObject({ line: 2.5, conductor_class: 1, length: 19 })
    expect(hall.circuits?.G1?.device).toEqual({ kind: 'fuse', curve: 'gG', rated: 32, breaking: 50_000 })
  })
})

describe('what is left out', () => {
  it('is the IEC book, and nothing else is supplied', () => {
    const { install: plain } = normalise(changed(bakery, ['report', 'rulebook'], undefined))
    expect(plain.report.rulebook).toBe('iec')
    expect(plain).not.toHaveProperty('links')
    expect(plain.changeover).not.toHaveProperty('neutral_opens')
  })
})

describe('text outside the range of its place', () => {
  it.each<[string, (string | number)[], unknown, string]>([
    [
      'a cable of no length',
      ['circuits', 'K1', 'cable', 'length'],
      '0 m',
      '0 m cannot be right here, the value is more than 0: correct it.',
    ],
    [
      'a negative length',
      ['meter', 'link', 'length'],
      '-3 m',
      '-3 m cannot be right here, the value is more than 0: correct it.',
    ],
    [
      'a nominal voltage of nothing',
      ['supply', 'nominal', 'voltage'],
      '0 V',
      '0 V cannot be right here, the value is more than 0: correct it.',
    ],
    [
      'more than all the charge',
      ['inverters', 'INV', 'settings', 'held_back_charge'],
      '140 %',
      '140 % cannot be right here, the value is 100 or less: correct it.',
    ],
    [
      'a negative reading',
      ['readings', 'circuits', 'K1', 'continuity'],
      '-0.2 ohm',
      '-0.2 Ω cannot be right here, the value is 0 or more: correct it.',
    ],
    [
      'a coefficient of the wrong sign',
      ['arrays', 'A1', 'module', 'voc_coefficient'],
      '0.27 %/K',
      '0.27 %/K cannot be right here, the value is 0 or less: correct it.',
    ],
    [
      'a breaking capacity of nothing',
      ['circuits', 'K1', 'device', 'breaking'],
      '0 kA',
      '0 A cannot be right here, the value is more than 0: correct it.',
    ],
  ])('is refused: %s', (_, path, value, message) => {
    expect(told(path, value)).toEqual([`${path.join('/')}: ${message}`])
  })
  it('is no number at all', () => {
    expect(told(['site', 'lowest_temperature'], 'cold')).toEqual([
      'site/lowest_temperature: “cold” is not a temperature: write a number, for example -12 °C.',
    ])
  })
  it('is left out of the normalised file', () => {
    const { install: short } = normalise(changed(bakery, ['meter', 'link', 'length'], '-3 m'))
    expect(short.meter?.link).not.toHaveProperty('length')
  })
  it('is a conductor size that is not made', () => {
    const cable = { line: '2.7 mm²', cores: 3 }
    expect(told(['circuits', 'K1', 'cable'], cable)).toEqual([
      'circuits/K1/cable/line: 2.7 mm² is not a size of IEC 60228: write 2.5 or 4 mm².',
    ])
  })
  it('is everywhere told at its place, many at once', () => {
    const twice = changed(
      changed(bakery, ['readings', 'load_steps', 0, 'lowest_voltage'], 'low'),
      ['site', 'lowest_temperature'],
      '-90 °C',
    )
    expect(normalise(twice).problems.map(({ path }) => path.join('/'))).toEqual([
      'site/lowest_temperature',
      'readings/load_steps/0/lowest_voltage',
    ])
  })
})

describe('the file itself', () => {
  it('is not changed', () => {
    const frozen = deepFrozen(structuredClone(bakery))
    expect(normalise(frozen).problems).toEqual([])
    expect(frozen).toEqual(bakery)
  })
  it.each(EXAMPLES.filter(({ name }) => name !== 'wrong-in-shape.skerry.yaml'))(
    '$name has nothing out of range',
    ({ tree }) => {
      expect(normalise(tree).problems).toEqual([])
    },
  )
  it.each([null, 7, 'text'])('may be %j at the place of a block: that is left to the shape', (tree) => {
    const at = { path: [], problems: [] }
    expect(walk(tree, { as: 'map', each: INSTALL_PLAN }, at)).toBe(tree)
    expect(walk('text', { as: 'list', each: INSTALL_PLAN }, at)).toBe('text')
    expect(walk('text', INSTALL_PLAN, at)).toBe('text')
  })
})

function deepFrozen<T>(value: T): T {
  if (typeof value === 'object' && value !== null) Object.values(value).forEach(deepFrozen)
  return Object.freeze(value)
}
