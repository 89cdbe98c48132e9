import { readdirSync, readFileSync } from 'node:fs'
import { load } from 'js-yaml'
import { describe, expect, it } from 'vitest'
import { check } from '#core/engine.ts'
import { SHIPPED_BOOKS, shippedBook } from '#core/judge/shipped.ts'
import { explain } from '#core/read/explain.ts'
import { patched } from './judge/patch.ts'

const shelf = { find: shippedBook, names: SHIPPED_BOOKS }
const base = patched({})

describe('a file', () => {
  it('that is sound is computed and judged', () => {
    const result = check(base, shelf)
    expect(result.kind).toBe('judged')
  })

  it('that is no YAML is unreadable, and every syntax error is told', () => {
    const result = check('skerry: 1\n\tsite: [\n', shelf, explain)
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
