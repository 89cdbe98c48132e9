// The baseline of the server's bench: Express, a pool, one query, and nothing that makes it safe.
import express from 'express'
import pg from 'pg'

const pool = new pg.Pool({ connectionString: process.env['DATABASE_OWNER_URL'], max: 10 })
pool.on(
  'connect',
  (client) =>
    void client.query(
      `set role skerry_app; select set_config('app.organisation', '${process.env['ORGANISATION']}', false)`,
    ),
)

const LIST = `select report_id, state, reference, title, place, purpose, inspected_on, due_on, outcome, revision, number, corrects,
  correction_reason, created_by, reviewer_id, version, created_at, updated_at
  from reports where organisation_id = $1 and discarded_at is null order by updated_at desc, report_id desc limit 51`

const app = express()
app.get('/readyz', (_request, response) => response.json({ status: 'ready' }))
app.get('/', async (_request, response) => {
  const { rows } = await pool.query(LIST, [process.env['ORGANISATION']])
  response.json({ reports: rows })
})
app.listen(Number(process.env['PORT']), '127.0.0.1')
