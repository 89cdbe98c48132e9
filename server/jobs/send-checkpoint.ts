import { tell } from '#server/commands/tell.ts'
import { inOrganisation } from '#server/db.ts'
import { findByRole } from '#server/queries/colleagues.ts'
import { newestCheckpoint } from '#server/queries/register.ts'
import type { Handler } from './handler.ts'

/** At most so many auditors of an organisation are written to. */
const MOST = 50

/**
 * Mails the newest signed checkpoint to the auditors, at most once a day each: a register that is cut or rewritten later
 * no longer continues what they hold.
 */
export const sendCheckpoint: Handler<'send-checkpoint'> = async (services, { organisation }) => {
  const now = services.clock()
  await inOrganisation(services.db, organisation, async (tx) => {
    const checkpoint = await newestCheckpoint(tx, organisation)
    if (checkpoint === undefined) return
    await tell(
      tx,
      services,
      {
        organisation,
        kind: 'checkpoint',
        event: `checkpoint/${now.toISOString().slice(0, 10)}`,
        actor: '',
        subject: `The register has ${checkpoint.size} entries`,
        lines: [
          'Keep this mail: with it, anybody can tell later whether the register was cut or rewritten.',
          checkpoint.signed,
        ],
        path: '/register',
        now,
      },
      await findByRole(tx, organisation, 'auditor', MOST),
    )
  })
}
