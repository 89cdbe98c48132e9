import { createHash } from 'node:crypto'
import { writeFileSync } from 'node:fs'
import { chmod, readFile, rm } from 'node:fs/promises'
import { join } from 'node:path'
import createKnex from 'knex'
import { SMTPServer } from 'smtp-server'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { inOrganisation, type Tx } from '#server/db.ts'
import { checkOrganisation } from '#server/jobs/check-records.ts'
import { sealDocument } from '#server/jobs/seal-document.ts'
import { sendMail } from '#server/jobs/send-mail.ts'
import { sweep } from '#server/jobs/sweep.ts'
import { drain } from '#tests/server/drain.ts'
import { type Browser, type House, openHouse, source } from '#tests/server/house.ts'
import { approved, issue, well } from '#tests/server/life.ts'
import { soundRegister } from '#tests/server/registers.ts'

let house: House
let organisation: string
let installer: Browser
let reviewer: Browser
let administrator: Browser
const farm = source('tern-farm-tt')

beforeAll(async () => {
  house = await openHouse()
  organisation = await house.organisation('JOB')
  installer = await house.signIn(await house.member(organisation, ['installer']))
  reviewer = await house.signIn(await house.member(organisation, ['reviewer']))
  administrator = await house.signIn(await house.member(organisation, ['administrator']))
})
afterAll(() => house.close())

const inside = <T>(work: (tx: Tx) => Promise<T>): Promise<T> => inOrganisation(house.services.db, organisation, work)

async function issued(): Promise<{ report: string; document: string }> {
  const report = await approved(installer, reviewer, farm)
  well(await issue(reviewer, report))
  const row = await inside((tx) =>
    tx('documents').where({ organisation_id: organisation, report_id: report }).first('document_id'),
  )
  return { report, document: row.document_id }
}

const filesOf = async (): Promise<string[]> => {
  const found: string[] = []
  for await (const { key } of house.services.store.list({ organisation, kind: 'document' })) found.push(key)
  return found
}

describe('sealing', () => {
  it('has its effect once when two workers do the same job at the same time, and once more later', async () => {
    const { document } = await issued()
    const before = (await filesOf()).length
    await Promise.all([1, 2, 3].map(() => sealDocument(house.services, { organisation, document })))
    await sealDocument(house.services, { organisation, document })
    expect(
      await inside((tx) =>
        tx('seals').where({ organisation_id: organisation, document_id: document }).select('pdf_sha256'),
      ),
    ).toHaveLength(1)
    const entries = await soundRegister(house.services, organisation)
    expect(entries.filter(({ kind }) => kind === 'sealed')).toHaveLength(1)
    expect(await filesOf()).toHaveLength(before + 1)
  })

  it('of a document that does not exist is an error, which the queue tries again and then gives up', async () => {
    await expect(sealDocument(house.services, { organisation, document: organisation })).rejects.toThrow(/no document/)
  })
})

