// npm start: sets everything up, then serves: a database of its own on loopback, the web application, and its worker.
import { spawn, spawnSync } from 'node:child_process'
import { createHash } from 'node:crypto'
import { existsSync, mkdirSync, openSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { join, resolve } from 'node:path'
import { freePort, homeFor, startCluster, stopCluster } from './setup/postgres.mjs'
import { ready, run, stop } from './setup/ready.mjs'

ready()

const DATA = resolve('.data')
const NOTE = join(DATA, 'running.json')
const LOG = join(DATA, 'server.log')
const PREFERRED_PORT = 4180

/** A process that this project started before and that still answers. */
async function running() {
  if (!existsSync(NOTE)) return undefined
  const note = JSON.parse(readFileSync(NOTE, 'utf8'))
  try {
    const answer = await fetch(`${note.address}/healthz`, { signal: AbortSignal.timeout(2000) })
    return answer.ok ? note : undefined
  } catch {
    // Nothing answers: the note was left behind by a process that was killed.
    return undefined
  }
}

/** Two starts at once must not both set up: the second waits its turn by refusing. */
function lock() {
  mkdirSync(DATA, { recursive: true })
  const file = join(DATA, 'starting.lock')
  try {
    writeFileSync(openSync(file, 'wx'), String(process.pid))
  } catch {
    const pid = Number(readFileSync(file, 'utf8'))
    if (pid > 0 && existsSync(`/proc/${pid}`))
      stop(`Another start (process ${pid}) is setting things up. Wait for it, or end it.`)
    writeFileSync(file, String(process.pid))
  }
  return () => rmSync(file, { force: true })
}

function output(program, args, env = {}) {
  const { status, stdout, stderr } = spawnSync(program, args, { encoding: 'utf8', env: { ...process.env, ...env } })
  if (status !== 0) stop(`${program} ${args.join(' ')} ended with ${status}.\n${stderr}`)
  return stdout
}

const TSX = ['--import', 'tsx']

/** The project's own cluster, or the server that DATABASE_URL names. */
async function database() {
  if (process.env.DATABASE_URL) {
    output(process.execPath, [...TSX, 'tools/setup/migrate.ts'])
    return { env: {}, end: () => undefined }
  }
  const place = createHash('sha256').update(process.cwd()).digest('hex').slice(0, 12)
  const home = homeFor(join(DATA, 'postgres'), `/var/lib/skerry-${place}`)
  const { url } = await startCluster(home)
  const made = output(process.execPath, [...TSX, 'tools/setup/prepare.ts', 'skerry'], { SKERRY_ADMIN_URL: url })
  const { owner, web } = JSON.parse(made)
  return { env: { DATABASE_URL: web, DATABASE_OWNER_URL: owner }, end: () => stopCluster(home) }
}

async function portToUse() {
  if (process.env.PORT) return Number(process.env.PORT)
  const taken = await fetch(`http://127.0.0.1:${PREFERRED_PORT}/`, { signal: AbortSignal.timeout(1000) }).then(
    () => true,
    (error) => error.name === 'TimeoutError',
  )
  return taken ? await freePort() : PREFERRED_PORT
}

async function answering(address, server) {
  for (let attempt = 0; attempt < 120; attempt++) {
    if (server.exitCode !== null) stop(`The server ended with ${server.exitCode} before it was ready.`)
    try {
      const answer = await fetch(`${address}/readyz`, { signal: AbortSignal.timeout(2000) })
      if (answer.ok) return
    } catch {
      // Not listening yet.
    }
    await new Promise((done) => setTimeout(done, 250))
  }
  stop('The server did not become ready within 30 seconds.')
}

const before = await running()
if (before !== undefined) {
  process.stdout.write(`Skerry is running already: ${before.address} (process ${before.pid}).\n`)
  process.exit(0)
}

const unlock = lock()
run('npm', ['run', '--silent', 'build'])
const { env, end } = await database()
const port = await portToUse()
const address = `http://localhost:${port}`
const settings = { ...process.env, ...env, PORT: String(port), BASE_URL: process.env.BASE_URL ?? address }
const seeded = output(process.execPath, [...TSX, 'tools/setup/seed.ts'], settings)

const log = openSync(LOG, 'a')
const children = ['server/main.ts', 'server/worker.ts'].map((program) =>
  spawn(process.execPath, [...TSX, program], { env: settings, stdio: ['ignore', log, 'inherit'] }),
)
const [web] = children
let ending = false
const finish = (signal) => {
  if (ending) return
  ending = true
  for (const child of children) child.kill(signal)
}
for (const signal of ['SIGINT', 'SIGTERM']) process.on(signal, () => finish(signal))
const ended = Promise.all(children.map((child) => new Promise((done) => child.once('exit', (code) => done(code)))))
// One without the other is no server: whatever ends first takes the other along.
for (const child of children) child.once('exit', () => finish('SIGTERM'))

await answering(address, web)
writeFileSync(NOTE, JSON.stringify({ pid: process.pid, address }))
unlock()
process.stdout.write(`
Skerry is ready: ${address}

${seeded}
Files can be checked without the server, too:
  npx skerry check examples/alder-mill-bakery.skerry.yaml

Verification is work for skilled persons. Local codes and licensed practice come before anything that Skerry prints.
The log: ${LOG}
Ctrl-C ends it.
`)

const codes = await ended
rmSync(NOTE, { force: true })
end()
process.exitCode = codes.every((code) => code === 0 || code === null) ? 0 : 1
