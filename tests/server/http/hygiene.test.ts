import { readFileSync } from 'node:fs'
import { Ajv2020 } from 'ajv/dist/2020.js'
import ajvFormats from 'ajv-formats'
import { CspEvaluator } from 'csp_evaluator/dist/evaluator.js'
import { Severity } from 'csp_evaluator/dist/finding.js'
import { CspParser } from 'csp_evaluator/dist/parser.js'
import fc from 'fast-check'
import supertest, { type Response } from 'supertest'
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { LIMITS } from '#server/http/limits.ts'
import { ROUTES } from '#server/routes/all.ts'
import { type Browser, type House, openHouse, PASSWORD } from '#tests/server/house.ts'

const ajv = new Ajv2020({ allErrors: true })
ajvFormats.default(ajv)
const isProblem = ajv.compile(
  JSON.parse(readFileSync(new URL('../../../schemas/api/problem.schema.json', import.meta.url), 'utf8')),
)

let house: House
let secure: House
let organisation: string
let installer: Browser
let administrator: Browser

beforeAll(async () => {
  house = await openHouse()
  secure = await openHouse({ BASE_URL: 'https://skerry.example', TRUST_PROXY: '1' })
  organisation = await house.organisation()
  installer = await house.signIn(await house.member(organisation, ['installer']))
  administrator = await house.signIn(await house.member(organisation, ['administrator']))
}, 60_000)
afterAll(async () => {
  await house.close()
  await secure.close()
})
beforeEach(async () => {
  await house.services.db('rate_limits').delete()
})

/** A refusal as RFC 9457 has it: type, title and a status that is the answer's own. */
function expectProblem(answer: Response, status: number): void {
  expect([answer.status, answer.text]).toEqual([status, answer.text])
  expect(answer.headers['content-type']).toBe('application/problem+json; charset=utf-8')
  expect(isProblem(answer.body) ? [] : isProblem.errors).toEqual([])
  expect(answer.body.status).toBe(answer.status)
  expect(answer.text).not.toMatch(/node_modules|at .*\.ts:\d|select |pg_/)
}

const pathsOf = (): string[] =>
  ROUTES.map(({ path }) => `/api${path.replaceAll(/:(\w+)/g, '3f000000-0000-4000-8000-000000000000')}`)

const ALWAYS: Readonly<Record<string, string>> = {
  'x-content-type-options': 'nosniff',
  'referrer-policy': 'no-referrer',
  'cross-origin-opener-policy': 'same-origin',
  'cross-origin-resource-policy': 'same-origin',
}

describe('every answer', () => {
  it.each(['/', '/nothing', '/api/nothing', '/healthz', '/problems', ...new Set(pathsOf())])(
    '%s carries the headers that shut a browser’s doors, and does not tell what serves it',
    async (path) => {
      const { headers } = await supertest(house.app).get(path)
      expect(headers).toMatchObject(ALWAYS)
      expect(headers['content-security-policy']).toContain("default-src 'none'")
      expect(headers['x-powered-by']).toBeUndefined()
      if (path.startsWith('/api/') && path !== '/api/nothing' && path !== '/api/openapi.json')
        expect(headers['cache-control']).toBe('no-store')
    },
  )

  it('has a policy for content in which an independent judge finds nothing above low', async () => {
    const { headers } = await supertest(house.app).get('/healthz')
    const { csp } = new CspParser(headers['content-security-policy'] ?? '')
    const found = new CspEvaluator(csp).evaluate()
    // The judge's scale falls from high (10) over medium (30) to advice.
    expect(found.filter(({ severity }) => severity <= Severity.MEDIUM).map(({ description }) => description)).toEqual(
      [],
    )
    expect(Object.keys(csp.directives).length).toBeGreaterThan(8)
  })

  it('binds browsers to TLS for two years where people come over TLS', async () => {
    const { headers } = await supertest(secure.app).get('/healthz')
    expect(headers['strict-transport-security']).toBe('max-age=63072000; includeSubDomains')
  })
})

