/** Every design decision of the paper in one place. Lengths in points (1/72 inch) unless a name says otherwise. */

const MM = 72 / 25.4

/** A4 with room at the left for filing holes (ISO 838 holes stand 12 mm from the edge). */
export const PAGE = {
  width: 595.28,
  height: 841.89,
  left: 20 * MM,
  right: 15 * MM,
  top: 23 * MM,
  bottom: 21 * MM,
  headerAt: 11.5 * MM,
  footerAt: 11.5 * MM,
} as const

export const CONTENT = {
  width: PAGE.width - PAGE.left - PAGE.right,
  height: PAGE.height - PAGE.top - PAGE.bottom,
  bottom: PAGE.height - PAGE.bottom,
} as const

/** Ink on chart paper: depth tints of one blue, hairlines, and one lamp that is kept for the island. */
export const COLOUR = {
  ink: '#16242e',
  muted: '#51626e',
  hairline: '#b4c3cd',
  rule: '#6d8494',
  shoal: '#f1f6f9',
  depth: '#dfeaf1',
  deep: '#bfd5e2',
  abyss: '#34617f',
  lamp: '#b4690e',
  lampTint: '#fcf3e4',
  alarm: '#9b2c1f',
  alarmTint: '#fbefec',
  paper: '#ffffff',
  watermark: '#ecf0f2',
} as const

export type FaceName = 'regular' | 'italic' | 'medium' | 'semibold' | 'fallback'

export interface TextStyle {
  readonly face: FaceName
  readonly size: number
  readonly leading: number
  readonly colour: string
  /** Added between letters, as a part of the size. */
  readonly spacing: number
  readonly align: 'left' | 'right' | 'centre'
}

/** Text that is used as it is, and the distances around the block that holds it. */
export interface BlockStyle {
  readonly text: TextStyle
  readonly before: number
  readonly after: number
}

const BODY: TextStyle = { face: 'regular', size: 9, leading: 12.8, colour: COLOUR.ink, spacing: 0, align: 'left' }
const TABLE: TextStyle = { ...BODY, size: 8.4, leading: 11.4 }

export const BLOCK = {
  h1: { text: { ...BODY, face: 'medium', size: 22, leading: 26, spacing: -0.008 }, before: 22, after: 8 },
  h2: { text: { ...BODY, face: 'medium', size: 14, leading: 17.5 }, before: 24, after: 7 },
  h3: { text: { ...BODY, face: 'semibold', size: 10.2, leading: 13.5 }, before: 15, after: 4 },
  h4: { text: { ...BODY, face: 'medium', size: 9, leading: 12.8, colour: COLOUR.muted }, before: 10, after: 2 },
  p: { text: BODY, before: 0, after: 6 },
  item: { text: BODY, before: 0, after: 2.5 },
  list: { text: BODY, before: 0, after: 6 },
  term: { text: { ...TABLE, face: 'medium', size: 7.8, colour: COLOUR.muted }, before: 0, after: 0 },
  detail: { text: TABLE, before: 0, after: 0 },
  definitions: { text: TABLE, before: 2, after: 8 },
  caption: { text: { ...BODY, face: 'semibold', size: 8.4, leading: 11.6 }, before: 0, after: 3.5 },
  figcaption: { text: { ...BODY, size: 7.8, leading: 10.6, colour: COLOUR.muted }, before: 4, after: 0 },
  header: {
    text: { ...TABLE, face: 'medium', size: 7.4, leading: 9.8, colour: COLOUR.muted, spacing: 0.012 },
    before: 0,
    after: 0,
  },
  rowHeader: { text: { ...TABLE, face: 'medium' }, before: 0, after: 0 },
  cell: { text: TABLE, before: 0, after: 0 },
  table: { text: TABLE, before: 9, after: 13 },
  figure: { text: BODY, before: 8, after: 12 },
} satisfies Record<string, BlockStyle>

/** What a class changes about text, on a block or on a span. Letters are never changed to capitals: mΩ is not MΩ. */
export const TEXT_CLASS: Readonly<Record<string, Partial<TextStyle>>> = {
  lead: { size: 11, leading: 16, colour: COLOUR.muted },
  muted: { colour: COLOUR.muted },
  'small-label': { face: 'medium', size: 7, leading: 10, colour: COLOUR.muted, spacing: 0.06 },
  figure: { face: 'medium', size: 18, leading: 22 },
  num: { align: 'right' },
  right: { align: 'right' },
  centre: { align: 'centre' },
  medium: { face: 'medium' },
  island: { colour: COLOUR.lamp, face: 'medium' },
  alarm: { colour: COLOUR.alarm, face: 'medium' },
}

