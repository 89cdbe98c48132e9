import type { Proof } from '#core/register/proof.ts'

/** A person as printed. */
export interface Signatory {
  readonly name: string
  readonly licence?: string
}

/** A departure or a limitation that the reviewer accepted, as it is printed. */
export interface Accepted {
  readonly kind: 'departure' | 'limitation'
  /** What it is about in the report. */
  readonly anchor: string
  /** The words that were accepted. */
  readonly words: string
  /** Who accepted them, and when (RFC 3339 in UTC). */
  readonly by: string
  readonly on: string
  /** What the reviewer said to it. */
  readonly reason?: string
}

/** What an issued report says beyond its file: all of it is printed, and embedded for whoever verifies it. */
export interface Issue {
  readonly number: string
  /** RFC 3339 in UTC. */
  readonly issued_at: string
  /** The issuing body. */
  readonly organisation: { readonly name: string; readonly address: readonly string[] }
  /** Who authorised the report. */
  readonly issued_by: Signatory
  readonly reviewed_by: Signatory
  /** The report that this one takes the place of, and why. */
  readonly replaces?: { readonly number: string; readonly reason: string }
  /** Where anybody can check the report by its number or its file. */
  readonly check_address: string
  /** Place of the `issued` entry in the register. */
  readonly register: Proof
  readonly accepted: readonly Accepted[]
}

/** What of an issue stands in `issue.json`: the register's proof has a file of its own beside it. */
export type IssueRecord = Omit<Issue, 'register'>

/** What `issue.json` holds: the record, and how the file was judged, for whoever judges it again. */
export interface IssueFile extends IssueRecord {
  readonly rulebook: { readonly id: string; readonly version: string; readonly hash: string }
  /** Each verdict by the anchor of its finding. */
  readonly verdicts: Readonly<Record<string, string>>
}

/** Names under which the files of an issued report are embedded, beside the install file itself. */
export const EMBEDDED = { facts: 'facts.json', register: 'register.json', issue: 'issue.json' } as const

interface Hashes {
  readonly source: string
  readonly facts: string
}

/**
 * What keeps an issue from being printed: its register entry must be about this very file and these very words.
 *
 * @param hashes SHA-256 of the file and of the embedded quantities, in hex
 * @returns the first thing that does not fit, in words
 */
export function misfit(issue: Issue, hashes: Hashes): string | undefined {
  const { entry } = issue.register
  if (entry.kind !== 'issued') return `The register entry is of the kind “${entry.kind}”, not “issued”.`
  const pairs = [
    ['number', entry.number, issue.number],
    ['time of issue', entry.at, issue.issued_at],
    ['hash of the file', entry.source_sha256, hashes.source],
    ['hash of the quantities', entry.facts_sha256, hashes.facts],
    ['number of the replaced report', entry.replaces, issue.replaces?.number],
    ['reason for replacing', entry.reason, issue.replaces?.reason],
  ] as const
  const wrong = pairs.find(([, registered, printed]) => registered !== printed)
  return (
    wrong && `The ${wrong[0]} in the register is ${wrong[1] ?? 'not given'}, in the report ${wrong[2] ?? 'not given'}.`
  )
}
