import { hexToBytes } from '@noble/hashes/utils.js'
import { strFromU8 } from 'fflate'
import { type Dictionary, type List, PdfError, type Text, type Value } from './pdf-values.ts'

const DEEPEST = 32
const SPACE: ReadonlySet<number> = new Set([0x00, 0x09, 0x0a, 0x0c, 0x0d, 0x20])
const ESCAPES: Readonly<Record<string, number>> = { n: 10, r: 13, t: 9, b: 8, f: 12, '(': 40, ')': 41, '\\': 92 }
const PLAIN = /[^\x00\t\n\f\r ()<>[\]{}/%]/

/**
 * Reads values as PDFKit writes them; of what else PDF allows (comments, octal escapes, broken lines) nothing is taken.
 *
 * @source ISO 32000-1, 7.3
 */
export class Parser {
  #bytes: Uint8Array
  #at: number

  constructor(bytes: Uint8Array, at: number) {
    this.#bytes = bytes
    this.#at = at
  }

  get at(): number {
    return this.#at
  }

  #sign(ahead = 0): string {
    const byte = this.#bytes[this.#at + ahead]
    return byte === undefined ? '' : String.fromCharCode(byte)
  }

  #fail(wanted: string): never {
    throw new PdfError(`At byte ${this.#at} ${wanted} was expected.`)
  }

  /** Goes past blanks and line ends. */
  skip(): this {
    while (SPACE.has(this.#bytes[this.#at] ?? -1)) this.#at += 1
    return this
  }

  /** Goes past these very signs. */
  expect(signs: string): this {
    for (const sign of signs) {
      if (this.#sign() !== sign) this.#fail(`“${signs}”`)
      this.#at += 1
    }
    return this
  }

  /** Whether these signs come next. */
  sees(signs: string): boolean {
    return [...signs].every((sign, ahead) => this.#sign(ahead) === sign)
  }

  #word(): string {
    let word = ''
    while (PLAIN.test(this.#sign())) {
      word += this.#sign()
      this.#at += 1
    }
    return word === '' ? this.#fail('a value') : word
  }

  /** A whole number of at least 0. */
  count(): number {
    const word = this.#word()
    return /^[0-9]{1,10}$/.test(word) ? Number(word) : this.#fail('a whole number')
  }

  value(depth = 0): Value {
    if (depth > DEEPEST) this.#fail('less depth')
    this.skip()
    if (this.sees('<<')) return this.#dictionary(depth)
    const read = {
      '[': () => this.#list(depth),
      '<': () => this.#hex(),
      '(': () => this.#text(),
      '/': () => this.#named(),
    }
    return (read[this.#sign() as keyof typeof read] ?? (() => this.#plain()))()
  }

  #name(): string {
    this.expect('/')
    return this.#word().replaceAll(/#([0-9A-F]{2})/g, (_, code: string) =>
      String.fromCharCode(Number.parseInt(code, 16)),
    )
  }

  #named(): Value {
    return { kind: 'name', name: this.#name() }
  }

  #plain(): Value {
    const word = this.#word()
    if (!/^[-+.0-9]/.test(word)) return { kind: 'word', word }
    const after = this.#at
    if (/^[0-9]+$/.test(word) && this.sees(' 0 R')) {
      this.#at = after + 4
      return { kind: 'reference', id: Number(word) }
    }
    return { kind: 'number', number: Number(word) }
  }

  #hex(): Text {
    const start = this.#at
    this.expect('<')
    const end = this.#bytes.indexOf(0x3e, this.#at)
    if (end === -1) this.#fail('“>” somewhere after it')
    const hex = strFromU8(this.#bytes.subarray(this.#at, end), true)
    if (!/^(?:[0-9a-f]{2})*$/.test(hex)) this.#fail('hexadecimal digits in small letters')
    this.#at = end + 1
    return { kind: 'text', bytes: hexToBytes(hex), start, end: this.#at }
  }

  #text(): Text {
    const start = this.#at
    const bytes: number[] = []
    this.expect('(')
    while (!this.sees(')')) {
      if (this.sees('\\')) {
        this.#at += 1
        bytes.push(ESCAPES[this.#sign()] ?? this.#fail('an escaped sign'))
      } else bytes.push(this.#bytes[this.#at] ?? this.#fail('“)” somewhere after it'))
      this.#at += 1
    }
    this.#at += 1
    return { kind: 'text', bytes: Uint8Array.from(bytes), start, end: this.#at }
  }

  #list(depth: number): List {
    const start = this.#at
    const values: Value[] = []
    this.expect('[')
    while (!this.skip().sees(']')) values.push(this.value(depth + 1))
    this.expect(']')
    return { kind: 'list', values, start, end: this.#at }
  }

  #dictionary(depth: number): Dictionary {
    const entries = new Map<string, Value>()
    this.expect('<<')
    while (!this.skip().sees('>>')) {
      const key = this.#name()
      if (entries.has(key)) this.#fail('a key that is not there yet')
      entries.set(key, this.value(depth + 1))
    }
    this.expect('>>')
    return { kind: 'dictionary', entries, end: this.#at }
  }
}
