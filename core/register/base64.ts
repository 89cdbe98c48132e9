const SIGNS = 'ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz0123456789+/'
const BASE64 = /^(?:[A-Za-z0-9+/]{4})*(?:[A-Za-z0-9+/]{2}==|[A-Za-z0-9+/]{3}=)?$/

/**
 * Bytes as base64 text. Written out since core has no platform of its own: `btoa` is the browser's, `Buffer` Node's.
 *
 * @source RFC 4648, section 4
 */
export function base64Of(bytes: Uint8Array): string {
  const triples = Array.from({ length: Math.ceil(bytes.length / 3) }, (_, at) => bytes.subarray(at * 3, at * 3 + 3))
  const text = triples.map(([one = 0, two = 0, three = 0]) => {
    const bits = one * 65_536 + two * 256 + three
    return [18, 12, 6, 0].map((shift) => SIGNS.charAt((bits >> shift) & 63)).join('')
  })
  const padding = (3 - (bytes.length % 3)) % 3
  return text.join('').slice(0, Math.ceil((bytes.length * 4) / 3)) + '='.repeat(padding)
}

/** Base64 text as bytes; `undefined` where it is none. */
export function bytesFrom(text: string): Uint8Array | undefined {
  if (!BASE64.test(text)) return undefined
  const signs = text.replace(/=+$/, '')
  const bytes = new Uint8Array(Math.floor((signs.length * 3) / 4))
  let [bits, held, at] = [0, 0, 0]
  for (const sign of signs) {
    bits = ((bits << 6) | SIGNS.indexOf(sign)) & 0xffff
    held += 6
    if (held < 8) continue
    held -= 8
    bytes[at] = (bits >> held) & 0xff
    at += 1
  }
  return bytes
}
