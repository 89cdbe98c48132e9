import { parseEvents } from 'js-yaml'
import { describe, expect, it } from 'vitest'
import { afterNode, keyText, stretchOf } from '#core/read/events.ts'
import { read } from '#core/read/read.ts'

const parsed = (text: string) => ({ text, events: parseEvents(text, {}) })

describe('the parser’s events', () => {
  it('a key that is a list has no text', () => {
    expect(keyText(parsed('? [ a ]\n: b'), 2)).toBeUndefined()
  })

  it('a node ends with its last child', () => {
    const { events } = parsed('- [ a, { b: c } ]\n- d')
    expect(afterNode(events, 1)).toBe(events.length - 1)
    expect(afterNode(events, 2)).toBe(events.length - 3)
  })

  it('what has no text is where it would be', () => {
    expect(stretchOf(parsed('a:'), 3, 2)).toEqual({ start: 2, end: 2 })
  })

  it('an empty item behind a comment that ends the file', () => {
    const result = read('- a\n- # later')
    expect(result.ok && result.locate([1])).toMatchObject({ line: 2, column: 2, endColumn: 2 })
    const last = read('- a # only')
    expect(last.ok && last.locate([1])).toMatchObject({ offset: 0 })
    const braces = read('[ a # one\n, b ]')
    expect(braces.ok && braces.locate([1])).toMatchObject({ line: 2, column: 3 })
  })
})
