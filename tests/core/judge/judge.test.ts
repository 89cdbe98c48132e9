import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { Departure, Finding, Sheet, Span } from '#core/glossary.ts'
import { judge } from '#core/judge/judge.ts'
import type { Rule, RuleBook } from '#core/judge/rule.ts'
import { shippedBook } from '#core/judge/shipped.ts'

const LIMIT = 1

interface Values {
  readonly loop?: number
  readonly backed_up?: boolean
}

const loopRule = (more: Partial<Rule> = {}): Rule => ({
  id: 'loop-low-enough',
  subject: 'circuit',
  state: 'grid',
  severity: 'failure',
  needs: ['loop'],
  reads: ['loop'],
  at: ['loop', 'device_rated'],
  when: undefined,
  must: (values) => ((values as Values).loop ?? 0) <= LIMIT,
  ...more,
})

function bookWith(...rules: Rule[]): RuleBook {
  const base = shippedBook('iec')
  if (!base) throw new Error('The base book is missing.')
  return { ...base, rules }
}

const sheet = (loop: number | undefined, span?: Span): Sheet => ({
  subject: 'circuit',
  id: 'K1',
  path: ['circuits', 'K1'],
  values: { device_rated: 16 },
  spans: {},
  inState: { grid: loop === undefined ? {} : { loop }, island: {} },
  spansInState: { grid: span ? { loop: span } : {}, island: {} },
  pathOf: (name) =>
    name === 'loop'
      ? ['readings', 'circuits', 'K1', 'loop', 'grid']
      : name === 'device_rated'
        ? ['circuits', 'K1', 'device']
        : ['circuits', 'K1'],
})

function verdict(rule: Rule, of: Sheet, tree: unknown = {}, departures: Departure[] = []): Finding {
  const [finding] = judge(bookWith(rule), { sheets: [of], tree, departures })
  if (!finding) throw new Error('There is no finding.')
  return finding
}

describe('a reading against its limit', () => {
  it.each([
    ['meets with its whole interval below the limit', 0.7, { low: 0.49, high: 0.91 }, 'meets'],
    ['meets at the limit itself without an uncertainty', 1, undefined, 'meets'],
    [
      'meets inside the uncertainty when its upper end is beyond',
      0.8,
      { low: 0.56, high: 1.04 },
      'meets, inside the uncertainty',
    ],
    [
      'fails inside the uncertainty when its lower end is within',
      1.2,
      { low: 0.84, high: 1.56 },
      'fails, inside the uncertainty',
    ],
    ['fails with its whole interval beyond', 2, { low: 1.4, high: 2.6 }, 'fails'],
    ['fails past the limit without an uncertainty', 1.001, undefined, 'fails'],
  ] as const)('%s', (_, loop, span, wanted) => {
    expect(verdict(loopRule(), sheet(loop, span)).verdict).toBe(wanted)
  })

  it('is not shown without a reading, and points to where it would stand', () => {
    const finding = verdict(loopRule(), sheet(undefined))
    expect(finding).toMatchObject({
      verdict: 'not shown',
      missing: ['loop'],
      path: ['readings', 'circuits', 'K1', 'loop', 'grid'],
    })
  })

  it('is limited where the file says why', () => {
    const tree = { readings: { circuits: { K1: { not_tested: 'no access' } } } }
    expect(verdict(loopRule(), sheet(undefined), tree)).toMatchObject({ verdict: 'limited', reason: 'no access' })
  })

  it('points to the reading first and to the device besides', () => {
    expect(verdict(loopRule(), sheet(2)).related).toEqual([['circuits', 'K1', 'device']])
  })

  it('points to the subject where a rule names no place', () => {
    expect(verdict(loopRule({ at: [], needs: [] }), sheet(2))).toMatchObject({ path: ['circuits', 'K1'], related: [] })
  })

  it('leaves the sheet as it was', () => {
    const given = sheet(0.8, { low: 0.56, high: 1.04 })
    verdict(loopRule(), given)
    expect(given.inState.grid).toEqual({ loop: 0.8 })
  })
})

