import type { Actor } from '#core/policy/roles.ts'
import { inOrganisation, type Tx } from '#server/db.ts'
import { type Refused, refuse } from '#server/http/problems.ts'
import { findActor } from '#server/queries/actor.ts'
import { writeAudit } from '#server/queries/audit.ts'
import { type OrganisationName, organisationName } from '#server/queries/organisations.ts'
import { findSecrets, writeSecrets } from '#server/queries/secrets.ts'
import type { Services } from '#server/services.ts'
import { hashPassword, isOutdated } from './passwords.ts'
import { takeCode } from './second-step.ts'
import { type Membership, signIn } from './sign-in.ts'
import { SignInThrottle } from './sign-in-throttle.ts'

export interface Credentials {
  readonly email: string
  readonly password: string
  readonly code?: string
  /** Which of several organisations, for an address that belongs to people of more than one. */
  readonly organisation?: string
}

export interface Origin {
  readonly address: string
  readonly request: string
}

export type Entered =
  | { readonly kind: 'in'; readonly actor: Actor; readonly membership: Membership }
  | { readonly kind: 'choose'; readonly organisations: readonly OrganisationName[] }
  | { readonly kind: 'refused'; readonly refused: Refused }

const refused = (refusal: Refused): Entered => ({ kind: 'refused', refused: refusal })

async function note(
  services: Services,
  { organisation, person }: Membership,
  action: string,
  { address, request }: Origin,
  details: Readonly<Record<string, unknown>> = {},
): Promise<void> {
  await inOrganisation(services.db, organisation, (tx) =>
    writeAudit(tx, {
      organisation,
      person,
      roles: [],
      action,
      subject: `person/${person}`,
      at: services.clock(),
      request,
      address,
      details,
    }),
  )
}

/** No refusal is quicker than this: what was looked up behind it cannot be told from its time. */
const REFUSAL_MS = 400

/**
 * Address, password and code; counted where they are wrong, and written into the trail of whose account it is. A refusal
 * has the same words and takes the same time whether or not anybody has the address.
 */
export async function enter(services: Services, credentials: Credentials, origin: Origin): Promise<Entered> {
  const begun = performance.now()
  const entered = await tryToEnter(services, credentials, origin)
  const left = REFUSAL_MS - (performance.now() - begun)
  if (entered.kind === 'refused' && left > 0) await new Promise((resolve) => setTimeout(resolve, left))
  return entered
}

async function tryToEnter(services: Services, credentials: Credentials, origin: Origin): Promise<Entered> {
  const throttle = new SignInThrottle(services.tries)
  const tried = { email: credentials.email, address: origin.address }
  const wait = await throttle.enter(tried)
  if (wait > 0)
    return refused(
      refuse('too-many', `After several wrong tries the next one may be made in ${wait} seconds.`, {
        headers: { 'retry-after': String(wait) },
      }),
    )
  const { matching, tried: wrong } = await signIn(services.db, credentials)
  const chosen =
    credentials.organisation === undefined
      ? matching
      : matching.filter(({ organisation }) => organisation === credentials.organisation)
  const [membership, ...others] = chosen
  if (membership === undefined) {
    for (const account of wrong) await note(services, account, 'sign-in-failed', origin)
    return refused(refuse('sign-in-failed'))
  }
  if (others.length > 0)
    return {
      kind: 'choose',
      organisations: await Promise.all(
        chosen.map(({ organisation }) =>
          inOrganisation(services.db, organisation, (tx) => organisationName(tx, organisation)),
        ),
      ),
    }
  const actor = await inOrganisation(services.db, membership.organisation, (tx) =>
    admit(tx, services, membership, credentials),
  )
  if (actor === undefined) {
    await note(services, membership, 'sign-in-failed', origin, { reason: 'code' })
    return refused(
      refuse('sign-in-failed', 'The code of the second factor is missing or wrong.', { more: { code_needed: true } }),
    )
  }
  await throttle.succeeded(tried)
  await note(services, membership, 'sign-in', origin)
  return { kind: 'in', actor, membership }
}

/** The second step, and the hash made anew when the settings have changed since it was made. */
async function admit(
  tx: Tx,
  services: Services,
  membership: Membership,
  { password, code = '' }: Credentials,
): Promise<Actor | undefined> {
  const secrets = await findSecrets(tx, membership)
  if (secrets === undefined || !(await takeCode(tx, membership, secrets, code, services.clock()))) return undefined
  if (secrets.password_hash !== null && isOutdated(secrets.password_hash))
    await writeSecrets(tx, membership, { password_hash: await hashPassword(password) })
  return await findActor(tx, membership.organisation, membership.person)
}
