import { readdirSync, readFileSync } from 'node:fs'
import fc from 'fast-check'
import { load } from 'js-yaml'
import { describe, expect, it } from 'vitest'
import { check } from '#core/engine.ts'
import { SHIPPED_BOOKS, shippedBook } from '#core/judge/shipped.ts'
import { readThoroughly } from '#core/read/thorough.ts'
import { example, mutants } from '../schemas/corpus.ts'
import { patched } from './judge/patch.ts'

const shelf = { find: shippedBook, names: SHIPPED_BOOKS }
const base = patched({})

describe('a file', () => {
  it('that is sound is computed and judged', () => {
    const result = check(base, shelf)
    expect(result.kind).toBe('judged')
  })

  it('that is no YAML is unreadable, and every syntax error is told', () => {
    const result = check('skerry: 1\n\tsite: [\n', shelf, readThoroughly)
    expect(result.kind).toBe('unreadable')
  })

  it('out of shape is told so with every problem at once, and not judged', () => {
    const result = check(patched({ set: { 'supply.earthing': 'TNS', 'site.nmae': 'x' } }), shelf)
    expect(result.kind).toBe('misshapen')
    expect(result.kind === 'misshapen' && result.problems.map(({ code }) => code).toSorted()).toEqual([
      'not-allowed-value',
      'unknown-key',
    ])
  })

  it('with a dangling name is told where', () => {
    const result = check(patched({ set: { 'circuits.K1.fed_from': 'EBB' } }), shelf)
    expect(result.kind === 'misshapen' && result.problems).toMatchObject([
      { code: 'dangling-name', path: ['circuits', 'K1', 'fed_from'] },
    ])
  })

  it('that asks for a book that is not at hand is told which ones are', () => {
    const result = check(patched({ set: { 'report.rulebook': 'atlantis' } }), shelf)
    expect(result.kind === 'misshapen' && result.problems[0]?.message).toMatch(
      /There is no rule book “atlantis”. At hand: .*iec/,
    )
  })

  it('that names no book is judged by the base', () => {
    const result = check(base, shelf)
    expect(result.kind === 'judged' && result.book.id).toBe('iec')
  })
})

describe('the examples', () => {
  const names = readdirSync('examples').filter((name) => name.endsWith('.skerry.yaml'))

  it.each(names.filter((name) => !name.startsWith('wrong-')))(
    '%s has nothing at failure level that its first lines do not announce',
    (name) => {
      const text = readFileSync(`examples/${name}`, 'utf8')
      const result = check(text, shelf)
      if (result.kind !== 'judged') throw new Error(result.problems.map(({ message }) => message).join('\n'))
      const failing = result.findings.filter(
        ({ verdict, severity, departure }) => severity === 'failure' && verdict.startsWith('fails') && !departure,
      )
      const announced = name.startsWith('alder-mill') ? ['no-defect-is-left'] : []
      expect(
        failing
          .map(({ rule, subject, state }) => `${rule} on ${subject} ${state ?? ''}`)
          .filter((line) => !announced.some((rule) => line.startsWith(rule))),
      ).toEqual([])
    },
  )

  it.each(names.filter((name) => name !== 'wrong-in-shape.skerry.yaml'))(
    '%s names each inspection item once, and none beside the name that rules know',
    (name) => {
      const result = check(readFileSync(`examples/${name}`, 'utf8'), shelf)
      if (result.kind !== 'judged') throw new Error('It cannot be judged.')
      const items = (result.install.inspection ?? []).map(({ item }) => item)
      expect(new Set(items).size).toBe(items.length)
      for (const old of ['identification of conductors', 'connections tight']) expect(items).not.toContain(old)
    },
  )

  it('that is wrong in twenty ways fails in at least twenty', () => {
    const result = check(readFileSync('examples/wrong-in-twenty-ways.skerry.yaml', 'utf8'), shelf)
    if (result.kind !== 'judged') throw new Error('It cannot be judged.')
    const failing = new Set(
      result.findings
        .filter(({ verdict }) => verdict.startsWith('fails'))
        .map(({ rule, subject }) => `${rule} ${subject}`),
    )
    expect(failing.size).toBeGreaterThanOrEqual(20)
  })
})

it('gives the same findings whatever the order of keys', () => {
  const turned = (value: unknown): unknown => {
    if (Array.isArray(value)) return value.map(turned)
    if (typeof value !== 'object' || value === null) return value
    return Object.fromEntries(
      Object.entries(value)
        .toReversed()
        .map(([key, inner]) => [key, turned(inner)]),
    )
  }
  const lines = (text: string): string[] => {
    const result = check(text, shelf)
    if (result.kind !== 'judged') throw new Error('It cannot be judged.')
    return result.findings
      .map(({ rule, subject, state, verdict }) => `${rule} ${subject} ${state ?? ''} ${verdict}`)
      .toSorted()
  }
  expect(lines(JSON.stringify(turned(load(base))))).toEqual(lines(base))
})

