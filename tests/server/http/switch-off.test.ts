import supertest from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { switchKey } from '#server/mail/switch-key.ts'
import { unsubscribeToken } from '#server/mail/unsubscribe.ts'
import { type Browser, type House, openHouse } from '#tests/server/house.ts'

let house: House
let reviewer: Browser

const link = (kind: 'review asked' | 'report issued', key = switchKey(house.services.env)): string =>
  `/mails/switch-off/${unsubscribeToken({ organisation: reviewer.member.organisation, person: reviewer.member.id, kind }, key)}`

const isOn = async (kind: string): Promise<boolean> => {
  const { body } = await reviewer.get('/api/mail-switches')
  return body.switches.find((one: { kind: string }) => one.kind === kind).on
}

beforeAll(async () => {
  house = await openHouse()
  reviewer = await house.signIn(await house.member(await house.organisation(), ['reviewer']))
})
afterAll(() => house.close())

describe('the link that switches mails off', () => {
  it('does nothing when it was signed by another key', async () => {
    const forged = await supertest(house.app).post(link('review asked', Buffer.from('another key')))
    expect(forged.status).toBe(404)
    expect(await isOn('review asked')).toBe(true)
  })

  it('shows a button to who only looks, as programs that read mails do', async () => {
    const seen = await supertest(house.app).get(link('review asked'))
    expect(seen.status).toBe(200)
    expect(seen.text).toContain('<button>')
    expect(await isOn('review asked')).toBe(true)
  })

  it('switches that kind off, and no other, without signing in', async () => {
    const done = await supertest(house.app).post(link('review asked')).type('form').send('List-Unsubscribe=One-Click')
    expect(done.status).toBe(200)
    expect(await isOn('review asked')).toBe(false)
    expect(await isOn('report issued')).toBe(true)
  })

  it('can be taken back in the account', async () => {
    const on = await reviewer.put('/api/mail-switches').send({ kind: 'review asked', on: true })
    expect(on.status).toBe(200)
    expect(await isOn('review asked')).toBe(true)
  })
})
