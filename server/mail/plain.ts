/** Unseen signs: controls, line ends of every kind, and what turns or hides text. */
const UNSEEN = /[\p{Cc}\p{Cf}\p{Cs}\p{Zl}\p{Zp}]/gu

/** What mail programs turn into a link of its own accord. */
const ADDRESS = /(?:\b[a-z][a-z0-9+.-]{0,30}:\/\/|\bwww\.)\S*/giu

const LONGEST = 500

/**
 * What people wrote, as it may stand in a mail: one line, nothing unseen, at most 500 characters, and no address of
 * another site. Mails carry our name, so nobody may use one to send a stranger anywhere else.
 */
export function plain(text: string): string {
  const line = text.replace(/\s+/g, ' ').replace(UNSEEN, '').replace(ADDRESS, '[address left out]').trim()
  const signs = [...line]
  return signs.length <= LONGEST ? line : `${signs.slice(0, LONGEST - 1).join('')}…`
}

function plainValue(value: unknown): unknown {
  if (typeof value === 'string') return plain(value)
  if (Array.isArray(value)) return value.map(plainValue)
  if (typeof value !== 'object' || value === null || value instanceof Date) return value
  return plainly(value)
}

/** A view with all its text made plain; numbers, dates, and the order of everything stay. */
export const plainly = (view: object): Readonly<Record<string, unknown>> =>
  Object.fromEntries(Object.entries(view).map(([name, value]) => [name, plainValue(value)]))
