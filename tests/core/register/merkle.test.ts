import { bytesToHex, hexToBytes } from '@noble/hashes/utils.js'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { consistencyPath, continues, nodesOfConsistency } from '#core/register/consistency.ts'
import { append, EMPTY_FRONTIER, type Frontier, rootOfFrontier } from '#core/register/frontier.ts'
import { includes, inclusionPath, nodesOfInclusion } from '#core/register/inclusion.ts'
import { type Hash, hashOfLeaf, type NodePlace, readerOf, rootOf } from '#core/register/merkle.ts'
import { CONSISTENCIES, INCLUSIONS, LEAVES, LEVELS, ROOTS } from './reference-tree.ts'

const reference = LEAVES.map((leaf) => hashOfLeaf(hexToBytes(leaf)))
const madeUp = (count: number): Hash[] =>
  Array.from({ length: count }, (_, at) => hashOfLeaf(Uint8Array.of(at >> 8, at)))
const many = madeUp(300)
const first = (size: number): Hash[] => many.slice(0, size)
const hex = (hashes: readonly Hash[]): string[] => hashes.map(bytesToHex)

function flipped(hash: Hash, bit: number): Hash {
  return hash.map((byte, at) => (at === bit >> 3 ? byte ^ (1 << (bit & 7)) : byte))
}

/** A size of a register and the place of an entry in it. */
const placed = fc
  .integer({ min: 1, max: 300 })
  .chain((size) => fc.record({ size: fc.constant(size), index: fc.integer({ min: 0, max: size - 1 }) }))
/** An older size and a newer one. */
const grown = fc
  .integer({ min: 1, max: 300 })
  .chain((newer) => fc.record({ newer: fc.constant(newer), older: fc.integer({ min: 1, max: newer }) }))

/** A frontier with the first so many leaves, and every node that was to be stored on the way. */
function grow(leaves: readonly Hash[]) {
  const stored = new Map<string, Hash>()
  let frontier: Frontier = EMPTY_FRONTIER
  for (const leaf of leaves) {
    const next = append(frontier, leaf)
    for (const { level, index, hash } of next.nodes) stored.set(`${level}/${index}`, hash)
    frontier = next
  }
  const read = ({ level, index }: NodePlace): Hash => {
    const hash = stored.get(`${level}/${index}`)
    if (!hash) throw new Error(`node ${level}/${index} was never stored`)
    return hash
  }
  return { frontier, read }
}

describe('a proof of inclusion is refused', () => {
  const size = 13
  const read = readerOf(first(size))
  const good = { leaf: many[6] as Hash, index: 6, size, path: inclusionPath(6, size, read), root: rootOf(first(size)) }

  it('holds before it is tampered with', () => expect(includes(good)).toBe(true))

  it.each([
    ['for another leaf', { leaf: many[7] as Hash }],
    ['for another place', { index: 7 }],
    ['for a place before the first', { index: -1 }],
    ['for a place past the last', { index: size }],
    ['for a place that is no whole number', { index: 6.5 }],
    ['for a smaller tree', { size: 8 }],
    ['for a larger tree', { size: 17 }],
    ['for a size that is no whole number', { size: 13.5 }],
    ['for an empty tree', { size: 0 }],
    ['for another root', { root: rootOf(first(12)) }],
    ['for a root cut short', { root: good.root.slice(0, 31) }],
    ['without its last hash', { path: good.path.slice(0, -1) }],
    ['without its first hash', { path: good.path.slice(1) }],
    ['with a hash too many', { path: [...good.path, good.root] }],
    ['without any hash', { path: [] }],
    ['with its hashes turned round', { path: good.path.toReversed() }],
  ])('%s', (_, change) => expect(includes({ ...good, ...change })).toBe(false))

  it('for every single bit that is wrong in it', () => {
    const bits = fc.integer({ min: 0, max: 255 })
    fc.assert(
      fc.property(placed, bits, fc.nat(), (at, bit, which) => {
        const path = inclusionPath(at.index, at.size, readerOf(first(at.size)))
        const whole = { ...at, leaf: many[at.index] as Hash, path, root: rootOf(first(at.size)) }
        expect(includes({ ...whole, root: flipped(whole.root, bit) })).toBe(false)
        expect(includes({ ...whole, leaf: flipped(whole.leaf, bit) })).toBe(false)
        const wrong = path.map((hash, step) => (step === which % path.length ? flipped(hash, bit) : hash))
        expect(path.length === 0 || !includes({ ...whole, path: wrong })).toBe(true)
      }),
    )
  })
})