describe('the nightly check', () => {
  const damaged = async (): Promise<string[]> =>
    (await checkOrganisation(house.services, organisation)).map(({ what }) => what)

  it('finds nothing in a sound record', async () => {
    await issued()
    await drain(house.services)
    expect(await damaged()).toEqual([])
  })

  it('finds a sealed file that was changed, and one that is gone', async () => {
    const [row] = await inside((tx) => tx('seals').where({ organisation_id: organisation }).select('pdf_sha256'))
    const file = join(house.services.env.DATA_DIR, organisation, 'document', row.pdf_sha256)
    const bytes = await readFile(file)
    await chmod(file, 0o600)
    writeFileSync(file, Buffer.concat([bytes.subarray(0, -1), Buffer.from('x')]))
    expect(await damaged()).toEqual(['its sealed file was changed'])
    await rm(file)
    expect(await damaged()).toEqual(['its sealed file is missing'])
    writeFileSync(file, bytes)
    expect(createHash('sha256').update(bytes).digest('hex')).toBe(row.pdf_sha256)
    expect(await damaged()).toEqual([])
  })

  it.each([
    [
      'a changed entry',
      `update register_entries set entry = replace(entry, 'issued', 'isSued'), leaf_hash = encode(sha256('\\x00'::bytea || convert_to(replace(entry, 'issued', 'isSued'), 'UTF8')), 'hex') where sequence = 0`,
      'the chain breaks here',
    ],
    [
      'a cut tail',
      'delete from register_entries where sequence = (select max(sequence) from register_entries)',
      'the register is shorter than this',
    ],
    ['a head set back', `update register_heads set size = size - 1`, 'the head is not where the entries end'],
    ['a number skipped', 'update counters set last = last + 1', /^the counter stands at/],
    [
      'a state that the register does not know',
      `update reports set state = 'withdrawn' where state = 'issued'`,
      /the register says issued$/,
    ],
    ['a changed audit event', `update audit_events set body = body || ' ' where sequence = 2`, 'the chain breaks here'],
  ])(
    'finds %s, made by the owner with the triggers off, and is content when it is undone',
    async (_name, damage, words) => {
      const admin = createKnex({ client: 'pg', connection: house.addresses.owner, pool: { min: 0, max: 1 } })
      const tables = ['register_entries', 'register_heads', 'counters', 'reports', 'audit_events']
      try {
        // Row-level security is forced on the owner too; only whoever takes it off can do damage at all.
        await admin.transaction(async (tx) => {
          for (const table of tables)
            await tx.raw(`alter table ${table} disable trigger user; alter table ${table} no force row level security`)
          for (const table of tables) await tx.raw(`create table copy_of_${table} as table ${table}`)
          await tx.raw(damage)
        })
        const found = await damaged()
        expect(found.length).toBeGreaterThan(0)
        expect(found.some((what) => (typeof words === 'string' ? what === words : words.test(what)))).toBe(true)
      } finally {
        await admin.transaction(async (tx) => {
          await tx.raw('set constraints all deferred')
          await restore(tx)
          for (const table of tables)
            await tx.raw(
              `alter table ${table} enable trigger user; alter table ${table} force row level security; drop table copy_of_${table}`,
            )
        })
        await admin.destroy()
      }
      expect(await damaged()).toEqual([])
    },
  )

  async function restore(tx: { raw: (sql: string) => Promise<unknown> }): Promise<void> {
    await tx.raw('delete from register_entries; insert into register_entries select * from copy_of_register_entries')
    await tx.raw(
      'update register_heads h set size = c.size from copy_of_register_heads c where c.organisation_id = h.organisation_id',
    )
    await tx.raw(
      'update counters h set last = c.last from copy_of_counters c where c.organisation_id = h.organisation_id and c.year = h.year',
    )
    await tx.raw('update reports h set state = c.state from copy_of_reports c where c.report_id = h.report_id')
    await tx.raw(
      'update audit_events h set body = c.body from copy_of_audit_events c where c.organisation_id = h.organisation_id and c.sequence = h.sequence',
    )
  }
})

