import type { State } from '#core/glossary.ts'
import type { Install } from '#core/install.ts'
import { COLOUR } from '#core/paper/style.ts'
import { STATE_WORDS } from '#core/texts/label.ts'
import type { Topology, TopologyNode } from '#core/topology/topology.ts'
import { at, svgText } from '../svg-text.ts'
import { captionOf } from './captions.ts'
import { flat, type Placed, placeTree } from './layout.ts'
import * as draw from './symbols.ts'

const STEP = 70
const ROW = 31
const LEFT = 46
const TOP = 30
/** Sizes of an id and of what is told below it. */
const HEAD = 8.6
const REST = 7.4

const LIVE: draw.Pen = { colour: COLOUR.ink, width: 1.1, dash: '' }
const DEAD: draw.Pen = { colour: COLOUR.hairline, width: 0.9, dash: '3 2' }
const LAMP: draw.Pen = { colour: COLOUR.lamp, width: 1.3, dash: '' }

interface Sheet {
  readonly install: Install
  readonly topology: Topology
  readonly state: State
}

const xOf = (column: number): number => LEFT + column * STEP
const yOf = (row: number): number => TOP + row * ROW

function penOf(node: TopologyNode, { topology, state }: Sheet): draw.Pen {
  if (state === 'island' && topology.inverters.island.includes(node.id)) return LAMP
  if (node.kind === 'supply') return state === 'grid' ? LIVE : DEAD
  return topology.live(node.id, state) ? LIVE : DEAD
}

function symbolOf({ node }: Placed, x: number, y: number, pen: draw.Pen, { install, state }: Sheet): string {
  switch (node.kind) {
    case 'supply':
      return draw.supply(x, y, pen)
    case 'overcurrent device':
      return install.overcurrent?.[node.id]?.device.kind === 'breaker' ? draw.breaker(x, y, pen) : draw.fuse(x, y, pen)
    case 'changeover':
      return draw.changeover(x, y, state === 'island' ? LAMP : pen, state === 'island')
    case 'residual-current device':
      return draw.residual(x, y, pen)
    case 'inverter':
      return draw.inverter(x, y, pen)
    case 'circuit':
      return `${install.circuits?.[node.id]?.device.kind === 'fuse' ? draw.fuse(x, y, pen) : draw.breaker(x, y, pen)}${draw.wire(x + 14, y, x + 22, y, pen)}${draw.load(x + 22, y, pen)}`
    default:
      return draw.board(x, y, pen)
  }
}

/** Half of a symbol's width: where its wires begin. */
function reach({ kind }: TopologyNode): number {
  if (kind === 'board') return 0
  return kind === 'changeover' ? 15 : kind === 'residual-current device' ? 14 : 10
}

function wires(parent: Placed, sheet: Sheet): string {
  const [x, y] = [xOf(parent.column), yOf(parent.row)]
  const bend = x + STEP * 0.42
  return parent.children
    .map((child) => {
      const pen = penOf(child.node, sheet)
      const own = pen === LAMP ? LIVE : pen
      const [childX, childY] = [xOf(child.column), yOf(child.row)]
      const start = child.row === parent.row ? x + reach(parent.node) : bend
      const down = child.row === parent.row ? '' : draw.wire(bend, y, bend, childY, own)
      return `${down}${draw.wire(start, childY, childX - reach(child.node), childY, own)}`
    })
    .join('')
}

function words(x: number, y: number, lines: readonly string[], pen: draw.Pen, anchor: 'start' | 'middle'): string {
  const colour = pen === DEAD ? COLOUR.rule : COLOUR.ink
  return lines
    .map(
      (line, index) =>
        `<text x="${at(x)}" y="${at(y + index * 8.6)}" font-size="${index === 0 ? HEAD : REST}" font-weight="${index === 0 ? 600 : 400}" text-anchor="${anchor}" fill="${index === 0 ? colour : COLOUR.muted}" stroke="none">${svgText(line)}</text>`,
    )
    .join('')
}

