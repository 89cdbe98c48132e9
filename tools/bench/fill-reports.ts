import { createHash, randomBytes } from 'node:crypto'
import createKnex from 'knex'
import { addressFor } from '#server/setup/databases.ts'

/** Whom a filled database belongs to, and the token that opens it. */
export interface Filled {
  readonly organisation: string
  readonly token: string
}

const ORGANISATION = '5ee00009-0000-4000-8000-000000000000'
const PERSON = '5ee00009-0000-4000-8000-000000000001'
/** A second organisation with as many rows again: what is fenced off must cost nothing. */
const OTHERS = 4

const names = ['Heron Ford', 'Alder Mill', 'Tern Farm', 'Reed Hall', 'Osier Lane', 'Weir Mill', 'Fell Side', 'Smithy']

/**
 * Fills a migrated database with made reports of the invented valley of Fennmark, some three in four of them of one
 * organisation.
 *
 * @param admin the address of the cluster's administrator, whom no fence keeps out
 */
export async function fill(admin: string, database: string, count: number): Promise<Filled> {
  const db = createKnex({ client: 'pg', connection: addressFor(admin, database), pool: { min: 0, max: 1 } })
  const token = `skerry_${randomBytes(24).toString('base64url')}`
  try {
    for (let index = 0; index < OTHERS; index += 1) {
      const id = ORGANISATION.replace(/.$/, String(index * 2))
      const person = ORGANISATION.replace(/.$/, String(index * 2 + 1))
      await db('organisations').insert({ organisation_id: id, name: `Works ${index}`, mark: `W${index}` })
      await db('people').insert({
        organisation_id: id,
        person_id: person,
        email: `a${index}@fennmark.example`,
        name: 'A. Fenn',
        roles: ['installer', 'reviewer'],
      })
    }
    await db('tokens').insert({
      organisation_id: ORGANISATION,
      person_id: PERSON,
      name: 'bench',
      token_hash: createHash('sha256').update(token).digest('hex'),
      hint: token.slice(-4),
      scopes: ['report.read', 'report.send'],
      expires_at: new Date('2099-01-01'),
    })
    await db.raw(
      `insert into reports (organisation_id, state, reference, title, place, purpose, inspected_on, due_on, outcome, created_by, created_at, updated_at)
       select replace(?, '000000000000', '00000000000' || o)::uuid,
              (array['draft', 'in review', 'returned', 'approved'])[1 + i % 4],
              'FM-' || (2020 + i % 7) || '-' || i, (?::text[])[1 + i % 8] || ' ' || i, 'Fennmark', 'initial verification',
              date '2020-01-01' + i % 2400, date '2025-01-01' + i % 2400, 'meets',
              replace(?, '000000000000', '00000000000' || (o + 1))::uuid,
              timestamptz '2020-01-01' + i * interval '3 minutes', timestamptz '2020-01-01' + i * interval '3 minutes'
       from (select i, case when i % 4 < 3 then 0 else 2 * (1 + i % 3) end as o from generate_series(1, ?::int) i) made`,
      [ORGANISATION, names, ORGANISATION, count],
    )
    await db.raw('vacuum analyze reports')
    return { organisation: ORGANISATION, token }
  } finally {
    await db.destroy()
  }
}
