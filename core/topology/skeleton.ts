import type { Install } from '#core/install.ts'
import { isCovered } from '#core/read/masks.ts'
import { isObject } from '#core/shape/locate.ts'

type Block = Readonly<Record<string, unknown>>

const isBlock = (value: unknown): value is Block => isObject(value) && !Array.isArray(value)

/** Sections whose entries are named, and the names that each entry refers to things by. */
const SECTIONS: Readonly<Record<string, readonly string[]>> = {
  boards: ['fed_from'],
  overcurrent: ['fed_from'],
  residual_current: ['fed_from'],
  inverters: ['fed_from'],
  circuits: ['fed_from'],
  arrays: ['into'],
  batteries: ['into'],
  links: ['from', 'to'],
  instruments: [],
}

const READINGS = ['circuits', 'residual_current', 'arrays'] as const

/**
 * Names and references alone, of a file that is not in shape: enough to tell those that lead nowhere. An entry that does
 * not say what feeds it stands at the supply, other unusable references are left out.
 *
 * @param tree the file's values, whatever they are
 * @returns a file that `buildTopology` can take; undefined where it is in doubt which names there are
 */
export function skeletonOf(tree: unknown): Install | undefined {
  if (!isBlock(tree)) return undefined
  const { changeover, report, readings, meter } = tree
  if (!isBlock(changeover) || typeof changeover.id !== 'string' || isCovered(changeover.id)) return undefined
  const sections = Object.entries(SECTIONS).map(
    ([name, references]) => [name, section(tree[name], references)] as const,
  )
  if (sections.some(([, entries]) => entries === undefined)) return undefined
  const named = readings === undefined ? {} : readingsOf(readings)
  if (named === undefined) return undefined
  const skeleton: unknown = {
    ...Object.fromEntries(sections),
    report: isBlock(report) ? text(report, 'rulebook') : {},
    supply: { nominal: { phases: 3 } },
    changeover: { id: changeover.id, poles: 4, ...reference(changeover, 'fed_from') },
    ...(isBlock(meter) && typeof meter.id === 'string' && { meter: { id: meter.id } }),
    readings: named,
  }
  return skeleton as Install
}

function section(value: unknown, references: readonly string[]): Block | undefined {
  if (value === undefined) return {}
  if (!isBlock(value) || Object.keys(value).some(isCovered)) return undefined
  return Object.fromEntries(Object.entries(value).map(([id, entry]) => [id, entryOf(entry, references)]))
}

function entryOf(entry: unknown, references: readonly string[]): Block {
  const block = isBlock(entry) ? entry : {}
  return {
    ...Object.assign({}, ...references.map((key) => reference(block, key))),
    ...(isObject(block.residual_current) && { residual_current: {} }),
    ...(typeof block.strings === 'number' && { strings: block.strings }),
  }
}

/** A name that is in doubt leads to the supply, which is always there; into an inverter it is asked for elsewhere. */
function reference(block: Block, key: string): Block {
  const name = block[key]
  return { [key]: typeof name === 'string' && !isCovered(name) ? name : 'supply' }
}

function text(block: Block, key: string): Block {
  const value = block[key]
  return typeof value === 'string' && !isCovered(value) ? { [key]: value } : {}
}

function readingsOf(readings: unknown): Block | undefined {
  if (!isBlock(readings)) return {}
  const sections = READINGS.map((name) => [name, readingSection(readings[name])] as const)
  if (sections.some(([, entries]) => entries === undefined)) return undefined
  return { ...text(readings, 'with'), ...Object.fromEntries(sections) }
}

function readingSection(value: unknown): Block | undefined {
  if (value === undefined) return {}
  if (!isBlock(value) || Object.keys(value).some(isCovered)) return undefined
  return Object.fromEntries(
    Object.entries(value).map(([id, entry]) => {
      const block = isBlock(entry) ? entry : {}
      return [id, { ...text(block, 'with'), ...(Array.isArray(block.strings) && { strings: block.strings }) }]
    }),
  )
}
