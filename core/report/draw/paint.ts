import type { State } from '#core/glossary.ts'
import type { Install } from '#core/install.ts'
import { COLOUR } from '#core/paper/style.ts'
import type { Topology } from '#core/topology/topology.ts'
import { cableName, deviceName } from '../devices.ts'
import { amount } from '../print.ts'
import { sure } from '../sure.ts'
import type { PartKind } from './parts.ts'
import { leadsOn, type Placed, RAISED } from './place.ts'
import { group, line, rect, text } from './svg.ts'
import * as symbol from './symbols.ts'
import { cabled, cut, told } from './words.ts'

/** What a part is painted from. */
export interface DiagramScene {
  readonly install: Install
  readonly topology: Topology
  readonly state: State
  /** Where the words of the circuits start, and the width of the whole. */
  readonly words: number
  readonly width: number
}

const DEAD = { stroke: '#8b9aa5', 'stroke-dasharray': '3 2' }
const GREY = '#6b7a85'

/** Part of the tree that only the grid feeds. */
const UPSTREAM: ReadonlySet<PartKind> = new Set(['supply', 'meter', 'main protection'])

function isLive({ part }: Placed, { topology, install, state }: DiagramScene): boolean {
  if (state === 'grid') return true
  if (UPSTREAM.has(part.kind)) return false
  if (part.kind === 'array') return topology.live(sure(install.arrays?.[part.id], part.id).into, state)
  if (part.kind === 'battery') return topology.live(sure(install.batteries?.[part.id], part.id).into, state)
  if (part.kind === 'link') return topology.live(sure(install.links?.[part.id], part.id).from, state)
  return topology.live(part.id, state)
}

const lookOf = (live: boolean) => (live ? {} : DEAD)
const inkOf = (live: boolean): string => (live ? COLOUR.ink : GREY)

function labels(placed: Placed, scene: DiagramScene, live: boolean): string {
  const { above, below = [] } = told(placed.part, scene.install)
  const { x, y, part } = placed
  const lift = part.kind === 'changeover' || part.kind === 'inverter' ? 20 : 13
  return [
    above === undefined ? '' : text(x, y - lift, above, { 'font-size': 8.6, 'font-weight': 600, fill: inkOf(live) }),
    ...below.map((words, index) => text(x + 1, y + 15 + index * 9.5, words, { 'font-size': 8, fill: inkOf(live) })),
  ].join('')
}

function linkAt(x: number, y: number, id: string, { topology, state }: DiagramScene, note: string): string {
  const closed = topology.neutralEarthLinks[state].includes(id)
  const words = text(x + 9, y + 26, note, { 'font-size': 7.6, fill: closed ? COLOUR.ink : GREY, stroke: 'none' })
  return (
    group(closed ? { 'stroke-dasharray': 'none', stroke: COLOUR.ink } : DEAD, [symbol.earthLink(x, y, closed)]) + words
  )
}

function changeover({ x, y, part }: Placed, scene: DiagramScene): string {
  const closed = scene.state === 'grid'
  const carries = scene.install.changeover.neutral_link !== 'none'
  return [
    rect(x + 2, y - 15, 80, carries ? 56 : 30, {
      fill: 'none',
      stroke: COLOUR.rule,
      'stroke-width': 0.7,
      'stroke-dasharray': 'none',
    }),
    group(lookOf(closed), [line(x, y, x + 16, y)]),
    symbol.contact(x + 16, y, closed),
    line(x + 46, y, x + 84, y),
    carries ? linkAt(x + 51, y, part.id, scene, 'N–PE') : '',
    text(x + 6, y + (carries ? 36 : 11), cut(cabled(scene.install.changeover.cable).join(''), 42, 7.6), {
      'font-size': 7.6,
      fill: COLOUR.ink,
      stroke: 'none',
    }),
  ].join('')
}

function board(placed: Placed, scene: DiagramScene): string {
  const { x, y, part, children } = placed
  const found = sure(scene.install.boards?.[part.id], part.id)
  const last = children.at(-1)?.y ?? y
  const name = [`${part.id} ${found.name}`.trim(), ...cabled(found.cable)].join(' · ')
  const live = isLive(placed, scene)
  return [
    line(x + 2, y - 7, x + 2, Math.max(last, y) + 7, {
      'stroke-width': 3,
      'stroke-dasharray': 'none',
      ...(!live && { stroke: DEAD.stroke }),
    }),
    line(x, y, x + 2, y),
    text(x - 1, y - (leadsOn(part.children) ? RAISED : 12), name, {
      'font-size': 8.6,
      'font-weight': 600,
      fill: inkOf(live),
      stroke: 'none',
    }),
    part.linked ? linkAt(x + 2, Math.max(last, y) + 7, part.id, scene, 'N–PE') : '',
  ].join('')
}

function circuit({ x, y, part }: Placed, scene: DiagramScene, live: boolean): string {
  const found = sure(scene.install.circuits?.[part.id], part.id)
  const { words, width } = scene
  const device = found.residual_current
    ? symbol.residualBreaker(x, y)
    : found.device.kind === 'fuse'
      ? symbol.fuse(x, y)
      : symbol.breaker(x, y)
  const end = found.lighting
    ? symbol.lamp(words - 12, y)
    : found.sockets
      ? symbol.socket(words - 12, y)
      : symbol.feeder(words - 11, y, inkOf(live))
  const fill = inkOf(live)
  const plain = { 'font-size': 8.4, fill, stroke: 'none' }
  return [
    device,
    line(x + 30, y, words - 12, y),
    symbol.conductors(words - 26, y, found.phases.length),
    end,
    text(words, y + 3, cut(part.id, 30, 8.4), { ...plain, 'font-weight': 600 }),
    text(words + 33, y + 3, cut(found.serves, 128, 8.4), plain),
    text(words + 163, y + 3, deviceName(found.device), plain),
    text(words + 194, y + 3, cut(cableName(found.cable), width - words - 194, 8.4), plain),
  ].join('')
}

