import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { parseQuantity, parseReading } from '#core/read/quantity.ts'
import { CONDUCTOR_SIZES, parseCable, parseDevice } from '#core/read/shorthand.ts'
import { kindOf, printed } from '#core/read/units.ts'
import { placeAt, resolved } from '#core/shape/place.ts'
import { installSchema } from '#core/shape/schema.ts'
import type { SchemaNode } from '#core/shape/schema-node.ts'
import { eachSchema } from '#tools/schema/map-schema.ts'

const schema = installSchema()
const definitions = Object.entries(schema.$defs ?? {})
const quantities = definitions.filter(([, node]) => node['x-quantity'] ?? node['x-reading'])
/** What only the reader can refuse: too many digits. */
const BEYOND_PATTERNS = new Set(['number-too-precise', 'number-not-finite', 'device-unknown'])

/** The unit that the first place of the kind asks for. */
function unitOf(name: string): string {
  const place = [...eachSchema(schema)].find(({ node }) => node.$ref === `#/$defs/${name}`)
  return place?.node['x-unit'] ?? ''
}

function read(node: SchemaNode, unit: string, text: string) {
  const kind = node['x-quantity']
  return kind ? parseQuantity(text, kind, unit) : parseReading(text, node['x-reading'] ?? '', unit)
}

function pattern({ pattern: source = '' }: SchemaNode): RegExp {
  return new RegExp(source, 'u')
}

describe('the text forms in the schema', () => {
  it('are there for every kind that the format uses', () => expect(quantities.length).toBeGreaterThan(25))

  it.each(quantities)('%s: whatever they take, the reader can read', (name, node) => {
    const unit = unitOf(name)
    fc.assert(
      fc.property(fc.stringMatching(pattern(node)), (text) => {
        const parsed = read(node, unit, text)
        expect(parsed.ok || BEYOND_PATTERNS.has(parsed.code), `${text}: ${parsed.ok ? '' : parsed.message}`).toBe(true)
      }),
      { numRuns: 150 },
    )
  })

  it.each(quantities)('%s: they take every unit that the reader knows for the kind', (name, node) => {
    const kind = node['x-quantity'] ?? node['x-reading'] ?? ''
    const units = Object.keys(kindOf(kind).units)
    expect(units.length).toBeGreaterThan(0)
    for (const spelt of units.flatMap((unit) => [unit, printed(unit)])) {
      for (const text of [`12.5 ${spelt}`, `12.5${spelt}`, '12.5']) {
        expect(read(node, unitOf(name), text.trim()).ok, text).toBe(true)
        expect(text.trim(), name).toMatch(pattern(node))
      }
    }
  })

  it('take what the brief forms of the trade are', () => {
    const cable = placeAt(schema, ['circuits', 'K1', 'cable'])
    const device = placeAt(schema, ['circuits', 'K1', 'device'])
    for (const size of CONDUCTOR_SIZES) expect(`3G${size}`).toMatch(pattern(cable))
    for (const text of ['5G6', '3g2.5', '4x10', '4×10', '5 G 6', '5G6 mm²', '1x35']) {
      expect([parseCable(text).ok, pattern(cable).test(text)], text).toEqual([true, true])
    }
    for (const text of ['3G3', '1G6', 'G6', '0G6', '3G2,5']) {
      expect([parseCable(text).ok, pattern(cable).test(text)], text).toEqual([false, false])
    }
    for (const text of ['B16', 'C 32', 'D10 A', 'gG 35', 'gG63', 'B0.5']) {
      expect([parseDevice(text).ok, pattern(device).test(text)], text).toEqual([true, true])
    }
    for (const text of ['b16', 'E16', 'gL 35', 'B0', 'B', '16']) {
      expect([parseDevice(text).ok, pattern(device).test(text)], text).toEqual([false, false])
    }
  })

  it.each([
    ['supply/loop_impedance', ['0.42 ohm', '0.42 Ω', '0.42 \u2126', '420 mΩ', '<0.05 ohm', '≤ 0.05 ohm', '>= 1 kohm']],
    ['readings/circuits/K1/insulation', ['>999 MΩ', '180 MΩ at 1000 V', '>999 MΩ at 500 V', '1 GΩ']],
    ['readings/residual_current/RCD1/grid/half', ['no trip', '24 ms', '>300 ms', '0.3 s']],
    ['circuits/K1/load/start', ['2.0x', '6x', '6×', '6']],
    ['site/lowest_temperature', ['-12 °C', '−12 °C', '-12°C', '-12 ℃', '-12']],
  ])('take at %s: %j', (path, texts) => {
    const node = resolved(placeAt(schema, path.split('/')), schema)
    for (const text of texts) {
      expect(text).toMatch(pattern(node))
      expect(read(node, node['x-unit'] ?? '', text).ok, text).toBe(true)
    }
  })

  it('take “no trip” for the time of a residual-current device only', () => {
    expect('no trip').not.toMatch(pattern(placeAt(schema, ['readings', 'transfers', 0, 'gap'])))
  })
})
