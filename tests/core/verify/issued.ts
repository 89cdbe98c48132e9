import { createHash } from 'node:crypto'
import { check } from '#core/engine.ts'
import { SHIPPED_BOOKS, shippedBook } from '#core/judge/shipped.ts'
import type { RegisterEntry } from '#core/register/entry.ts'
import { factsText } from '#core/report/facts.ts'
import { createdFrom, renderReport } from '#core/report/render.ts'
import { verdictsOf } from '#core/report/verdict-list.ts'
import { pemOf } from '#core/seal/pem.ts'
import { seal } from '#core/seal/seal.ts'
import { type ReportVerdict, verifyReport, type Workshop } from '#core/verify/verify-report.ts'
import { fonts } from '../../paper/fonts.ts'
import { entryOf, issueOf, provedEntry } from '../report/issue.ts'
import { exampleText, judgedText } from '../report/judged.ts'
import { root, sealer } from '../seal/people.ts'

export const TEXT = exampleText('fell-side-dairy')
export const judged = judgedText(TEXT)
export const keys = { sign: sealer.sign, certificate: sealer.certificates.map(pemOf).join('') }
export const issue = await issueOf(judged, TEXT, keys)

export const workshop: Workshop = {
  judge: (text) => check(text, { find: shippedBook, names: SHIPPED_BOOKS }),
  facts: factsText,
  verdicts: ({ findings }) => verdictsOf(findings),
  render: (found, { text, file, issue: printed }) =>
    renderReport(found, { text, file, issue: printed, fonts, created: createdFrom(found.install), draft: false }),
}

/** Seals as the house of the tests does. */
export const sealedBy = (pdf: Uint8Array): Promise<Uint8Array> =>
  seal({ pdf, sign: sealer.sign, certificates: sealer.certificates, at: '2026-10-21T09:30:05Z' })

export const report = await sealedBy(workshop.render(judged, { text: TEXT, file: 'fell-side.skerry.yaml', issue }))

export const sha256 = (bytes: Uint8Array): string => createHash('sha256').update(bytes).digest('hex')

/** The proof file of an entry about the report. */
export async function proofOf(change: object = {}, signing = keys): Promise<string> {
  const { replaces: _replaces, reason: _reason, ...entry } = entryOf(judged, TEXT, issue, 23)
  const sealedEntry = { ...entry, kind: 'sealed', pdf_sha256: sha256(report), ...change }
  const kept = Object.fromEntries(Object.entries(sealedEntry).filter(([, value]) => value !== undefined))
  return JSON.stringify(await provedEntry(kept as unknown as RegisterEntry, { ...signing, at: '2026-10-21T18:00:00Z' }))
}

interface Asked {
  readonly pdf?: Uint8Array
  readonly proof?: string
  readonly trusted?: readonly Uint8Array[] | null
  readonly shop?: Partial<Workshop>
}

/** What verifying says; the root of the house is trusted unless told otherwise. */
export function verified({
  pdf = report,
  proof,
  trusted = root.certificates,
  shop = {},
}: Asked = {}): Promise<ReportVerdict> {
  const trust = { certificates: trusted ?? undefined, subtle: crypto.subtle }
  return verifyReport({ pdf, proof, trust, workshop: { ...workshop, ...shop } })
}

/** Names of the checks that do not hold. */
export async function failing(asked: Asked): Promise<string[]> {
  return (await verified(asked)).checks.filter(({ holds }) => !holds).map(({ id }) => id)
}
