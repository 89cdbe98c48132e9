import { createHash } from 'node:crypto'
import { textHash } from '#core/report/anchor.ts'
import { type Facts, factsOf, factsText } from '#core/report/facts.ts'
import { EMBEDDED } from '#core/report/issue.ts'
import { attachmentsOf } from '#core/seal/attachments.ts'
import { PdfFile } from '#core/seal/pdf-file.ts'
import type { Tx } from '#server/db.ts'
import type { FieldError } from '#server/http/problems.ts'
import { type RegisterRow, type StoredJudgement, storedJudgement } from '#server/queries/register-search.ts'
import type { Services } from '#server/services.ts'
import { judgeSource, type Lifted } from './judge-source.ts'
import { sealedFile } from './sealed-file.ts'

/** A number that came out otherwise. */
interface Difference {
  readonly subject: string
  readonly quantity: string
  readonly issued: unknown
  readonly now: unknown
}

/** One thing about a document held against what today's engine makes of its stored file. */
export interface Recomputed {
  readonly document: string
  readonly number: string
  /** Same file, same quantities, same verdicts. */
  readonly same: boolean
  readonly source: { readonly registered: string; readonly stored: string }
  readonly rulebook: { readonly issued: object; readonly now: object | null; readonly same: boolean }
  readonly software: { readonly issued: string; readonly now: string | null }
  readonly facts: {
    readonly registered: string
    readonly now: string | null
    readonly same: boolean
    /** Quantity by quantity, as the sealed PDF carries them; null where it is not there to be read. */
    readonly differences: readonly Difference[] | null
  }
  readonly verdicts: readonly { readonly verdict: string; readonly issued: number; readonly now: number }[]
  readonly outcome: { readonly issued: string; readonly now: string | null }
  /** Why today's engine does not take the file, where it does not. */
  readonly errors: readonly FieldError[]
}

const same = (a: unknown, b: unknown): boolean => JSON.stringify(a) === JSON.stringify(b)

/** Subject by subject, quantity by quantity. */
export function factDifferences(issued: Facts, now: Facts): Difference[] {
  const subjects = [...new Set([...Object.keys(issued), ...Object.keys(now)])]
  return subjects.flatMap((subject) => {
    const [was, is] = [issued[subject] ?? {}, now[subject] ?? {}]
    const names = [...new Set([...Object.keys(was), ...Object.keys(is)])]
    return names
      .filter((name) => !same(was[name], is[name]))
      .map((quantity) => ({
        subject,
        quantity,
        issued: was[quantity]?.value ?? null,
        now: is[quantity]?.value ?? null,
      }))
  })
}

function verdictDifferences(issued: Readonly<Record<string, number>>, now: Readonly<Record<string, number>>) {
  return [...new Set([...Object.keys(issued), ...Object.keys(now)])]
    .map((verdict) => ({ verdict, issued: issued[verdict] ?? 0, now: now[verdict] ?? 0 }))
    .filter((one) => one.issued !== one.now)
}

/** The quantities as they were issued: the sealed PDF carries them, and the register has their hash. */
async function issuedFacts(
  tx: Tx,
  services: Services,
  organisation: string,
  row: RegisterRow,
): Promise<Facts | undefined> {
  const pdf = await sealedFile(tx, services, organisation, row.document_id)
  if ('refused' in pdf) return undefined
  const carried = attachmentsOf(new PdfFile(pdf.bytes)).find(({ name }) => name === EMBEDDED.facts)
  const text = carried && new TextDecoder().decode(carried.bytes)
  if (text === undefined || textHash(text) !== row.facts_sha256) return undefined
  const facts: Facts = JSON.parse(text)
  return facts
}

const bookOf = ({ rulebook_id, rulebook_version, rulebook_hash }: StoredJudgement): Lifted['rulebook'] => ({
  id: rulebook_id,
  version: rulebook_version,
  hash: rulebook_hash,
})

/** Judges the stored file of a document with today's engine and lists what came out otherwise than it was issued. */
export async function recompute(
  tx: Tx,
  services: Services,
  organisation: string,
  row: RegisterRow,
): Promise<Recomputed> {
  const stored = await storedJudgement(tx, organisation, row.report_id, row.revision)
  const storedHash = createHash('sha256').update(stored.source).digest('hex')
  const result = judgeSource(stored.source)
  const issuedBook = bookOf(stored)
  const common = {
    document: row.document_id,
    number: row.number,
    source: { registered: row.source_sha256, stored: storedHash },
  }
  if (!result.ok)
    return {
      ...common,
      same: false,
      rulebook: { issued: issuedBook, now: null, same: false },
      software: { issued: stored.software, now: null },
      facts: { registered: row.facts_sha256, now: null, same: false, differences: null },
      verdicts: [],
      outcome: { issued: stored.outcome, now: null },
      errors: result.errors,
    }
  const { judged, lifted } = result
  const now = textHash(factsText(judged))
  const factsSame = now === row.facts_sha256
  const issued = factsSame ? undefined : await issuedFacts(tx, services, organisation, row)
  const verdicts = verdictDifferences(stored.counts, lifted.counts)
  const kept = issued === undefined ? null : factDifferences(issued, factsOf(judged))
  return {
    ...common,
    same: storedHash === row.source_sha256 && factsSame && verdicts.length === 0 && stored.outcome === lifted.outcome,
    rulebook: { issued: issuedBook, now: lifted.rulebook, same: issuedBook.hash === lifted.rulebook.hash },
    software: { issued: stored.software, now: lifted.software },
    facts: { registered: row.facts_sha256, now, same: factsSame, differences: factsSame ? [] : kept },
    verdicts,
    outcome: { issued: stored.outcome, now: lifted.outcome },
    errors: [],
  }
}
