import { describe, expect, it } from 'vitest'
import type { Finding } from '#core/glossary.ts'
import { sure } from '#core/report/sure.ts'
import { Verdicts, verdictCell, worst } from '#core/report/verdicts.ts'
import { judgedBase, modelOf, sceneOf, textsOf } from './judged.ts'

const plain = (part: unknown): string => textsOf(part).join('\n').replaceAll('\u00a0', ' ')

const finding = (more: Partial<Finding>): Finding => ({
  rule: 'insulation-is-high-enough',
  subject: 'K1',
  state: null,
  verdict: 'meets',
  severity: 'failure',
  path: [],
  related: [],
  missing: [],
  ...more,
})

const departure = { rule: 'r', subject: 'K1', reason: 'agreed', agreed_by: 'B. Reed', on: '2026-06-01' }

describe('the verdict at the end of a row', () => {
  it('is a dash where no rule is about the row', () => {
    expect(new Verdicts({ findings: [], book: judgedBase().book }).cell('K1', {}, 'a')).toEqual({
      anchor: 'a',
      text: '–',
    })
  })

  it('is the worst of what is judged, not its average', () => {
    const verdicts = ['meets', 'limited', 'fails, inside the uncertainty', 'not shown'] as const
    expect(worst(verdicts.map((verdict) => ({ verdict })))).toBe('fails, inside the uncertainty')
    expect(worst([])).toBe('meets')
  })

  it('fails beside a departure when another rule fails for which nobody agreed to depart', () => {
    const departs = finding({ verdict: 'fails', departure })
    expect(verdictCell([departs, finding({ verdict: 'fails' })])).toEqual({
      mark: { word: 'fails', shape: 'verdict-fails' },
    })
    expect(verdictCell([departs, finding({})])).toEqual({
      mark: { word: 'departs on purpose', shape: 'verdict-limited' },
    })
    expect(verdictCell([departs])).toMatchObject({ mark: { word: 'departs on purpose' } })
  })

  it('counts cautions beside it, and stands alone where there is nothing else', () => {
    const caution = finding({ verdict: 'fails', severity: 'caution' })
    expect(verdictCell([finding({}), caution])).toMatchObject({ mark: { word: 'meets' }, note: '1 caution' })
    expect(verdictCell([caution, caution])).toEqual({ text: '2 cautions' })
  })

  it('is the departure where the file departs on purpose', () => {
    const judged = judgedBase({
      set: {
        'readings.circuits.K1.insulation': '0.4 MΩ at 500 V',
        departures: [
          {
            rule: 'insulation-is-high-enough',
            subject: 'K1',
            reason: 'heating cable, dried out later',
            agreed_by: 'B. Reed',
            on: '2026-06-17',
          },
        ],
      },
    })
    expect(judged.findings.filter(({ departure: agreed }) => agreed).map(({ subject }) => subject)).toEqual(['K1'])
    expect(plain(modelOf(judged))).toContain('departs on purpose')
  })
})

describe('what a report takes for granted', () => {
  it('stops the report when it is missing: a gap would hide a mistake of ours', () => {
    expect(() => sure(undefined, 'The sheet of K1')).toThrow('The sheet of K1 is taken for granted')
    expect(sure(0, 'nothing')).toBe(0)
    const scene = sceneOf(judgedBase())
    expect(() => scene.sheet('K99')).toThrow('The sheet of K99')
    expect(() => scene.ruleKey('no-such-rule')).toThrow('The rule no-such-rule')
  })
})
