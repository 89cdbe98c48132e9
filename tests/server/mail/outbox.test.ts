import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { checkedAddress, headerProblem } from '#server/mail/header.ts'
import { mailRenderer } from '#server/mail/mail.ts'
import {
  audience,
  type Composed,
  compose,
  type MailEvent,
  type OutboxFrame,
  type Recipient,
} from '#server/mail/outbox.ts'
import { readUnsubscribeToken, unsubscribeHeaders, unsubscribeToken } from '#server/mail/unsubscribe.ts'
import { SAMPLES } from './samples.ts'

const FRAME: OutboxFrame = {
  render: mailRenderer(),
  baseUrl: 'https://skerry.example',
  organisationName: 'Fennmark Electric',
}
const ADA: Recipient = { person: 'ada', name: 'Ada Reed', address: 'ada@fennmark.example', silent: [] }
const EVENT: MailEvent<'report returned'> = {
  organisation: 'fennmark',
  kind: 'report returned',
  event: 'review/1',
  actor: 'rowan',
  view: SAMPLES['report returned'],
}

function mailOf(composed: Composed) {
  if (!composed.ok) throw new Error(composed.problem)
  return composed.mail
}

describe('an address', () => {
  it.each([
    ['ada@fennmark.example\r\nBcc: all@example.org', 'holds a line end or another control character'],
    ['ada@fennmark.example\u2028', 'holds a line end or another control character'],
    ['', 'is empty'],
    ['ada', 'is no address'],
    ['@fennmark.example', 'is no address'],
    ['ada@', 'is no address'],
    ['ada@fennmark.example, eve@example.org', 'is no address'],
    ['Ada <ada@fennmark.example>', 'is no address'],
    ['"ada, eve"@fennmark.example', 'is no address'],
    ['ada(comment)@fennmark.example', 'is no address'],
    ['@relay.example:ada@fennmark.example', 'is no address'],
    ['ada@eve@fennmark.example', 'is no address'],
    ['ada@fennmark..example', 'is no address'],
    ['ada@-fennmark.example', 'is no address'],
    ['ädä@fennmark.example', 'is no address'],
    [`${'a'.repeat(65)}@fennmark.example`, 'is no address'],
    ['--help@fennmark.example ', 'is no address'],
  ])('%j is refused: it %s', (address, problem) => {
    expect(checkedAddress(address)).toEqual({ ok: false, problem })
    const composed = compose(EVENT, { ...ADA, address }, FRAME)
    expect(composed).toEqual({ ok: false, field: 'address', problem })
  })

  it.each([
    ['ada@fennmark.example', 'ada@fennmark.example'],
    ["o'neil+mill@Fennmark.Example", "o'neil+mill@fennmark.example"],
    ['ada@fünnmark.example', 'ada@xn--fnnmark-n2a.example'],
    ['ada@localhost', 'ada@localhost'],
  ])('%j is taken as %s', (sent, address) => {
    expect(checkedAddress(sent)).toEqual({ ok: true, address })
  })

  it('never holds what ends a header or begins a second address', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary' }), fc.constantFrom('ada@x.example', '@', ''), (noise, core) => {
        const checked = checkedAddress(core + noise)
        if (checked.ok) expect(checked.address).toMatch(/^[\x21-\x7e]+$/)
        if (checked.ok) expect(checked.address).not.toMatch(/[\s,;<>()"\\:[\]]/)
      }),
      { numRuns: 2_000 },
    )
  })
})

describe('a subject', () => {
  it('is refused with a line end, when empty, and when too long for any header', () => {
    expect(headerProblem('a\r\nBcc: x')).toBe('holds a line end or another control character')
    expect(headerProblem('a\u0085b')).toBe('holds a line end or another control character')
    expect(headerProblem(' ')).toBe('is empty')
    expect(headerProblem('ä'.repeat(500))).toBe('is too long')
    expect(headerProblem('ALD-7: returned')).toBeUndefined()
  })

  it('made of hostile names still is one line', () => {
    const report = { reference: 'ALD\r\nBcc: all@example.org', title: 'x' }
    const mail = mailOf(compose({ ...EVENT, view: { ...EVENT.view, report } }, ADA, FRAME))
    expect(mail.subject).toBe('ALD Bcc: all@example.org: returned')
  })
})

