import type { IssuedEntry, RegisterEntry, SealedEntry } from '#core/register/entry.ts'

/** An invented house in Fennmark. */
export const ORGANISATION = 'skerry.test/organisations/fen'

const hash = (digit: string): string => digit.repeat(64)

export function issuedEntry(sequence: number): IssuedEntry {
  return {
    organisation: ORGANISATION,
    sequence,
    kind: 'issued',
    number: `FEN-2026-${String(sequence + 1).padStart(4, '0')}`,
    revision: 2,
    source_sha256: hash('a'),
    facts_sha256: hash('b'),
    at: '2026-10-21T09:30:00Z',
  }
}

export function sealedEntry(sequence: number): SealedEntry {
  return { ...issuedEntry(sequence), kind: 'sealed', pdf_sha256: hash('c') }
}

/** A register of so many entries, issued and sealed in turn. */
export function entries(count: number): RegisterEntry[] {
  return Array.from({ length: count }, (_, at) => (at % 2 === 0 ? issuedEntry(at) : sealedEntry(at)))
}
