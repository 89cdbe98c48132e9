import { describe, expect, it } from 'vitest'
import { check, type Judged } from '#core/engine.ts'
import pages from '#core/generated/rule-pages.js'
import { SHIPPED_BOOKS, shippedBook } from '#core/judge/shipped.ts'
import { patched } from './patch.ts'

const { rules } = pages()

/** A rule is tried by the book that it was written for. */
const bookWith = (key: string): string => key.split('/')[0] ?? ''

function judged(text: string, book: string): Judged {
  const result = check(text, {
    find: (asked) => shippedBook(asked === 'iec' ? book : asked),
    names: SHIPPED_BOOKS,
  })
  if (result.kind !== 'judged')
    throw new Error(result.problems.map(({ path, message }) => `${path.join('.')}: ${message}`).join('\n'))
  return result
}

const plainly = (verdict: string): string => verdict.replace(', inside the uncertainty', '')

describe.each(rules)('$key: $record.title', ({ key, record }) => {
  it.each(record.examples.map((example, index) => [index + 1, example] as const))(
    'example %i gives what it says',
    (_, example) => {
      const { findings } = judged(patched(example), bookWith(key))
      const own = findings.filter(
        ({ rule, subject, state }) =>
          rule === record.id && subject === example.subject && (example.state === undefined || state === example.state),
      )
      expect(own.length, `no finding of ${record.id} on ${example.subject}`).toBeGreaterThan(0)
      for (const finding of own) expect(plainly(finding.verdict), JSON.stringify(finding)).toBe(example.gives)
    },
  )

  it('has an example that meets and one that fails', () => {
    const gives = record.examples.map((example) => example.gives)
    expect(gives).toContain('meets')
    expect(gives).toContain('fails')
  })
})

describe('the base file', () => {
  it('meets every rule of the base book that applies to it', () => {
    const { findings } = judged(patched({}), 'iec')
    const open = findings.filter(({ verdict }) => !verdict.startsWith('meets') && verdict !== 'not applicable')
    expect(open.map(({ rule, subject, state, verdict }) => `${rule} on ${subject} ${state ?? ''}: ${verdict}`)).toEqual(
      [],
    )
  })
})
