import { expect, test } from 'vitest'
import { lacking } from '#core/sheets/lacking.ts'
import { judgedBase } from '../report/judged.ts'

function lackingOf(changes: Parameters<typeof judgedBase>[0], id: string, name: string, state: 'grid' | null = null) {
  const sheet = judgedBase(changes).sheets.find((candidate) => candidate.id === id)
  if (!sheet) throw new Error(`There is no sheet ${id}`)
  return lacking(sheet, name, state)
}

test('a capacity that cannot be told lacks how the cable is laid and what insulates it', () => {
  expect(lackingOf({ remove: ['circuits.K1.cable.method'] }, 'K1', 'capacity')).toEqual([
    'Reference method of installation',
  ])
  const both = { remove: ['circuits.K1.cable.method', 'circuits.K1.cable.insulation'] }
  expect(lackingOf(both, 'K1', 'overload_limit')).toEqual([
    'Insulation of the cable',
    'Reference method of installation',
  ])
})

test('where everything is entered and no table goes so far, the value itself is what is lacking', () => {
  const aluminium = { line: '35 mm²', neutral: '35 mm²', protective: '16 mm²', cores: 5, material: 'aluminium' }
  const laid = { ...aluminium, insulation: 'pvc', method: 'C', length: '14 m' }
  expect(lackingOf({ set: { 'circuits.K7.cable': laid } }, 'K7', 'capacity')).toEqual([
    'Capacity of the cable by the table',
  ])
})

test('a reading lacks nothing but itself, in its state', () => {
  expect(lackingOf({ remove: ['readings.circuits.K1.loop.grid'] }, 'K1', 'loop', 'grid')).toEqual([
    'Fault-loop impedance',
  ])
  expect(lackingOf({}, 'K1', 'no_such_field')).toEqual(['no_such_field'])
})
