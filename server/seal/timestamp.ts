/** An authority that does not answer in this time keeps no report waiting. */
const PATIENCE = 10_000
const LARGEST = 65_536

/**
 * Asks a time-stamp authority over HTTP.
 *
 * @param url address of the authority
 * @returns what `seal` takes as `timestamp`
 * @source RFC 3161, 3.4
 */
export function timestampFrom(url: string): (request: Uint8Array) => Promise<Uint8Array> {
  return async (request) => {
    const answer = await fetch(url, {
      method: 'POST',
      headers: { 'content-type': 'application/timestamp-query' },
      body: new Uint8Array(request),
      signal: AbortSignal.timeout(PATIENCE),
      redirect: 'error',
    })
    if (!answer.ok) throw new RangeError(`The time-stamp authority answered with ${answer.status}.`)
    const bytes = new Uint8Array(await answer.arrayBuffer())
    if (bytes.length > LARGEST) throw new RangeError(`The time-stamp authority answered with ${bytes.length} bytes.`)
    return bytes
  }
}
