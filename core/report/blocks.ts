/**
 * What a report is made of. Every part that can be pointed at has an anchor: a name by meaning
 * (`circuit/K1/loop/grid`), never a position, so that a remark holds on to it through later revisions.
 * Text is data: nothing in it is markup. In words of our own, `I_b` stands for I with b below it.
 */

/** A verdict as printed: a word, and the shape in front of it. */
export interface Mark {
  readonly word: string
  /** Class of the shape: `verdict-meets`. */
  readonly shape: string
}

export interface Cell {
  readonly anchor?: string
  readonly text?: string
  /** A second, quieter line. */
  readonly note?: string
  readonly mark?: Mark
  /** A drawing of our own; the only markup that the model holds. */
  readonly svg?: string
}

export interface Column {
  readonly label: string
  readonly unit?: string
  /** Part of the table's width in %; the content decides where it is left out. */
  readonly width?: number
  readonly align?: 'num' | 'centre'
}

export interface Row {
  readonly anchor: string
  readonly look?: 'row-fails' | 'row-island'
  readonly head: Cell
  readonly cells: readonly Cell[]
}

export interface RowGroup {
  readonly title?: string
  readonly rows: readonly Row[]
}

export interface TableBlock {
  readonly kind: 'table'
  readonly anchor: string
  readonly caption?: string
  readonly columns: readonly Column[]
  readonly groups: readonly RowGroup[]
  readonly span: number
}

export interface Entry {
  readonly anchor: string
  readonly term: string
  readonly detail: string
  readonly note?: string
  readonly mark?: Mark
}

/** Terms with what they stand for, in one or more lists beside each other. */
export interface Particulars {
  readonly kind: 'particulars'
  readonly anchor: string
  readonly title?: string
  readonly lists: readonly { readonly title?: string; readonly entries: readonly Entry[] }[]
  readonly beside: boolean
}

export interface FigureBlock {
  readonly kind: 'figure'
  readonly anchor: string
  readonly svg: string
  readonly caption: string
}

/** Drawings that are seen together. */
export interface Figures {
  readonly kind: 'figures'
  readonly anchor: string
  readonly figures: readonly FigureBlock[]
}

export interface Prose {
  readonly kind: 'prose'
  readonly anchor: string
  readonly title?: string
  readonly paragraphs: readonly string[]
  readonly quiet?: true
}

export interface Notice {
  readonly kind: 'notice'
  readonly anchor: string
  readonly box: 'box-caution' | 'box-note' | 'box-island' | 'box-tint'
  readonly title?: string
  readonly paragraphs: readonly string[]
  readonly items: readonly string[]
}

/** A few large figures beside each other. */
export interface Tiles {
  readonly kind: 'tiles'
  readonly anchor: string
  readonly tiles: readonly {
    readonly anchor: string
    readonly box: 'box' | 'box-island'
    readonly label: string
    readonly figure: string
    readonly lines: readonly string[]
    readonly marks: readonly { readonly mark: Mark; readonly count: number }[]
  }[]
}

/** A finding in words, or all findings of one rule that say the same. */
export interface FindingBlock {
  readonly anchor: string
  readonly mark: Mark
  readonly about: string
  /** Subjects of a rule that lacks the same on several of them, each with an anchor of its own. */
  readonly subjects: readonly { readonly anchor: string; readonly name: string }[]
  readonly title: string
  readonly says: string
  readonly remedy: string
  readonly rule: string
  readonly cites: string
  readonly place: string
  readonly departure?: string
}

export interface Findings {
  readonly kind: 'findings'
  readonly anchor: string
  readonly title: string
  readonly lead: string
  readonly findings: readonly FindingBlock[]
}

/** Names by chapter, each of which can be pointed at. */
export interface Names {
  readonly kind: 'names'
  readonly anchor: string
  readonly title: string
  readonly lead: string
  readonly groups: readonly {
    readonly title: string
    readonly names: readonly { readonly anchor: string; readonly name: string; readonly id: string }[]
  }[]
}

export type Block = Names | Figures | Particulars | TableBlock | FigureBlock | Prose | Notice | Tiles | Findings

export interface Section {
  readonly anchor: string
  readonly title: string
  readonly newPage?: true
  readonly blocks: readonly Block[]
}

/** Up to this many rows a group is kept in one piece. */
const WHOLE = 8

/** Groups as one table where they are small, else each as a table of its own under its title. */
export function tables(
  anchor: string,
  columns: readonly Column[],
  groups: readonly RowGroup[],
  caption?: string,
): TableBlock[] {
  const filled = groups.filter(({ rows }) => rows.length > 0)
  if (filled.length === 0) return []
  if (filled.every(({ rows }) => rows.length <= WHOLE)) return [table(anchor, columns, filled, caption)]
  return filled.map(({ title, rows }) => {
    const words = [caption, title].filter((part) => part !== undefined).join(' · ')
    return table(`${anchor}/${title ?? ''}`, columns, [{ rows }], words)
  })
}

/** Puts a table together; `span` is its count of columns. */
export function table(
  anchor: string,
  columns: readonly Column[],
  groups: readonly RowGroup[],
  caption?: string,
): TableBlock {
  const filled = groups.filter(({ rows }) => rows.length > 0)
  return {
    kind: 'table',
    anchor,
    columns,
    groups: filled,
    span: columns.length,
    ...(caption !== undefined && { caption }),
  }
}
