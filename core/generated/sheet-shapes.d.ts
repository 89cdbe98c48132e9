import type { SheetValue, SheetValues, Subject } from '#core/glossary.ts'
type Values = Record<string, SheetValue | undefined>
/** How the sheets of a subject are made. Written out field by field, all of a kind look alike to the engine and are quick to make, read and copy. */
export interface SheetShape {
  /** All fields that do not depend on the state, with nothing in them. */
  readonly common: () => Values
  /** All fields of a state, with nothing in them. */
  readonly inState: () => Values
  /** What the rules see: the common fields, those of a state over them, and the book's parameters. */
  readonly seen: <Book>(common: SheetValues, inState: SheetValues, book: Book) => Record<string, SheetValue | Book | undefined>
}
declare const shapes: Readonly<Record<Subject, SheetShape>>
export default shapes
