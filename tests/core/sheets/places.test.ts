import { describe, expect, it } from 'vitest'
import { stateFieldsOf } from '#core/sheets/plans.ts'
import { judgedBase } from '../report/judged.ts'

const sheet = (id: string, changes: Parameters<typeof judgedBase>[0] = {}) => {
  const found = judgedBase(changes).sheets.find((one) => one.id === id)
  if (!found) throw new Error(`no sheet of ${id}`)
  return found
}

describe('where a field stands in the file', () => {
  it('is at its subject for one that holds in a state and follows from what is entered', () => {
    expect(sheet('RCD1').pathOf('live', 'island')).toEqual(['residual_current', 'RCD1', 'fed_from'])
  })

  it('is at the reading of the state for one that is read in each', () => {
    expect(sheet('K1').pathOf('loop', 'island')).toEqual(['readings', 'circuits', 'K1', 'loop', 'island'])
  })

  it('is at the first defect of the inspection, or at the inspection where there is none', () => {
    expect(sheet('installation').pathOf('items_with_defect', null)).toEqual(['inspection'])
    const set = { 'inspection.3.result': 'defect', 'inspection.5.result': 'defect' }
    expect(sheet('installation', { set }).pathOf('items_with_defect', null)).toEqual(['inspection', 3, 'result'])
  })

  it('is its subject for what no sheet knows', () => {
    expect(sheet('K1').pathOf('no_such_field', null)).toEqual(['circuits', 'K1'])
    expect(sheet('K1').pathOf('no_such_field', 'grid')).toEqual(['circuits', 'K1'])
  })
})

describe('fields of one state', () => {
  it('are few on a circuit, and none on a person', () => {
    expect(stateFieldsOf('circuit').has('loop')).toBe(true)
    expect(stateFieldsOf('circuit').has('serves')).toBe(false)
    expect(stateFieldsOf('person').size).toBe(0)
  })
})
