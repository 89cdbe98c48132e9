import { type DefaultTreeAdapterTypes, parse } from 'parse5'
import { describe, expect, it } from 'vitest'
import { addressOf } from '#server/mail/helpers.ts'
import { type MailFrame, mailRenderer, type RenderedMail } from '#server/mail/mail.ts'
import { plain } from '#server/mail/plain.ts'
import { KINDS, SAMPLES } from './samples.ts'

const FRAME: MailFrame = { baseUrl: 'https://skerry.example/at', organisation: 'Fennmark Electric', to: 'Ada Reed' }
const render = mailRenderer()

type Node = DefaultTreeAdapterTypes.Node

const childrenOf = (node: Node): readonly Node[] => ('childNodes' in node ? node.childNodes : [])
const withAll = (node: Node): readonly Node[] => [node, ...childrenOf(node).flatMap(withAll)]
const nodesOf = ({ html }: RenderedMail) => withAll(parse(html))

const linksOf = (mail: RenderedMail): string[] =>
  nodesOf(mail)
    .flatMap((node) => ('attrs' in node ? node.attrs.filter(({ name }) => name === 'href') : []))
    .map(({ value }) => value)

const tagsOf = (mail: RenderedMail): Set<string> => new Set(nodesOf(mail).map(({ nodeName }) => nodeName))

/** The words of a part, without what only marks lists and quotes. */
const words = (text: string): string[] => text.split(/\s+/).filter((word) => !['', '-', '>'].includes(word))

const wordsOfHtml = (mail: RenderedMail): string[] => {
  const body = nodesOf(mail).find(({ nodeName }) => nodeName === 'body')
  const texts = body ? withAll(body).flatMap((node) => ('value' in node ? [node.value] : [])) : []
  return words(texts.join(''))
}

/** The sample with every text replaced, as if each had been written by somebody with bad intent. */
function poisoned(value: unknown, text: string): unknown {
  if (typeof value === 'string') return value.startsWith('/') || /^\d{4}-\d\d-\d\d$/.test(value) ? value : text
  if (Array.isArray(value)) return value.map((each) => poisoned(each, text))
  if (typeof value !== 'object' || value === null || value instanceof Date) return value
  return Object.fromEntries(Object.entries(value).map(([name, each]) => [name, poisoned(each, text)]))
}

const HOSTILE = [
  '<img src=x onerror=alert(1)><script>alert(1)</script>',
  '{{constructor}} {{#each this}}{{@key}}{{/each}} ${7*7} <%= 7*7 %>',
  '"><a href="https://evil.example">here</a>',
  'https://evil.example/login www.evil.example javascript://x',
  'line\r\nBcc: everybody@example.org\r\n\r\nbody',
  'right\u202Eto left, \u2066hidden\u2069, \u200Bnothing',
  '</title><title>other</title>',
  '<!-- --><![CDATA[ ]]>',
]

describe.each(KINDS)('the mail %s', (kind) => {
  const mail = render(kind, SAMPLES[kind], FRAME)

  it('says the same as text and as HTML', () => {
    expect(wordsOfHtml(mail)).toEqual(words(mail.text))
  })

  it('leads to our pages only', () => {
    expect(linksOf(mail).length).toBeGreaterThan(0)
    for (const link of linksOf(mail)) expect(link).toMatch(/^https:\/\/skerry\.example\/at\/[a-z]/)
    for (const link of linksOf(mail)) expect(mail.text).toContain(link)
  })

  it('is short, to a person, with a subject of its own', () => {
    expect(mail.text).toMatch(/^Hello Ada Reed,\n\n/)
    expect(words(mail.text).length).toBeLessThan(120)
    expect(mail.subject.length).toBeGreaterThan(5)
    expect(mail.subject).not.toMatch(/undefined|\[object|\n/)
    expect(mail.text).not.toMatch(/undefined|\[object|\{\{|<\/?[a-z]/)
  })

  it.each(HOSTILE)('shows what people wrote and does nothing by it: %j', (text) => {
    const hostile = poisoned(SAMPLES[kind], text) as never
    const poisonedMail = render(kind, hostile, { ...FRAME, organisation: text, to: text })
    expect([...tagsOf(poisonedMail)].sort()).toEqual(
      expect.arrayContaining([...tagsOf(mail)].filter((tag) => tag !== 'small').sort()),
    )
    for (const tag of ['img', 'script', '#comment']) expect(tagsOf(poisonedMail)).not.toContain(tag)
    expect(linksOf(poisonedMail)).toEqual(linksOf(mail))
    expect(wordsOfHtml(poisonedMail)).toEqual(words(poisonedMail.text))
    const shown = plain(text)
    expect(poisonedMail.text).toContain(shown)
    expect(poisonedMail.subject).not.toMatch(/[\r\n\u202E]/)
    expect(poisonedMail.text).not.toMatch(/evil\.example\/login|www\.|[\u200B\u202E\u2066]/)
  })
})

describe('a mail with many remarks', () => {
  it('shows twenty and says how many more there are', () => {
    const remarks = Array.from({ length: 23 }, (_, index) => ({ about: `circuit K${index}`, words: 'why?' }))
    const { text, subject } = render('report returned', { ...SAMPLES['report returned'], remarks }, FRAME)
    expect(text.match(/circuit K\d+: why\?/g)).toHaveLength(20)
    expect(text).toContain('- 3 further remarks on the page')
    expect(text).toContain('with 23 remarks')
    expect(subject).toBe('ALD-7: returned')
  })
})

describe('some wording', () => {
  it.each([
    ['report withdrawn', 'Do not rely on report FEN-2026-0007.'],
    ['report replaced', 'Report FEN-2026-0007 no longer stands.'],
    ['invitation', 'as installer and reviewer.'],
    ['invitation', 'until 4 May 2026, 10:15 UTC.'],
    ['calibration due', 'Loop tester, serial number L-1: ended on 1 May 2026'],
    ['calibration due', 'Insulation tester, serial number I-2: until 1 June 2026'],
    ['checkpoint', 'held 1207 entries'],
    ['review asked', '2 findings at failure level'],
    ['report issued', 'check it at https://skerry.example/at/check'],
  ] as const)('%s: %s', (kind, sentence) => {
    expect(render(kind, SAMPLES[kind], FRAME).text).toContain(sentence)
  })

  it('offers to switch off only what can be switched off', () => {
    expect(render('report issued', SAMPLES['report issued'], FRAME).text).toContain('switch mails like this one off')
    expect(render('password reset', SAMPLES['password reset'], FRAME).text).not.toContain('switch')
  })

  it('is an error where a view lacks what its template names', () => {
    const { reason: _, ...without } = SAMPLES['report withdrawn']
    expect(() => render('report withdrawn', without as never, FRAME)).toThrow(/reason/)
  })
})

describe('the address of a page', () => {
  it.each(['//evil.example/x', '/\\evil.example', 'https://evil.example', '@evil.example', 'x', ''])(
    'is refused for %j',
    (path) => {
      expect(() => addressOf('https://skerry.example', path)).toThrow('our own pages')
    },
  )

  it('keeps the folder that the server lies in', () => {
    expect(addressOf('https://skerry.example/at/', '/reports/7?a=b#c')).toBe(
      'https://skerry.example/at/reports/7?a=b#c',
    )
  })
})