describe('the session’s cookie', () => {
  const signedIn = async (of: House, origin: Record<string, string> = {}) => {
    const member = await of.member(await of.organisation(), ['installer'])
    return await supertest(of.app).post('/api/session').set(origin).send({ email: member.email, password: PASSWORD })
  }

  it('belongs to this host and to TLS only, and no script reads it', async () => {
    const answer = await signedIn(secure, { 'x-forwarded-proto': 'https' })
    const cookie = String(answer.headers['set-cookie'])
    expect(cookie).toMatch(/^__Host-skerry=/)
    for (const part of ['Path=/', 'HttpOnly', 'Secure', 'SameSite=Lax']) expect(cookie).toContain(part)
    expect(cookie).not.toContain('Domain')
  })

  it('is a new one at sign-in, whatever was planted before', async () => {
    const member = await house.member(organisation, ['installer'])
    const planted = 'skerry=s%3Aplanted-by-a-stranger.x'
    const answer = await supertest(house.app)
      .post('/api/session')
      .set('cookie', planted)
      .send({ email: member.email, password: PASSWORD })
    expect(answer.status).toBe(200)
    expect(String(answer.headers['set-cookie'])).not.toContain('planted')
    expect((await supertest(house.app).get('/api/sessions').set('cookie', planted)).status).toBe(401)
  })
})

describe('a request from another site', () => {
  const token = { name: 'van', scopes: ['report.read'], days: 1, password: PASSWORD }

  it.each([
    ['with the browser’s word that it is cross-site', { 'sec-fetch-site': 'cross-site' }],
    ['from a sister of the host', { 'sec-fetch-site': 'same-site' }],
    ['with a foreign origin', { origin: 'https://evil.example' }],
    ['with an origin that hides itself', { origin: 'null' }],
    ['with a token of another session', { 'x-csrf-token': 'a'.repeat(43) }],
    ['with an empty token', { 'x-csrf-token': '' }],
  ])('%s is refused', async (_name, headers) => {
    expectProblem(await installer.post('/api/tokens').set(headers).send(token), 403)
  })

  it('without the token is refused', async () => {
    expectProblem(await installer.agent.post('/api/tokens').send(token), 403)
  })

  it('as a form, or as JSON that calls itself text, is not even read', async () => {
    expectProblem(await installer.post('/api/tokens').type('form').send({ name: 'van' }), 415)
    expectProblem(
      await installer.post('/api/tokens').set('content-type', 'text/plain').send(JSON.stringify(token)),
      415,
    )
  })

  it('cannot sign somebody in or out', async () => {
    const foreign = { 'sec-fetch-site': 'cross-site' }
    const signIn = { email: installer.member.email, password: PASSWORD }
    expectProblem(await supertest(house.app).post('/api/session').set(foreign).send(signIn), 403)
    expectProblem(await installer.agent.delete('/api/session').set(foreign), 403)
    expect((await installer.get('/api/sessions')).status).toBe(200)
  })
})

describe('what the request says of itself', () => {
  it('does not choose the organisation', async () => {
    const other = await house.organisation()
    const headers = { 'x-tenant-id': other, 'x-organisation': other }
    const answer = await installer.get('/api/session').set(headers)
    expect(answer.body.person.organisation).toBe(organisation)
    expectProblem(await installer.get(`/api/reports?organisation_id=${other}`), 400)
    expectProblem(
      await administrator
        .post('/api/people')
        .set('idempotency-key', crypto.randomUUID())
        .send({ email: 'a@b.example', name: 'A', roles: [], organisation_id: other }),
      400,
    )
  })

  it('does not change under which address it is counted', async () => {
    for (let index = 0; index < LIMITS.public.points; index += 1)
      await supertest(house.app)
        .post('/api/links/show')
        .send({ link: 'x'.repeat(43) })
    const answer = await supertest(house.app)
      .post('/api/links/show')
      .set('x-forwarded-for', '203.0.113.9')
      .send({ link: 'x'.repeat(43) })
    expectProblem(answer, 429)
    expect(Number(answer.headers['retry-after'])).toBeGreaterThan(0)
  }, 30_000)
})

