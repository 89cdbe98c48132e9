import { describe, expect, it } from 'vitest'
import type { Issue } from '#core/report/issue.ts'
import { issue, judged, TEXT, workshop } from '../core/verify/issued.ts'
import { pagesOf, wordsOf } from './tools.ts'

const printed = (change: Partial<Issue> = {}): Uint8Array =>
  workshop.render(judged, { text: TEXT, file: 'fell-side.skerry.yaml', issue: { ...issue, ...change } })
const pdf = printed()
const words = wordsOf(pdf)
const pages = pagesOf(pdf)
const [first = ''] = pages.map((page) => page.replaceAll(/\s+/g, ' '))

describe('an issue is not printed', () => {
  const { entry } = issue.register
  const registered = (change: object): Partial<Issue> => ({
    register: { ...issue.register, entry: { ...entry, ...change } as never },
  })
  it.each([
    [
      'under another number than the register has',
      { number: 'FEN-2026-0013' },
      'The number in the register is FEN-2026-0012, in the report FEN-2026-0013',
    ],
    ['at another time', { issued_at: '2026-10-22T09:30:00Z' }, 'time of issue'],
    ['for another file', registered({ source_sha256: '0'.repeat(64) }), 'hash of the file'],
    ['for other quantities', registered({ facts_sha256: '0'.repeat(64) }), 'hash of the quantities'],
    ['as replacing another report', registered({ replaces: 'FEN-2026-0001' }), 'number of the replaced report'],
    ['for another reason', registered({ reason: 'none' }), 'reason for replacing'],
    [
      'as replacing what the register does not name',
      registered({ replaces: undefined }),
      'is not given, in the report FEN-2026-0009',
    ],
    ['with an entry of another kind', registered({ kind: 'withdrawn' }), 'of the kind “withdrawn”'],
  ])('%s', (_, change, said) => expect(() => printed(change)).toThrow(said))
})

describe('an issued report', () => {
  it.each([
    ['a title', 'Test report: photovoltaics, battery and automatic changeover'],
    ['the issuing body', 'Fenn & Moor Islanding'],
    ['its address', 'Quay 4, Fennmark'],
    ['the place of the work', 'Fell Side 3, Fennmark'],
    ['the customer', 'M. Fell'],
    ['its number', 'FEN-2026-0012'],
    ['the days of the tests', '21 to 22 April 2026'],
    ['the day of issue, with its zone', '21 October 2026, 09:30 UTC'],
    ['who authorised it', 'I. Sandpiper, licence FM-0419'],
    ['who reviewed it', 'O. Plover, licence FM-0377'],
    ['what it replaces, and why', 'This report replaces FEN-2026-0009: the loop reading of K2 was entered for K3'],
    ['the rule book', 'International base, iec 1.0.0'],
    ['where it can be checked', 'https://skerry.test/check/FEN-2026-0012'],
  ])('says on its first page: %s', (_, part) => expect(first).toContain(part))

  it.each([
    ['that the results relate to this installation', 'The results relate to this installation only'],
    ['the decision rule', 'Decision rule: simple acceptance'],
    [
      'what was accepted, in the words that were accepted',
      'the freezer could not be switched off. It leaves open: K2 in the island',
    ],
    ['who accepted it and when', 'O. Plover 20 October 2026, 16:05 UTC'],
    ['the words of the reviewer', 'The reviewer: “to be read at the next service in March”'],
    ['what is an opinion', 'Cautions and notes are opinions of the rule book, marked as such'],
    ['the root of the register', '23 entries at 21 October 2026, 09:30 UTC'],
    ['a clear end', 'End of report FEN-2026-0012'],
  ])('says somewhere: %s', (_, part) => expect(words.includes(part), part).toBe(true))

  it('carries its number, its page and the count of pages on each page, and is no draft', () => {
    expect(pages.length).toBeGreaterThan(10)
    for (const [index, page] of pages.entries())
      expect(page).toContain(`FEN-2026-0012 · page ${index + 1} of ${pages.length}`)
    expect(words).not.toContain('DRAFT')
    expect(words).not.toContain('not yet: this is a draft')
  })

  it('marks readings that another company took', () => {
    const people = { ...judged.install.people, tested_by: { name: 'T. Heron', company: 'Mossgrid' } }
    const foreign = { ...judged, install: { ...judged.install, people } }
    const said = wordsOf(workshop.render(foreign, { text: TEXT, file: 'a.yaml', issue }))
    expect(said).toContain('The readings were taken by Mossgrid, not by the issuing body Fenn & Moor Islanding.')
    expect(words).not.toContain('The readings were taken by')
  })

  it('says so where there was nothing to accept, and names nothing that it replaces', () => {
    const plain = { ...issue, accepted: [] }
    const { replaces: _replaces, ...rest } = plain
    const { replaces: _number, reason: _reason, ...entry } = { reason: '', replaces: '', ...issue.register.entry }
    const other = workshop.render(judged, {
      text: TEXT,
      file: 'a.yaml',
      issue: { ...rest, register: { ...issue.register, entry: entry as never } },
    })
    expect(wordsOf(other)).toContain('There was no departure and no limitation to accept.')
    expect(wordsOf(other)).not.toContain('This report replaces')
  })
})
