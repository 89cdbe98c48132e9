import supertest from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { Role } from '#core/policy/roles.ts'
import { type Browser, type House, openHouse, PASSWORD } from '#tests/server/house.ts'
import { eventsOf, linkIn, mailsTo } from './mailed.ts'

const GOOD = 'otter ladder quartz mitten'

let house: House
let organisation: string
let administrator: Browser

beforeAll(async () => {
  house = await openHouse()
  organisation = await house.organisation()
  administrator = await house.signIn(await house.member(organisation, ['administrator']))
})
afterAll(() => house.close())

const address = (): string => `${crypto.randomUUID().slice(0, 8)}@fennmark.example`

const invite = async (email: string, roles: readonly Role[] = ['installer'], browser = administrator) =>
  await browser
    .post('/api/people')
    .set('idempotency-key', crypto.randomUUID())
    .send({ email, name: 'Linn Birk', licence: 'FM-1301', roles })

const choose = async (link: string, new_password: string) =>
  await supertest(house.app).post('/api/links/use').send({ link, new_password })

const attempt = async (email: string, password: string) =>
  await supertest(house.app).post('/api/session').send({ email, password })

const change = async (person: string, body: object, browser = administrator) =>
  await browser
    .patch(`/api/people/${person}`)
    .set('if-match', (await browser.get(`/api/people/${person}`)).headers['etag'] ?? '')
    .send(body)

/** Somebody who was invited and has chosen a password. */
async function joined(roles: readonly Role[] = ['installer']): Promise<{ id: string; email: string }> {
  const email = address()
  const { id } = (await invite(email, roles)).body
  const [mail] = await mailsTo(house, organisation, email)
  if (mail === undefined) throw new Error('There is no mail.')
  expect((await choose(linkIn(mail), GOOD)).status).toBe(204)
  return { id, email }
}

describe('an invitation', () => {
  it('is refused for an address that has an account, that takes no mail, or by who may not', async () => {
    expect((await invite(administrator.member.email)).status).toBe(409)
    expect((await invite('somebody@')).status).toBe(400)
    expect((await invite('a@b.example\r\nbcc: all@b.example')).status).toBe(400)
    const reviewer = await house.signIn(await house.member(organisation, ['reviewer']))
    expect((await invite(address(), ['installer'], reviewer)).status).toBe(403)
  })

  it('opens the account once, by a link that is only in the mail and that looking at does not use up', async () => {
    const email = address()
    const made = await invite(email, ['installer', 'reviewer'])
    expect(made.status).toBe(201)
    expect(made.body).toMatchObject({ email, roles: ['installer', 'reviewer'], invited: true, active: true })
    const mails = await mailsTo(house, organisation, email)
    expect(mails.map(({ kind }) => kind)).toEqual(['invitation'])
    const link = linkIn(mails[0] ?? { text_body: '' })
    expect(JSON.stringify(made.body)).not.toContain(link)
    const rows = await house.services.db.transaction(async (tx) => {
      await tx.raw("select set_config('app.organisation', ?, true)", [organisation])
      return await tx('links').select('token_hash')
    })
    expect(JSON.stringify(rows)).not.toContain(link)

    for (let times = 0; times < 2; times += 1) {
      const shown = await supertest(house.app).post('/api/links/show').send({ link })
      expect(shown.body).toMatchObject({ purpose: 'invitation', name: 'Linn Birk' })
    }
    expect((await attempt(email, GOOD)).status).toBe(401)
    expect((await choose(link, GOOD)).status).toBe(204)
    expect((await choose(link, 'another ladder quartz mitten')).status).toBe(410)
    expect((await attempt(email, GOOD)).status).toBe(200)
  })

  it('works for one of many that come at once', async () => {
    const email = address()
    await invite(email)
    const [mail] = await mailsTo(house, organisation, email)
    const link = linkIn(mail ?? { text_body: '' })
    const answers = await Promise.all([1, 2, 3, 4, 5, 6].map((n) => choose(link, `${GOOD} ${n}`)))
    expect(answers.map(({ status }) => status).toSorted((a, b) => a - b)).toEqual([204, 410, 410, 410, 410, 410])
  })

  it('runs out after seven days, and an earlier one when it is sent again', async () => {
    const email = address()
    const { id } = (await invite(email)).body
    const first = linkIn((await mailsTo(house, organisation, email))[0] ?? { text_body: '' })
    expect((await administrator.post(`/api/people/${id}/invitation`)).status).toBe(204)
    const links = (await mailsTo(house, organisation, email)).map(linkIn)
    expect(links).toHaveLength(2)
    const second = links.find((link) => link !== first) ?? ''
    expect((await choose(first, GOOD)).status).toBe(410)
    const before = house.now
    house.now = new Date(before.getTime() + 7 * 86_400_000 + 1000)
    expect((await choose(second, GOOD)).status).toBe(410)
    house.now = before
    expect((await choose(second, GOOD)).status).toBe(204)
  })

  it.each([
    ['too short', 'moss on grey s', /14 characters; at least 15/],
    ['of the person’s own name', 'Linn Birk 2026 Linn', /your name/],
    ['of common words', 'PasswordPassword2026', /guessers try first/],
    ['of two hundred and fifty-seven characters', `${'m0ss '.repeat(51)}ab`, /at most 256/],
  ])('refuses a password that is %s, says why, and stays good', async (_name, password, why) => {
    const email = address()
    await invite(email)
    const link = linkIn((await mailsTo(house, organisation, email))[0] ?? { text_body: '' })
    const answer = await choose(link, password)
    expect(answer.status).toBe(400)
    expect(answer.body.errors[0]).toMatchObject({ pointer: '/new_password', message: expect.stringMatching(why) })
    expect((await choose(link, GOOD)).status).toBe(204)
  })

  it('takes no notice of a host that the request invents', async () => {
    const email = address()
    await administrator
      .post('/api/people')
      .set({ 'idempotency-key': crypto.randomUUID(), 'x-forwarded-host': 'evil.example', 'x-forwarded-proto': 'https' })
      .send({ email, name: 'Linn Birk', roles: ['installer'] })
    const [mail] = await mailsTo(house, organisation, email)
    expect(mail?.text_body).toContain('http://skerry.test/password#')
    expect(`${mail?.text_body}${mail?.html_body}`).not.toContain('evil.example')
  })
})

