import type { Place } from './problems.ts'
import type { Shape } from './style.ts'
import type { SvgPicture } from './svg-read.ts'

/** How a stretch of text differs from the block it stands in. */
export interface Marks {
  readonly strong: boolean
  readonly em: boolean
  readonly small: boolean
  readonly raise: 'sup' | 'sub' | undefined
  readonly classes: readonly string[]
}

/** A stretch of text, a forced new line, or the shape in front of a verdict. `source` is where the text stands in the HTML. */
export type Run =
  | { readonly kind: 'text'; readonly text: string; readonly marks: Marks; readonly source: Source }
  | { readonly kind: 'break' }
  | { readonly kind: 'shape'; readonly shape: Shape; readonly colour: string; readonly marks: Marks }

/** Offsets into the HTML, and the place of the first. */
export interface Source {
  readonly place: Place
  readonly from: number
  readonly to: number
}

interface Common {
  readonly place: Place
  readonly classes: readonly string[]
  readonly id: string | undefined
}

export interface Heading extends Common {
  readonly kind: 'heading'
  readonly level: 1 | 2 | 3 | 4
  readonly runs: readonly Run[]
}

export interface Paragraph extends Common {
  readonly kind: 'paragraph'
  readonly runs: readonly Run[]
}

export interface List extends Common {
  readonly kind: 'list'
  readonly ordered: boolean
  readonly items: readonly (readonly Block[])[]
}

export interface Definitions extends Common {
  readonly kind: 'definitions'
  readonly entries: readonly { readonly term: readonly Run[]; readonly details: readonly Block[] }[]
}

export interface Cell extends Common {
  readonly header: boolean
  readonly scope: string | undefined
  readonly span: number
  readonly blocks: readonly Block[]
}

export interface Row extends Common {
  readonly cells: readonly Cell[]
}

/** A column's share of the table's width in percent, or nothing where the content decides. */
export interface Column {
  readonly share: number | undefined
  readonly classes: readonly string[]
}

export interface Table extends Common {
  readonly kind: 'table'
  readonly caption: readonly Run[]
  readonly columns: readonly Column[]
  readonly head: readonly Row[]
  readonly bodies: readonly (readonly Row[])[]
}

export type Picture =
  | { readonly kind: 'svg'; readonly svg: SvgPicture }
  | { readonly kind: 'photo'; readonly name: string }

export interface Figure extends Common {
  readonly kind: 'figure'
  readonly picture: Picture
  readonly alternative: string
  readonly width: string | undefined
  readonly caption: readonly Run[]
}

export interface Group extends Common {
  readonly kind: 'group'
  readonly tag: 'section' | 'div'
  readonly blocks: readonly Block[]
}

export type Block = Heading | Paragraph | List | Definitions | Table | Figure | Group
