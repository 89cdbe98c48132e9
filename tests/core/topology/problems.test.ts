import { describe, expect, test } from 'vitest'
import { PROBLEM_CODES } from '#core/errors.ts'
import type { Install } from '#core/install.ts'
import { buildTopology } from '#core/topology/build.ts'
import { bakery, plainCircuit } from './bakery.ts'

const board = (fed_from: string) => ({ name: 'A board', fed_from })

interface Case {
  readonly why: string
  readonly install: Install
  readonly code: keyof typeof PROBLEM_CODES
  readonly path: readonly (string | number)[]
  readonly says: string
  /** Whether the tree stands nevertheless. */
  readonly stands: boolean
}

const cases: readonly Case[] = [
  {
    why: 'a circuit fed from a misspelt board',
    install: { ...bakery, circuits: { K1: plainCircuit('EBB') } },
    code: 'dangling-name',
    path: ['circuits', 'K1', 'fed_from'],
    says: 'Did you mean `EB`?',
    stands: false,
  },
  {
    why: 'a circuit fed from a name far from any other',
    install: { ...bakery, circuits: { K1: plainCircuit('Kitchen distribution') } },
    code: 'dangling-name',
    path: ['circuits', 'K1', 'fed_from'],
    says: 'Known are: `supply`, `MB`, `EB`, `F35`, `CO`, `RCD1`, `CO.load`.',
    stands: false,
  },
  {
    why: 'a circuit fed from a circuit',
    install: { ...bakery, circuits: { ...bakery.circuits, K3: plainCircuit('K1') } },
    code: 'not-a-feeder',
    path: ['circuits', 'K3', 'fed_from'],
    says: 'which is a circuit and feeds nothing',
    stands: false,
  },
  {
    why: 'a board fed from an inverter',
    install: { ...bakery, boards: { ...bakery.boards, SB: board('INV') } },
    code: 'not-a-feeder',
    path: ['boards', 'SB', 'fed_from'],
    says: 'which is an inverter and feeds nothing',
    stands: false,
  },
  {
    why: 'two boards that feed each other',
    install: { ...bakery, boards: { ...bakery.boards, X: board('Y'), Y: board('X') } },
    code: 'loop',
    path: ['boards', 'X', 'fed_from'],
    says: '`X` ← `Y` ← `X`',
    stands: false,
  },
  {
    why: 'a changeover fed from its own backed-up side',
    install: { ...bakery, changeover: { ...bakery.changeover, fed_from: 'CO.load' } },
    code: 'loop',
    path: ['changeover', 'fed_from'],
    says: '`CO` ← `CO`',
    stands: false,
  },
  {
    why: 'a circuit with the name of a board',
    install: { ...bakery, circuits: { MB: plainCircuit('EB') } },
    code: 'duplicate-name',
    path: ['circuits', 'MB'],
    says: '`MB` already names the board at `boards.MB`',
    stands: false,
  },
  {
    why: 'an instrument with the name of a circuit',
    install: { ...bakery, circuits: { ...bakery.circuits, T1: plainCircuit('EB') } },
    code: 'duplicate-name',
    path: ['instruments', 'T1'],
    says: '`T1` already names the circuit',
    stands: false,
  },
  {
    why: 'a meter with the name of the changeover',
    install: { ...bakery, meter: { id: 'CO', at: 'connection point' } },
    code: 'duplicate-name',
    path: ['meter'],
    says: 'Give this meter a name of its own',
    stands: false,
  },
  {
    why: 'a board that calls itself the supply',
    install: { ...bakery, boards: { ...bakery.boards, supply: board('MB') } },
    code: 'duplicate-name',
    path: ['boards', 'supply'],
    says: '`supply` already names the supply',
    stands: false,
  },
  {
    why: 'a board that takes the name of the backed-up side',
    install: { ...bakery, boards: { ...bakery.boards, 'CO.load': board('MB') } },
    code: 'duplicate-name',
    path: ['boards', 'CO.load'],
    says: 'the backed-up side of the changeover `CO`',
    stands: false,
  },
  {
    why: 'an array into an inverter that is not there',
    install: { ...bakery, inverters: {} },
    code: 'dangling-name',
    path: ['arrays', 'A1', 'into'],
    says: 'The file names none yet',
    stands: true,
  },
  {
    why: 'a battery into a misspelt inverter',
    install: {
      ...bakery,
      batteries: {
        BAT: {
          into: 'INW',
          chemistry: 'sodium-ion',
          usable: 9600,
          max_discharge: 5100,
          efficiency: 95,
          place: 'cellar',
        },
      },
    },
    code: 'dangling-name',
    path: ['batteries', 'BAT', 'into'],
    says: '`INW` does not name an inverter of this file. Did you mean `INV`?',
    stands: true,
  },
  {
    why: 'a link to nowhere',
    install: { ...bakery, links: { BY: { from: 'MB', to: 'Shed', position: 'open', interlocked: true } } },
    code: 'dangling-name',
    path: ['links', 'BY', 'to'],
    says: '`Shed` does not name anything in the tree of supply',
    stands: true,
  },
  {
    why: 'readings with an instrument that is not listed',
    install: { ...bakery, readings: { with: 'T9' } },
    code: 'dangling-name',
    path: ['readings', 'with'],
    says: '`T9` does not name an instrument',
    stands: true,
  },
  {
    why: 'readings of one circuit with an instrument that is not listed',
    install: { ...bakery, readings: { circuits: { K1: { with: 'T9' } } } },
    code: 'dangling-name',
    path: ['readings', 'circuits', 'K1', 'with'],
    says: '`T9` does not name an instrument',
    stands: true,
  },
  {
    why: 'readings of a circuit that is not there',
    install: { ...bakery, readings: { circuits: { K9: { polarity: 'correct' } } } },
    code: 'dangling-name',
    path: ['readings', 'circuits', 'K9'],
    says: '`K9` does not name a circuit',
    stands: true,
  },
  {
    why: 'readings of a residual-current device that is not there',
    install: { ...bakery, readings: { residual_current: { K1: {} } } },
    code: 'dangling-name',
    path: ['readings', 'residual_current', 'K1'],
    says: '`K1` does not name a residual-current device',
    stands: true,
  },
  {
    why: 'readings of an array that is not there',
    install: { ...bakery, readings: { arrays: { A2: {} } } },
    code: 'dangling-name',
    path: ['readings', 'arrays', 'A2'],
    says: 'Did you mean `A1`?',
    stands: true,
  },
  {
    why: 'more string readings than strings',
    install: {
      ...bakery,
      readings: { arrays: { A1: { strings: [{ voc: { value: 652 } }, { voc: { value: 650 } }] } } },
    },
    code: 'too-many',
    path: ['readings', 'arrays', 'A1', 'strings', 1],
    says: 'Array `A1` has 1 string, but readings of 2 are given',
    stands: true,
  },
]

