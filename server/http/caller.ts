import { createHash } from 'node:crypto'
import type { Request } from 'express'
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
}

/** The caller behind an API token or a session; undefined where there is neither, or neither holds any more. */
export async function findCaller(request: Request, services: Services): Promise<Caller | undefined> {
  const bearer = /^Bearer (skerry_[\w-]{20,100})$/.exec(request.get('authorization') ?? '')?.[1]
  if (bearer !== undefined) {
    const { rows } = await services.db.raw<{ rows: Holder[] }>('select * from token_holder(?)', [tokenHash(bearer)])
    const [holder] = rows
    if (holder === undefined) return undefined
    return {
      person: holder.person_id,
      organisation: holder.organisation_id,
      token: holder.token_id,
      scopes: holder.scopes,
    }
  }
  const { person, organisation } = request.session
  if (person === undefined || organisation === undefined) return undefined
  if (!stillSignedIn(request.session, services.clock())) return undefined
  return { person, organisation, token: null, scopes: null }
}
