import { describe, expect, it } from 'vitest'
import { pemOf } from '#core/seal/pem.ts'
import { page } from '../../paper/page.ts'
import { judgedText } from '../report/judged.ts'
import { person } from '../seal/people.ts'
import { failing, issue, judged, keys, proofOf, report, sealedBy, sha256, TEXT, verified, workshop } from './issued.ts'

const stranger = person('Stranger', 'authority')
const clerk = person('Clerk', 'seal', stranger)
const clerkKeys = { sign: clerk.sign, certificate: clerk.certificates.map(pemOf).join('') }
const withOthers = { text: TEXT, file: 'fell-side.skerry.yaml', issue }
const saysOf = async (id: string, ...asked: Parameters<typeof verified>) =>
  (await verified(...asked)).checks.find((check) => check.id === id)?.says

describe('an issued report does not hold', () => {
  it('when its pages show other words than the file that it carries', async () => {
    const remarks = { ...judged.install.report, remarks: 'All circuits were tested twice.' }
    const forged = { ...judged, install: { ...judged.install, report: remarks } }
    expect(await failing({ pdf: await sealedBy(workshop.render(forged, withOthers)) })).toEqual(['pages'])
  })

  it('when a bit of it was changed', async () => {
    const pdf = report.map((byte, at) => (at === report.length >> 1 ? byte ^ 1 : byte))
    expect(await failing({ pdf })).toContain('seal-digest')
  })

  it('when it is cut', async () => expect(await failing({ pdf: report.subarray(0, -100) })).toEqual(['seal-file']))

  it('for someone who trusts somebody else', async () => {
    expect(await failing({ trusted: stranger.certificates })).toEqual(['seal-certificate', 'register-keeper'])
  })

  it('when a quantity or a verdict comes out differently, and says which', async () => {
    const facts: typeof workshop.facts = (found) => workshop.facts(found).replace(/"value": [0-9.]+/, '"value": 4711')
    const verdicts: typeof workshop.verdicts = (found) => ({
      ...workshop.verdicts(found),
      'rule/new/K1/always': 'fails',
    })
    expect(await failing({ shop: { facts, verdicts } })).toEqual(['quantities', 'verdicts'])
    const { differences } = await verified({ shop: { facts, verdicts } })
    expect(differences.map(({ kind }) => kind)).toEqual(['quantity', 'verdict'])
    expect(differences[0]?.now).toContain('4711')
    expect(differences[1]).toEqual({ kind: 'verdict', about: 'rule/new/K1/always', issued: 'not there', now: 'fails' })
  })

  it('when several come out differently, and counts them', async () => {
    const verdicts = () => ({})
    expect(await saysOf('verdicts', { shop: { verdicts } })).toMatch(/^Judged anew, \d+ verdicts differ/)
    expect(await saysOf('quantities', { shop: { facts: () => '{}\n' } })).toMatch(
      /^Computed anew, \d+ quantities differ/,
    )
  })

  it('when this version cannot judge its file', async () => {
    const judge = () => workshop.judge('site: nowhere\n')
    expect(await failing({ shop: { judge } })).toEqual(['quantities'])
    expect(await saysOf('quantities', { shop: { judge } })).toContain('cannot judge the embedded file')
  })
})

describe('a proof that was handed out does not hold', () => {
  it.each([
    ['about another report', { number: 'FEN-2026-0077' }, 'The proof is about FEN-2026-0077'],
    ['about another file', { source_sha256: '1'.repeat(64) }, 'another install file'],
    ['about other quantities', { facts_sha256: '1'.repeat(64) }, 'other quantities'],
    ['about another PDF of the report', { pdf_sha256: '1'.repeat(64) }, 'not the one that was sealed'],
    [
      'once another took its place',
      { kind: 'replaced', replaced_by: 'FEN-2026-0013', reason: 'wrong Zs', pdf_sha256: undefined },
      'replaced by FEN-2026-0013: wrong Zs',
    ],
    [
      'once it was withdrawn',
      { kind: 'withdrawn', reason: 'never built', pdf_sha256: undefined },
      'withdrawn: never built',
    ],
  ])('%s', async (_, change, words) => {
    const proof = await proofOf(change)
    expect(await failing({ proof })).toEqual(['proof-is-about-this-file'])
    expect(await saysOf('proof-is-about-this-file', { proof })).toContain(words)
  })

  it('that is none', async () => expect(await failing({ proof: 'none' })).toEqual(['proof-file']))

  it('signed by somebody who is not trusted', async () => {
    expect(await failing({ proof: await proofOf({}, clerkKeys) })).toEqual(['proof-register-keeper'])
    expect(await failing({ proof: await proofOf({}, clerkKeys), trusted: null })).toEqual(['proof-register-keeper'])
  })

  it('that names nobody who signed it', async () => {
    expect(await failing({ proof: await proofOf({}, { ...keys, certificate: 'nobody' }) })).toEqual([
      'proof-register-checkpoint',
    ])
  })

  it('that names somebody else as who signed it', async () => {
    const proof = await proofOf({}, { sign: clerk.sign, certificate: keys.certificate })
    expect(await failing({ proof })).toEqual(['proof-register-checkpoint'])
  })
})

