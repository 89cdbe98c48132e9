/** Symbols after IEC 60617, drawn by us, for a wire that runs from left to right at height `y`. Each starts at `x`. */
import { circle, line, path, polygon, rect, text } from './svg.ts'

/** How far a switching device reaches along its wire. */
export const DEVICE = 30

/** The blade of a contact, hinged at the left; a device that is no changeover is always drawn open, as the standard does. */
const blade = (x: number, y: number): string => line(x + 8, y, x + 21, y - 8)

/** Circuit-breaker: a contact with a cross at its fixed side. */
export function breaker(x: number, y: number): string {
  return [
    line(x, y, x + 8, y),
    blade(x, y),
    line(x + 19.5, y - 2.5, x + 24.5, y + 2.5),
    line(x + 19.5, y + 2.5, x + 24.5, y - 2.5),
    line(x + 22, y, x + DEVICE, y),
  ].join('')
}

/** Fuse: a box on a wire that runs through. */
export function fuse(x: number, y: number): string {
  return line(x, y, x + DEVICE, y) + rect(x + 6, y - 4, 18, 8, { fill: 'none' })
}

/** The summation transformer of residual-current protection, linked to the blade before it. */
function summation(x: number, y: number, half: number): string {
  const [top, bottom] = [y - half, y + half]
  const ring = `M${x} ${top}C${x + 3.5} ${top} ${x + 3.5} ${bottom} ${x} ${bottom}C${x - 3.5} ${bottom} ${x - 3.5} ${top} ${x} ${top}Z`
  const shaft = `M${x} ${top}V${top - 3}H${x - 10}V${y - 6}`
  return path(ring, { fill: 'none' }) + path(shaft, { fill: 'none', 'stroke-width': 0.7, 'stroke-dasharray': '2 1.4' })
}

/** Residual-current device: a contact that a summation transformer opens. */
export function residualDevice(x: number, y: number): string {
  return [line(x, y, x + 8, y), blade(x, y), line(x + 21, y, x + 34, y), summation(x + 27, y, 6.5)].join('')
}

/** A breaker with residual-current protection built in. */
export function residualBreaker(x: number, y: number): string {
  return breaker(x, y) + line(x + DEVICE, y, x + 36, y) + summation(x + 32, y, 4.4)
}

/** A contact that is open or closed as the state has it. */
export function contact(x: number, y: number, closed: boolean): string {
  return [
    line(x, y, x + 8, y),
    closed ? line(x + 8, y, x + 22, y) : line(x + 8, y, x + 20, y - 9),
    circle(x + 8, y, 1.5, { fill: '#ffffff' }),
    circle(x + 22, y, 1.5, { fill: '#ffffff' }),
    line(x + 23.5, y, x + DEVICE, y),
  ].join('')
}

/** Earth. */
export function earth(x: number, y: number): string {
  return line(x - 6, y, x + 6, y) + line(x - 3.8, y + 2.6, x + 3.8, y + 2.6) + line(x - 1.6, y + 5.2, x + 1.6, y + 5.2)
}

/** A link between neutral and earth that hangs below a wire. */
export function earthLink(x: number, y: number, closed: boolean): string {
  return [
    line(x, y, x, y + 10),
    closed ? line(x, y + 10, x, y + 21) : line(x, y + 21, x - 6.5, y + 12),
    circle(x, y + 10, 1.4, { fill: '#ffffff' }),
    circle(x, y + 21, 1.4, { fill: '#ffffff' }),
    line(x, y + 22.4, x, y + 29),
    earth(x, y + 29),
  ].join('')
}

/** The public grid: a source of alternating voltage. */
export function gridSource(x: number, y: number): string {
  return [
    circle(x + 9, y, 8.5, { fill: '#ffffff' }),
    path(
      `M${x + 4} ${y}C${x + 6} ${y - 5} ${x + 7.5} ${y - 5} ${x + 9} ${y}C${x + 10.5} ${y + 5} ${x + 12} ${y + 5} ${x + 14} ${y}`,
      { fill: 'none' },
    ),
    line(x + 17.5, y, x + 24, y),
  ].join('')
}

