import type { Tx } from '#server/db.ts'

export type Purpose = 'invitation' | 'reset'

export interface NewLink {
  readonly organisation: string
  readonly person: string
  readonly purpose: Purpose
  readonly hash: string
  readonly expires: Date
  readonly now: Date
}

/** A new link takes the place of those before it: only the newest mail works. */
export async function insertLink(tx: Tx, link: NewLink): Promise<void> {
  await voidLinks(tx, link.organisation, link.person, link.now)
  await tx('links').insert({
    organisation_id: link.organisation,
    token_hash: link.hash,
    person_id: link.person,
    purpose: link.purpose,
    expires_at: link.expires,
    created_at: link.now,
  })
}

/** Makes every link of a person worthless that was not used yet. */
export async function voidLinks(tx: Tx, organisation: string, person: string, now: Date): Promise<void> {
  await tx('links').where({ organisation_id: organisation, person_id: person, used_at: null }).update({ used_at: now })
}

/** Uses a link up; false when somebody was faster. */
export async function useLink(tx: Tx, organisation: string, hash: string, now: Date): Promise<boolean> {
  const used = await tx('links')
    .where({ organisation_id: organisation, token_hash: hash, used_at: null })
    .andWhere('expires_at', '>', now)
    .update({ used_at: now })
  return used === 1
}

export interface LinkHolder {
  readonly organisation_id: string
  readonly person_id: string
  readonly purpose: Purpose
}

/** Whom an unused link belongs to, asked before the organisation is known. */
export async function findLink(tx: Tx, hash: string, now: Date): Promise<LinkHolder | undefined> {
  const { rows } = await tx.raw<{ rows: LinkHolder[] }>('select * from link_holder(?, ?)', [hash, now])
  return rows[0]
}

export async function findByAddress(tx: Tx, email: string): Promise<{ organisation_id: string; person_id: string }[]> {
  const { rows } = await tx.raw<{ rows: { organisation_id: string; person_id: string }[] }>(
    'select * from people_with_address(?)',
    [email.trim()],
  )
  return rows
}