describe('mails', () => {
  interface Post {
    readonly server: SMTPServer
    readonly url: string
    readonly got: string[]
  }

  /** A mail server on loopback that answers as it is told. */
  async function post(answer: () => Error | null): Promise<Post> {
    const got: string[] = []
    const server = new SMTPServer({
      authOptional: true,
      disabledCommands: ['STARTTLS', 'AUTH'],
      onData(stream, _session, done) {
        const chunks: Buffer[] = []
        stream.on('data', (chunk: Buffer) => chunks.push(chunk))
        stream.on('end', () => {
          const refusal = answer()
          if (refusal === null) got.push(Buffer.concat(chunks).toString())
          done(refusal)
        })
      },
    })
    await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', () => resolve()))
    const address = server.server.address()
    const port = typeof address === 'object' && address !== null ? address.port : 0
    return { server, url: `smtp://127.0.0.1:${port}`, got }
  }

  const mail = (key: string): Promise<string> =>
    inside(async (tx) => {
      const [row] = await tx('mails')
        .insert({
          organisation_id: organisation,
          dedupe_key: key,
          message_id: `<${key}@skerry.test>`,
          kind: 'test',
          to_address: 'somebody@fennmark.example',
          subject: 'A test',
          text_body: 'Words.',
          html_body: '<p>Words.</p>',
        })
        .returning('mail_id')
      return row.mail_id
    })

  const stateOf = (id: string) =>
    inside((tx) => tx('mails').where({ organisation_id: organisation, mail_id: id }).first('state', 'attempts'))

  const refusal = (code: number): Error => Object.assign(new Error('Not now.'), { responseCode: code })

  it('are tried again after a passing refusal, sent once, with the same Message-ID', async () => {
    let left = 1
    const { server, url, got } = await post(() => (left-- > 0 ? refusal(451) : null))
    const services = { ...house.services, env: { ...house.services.env, SMTP_URL: url } }
    const id = await mail('tried-again')
    await expect(sendMail(services, { organisation, mail: id })).rejects.toThrow()
    await Promise.all([sendMail(services, { organisation, mail: id }), sendMail(services, { organisation, mail: id })])
    await sendMail(services, { organisation, mail: id })
    expect(got).toHaveLength(1)
    expect(got[0]).toContain('Message-ID: <tried-again@skerry.test>')
    expect(await stateOf(id)).toEqual({ state: 'sent', attempts: 2 })
    await new Promise<void>((resolve) => server.close(() => resolve()))
  })

  it('that are refused for good are not tried again', async () => {
    const { server, url } = await post(() => refusal(550))
    const services = { ...house.services, env: { ...house.services.env, SMTP_URL: url } }
    const id = await mail('refused')
    await sendMail(services, { organisation, mail: id })
    expect(await stateOf(id)).toMatchObject({ state: 'refused' })
    await new Promise<void>((resolve) => server.close(() => resolve()))
  })

  it('stay with the house where there is no mail server', async () => {
    const id = await mail('kept')
    await sendMail(house.services, { organisation, mail: id })
    expect(await stateOf(id)).toMatchObject({ state: 'kept' })
  })
})

describe('jobs that were given up', () => {
  it('are listed to the administrator with their reason and put back on their queue, and to no other house', async () => {
    const foreign = await house.signIn(await house.member(await house.organisation(), ['administrator']))
    const job = await inside(async (tx) => {
      await house.services.jobs.send(tx, 'seal-document', { organisation, document: organisation })
      const row = await tx('pgboss.job')
        .where({ name: 'seal-document', state: 'created' })
        .whereRaw(`data ->> 'document' = ?`, [organisation])
        .first('id')
      await tx('pgboss.job')
        .where({ id: row.id })
        .update({
          state: 'failed',
          completed_on: new Date(),
          output: JSON.stringify({ message: 'There is no document.' }),
        })
      return row.id
    })
    expect((await installer.get('/api/jobs')).status).toBe(403)
    expect((await foreign.get('/api/jobs')).body.failed).toEqual([])
    expect((await foreign.post(`/api/jobs/${job}/retry`).send({})).status).toBe(404)
    const { failed } = well(await administrator.get('/api/jobs')).body
    expect(failed).toMatchObject([{ id: job, queue: 'seal-document', reason: 'There is no document.' }])
    expect((await administrator.post(`/api/jobs/${job}/retry`).send({})).status).toBe(204)
    expect(well(await administrator.get('/api/jobs')).body.failed).toEqual([])
    expect((await administrator.post(`/api/jobs/${job}/retry`).send({})).status).toBe(404)
  })
})

describe('sweeping', () => {
  it('takes away what has had its time and leaves the rest', async () => {
    const key = (name: string, days: number) =>
      inside((tx) =>
        tx('idempotency_keys').insert({
          organisation_id: organisation,
          person_id: installer.member.id,
          key: name,
          request_sha256: '',
          status: 200,
          headers: '{}',
          body: '',
          created_at: new Date(house.now.getTime() - days * 86_400_000),
        }),
      )
    await key('three days old', 3)
    await key('one day old', 1)
    await sweep(house.services, {})
    const left: { key: string }[] = await inside((tx) =>
      tx('idempotency_keys').where({ organisation_id: organisation }).select('key'),
    )
    expect(left.map((row) => row.key)).toContain('one day old')
    expect(left.map((row) => row.key)).not.toContain('three days old')
  })
})
