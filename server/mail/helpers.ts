import type Handlebars from 'handlebars'

const DAY = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'long', year: 'numeric', timeZone: 'UTC' })
const TIME = new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit', timeZone: 'UTC' })

/** `4 May 2026` for `2026-05-04`. */
const day = (date: string): string => DAY.format(new Date(`${date}T00:00:00Z`))

/** `4 May 2026, 10:15 UTC`. */
const moment = (time: Date): string => `${DAY.format(time)}, ${TIME.format(time)} UTC`

/** `1 remark`, `3 remarks`, `2 entries`. */
const count = (number: number, one: string, many: unknown): string =>
  `${number} ${number === 1 ? one : typeof many === 'string' ? many : `${one}s`}`

/** `installer`, `installer and reviewer`, `installer, reviewer and auditor`. */
const list = (items: readonly string[]): string => new Intl.ListFormat('en-GB').format(items)

/** Joins what it is given; the last argument is the engine's own. */
const line = (...given: unknown[]): string => given.slice(0, -1).map(String).join('')

/** Teaches an engine the helpers of the mails. `baseUrl` is where all links lead. */
export function registerMailHelpers(engine: typeof Handlebars): void {
  engine.registerHelper('day', day)
  engine.registerHelper('moment', moment)
  engine.registerHelper('count', count)
  engine.registerHelper('list', list)
  engine.registerHelper('line', line)
  engine.registerHelper('address', (path: string, { data }: Handlebars.HelperOptions) => {
    const address = engine.escapeExpression(addressOf(String(data['root']['baseUrl']), path))
    return new engine.SafeString(`<a href="${address}">${address}</a>`)
  })
}

/** The address of a page of ours; throws where a path would lead to another site. */
export function addressOf(baseUrl: string, path: string): string {
  const base = new URL(baseUrl)
  const address = new URL(`${base.pathname.replace(/\/$/, '')}${path}`, base)
  if (!path.startsWith('/') || address.origin !== base.origin || address.username !== '')
    throw new Error('A mail links to our own pages only.')
  return address.href
}
