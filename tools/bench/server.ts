// npm run bench:server: the server's speed as ratios to a baseline of the same run, on PostgreSQL and Node of its own.
import { type ChildProcess, spawn } from 'node:child_process'
import { mkdtempSync, readFileSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { prepareDatabase } from '#server/setup/databases.ts'
import { freePort, homeFor, startCluster, stopCluster } from '#tools/setup/postgres.mjs'
import { type Filled, fill } from './fill-reports.ts'
import { median } from './measure.ts'
import { printTable } from './table.ts'

const SMALL = 10_000
const LARGE = Number(process.env['BENCH_REPORTS'] ?? 1_000_000)
const ROUNDS = 300
const LOAD_SECONDS = 5
const CONNECTIONS = 20

interface Web {
  readonly child: ChildProcess
  readonly address: string
}

const started: ChildProcess[] = []

async function serve(program: string, env: Readonly<Record<string, string>>): Promise<Web> {
  const port = await freePort()
  const address = `http://127.0.0.1:${port}`
  const child = spawn(process.execPath, ['--import', 'tsx', program], {
    env: { ...process.env, LOG_LEVEL: 'silent', PORT: String(port), BASE_URL: address, ...env },
    stdio: ['ignore', 'ignore', 'inherit'],
  })
  started.push(child)
  for (let attempt = 0; attempt < 200; attempt += 1) {
    const ready = await fetch(`${address}/readyz`).then(
      (answer) => answer.ok,
      () => false,
    )
    if (ready) return { child, address }
    await new Promise((resolve) => setTimeout(resolve, 100))
  }
  throw new Error(`${program} did not become ready.`)
}

/** A request that must succeed, timed to the last byte of its answer. */
async function timed(url: string, request: RequestInit): Promise<number> {
  const begun = performance.now()
  const answer = await fetch(url, request)
  await answer.arrayBuffer()
  if (!answer.ok) throw new Error(`${url} answered with ${answer.status}`)
  return performance.now() - begun
}

/** Medians of requests that take turns, so that a slow moment of the machine hits them all. */
async function inTurns(
  contestants: Readonly<Record<string, () => Promise<number>>>,
  rounds = ROUNDS,
): Promise<Map<string, number>> {
  const times = new Map(Object.keys(contestants).map((name): [string, number[]] => [name, []]))
  for (let round = -20; round < rounds; round += 1)
    for (const [name, run] of Object.entries(contestants)) {
      const time = await run()
      if (round >= 0) times.get(name)?.push(time)
    }
  return new Map([...times].map(([name, list]) => [name, median(list)]))
}

/** Requests answered in a second by a number of connections that never rest. */
async function throughput(addresses: readonly string[], path: string, request: RequestInit): Promise<number> {
  const until = performance.now() + LOAD_SECONDS * 1000
  let answered = 0
  const client = async (address: string): Promise<void> => {
    while (performance.now() < until) {
      await timed(`${address}${path}`, request)
      answered += 1
    }
  }
  await Promise.all(
    Array.from({ length: CONNECTIONS }, (_, index) => client(addresses[index % addresses.length] ?? '')),
  )
  return answered / LOAD_SECONDS
}

const residentMegabytes = (pid: number | undefined): number =>
  Number(/VmRSS:\s+(\d+) kB/.exec(readFileSync(`/proc/${pid}/status`, 'utf8'))?.[1] ?? 0) / 1024

const bearer = ({ token }: Filled): RequestInit => ({ headers: { authorization: `Bearer ${token}` } })

async function lists(small: Web, large: Web, bare: Web, filled: { small: Filled; large: Filled }): Promise<void> {
  const page = '/api/reports?limit=50'
  const medians = await inTurns({
    '50 of 10,000': () => timed(`${small.address}${page}`, bearer(filled.small)),
    [`50 of ${LARGE.toLocaleString('en')}`]: () => timed(`${large.address}${page}`, bearer(filled.large)),
    'search in the larger': () => timed(`${large.address}${page}&search=heron`, bearer(filled.large)),
  })
  printTable('A list of reports through the API', medians)
  const versus = await inTurns({
    'bare Express, one query, the same rows': () => timed(`${bare.address}/`, {}),
    'the API': () => timed(`${large.address}${page}`, bearer(filled.large)),
  })
  printTable('The API against a bare Express route with the same query', versus)
}

async function submitting({ address, child }: Web, filled: Filled): Promise<void> {
  const source = readFileSync('examples/weir-mill-63.skerry.yaml', 'utf8')
  const submit = (): Promise<number> =>
    timed(`${address}/api/reports?file_name=site.skerry.yaml`, {
      method: 'POST',
      body: source,
      headers: {
        ...(bearer(filled).headers as Record<string, string>),
        'content-type': 'application/yaml',
        'idempotency-key': crypto.randomUUID(),
      },
    })
  const medians = await inTurns(
    {
      'list of 50': () => timed(`${address}/api/reports?limit=50`, bearer(filled)),
      'submit of a 300-line file, judged and stored': submit,
    },
    60,
  )
  printTable('From file to stored revision', medians)
  process.stdout.write(`  memory of the web process after all this: ${residentMegabytes(child.pid).toFixed(0)} MB\n`)
}

async function scaling(one: Web, two: Web, filled: Filled): Promise<void> {
  const path = '/api/reports?limit=50'
  const single = await throughput([one.address], path, bearer(filled))
  const double = await throughput([one.address, two.address], path, bearer(filled))
  printTable(
    'Requests a second, twenty connections',
    new Map([
      ['one web process', single],
      ['two web processes', double],
    ]),
    '/s',
  )
}

const home = homeFor(mkdtempSync(join(tmpdir(), 'skerry-bench-')))
try {
  const { url } = await startCluster(home)
  const databases = { small: await prepareDatabase(url, 'small'), large: await prepareDatabase(url, 'large') }
  process.stdout.write(`Filling two databases with ${SMALL} and ${LARGE} reports …\n`)
  const filled = { small: await fill(url, 'small', SMALL), large: await fill(url, 'large', LARGE) }
  const env = (addresses: { web: string; owner: string }) => ({
    DATABASE_URL: addresses.web,
    DATABASE_OWNER_URL: addresses.owner,
  })
  const small = await serve('server/main.ts', env(databases.small))
  const large = await serve('server/main.ts', env(databases.large))
  const twin = await serve('server/main.ts', env(databases.large))
  const bare = await serve('tools/bench/bare-express.ts', {
    ...env(databases.large),
    ORGANISATION: filled.large.organisation,
  })
  await lists(small, large, bare, filled)
  await submitting(large, filled.large)
  await scaling(large, twin, filled.large)
} finally {
  for (const child of started) child.kill('SIGKILL')
  stopCluster(home, 'immediate')
  rmSync(home, { recursive: true, force: true })
}
