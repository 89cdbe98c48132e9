import { spawnSync } from 'node:child_process'
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import supertest from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { PROBLEMS } from '#server/http/problems.ts'
import { type House, openHouse } from '#tests/server/house.ts'

const TOKEN = 'a token for whoever watches over the server'
let house: House
let bare: House
let folder: string

beforeAll(async () => {
  house = await openHouse({ METRICS_TOKEN: TOKEN, SECURITY_CONTACT: 'mailto:security@fennmark.example' })
  bare = await openHouse()
  folder = mkdtempSync(join(tmpdir(), 'skerry-pages-'))
})
afterAll(async () => {
  await house.close()
  await bare.close()
  rmSync(folder, { recursive: true })
})

describe('the page behind the type of a problem', () => {
  it.each(Object.keys(PROBLEMS))('%s says what it means, as sound HTML', async (code) => {
    const answer = await supertest(house.app).get(`/problems/${code}`)
    expect(answer.status).toBe(200)
    expect(answer.type).toBe('text/html')
    expect(answer.text).toContain('<html lang="en">')
    // An outside parser: xmllint finds unclosed and unknown markup.
    const file = join(folder, `${code}.html`)
    writeFileSync(file, answer.text.replace('<main>', '<div>').replace('</main>', '</div>'))
    const judged = spawnSync('xmllint', ['--html', '--noout', file], { encoding: 'utf8' })
    expect([judged.status, judged.stderr]).toEqual([0, ''])
  })

  it('exists for problems only', async () => {
    expect((await supertest(house.app).get('/problems/toString')).status).toBe(404)
    expect((await supertest(house.app).get('/problems/nothing')).status).toBe(404)
  })
})

describe('security.txt', () => {
  it('names a contact and ends in the future, within a year', async () => {
    const { text } = await supertest(house.app).get('/.well-known/security.txt')
    expect(text).toMatch(/^Contact: mailto:security@fennmark\.example$/m)
    const ends = Date.parse(/^Expires: (.+)$/m.exec(text)?.[1] ?? '')
    expect(ends).toBeGreaterThan(house.now.getTime())
    expect(ends).toBeLessThan(house.now.getTime() + 365 * 86_400_000)
  })

  it('is not there without a contact', async () => {
    expect((await supertest(bare.app).get('/.well-known/security.txt')).status).toBe(404)
  })
})

describe('metrics', () => {
  it('are for who has the token, and not there where none is configured', async () => {
    expect((await supertest(house.app).get('/metrics')).status).toBe(401)
    expect((await supertest(house.app).get('/metrics').set('authorization', 'Bearer another')).status).toBe(401)
    expect((await supertest(bare.app).get('/metrics').set('authorization', 'Bearer ')).status).toBe(404)
  })

  it('count requests by route, refusals, and connections', async () => {
    await supertest(house.app).get('/api/reports/3f000000-0000-4000-8000-000000000000')
    const { text } = await supertest(house.app).get('/metrics').set('authorization', `Bearer ${TOKEN}`)
    expect(text).toContain('skerry_request_seconds_count{method="GET",route="/api/reports/:report",status="401"} 1')
    expect(text).toContain('skerry_refused_total{status="401"}')
    expect(text).toContain('skerry_pool_connections{state="used"}')
    expect(text).not.toContain('3f000000')
  })
})
