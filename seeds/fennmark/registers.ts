import { inOrganisation } from '#server/db.ts'
import { insertCondition, insertConditionVersion } from '#server/queries/conditions.ts'
import { insertInstrument, insertInstrumentVersion } from '#server/queries/instruments.ts'
import type { Services } from '#server/services.ts'
import { INSTRUMENTS, YEARS } from './calibrations.ts'
import type { Cast } from './tell-story.ts'

/** Instruments with a calibration each year, and what the grid operator has demanded over time. */
export async function fillRegisters({ db }: Services, { organisation, administrator }: Cast): Promise<void> {
  await inOrganisation(db, organisation, async (tx) => {
    for (const { serial, kind, calibrated } of INSTRUMENTS) {
      const by = { organisation, person: administrator, now: new Date('2023-01-09T08:00:00Z') }
      const id = await insertInstrument(tx, by, serial)
      if (id === undefined) throw new Error(`Instrument ${serial} stands in the story twice.`)
      for (const [index, year] of YEARS.entries()) {
        const facts = {
          kind,
          calibrated_on: `${year}-${calibrated}`,
          due_on: `${year + 1}-${calibrated}`,
          certificate: `FC-${year}-${serial}`,
          uncertainty: {},
          note: '',
        }
        await insertInstrumentVersion(
          tx,
          { ...by, now: new Date(`${year}-${calibrated}T15:00:00Z`) },
          { id, version: index + 1, facts },
        )
      }
    }
    const by = { organisation, person: administrator, now: new Date('2023-01-09T08:00:00Z') }
    const id = await insertCondition(tx, by, 'Fennmark Grid')
    if (id === undefined) throw new Error('Fennmark Grid stands in the story twice.')
    const facts = {
      separation: 'not stated',
      stated_in: 'Connection conditions 2023',
      valid_from: '2023-01-01',
      note: 'Asked for in writing for each site.',
    } as const
    await insertConditionVersion(tx, by, { id, version: 1, facts })
  })
}
