import type { Fault } from '../errors.ts'
import type { Cable, Device } from '../install.ts'
import { type Block, isBlock, quantityUnder, together, unknownKey, wordUnder } from './block.ts'
import type { Parsed } from './quantity.ts'
import { cut, either, quote } from './words.ts'

const BREAKER = /^([BCD]) ?([0-9]{1,4}(?:\.[0-9])?)(?: ?A)?$/
const FUSE = /^gG ?([0-9]{1,4}(?:\.[0-9])?)(?: ?A)?$/
const DEVICES = 'write a breaker as B16, C32 or D10, a fuse as gG 35'

/**
 * Reads an overcurrent protective device.
 *
 * Short: `B16`, `C32`, `D10` for a circuit-breaker (ranges of instantaneous tripping B, C and D, IEC 60898-1), `gG 35`
 * for a fuse (utilization category gG, IEC 60269-1). Long: `{ breaker: B16, breaking: 6 kA, let_through: 18000 A²s }` or
 * `{ fuse: gG 35, … }`.
 *
 * @param value what stands in the file
 * @returns the device, ratings in A, let-through energy in A²s; or the fault, with an example of what is written
 */
export function parseDevice(value: unknown): Parsed<Device> {
  return isBlock(value) ? longDevice(value) : shortDevice(value)
}

function shortDevice(value: unknown): Parsed<Device> {
  if (typeof value !== 'string') return noDevice(`This is not a protective device: ${DEVICES}.`)
  const text = value.trim()
  const [, curve, breaker] = BREAKER.exec(text) ?? []
  if (curve === 'B' || curve === 'C' || curve === 'D')
    return rated(text, { kind: 'breaker', curve, rated: Number(breaker) })
  const fuse = FUSE.exec(text)?.[1]
  if (fuse !== undefined) return rated(text, { kind: 'fuse', curve: 'gG', rated: Number(fuse) })
  return noDevice(`${quote(text)} is not a protective device that is known: ${mendedDevice(text)}.`)
}

function rated(text: string, device: Device): Parsed<Device> {
  if (device.rated > 0) return { ok: true, value: device }
  return noDevice(`${quote(text)} has no rated current: ${DEVICES}.`)
}

/** A spelling that comes near: other capitals, the rating in front, the older name gL. */
function mendedDevice(text: string): string {
  const letters = /[a-z]+/i.exec(text)?.[0] ?? ''
  const rating = /[0-9]{1,4}/.exec(text)?.[0]
  if (rating === undefined) return DEVICES
  if (/^[bcd]$/i.test(letters)) return `write ${letters.toUpperCase()}${rating}`
  return /^g[gl]$/i.test(letters) ? `write gG ${rating}` : DEVICES
}

function longDevice(block: Block): Parsed<Device> {
  const unknown = unknownKey(block, ['breaker', 'fuse', 'breaking', 'let_through'])
  if (unknown !== undefined) return { ok: false, ...unknown }
  if ((block.breaker === undefined) === (block.fuse === undefined)) {
    const example = '{ breaker: B16, breaking: 6 kA } or { fuse: gG 35, breaking: 50 kA }'
    return noDevice(`A device in long form is either a breaker or a fuse: write ${example}.`)
  }
  const name = block.breaker === undefined ? 'fuse' : 'breaker'
  const device = shortDevice(block[name])
  if (!device.ok) return { ...device, at: [name] }
  const { kind } = device.value
  if (kind !== name)
    return { ...noDevice(`${quote(String(block[name]))} is a ${kind}: write “${kind}” before it.`), at: [name] }
  const parts = [
    quantityUnder(block, 'breaking', 'current', 'A'),
    quantityUnder(block, 'let_through', 'let-through', 'A²s'),
  ]
  return together(parts, device.value)
}

function noDevice(message: string): { ok: false } & Fault {
  return { ok: false, code: 'device-unknown', message }
}

/** Nominal cross-sections in mm², IEC 60228:2023, tables 1 and 2, up to the largest that buildings use in one cable. */
export const CONDUCTOR_SIZES: readonly number[] = [
  0.5, 0.75, 1, 1.5, 2.5, 4, 6, 10, 16, 25, 35, 50, 70, 95, 120, 150, 185, 240, 300,
]

const TYPE = /^([1-9][0-9]?) ?([GgXx×]) ?([0-9]{1,3}(?:\.[0-9]{1,2})?)(?: ?mm(?:²|2))?$/
const CABLES = 'write cores and size as 3G2.5, 5G6 or 4x10 (G with a green-and-yellow core, x without)'
const WITHOUT = ['line', 'neutral', 'protective', 'cores'] as const
const LAYING = ['material', 'conductor_class', 'insulation', 'method', 'length', 'ambient', 'grouped'] as const

/**
 * Reads a cable.
 *
 * Short: `3G2.5`, `5G6`, `4x10`: cores, whether one of them is green and yellow (G) or none is (x), size in mm². What
 * the cores are used for is taken as usual (common practice): with 2 cores left besides the green-and-yellow one, line
 * and neutral; with 3, three lines; with 4 or more, three lines and a neutral; a single core is a line. Long: `{ type:
 * 3G2.5, length: 18 m, … }`, or each conductor: `{ line: 2.5 mm², neutral: 2.5 mm², protective: 1.5 mm², cores: 3 }`.
 *
 * @param value what stands in the file
 * @returns the cable in mm², m and °C, copper of class 2 where nothing else is said; or the first fault
 */
