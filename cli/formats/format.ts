import type { FileResult } from '#cli/result.ts'

/** What a format may draw on beside the results. */
export interface FormatScene {
  readonly version: string
  readonly colour: boolean
  readonly width: number
  readonly verbose: boolean
  readonly quiet: boolean
  readonly strict: boolean
}

/** What stands above and below the pieces of the files. */
export interface Frame {
  readonly head: string
  readonly tail: string
}

/** A print in the making: it is given one file after the other, and holds nothing of them but what its frame needs. */
export interface Printing {
  /** The piece of a file; pieces stand below each other in the order of the files. */
  readonly take: (result: FileResult) => string
  /** Known when all files were taken. */
  readonly frame: () => Frame
}

export type Format = (scene: FormatScene) => Printing

/** What a format puts between two pieces: nothing in front of the first. */
export function between(separator: string): () => string {
  let first = true
  return () => {
    const mark = first ? '' : separator
    first = false
    return mark
  }
}

/** A value as it stands inside an indented JSON document, at a depth of so many spaces. */
export function indented(value: unknown, spaces: number): string {
  const margin = ' '.repeat(spaces)
  return `${margin}${JSON.stringify(value, null, 2).replaceAll('\n', `\n${margin}`)}`
}

/**
 * The frame of a JSON document around the items of one of its lists.
 *
 * @param document the whole with that list empty, the only empty list under that name
 * @param name of the list
 * @param spaces depth at which the list itself stands
 * @param some whether there are items
 */
export function listFrame(document: unknown, name: string, spaces: number, some: boolean): Frame {
  const text = `${JSON.stringify(document, null, 2)}\n`
  const mark = `\n${' '.repeat(spaces)}"${name}": [`
  const at = text.lastIndexOf(`${mark}]`) + mark.length
  return some
    ? { head: `${text.slice(0, at)}\n`, tail: `\n${' '.repeat(spaces)}${text.slice(at)}` }
    : { head: text, tail: '' }
}
