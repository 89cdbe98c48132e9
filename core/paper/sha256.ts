/** First 32 bits of the fractional parts of `root(prime)`, as FIPS 180-4 defines its constants; exact in a double for these primes. */
const fraction = (value: number): number => Math.floor((value - Math.floor(value)) * 2 ** 32)

const PRIMES = (() => {
  const primes: number[] = []
  for (let n = 2; primes.length < 64; n++) if (primes.every((prime) => n % prime !== 0)) primes.push(n)
  return primes
})()

const ROUND = Uint32Array.from(PRIMES, (prime) => fraction(Math.cbrt(prime)))
const START = Uint32Array.from(PRIMES.slice(0, 8), (prime) => fraction(Math.sqrt(prime)))

const turn = (word: number, by: number): number => (word >>> by) | (word << (32 - by))

/** The message, a set bit, zeros, and its length in bits: whole blocks of 64 bytes (FIPS 180-4, 5.1.1). */
const pad = (message: Uint8Array): DataView => {
  const bytes = new Uint8Array(((message.length + 72) >> 6) << 6)
  bytes.set(message)
  bytes[message.length] = 0x80
  const view = new DataView(bytes.buffer)
  view.setUint32(bytes.length - 8, Math.floor(message.length / 2 ** 29))
  view.setUint32(bytes.length - 4, (message.length << 3) >>> 0)
  return view
}

/** Mixes one block of 64 bytes into the state (FIPS 180-4, 6.2.2). */
const mix = (state: Uint32Array, view: DataView, at: number, words: Uint32Array): void => {
  for (let i = 0; i < 16; i++) words[i] = view.getUint32(at + i * 4)
  for (let i = 16; i < 64; i++) {
    const old = words[i - 15] as number
    const late = words[i - 2] as number
    const small0 = turn(old, 7) ^ turn(old, 18) ^ (old >>> 3)
    const small1 = turn(late, 17) ^ turn(late, 19) ^ (late >>> 10)
    words[i] = ((words[i - 16] as number) + small0 + (words[i - 7] as number) + small1) | 0
  }
  let [a, b, c, d, e, f, g, h] = state as unknown as [number, number, number, number, number, number, number, number]
  for (let i = 0; i < 64; i++) {
    const big1 = turn(e, 6) ^ turn(e, 11) ^ turn(e, 25)
    const first = (h + big1 + ((e & f) ^ (~e & g)) + (ROUND[i] as number) + (words[i] as number)) | 0
    const big0 = turn(a, 2) ^ turn(a, 13) ^ turn(a, 22)
    const second = (big0 + ((a & b) ^ (a & c) ^ (b & c))) | 0
    h = g
    g = f
    f = e
    e = (d + first) | 0
    d = c
    c = b
    b = a
    a = (first + second) | 0
  }
  const step = [a, b, c, d, e, f, g, h]
  for (let i = 0; i < 8; i++) state[i] = (state[i] as number) + (step[i] as number)
}

/**
 * SHA-256 of a message, without any platform's cryptography, so that it gives the same in Node and in a browser at once.
 *
 * @param message any bytes, shorter than 2^53 bits
 * @returns 32 bytes
 * @source FIPS 180-4 (2015), sections 4.2.2, 5 and 6.2
 */
export const sha256 = (message: Uint8Array): Uint8Array => {
  const view = pad(message)
  const state = START.slice()
  const words = new Uint32Array(64)
  for (let at = 0; at < view.byteLength; at += 64) mix(state, view, at, words)
  const digest = new DataView(new ArrayBuffer(32))
  for (let i = 0; i < 8; i++) digest.setUint32(i * 4, state[i] as number)
  return new Uint8Array(digest.buffer)
}
