import { describe, expect, it, vi } from 'vitest'
import { read } from '#core/read/read.ts'

const { parseEvents } = vi.hoisted(() => ({ parseEvents: vi.fn() }))
vi.mock('js-yaml', async (original) => ({ ...(await original<object>()), parseEvents }))

describe('when the parser itself', () => {
  it('breaks down, it is not taken for a mistake in the file', () => {
    parseEvents.mockImplementationOnce(() => {
      throw new RangeError('Maximum call stack size exceeded')
    })
    expect(() => read('a: 1')).toThrow(RangeError)
  })

  it('gives no place, the beginning of the file is shown', async () => {
    const { YAMLException } = await import('js-yaml')
    parseEvents.mockImplementationOnce(() => {
      throw new YAMLException('something new')
    })
    expect(read('a: 1')).toMatchObject({
      ok: false,
      problems: [{ code: 'syntax', range: { line: 1, column: 1 }, message: expect.stringContaining('something new') }],
    })
  })
})
