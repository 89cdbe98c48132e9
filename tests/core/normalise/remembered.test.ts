import { describe, expect, it } from 'vitest'
import { remembered } from '#core/normalise/remembered.ts'

describe('what a text was read as', () => {
  it('is worked out once for each place', () => {
    const [place, other] = [{}, {}]
    let count = 0
    const read = (): number => {
      count += 1
      return count
    }
    expect([remembered(place, '6 kA', read), remembered(place, '6 kA', read), remembered(other, '6 kA', read)]).toEqual(
      [1, 1, 2],
    )
  })

  it('is not remembered for numbers, which take no work', () => {
    const place = {}
    expect([remembered(place, 6, () => 1), remembered(place, 6, () => 2)]).toEqual([1, 2])
  })

  it('is forgotten before it grows without end', () => {
    const place = {}
    remembered(place, 'first', () => 'kept')
    for (let index = 0; index < 2000; index += 1) remembered(place, `text ${index}`, () => index)
    expect(remembered(place, 'first', () => 'read anew')).toBe('read anew')
  })
})
