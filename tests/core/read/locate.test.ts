import { readdirSync, readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { isMap, isScalar, isSeq, type Node, parseDocument } from 'yaml'
import type { Path } from '#core/glossary.ts'
import { read } from '#core/read/read.ts'

const FOLDER = new URL('../../fixtures/yaml/', import.meta.url)
const FIXTURES = readdirSync(FOLDER).map((name) => [name, readFileSync(new URL(name, FOLDER), 'utf8')] as const)

const locator = (text: string) => {
  const result = read(text)
  if (!result.ok) throw new Error('the file is not sound')
  const shown = (path: Path, part?: 'key' | 'value') => {
    const range = result.locate(path, part)
    return text.slice(range.offset, range.endOffset)
  }
  return { locate: result.locate, shown }
}

interface Visited {
  readonly path: Path
  readonly node: Node
  readonly key?: Node
}

function* nodesOf(node: unknown, path: Path = [], key?: Node): Generator<Visited> {
  if (isScalar(node) || isMap(node) || isSeq(node)) yield key === undefined ? { path, node } : { path, node, key }
  if (isSeq(node)) for (const [index, item] of node.items.entries()) yield* nodesOf(item, [...path, index])
  if (!isMap(node)) return
  for (const pair of node.items) {
    if (isScalar(pair.key)) yield* nodesOf(pair.value, [...path, String(pair.key.value)], pair.key)
  }
}

describe.each(FIXTURES)('every place of %s', (_, text) => {
  const { locate } = locator(text)
  const document = parseDocument(text, { schema: 'core', stringKeys: true })
  const visited = [...nodesOf(document.contents)]

  it('is where the other parser sees it', () => {
    expect(visited.length).toBeGreaterThan(5)
    for (const { path, node, key } of visited) {
      const [start = 0, end = 0] = node.range ?? []
      if (start === end) continue
      const range = locate(path)
      expect({ path, start: range.offset }).toEqual({ path, start })
      const flow = !isScalar(node) && text.slice(start, start + 1).match(/[{[]/) !== null
      if (isScalar(node) || flow) expect({ path, end: range.endOffset }).toEqual({ path, end })
      if (key === undefined) continue
      const keyRange = locate(path, 'key')
      expect({ path, key: [keyRange.offset, keyRange.endOffset] }).toEqual({ path, key: key.range?.slice(0, 2) })
    }
  })

  it('has the line and column of its offset', () => {
    for (const { path } of visited) {
      const { line, column, offset, endLine, endColumn, endOffset } = locate(path)
      const before = text.slice(0, offset).split('\n')
      const upTo = text.slice(0, endOffset).split('\n')
      expect([line, column]).toEqual([before.length, (before.at(-1)?.length ?? 0) + 1])
      expect([endLine, endColumn]).toEqual([upTo.length, (upTo.at(-1)?.length ?? 0) + 1])
    }
  })
})

describe('what a person is shown', () => {
  const { locate, shown } = locator(
    [
      '# head',
      'circuits:',
      '  K1: { serves: Cold store, load: }   # note',
      '  K2:',
      '    serves: "Bakery sockets"',
      '    note: | # why',
      '      two',
      '      lines',
      '    phases: [ L1,',
      '      L2 ]',
      'steps:',
      '  - step: one',
      '    tripped: false',
      '  -',
      '  - [ x, ]',
      'last:',
    ].join('\n'),
  )

  it.each<[Path, 'key' | 'value' | undefined, string]>([
    [['circuits', 'K1', 'serves'], undefined, 'Cold store'],
    [['circuits', 'K1', 'serves'], 'key', 'serves'],
    [['circuits', 'K1'], undefined, '{ serves: Cold store, load: }'],
    [['circuits', 'K2', 'serves'], 'value', '"Bakery sockets"'],
    [['circuits', 'K2', 'note'], undefined, '| # why\n      two\n      lines\n'],
    [['circuits', 'K2', 'phases'], undefined, '[ L1,\n      L2 ]'],
    [['circuits', 'K2', 'phases', 1], undefined, 'L2'],
    [['circuits', 'K2', 'phases', 1], 'key', 'L2'],
    [['steps', 0], undefined, 'step: one\n    tripped: false'],
    [['steps', 2], undefined, '[ x, ]'],
  ])('%j (%s)', (path, part, expected) => {
    expect(shown(path, part)).toBe(expected)
  })

  it.each<[string, Path, string]>([
    ['a missing key shows the key of its block', ['circuits', 'K2', 'device'], 'K2'],
    ['a missing block shows the key above it', ['circuits', 'K9', 'cable', 'length'], 'circuits'],
    ['a key below a value shows the key of the value', ['circuits', 'K1', 'serves', 'x'], 'serves'],
    ['a key missing in a list item shows the item', ['steps', 0, 'lowest_voltage'], 'step: one\n    tripped: false'],
    ['an item past the end shows the key of the list', ['steps', 7], 'steps'],
    ['a value left empty shows its key', ['circuits', 'K1', 'load'], 'load'],
    ['a value left empty at the end of the file shows its key', ['last'], 'last'],
    ['a key missing at the top shows the very beginning', ['site'], ''],
    ['a list item left empty shows the place behind its dash', ['steps', 1], ''],
  ])('%s', (_, path, expected) => {
    expect(shown(path)).toBe(expected)
  })

  it('a key missing at the top is at the first key, with no length', () => {
    expect(locate(['site'])).toMatchObject({ line: 2, column: 1, endColumn: 1 })
  })

  it('an empty list item has a line of its own', () => {
    expect(locate(['steps', 1])).toMatchObject({ line: 14, column: 4 })
  })
})