describe('a reset', () => {
  const ask = async (email: string) => await supertest(house.app).post('/api/links').send({ email })

  it('answers the same for an address that nobody has, and takes as long', async () => {
    const { email } = await joined()
    const timed = async (who: string) => {
      const begun = performance.now()
      const answer = await ask(who)
      return { answer, ms: performance.now() - begun }
    }
    const known = await timed(email)
    const unknown = await timed('nobody@fennmark.example')
    expect(known.answer.status).toBe(202)
    expect(known.answer.body).toEqual(unknown.answer.body)
    expect(Math.min(known.ms, unknown.ms)).toBeGreaterThan(380)
  })

  it('ends every session, keeps the second factor out of it, and works once', async () => {
    const { email } = await joined()
    const signed = await attempt(email, GOOD)
    const cookie = signed.headers['set-cookie'] ?? ''
    await ask(email)
    const mail = (await mailsTo(house, organisation, email)).find(({ kind }) => kind === 'password reset')
    const link = linkIn(mail ?? { text_body: '' })
    expect((await choose(link, 'kettle bramble pivot sonnet')).status).toBe(204)
    expect((await supertest(house.app).get('/api/sessions').set('cookie', cookie)).status).toBe(401)
    expect((await attempt(email, GOOD)).status).toBe(401)
    expect((await attempt(email, 'kettle bramble pivot sonnet')).status).toBe(200)
    expect((await choose(link, GOOD)).status).toBe(410)
  })

  it('mails at most three an hour to one address, and says nothing of it', async () => {
    const { email } = await joined()
    for (let times = 0; times < 5; times += 1) expect((await ask(email)).status).toBe(202)
    const resets = (await mailsTo(house, organisation, email)).filter(({ kind }) => kind === 'password reset')
    expect(resets).toHaveLength(3)
  })
})

