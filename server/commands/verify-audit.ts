import { createHash } from 'node:crypto'
import type { Tx } from '#server/db.ts'
import { type AuditHead, auditHead, chainAfter, type LinkRow } from '#server/queries/audit-trail.ts'

/** The first place where a chain does not hold. */
export interface Break {
  readonly sequence: number
  readonly why: string
}

export interface AuditVerdict {
  readonly ok: boolean
  /** How many events were looked at. */
  readonly events: number
  readonly last: number
  /** The link of the last event: noted outside, it shows later whether the trail was cut or written anew. */
  readonly hash: string
  readonly broken: Break | null
}

const STRETCH = 1000

/** The link of an event: SHA-256 over the link before and the event's own text. */
export const linkOf = (before: string, body: string): string =>
  createHash('sha256')
    .update(before + body)
    .digest('hex')

interface Told {
  readonly at?: string
  readonly person?: string | null
  readonly action?: string
  readonly subject?: string
  readonly organisation?: string
}

function toldOf(body: string): Told | undefined {
  try {
    const told: Told = JSON.parse(body)
    return told
  } catch {
    return undefined
  }
}

/** What lists show comes from columns, and the hash is over the text: both must say the same. */
function columnsAgree(row: LinkRow, organisation: string): boolean {
  const told = toldOf(row.body)
  return (
    told !== undefined &&
    told.organisation === organisation &&
    told.at === row.at.toISOString() &&
    (told.person ?? null) === row.person_id &&
    told.action === row.action &&
    told.subject === row.subject
  )
}

function breakAt(row: LinkRow, expected: number, before: string, organisation: string): Break | undefined {
  if (row.sequence !== expected) return { sequence: expected, why: 'The event is missing.' }
  if (linkOf(before, row.body) !== row.hash)
    return {
      sequence: expected,
      why: 'The event, or one before it, was changed: its link does not follow from the one before.',
    }
  if (!columnsAgree(row, organisation))
    return { sequence: expected, why: 'The columns of the event say something else than the text that was hashed.' }
  return undefined
}

/** A link that somebody noted at an earlier time. */
export interface Known {
  readonly sequence: number
  readonly hash: string
}

interface Walk {
  readonly tx: Tx
  readonly organisation: string
  readonly head: AuditHead
  readonly known: Known | undefined
}

async function walk({ tx, organisation, head, known }: Walk): Promise<{ seen: number; broken: Break | undefined }> {
  let [seen, link] = [0, '']
  while (seen < head.last) {
    const rows = await chainAfter(tx, organisation, seen, Math.min(STRETCH, head.last - seen))
    if (rows.length === 0) return { seen, broken: { sequence: seen + 1, why: 'The event is missing.' } }
    for (const row of rows) {
      const broken = breakAt(row, seen + 1, link, organisation)
      if (broken !== undefined) return { seen, broken }
      if (known?.sequence === row.sequence && known.hash !== row.hash)
        return {
          seen,
          broken: { sequence: row.sequence, why: 'The link is not the one that was noted at an earlier time.' },
        }
      ;[seen, link] = [row.sequence, row.hash]
    }
  }
  return {
    seen,
    broken: link === head.hash ? undefined : { sequence: seen, why: 'The chain does not end where its head says.' },
  }
}

/**
 * Reads the whole trail of an organisation and follows its chain.
 *
 * @param known a link noted outside the database: only that shows that the newest events were cut off together with the head
 */
export async function verifyAudit(tx: Tx, organisation: string, known?: Known): Promise<AuditVerdict> {
  const head = await auditHead(tx, organisation)
  const { seen, broken } = await walk({ tx, organisation, head, known })
  const cut =
    known !== undefined && known.sequence > head.last
      ? {
          sequence: head.last + 1,
          why: `The trail ends here, and event ${known.sequence} was noted at an earlier time.`,
        }
      : undefined
  const found = broken ?? cut
  return { ok: found === undefined, events: seen, last: head.last, hash: head.hash, broken: found ?? null }
}