/** Energy meter. */
export function meter(x: number, y: number, ink: string): string {
  return [
    line(x, y, x + 5, y),
    rect(x + 5, y - 9, 24, 18, { fill: '#ffffff' }),
    line(x + 5, y - 4, x + 29, y - 4),
    text(x + 17, y + 5.5, 'kWh', { 'font-size': 7, 'text-anchor': 'middle', fill: ink, stroke: 'none' }),
    line(x + 29, y, x + 34, y),
  ].join('')
}

/** Inverter: from direct to alternating current. */
export function inverter(x: number, y: number, ground: string): string {
  return [
    line(x, y, x + 6, y),
    rect(x + 6, y - 15, 30, 30, { fill: ground }),
    line(x + 6, y + 15, x + 36, y - 15),
    path(
      `M${x + 10} ${y - 6}C${x + 12} ${y - 10.5} ${x + 13.5} ${y - 10.5} ${x + 15} ${y - 6}C${x + 16.5} ${y - 1.5} ${x + 18} ${y - 1.5} ${x + 20} ${y - 6}`,
      { fill: 'none' },
    ),
    line(x + 24, y + 6, x + 32, y + 6),
    line(x + 24, y + 9.5, x + 32, y + 9.5),
    line(x + 36, y, x + 42, y),
  ].join('')
}

/** Photovoltaic generator. */
export function array(x: number, y: number): string {
  return [
    line(x, y, x + 6, y),
    rect(x + 6, y - 8, 26, 16, { fill: '#ffffff' }),
    polygon([x + 6, y - 8, x + 14, y, x + 6, y + 8], { fill: 'none' }),
    line(x + 27, y - 15, x + 22, y - 10, { 'stroke-width': 0.8 }),
    line(x + 33, y - 15, x + 28, y - 10, { 'stroke-width': 0.8 }),
    polygon([x + 21, y - 9, x + 22.6, y - 12.4, x + 24.4, y - 10.6], { 'stroke-width': 0.4 }),
    polygon([x + 27, y - 9, x + 28.6, y - 12.4, x + 30.4, y - 10.6], { 'stroke-width': 0.4 }),
  ].join('')
}

/** Battery: two cells. */
export function battery(x: number, y: number): string {
  return [
    line(x, y, x + 10, y),
    line(x + 10, y - 8, x + 10, y + 8),
    line(x + 14, y - 4, x + 14, y + 4, { 'stroke-width': 2 }),
    line(x + 14, y, x + 20, y, { 'stroke-dasharray': '2 1.5' }),
    line(x + 20, y - 8, x + 20, y + 8),
    line(x + 24, y - 4, x + 24, y + 4, { 'stroke-width': 2 }),
    line(x + 24, y, x + 30, y),
  ].join('')
}

/** A circuit that goes on to its loads. */
export function feeder(x: number, y: number, ink: string): string {
  return polygon([x, y - 3, x + 6, y, x, y + 3], { fill: ink, stroke: 'none' })
}

/** Lighting. */
export function lamp(x: number, y: number): string {
  return (
    circle(x + 3, y, 3.6, { fill: '#ffffff' }) +
    line(x + 0.5, y - 2.5, x + 5.5, y + 2.5) +
    line(x + 0.5, y + 2.5, x + 5.5, y - 2.5)
  )
}

/** Socket-outlet. */
export function socket(x: number, y: number): string {
  return (
    path(`M${x + 6} ${y - 4}C${x - 1.4} ${y - 4} ${x - 1.4} ${y + 4} ${x + 6} ${y + 4}`, { fill: 'none' }) +
    line(x, y - 4, x, y + 4)
  )
}

/** One stroke across a wire for each line conductor. */
export function conductors(x: number, y: number, count: number): string {
  return Array.from({ length: count }, (_, index) =>
    line(x + index * 3.2 - 1.6, y + 3, x + index * 3.2 + 1.6, y - 3, { 'stroke-width': 0.8 }),
  ).join('')
}
