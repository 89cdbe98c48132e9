/** Length of r and of s on the curve P-256, in bytes. */
const HALF = 32

/** A positive whole number as DER has it: no needless zeros in front, one where the first bit would mean a minus. */
function derNumber(bytes: Uint8Array): number[] {
  const first = bytes.findIndex((byte) => byte !== 0)
  const digits = bytes.subarray(first === -1 ? bytes.length - 1 : first)
  const signed = digits.subarray(0, 1).some((byte) => byte > 0x7f) ? [0, ...digits] : [...digits]
  return [0x02, signed.length, ...signed]
}

/**
 * A signature as certificates, CMS and OpenSSL write it.
 *
 * @param raw r and s behind one another, as WebCrypto gives them, 64 bytes
 * @source RFC 3279, 2.2.3: `Ecdsa-Sig-Value ::= SEQUENCE { r INTEGER, s INTEGER }`
 */
export function derFromRaw(raw: Uint8Array): Uint8Array {
  if (raw.length !== HALF * 2) throw new RangeError(`A P-256 signature has 64 bytes; this one has ${raw.length}.`)
  const body = [...derNumber(raw.subarray(0, HALF)), ...derNumber(raw.subarray(HALF))]
  return Uint8Array.of(0x30, body.length, ...body)
}

/** One number of the pair and what follows it; `undefined` where it is not as DER wants it. */
function numberAt(der: Uint8Array, half: number): readonly [Uint8Array, Uint8Array] | undefined {
  const [tag, length = 0] = der
  if (tag !== 0x02 || length < 1 || der.length < 2 + length) return undefined
  const digits = der.subarray(2, 2 + length)
  const [first = 0, second = 0] = digits
  if (first > 0x7f || (length > 1 && first === 0 && second <= 0x7f)) return undefined
  const plain = first === 0 ? digits.subarray(1) : digits
  if (plain.length > half) return undefined
  const whole = new Uint8Array(half)
  whole.set(plain, half - plain.length)
  return [whole, der.subarray(2 + length)]
}

/**
 * The same the other way; `undefined` where the bytes are not exactly one signature in DER.
 *
 * @param half length of r and of s in bytes: 32 on P-256, 48 on P-384
 */
export function rawFromDer(der: Uint8Array, half = HALF): Uint8Array | undefined {
  const [tag, length] = der
  if (tag !== 0x30 || length !== der.length - 2 || length > 0x7f) return undefined
  const r = numberAt(der.subarray(2), half)
  const s = r && numberAt(r[1], half)
  if (!s || s[1].length > 0) return undefined
  const raw = new Uint8Array(half * 2)
  raw.set(r[0])
  raw.set(s[0], half)
  return raw
}
