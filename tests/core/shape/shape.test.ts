import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { PROBLEM_CODES } from '#core/errors.ts'
import type { Path } from '#core/glossary.ts'
import { checkShape } from '#core/shape/shape.ts'
import { changed, EXAMPLES, example } from '../../schemas/corpus.ts'

const bakery = example('alder-mill-bakery').tree

/** What is told when one value of a right file is put in place of another. */
function told(path: (string | number)[], value: unknown): string[] {
  return checkShape(changed(bakery, path, value)).map((one) => `${one.path.join('/')}: ${one.message}`)
}

describe('a file of the right shape', () => {
  it.each(EXAMPLES.filter(({ name }) => name !== 'wrong-in-shape.skerry.yaml'))(
    '$name is accepted as it stands',
    ({ tree }) => {
      expect(checkShape(tree)).toEqual([])
    },
  )
  it('never asks for the schema', () => {
    const refuse = () => {
      throw new Error('The schema was asked for')
    }
    expect(checkShape(bakery, refuse)).toEqual([])
    expect(() => checkShape({}, refuse)).toThrow('The schema was asked for')
  })
})

describe('a file that is wrong in many ways', () => {
  it('gets one problem for each of its numbered faults, at its place', () => {
    const wrong = example('wrong-in-shape')
    const numbered = wrong.text.split('\n').flatMap((line) => line.split('#')[1]?.match(/\b\d+(?=[:,]|$)/g) ?? [])
    const problems = checkShape(wrong.tree)
    expect(problems.length).toBe(Number(numbered.at(-1)))
    expect(new Set(problems.map(({ path }) => path.join('/'))).size).toBe(problems.length)
  })
  it('gets at most 200 problems, and how many more there are', () => {
    const circuits = Object.fromEntries(Array.from({ length: 300 }, (_, index) => [`K${index}`, 7]))
    const problems = checkShape(changed(bakery, ['circuits'], circuits))
    expect(problems.length).toBe(201)
    expect(problems.at(-1)?.message).toBe('100 more problems are not shown: mend these 200 first.')
  })
})

describe('a key', () => {
  it('that is mistyped gets the nearest one, and the one that is meant is not missed as well', () => {
    const { fed_from, ...rest } = (bakery as { circuits: { K1: { fed_from: string } } }).circuits.K1
    expect(told(['circuits', 'K1'], { ...rest, fedfrom: fed_from })).toEqual([
      'circuits/K1/fedfrom: “Circuit” has no key “fedfrom”: write fed_from.',
    ])
  })
  it('that is like none gets the list of what is allowed', () => {
    expect(told(['site', 'position', 'colour'], 'red')).toEqual([
      'site/position/colour: “Position” has no key “colour”: remove it, or use one of latitude, longitude, altitude.',
    ])
  })
  it('made by a decimal comma between braces gets the mended number', () => {
    expect(told(['circuits', 'K1', 'cable'], { type: '3G2.5', length: 1, '5 m': null })).toEqual([
      'circuits/K1/cable/5 m: A comma inside braces starts a new key, here “5 m”: write length: 1.5 m.',
    ])
  })
  it('made by a decimal comma gets no guess where the number before it is not known', () => {
    const guess = 'A comma inside braces starts a new key, here “5”: write the number with a decimal point.'
    expect(told(['circuits', 'K1', 'load', '5'], null)).toEqual([`circuits/K1/load/5: ${guess}`])
  })
  it('that begins with a digit but holds something is only unknown', () => {
    expect(told(['site', 'position', '5 m'], 3)[0]).toMatch(/has no key “5 m”: remove it/)
  })
  it.each([
    [['report', 'reference'], 'report: “Report” lacks reference: add it, such as reference: FM-2026-031.'],
    [['circuits', 'K1', 'phases'], 'circuits/K1: “Circuit” lacks phases: add it, such as phases: [ L1 ].'],
    [
      ['supply'],
      ': “Skerry install file, version 1” lacks supply: add it, such as supply: { operator: Fennmark Grid, ',
    ],
  ])('that is missing is told at its parent: %s', (path, start) => {
    expect(told(path, undefined)[0]?.startsWith(start)).toBe(true)
  })
  it('that is missing beside others is told once for all of them', () => {
    const problems = told(['circuits', 'K1'], { serves: 'Oven', fed_from: 'EB', phases: ['L1'] })
    expect(problems).toEqual([
      'circuits/K1: “Circuit” lacks device and cable: add them, such as device: B16, cable: 5G10.',
    ])
  })
  it('of a device in long form is a breaker or a fuse, not both and not none', () => {
    const device = ['circuits', 'K1', 'device']
    expect(told(device, { breaking: '6 kA' })).toEqual([
      'circuits/K1/device: “Device” names no device: add breaker or fuse, such as breaker: B16 or fuse: gG 35.',
    ])
    expect(told(device, { breaker: 'B16', fuse: 'gG 16' })).toEqual([
      'circuits/K1/device/breaker: “breaker” cannot stand beside “fuse”: keep one of them.',
    ])
  })
  it('of a cable says its size once', () => {
    const cable = ['circuits', 'K1', 'cable']
    expect(told(cable, { method: 'C' })).toEqual([
      'circuits/K1/cable: “Cable” lacks type: add it, such as type: 3G2.5.',
    ])
    expect(told(cable, { line: '4 mm²' })).toEqual([
      'circuits/K1/cable: “Cable” lacks cores: add it, such as cores: 3.',
    ])
    expect(told(cable, { type: '3G2.5', cores: 3 })).toEqual([
      'circuits/K1/cable/cores: “cores” cannot stand beside “type”: keep one of them.',
    ])
  })
})

describe('an id', () => {
  const board = { name: 'Board', fed_from: 'supply' }
  it.each(['1MB', 'main board', 'M/B', 'Ä1', `A${'b'.repeat(32)}`])('cannot be %s', (id) => {
    const problems = checkShape(changed(bakery, ['boards', id], board))
    expect(problems.map(({ code, path }) => [code, path])).toEqual([['pattern', ['boards', id]]])
  })
  it.each(['supply', 'installation', 'earthing'])('cannot be %s, which is a name of the format’s own', (id) => {
    const problems = checkShape(changed(bakery, ['boards', id], board))
    expect(problems.map(({ code, path }) => [code, path])).toEqual([['reserved-key', ['boards', id]]])
    expect(told(['changeover', 'id'], id)[0]).toMatch(/is a name of the format’s own/)
  })
  it('that is a value follows the same rules', () => {
    expect(told(['meter', 'id'], '1M')[0]).toMatch(/“1M” cannot be an id/)
  })
})

describe('whatever stands in a file', () => {
  const value = fc.jsonValue({ maxDepth: 3 })
  it('is judged without a failure of our own, in finished sentences of the closed list of problems', () => {
    const places = fc.constantFrom<Path>(
      [],
      ['circuits'],
      ['circuits', 'K1'],
      ['circuits', 'K1', 'cable'],
      ['report'],
      ['supply', 'main_protection'],
    )
    fc.assert(
      fc.property(places, value, (path, found) => {
        for (const { code, message } of checkShape(changed(bakery, [...path], found))) {
          expect(PROBLEM_CODES).toHaveProperty(code)
          expect(message).toMatch(/\S: .*\.$/s)
        }
      }),
      { numRuns: 300 },
    )
  })
})
