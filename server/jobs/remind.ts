import { AHEAD_DAYS, type DueStage, daysAfter, dueStage } from '#core/review/due-stage.ts'
import { queueMail } from '#server/commands/queue-mail.ts'
import { inOrganisation, type Tx } from '#server/db.ts'
import { everyRow } from '#server/exports/table.ts'
import { type Colleague, findByRole, findColleagues } from '#server/queries/colleagues.ts'
import { type DueRow, listDue } from '#server/queries/due.ts'
import { everyOrganisation } from '#server/queries/every-organisation.ts'
import type { Services } from '#server/services.ts'
import type { Handler } from './handler.ts'

/** At most so many administrators are told of one thing. */
const MOST_TOLD = 20

/** Calibrations concern the administrators; a verification also whoever made the report. */
async function concerned(tx: Tx, organisation: string, { person, kind }: DueRow): Promise<Colleague[]> {
  const administrators = await findByRole(tx, organisation, 'administrator', MOST_TOLD)
  const makers = person === null ? [] : await findColleagues(tx, organisation, [person])
  const all = new Map([...administrators, ...makers].map((one) => [one.person, one]))
  return [...all.values()].filter(({ silent }) => !silent.includes(`${kind} due`))
}

async function tellOf(
  tx: Tx,
  services: Services,
  { organisation, row, stage }: { readonly organisation: string; readonly row: DueRow; readonly stage: DueStage },
): Promise<void> {
  const { kind, id, name, place, mark, due_on: due } = row
  const now = services.clock()
  const overdue = stage === 'overdue'
  for (const { person, name: called, email } of await concerned(tx, organisation, row)) {
    const common = {
      organisation,
      to: { person, name: called, address: email },
      // Another due date is another thing: after a new calibration the reminders begin anew.
      dedupe: `due/${kind}/${id}/${due}/${stage}`,
      now,
    }
    if (kind === 'calibration') {
      const model = { instruments: [{ name, serial: mark, due, overdue }], page: `/instruments/${id}` } as const
      await queueMail(tx, services, { ...common, kind: 'calibration due', model })
    } else {
      const model = {
        installations: [{ title: name, place, number: mark, due, overdue }],
        page: `/reports/${id}`,
      } as const
      await queueMail(tx, services, { ...common, kind: 'verification due', model })
    }
  }
}

/** Reminds of what falls due: one mail for each person, thing and stage, however often this runs. */
export const remind: Handler<'remind'> = async (services) => {
  const today = services.clock().toISOString().slice(0, 10)
  const until = daysAfter(today, AHEAD_DAYS)
  for (const organisation of await everyOrganisation(services.db)) {
    const rows = everyRow<DueRow>(services, organisation, async (tx, last, limit) => {
      const after = last === undefined ? {} : { after: [last.due_on, last.id] }
      return (await listDue(tx, { organisation, until, ...after, limit })).slice(0, limit)
    })
    for await (const row of rows) {
      const stage = dueStage(row.due_on, today)
      if (stage === undefined) continue
      await inOrganisation(services.db, organisation, (tx) => tellOf(tx, services, { organisation, row, stage }))
    }
  }
}
