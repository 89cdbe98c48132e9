import type { Tx } from '#server/db.ts'
import type { MailKind } from '#server/mail/kinds.ts'
import type { Whom } from './secrets.ts'

export type MailSwitches = Readonly<Record<string, unknown>>

const of = (tx: Tx, { organisation, person }: Whom) =>
  tx('people').where({ organisation_id: organisation, person_id: person, active: true })

/** What a person has switched; a kind that is not there is on. */
export async function findSwitches(tx: Tx, whom: Whom): Promise<MailSwitches | undefined> {
  const row = await of(tx, whom).first<{ mail_switches: MailSwitches } | undefined>('mail_switches')
  return row?.mail_switches
}

/** Switches one kind of mail; false when there is no such person any more. */
export async function switchMail(tx: Tx, whom: Whom, kind: MailKind, on: boolean): Promise<boolean> {
  const changed = await of(tx, whom).update({
    mail_switches: tx.raw('mail_switches || jsonb_build_object(?::text, ?::boolean)', [kind, on]),
  })
  return changed === 1
}
