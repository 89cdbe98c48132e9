import { randomBytes, randomUUID } from 'node:crypto'
import { mkdtempSync, readFileSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import supertest, { type Test } from 'supertest'
import type TestAgent from 'supertest/lib/agent.js'
import { inject } from 'vitest'
import type { Role } from '#core/policy/roles.ts'
import { createApp } from '#server/app.ts'
import { hashPassword } from '#server/commands/passwords.ts'
import { inOrganisation } from '#server/db.ts'
import { readEnv } from '#server/env.ts'
import { openServices } from '#server/make-services.ts'
import type { Services } from '#server/services.ts'
import { type Addresses, cloneDatabase, dropDatabase } from '#server/setup/databases.ts'

export const PASSWORD = 'a long password for tests only'
const passwordHash = hashPassword(PASSWORD)

export interface Member {
  readonly id: string
  readonly organisation: string
  readonly email: string
  readonly name: string
}

/** A signed-in browser: sends the session's token along with whatever changes something. */
export interface Browser {
  readonly member: Member
  readonly agent: InstanceType<typeof TestAgent>
  readonly csrf: string
  get(path: string): Test
  post(path: string): Test
  put(path: string): Test
  patch(path: string): Test
  delete(path: string): Test
}

/** A whole server of its own: database, services, web application, a clock that stands still until it is moved. */
export interface House {
  readonly services: Services
  readonly addresses: Addresses
  readonly app: ReturnType<typeof createApp>
  readonly dataDir: string
  now: Date
  organisation(mark?: string): Promise<string>
  member(organisation: string, roles: readonly Role[], name?: string): Promise<Member>
  signIn(member: Member): Promise<Browser>
  close(): Promise<void>
}

/** An example's text, for uploading. */
export const source = (name: string): string =>
  readFileSync(new URL(`../../examples/${name}.skerry.yaml`, import.meta.url), 'utf8')

/** The bytes of an answer, whatever its type. */
export async function whole(request: Test): Promise<Buffer> {
  const answer = await request.buffer(true).parse((response, done) => {
    const chunks: Buffer[] = []
    response.on('data', (chunk: Buffer) => chunks.push(chunk))
    response.on('end', () => done(null, Buffer.concat(chunks)))
  })
  return answer.body as Buffer
}

const changing =
  (agent: InstanceType<typeof TestAgent>, method: 'post' | 'put' | 'patch' | 'delete', csrf: string) =>
  (path: string) =>
    agent[method](path).set('x-csrf-token', csrf)

async function browser(app: House['app'], member: Member): Promise<Browser> {
  const agent = supertest.agent(app)
  const before = await agent.get('/api/session')
  const signed = await agent
    .post('/api/session')
    .set('x-csrf-token', before.body.csrf)
    .send({ email: member.email, password: PASSWORD })
  if (signed.status !== 200) throw new Error(`Signing in ended with ${signed.status}: ${signed.text}`)
  const { csrf } = signed.body
  return {
    member,
    agent,
    csrf,
    get: (path) => agent.get(path),
    post: changing(agent, 'post', csrf),
    put: changing(agent, 'put', csrf),
    patch: changing(agent, 'patch', csrf),
    delete: changing(agent, 'delete', csrf),
  }
}

/** Opens a server on a fresh copy of the migrated database. */
export async function openHouse(
  variables: Readonly<Record<string, string>> = {},
  admin: string = inject('postgres'),
): Promise<House> {
  const database = `test_${randomBytes(6).toString('hex')}`
  const addresses = await cloneDatabase(admin, 'skerry_template', database)
  const dataDir = mkdtempSync(join(tmpdir(), 'skerry-files-'))
  const read = readEnv({
    NODE_ENV: 'test',
    DATABASE_URL: addresses.web,
    DATABASE_OWNER_URL: addresses.owner,
    DATABASE_POOL: '4',
    BASE_URL: 'http://skerry.test',
    LOG_LEVEL: 'silent',
    DATA_DIR: join(dataDir, 'files'),
    KEY_DIR: join(dataDir, 'keys'),
    ...variables,
  })
  if (!read.ok) throw new Error(read.problems.join('\n'))
  const house = { now: new Date('2026-11-02T09:00:00Z') }
  const { services, boss, close } = openServices(read.env, { name: database, supervise: false, clock: () => house.now })
  await boss.start()
  const app = createApp(services)
  return Object.assign(house, {
    services,
    addresses,
    app,
    dataDir,
    async organisation(mark = `T${randomBytes(3).toString('hex').toUpperCase()}`) {
      const id = randomUUID()
      await inOrganisation(services.db, id, (tx) =>
        tx('organisations').insert({
          organisation_id: id,
          name: `Electrical works ${mark}`,
          address: 'Weir Lane 2, Fennmark',
          mark,
        }),
      )
      return id
    },
    async member(
      organisation: string,
      roles: readonly Role[],
      name = `${roles.join(' and ')} ${randomBytes(2).toString('hex')}`,
    ) {
      const id = randomUUID()
      const email = `${id.slice(0, 8)}@fennmark.example`
      const password_hash = await passwordHash
      await inOrganisation(services.db, organisation, (tx) =>
        tx('people').insert({
          organisation_id: organisation,
          person_id: id,
          email,
          name,
          roles: [...roles],
          password_hash,
        }),
      )
      return { id, organisation, email, name }
    },
    signIn: (member: Member) => browser(app, member),
    async close() {
      await close()
      await dropDatabase(admin, database)
      rmSync(dataDir, { recursive: true, force: true })
    },
  })
}
