import { describe, expect, it } from 'vitest'
import { LONGEST_ANCHOR } from '#core/report/anchor.ts'
import { type Acceptance, blockers, type ThreadStanding } from '#core/review/blockers.ts'
import { decisionsOf } from '#core/review/decisions.ts'
import { exampleText, judgedExample, judgedText } from '../report/judged.ts'

const dairy = judgedExample('fell-side-dairy')
const accepted = (judged = dairy, answer = true): Acceptance[] =>
  decisionsOf(judged).map(({ anchor, wordsSha256 }) => ({ anchor, wordsSha256, accepted: answer }))

const kinds = (...args: Parameters<typeof blockers>): string[] => [
  ...new Set(blockers(...args).map(({ kind }) => kind)),
]

/** The dwelling as departing on purpose from the first rule that it does not meet. */
function departing(reason: string) {
  const text = exampleText('alder-mill-bakery')
  const failing = judgedText(text).findings.filter(
    ({ verdict, severity }) => verdict === 'fails' && severity === 'failure',
  )
  const departures = failing.map(
    ({ rule, subject }) =>
      `  - { rule: ${rule}, subject: ${subject}, reason: "${reason}", agreed_by: customer, on: 2026-10-13 }`,
  )
  return judgedText(text.replace(/^departures: \[\].*$/m, `departures:\n${departures.join('\n')}`))
}

describe('what keeps a report from being issued', () => {
  it('is every rule that fails, at its own place', () => {
    const bakery = judgedExample('alder-mill-bakery')
    const found = blockers(bakery, accepted(bakery), []).filter(({ kind }) => kind === 'fails')
    expect(found.length).toBeGreaterThan(0)
    for (const { anchor, message } of found) {
      expect(anchor).toMatch(/^rule\/[a-z0-9-]+\/.+\/(grid|island|always)$/)
      expect(message).toMatch(/ does not meet: .+\.$/)
    }
  })

  it('is every binding rule that is not shown, and no caution', () => {
    const hall = judgedExample('reed-hall-design')
    const shown = blockers(hall, accepted(hall), []).filter(({ kind }) => kind === 'not shown')
    const binding = hall.findings.filter(({ verdict, severity }) => verdict === 'not shown' && severity === 'failure')
    expect(shown).toHaveLength(binding.length)
    expect(binding.length).toBeGreaterThan(0)
  })

  it('is a limitation that nobody has accepted', () => {
    expect(kinds(dairy, [], [])).toEqual(['not decided'])
  })

  it('is a limitation that was accepted in other words', () => {
    const others = accepted().map((one) => ({ ...one, wordsSha256: 'ab'.repeat(32) }))
    expect(kinds(dairy, others, [])).toEqual(['not decided'])
  })

  it('is a limitation that was accepted at another place', () => {
    const elsewhere = accepted().map((one) => ({ ...one, anchor: 'limitation/elsewhere' }))
    expect(kinds(dairy, elsewhere, [])).toEqual(['not decided'])
  })

  it('is a limitation that was refused after it had been accepted', () => {
    expect(kinds(dairy, [...accepted(), ...accepted(dairy, false)], [])).toEqual(['refused'])
    expect(kinds(dairy, [...accepted(dairy, false), ...accepted()], [])).toEqual([])
  })

  it('is a departure, which takes the place of the failing rule', () => {
    const bakery = departing('agreed with the owner')
    const found = blockers(bakery, [], [])
    expect(found.some(({ kind }) => kind === 'fails')).toBe(false)
    expect(found.some(({ message }) => message.includes('agreed with the owner'))).toBe(true)
    expect(kinds(bakery, accepted(bakery), [])).not.toContain('not decided')
  })

  it('is a departure whose reason was changed after it was accepted', () => {
    expect(kinds(departing('another reason'), accepted(departing('one reason')), [])).toContain('not decided')
  })

  it.each([
    ['an open correction', 'correction', 'open', ['correction']],
    ['an answered correction', 'correction', 'answered', ['correction']],
    ['a settled correction', 'correction', 'resolved', []],
    ['an open question', 'question', 'open', []],
    ['an open remark', 'remark', 'open', []],
  ] satisfies [string, ThreadStanding['kind'], ThreadStanding['state'], string[]][])(
    'looks at threads: %s',
    (_words, kind, state, expected) => {
      expect(kinds(dairy, accepted(), [{ anchor: 'circuit/K1', kind, state }])).toEqual(expected)
    },
  )

  it.each([
    ['customer', /^ {2}customer: .*\n/m, 'site/customer'],
    ['days of the inspection', /^ {2}inspected: .*\n/m, 'report/inspected'],
    ['person who tested', /^ {2}tested_by: .*\n/m, 'person/tested_by'],
  ])('is a report without its %s', (_what, line, anchor) => {
    const judged = judgedText(exampleText('fell-side-dairy').replace(line, ''))
    const content = blockers(judged, accepted(judged), []).filter(({ kind }) => kind === 'content')
    expect(content.map((blocker) => blocker.anchor)).toEqual([anchor])
  })

  it('is a report in which nobody is named', () => {
    const judged = judgedText(exampleText('fell-side-dairy').replace(/^people:\n(?: {2}.*\n)+/m, ''))
    expect(kinds(judged, accepted(judged), [])).toContain('content')
  })

  it('is nothing, once all is decided', () => {
    expect(blockers(dairy, accepted(), [])).toEqual([])
  })
})

describe('decisions', () => {
  it('ask once for each reason, and say what it leaves open', () => {
    const decisions = decisionsOf(dairy)
    expect(decisions.map(({ kind }) => kind)).toContain('limitation')
    expect(new Set(decisions.map(({ anchor }) => anchor)).size).toBe(decisions.length)
    for (const { words, anchor } of decisions) {
      expect(words).toContain('It leaves open: WEST/2: ')
      expect(anchor.length).toBeLessThanOrEqual(LONGEST_ANCHOR)
    }
  })

  it('name the state where a departure holds in one, and leave out what does not apply', () => {
    const [finding] = dairy.findings.filter(({ state }) => state === 'island')
    if (finding === undefined) throw new Error('The dairy has no finding in the island.')
    const departure = {
      rule: finding.rule,
      subject: finding.subject,
      reason: 'tried',
      agreed_by: 'K. Tern',
      on: '2026-04-22',
    }
    const departed = decisionsOf({ ...dairy, findings: [{ ...finding, rule: 'a-rule-of-old', departure }] })
    expect(departed.map(({ words }) => words)).toEqual([
      `${finding.subject} in the island departs from: a-rule-of-old. Reason: tried. Agreed by K. Tern, 2026-04-22.`,
    ])
    expect(decisionsOf({ ...dairy, findings: [{ ...finding, verdict: 'not applicable', departure }] })).toEqual([])
  })

  it('ask for nothing where nothing is limited', () => {
    expect(decisionsOf(judgedExample('tern-farm-tt'))).toEqual([])
  })
})
