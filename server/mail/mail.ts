import type Handlebars from 'handlebars'
import runtime from 'handlebars/runtime.js'
import templates from '#server/generated/mails.js'
import { registerMailHelpers } from './helpers.ts'
import { MAIL_KINDS, type MailKind } from './kinds.ts'
import { plainly } from './plain.ts'
import { textTwin } from './text-twin.ts'
import type { MailViews } from './views.ts'

/** What a mail says. */
export interface RenderedMail {
  readonly subject: string
  readonly text: string
  readonly html: string
}

export interface MailFrame {
  /** From the configuration, never from a request. */
  readonly baseUrl: string
  readonly organisation: string
  /** The name of who gets it. */
  readonly to: string
}

export type RenderMail = <Kind extends MailKind>(kind: Kind, view: MailViews[Kind], frame: MailFrame) => RenderedMail

/** Items shown of a list; a mail says how many more there are. */
const SHOWN = 20

const LONGEST_SUBJECT = 150

/** Only what a view has itself is looked up. */
const OWN_ONLY = { allowProtoPropertiesByDefault: false, allowProtoMethodsByDefault: false }

/** A view's list cut to what is shown, with its length and what is left out. */
function withCount(view: object): object {
  const list = Object.entries(view).find(([name]) => ['remarks', 'instruments', 'installations'].includes(name))
  if (!list || !Array.isArray(list[1])) return view
  const [name, items] = list
  return { ...view, [name]: items.slice(0, SHOWN), total: items.length, more: Math.max(0, items.length - SHOWN) }
}

const STYLE = 'font-family: sans-serif; line-height: 1.5; max-width: 40em'

const asPage = (subject: string, body: string): string =>
  `<!DOCTYPE html>\n<html lang="en">\n<head><meta charset="utf-8"><title>${subject}</title></head>\n<body style="${STYLE}">\n${body}\n</body>\n</html>\n`

/** Makes the mails from their precompiled templates. Text of people is filled in, escaped, and nothing else. */
export function mailRenderer(): RenderMail {
  // The package declares no types for its runtime: it is the full engine without the compiler.
  const engine = (runtime as unknown as typeof Handlebars).create()
  registerMailHelpers(engine)
  for (const [name, specification] of Object.entries(templates.partials))
    engine.registerPartial(name, engine.template(specification()))

  return (kind, view, { baseUrl, organisation, to }) => {
    const { template, switchable } = MAIL_KINDS[kind]
    const specification = templates.pages[template]
    if (!specification) throw new Error(`There is no mail ${template}: generate the templates again.`)
    const words = plainly({ ...withCount(view), organisation, to })
    const page = engine.template(specification())({ ...words, switchable, baseUrl }, OWN_ONLY)
    const { subject: whole, text, body } = textTwin(page)
    const subject = [...whole].slice(0, LONGEST_SUBJECT).join('')
    return { subject, text, html: asPage(engine.escapeExpression(subject), body) }
  }
}
