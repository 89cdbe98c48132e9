import { expect, it } from 'vitest'
import { lacking } from '#core/sheets/lacking.ts'
import { judgedBase } from '../report/judged.ts'

it('of a person nothing is computed: what is missing is the entry itself', () => {
  const sheets = judgedBase({ remove: ['people.tested_by.licence'] }).sheets
  const person = sheets.find(({ subject, values }) => subject === 'person' && values['licence'] === undefined)
  if (!person) throw new Error('no sheet of a person')
  expect(lacking(person, 'licence', null)).toEqual(['Licence'])
})