describe('who is told', () => {
  const people = (kind: MailEvent['kind'], recipients: readonly Recipient[], looking: readonly string[] = []) =>
    audience({ kind, actor: 'rowan' }, recipients, new Set(looking)).map(({ address }) => address)
  const ROWAN: Recipient = { ...ADA, person: 'rowan', address: 'rowan@fennmark.example' }

  it('is not who did it', () => {
    expect(people('report returned', [ADA, ROWAN])).toEqual([ADA.address])
  })

  it('is not who has switched that kind off, save for what an account needs', () => {
    const quiet = { ...ADA, silent: ['report returned', 'password reset'] }
    expect(people('report returned', [quiet])).toEqual([])
    expect(people('report issued', [quiet])).toEqual([ADA.address])
    expect(people('password reset', [quiet])).toEqual([ADA.address])
  })

  it('is not who is looking at it now, save for what an account needs', () => {
    expect(people('report returned', [ADA], ['ada'])).toEqual([])
    expect(people('account notice', [ADA], ['ada'])).toEqual([ADA.address])
  })

  it('is nobody twice, also under a second account with the same address', () => {
    expect(
      people('report returned', [ADA, ADA, { ...ADA, person: 'ada2', address: 'ADA@fennmark.example' }]),
    ).toHaveLength(1)
  })
})

describe('a review with twenty remarks', () => {
  it('is one mail for each who is told', () => {
    const remarks = Array.from({ length: 20 }, (_, index) => ({ about: `circuit K${index}`, words: 'why?' }))
    const told = audience(EVENT, [ADA, { ...ADA, person: 'rowan', address: 'rowan@fennmark.example' }])
    const mails = told.map((recipient) =>
      mailOf(compose({ ...EVENT, view: { ...EVENT.view, remarks } }, recipient, FRAME)),
    )
    expect(mails).toHaveLength(1)
    expect(mails[0]?.text.match(/why\?/g)).toHaveLength(20)
  })
})

describe('the same event', () => {
  it('gives the same key and the same Message-ID, however often and however worded', () => {
    const first = mailOf(compose(EVENT, ADA, FRAME))
    const again = mailOf(compose({ ...EVENT, view: { ...EVENT.view, by: 'R. Heath' } }, { ...ADA, name: 'A.' }, FRAME))
    expect(again.dedupeKey).toBe(first.dedupeKey)
    expect(again.messageId).toBe(first.messageId)
    expect(first.messageId).toMatch(/^<[0-9a-f]{40}@skerry\.example>$/)
  })

  it('gives others for another event, person or organisation', () => {
    const ids = [
      compose(EVENT, ADA, FRAME),
      compose({ ...EVENT, event: 'review/2' }, ADA, FRAME),
      compose(EVENT, { ...ADA, person: 'wren' }, FRAME),
      compose(EVENT, { ...ADA, person: null }, FRAME),
      compose({ ...EVENT, organisation: 'other' }, ADA, FRAME),
    ].map((composed) => mailOf(composed).messageId)
    expect(new Set(ids).size).toBe(5)
  })
})

describe('the link that switches a kind of mail off', () => {
  const KEY = Buffer.alloc(32, 7)
  const WHAT = { organisation: 'fennmark', person: 'ada', kind: 'report issued' } as const

  it('is read back, and only with our key', () => {
    const token = unsubscribeToken(WHAT, KEY)
    expect(readUnsubscribeToken(token, KEY)).toEqual(WHAT)
    expect(readUnsubscribeToken(token, Buffer.alloc(32, 8))).toBeUndefined()
  })

  it('is worth nothing once a sign of it is changed, or when made up', () => {
    const token = unsubscribeToken(WHAT, KEY)
    fc.assert(
      fc.property(fc.nat({ max: token.length - 1 }), fc.constantFrom('A', 'z', '.', '-', '0'), (at, sign) => {
        const forged = token.slice(0, at) + sign + token.slice(at + 1)
        // The last sign of base64url may carry bits that count for nothing.
        const same = forged === token || at === token.length - 1
        expect(same || readUnsubscribeToken(forged, KEY) === undefined).toBe(true)
      }),
    )
    for (const made of ['', '.', 'a.b', 'a.b.c', '...']) expect(readUnsubscribeToken(made, KEY)).toBeUndefined()
  })

  it('is offered as one click, save for what an account needs and for strangers', () => {
    const headers = (kind: 'report issued' | 'password reset', person: string | null) =>
      unsubscribeHeaders({ organisation: 'fennmark', person, kind }, { baseUrl: FRAME.baseUrl, key: KEY })
    expect(headers('report issued', 'ada')).toEqual({
      'List-Unsubscribe': expect.stringMatching(/^<https:\/\/skerry\.example\/mails\/switch-off\/[\w.-]+>$/),
      'List-Unsubscribe-Post': 'List-Unsubscribe=One-Click',
    })
    expect(headers('password reset', 'ada')).toEqual({})
    expect(headers('report issued', null)).toEqual({})
  })
})
