import { expect, it } from 'vitest'
import { askedOnce } from '#core/topology/by-state.ts'

it('asks once for each name in each state, and keeps the states apart', () => {
  const asked: string[] = []
  const routes = askedOnce((id, state) => {
    asked.push(`${id} ${state}`)
    return [id, state]
  })
  expect(routes('K1', 'grid')).toEqual(['K1', 'grid'])
  expect(routes('K1', 'island')).toEqual(['K1', 'island'])
  expect(routes('K1', 'grid')).toBe(routes('K1', 'grid'))
  expect(routes('K2', 'grid')).toEqual(['K2', 'grid'])
  expect(asked).toEqual(['K1 grid', 'K1 island', 'K2 grid'])
})
