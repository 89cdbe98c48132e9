import { spawn } from 'node:child_process'
import { createHash, randomBytes } from 'node:crypto'
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { createServer, type Server } from 'node:http'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { inOrganisation } from '#server/db.ts'
import { type House, type Member, openHouse, source } from './house.ts'

let house: House
let web: Server
let address: string
let folder: string
let installer: Member
let token: string

async function makeToken(member: Member): Promise<string> {
  const secret = `skerry_${randomBytes(24).toString('base64url')}`
  await inOrganisation(house.services.db, member.organisation, (tx) =>
    tx('tokens').insert({
      organisation_id: member.organisation,
      person_id: member.id,
      name: 'command line',
      token_hash: createHash('sha256').update(secret).digest('hex'),
      hint: secret.slice(-4),
      scopes: ['report.send', 'report.read'],
      expires_at: new Date('2099-01-01'),
    }),
  )
  return secret
}

interface Ended {
  readonly code: number | null
  readonly out: string
  readonly err: string
}

/** Runs the bundle as a person would; the server lives in this process, so nothing here may block. */
function skerry(words: readonly string[], env: Readonly<Record<string, string>> = {}): Promise<Ended> {
  const child = spawn(process.execPath, ['dist/skerry.cjs', ...words], {
    env: { PATH: process.env['PATH'], HOME: folder, SKERRY_SERVER: address, SKERRY_TOKEN: token, ...env },
  })
  const out: string[] = []
  const err: string[] = []
  child.stdout.on('data', (chunk) => out.push(String(chunk)))
  child.stderr.on('data', (chunk) => err.push(String(chunk)))
  return new Promise((resolve) => child.on('close', (code) => resolve({ code, out: out.join(''), err: err.join('') })))
}

function put(name: string, text: string): string {
  const file = join(folder, name)
  writeFileSync(file, text)
  return file
}

beforeAll(async () => {
  house = await openHouse()
  folder = mkdtempSync(join(tmpdir(), 'skerry-send-'))
  web = createServer(house.app)
  await new Promise<void>((resolve) => web.listen(0, '127.0.0.1', resolve))
  const bound = web.address()
  address = `http://127.0.0.1:${typeof bound === 'object' && bound !== null ? bound.port : 0}`
  installer = await house.member(await house.organisation(), ['installer'])
  token = await makeToken(installer)
})
afterAll(async () => {
  await new Promise((resolve) => web.close(resolve))
  rmSync(folder, { recursive: true })
  await house.close()
})

const reports = async (): Promise<readonly { reference: string; revision: number }[]> =>
  await inOrganisation(house.services.db, installer.organisation, (tx) =>
    tx('reports').select('reference', 'revision').where('organisation_id', installer.organisation).orderBy('reference'),
  )

describe('skerry send', () => {
  it('says what is missing before anything is sent: the server, the token', async () => {
    const file = put('bakery.skerry.yaml', source('alder-mill-bakery'))
    const nowhere = await skerry(['send', file], { SKERRY_SERVER: 'ftp://x' })
    expect(nowhere).toMatchObject({ code: 2, out: '' })
    expect(nowhere.err).toContain('is not the address of a server')
    const unknown = await skerry(['send', file], { SKERRY_TOKEN: '' })
    expect(unknown).toMatchObject({ code: 2, out: '' })
    expect(unknown.err).toContain('.config/skerry/token')
  })

  it('shows every place of a file that is refused, and stores nothing', async () => {
    const file = put('broken.skerry.yaml', 'skerry: 1\nreport: { reference: X }\n')
    const refused = await skerry(['send', file])
    expect(refused.code).toBe(1)
    expect(refused.err).toMatch(new RegExp(`^${file}:\\d+:\\d+: .+`, 'm'))
    expect(await reports()).toEqual([])
  })

  it('refuses a token that was revoked', async () => {
    const file = put('bakery.skerry.yaml', source('alder-mill-bakery'))
    const refused = await skerry(['send', file], { SKERRY_TOKEN: `skerry_${'x'.repeat(30)}` })
    expect(refused.code).toBe(1)
    expect(refused.err).toContain('Sign in first')
  })

  it('prints the address of the report, and sends nothing twice', async () => {
    const file = put('bakery.skerry.yaml', source('alder-mill-bakery'))
    const first = await skerry(['send', file])
    expect(first).toMatchObject({ code: 0, err: '' })
    expect(first.out).toMatch(/^http:\/\/127\.0\.0\.1:\d+\/reports\/[0-9a-f-]{36} {2}FM-2026-031, revision 1, draft\n$/)
    const second = await skerry(['send', file])
    expect(second).toEqual(first)
    // A key is forgotten after some days; the file is known all the same.
    await inOrganisation(house.services.db, installer.organisation, (tx) => tx('idempotency_keys').delete())
    expect(await skerry(['send', file])).toEqual(first)
    expect(await reports()).toEqual([{ reference: 'FM-2026-031', revision: 1 }])
  })

  it('tells that a server does not answer, after trying again', async () => {
    const file = put('farm.skerry.yaml', source('tern-farm-tt'))
    const silent = await skerry(['send', file], { SKERRY_SERVER: 'http://127.0.0.1:9' })
    expect(silent.code).toBe(2)
    expect(silent.err).toContain('the server does not answer')
  }, 40_000)
})
