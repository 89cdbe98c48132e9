import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { type Checked, check } from '#core/engine.ts'
import { SHIPPED_BOOKS, shippedBook } from '#core/judge/shipped.ts'
import { atFailureLevel, atStrictLevel, countVerdicts, type ToldFinding, toldFindings } from '#core/report/told.ts'
import { patched } from '../judge/patch.ts'

const shelf = { find: shippedBook, names: SHIPPED_BOOKS }
const example = (name: string): string => readFileSync(`examples/${name}.skerry.yaml`, 'utf8')
const told = (text: string, all = false): ToldFinding[] => toldFindings(check(text, shelf), all)
const bakery = example('alder-mill-bakery')

describe('a finding in words', () => {
  it('says what is wrong and what to do where a rule fails, at its place', () => {
    const finding = told(bakery).find(({ rule }) => rule === 'no-defect-is-left')
    expect(finding).toMatchObject({
      verdict: 'fails',
      subject: 'installation',
      message: 'These items have a defect: fire sealing.',
      range: { line: 118, column: 35 },
    })
    expect(finding?.remedy).toContain('Mend the defect')
  })

  it('names what is missing where a rule is not shown', () => {
    const finding = told(bakery).find(({ rule }) => rule === 'terminals-are-tight')
    expect(finding?.message).toContain('Not shown without: inspection: terminals tight.')
  })

  it('gives the stated reason where a reading is missing on purpose', () => {
    const text = bakery.replace('continuity: 0.29 ohm', 'continuity: { not_tested: cold store may not be opened }')
    const finding = told(text).find(({ verdict }) => verdict === 'limited')
    expect(finding?.message).toContain('Not tested: cold store may not be opened.')
  })

  it('says so where a rule holds only inside the uncertainty', () => {
    expect(
      told(patched({ set: { 'readings.circuits.K1.insulation': '1.1 MΩ at 500 V' } })).find(
        ({ verdict }) => verdict === 'meets, inside the uncertainty',
      )?.message,
    ).toContain('not over the whole uncertainty')
  })

  it('carries a departure along, and no longer stops the report then', () => {
    const text = bakery.replace(
      'departures: []',
      'departures: [ { rule: no-defect-is-left, subject: installation, reason: ordered, agreed_by: customer, on: 2026-10-13 } ]',
    )
    const finding = told(text).find(({ rule }) => rule === 'no-defect-is-left')
    expect(finding?.departure?.reason).toBe('ordered')
    expect(finding && atFailureLevel(finding)).toBe(false)
  })

  it('leaves out what is met and what does not apply, unless asked for all', () => {
    expect(told(bakery).some(({ verdict }) => verdict === 'meets')).toBe(false)
    const all = told(bakery, true)
    expect(all.find(({ verdict }) => verdict === 'meets')?.message).toMatch(/\.$/)
    expect(all.some(({ verdict }) => verdict === 'not applicable')).toBe(true)
  })

  it('comes in the order of the file', () => {
    const lines = told(bakery).map(({ range }) => range.offset)
    expect(lines).toEqual(lines.toSorted((a, b) => a - b))
  })
})

describe('a problem that keeps a file from being judged', () => {
  it.each([
    ['circuits:\n', 'circuits:\n  K9: 3\n', 'K9'],
    ['  operator: Fennmark Grid', '  opertor: Fennmark Grid', 'supply'],
    ['K1: { continuity: 0.29 ohm', 'K1: { continuity: 0.29 volt', 'K1'],
  ])('stands under the subject that it is in', (before, after, subject) => {
    expect(told(bakery.replace(before, after)).map((finding) => finding.subject)).toContain(subject)
  })

  it('stands at the head of the file where it has no other place', () => {
    expect(told('')).toMatchObject([{ subject: 'file', rule: 'empty-file', key: null, range: { line: 1, column: 1 } }])
    const unplaced: Checked = { kind: 'unreadable', problems: [{ code: 'syntax', path: [], message: 'No.' }] }
    expect(toldFindings(unplaced)).toMatchObject([{ range: { line: 1 } }])
  })
})

describe('what stops a report', () => {
  const finding = (
    verdict: ToldFinding['verdict'],
    severity: ToldFinding['severity'],
  ): Pick<ToldFinding, 'verdict' | 'severity'> => ({ verdict, severity })

  it.each([
    ['fails', 'failure', true, true],
    ['fails, inside the uncertainty', 'failure', true, true],
    ['fails', 'caution', false, false],
    ['not shown', 'failure', false, true],
    ['meets, inside the uncertainty', 'failure', false, true],
    ['limited', 'failure', false, false],
    ['meets', 'failure', false, false],
    ['not shown', 'note', false, false],
  ] as const)('%s at the level of %s: %s; strictly: %s', (verdict, severity, plain, strict) => {
    expect(atFailureLevel(finding(verdict, severity))).toBe(plain)
    expect(atStrictLevel(finding(verdict, severity))).toBe(strict)
  })

  it('is counted by verdict', () => {
    expect(countVerdicts([{ verdict: 'fails' }, { verdict: 'fails' }, { verdict: 'limited' }])).toMatchObject({
      fails: 2,
      limited: 1,
      meets: 0,
    })
  })
})
