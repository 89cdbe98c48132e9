import { spawnSync } from 'node:child_process'
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import supertest from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { type House, openHouse } from './house.ts'

const SECRET = 'otter ladder quartz mitten'
let house: House
let folder: string

beforeAll(async () => {
  house = await openHouse()
  folder = mkdtempSync(join(tmpdir(), 'skerry-organisation-'))
})
afterAll(async () => {
  await house.close()
  rmSync(folder, { recursive: true })
})

function found(words: readonly string[], password = SECRET) {
  const file = join(folder, 'password.txt')
  writeFileSync(file, `${password}\n`, { mode: 0o600 })
  return spawnSync(
    process.execPath,
    ['--import', 'tsx', 'tools/organisation/run.ts', ...words, '--password-file', file],
    { encoding: 'utf8', env: { ...process.env, NODE_ENV: 'test', DATABASE_URL: house.addresses.web } },
  )
}

const FERRY = ['--name', 'Ferry Road Electrical', '--mark', 'FERRY', '--email', 'Quay@Ferry.example']

describe('a fresh database', () => {
  it('has no account at all', async () => {
    const { rows } = await house.services.db.raw('select any_organisation() as any')
    expect(rows[0].any).toBe(false)
  })
})

describe('npm run organisation', () => {
  it.each([
    ['a password that is too short', FERRY, 'moss on grey', /at least 15 are needed/],
    ['a password of the organisation’s name', FERRY, 'Ferry Road Electrical', /guessers try first/],
    ['a mark of another form', [...FERRY, '--mark', 'ferry'], SECRET, /--mark:/],
    ['an address that takes no mail', [...FERRY, '--email', 'quay'], SECRET, /--email:/],
  ])('refuses %s', (_name, words, password, why) => {
    const { status, stderr } = found(words, password)
    expect(stderr).toMatch(why)
    expect(status).toBe(1)
  })

  it('knows no flag for the password itself', () => {
    const { status, stderr } = found([...FERRY, '--password', SECRET])
    expect(status).toBe(2)
    expect(stderr).toContain('--password-file')
  })

  it('makes an organisation whose administrator can sign in, once', async () => {
    const made = found(FERRY)
    expect([made.status, made.stderr]).toEqual([0, ''])
    expect(made.stdout).not.toContain(SECRET)
    const signed = await supertest(house.app)
      .post('/api/session')
      .send({ email: 'quay@ferry.example', password: SECRET })
    expect(signed.body.person.roles).toEqual(['administrator'])
    const again = found(FERRY)
    expect(again.status).toBe(1)
    expect(again.stderr).toContain('another organisation has FERRY already')
  })
})
