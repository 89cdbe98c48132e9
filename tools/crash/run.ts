// npm run crash -- --rounds 200: tells the story of a report again and again while web, worker and database are killed at
// moving points, and then looks whether anything was lost, doubled or left half done. Exit 0 when all holds, 1 when not.
import { randomUUID } from 'node:crypto'
import { mkdtempSync, readFileSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { parseArgs } from 'node:util'
import { hashPassword } from '#server/commands/passwords.ts'
import { inOrganisation, outside } from '#server/db.ts'
import { readEnv } from '#server/env.ts'
import { openServices } from '#server/make-services.ts'
import type { Services } from '#server/services.ts'
import { prepareDatabase } from '#server/setup/databases.ts'
import { freePort, homeFor, startCluster, stopCluster } from '#tools/setup/postgres.mjs'
import { Client } from './client.ts'
import { broken, strays } from './invariants.ts'
import { type Told, tellStory } from './story.ts'
import { Database, OwnProcess, type Victim } from './victims.ts'

const { values } = parseArgs({ options: { rounds: { type: 'string', default: '200' } } })
const ROUNDS = Number(values.rounds)
const PASSWORD = 'a long password for the crash loop'
/** Requests that change something in one story: the kill moves over all of them, round by round. */
const STEPS = 15
/** ms after the request was sent: before, in the middle of, and after the transaction. */
const DELAYS = [0, 3, 12, 40, 110, 300] as const

const say = (line: string): void => void process.stdout.write(`${line}\n`)
const pause = (ms: number): Promise<void> => new Promise((resolve) => setTimeout(resolve, ms))

const folder = mkdtempSync(join(tmpdir(), 'skerry-crash-'))
const home = homeFor(mkdtempSync(join(tmpdir(), 'skerry-crash-db-')))
const cluster = await startCluster(home)
const addresses = await prepareDatabase(cluster.url, 'crash')
const port = await freePort()
const address = `http://127.0.0.1:${port}`
const variables = {
  NODE_ENV: 'development',
  DATABASE_URL: addresses.web,
  DATABASE_OWNER_URL: addresses.owner,
  PORT: String(port),
  BASE_URL: address,
  DATA_DIR: join(folder, 'files'),
  KEY_DIR: join(folder, 'keys'),
  LOG_LEVEL: 'info',
}

const web = new OwnProcess('web', 'server/main.ts', variables, join(folder, 'web.log'))
const worker = new OwnProcess('worker', 'server/worker.ts', variables, join(folder, 'worker.log'))
const database = new Database(home, cluster.port)
const VICTIMS: readonly Victim[] = [web, worker, database]

const read = readEnv(variables)
if (!read.ok) throw new Error(read.problems.join('\n'))
const open = () => openServices(read.env, { name: 'skerry crash', supervise: false, clock: () => new Date() })

const organisation = randomUUID()

async function seed({ db }: Services): Promise<Readonly<Record<'installer' | 'reviewer' | 'auditor', string>>> {
  const password_hash = await hashPassword(PASSWORD)
  const address = 'Weir Lane 2, Fennmark'
  const emails = {
    installer: 'w.sallow@fennmark.example',
    reviewer: 'o.plover@fennmark.example',
    auditor: 'k.heron@fennmark.example',
  }
  await inOrganisation(db, organisation, async (tx) => {
    await tx('organisations').insert({ organisation_id: organisation, name: 'Crash works', address, mark: 'CRASH' })
    for (const [role, email] of Object.entries(emails))
      await tx('people').insert({
        organisation_id: organisation,
        email,
        name: `The ${role}`,
        roles: [role],
        password_hash,
      })
  })
  return emails
}

/** Kills one victim at one point of a story, and starts it again. */
class Kill {
  #left: number
  #done: Promise<void> | undefined

  constructor(
    readonly victim: Victim,
    step: number,
    readonly delay: number,
  ) {
    this.#left = step
  }

  /** Called with each request that is about to be sent. */
  count(): void {
    if (this.#left-- === 0) this.#done = this.#strike()
  }

  async #strike(): Promise<void> {
    await pause(this.delay)
    this.victim.kill()
    await this.victim.start()
  }

  /** A worker is busy after the story too: what was not struck by then is struck now. */
  async end(): Promise<void> {
    this.#done ??= this.#strike()
    await this.#done
  }
}

/** Nobody works any more: jobs that a killed worker held are handed on, as the queue does when their time runs out. */
async function settle(services: Services): Promise<void> {
  const code = await worker.stop()
  if (code !== 0) say(`the worker did not stop in good order: ${code}`)
  await outside(services.db, (tx) => tx('pgboss.job').where('state', 'active').update({ state: 'retry' }))
  await worker.start()
  const until = Date.now() + 180_000
  for (;;) {
    const row = await outside(services.db, async (tx) => {
      await tx('pgboss.job')
        .where('state', 'retry')
        .update({ start_after: tx.raw('now()') })
      return await tx('pgboss.job')
        .whereIn('state', ['created', 'retry', 'active'])
        .whereIn('name', ['seal-document', 'send-mail', 'send-checkpoint'])
        .count('* as count')
        .first()
    })
    if (row?.['count'] === 0) return
    if (Date.now() > until) return say(`${String(row?.['count'])} jobs are still waiting`)
    await pause(500)
  }
}

async function rounds(): Promise<Told[]> {
  const first = open()
  const emails = await seed(first.services)
  await first.close()
  let kill: Kill | undefined
  const client = async (email: string): Promise<Client> => {
    const made = new Client(address, () => kill?.count())
    await made.signIn(email, PASSWORD)
    return made
  }
  const source = readFileSync(new URL('../../examples/fell-side-dairy.skerry.yaml', import.meta.url), 'utf8')
  const cast = {
    installer: await client(emails.installer),
    reviewer: await client(emails.reviewer),
    password: PASSWORD,
    source,
  }
  const told: Told[] = []
  for (let round = 0; round < ROUNDS; round++) {
    const victim = VICTIMS[round % VICTIMS.length] ?? web
    const [step, delay] = [Math.floor(round / VICTIMS.length) % STEPS, DELAYS[round % DELAYS.length] ?? 0]
    kill = new Kill(victim, step, delay)
    told.push(await tellStory(cast))
    await kill.end()
    say(`round ${round + 1}: ${victim.name} killed ${delay} ms after request ${step + 1}`)
  }
  return told
}

let code = 1
try {
  await web.start()
  await worker.start()
  const told = await rounds()
  const { services, close } = open()
  await settle(services)
  const found = await broken(services, organisation, told)
  const stray = await strays(services, organisation)
  if (stray > ROUNDS) found.push(`${stray} files that no row knows`)
  await close()
  for (const line of found) say(`BROKEN: ${line}`)
  say(
    `${ROUNDS} rounds, ${told.length * 2} reports issued, ${stray} files left by killed workers, ${found.length} things broken`,
  )
  code = found.length === 0 ? 0 : 1
} finally {
  await web.stop()
  await worker.stop()
  stopCluster(home, 'immediate')
  if (code === 0) rmSync(folder, { recursive: true, force: true })
  else say(`The logs are in ${folder}.`)
  rmSync(home, { recursive: true, force: true })
}
process.exit(code)
