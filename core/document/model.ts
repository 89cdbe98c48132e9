import type { Verdict } from '#core/glossary.ts'

/**
 * The document model: what the browser shows, the PDF prints and annotations hold on to. Anchors are semantic
 * (`circuit/K1`, `rule/<id>/<subject>/<state>`), never positions, so that they survive another revision of the file.
 */
export interface ReportModel {
  readonly title: string
  readonly kicker: string
  readonly lead: string
  readonly place: string
  readonly tiles: readonly Tile[]
  readonly sections: readonly Section[]
  readonly end: string
}

export interface Tile {
  readonly label: string
  readonly figure: string
  readonly note: string
  /** `box`, `box-tint` or `box-island`. */
  readonly look: 'box' | 'box-tint' | 'box-island'
}

export interface Section {
  readonly anchor: string
  readonly title: string
  readonly blocks: readonly Block[]
  readonly newPage?: true
}

/** One block of a section, under exactly one of its names, as the template asks for them. */
export interface Block {
  readonly anchor: string
  readonly heading?: string
  readonly paragraph?: string
  readonly caution?: readonly string[]
  readonly list?: readonly string[]
  readonly particulars?: readonly Particular[]
  readonly table?: Table
  readonly figure?: Figure
  readonly finding?: FindingBlock
}

export interface Particular {
  readonly term: string
  readonly detail: string
}

export interface Figure {
  readonly svg: string
  readonly caption: string
  readonly width: string
}

export interface Table {
  readonly caption: string
  readonly columns: readonly Column[]
  readonly rows: readonly Row[]
}

export interface Column {
  readonly title: string
  readonly width?: string
  readonly look: '' | 'num'
}

export interface Row {
  readonly anchor: string
  readonly head: string
  readonly cells: readonly Cell[]
  readonly look: '' | 'row-fails' | 'row-island'
}

export interface Cell {
  readonly text?: string
  readonly look?: 'num'
  readonly svg?: string
  readonly badge?: Badge
}

export interface Badge {
  readonly look: string
  readonly word: string
}

export interface FindingBlock {
  readonly badge: Badge
  readonly about: string
  readonly title: string
  readonly message: string
  readonly remedy: string
  readonly sources: string
  readonly rule: string
  readonly place: string
}

const LOOKS: Readonly<Record<Verdict, string>> = {
  meets: 'verdict-meets',
  'meets, inside the uncertainty': 'verdict-meets-inside',
  'fails, inside the uncertainty': 'verdict-fails-inside',
  fails: 'verdict-fails',
  'not shown': 'verdict-not-shown',
  limited: 'verdict-limited',
  'not applicable': 'verdict-not-applicable',
}

/** A verdict as word and shape. */
export const badge = (verdict: Verdict, word: string = verdict): Badge => ({ look: LOOKS[verdict], word })
