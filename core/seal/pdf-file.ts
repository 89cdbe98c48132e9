import { Unzlib } from 'fflate'
import { Parser } from './pdf-parse.ts'
import { type Dictionary, PdfError, type Value } from './pdf-values.ts'

/** No stream of a report comes near this; one that grows beyond it is meant to fill the memory. */
const LARGEST_STREAM = 1 << 26

const HEAD = '%PDF-1.7\n'
/** `startxref`, an offset, and the end of the file. */
const TAIL_BYTES = 40

/**
 * A PDF of one piece, as Skerry writes it: one cross-reference table at the end, nothing appended, nothing encrypted.
 * Anything else is refused, however many programs would show it.
 */
export class PdfFile {
  readonly bytes: Uint8Array
  readonly #offsets: readonly number[]
  readonly trailer: Dictionary

  /** @throws PdfError where the bytes are anything else */
  constructor(bytes: Uint8Array) {
    this.bytes = bytes
    if (!new Parser(bytes, 0).sees(HEAD)) throw new PdfError('This is no PDF of version 1.7.')
    const table = this.#table()
    const parser = new Parser(bytes, table).expect('xref\n')
    this.#offsets = this.#entries(parser)
    const trailer = parser.skip().expect('trailer').value()
    if (trailer.kind !== 'dictionary') throw new PdfError('The trailer is no dictionary.')
    this.trailer = trailer
    const more = ['Prev', 'XRefStm', 'Encrypt'].find((key) => trailer.entries.has(key))
    if (more !== undefined) throw new PdfError(`The file was changed after it was written: its trailer has “${more}”.`)
    parser.skip().expect(`startxref\n${table}\n%%EOF\n`)
    if (parser.at !== bytes.length)
      throw new PdfError(`${bytes.length - parser.at} bytes stand behind the end of the PDF.`)
  }

  /** Where the cross-reference table stands, as the end of the file says. */
  #table(): number {
    const start = Math.max(0, this.bytes.length - TAIL_BYTES)
    const tail = String.fromCharCode(...this.bytes.subarray(start))
    const [, offset] = /startxref\n([0-9]{1,10})\n%%EOF\n$/.exec(tail) ?? []
    if (offset === undefined)
      throw new PdfError('The file does not end as a PDF does: it was cut, or something was appended.')
    return Number(offset)
  }

  #entries(parser: Parser): number[] {
    const first = parser.count()
    const count = parser.skip().count()
    if (first !== 0 || count * 20 > this.bytes.length)
      throw new PdfError('The cross-reference table is not in one piece.')
    parser.expect('\n0000000000 65535 f \n')
    return Array.from({ length: count - 1 }, () => {
      const offset = parser.count()
      parser.expect(' 00000 n \n')
      return offset
    })
  }

  /** Starts reading an object at its value. */
  #open(id: number): Parser {
    const offset = this.#offsets[id - 1]
    if (offset === undefined) throw new PdfError(`Object ${id} is missing.`)
    return new Parser(this.bytes, offset).expect(`${id} 0 obj\n`)
  }

  /** A value, or the object that it refers to. */
  follow(value: Value | undefined): Value | undefined {
    return value?.kind === 'reference' ? this.#open(value.id).value() : value
  }

  /**
   * The dictionary at the end of a way through dictionaries.
   *
   * @throws PdfError where the way leads nowhere
   */
  dictionary(from: Dictionary, ...way: readonly string[]): Dictionary {
    return way.reduce((dictionary, key) => {
      const found = this.follow(dictionary.entries.get(key))
      if (found?.kind !== 'dictionary') throw new PdfError(`The PDF has no dictionary “${key}” where one belongs.`)
      return found
    }, from)
  }

  get catalog(): Dictionary {
    return this.dictionary(this.trailer, 'Root')
  }

  /**
   * The bytes of a stream.
   *
   * @throws PdfError where there is none, it is packed in another way than Skerry does, or grows beyond all measure
   */
  stream(value: Value | undefined): Uint8Array {
    if (value?.kind !== 'reference') throw new PdfError('A stream is not referred to.')
    const parser = this.#open(value.id)
    const dictionary = parser.value()
    const length = dictionary.kind === 'dictionary' ? dictionary.entries.get('Length') : undefined
    const filter = dictionary.kind === 'dictionary' ? dictionary.entries.get('Filter') : undefined
    if (length?.kind !== 'number') throw new PdfError(`Object ${value.id} is no stream.`)
    const start = parser.skip().expect('stream\n').at
    const raw = this.bytes.subarray(start, start + length.number)
    if (filter === undefined) return raw
    if (filter.kind !== 'name' || filter.name !== 'FlateDecode')
      throw new PdfError(`Object ${value.id} is packed in an unknown way.`)
    return unpacked(raw)
  }
}

function unpacked(raw: Uint8Array): Uint8Array {
  const parts: Uint8Array[] = []
  let size = 0
  const unpack = new Unzlib((part) => {
    size += part.length
    if (size > LARGEST_STREAM) throw new PdfError('A stream grows beyond all measure.')
    parts.push(part)
  })
  try {
    // In pieces, so that a stream that grows without end is stopped while it grows.
    for (let at = 0; at < raw.length; at += 4096) unpack.push(raw.subarray(at, at + 4096), at + 4096 >= raw.length)
  } catch (error) {
    if (error instanceof PdfError) throw error
    throw new PdfError('A stream cannot be unpacked.', { cause: error })
  }
  const whole = new Uint8Array(size)
  parts.reduce((at, part) => {
    whole.set(part, at)
    return at + part.length
  }, 0)
  return whole
}
