import type { Knex } from 'knex'
import passport from 'passport'
import { Strategy } from 'passport-local'
import { outside } from '#server/db.ts'
import { hashPassword, verifyPassword } from './passwords.ts'

/** Who showed the right password. */
export interface SignedIn {
  readonly person: string
  readonly organisation: string
}

interface Candidate {
  organisation_id: string
  person_id: string
  password_hash: string
}

/** Checked when nobody has the address, so that the answer takes as long as for somebody. */
const nobody = hashPassword('nobody has this password')

async function find(db: Knex, email: string, password: string): Promise<SignedIn | undefined> {
  const { rows } = await outside(db, (tx) =>
    tx.raw<{ rows: Candidate[] }>('select * from sign_in_candidates(?)', [email.trim()]),
  )
  if (rows.length === 0) await verifyPassword(await nobody, password)
  for (const { organisation_id, person_id, password_hash } of rows)
    if (await verifyPassword(password_hash, password)) return { organisation: organisation_id, person: person_id }
  return undefined
}

/** The way in by address and password, as a strategy of Passport. One address may belong to people of several organisations. */
export function localStrategy(db: Knex): Strategy {
  return new Strategy({ usernameField: 'email', passwordField: 'password' }, (email, password, done) => {
    find(db, email, password).then(
      (found) => done(null, found ?? false),
      (error: unknown) => done(error),
    )
  })
}

/** Runs the strategy on what was sent; nobody when address and password do not belong together. */
export async function signIn(
  db: Knex,
  body: { readonly email: string; readonly password: string },
): Promise<SignedIn | undefined> {
  const authenticator = new passport.Passport()
  authenticator.use(localStrategy(db))
  return await new Promise((resolve, reject) => {
    const settle = (error: unknown, user?: SignedIn | false | null): void => {
      if (error) reject(error)
      else resolve(user || undefined)
    }
    authenticator.authenticate('local', { session: false }, settle)({ body }, {}, reject)
  })
}