describe('a rule with several readings', () => {
  const both = loopRule({
    state: 'none',
    needs: [],
    reads: ['continuity', 'insulation'],
    at: [],
    must: (values) => {
      const { continuity, insulation } = values as { continuity: number; insulation: number }
      return continuity <= insulation
    },
  })
  const pair = (a: Span, b: Span): Sheet => ({
    ...sheet(undefined),
    values: { continuity: (a.low + a.high) / 2, insulation: (b.low + b.high) / 2 },
    spans: { continuity: a, insulation: b },
  })

  it('meets only when every corner of the intervals does', () => {
    expect(verdict(both, pair({ low: 1, high: 2 }, { low: 3, high: 4 })).verdict).toBe('meets')
    expect(verdict(both, pair({ low: 1, high: 3 }, { low: 2.5, high: 4 })).verdict).toBe(
      'meets, inside the uncertainty',
    )
  })

  it('fails outright only when no corner meets', () => {
    expect(verdict(both, pair({ low: 3, high: 4 }, { low: 1, high: 2 })).verdict).toBe('fails')
    expect(verdict(both, pair({ low: 2.5, high: 4 }, { low: 1, high: 3 })).verdict).toBe(
      'fails, inside the uncertainty',
    )
  })
})

describe('where a rule applies', () => {
  it('does not judge a sheet that its condition leaves out, and says so', () => {
    const rule = loopRule({ when: (values) => (values as Values).backed_up === true })
    expect(verdict(rule, sheet(2)).verdict).toBe('not applicable')
  })

  it('judges each state on its own', () => {
    const findings = judge(bookWith(loopRule({ state: 'each' })), { sheets: [sheet(0.5)], tree: {}, departures: [] })
    expect(findings.map(({ state, verdict: given }) => [state, given])).toEqual([
      ['grid', 'meets'],
      ['island', 'not shown'],
    ])
  })

  it('judges only the subjects that it is about', () => {
    expect(judge(bookWith(loopRule({ subject: 'meter' })), { sheets: [sheet(2)], tree: {}, departures: [] })).toEqual(
      [],
    )
  })
})

describe('a departure', () => {
  const departure: Departure = {
    rule: 'loop-low-enough',
    subject: 'K1',
    reason: 'agreed',
    agreed_by: 'customer',
    on: '2026-10-13',
  }

  it('goes with the finding that it is about', () => {
    expect(verdict(loopRule(), sheet(2), {}, [departure]).departure).toEqual(departure)
  })

  it('does not go with what is met, or with another subject', () => {
    expect(verdict(loopRule(), sheet(0.5), {}, [departure]).departure).toBeUndefined()
    expect(verdict(loopRule(), sheet(2), {}, [{ ...departure, subject: 'K2' }]).departure).toBeUndefined()
  })
})

const RANK = { meets: 0, 'meets, inside the uncertainty': 1, 'fails, inside the uncertainty': 2, fails: 3 } as const

it('tightening a limit never turns a failure into a pass', () => {
  fc.assert(
    fc.property(
      fc.double({ min: 0, max: 10, noNaN: true }),
      fc.double({ min: 0, max: 0.5, noNaN: true }),
      fc.double({ min: 0, max: 10, noNaN: true }),
      fc.double({ min: 0, max: 10, noNaN: true }),
      (loop, part, one, two) => {
        const judgedAt = (limit: number) => {
          const rule = loopRule({ must: (values) => ((values as Values).loop ?? 0) <= limit })
          return verdict(rule, sheet(loop, { low: loop * (1 - part), high: loop * (1 + part) }))
            .verdict as keyof typeof RANK
        }
        const [tight, loose] = [Math.min(one, two), Math.max(one, two)]
        expect(RANK[judgedAt(tight)]).toBeGreaterThanOrEqual(RANK[judgedAt(loose)])
      },
    ),
  )
})