export function parseCable(value: unknown): Parsed<Cable> {
  if (!isBlock(value)) return together([cores(value)], COMMON)
  const { type } = value
  const known = type === undefined ? [...WITHOUT, ...LAYING] : ['type', ...LAYING]
  const unknown = unknownKey(value, known)
  if (unknown !== undefined) return { ok: false, ...unknown }
  const core = type === undefined ? conductors(value) : under('type', cores(type))
  return together([core, ...laying(value)], COMMON)
}

/** Before anything is read: what a cable is made of when nothing is said. */
const COMMON: Cable = { line: 0, cores: 0, material: 'copper', conductor_class: 2 }

function cores(value: unknown): Parsed<Pick<Cable, 'line' | 'neutral' | 'protective' | 'cores'>> {
  if (typeof value !== 'string') return noCable(`This is not a cable: ${CABLES}.`)
  const text = value.trim()
  const [, count, letter = '', size] = TYPE.exec(text) ?? []
  if (count === undefined || size === undefined)
    return noCable(`${quote(text)} is not a cable that is known: ${mendedCable(text)}.`)
  const line = Number(size)
  const fault = sizeFault(line)
  if (fault !== undefined) return { ok: false, ...fault }
  const green = letter.toUpperCase() === 'G'
  const rest = green ? Number(count) - 1 : Number(count)
  if (rest === 0) return noCable(`${quote(text)} has no core for a line: ${CABLES}.`)
  const neutral = rest === 2 || rest > 3
  return {
    ok: true,
    value: { line, ...(neutral && { neutral: line }), ...(green && { protective: line }), cores: Number(count) },
  }
}

function mendedCable(text: string): string {
  if (text.includes(',')) return `write ${cut(text.replace(',', '.'))}, with a decimal point`
  return CABLES
}

function conductors(block: Block): Parsed<object> {
  const missing = ['line', 'cores'].find((key) => block[key] === undefined)
  if (missing !== undefined) {
    const message = `The key ${quote(missing)} is missing: write { line: 2.5 mm², neutral: 2.5 mm², protective: 1.5 mm², cores: 3 }.`
    return { ok: false, code: 'missing-key', message }
  }
  const sizes = (['line', 'neutral', 'protective'] as const).map((key) => sizeUnder(block, key))
  return together([...sizes, countUnder(block, 'cores')], {})
}

function sizeUnder(block: Block, key: 'line' | 'neutral' | 'protective'): Parsed<object> {
  const size = quantityUnder(block, key, 'area', 'mm²')
  const found = size.ok ? size.value[key] : undefined
  const fault = found === undefined ? undefined : sizeFault(found)
  return fault === undefined ? size : { ok: false, ...fault, at: [key] }
}

function sizeFault(size: number): Fault | undefined {
  if (CONDUCTOR_SIZES.includes(size)) return undefined
  const above = CONDUCTOR_SIZES.findIndex((known) => known > size)
  const near = above === -1 ? CONDUCTOR_SIZES.slice(-1) : CONDUCTOR_SIZES.slice(Math.max(above - 1, 0), above + 1)
  const message = `${size} mm² is not a size of IEC 60228: write ${either(near.map(String))} mm².`
  return { code: 'size-not-standard', message }
}

function laying(block: Block): Parsed<object>[] {
  return [
    wordUnder(block, 'material', ['copper', 'aluminium']),
    wordUnder(block, 'conductor_class', [1, 2, 5]),
    wordUnder(block, 'insulation', ['pvc', 'xlpe']),
    wordUnder(block, 'method', ['A1', 'A2', 'B1', 'B2', 'C', 'D1', 'D2', 'E']),
    quantityUnder(block, 'length', 'length', 'm'),
    quantityUnder(block, 'ambient', 'temperature', '°C'),
    grouped(block),
  ]
}

const ARRANGEMENTS = ['bunched', 'single layer', 'single layer, spaced', 'under ceiling', 'under ceiling, spaced']

function grouped(block: Block): Parsed<object> {
  const group = block.grouped
  if (group === undefined) return { ok: true, value: {} }
  if (!isBlock(group) || group.circuits === undefined || group.as === undefined) {
    const message = 'How the cable is grouped needs two keys: write { circuits: 2, as: single layer }.'
    return { ok: false, code: 'missing-key', message, at: ['grouped'] }
  }
  const parts = together([countUnder(group, 'circuits'), wordUnder(group, 'as', ARRANGEMENTS)], {})
  return under('grouped', parts.ok ? { ok: true, value: { grouped: parts.value } } : parts)
}

function countUnder(block: Block, key: 'cores' | 'circuits'): Parsed<object> {
  const count = block[key]
  if (typeof count === 'number' && Number.isInteger(count) && count > 0) return { ok: true, value: { [key]: count } }
  const message = `The count under “${key}” is not a whole number: write for example 3.`
  return { ok: false, code: 'wrong-type', message, at: [key] }
}

function under<T>(key: string, parsed: Parsed<T>): Parsed<T> {
  return parsed.ok ? parsed : { ...parsed, at: [key, ...(parsed.at ?? [])] }
}

function noCable(message: string): { ok: false } & Fault {
  return { ok: false, code: 'cable-unknown', message }
}
