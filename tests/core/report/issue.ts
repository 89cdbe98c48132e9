import { createHash } from 'node:crypto'
import { bytesToHex } from '@noble/hashes/utils.js'
import type { Judged } from '#core/engine.ts'
import { signCheckpoint } from '#core/register/checkpoint.ts'
import { type IssuedEntry, leafHash, type RegisterEntry } from '#core/register/entry.ts'
import { readerOf, rootOf } from '#core/register/merkle.ts'
import { makeProof, type Proof } from '#core/register/proof.ts'
import type { Sign } from '#core/register/signing.ts'
import { factsText } from '#core/report/facts.ts'
import type { Issue, IssueRecord } from '#core/report/issue.ts'
import { entries, ORGANISATION } from '../register/entries.ts'

const sha256 = (text: string): string => createHash('sha256').update(text).digest('hex')

/** An invented house of Fennmark issues a report that takes the place of another. */
export const RECORD: IssueRecord = {
  number: 'FEN-2026-0012',
  issued_at: '2026-10-21T09:30:00Z',
  organisation: { name: 'Fenn & Moor Islanding', address: ['Quay 4', 'Fennmark'] },
  issued_by: { name: 'I. Sandpiper', licence: 'FM-0419' },
  reviewed_by: { name: 'O. Plover', licence: 'FM-0377' },
  replaces: { number: 'FEN-2026-0009', reason: 'the loop reading of K2 was entered for K3' },
  check_address: 'https://skerry.test/check/FEN-2026-0012',
  accepted: [
    {
      kind: 'limitation',
      anchor: 'limitation/K2',
      words: 'Not tested: the freezer could not be switched off. It leaves open: K2 in the island: Loop impedance.',
      by: 'O. Plover',
      on: '2026-10-20T16:05:00Z',
      reason: 'to be read at the next service in March',
    },
  ],
}

/** The entry that the register holds for it. */
export function entryOf(judged: Judged, text: string, record: IssueRecord, sequence: number): IssuedEntry {
  const { replaces } = record
  return {
    organisation: ORGANISATION,
    sequence,
    kind: 'issued',
    number: record.number,
    revision: 2,
    source_sha256: sha256(text),
    facts_sha256: sha256(factsText(judged)),
    at: record.issued_at,
    ...(replaces && { replaces: replaces.number, reason: replaces.reason }),
  }
}

/** The last entry of a register of so many, proved. */
export async function provedEntry(
  entry: RegisterEntry,
  { sign, certificate, at }: { readonly sign: Sign; readonly certificate: string; readonly at: string },
): Promise<Proof> {
  const leaves = [...entries(entry.sequence), entry].map(leafHash)
  const head = { origin: entry.organisation, size: leaves.length, root: bytesToHex(rootOf(leaves)), at }
  return makeProof(entry, await signCheckpoint(head, sign), certificate, readerOf(leaves))
}

export interface IssueKeys {
  readonly sign: Sign
  readonly certificate: string
}

/** Everything that an issued report is printed from. */
export async function issueOf(
  judged: Judged,
  text: string,
  keys: IssueKeys,
  change: Partial<IssueRecord> = {},
): Promise<Issue> {
  const record = { ...RECORD, ...change }
  const entry = entryOf(judged, text, record, 22)
  return { ...record, register: await provedEntry(entry, { ...keys, at: record.issued_at }) }
}
