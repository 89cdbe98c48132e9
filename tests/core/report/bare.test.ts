import { describe, expect, it } from 'vitest'
import { fieldsheetModel } from '#core/report/fieldsheet.ts'
import { judgedText, modelOf, textsOf } from './judged.ts'

/** Nothing but what the schema asks for: a changeover that has been fitted, and nothing behind it yet. */
const BARE = `
skerry: 1
report: { reference: FM-BARE, purpose: alteration }
site: { name: Boat shed, address: [ Lower Road 9, Fennmark ] }
supply:
  operator: Fennmark Grid
  earthing: TN-S
  nominal: { voltage: 230 V, phases: 1, frequency: 50 Hz }
  main_protection: { breaker: C40 }
changeover: { id: CO, fed_from: supply, operation: manual, poles: 2, rated_current: 40 A, neutral_link: none }
`

const judged = judgedText(BARE)
const plain = (part: unknown): string => textsOf(part).join('\n').replaceAll('\u00a0', ' ')

describe('a file that states nothing but supply and changeover', () => {
  const words = plain(modelOf(judged))

  it('has an island without a link between neutral and earth, which the report says in so many words', () => {
    expect(words).toMatch(/Links on the grid\n1\nsupply/)
    expect(words).toMatch(/Links in the island\n0\nnone/)
    expect(words).toContain('supply on the grid; none in the island')
  })

  it('has no circuit on either side', () => {
    expect(words).toMatch(/Lives on\n0 circuits\nnone/)
    expect(words).toMatch(/Grid only\n0 circuits\nnone/)
    expect(words).toMatch(/What lives on\n0 of 0\n/)
  })

  it('has no section about what is not there', () => {
    const titles = modelOf(judged).sections.map(({ title }) => title)
    for (const absent of [
      'Boards and devices',
      'Tests of the circuits',
      'Residual-current devices, tested',
      'Photovoltaics',
      'Inverter and settings',
      'Battery and the island’s budget',
      'Meter and link',
    ])
      expect(titles, absent).not.toContain(absent)
    expect(titles).toContain('Supply and earthing')
  })

  it('leaves little to read on the field sheet: both states, the transfers, and that no link closes', () => {
    const sheet = plain(fieldsheetModel(judged))
    expect(sheet).toContain('closed: none')
    for (const absent of ['R_1', 'Serves', 'charge held back', 'Residual-current devices'])
      expect(sheet).not.toContain(absent)
  })
})
