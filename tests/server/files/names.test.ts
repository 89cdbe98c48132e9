import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { contentDisposition, displayName } from '#server/files/names.ts'
import { python } from '#tests/judges/python.ts'

const HOSTILE: readonly (readonly [string, string])[] = [
  ['a\r\nSet-Cookie: x=1.jpg', 'a Set-Cookie: x=1.jpg'],
  ['../../../etc/passwd', 'passwd'],
  ['C:\\photos\\board.jpg', 'board.jpg'],
  ['board\0.jpg', 'board.jpg'],
  ['board\u202Egpj.exe', 'boardgpj.exe'],
  ['bo\u2066ar\u2069d\u200B.jpg\uFEFF', 'board.jpg'],
  ['..', 'unnamed'],
  ['.htaccess', 'htaccess'],
  ['', 'unnamed'],
  ['\u0007\u009F', 'unnamed'],
  ['half\uD800.jpg', 'half.jpg'],
  ['  two   words\t.jpg ', 'two words .jpg'],
]

describe('the name of a file that somebody sent', () => {
  it.each(HOSTILE)('%j is shown as %j', (sent, shown) => {
    expect(displayName(sent)).toBe(shown)
  })

  it('keeps its letters, in any language', () => {
    expect(displayName('Verteilertafel Übergabe – Zähler №2 (配電盤).jpg')).toBe(
      'Verteilertafel Übergabe – Zähler №2 (配電盤).jpg',
    )
  })

  it('is cut to 120 characters without its ending, and never within one character', () => {
    expect(displayName(`${'x'.repeat(200)}.jpeg`)).toBe(`${'x'.repeat(114)}….jpeg`)
    expect([...displayName('x'.repeat(500))]).toHaveLength(120)
    expect(displayName(`${'e\u0323\u0301'.repeat(100)}.jpg`)).toMatch(/^(?:ẹ\u0301)+…\.jpg$/)
  })

  it('holds nothing unseen and at most 120 characters, whatever was sent', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary', maxLength: 300 }), (sent) => {
        const name = displayName(sent)
        expect(name).not.toMatch(/[\p{Cc}\p{Cf}\p{Cs}\p{Zl}\p{Zp}/\\]/u)
        expect([...name].length).toBeGreaterThan(0)
        expect([...name].length).toBeLessThanOrEqual(120)
        expect(displayName(name)).toBe(name)
      }),
    )
  })
})

const READ_HEADERS = `
import sys, json, email
def one(h):
    m = email.message_from_string("Content-Disposition: " + h + "\\n\\nbody")
    return [m.get_content_disposition(), m.get_filename(), len(m.keys()), m.get_payload()]
print(json.dumps([one(h) for h in json.load(sys.stdin)]))`

describe('the header for a download', () => {
  it('is one line of plain characters', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary', maxLength: 200 }), (sent) => {
        expect(contentDisposition('attachment', sent)).toMatch(
          /^attachment; filename="[A-Za-z0-9._ -]+"; filename\*=UTF-8''[\x21-\x7e]+$/,
        )
      }),
    )
  })

  it("is read back as the name by another language's reader of headers", () => {
    const names = [
      ...HOSTILE.map(([sent]) => sent),
      ...fc.sample(fc.string({ unit: 'grapheme', maxLength: 100 }), { numRuns: 200, seed: 7 }),
      `it's "quoted"; filename=x.exe %41`,
    ]
    const headers = names.map((name) => contentDisposition('attachment', name))
    // That reader joins both forms; the one in UTF-8 is what it must be able to decode.
    const extended = headers.map((header) => header.replace(/filename="[^"]*"; /, ''))
    const read = python(READ_HEADERS, JSON.stringify(extended))
    expect(read).toEqual(names.map((name) => ['attachment', displayName(name), 1, 'body']))
  })
})