function labels(placed: Placed, pen: draw.Pen, sheet: Sheet): string {
  const { node, stands } = placed
  const [x, y] = [xOf(placed.column), yOf(placed.row)]
  const [head = '', ...rest] = captionOf(node, sheet.install)
  if (node.kind === 'circuit') {
    const more = stands > 0 ? [`and ${stands} more circuits`] : []
    return words(x + 33, y - 1, [`${head}  ${rest[0] ?? ''}`, ...rest.slice(1), ...more], pen, 'start')
  }
  const below = rest.map(
    (line, index) =>
      `<text x="${at(x)}" y="${at(y + 20 + index * 8.6)}" font-size="${REST}" text-anchor="middle" fill="${COLOUR.muted}" stroke="none">${svgText(line)}</text>`,
  )
  return `${words(x, y - 14, [head], pen, 'middle')}${below.join('')}`
}

/** What hangs on an inverter: arrays and batteries, drawn to its right. */
function sources({ node, column, row }: Placed, { install, state, topology }: Sheet): string {
  if (node.kind !== 'inverter') return ''
  const pen = state === 'island' && topology.inverters.island.includes(node.id) ? LAMP : LIVE
  const into = <Item extends { readonly into: string }>(items: Readonly<Record<string, Item>> | undefined): string[] =>
    Object.entries(items ?? {}).flatMap(([id, item]) => (item.into === node.id ? [id] : []))
  const parts = [
    ...into(install.batteries).map((id) => ['battery', id] as const),
    ...into(install.arrays).map((id) => ['array', id] as const),
  ]
  const y = yOf(row)
  return parts
    .map(([kind, id], index) => {
      const x = xOf(column) + 42 + index * 46
      return `${draw.wire(x - (index === 0 ? 30 : 36), y, x - 10, y, pen)}${kind === 'battery' ? draw.battery(x, y, pen) : draw.array(x, y, pen)}${words(x, y + 16, [id], pen, 'middle')}`
    })
    .join('')
}

/** The links between neutral and earth that are closed in the state, and the building's electrode. */
function earthing(all: readonly Placed[], { topology, state, install }: Sheet): string {
  return topology.neutralEarthLinks[state]
    .map((id) => {
      const carrier = all.find(({ node }) => node.id === id)
      if (!carrier) return ''
      const [x, y] = [xOf(carrier.column), yOf(carrier.row)]
      const pen = state === 'island' && id !== 'supply' ? LAMP : LIVE
      const label = id === 'supply' || install.earthing?.electrode === undefined ? ['N–PE'] : ['N–PE', 'electrode']
      const left = x - reach(carrier.node) - 12
      const text = label.map(
        (line, index) =>
          `<text x="${at(left - 8)}" y="${at(y + 10 + index * 8)}" font-size="${REST}" text-anchor="end" fill="${pen.colour}" stroke="none">${line}</text>`,
      )
      return `${draw.earth(left, y, pen)}${text.join('')}`
    })
    .join('')
}

/**
 * The single-line diagram of an installation in one state, as SVG: live parts in ink, dead parts pale and dashed, open
 * contacts open, the island's source in the lamp's colour.
 */
export function singleLine(install: Install, topology: Topology, state: State): string {
  const sheet: Sheet = { install, topology, state }
  const { root, rows, columns } = placeTree(topology.supply)
  const all = flat(root)
  const width = xOf(columns - 1) + 172
  const height = yOf(rows - 1) + 44
  const body = all.map((placed) => {
    const pen = penOf(placed.node, sheet)
    const [x, y] = [xOf(placed.column), yOf(placed.row)]
    return `${wires(placed, sheet)}${symbolOf(placed, x, y, pen, sheet)}${labels(placed, pen, sheet)}${sources(placed, sheet)}`
  })
  const title = `Single-line diagram ${STATE_WORDS[state]}`
  return `<svg role="img" aria-label="${title}" viewBox="0 0 ${at(width)} ${at(height)}">${body.join('\n')}${earthing(all, sheet)}</svg>`
}