describe('a proof of consistency is refused', () => {
  const [older, newer] = [6, 13]
  const path = consistencyPath(older, newer, readerOf(first(newer)))
  const good = { first: older, firstRoot: rootOf(first(older)), second: newer, secondRoot: rootOf(first(newer)), path }

  it('holds before it is tampered with', () => expect(continues(good)).toBe(true))

  it.each([
    ['where the newer register is the smaller one', { first: 13, second: 6 }],
    ['from an empty register', { first: 0 }],
    ['from a size that is no whole number', { first: 5.5 }],
    ['to a size that is no whole number', { second: 13.5 }],
    ['from another size', { first: 7 }],
    ['to another size', { second: 17 }],
    ['where the old root is another', { firstRoot: rootOf(first(5)) }],
    ['where the new root is another', { secondRoot: rootOf(first(12)) }],
    ['without its last hash', { path: path.slice(0, -1) }],
    ['with a hash too many', { path: [...path, good.firstRoot] }],
    ['without any hash', { path: [] }],
    ['with its hashes turned round', { path: path.toReversed() }],
  ])('%s', (_, change) => expect(continues({ ...good, ...change })).toBe(false))

  it('where an entry was changed after the older checkpoint', () => {
    fc.assert(
      fc.property(grown, fc.nat(), ({ older, newer }, which) => {
        const changed = first(newer).map((leaf, at) => (at === which % older ? flipped(leaf, 7) : leaf))
        const path = consistencyPath(older, newer, readerOf(changed))
        expect(
          continues({
            first: older,
            firstRoot: rootOf(first(older)),
            second: newer,
            secondRoot: rootOf(changed),
            path,
          }),
        ).toBe(false)
      }),
    )
  })
})

describe('asked for what a register does not have', () => {
  it.each([
    [0, 0],
    [5, 5],
    [-1, 5],
    [1.5, 5],
  ])('it gives no proof of entry %d of %d', (index, size) => {
    expect(() => inclusionPath(index, size, readerOf(first(5)))).toThrow(RangeError)
    expect(() => nodesOfInclusion(index, size)).toThrow(`Entry ${index} is not one of ${size}.`)
  })

  it.each([
    [0, 5],
    [6, 5],
  ])('it gives no proof that %d entries grew to %d', (older, newer) => {
    expect(() => consistencyPath(older, newer, readerOf(first(5)))).toThrow(RangeError)
    expect(() => nodesOfConsistency(older, newer)).toThrow(`${newer} entries cannot continue one of ${older}`)
  })

  it('it reads no leaf that is not there', () => {
    expect(() => readerOf(first(3))({ level: 1, index: 1 })).toThrow('no leaf 3 among 3')
  })

  it('it appends to no peaks that do not belong to their size', () => {
    expect(() => append({ size: 3, peaks: [many[0] as Hash] }, many[1] as Hash)).toThrow('1 peaks do not belong')
  })
})

describe('against the published tree of eight leaves', () => {
  it('has every full subtree', () => {
    const read = readerOf(reference)
    const levels = LEVELS.map((nodes, level) => nodes.map((_, index) => bytesToHex(read({ level, index }))))
    expect(levels).toEqual(LEVELS)
  })

  it.each(ROOTS.map((root, size) => [size, root] as const))('has the root over %d leaves', (size, root) => {
    expect(bytesToHex(rootOf(reference.slice(0, size)))).toBe(root)
    expect(bytesToHex(rootOfFrontier(grow(reference.slice(0, size)).frontier))).toBe(root)
  })

  it.each(INCLUSIONS)('proves entry $index of $size', ({ index, size, path }) => {
    expect(hex(inclusionPath(index, size, readerOf(reference.slice(0, size))))).toEqual(path)
    const root = hexToBytes(ROOTS[size] as string)
    expect(includes({ leaf: reference[index] as Hash, index, size, path: path.map(hexToBytes), root })).toBe(true)
  })

  it.each(CONSISTENCIES)('proves that $first entries grew to $second', ({ first, second, path }) => {
    expect(hex(consistencyPath(first, second, readerOf(reference.slice(0, second))))).toEqual(path)
    const roots = { firstRoot: hexToBytes(ROOTS[first] as string), secondRoot: hexToBytes(ROOTS[second] as string) }
    expect(continues({ first, second, ...roots, path: path.map(hexToBytes) })).toBe(true)
  })
})

describe('for every size up to 300', () => {
  it('appending one by one gives the same root as the whole list', () => {
    let frontier: Frontier = EMPTY_FRONTIER
    for (const [at, leaf] of many.entries()) {
      frontier = append(frontier, leaf)
      expect(bytesToHex(rootOfFrontier(frontier))).toBe(bytesToHex(rootOf(first(at + 1))))
      expect(frontier.peaks).toHaveLength([...(at + 1).toString(2)].filter((bit) => bit === '1').length)
    }
  })

  it('what was stored while appending is all that a proof of inclusion asks for', () => {
    fc.assert(
      fc.property(placed, ({ size, index }) => {
        const { read } = grow(first(size))
        const asked = new Set(nodesOfInclusion(index, size).map(({ level, index: at }) => `${level}/${at}`))
        const path = inclusionPath(index, size, (place) => {
          expect(asked).toContain(`${place.level}/${place.index}`)
          return read(place)
        })
        expect(includes({ leaf: many[index] as Hash, index, size, path, root: rootOf(first(size)) })).toBe(true)
        expect(path.length).toBeLessThanOrEqual(Math.ceil(Math.log2(size)))
      }),
    )
  })

  it('what was stored while appending is all that a proof of consistency asks for', () => {
    fc.assert(
      fc.property(grown, ({ older, newer }) => {
        const { read } = grow(first(newer))
        const asked = new Set(nodesOfConsistency(older, newer).map(({ level, index }) => `${level}/${index}`))
        const path = consistencyPath(older, newer, (place) => {
          expect(asked).toContain(`${place.level}/${place.index}`)
          return read(place)
        })
        const roots = { firstRoot: rootOf(first(older)), secondRoot: rootOf(first(newer)) }
        expect(continues({ first: older, second: newer, ...roots, path })).toBe(true)
      }),
    )
  })
})
