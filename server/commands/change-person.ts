import type { Role } from '#core/policy/roles.ts'
import type { Tx } from '#server/db.ts'
import { type Refused, refuse } from '#server/http/problems.ts'
import type { Answer, Call } from '#server/http/route.ts'
import { presentPerson } from '#server/presenters/person.ts'
import { voidLinks } from '#server/queries/links.ts'
import { addressTaken, findPerson, lockAdministrators, type PersonRow, updatePerson } from '#server/queries/people.ts'
import { endSessions } from '#server/queries/sessions.ts'
import { revokeTokens } from '#server/queries/tokens.ts'
import { checkAgain } from './check-again.ts'
import { sendNotice } from './send-link.ts'

export interface PersonBody {
  readonly email?: string
  readonly name?: string
  readonly licence?: string | null
  readonly roles?: readonly Role[]
  readonly active?: boolean
}

type ChangeCall = Call<unknown, PersonBody, PersonRow>

/** Why the organisation would be left with nobody to administer it. */
async function leavesNobody({ tx, actor, subject, body }: ChangeCall): Promise<Refused | undefined> {
  const loses = body.active === false || (body.roles !== undefined && !body.roles.includes('administrator'))
  if (!loses || !subject.roles.includes('administrator')) return undefined
  const others = (await lockAdministrators(tx, actor.organisation)).filter((id) => id !== subject.person_id)
  return others.length > 0
    ? undefined
    : refuse('conflict', 'This is the last administrator. Give the role to somebody else first.')
}

/** Who has the address can have the account by a reset: it is changed with the administrator's own password only. */
async function movesTo(call: ChangeCall, email: string): Promise<Refused | undefined> {
  const { tx, actor, subject } = call
  if (await addressTaken(tx, actor.organisation, email, subject.person_id))
    return refuse('conflict', `Somebody else of the organisation has the address ${email}.`)
  return await checkAgain(call)
}

/** What ends with an account at once: its sessions, its tokens, and the links that were mailed. */
async function shut(tx: Tx, organisation: string, person: string, now: Date): Promise<void> {
  await endSessions(tx, person)
  await revokeTokens(tx, organisation, person, now)
  await voidLinks(tx, organisation, person, now)
}

/** Changes a person, tells the old address when it is replaced, and ends what a closed account leaves open. */
export async function changePerson(call: ChangeCall): Promise<Answer | Refused> {
  const { tx, actor, subject, body, now, services } = call
  const { organisation } = actor
  const { person_id: person } = subject
  const email = body.email?.toLowerCase()
  const moved = email !== undefined && email !== subject.email
  const refused = (await leavesNobody(call)) ?? (moved ? await movesTo(call, email) : undefined)
  if (refused !== undefined) return refused
  if (moved) {
    await voidLinks(tx, organisation, person, now)
    const to = { organisation, person, name: subject.name, email: subject.email, now }
    await sendNotice(tx, services, to, 'The address was changed')
  }
  await updatePerson(tx, organisation, person, {
    ...(email === undefined ? {} : { email }),
    ...(body.name === undefined ? {} : { name: body.name }),
    ...(body.licence === undefined ? {} : { licence: body.licence }),
    ...(body.roles === undefined ? {} : { roles: body.roles }),
    ...(body.active === undefined ? {} : { active: body.active }),
  })
  if (body.active === false) await shut(tx, organisation, person, now)
  const changed = await findPerson(tx, organisation, person)
  if (changed === undefined) throw new Error('A changed person has no row.')
  return {
    body: presentPerson(changed),
    version: changed.version,
    audit: { before: presentPerson(subject), after: presentPerson(changed) },
  }
}
