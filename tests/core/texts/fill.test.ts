import Handlebars from 'handlebars'
import { describe, expect, it } from 'vitest'
import ruleWords from '#core/generated/rule-words.js'
import type { Sheet } from '#core/glossary.ts'
import { shippedBook } from '#core/judge/shipped.ts'
import { printerOf, type WordScene } from '#core/texts/fill.ts'
import { ruleWordsFor } from '#core/texts/words.ts'

const book = shippedBook('iec')
if (!book) throw new Error('The base book is missing.')

const sheet: Sheet = {
  subject: 'circuit',
  id: 'K1',
  path: ['circuits', 'K1'],
  values: { serves: 'Cold store {{name}} <b>', cable_length: 18, lines: ['L1'] },
  spans: {},
  inState: { grid: { loop: 0.55 }, island: {} },
  spansInState: { grid: {}, island: {} },
  pathOf: () => ['circuits', 'K1'],
}

const scene = (state: WordScene['state']): WordScene => ({
  sheet,
  state,
  parameters: book.parameters,
  units: book.units,
})

const filled = (template: string, state: WordScene['state'] = 'grid'): string => printerOf(template)(scene(state))

/** The same words filled by a templating engine that knows nothing of ours. */
function filledElsewhere(template: string, given: WordScene): string {
  const engine = Handlebars.create()
  const show = (field: string): string => printerOf(`{{show "${field}"}}`)(given)
  engine.registerHelper({
    name: () => printerOf('{{name}}')(given),
    state: () => printerOf('{{state}}')(given),
    show,
    list: show,
  })
  return engine.compile(template, { noEscape: true, knownHelpersOnly: true, knownHelpers: KNOWN })({})
}
const KNOWN = { name: true, state: true, show: true, list: true }

describe('the words of a rule', () => {
  it.each([
    ['the value of a state with its unit', '{{show "loop"}} {{state}}', 'grid', '0.55 Ω on the grid'],
    ['a value that is common to both', '{{show "cable_length"}} {{state}}', 'island', '18 m in the island'],
    ['a list', '{{list "lines"}}', null, 'L1'],
    ['a rule that is about neither state', '{{state}}', null, 'in either state'],
    ['a parameter of the book', '{{show "book.touch_voltage"}}', null, '50 V'],
    ['a parameter that the book leaves open', '{{show "book.unbalance"}}', null, 'not stated'],
    ['a parameter that no book has', '{{show "book.colour"}}', null, 'not stated'],
    ['a field that is missing', '{{show "loop"}}', 'island', 'not stated'],
    ['a field that no sheet has', '{{show "colour"}}', null, 'not stated'],
    ['user text as it is, never as a template', '{{name}}', null, 'circuit K1 (Cold store {{name}} <b>)'],
  ] as const)('show %s', (_, template, state, wanted) => {
    expect(filled(template, state)).toBe(wanted)
  })

  it('are there for every shipped rule', () => {
    for (const { key } of book.rules) {
      const words = ruleWordsFor(key, scene('grid'))
      expect(words.says.length).toBeGreaterThan(0)
      expect(words.do.length).toBeGreaterThan(0)
    }
  })

  it('come out as a templating engine would fill them, for every shipped rule', () => {
    const keys = Object.keys(ruleWords)
    expect(keys.length).toBeGreaterThan(150)
    for (const key of keys) {
      for (const state of ['grid', 'island', null] as const) {
        const given = scene(state)
        const { says, do: what } = ruleWords[key] ?? { says: '', do: '' }
        expect(ruleWordsFor(key, given)).toEqual({
          says: filledElsewhere(says, given),
          do: filledElsewhere(what, given),
        })
      }
    }
  })

  it('that ask for what nothing fills are a fault of the book', () => {
    expect(() => printerOf('{{loop}} Ω')).toThrow('{{loop}}')
  })

  it('of an unknown rule are a fault of the build', () => {
    expect(() => ruleWordsFor('iec/no-such-rule', scene(null))).toThrow('generate the rules again')
  })
})
