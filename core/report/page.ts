import type Handlebars from 'handlebars'
import runtime from 'handlebars/runtime.js'
import templates from '#core/generated/templates.js'

/** The package declares no types for its runtime: it is the full engine without the compiler. */
const engine = (runtime as unknown as typeof Handlebars).create()
/** Only what a model has itself is looked up. */
const OWN_ONLY = { allowProtoPropertiesByDefault: false, allowProtoMethodsByDefault: false }

type Page = (model: object, options?: typeof OWN_ONLY) => string
const pages = new Map<string, Page>()

/** Words of our own: escaped, then `I_b` with its b below the line. */
function words(text: string): Handlebars.SafeString {
  const escaped = engine.escapeExpression(text)
  return new engine.SafeString(escaped.replace(/_([A-Za-z0-9]+)/g, '<sub>$1</sub>'))
}

function open(name: string): Page {
  if (pages.size === 0) {
    engine.registerHelper('words', words)
    for (const [partial, specification] of Object.entries(templates.partials))
      engine.registerPartial(partial, engine.template(specification()))
  }
  const specification = templates.pages[name]
  if (!specification) throw new Error(`There is no page ${name}: generate the templates again.`)
  const page = engine.template<object>(specification())
  pages.set(name, page)
  return page
}

/**
 * Fills a page from a model: the HTML that the browser shows and the paper is set from.
 *
 * @param name a page of `templates/`
 * @param model own properties only are looked up; their text is escaped and never read as a template
 */
export function fillPage(name: 'report' | 'fieldsheet', model: object): string {
  return (pages.get(name) ?? open(name))(model, OWN_ONLY)
}
