import { at } from '../svg-text.ts'

/** How a part is drawn: in ink where it is live, dashed and pale where it is dead, in the lamp's colour at the island's source. */
export interface Pen {
  readonly colour: string
  readonly width: number
  readonly dash: string
}

const stroke = ({ colour, width, dash }: Pen): string =>
  `stroke="${colour}" stroke-width="${width}" fill="none"${dash === '' ? '' : ` stroke-dasharray="${dash}"`}`

export const wire = (x1: number, y1: number, x2: number, y2: number, pen: Pen): string =>
  `<line x1="${at(x1)}" y1="${at(y1)}" x2="${at(x2)}" y2="${at(y2)}" ${stroke(pen)}/>`

/** A fuse: a rectangle with the conductor through it (IEC 60617, S00362). */
export const fuse = (x: number, y: number, pen: Pen): string =>
  `<rect x="${at(x - 8)}" y="${at(y - 3.5)}" width="16" height="7" ${stroke(pen)}/>${wire(x - 8, y, x + 8, y, pen)}`

const contact = (x: number, y: number, pen: Pen, open: boolean): string =>
  `<path d="M${at(x - 9)} ${at(y)}L${at(x + 7)} ${at(open ? y - 8 : y - 0.5)}" ${stroke({ ...pen, dash: '' })}/><circle cx="${at(x - 9)}" cy="${at(y)}" r="1.3" fill="${pen.colour}"/><circle cx="${at(x + 9)}" cy="${at(y)}" r="1.3" fill="${pen.colour}"/>`

/** A circuit-breaker: a contact with a cross at its fixed end (IEC 60617, S00287). */
export const breaker = (x: number, y: number, pen: Pen): string =>
  `${contact(x, y, pen, false)}<path d="M${at(x + 6)} ${at(y - 3)}l6 6m0 -6l-6 6" ${stroke({ ...pen, dash: '' })}/>`

/** A residual-current device: a breaker whose conductors pass a summation transformer. */
export const residual = (x: number, y: number, pen: Pen): string =>
  `${contact(x - 4, y, pen, false)}<ellipse cx="${at(x + 9)}" cy="${at(y)}" rx="3" ry="6" ${stroke({ ...pen, dash: '' })}/>${wire(x + 5, y, x + 14, y, pen)}`

/** The changeover: its grid contact, open in the island, and the bar of its backed-up side. */
export const changeover = (x: number, y: number, pen: Pen, open: boolean): string =>
  `<rect x="${at(x - 15)}" y="${at(y - 12)}" width="30" height="24" rx="2" ${stroke({ ...pen, dash: '' })}/>${contact(x - 2, y, pen, open)}`

/** A converter from d.c. to a.c. (IEC 60617, S00894 for the square with its diagonal). */
export const inverter = (x: number, y: number, pen: Pen): string =>
  `<rect x="${at(x - 10)}" y="${at(y - 10)}" width="20" height="20" ${stroke(pen)}/>${wire(x - 10, y + 10, x + 10, y - 10, pen)}<path d="M${at(x - 7)} ${at(y - 4)}q2.2 -4 4.4 0q2.2 4 4.4 0" ${stroke(pen)}/><path d="M${at(x)} ${at(y + 4)}h7m-7 3h7" ${stroke(pen)}/>`

/** A board: the busbar that its children hang on. */
export const board = (x: number, y: number, pen: Pen): string =>
  `<circle cx="${at(x)}" cy="${at(y)}" r="2.6" fill="${pen.colour}"/>`

/** A load at the end of its circuit: an arrow. */
export const load = (x: number, y: number, pen: Pen): string =>
  `<path d="M${at(x)} ${at(y - 3.6)}L${at(x + 7)} ${at(y)}L${at(x)} ${at(y + 3.6)}Z" fill="${pen.colour}"/>`

/** The supply: where the public grid enters. */
export const supply = (x: number, y: number, pen: Pen): string =>
  `<circle cx="${at(x)}" cy="${at(y)}" r="9" ${stroke(pen)}/><path d="M${at(x - 5.5)} ${at(y)}q2.75 -6 5.5 0q2.75 6 5.5 0" ${stroke(pen)}/>`

/** Earth (IEC 60617, S00200). */
export const earth = (x: number, y: number, pen: Pen): string =>
  `${wire(x, y, x, y + 6, pen)}<path d="M${at(x - 6)} ${at(y + 6)}h12m-10 2.6h8m-6 2.6h4" ${stroke(pen)}/>`

/** A photovoltaic array (IEC 60617, S00908 in outline: light falls on a plate). */
export const array = (x: number, y: number, pen: Pen): string =>
  `<rect x="${at(x - 9)}" y="${at(y - 5)}" width="18" height="10" ${stroke(pen)}/><path d="M${at(x - 9)} ${at(y - 5)}l5 5l-5 5" ${stroke(pen)}/><path d="M${at(x - 1)} ${at(y - 13)}l3 5m2 -5l3 5" ${stroke(pen)}/>`

/** A battery of cells (IEC 60617, S01341). */
export const battery = (x: number, y: number, pen: Pen): string =>
  `<path d="M${at(x - 6)} ${at(y - 6)}v12m4 -8v4m4 -8v12m4 -8v4" ${stroke(pen)}/>`
