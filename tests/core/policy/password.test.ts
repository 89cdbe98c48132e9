import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { COMMON_WORDS } from '#core/policy/common-words.ts'
import { passwordProblem } from '#core/policy/password.ts'

const NAMES = ['Kari Weir', 'weir@alder.example', 'Alder Electrical', 'ALDER']
const judge = (password: string, secondFactor = false) => passwordProblem(password, { secondFactor, words: NAMES })

describe('a password is refused, and told why,', () => {
  it.each([
    ['moss on grey s', /^It has 14 characters; at least 15 are needed/],
    ['', /^It has 0 characters/],
    ['🐌🐌 on a wal 🐌🐌', /^It has 14 characters/],
    [`${'m0ss '.repeat(51)}ab`, /^It has 257 characters; at most 256/],
    ['aaaaaaaaaaaaaaaaaaaa', /repeats one short piece/],
    ['xk4!xk4!xk4!xk4!', /repeats one short piece/],
    ['passwordpassword1', /words and runs of keys/],
    ['P@ssw0rd-Welcome-2026', /words and runs of keys/],
    ['abcdefghijklmnop', /words and runs of keys/],
    ['qwertyuiop1234567890', /words and runs of keys/],
    ['Summer2026Winter2027!!', /words and runs of keys/],
    ['Alder Electrical 2026', /your name, your address/],
    ['kari.weir.skerry.1', /your name, your address/],
  ])('%s', (password, why) => expect(judge(password)).toMatch(why))

  it('of seven characters even beside a second factor', () =>
    expect(judge('m7ß kqz', true)).toMatch(/^It has 7 characters; at least 8 are needed\.$/))

  // The rule stands for a list: every pair of its words with every usual ending, all that have the length.
  it('however two common words are put together', () => {
    const endings = ['', '2026!']
    const list = COMMON_WORDS.flatMap((first) =>
      COMMON_WORDS.filter((_word, index) => index % 2 === 0).flatMap((second) =>
        endings.map((ending) => `${first}${second}${ending}`),
      ),
    ).filter((password) => password.length >= 15)
    expect(list.length).toBeGreaterThan(3000)
    expect(list.filter((password) => judge(password) === undefined)).toEqual([])
  })
})

describe('a password is taken', () => {
  it.each([
    ['of fifteen characters', 'moss on grey st'],
    ['of several words', 'otter ladder quartz mitten'],
    ['that has a common word in it', 'my dragon eats seven kettles'],
    ['of digits only', '830295827193048'],
    ['with spaces at its end', 'otter ladder    '],
    ['in any script', 'мох на сером камне'],
    ['of signs beyond the basic plane', '🐌🦦🪨🌊⛰🪵🔥🧭🪝🧵🪡🎣🛶🏔🌿'],
    ['of sixty-four characters', 'otter ladder quartz mitten kettle bramble pivot sonnet walrus ex'],
    ['beyond the 72 bytes at which some hashes stop', `${'otter ladder quartz mitten '.repeat(3)}end`],
  ])('%s', (_name, password) => expect(judge(password)).toBeUndefined())

  it('of eight characters beside a second factor', () => expect(judge('m7ß kqzv', true)).toBeUndefined())
})

describe('judging', () => {
  it('comes to an end for any text, in words', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary', maxLength: 300 }), fc.boolean(), (password, secondFactor) => {
        const problem = judge(password, secondFactor)
        expect(problem === undefined || /^It .*\.$/.test(problem)).toBe(true)
      }),
    )
  })
})
