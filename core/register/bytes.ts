/** Whether two runs of bytes are the same. Nothing here is secret, so it may stop at the first difference. */
export function equal(one: Uint8Array, other: Uint8Array): boolean {
  return one.length === other.length && one.every((byte, at) => byte === other[at])
}
