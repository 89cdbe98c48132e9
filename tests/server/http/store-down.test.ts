import { spawnSync } from 'node:child_process'
import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import supertest from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { type Browser, type House, openHouse } from '#tests/server/house.ts'
import { homeFor, startCluster, stopCluster } from '#tools/setup/postgres.mjs'

let home: string
let port: number
let house: House
let installer: Browser

/** A PostgreSQL of this file alone, with all of its durability, so that it can be pulled out from under the server. */
beforeAll(async () => {
  home = homeFor(mkdtempSync(join(tmpdir(), 'skerry-down-')))
  const cluster = await startCluster(home)
  port = cluster.port
  const prepared = spawnSync(process.execPath, ['--import', 'tsx', 'tools/setup/prepare.ts', 'skerry_template'], {
    env: { ...process.env, SKERRY_ADMIN_URL: cluster.url },
    encoding: 'utf8',
  })
  if (prepared.status !== 0) throw new Error(prepared.stderr)
  house = await openHouse({ DATABASE_POOL: '3' }, cluster.url)
  installer = await house.signIn(await house.member(await house.organisation(), ['installer']))
})
afterAll(async () => {
  await house.close()
  stopCluster(home, 'immediate')
  rmSync(home, { recursive: true, force: true })
})

async function timed(request: () => PromiseLike<{ status: number; type: string; headers: Record<string, string> }>) {
  const begun = performance.now()
  const answer = await request()
  return { answer, ms: performance.now() - begun }
}

describe('a database that does not answer', () => {
  it('with all connections taken: 503 within four seconds, and all is well once they are free', async () => {
    const held = Array.from({ length: 3 }, () => house.services.db.raw('select pg_sleep(6)').then(() => undefined))
    const { answer, ms } = await timed(() => installer.get('/api/reports'))
    expect(answer.status).toBe(503)
    expect(answer.type).toBe('application/problem+json')
    expect(answer.headers['retry-after']).toBeDefined()
    expect(ms).toBeLessThan(4500)
    await Promise.all(held)
    expect((await installer.get('/api/reports')).status).toBe(200)
  })

  it('that was killed: 503 within seconds, never somebody else’s rights, and the session goes on when it is back', async () => {
    stopCluster(home, 'immediate')
    const { answer, ms } = await timed(() => installer.get('/api/reports'))
    expect(answer.status).toBe(503)
    expect(ms).toBeLessThan(5000)
    expect((await supertest(house.app).get('/healthz')).status).toBe(200)
    const ready = await supertest(house.app).get('/readyz')
    expect(ready.status).toBe(503)
    expect(ready.body).toEqual({ status: 'waiting', for: ['database'] })
    await startCluster(home, { port })
    await expect.poll(async () => (await installer.get('/api/reports')).status, { timeout: 15_000 }).toBe(200)
    expect((await supertest(house.app).get('/readyz')).status).toBe(200)
  }, 60_000)
})