describe('a file with errors of every kind', () => {
  const wrong = example('wrong-in-shape')
  const numbered = wrong.text
    .split('\n')
    .flatMap((line, index) => [...(line.split('#')[1]?.matchAll(/\b\d+(?=[:,]|$)/g) ?? [])].map(() => index + 1))

  it('is told all of them at once, each on its line, no value twice', () => {
    const result = check(wrong.text, shelf, readThoroughly)
    if (result.kind === 'judged') throw new Error('It cannot be judged.')
    expect(numbered).toHaveLength(28)
    expect(result.problems.map(({ range }) => range?.line).toSorted((a = 0, b = 0) => a - b)).toEqual(numbered)
    expect(new Set(result.problems.map(({ path }) => path.join('\n'))).size).toBe(28)
  })

  it('is told ranges, names and the rule book beside its shape', () => {
    const text = patched({
      set: {
        'site.nmae': 'x',
        'site.position.latitude': '97.3 °',
        'circuits.K1.fed_from': 'EBB',
        'report.rulebook': 'atlantis',
        'readings.with': 'X9',
      },
    })
    const result = check(text, shelf)
    expect(result.kind === 'misshapen' && result.problems.map(({ code, path }) => `${code} ${path.join('.')}`)).toEqual(
      [
        'unknown-key site.nmae',
        'out-of-range site.position.latitude',
        'dangling-name circuits.K1.fed_from',
        'dangling-name readings.with',
        'not-allowed-value report.rulebook',
      ],
    )
  })

  it.each([
    ['a section is misspelt', { 'circuit.K9.fed_from': 'EBB', 'circuits.K1.fed_from': 'EBB' }],
    ['a name cannot be one', { 'boards.1MB.fed_from': 'supply', 'circuits.K1.fed_from': 'EBB' }],
  ])('is not told that a name leads nowhere where %s', (_, set) => {
    const result = check(patched({ set }), shelf)
    expect(result.kind === 'misshapen' && result.problems.map(({ code }) => code)).not.toContain('dangling-name')
  })

  it('is told at most as many as are shown, and how many more', () => {
    const many = Array.from({ length: 150 }, (_, index) => `    K${index}: { fed_from: MB, cable: 012 }\n`).join('')
    const result = check(`skerry: 1\ncircuits:\n${many}`, shelf, readThoroughly)
    if (result.kind === 'judged') throw new Error('It cannot be judged.')
    expect(result.problems).toHaveLength(201)
    expect(result.problems.at(-1)?.message).toMatch(/^\d+ more problems are not shown/)
  })
})

describe('whatever is in a file', () => {
  const sound = readFileSync('examples/heron-ford-dwelling.skerry.yaml', 'utf8')

  it('no value of any kind at any place keeps the others from being looked at, and each place is told once', () => {
    const mutations = mutants(load(sound))
    expect(mutations.length).toBeGreaterThan(300)
    for (const { name, tree } of mutations) {
      const result = check(JSON.stringify(tree), shelf)
      if (result.kind === 'judged') continue
      const places = result.problems.map(({ path }) => path.join('\n'))
      expect([name, new Set(places).size]).toEqual([name, places.length])
    }
  })

  it('spoilt in several places it is told of, never with an exception', () => {
    const pieces = ['@', '"', ' #', '\t', '1_0', ',5', ': ', '!x ', '&a ', '*a', '>', '\u202e', '{', '- ', '<<: ']
    let misread = 0
    fc.assert(
      fc.property(
        fc.array(fc.tuple(fc.nat(), fc.constantFrom(...pieces)), { minLength: 1, maxLength: 5 }),
        (spoils) => {
          const text = spoils.reduce((now, [place, piece]) => {
            const at = place % now.length
            return now.slice(0, at) + piece + now.slice(at)
          }, sound)
          const result = check(text, shelf, readThoroughly)
          if (result.kind === 'judged') return
          misread++
          expect(result.problems.length).toBeGreaterThan(0)
          if (result.kind === 'unreadable') {
            for (const { range, message } of result.problems) {
              expect(range).toBeDefined()
              expect(message).not.toMatch(/[\ue000-\uf8ff]/)
            }
          }
        },
      ),
      { numRuns: 150 },
    )
    expect(misread).toBeGreaterThan(50)
  })
})
