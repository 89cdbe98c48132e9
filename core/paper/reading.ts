import { attribute, classesOf, type Element, placeOf } from './markup.ts'
import type { SvgStyle } from './style.ts'
import type { Block } from './tree.ts'

/** What reading needs to know besides the element in hand. */
export interface Reading {
  readonly svgStyles: Readonly<Record<string, SvgStyle>>
  readonly pictures: ReadonlySet<string>
  /** Reads the content of an item or a cell, where words and blocks may stand side by side. */
  readonly mixed: (element: Element) => readonly Block[]
}

/** Where an element stands and what it is called. */
export const common = (element: Element) => ({
  place: placeOf(element),
  classes: classesOf(element),
  id: attribute(element, 'id'),
})
