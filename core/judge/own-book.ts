import { Ajv2020 } from 'ajv/dist/2020.js'
import { fieldsOf, stateFieldsOf } from '#core/sheets/plans.ts'
import { learnWords } from '#core/texts/words.ts'
import ruleSchema from '#schemas/rule.schema.json' with { type: 'json' }
import { AJV_RULE_SETTINGS } from './ajv-settings.ts'
import { type BookFolder, overlayOn, type PlacedRule, type ResolvedBook } from './book.ts'
import { lintRule } from './lint.ts'
import { bookPage, bookPages, rulePage, shelve } from './pages.ts'
import type { Check, SheetSchema } from './rule.ts'
import { SHIPPED_BOOKS, type ShippedBook, type ShippedRule } from './shipped.ts'
import { firstCite, keyOf, storedBook, storedRule } from './stored.ts'

export type OwnBook =
  | { readonly ok: true; readonly book: ShippedBook }
  | { readonly ok: false; readonly problems: readonly string[] }

/** The rules' own engine for schemas that were not there when Skerry was built. */
function compiler(): (schema: SheetSchema) => Check {
  const ajv = new Ajv2020(AJV_RULE_SETTINGS)
  return (schema) => ajv.compile(schema)
}

/** What is wrong with the records of an overlay: their shape, their names, their schemas. */
function recordProblems({ chapters }: BookFolder, base: ResolvedBook): string[] {
  const validate = new Ajv2020({ allErrors: true }).compile(ruleSchema)
  const compile = compiler()
  const parameters = new Set(Object.keys(base.parameters))
  return Object.entries(chapters).flatMap(([chapter, records]) =>
    records.flatMap((record, index) => {
      const at = `${chapter}.yaml, rule ${index + 1}${typeof record?.id === 'string' ? ` (${record.id})` : ''}`
      if (!validate(record))
        return (validate.errors ?? []).map((error) => `${at}: ${error.instancePath} ${error.message}`)
      const faults = [
        ...lintRule(record, { fieldsOf, stateFieldsOf, parameters }),
        ...schemaFaults(record.must, compile),
        ...schemaFaults(record.when, compile),
      ]
      return faults.map((fault) => `${at}: ${fault}`)
    }),
  )
}

function schemaFaults(schema: SheetSchema | undefined, compile: (schema: SheetSchema) => Check): string[] {
  if (!schema) return []
  try {
    compile(schema)
    return []
  } catch (error) {
    return [error instanceof Error ? error.message : String(error)]
  }
}

function resolvedParent(id: string): ResolvedBook | undefined {
  const page = bookPage(id)
  return page && { ...page, rules: page.keys.map(rulePage) }
}

function teach(rules: readonly PlacedRule[]): void {
  for (const rule of rules) {
    const { title, says, do: what } = rule.record
    learnWords(keyOf(rule), { title, cite: firstCite(rule.record), says, do: what })
  }
}

/**
 * Makes a rule book of one's own ready to judge by: an overlay on a book that ships, compiled here and now.
 *
 * @param folder its book.yaml and chapters, as parsed
 * @returns the book, or everything that is wrong with it in words for the person who wrote it
 */
export function ownBook(folder: BookFolder): OwnBook {
  const parent = folder.book.extends ?? ''
  const base = resolvedParent(parent)
  if (!base)
    return {
      ok: false,
      problems: [
        `book.yaml: extends must name one of ${bookPages()
          .map(({ id }) => id)
          .join(', ')}; found “${parent}”.`,
      ],
    }
  if (SHIPPED_BOOKS.includes(folder.book.id))
    return {
      ok: false,
      problems: [`book.yaml: the name ${folder.book.id} is taken by a book that ships. Choose another id.`],
    }
  const problems = recordProblems(folder, base)
  if (problems.length > 0) return { ok: false, problems }
  const resolution = overlayOn(folder, base)
  if (!resolution.ok) return { ok: false, problems: resolution.problems.map(({ message }) => message) }
  const { book } = resolution
  const own = book.rules.filter(({ from }) => from === book.id)
  teach(own)
  const { rules, ...page } = book
  shelve(
    { ...page, keys: rules.map(keyOf) },
    rules.map((rule) => ({ ...rule, key: keyOf(rule) })),
  )
  return { ok: true, book: { ...storedBook(book, () => 0), rules: compiled(rules) } }
}

function compiled(rules: readonly PlacedRule[]): ShippedRule[] {
  const compile = compiler()
  const schemas = new Map<string, SheetSchema>()
  const nameOf = (schema: SheetSchema): string => {
    const name = `s${schemas.size}`
    schemas.set(name, schema)
    return name
  }
  const checkNamed = (name: string): Check => compile(schemas.get(name) ?? {})
  return rules.map((rule) => {
    const stored = storedRule(rule, nameOf)
    return {
      ...stored,
      when: stored.when === null ? undefined : checkNamed(stored.when),
      must: checkNamed(stored.must),
    }
  })
}
