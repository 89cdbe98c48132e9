import { InvalidArgumentError } from 'commander'
import { FORMAT_NAMES, type FormatName } from '#cli/formats/formats.ts'
import { nearest } from '#core/texts/nearest.ts'

/** A format, and the file that it goes to; to standard output without one. */
export interface Wanted {
  readonly format: FormatName
  readonly output: string | undefined
}

const STANDARD_OUTPUT = '-'

function known(word: string): FormatName {
  const name = FORMAT_NAMES.find((format) => format === word)
  if (name) return name
  const hint = nearest(word, FORMAT_NAMES)
  throw new InvalidArgumentError(
    `There is no format ${word}${hint === undefined ? '' : `: did you mean ${hint}?`} Formats: ${FORMAT_NAMES.join(', ')}.`,
  )
}

/** Collects formats and files as they are typed: a file belongs to the format before it, or else to the one after it. */
export class Outputs {
  readonly #wanted: { readonly format: FormatName; output: string | undefined }[] = []
  #waiting: string | undefined

  /** Takes a format; its name as typed. */
  format(word: string): void {
    this.#wanted.push({ format: known(word), output: this.#waiting })
    this.#waiting = undefined
  }

  /** Takes a file. */
  output(file: string): void {
    const last = this.#wanted.at(-1)
    if (last && last.output === undefined) last.output = file
    else if (this.#waiting === undefined) this.#waiting = file
    else throw new InvalidArgumentError(`It would be written over by ${this.#waiting}: give each its own --format.`)
  }

  /** All that is wanted, or what is wrong with it in words. */
  all(usual: FormatName): readonly Wanted[] | string {
    if (this.#wanted.length === 0) this.#wanted.push({ format: usual, output: this.#waiting })
    else if (this.#waiting !== undefined) return `There is no format for ${this.#waiting}: put a --format before it.`
    const all = this.#wanted.map(({ format, output }) => ({
      format,
      output: output === STANDARD_OUTPUT ? undefined : output,
    }))
    const unique = new Set(all.map(({ output }) => output))
    if (unique.size === all.length) return all
    return 'Two formats go to the same place: give each but one a file of its own, such as --format sarif -o findings.sarif.'
  }
}