function circuits({ x, y }: Placed, told: string, { words, width }: DiagramScene, live: boolean): string {
  const shown = cut(told, width - words, 8.4)
  return [
    symbol.breaker(x, y),
    line(x + 30, y, words - 12, y),
    symbol.feeder(words - 11, y, inkOf(live)),
    text(words, y + 3, shown, { 'font-size': 8.4, fill: inkOf(live), stroke: 'none' }),
  ].join('')
}

function beside({ x, y }: Placed, words: string, live: boolean): string {
  return text(x + 38, y + 3, words, { 'font-size': 8.4, fill: inkOf(live), stroke: 'none' })
}

function arrayWords(id: string, { arrays }: Install): string {
  const { strings, modules_in_series, module } = sure(arrays?.[id], id)
  const power = module.pmax === undefined ? '' : ` · ${amount(strings * modules_in_series * module.pmax, 'W')}`
  return `${id} · ${strings} × ${modules_in_series} modules${power}`
}

function link(placed: Placed, { install }: DiagramScene, live: boolean): string {
  const found = sure(install.links?.[placed.part.id], placed.part.id)
  const words = `${placed.part.id} to ${found.to} · ${found.position} · ${found.interlocked ? 'interlocked' : 'not interlocked'}`
  return symbol.contact(placed.x, placed.y, found.position === 'closed') + beside(placed, words, live)
}

/** Room for the operator's name before the first board's busbar. */
const OPERATOR = 100

function operator({ x, y }: Placed, { install }: DiagramScene, live: boolean): string {
  return text(x + 18, y + 45, cut(install.supply.operator, OPERATOR, 7.6), {
    'font-size': 7.6,
    fill: inkOf(live),
    stroke: 'none',
  })
}

function figure(placed: Placed, scene: DiagramScene, live: boolean): string {
  const { x, y, out, part } = placed
  const { install, state, topology } = scene
  const ink = inkOf(live)
  switch (part.kind) {
    case 'supply':
      return (
        symbol.gridSource(x, y) +
        linkAt(x + 9, y + 8.5, 'supply', scene, install.supply.earthing) +
        operator(placed, scene, live)
      )
    case 'meter':
      return symbol.meter(x, y, ink)
    case 'main protection':
      return (
        (install.supply.main_protection.kind === 'fuse' ? symbol.fuse(x, y) : symbol.breaker(x, y)) +
        line(x + 30, y, out, y)
      )
    case 'board':
      return board(placed, scene)
    case 'overcurrent device':
      return (
        (sure(install.overcurrent?.[part.id], part.id).device.kind === 'breaker'
          ? symbol.breaker(x, y)
          : symbol.fuse(x, y)) + line(x + 30, y, out, y)
      )
    case 'residual-current device':
      return symbol.residualDevice(x, y) + line(x + 34, y, out, y)
    case 'changeover':
      return changeover(placed, scene)
    case 'inverter': {
      const feeds = state === 'island' && topology.inverters.island.includes(part.id)
      const box = symbol.inverter(x, y, feeds ? COLOUR.lampTint : COLOUR.paper)
      return part.linked !== true ? box : box + linkAt(x + 21, y + 15, part.id, scene, 'N–PE')
    }
    case 'array':
      return symbol.array(x, y) + beside(placed, arrayWords(part.id, install), live)
    case 'battery': {
      const { usable } = sure(install.batteries?.[part.id], part.id)
      return symbol.battery(x, y) + beside(placed, `${part.id} · ${amount(usable, 'Wh')}`, live)
    }
    case 'link':
      return link(placed, scene, live)
    case 'circuits':
      return circuits(placed, part.words, scene, live)
    case 'circuit':
      return circuit(placed, scene, live)
  }
}

/** Wires from a part to what hangs on it; the busbar of a board is drawn with the board. */
function wires(placed: Placed, scene: DiagramScene): string {
  const { out, y, part, children } = placed
  const live = isLive(placed, scene)
  const upstreamDead = (child: Placed) => child.part.kind === 'changeover' && scene.state === 'island'
  const runs = children.map((child) => {
    const on = live && isLive(child, scene) && !upstreamDead(child)
    const from = part.kind === 'board' ? out - 2 : out
    return group(lookOf(on), [line(from, child.y, child.x, child.y)])
  })
  const last = children.at(-1)?.y ?? y
  const trunk = part.kind !== 'board' && last > y ? group(lookOf(live), [line(out, y, out, last)]) : ''
  return trunk + runs.join('')
}

/** A part with its words and its wires, in the look of its state; what can be clicked carries the part's name. */
export function paintPart(placed: Placed, scene: DiagramScene): string {
  const live = isLive(placed, scene)
  const inIsland = scene.state === 'island' && placed.part.kind === 'inverter' && live
  const look = { ...lookOf(live), ...(inIsland && { stroke: COLOUR.lamp }), 'data-part': placed.part.id }
  return (
    group(look, [figure(placed, scene, live), group({ stroke: 'none' }, [labels(placed, scene, live)])]) +
    wires(placed, scene)
  )
}