describe('an administrator', () => {
  it('changes name, licence and roles with the version that was read, and not without', async () => {
    const { id } = await joined()
    const bare = await administrator.patch(`/api/people/${id}`).send({ name: 'L. Birk' })
    expect(bare.status).toBe(428)
    const stale = await administrator.patch(`/api/people/${id}`).set('if-match', '"0"').send({ name: 'L. Birk' })
    expect(stale.status).toBe(412)
    const changed = await change(id, { name: 'L. Birk', licence: null, roles: ['reviewer'] })
    expect(changed.body).toMatchObject({ name: 'L. Birk', licence: null, roles: ['reviewer'] })
    const events = await eventsOf(house, organisation, `person/${id}`)
    const last = JSON.parse(events.findLast(({ action }) => action === 'change-person')?.body ?? '{}')
    expect(last.details).toMatchObject({ before: { name: 'Linn Birk' }, after: { name: 'L. Birk' } })
  })

  it('cannot set what only the server knows', async () => {
    const { id } = await joined()
    for (const field of ['password_hash', 'organisation_id', 'version', 'totp_secret', 'person_id']) {
      const answer = await change(id, { name: 'L. Birk', [field]: 'x' })
      expect([field, answer.status]).toEqual([field, 400])
    }
  })

  it('gives rights that hold at the very next request', async () => {
    const member = await house.member(organisation, ['installer'])
    const browser = await house.signIn(member)
    expect((await browser.get('/api/people/'.concat(member.id))).status).toBe(403)
    await change(member.id, { roles: ['administrator'] })
    expect((await browser.get('/api/people/'.concat(member.id))).status).toBe(200)
    await change(member.id, { roles: ['installer'] })
    expect((await browser.get('/api/people/'.concat(member.id))).status).toBe(403)
  })

  it('moves an address only with the own password, tells the old one, and makes links worthless', async () => {
    const { id, email } = await joined()
    const moved = address()
    expect((await change(id, { email: moved })).body.type).toBe('/problems/password-needed')
    expect((await change(id, { email: moved, password: 'not the right one' })).status).toBe(403)
    expect((await change(id, { email: administrator.member.email, password: PASSWORD })).status).toBe(409)
    await supertest(house.app).post('/api/links').send({ email })
    const mail = (await mailsTo(house, organisation, email)).find(({ kind }) => kind === 'password reset')
    expect((await change(id, { email: moved, password: PASSWORD })).status).toBe(200)
    expect((await choose(linkIn(mail ?? { text_body: '' }), GOOD)).status).toBe(410)
    expect((await mailsTo(house, organisation, email)).map(({ kind }) => kind)).toContain('account notice')
    expect((await attempt(moved, GOOD)).status).toBe(200)
    expect((await attempt(email, GOOD)).status).toBe(401)
  })

  it('closes an account with its sessions, tokens and links, and opens it again', async () => {
    const member = await house.member(organisation, ['installer'])
    const browser = await house.signIn(member)
    const token = await browser
      .post('/api/tokens')
      .send({ name: 'van', scopes: ['report.read'], days: 30, password: PASSWORD })
    const bearer = { authorization: `Bearer ${token.body.token}` }
    expect((await supertest(house.app).get('/api/reports').set(bearer)).status).toBe(200)
    expect((await change(member.id, { active: false })).body.active).toBe(false)
    expect((await browser.get('/api/sessions')).status).toBe(401)
    expect((await supertest(house.app).get('/api/reports').set(bearer)).status).toBe(401)
    expect((await attempt(member.email, PASSWORD)).status).toBe(401)
    const left = await house.services.db('sessions').where({ person_id: member.id })
    expect(left).toEqual([])
    await change(member.id, { active: true })
    expect((await attempt(member.email, PASSWORD)).status).toBe(200)
    expect((await supertest(house.app).get('/api/reports').set(bearer)).status).toBe(401)
  })

  it('ends a person’s sessions', async () => {
    const member = await house.member(organisation, ['installer'])
    const browser = await house.signIn(member)
    expect((await administrator.delete(`/api/people/${member.id}/sessions`)).status).toBe(204)
    expect((await browser.get('/api/sessions')).status).toBe(401)
  })

  it('cannot be the last one to go, also not when two go at once', async () => {
    const own = await house.organisation()
    const first = await house.signIn(await house.member(own, ['administrator']))
    const alone = await change(first.member.id, { roles: ['reviewer'] }, first)
    expect(alone.status).toBe(409)
    expect(alone.body.detail).toContain('last administrator')
    expect((await change(first.member.id, { active: false }, first)).status).toBe(409)
    // Somebody who was only invited could not take over.
    await invite(address(), ['administrator'], first)
    expect((await change(first.member.id, { roles: [] }, first)).status).toBe(409)
    const second = await house.signIn(await house.member(own, ['administrator']))
    const both = await Promise.all([
      change(first.member.id, { roles: ['reviewer'] }, second),
      change(second.member.id, { roles: ['reviewer'] }, first),
    ])
    expect(both.map(({ status }) => status).filter((status) => status === 200)).toHaveLength(1)
  })
})
