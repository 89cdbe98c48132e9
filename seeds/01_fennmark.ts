import type { Knex } from 'knex'
import { hashPassword } from '#server/commands/passwords.ts'
import { inOrganisation } from '#server/db.ts'
import { readEnv } from '#server/env.ts'
import { openServices } from '#server/make-services.ts'
import { ALDER, TARN } from './fennmark/histories.ts'
import { DEMO_PASSWORD, type DemoOrganisation, ORGANISATIONS } from './fennmark/people.ts'
import { fillRegisters } from './fennmark/registers.ts'
import { Stagehand } from './fennmark/stage.ts'
import { type Cast, scenesOf } from './fennmark/tell-story.ts'

async function people(db: Knex, { id, name, address, mark, people }: DemoOrganisation): Promise<void> {
  const password_hash = await hashPassword(DEMO_PASSWORD)
  await inOrganisation(db, id, async (tx) => {
    await tx('organisations').insert({ organisation_id: id, name, address, mark })
    await tx('people').insert(
      people.map((person) => ({
        organisation_id: id,
        person_id: person.id,
        email: person.email,
        name: person.name,
        licence: person.licence,
        roles: [...person.roles],
        password_hash,
      })),
    )
  })
}

/** Tarn Side has people of its own under the files that Alder's have signed. */
const TARN_NAMES = {
  'A. Fenn': 'L. Birk',
  'FM-1182': 'FM-1301',
  'J. Rushton': 'T. Vik',
  'FM-1240': 'FM-1288',
  'R. Alder': 'O. Strand',
  'FM-0907': 'FM-1122',
  'Alder Electrical': 'Tarn Side Installations',
} as const

function castOf({ id, mark, people }: DemoOrganisation): Cast {
  const first = (role: string): string => people.find(({ roles }) => roles[0] === role)?.id ?? ''
  return {
    organisation: id,
    mark,
    installer: first('installer'),
    reviewer: first('reviewer'),
    administrator: first('administrator'),
    names: mark === 'TARN' ? TARN_NAMES : {},
  }
}

/** The demonstration: two contractors of Fennmark, their people, registers, and three years of reports. */
export async function seed(): Promise<void> {
  const read = readEnv({ ...process.env, LOG_LEVEL: 'silent' })
  if (!read.ok) throw new Error(read.problems.join('\n'))
  const { services, boss, close } = openServices(read.env, {
    name: 'skerry seed',
    supervise: false,
    // The sealing key is made here: its certificate must hold on the days of the story.
    clock: () => new Date('2023-01-02T08:00:00Z'),
  })
  await boss.start()
  try {
    const stage = new Stagehand(services)
    for (const [organisation, histories] of [
      [ORGANISATIONS[0], ALDER],
      [ORGANISATIONS[1], TARN],
    ] as const) {
      if (organisation === undefined) continue
      await people(services.db, organisation)
      const cast = castOf(organisation)
      await fillRegisters(services, cast)
      const scenes = histories.flatMap((history, index) => scenesOf(stage, cast, history, index))
      for (const { play } of scenes.toSorted((a, b) => a.at.getTime() - b.at.getTime())) await play()
    }
  } finally {
    await close()
  }
}
