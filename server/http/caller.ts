import { createHash } from 'node:crypto'
import type { Request } from 'express'
import { inOrganisation } from '#server/db.ts'
import { noteTokenUse } from '#server/queries/tokens.ts'
import type { Services } from '#server/services.ts'
import { stillSignedIn } from './session.ts'

/** Who calls, before the database has been asked for the person. */
export interface Caller {
  readonly person: string
  readonly organisation: string
  readonly token: string | null
  readonly scopes: readonly string[] | null
}

/** Tokens begin with these letters, so that scanners for leaked secrets find them. */
export const TOKEN_PREFIX = 'skerry_'

export const tokenHash = (token: string): string => createHash('sha256').update(token).digest('hex')

interface Holder {
  organisation_id: string
  person_id: string
  token_id: string
  scopes: string[]
  last_used_at: Date | null
}

/** The use of a token is written down at most this often. */
const USE_EVERY_MS = 60_000

async function noteUse(services: Services, { organisation_id, token_id, last_used_at }: Holder): Promise<void> {
  const now = services.clock()
  if (last_used_at !== null && now.getTime() - last_used_at.getTime() < USE_EVERY_MS) return
  await inOrganisation(services.db, organisation_id, (tx) => noteTokenUse(tx, organisation_id, token_id, now))
}

async function tokenCaller(bearer: string, services: Services): Promise<Caller | undefined> {
  const { rows } = await services.db.raw<{ rows: Holder[] }>('select * from token_holder(?, ?)', [
    tokenHash(bearer),
    services.clock(),
  ])
  const [holder] = rows
  if (holder === undefined) return undefined
  await noteUse(services, holder)
  return {
    person: holder.person_id,
    organisation: holder.organisation_id,
    token: holder.token_id,
    scopes: holder.scopes,
  }
}

/** The caller behind an API token or a session; undefined where there is neither, or neither holds any more. */
export async function findCaller(request: Request, services: Services): Promise<Caller | undefined> {
  const authorization = request.get('authorization')
  if (authorization !== undefined) {
    const bearer = /^Bearer (skerry_[\w-]{20,100})$/.exec(authorization)?.[1]
    // Who shows a token means the token: one that does not hold is not made good by a cookie.
    return bearer === undefined ? undefined : await tokenCaller(bearer, services)
  }
  const { person, organisation } = request.session
  if (person === undefined || organisation === undefined) return undefined
  if (!stillSignedIn(request.session, services.clock())) return undefined
  return { person, organisation, token: null, scopes: null }
}
