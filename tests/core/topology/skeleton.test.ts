import { describe, expect, it } from 'vitest'
import { skeletonOf } from '#core/topology/skeleton.ts'

/** A letter that stands for something that could not be read. */
const COVERED = 'K\ue000'

const FILE = {
  report: { reference: 'FM-1', rulebook: 'de' },
  changeover: { id: 'CO', fed_from: 'MB', poles: '4' },
  meter: { id: 'M1', at: 'nowhere' },
  boards: { MB: { fed_from: 'supply', name: 7 } },
  overcurrent: { F1: { fed_from: 'MB' } },
  residual_current: { R1: { fed_from: 'CO' } },
  inverters: { INV: { fed_from: 'CO' } },
  circuits: { K1: { fed_from: 'R1', residual_current: { type: 'Z' } }, K2: {} },
  arrays: { A1: { into: 'INV', strings: 2 }, A2: { into: 'INV', strings: 'two' } },
  batteries: { BAT: { into: 'INV' } },
  links: { L1: { from: 'MB', to: 'CO' } },
  instruments: { T1: 'a tester' },
  readings: { with: 'T1', circuits: { K1: { with: 'T2' } }, arrays: { A1: { strings: [{}, {}] } } },
}

const skeleton = (changes: Readonly<Record<string, unknown>> = {}) => skeletonOf({ ...FILE, ...changes })

describe('names and references of a file that is not in shape', () => {
  it.each([
    ['a file that is a list', []],
    ['a file that is a word', 'skerry'],
    ['an empty file', undefined],
    ['a file without a changeover', { ...FILE, changeover: undefined }],
    ['a changeover without a name', { ...FILE, changeover: { fed_from: 'MB' } }],
    ['a changeover with a number for a name', { ...FILE, changeover: { id: 4 } }],
    ['a changeover whose name cannot be read', { ...FILE, changeover: { id: COVERED } }],
    ['a section that is a list', { ...FILE, circuits: [{ fed_from: 'MB' }] }],
    ['a section that is a word', { ...FILE, boards: 'MB' }],
    ['an entry whose name cannot be read', { ...FILE, boards: { [COVERED]: { fed_from: 'supply' } } }],
    ['readings of a name that cannot be read', { ...FILE, readings: { circuits: { [COVERED]: {} } } }],
    ['readings that are a list', { ...FILE, readings: { arrays: [] } }],
  ])('are in doubt in %s', (_, tree) => {
    expect(skeletonOf(tree)).toBeUndefined()
  })

  it('are kept in every section, by what each refers to', () => {
    expect(skeleton()).toEqual({
      report: { rulebook: 'de' },
      supply: { nominal: { phases: 3 } },
      changeover: { id: 'CO', poles: 4, fed_from: 'MB' },
      meter: { id: 'M1' },
      boards: { MB: { fed_from: 'supply' } },
      overcurrent: { F1: { fed_from: 'MB' } },
      residual_current: { R1: { fed_from: 'CO' } },
      inverters: { INV: { fed_from: 'CO' } },
      circuits: { K1: { fed_from: 'R1', residual_current: {} }, K2: { fed_from: 'supply' } },
      arrays: { A1: { into: 'INV', strings: 2 }, A2: { into: 'INV' } },
      batteries: { BAT: { into: 'INV' } },
      links: { L1: { from: 'MB', to: 'CO' } },
      instruments: { T1: {} },
      readings: {
        with: 'T1',
        circuits: { K1: { with: 'T2' } },
        residual_current: {},
        arrays: { A1: { strings: [{}, {}] } },
      },
    })
  })

  it('stand at the supply where what feeds them is not said, is no name, or cannot be read', () => {
    const circuits = { K1: {}, K2: { fed_from: 7 }, K3: { fed_from: COVERED }, K4: 'a cooker', K5: ['MB'] }
    const at = { fed_from: 'supply' }
    expect(skeleton({ circuits })?.circuits).toEqual({ K1: at, K2: at, K3: at, K4: at, K5: at })
  })

  it('do without sections, readings, meter and rule book that are not there or are no such thing', () => {
    const bare = skeletonOf({ changeover: { id: 'CO' } })
    expect(bare).toMatchObject({
      report: {},
      changeover: { id: 'CO', fed_from: 'supply' },
      circuits: {},
      instruments: {},
      readings: {},
    })
    expect(bare).not.toHaveProperty('meter')
    expect(skeleton({ readings: 'none yet', meter: 'M1', report: [] })).toMatchObject({ readings: {}, report: {} })
    expect(skeleton({ meter: { id: 1 } })).not.toHaveProperty('meter')
    expect(skeleton({ report: { rulebook: COVERED } })?.report).toEqual({})
    expect(skeleton({ readings: { with: COVERED, circuits: { K1: 'read' } } })?.readings).toEqual({
      circuits: { K1: {} },
      residual_current: {},
      arrays: {},
    })
  })
})
