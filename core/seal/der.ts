import { concatBytes } from '@noble/hashes/utils.js'
import { ObjectIdentifier } from 'asn1js'

/**
 * The distinguished encoding of ASN.1, as far as seals need it. Seals are compared byte for byte with how they must be
 * built, so they are put together and taken apart here rather than by a library that also takes other encodings.
 *
 * @source ITU-T X.690 (2021), 10
 */
export const TAG = {
  integer: 0x02,
  bits: 0x03,
  octets: 0x04,
  nothing: 0x05,
  name: 0x06,
  boolean: 0x01,
  sequence: 0x30,
  set: 0x31,
  /** Context-specific and constructed: `[0]`, `[1]`. */
  part0: 0xa0,
  part1: 0xa1,
} as const

/** One element: its tag, its content, and both together. */
export interface Element {
  readonly tag: number
  readonly content: Uint8Array
  readonly whole: Uint8Array
}

function lengthOf(size: number): number[] {
  if (size < 0x80) return [size]
  const digits: number[] = []
  for (let rest = size; rest > 0; rest = Math.floor(rest / 256)) digits.unshift(rest % 256)
  return [0x80 + digits.length, ...digits]
}

/** An element from its parts. */
export function der(tag: number, ...parts: readonly Uint8Array[]): Uint8Array {
  const content = concatBytes(...parts)
  return concatBytes(Uint8Array.of(tag, ...lengthOf(content.length)), content)
}

/** An object identifier such as `1.2.840.113549.1.7.2`. */
export function oid(dotted: string): Uint8Array {
  return new Uint8Array(new ObjectIdentifier({ value: dotted }).toBER())
}

/** A small number. */
export function integer(value: number): Uint8Array {
  return der(TAG.integer, Uint8Array.of(value))
}

function byBytes(one: Uint8Array, other: Uint8Array): number {
  const at = one.findIndex((byte, index) => byte !== other[index])
  return at === -1 ? one.length - other.length : (one[at] ?? 0) - (other[at] ?? 0)
}

/** A set, its elements in the order that the encoding asks for (X.690, 11.6). */
export function setOf(tag: number, elements: readonly Uint8Array[]): Uint8Array {
  return der(tag, ...elements.toSorted(byBytes))
}

/** The element that some bytes begin with; `undefined` where it is not in the distinguished form. */
export function leading(bytes: Uint8Array): Element | undefined {
  const [tag, size] = bytes
  if (tag === undefined || size === undefined || (tag & 0x1f) === 0x1f) return undefined
  const count = size < 0x80 ? 0 : size - 0x80
  if (size === 0x80 || count > 3 || bytes.length < 2 + count) return undefined
  const length = count === 0 ? size : bytes.subarray(2, 2 + count).reduce((sum, digit) => sum * 256 + digit, 0)
  const start = 2 + count
  if (lengthOf(length).length !== 1 + count || bytes.length < start + length) return undefined
  return { tag, content: bytes.subarray(start, start + length), whole: bytes.subarray(0, start + length) }
}

/** The elements that some bytes are made of, to the last byte; `undefined` where they are not. */
function elements(bytes: Uint8Array): readonly Element[] | undefined {
  const found: Element[] = []
  for (let rest = bytes; rest.length > 0; ) {
    const next = leading(rest)
    if (!next) return undefined
    found.push(next)
    rest = rest.subarray(next.whole.length)
  }
  return found
}

/** What an element is made of; nothing where there is no element, or one that is not made of others. */
export function partsOf(element: Element | undefined): readonly Element[] {
  return (element && elements(element.content)) ?? []
}

/** Goes down into an element by the places of its parts. */
export function inside(bytes: Uint8Array, ...places: readonly number[]): Element | undefined {
  return places.reduce<Element | undefined>((element, place) => partsOf(element)[place], leading(bytes))
}
