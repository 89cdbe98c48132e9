import { TOTP } from 'otpauth'
import supertest from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { inOrganisation } from '#server/db.ts'
import { type House, type Member, openHouse, PASSWORD } from '#tests/server/house.ts'

let house: House
let organisation: string
let member: Member

beforeAll(async () => {
  house = await openHouse()
  organisation = await house.organisation()
  member = await house.member(organisation, ['installer'])
})
afterAll(() => house.close())

const attempt = (email: string, password: string, more: Record<string, string> = {}) =>
  supertest(house.app)
    .post('/api/session')
    .send({ email, password, ...more })

const codeOf = (secret: string): string => new TOTP({ secret }).generate({ timestamp: house.now.getTime() })

const later = (ms: number): void => {
  house.now = new Date(house.now.getTime() + ms)
}

describe('signing in', () => {
  it('answers the same for a wrong password and for an address that nobody has', async () => {
    const wrong = await attempt(member.email, 'not the right password')
    const nobody = await attempt('nobody@fennmark.example', 'not the right password')
    expect(wrong.status).toBe(401)
    const { instance: first, ...one } = wrong.body
    const { instance: second, ...other } = nobody.body
    expect(first).not.toBe(second)
    expect(one).toEqual(other)
  })

  it('is refused for a while after several wrong tries, and not elsewhere', async () => {
    const target = await house.member(organisation, ['installer'])
    for (let index = 0; index < 8; index += 1) expect((await attempt(target.email, `wrong ${index}`)).status).toBe(401)
    const blocked = await attempt(target.email, PASSWORD)
    expect(blocked.status).toBe(429)
    expect(Number(blocked.headers['retry-after'])).toBeGreaterThan(0)
    expect((await attempt(member.email, PASSWORD)).status).toBe(200)
  })

  it('writes a wrong try into the trail of the account’s organisation', async () => {
    await attempt(member.email, 'wrong again')
    const events = await inOrganisation(house.services.db, organisation, (tx) =>
      tx('audit_events')
        .where({ action: 'sign-in-failed', subject: `person/${member.id}` })
        .select('body'),
    )
    expect(events.length).toBeGreaterThan(0)
    expect(JSON.stringify(events)).not.toContain('wrong again')
  })

  it('lets somebody choose whose address belongs to two organisations', async () => {
    const second = await house.organisation()
    const twin = await house.member(second, ['auditor'])
    await inOrganisation(house.services.db, second, (tx) =>
      tx('people').where({ person_id: twin.id }).update({ email: member.email }),
    )
    const asked = await attempt(member.email, PASSWORD)
    expect(asked.body.person).toBeNull()
    expect(asked.body.choose.map(({ id }: { id: string }) => id).toSorted()).toEqual([organisation, second].toSorted())
    const chosen = await attempt(member.email, PASSWORD, { organisation: second })
    expect(chosen.body.person).toMatchObject({ organisation: second, roles: ['auditor'] })
  })
})

describe('a session', () => {
  it('ends at eight hours without use, and at twelve in any case', async () => {
    const idle = await house.signIn(await house.member(organisation, ['installer']))
    later(7 * 3_600_000)
    expect((await idle.get('/api/sessions')).status).toBe(200)
    later(4 * 3_600_000)
    expect((await idle.get('/api/sessions')).status).toBe(200)
    later(2 * 3_600_000)
    expect((await idle.get('/api/sessions')).status).toBe(401)
    const forgotten = await house.signIn(await house.member(organisation, ['installer']))
    later(8 * 3_600_000 + 1000)
    expect((await forgotten.get('/api/sessions')).status).toBe(401)
  })

  it('is worth nothing after signing out, and its row is no key', async () => {
    const browser = await house.signIn(await house.member(organisation, ['installer']))
    const [row] = (await browser.get('/api/sessions')).body.sessions
    const stolen = await supertest(house.app).get('/api/sessions').set('cookie', `skerry=s:${row.id}.x`)
    expect(stolen.status).toBe(401)
    expect((await browser.delete('/api/session')).status).toBe(204)
    expect((await browser.get('/api/sessions')).status).toBe(401)
  })

  it('ends at the next request when the account is closed', async () => {
    const administrator = await house.signIn(await house.member(organisation, ['administrator']))
    const closed = await house.member(organisation, ['installer'])
    const browser = await house.signIn(closed)
    const shown = await administrator.get(`/api/people/${closed.id}`)
    const answer = await administrator
      .patch(`/api/people/${closed.id}`)
      .set('if-match', shown.headers['etag'] ?? '')
      .send({ active: false })
    expect(answer.status).toBe(200)
    expect((await browser.get('/api/sessions')).status).toBe(401)
  })
})

describe('the second factor', () => {
  it('is asked for once it is set, counts once, and can be replaced by a recovery code', async () => {
    const person = await house.member(organisation, ['reviewer'])
    const browser = await house.signIn(person)
    const offer = await browser.post('/api/second-factor/offer').send({ password: PASSWORD })
    const { secret } = offer.body
    const set = await browser.put('/api/second-factor').send({ password: PASSWORD, secret, new_code: codeOf(secret) })
    expect(set.body.recovery_codes).toHaveLength(10)
    const without = await attempt(person.email, PASSWORD)
    expect(without.status).toBe(401)
    expect(without.body.code_needed).toBe(true)
    later(60_000)
    const code = codeOf(secret)
    expect((await attempt(person.email, PASSWORD, { code })).status).toBe(200)
    expect((await attempt(person.email, PASSWORD, { code })).status).toBe(401)
    const [recovery] = set.body.recovery_codes
    expect((await attempt(person.email, PASSWORD, { code: recovery })).status).toBe(200)
    expect((await attempt(person.email, PASSWORD, { code: recovery })).status).toBe(401)
  })
})

describe('the password asked for again', () => {
  it('is not asked for ever: after ten wrong ones the next has to wait, right or wrong', async () => {
    const browser = await house.signIn(await house.member(organisation, ['installer']))
    const make = (password: string) =>
      browser.post('/api/tokens').send({ name: 'laptop', scopes: ['report.send'], days: 30, password })
    for (let index = 0; index < 10; index += 1) expect((await make(`wrong ${index}`)).status).toBe(403)
    expect((await make(PASSWORD)).status).toBe(429)
  })

  it('does not lock out who sends the right one many times at once', async () => {
    const browser = await house.signIn(await house.member(organisation, ['installer']))
    const made = await Promise.all(
      Array.from({ length: 20 }, (_, index) =>
        browser
          .post('/api/tokens')
          .send({ name: `laptop ${index}`, scopes: ['report.send'], days: 30, password: PASSWORD }),
      ),
    )
    expect(made.filter(({ status }) => status === 429)).toEqual([])
    expect((await browser.get('/api/tokens')).body.tokens.length).toBeGreaterThan(10)
  })
})