export type Shape = 'disc-tick' | 'ring-tick' | 'box-cross' | 'square-cross' | 'dotted-ring' | 'half-diamond' | 'dash'

/** A verdict is a word behind a shape of its own; the colour only repeats what both say. */
export const BADGE: Readonly<Record<string, { readonly shape: Shape; readonly colour: string }>> = {
  'verdict-meets': { shape: 'disc-tick', colour: COLOUR.abyss },
  'verdict-meets-inside': { shape: 'ring-tick', colour: COLOUR.abyss },
  'verdict-fails-inside': { shape: 'box-cross', colour: COLOUR.alarm },
  'verdict-fails': { shape: 'square-cross', colour: COLOUR.alarm },
  'verdict-not-shown': { shape: 'dotted-ring', colour: COLOUR.ink },
  'verdict-limited': { shape: 'half-diamond', colour: COLOUR.ink },
  'verdict-not-applicable': { shape: 'dash', colour: COLOUR.muted },
}

/** Boxes by class: padding, ground, border, and a bar at the left. */
export interface BoxStyle {
  readonly pad: { readonly x: number; readonly y: number }
  readonly ground?: string
  readonly border?: string
  readonly bar?: { readonly width: number; readonly colour: string }
  /** Room at the right that the content leaves to the chart. */
  readonly reserve?: number
}

export const BOX: Readonly<Record<string, BoxStyle>> = {
  box: { pad: { x: 9, y: 8 }, border: COLOUR.hairline },
  'box-tint': { pad: { x: 9, y: 8 }, ground: COLOUR.shoal },
  'box-caution': {
    pad: { x: 11, y: 8 },
    ground: COLOUR.alarmTint,
    border: COLOUR.alarm,
    bar: { width: 4, colour: COLOUR.alarm },
  },
  'box-note': { pad: { x: 11, y: 8 }, ground: COLOUR.shoal, bar: { width: 2.5, colour: COLOUR.abyss } },
  'box-island': { pad: { x: 11, y: 8 }, ground: COLOUR.lampTint, bar: { width: 2.5, colour: COLOUR.lamp } },
  'title-block': { pad: { x: 19, y: 20 }, reserve: 196 },
}

/** Classes that set the children of a div beside each other. */
export const GRID: Readonly<Record<string, number>> = {
  'columns-2': 2,
  'columns-3': 3,
  'grid-2': 2,
  'grid-3': 3,
  'grid-4': 4,
}

/** Prose is set no wider than this, about 95 letters a line; tables and figures take the whole width. */
export const MEASURE = 430
export const GAP = { columns: 16, rows: 10 } as const
export const CELL = { x: 5, top: 3.6, bottom: 3.8 } as const
export const LIST = { indent: 13, marker: 4 } as const
export const TERM_SHARE = 0.3
export const HAIRLINE = 0.5
export const MARK = { size: 0.62, raise: { sup: 0.36, sub: -0.14 }, small: 0.86 } as const

/** What a class means inside a drawing; a caller adds its own beside these. */
export interface SvgStyle {
  readonly fill?: string
  readonly stroke?: string
  readonly strokeWidth?: number
  readonly dash?: readonly number[]
  readonly opacity?: number
  readonly fontSize?: number
  readonly fontWeight?: number
}

/** Classes for plots that every page knows; diagrams bring their own. */
export const SVG_CLASS: Readonly<Record<string, SvgStyle>> = {
  axis: { fill: 'none', stroke: COLOUR.rule, strokeWidth: 0.8 },
  gridline: { fill: 'none', stroke: COLOUR.hairline, strokeWidth: 0.4 },
  label: { fill: COLOUR.muted, stroke: 'none', fontSize: 9 },
  value: { fill: COLOUR.ink, stroke: 'none', fontSize: 9, fontWeight: 500 },
  water: { fill: COLOUR.depth, stroke: 'none' },
  limit: { fill: 'none', stroke: COLOUR.alarm, strokeWidth: 1, dash: [4, 2] },
  island: { stroke: COLOUR.lamp, fill: 'none', strokeWidth: 1.4 },
  ink: { stroke: COLOUR.ink, fill: 'none', strokeWidth: 1.2 },
}