describe('references that lead nowhere are errors at their place', () => {
  test.each(cases)('$why', ({ install, code, path, says, stands }) => {
    const { topology, problems } = buildTopology(install)
    expect(problems).toHaveLength(1)
    expect(problems[0]).toMatchObject({ code, path })
    expect(problems[0]?.message).toContain(says)
    expect(PROBLEM_CODES).toHaveProperty(code)
    expect(topology !== undefined).toBe(stands)
  })

  test('two strings too many on an array of two are counted in the plural', () => {
    const array = { ...bakery.arrays?.A1, strings: 2 }
    const strings = [{}, {}, {}]
    const install = { ...bakery, arrays: { A1: array }, readings: { arrays: { A1: { strings } } } } as Install
    expect(buildTopology(install).problems[0]?.message).toContain('has 2 strings, but readings of 3')
  })

  test('every bad reference is reported, not only the first', () => {
    const install = {
      ...bakery,
      circuits: { K1: plainCircuit('nowhere'), K2: plainCircuit('INV') },
      readings: { with: 'T9' },
    }
    expect(buildTopology(install).problems.map(({ code }) => code)).toEqual([
      'dangling-name',
      'not-a-feeder',
      'dangling-name',
    ])
  })

  test('what hangs below a ring is not reported again, two rings are reported apart', () => {
    const boards = { ...bakery.boards, X: board('Y'), Y: board('X'), Below: board('X'), Z: board('Z') }
    const { problems } = buildTopology({ ...bakery, boards })
    expect(problems.map(({ path }) => path)).toEqual([
      ['boards', 'X', 'fed_from'],
      ['boards', 'Z', 'fed_from'],
    ])
  })

  test('a long list of known names is cut', () => {
    const boards = Object.fromEntries(Array.from({ length: 20 }, (_, index) => [`Board ${index}`, board('supply')]))
    const install = { ...bakery, boards: { ...bakery.boards, ...boards }, circuits: { K1: plainCircuit('?') } }
    expect(buildTopology(install).problems[0]?.message).toMatch(/and 19 more\.$/)
  })

  test('a circuit whose own device is residual-current protection may carry its test readings', () => {
    const circuits = { K1: plainCircuit('EB', { residual_current: { type: 'A', residual: 30 } }) }
    const readings = { residual_current: { K1: {} } }
    expect(buildTopology({ ...bakery, circuits, readings }).problems).toEqual([])
  })
})