describe('a request of the wrong form', () => {
  it('with another method is told which there are', async () => {
    const answer = await installer.patch('/api/session')
    expectProblem(answer, 405)
    expect(answer.headers['allow']).toBe('GET, POST, DELETE')
    expectProblem(await supertest(house.app).trace('/api/session'), 405)
  })

  it('with a parameter twice, or an unknown one, is refused', async () => {
    expectProblem(await installer.get('/api/reports?limit=1&limit=2'), 400)
    expectProblem(await installer.get('/api/reports?colour=red'), 400)
    expectProblem(await installer.get('/api/reports?search[a]=b'), 400)
  })

  it('with a broken address or id names nothing', async () => {
    expectProblem(await installer.get('/api/reports/%zz'), 400)
    expectProblem(await installer.get('/api/reports/1'), 404)
  })

  it.each([
    [256 * 1024 - 1, 400],
    [256 * 1024, 400],
    [256 * 1024 + 1, 413],
  ])('with a JSON body of %s bytes is answered by %s', async (bytes, status) => {
    const frame = JSON.stringify({ email: '', password: 'x' }).length
    const body = JSON.stringify({ email: 'x'.repeat(bytes - frame), password: 'x' })
    expect(body.length).toBe(bytes)
    const answer = await supertest(house.app).post('/api/session').type('json').send(body)
    expectProblem(answer, status)
  })

  it('with JSON that is none is refused without an echo', async () => {
    const answer = await supertest(house.app).post('/api/session').type('json').send('{"email": <script>')
    expectProblem(answer, 400)
    expect(answer.text).not.toContain('<script>')
  })
})

/** Text that has broken programs before, of our own choosing: nothing, controls, directions, quotes of each language. */
const NAUGHTY = [
  '\u0000',
  'a\u0000b',
  '\r\nSet-Cookie: a=b',
  '\u202Egpj.exe',
  '\uD800',
  '\uFFFE',
  "'; drop table people; --",
  '${7*7}{{7*7}}<%= 7 %>',
  '<img src=x onerror=alert(1)>',
  '../../../../etc/passwd',
  '__proto__',
  'constructor',
  '%00',
  '%s%n%x',
  '٠١٢',
  'ﷺ'.repeat(50),
  'Z̴̡̢a̸l̵g̷o',
  '-1e309',
  'NaN',
  'null',
]

describe('text that has broken programs before', () => {
  const fields = ROUTES.filter(({ body, again }: { body?: unknown; again?: unknown }) => body !== undefined && !again)

  it.each(fields.map((route) => [route.id, route] as const))('does not break %s', async (_id, route) => {
    const schema: { properties?: Record<string, unknown> } = Object(route.body)
    const names = Object.keys(schema.properties ?? {})
    const path = `/api${route.path.replaceAll(/:(\w+)/g, '3f000000-0000-4000-8000-000000000000')}`
    for (const text of NAUGHTY) {
      const body = Object.fromEntries(names.map((name) => [name, text]))
      const answer = await administrator[route.method === 'get' ? 'post' : route.method](path)
        .set({ 'idempotency-key': crypto.randomUUID(), 'if-match': '"1"' })
        .send(body)
      expect([text, answer.status < 500]).toEqual([text, true])
    }
  })

  it.each(['/api/reports?search=', '/api/reports?after=', '/api/reports?state='])('does not break %s', async (path) => {
    for (const text of NAUGHTY.filter((one) => one !== '\uD800')) {
      const answer = await installer.get(`${path}${encodeURIComponent(text)}`)
      expect([text, answer.status < 500]).toEqual([text, true])
    }
  })

  it('does not break inviting, signing in or asking for a reset, whatever is sent', async () => {
    await fc.assert(
      fc.asyncProperty(fc.string({ unit: 'binary', maxLength: 80 }), fc.jsonValue(), async (text, value) => {
        await house.services.db('rate_limits').delete()
        const answers = [
          await administrator
            .post('/api/people')
            .set('idempotency-key', crypto.randomUUID())
            .send({ email: 'somebody@fennmark.example', name: text, licence: text, roles: [] }),
          await supertest(house.app).post('/api/session').send({ email: text, password: text, code: text }),
          await supertest(house.app).post('/api/links').send(Object(value)),
        ]
        expect(answers.map(({ status }) => status).filter((status) => status >= 500)).toEqual([])
      }),
      { numRuns: 20 },
    )
  }, 60_000)
})
