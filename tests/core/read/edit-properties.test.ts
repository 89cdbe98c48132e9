import { readdirSync, readFileSync } from 'node:fs'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { Path } from '#core/glossary.ts'
import { type Edit, setValues } from '#core/read/edit.ts'
import { read } from '#core/read/read.ts'
import { sameTree, withValue } from '#core/read/tree.ts'

const FOLDER = new URL('../../fixtures/yaml/', import.meta.url)
const FILES = readdirSync(FOLDER).map((name) => readFileSync(new URL(name, FOLDER), 'utf8'))

function* pathsOf(tree: unknown, path: Path = []): Generator<Path> {
  if (path.length > 0) yield path
  if (typeof tree !== 'object' || tree === null) return
  const entries = Array.isArray(tree) ? [...tree.entries()] : Object.entries(tree)
  for (const [name, inner] of entries) yield* pathsOf(inner, [...path, name])
}

function sound(text: string) {
  const result = read(text)
  if (!result.ok) throw new Error(result.problems.map(({ message }) => message).join())
  return result
}

const text = fc.oneof(
  fc.constantFrom('0.29 ohm', '>999 MΩ', '24', 'no trip', 'a: b', '', "it's", 'x, y', '#', 'null', '012', 'true'),
  fc.string({ maxLength: 8, unit: fc.constantFrom(...'a1 :-#,\'"[]{}|>&*!%@\\Ω') }),
)
const beyond = fc.constantFrom<Path>([], [], ['new'], ['new', 'deeper'], [0, 'a'], [1])

const place = fc.constantFrom(...FILES).chain((file) => {
  const existing = fc.constantFrom(...pathsOf(sound(file).tree))
  const path = fc.tuple(existing, beyond).map(([start, more]): Path => [...start, ...more])
  return fc.record({ file: fc.constant(file), edit: fc.record({ path, text }) })
})

/** What a person means by a text: the text itself, or the number or word that YAML makes of it without quotes. */
function meant({ text: written }: Edit, value: unknown): boolean {
  return value === written || value === Number(written) || String(value) === written.toLowerCase()
}

function valueAt(tree: unknown, path: Path): unknown {
  return path.reduce<unknown>((now, name) => Reflect.get(Object(now), name), tree)
}

function commentsIn(file: string): string[] {
  return file.match(/(?:^|\s)#.*$/gm) ?? []
}

/** What stood between the longest common beginning and the longest common end. */
function removed(before: string, after: string): string {
  let front = 0
  while (front < before.length && before[front] === after[front]) front++
  let back = 0
  while (back < Math.min(before.length, after.length) - front && before.at(-1 - back) === after.at(-1 - back)) back++
  return before.slice(front, before.length - back)
}

describe('whatever is written', () => {
  it('the file holds its old values and the new one, or nothing is done', () => {
    let done = 0
    fc.assert(
      fc.property(place, ({ file, edit }) => {
        const result = setValues(file, [edit])
        if (!result.ok) return
        done++
        const before = sound(file).tree
        const after = sound(result.text).tree
        const value = valueAt(after, edit.path)
        expect(meant(edit, value)).toBe(true)
        expect(sameTree(after, withValue(before, edit.path, value))).toBe(true)
      }),
      { numRuns: 600 },
    )
    expect(done).toBeGreaterThan(200)
  })

  it('comments and line ends stay, and only the value itself is taken out', () => {
    fc.assert(
      fc.property(place, ({ file, edit }) => {
        const result = setValues(file, [edit])
        fc.pre(result.ok)
        if (!result.ok) return
        const { offset, endOffset } = sound(file).locate(edit.path)
        const value = file.slice(offset, endOffset)
        const kept = commentsIn(file).filter((comment) => !value.includes(comment.trim()))
        for (const comment of kept) expect(result.text).toContain(comment)
        expect(result.text.includes('\r\n')).toBe(file.includes('\r\n'))
        expect(value).toContain(removed(file, result.text))
      }),
      { numRuns: 400 },
    )
  })

  it('several edits come out as the same edits one after the other', () => {
    const several = fc.constantFrom(...FILES).chain((file) => {
      const path = fc.constantFrom(...pathsOf(sound(file).tree))
      return fc.record({ file: fc.constant(file), edits: fc.array(fc.record({ path, text }), { maxLength: 3 }) })
    })
    fc.assert(
      fc.property(several, ({ file, edits }) => {
        const together = setValues(file, edits)
        if (!together.ok) return
        const steps = edits.reduce((now, edit) => {
          const step = setValues(now, [edit])
          return step.ok ? step.text : now
        }, file)
        expect(together.text).toBe(steps)
      }),
    )
  })
})