describe('a PDF is no issued report', () => {
  const seal = { name: 'Fenn & Moor Islanding', reason: 'none' }
  const attached = (name: string, text: string, relationship: 'Source' | 'Data' = 'Data') => ({
    name,
    type: 'application/json',
    bytes: new Uint8Array(Buffer.from(text)),
    relationship,
    description: name,
    created: '2026-10-21T09:30:00Z',
  })
  const { register, ...record } = issue
  const file = JSON.stringify({ ...record, rulebook: { id: 'iec', version: '1', hash: 'a'.repeat(64) }, verdicts: {} })
  const all = [
    attached('a.yaml', TEXT, 'Source'),
    attached('facts.json', '{}'),
    attached('issue.json', file),
    attached('register.json', JSON.stringify(register)),
  ]

  it.each([
    ['that carries nothing', []],
    ['without its install file', all.slice(1)],
    ['with two install files', [...all, attached('b.yaml', TEXT, 'Source')]],
    ['without its quantities', all.filter(({ name }) => name !== 'facts.json')],
    ['without its issue', all.filter(({ name }) => name !== 'issue.json')],
    [
      'with an issue that is no JSON',
      all.map((one) => (one.name === 'issue.json' ? attached('issue.json', 'issue') : one)),
    ],
    ['without its place in the register', all.slice(0, 3)],
    ['whose parts do not belong together', all],
  ])('%s', async (_, attachments) => {
    const pdf = await sealedBy(page('<h1>Report</h1>', { seal, attachments }))
    expect(await failing({ pdf })).toEqual(['embedded'])
  })

  it('that is a draft', async () => {
    expect(await failing({ pdf: page('<h1>Draft</h1>') })).toEqual(['seal-file', 'embedded'])
  })
})

describe('an issued report', () => {
  it('holds, with the proof that was handed out, in every check', async () => {
    const { checks, number, issuedAt, sealedAt, sha256: hash } = await verified({ proof: await proofOf() })
    expect(checks.filter(({ holds, open }) => !holds || open)).toEqual([])
    expect(checks.length).toBeGreaterThan(15)
    expect({ number, issuedAt, sealedAt, hash }).toEqual({
      number: 'FEN-2026-0012',
      issuedAt: '2026-10-21T09:30:00Z',
      sealedAt: '2026-10-21T09:30:05Z',
      hash: sha256(report),
    })
  })

  it('holds where nobody was named as trusted, and leaves that open', async () => {
    const { checks } = await verified({ trusted: null })
    expect(checks.filter(({ holds }) => !holds)).toEqual([])
    expect(checks.filter(({ open }) => open).map(({ id }) => id)).toEqual(['seal-certificate'])
    expect(checks.find(({ id }) => id === 'register-keeper')?.says).toContain('the house that sealed the report')
  })

  it('leaves its pages open where the rule book is another by now, and says so', async () => {
    const judge: typeof workshop.judge = (text) => ({
      ...judgedText(text),
      book: { ...judged.book, hash: 'b'.repeat(64) },
    })
    const { checks } = await verified({ shop: { judge } })
    expect(checks.filter(({ open }) => open).map(({ id }) => id)).toEqual(['rulebook', 'pages'])
    expect(checks.filter(({ holds }) => !holds)).toEqual([])
  })

  it('leaves open what the proof of its issue cannot show', async () => {
    const { checks } = await verified({ proof: await proofOf({ kind: 'issued', pdf_sha256: undefined }) })
    expect(checks.filter(({ open }) => open).map(({ id }) => id)).toEqual(['proof-is-about-this-file'])
  })
})
