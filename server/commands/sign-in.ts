import type { Knex } from 'knex'
import passport from 'passport'
import { Strategy } from 'passport-local'
import { outside } from '#server/db.ts'
import { hashPassword, verifyPassword } from './passwords.ts'

/** A person of one organisation. */
export interface Membership {
  readonly person: string
  readonly organisation: string
}

/** What address and password open. `tried` are accounts with that address whose password is another. */
export interface Opened {
  readonly matching: readonly Membership[]
  readonly tried: readonly Membership[]
}

interface Candidate {
  organisation_id: string
  person_id: string
  password_hash: string
}

/** Checked when nobody has the address, so that the answer takes as long as for somebody. */
const nobody = hashPassword('nobody has this password')

async function open(db: Knex, email: string, password: string): Promise<Opened> {
  const { rows } = await outside(db, (tx) =>
    tx.raw<{ rows: Candidate[] }>('select * from sign_in_candidates(?)', [email.trim()]),
  )
  if (rows.length === 0) await verifyPassword(await nobody, password)
  const matching: Membership[] = []
  const tried: Membership[] = []
  for (const { organisation_id, person_id, password_hash } of rows) {
    const right = await verifyPassword(password_hash, password)
    const list = right ? matching : tried
    list.push({ organisation: organisation_id, person: person_id })
  }
  return { matching, tried }
}

/** The way in by address and password, as a strategy of Passport. One address may belong to people of several organisations. */
function localStrategy(db: Knex): Strategy {
  return new Strategy({ usernameField: 'email', passwordField: 'password' }, (email, password, done) => {
    open(db, email, password).then(
      (opened) => done(null, opened),
      (error: unknown) => done(error),
    )
  })
}

/** Runs the strategy on what was sent. */
export async function signIn(db: Knex, body: { readonly email: string; readonly password: string }): Promise<Opened> {
  const authenticator = new passport.Passport()
  authenticator.use(localStrategy(db))
  return await new Promise((resolve, reject) => {
    const settle = (error: unknown, opened?: Opened | false | null): void => {
      if (error) reject(error)
      else resolve(opened || { matching: [], tried: [] })
    }
    authenticator.authenticate('local', { session: false }, settle)({ body }, {}, reject)
  })
}
