import type { RuleRecord } from './rule.ts'

/** A parameter as a book states it. */
export interface ParameterRecord {
  readonly value: string | number | boolean | null
  readonly source: string
  readonly unit?: string
  readonly title?: string
}

/** `book.yaml`: what a folder of rules says of itself. */
export interface BookRecord {
  readonly id: string
  readonly title: string
  readonly version: string
  readonly note?: string
  /** The book that this one starts from; none for a base. */
  readonly extends?: string
  readonly parameters: Readonly<Record<string, ParameterRecord>>
  readonly off?: readonly { readonly rule: string; readonly reason: string }[]
  readonly chapters?: readonly string[]
}

/** A folder as read: its book.yaml and its chapters by name. */
export interface BookFolder {
  readonly book: BookRecord
  readonly chapters: Readonly<Record<string, readonly RuleRecord[]>>
}

/** A rule in a resolved book, with the chapter and the book that it came from. */
export interface PlacedRule {
  readonly record: RuleRecord
  readonly chapter: string
  readonly from: string
}

/** A book with everything that it inherits. */
export interface ResolvedBook {
  readonly id: string
  readonly title: string
  readonly version: string
  readonly note: string
  /** Ids from the base down to this book. */
  readonly lineage: readonly string[]
  readonly parameters: Readonly<Record<string, ParameterRecord>>
  readonly rules: readonly PlacedRule[]
  readonly off: readonly { readonly rule: string; readonly reason: string; readonly by: string }[]
}

/** What is wrong with a book, in words for the person who wrote it. */
export interface BookProblem {
  readonly book: string
  readonly message: string
}

export type Resolution =
  | { readonly ok: true; readonly book: ResolvedBook }
  | { readonly ok: false; readonly problems: readonly BookProblem[] }

function placed(folder: BookFolder): PlacedRule[] {
  return Object.entries(folder.chapters).flatMap(([chapter, records]) =>
    records.map((record) => ({ record, chapter, from: folder.book.id })),
  )
}

function repeated(rules: readonly PlacedRule[]): string[] {
  const ids = rules.map(({ record }) => record.id)
  return [...new Set(ids.filter((id, index) => ids.indexOf(id) !== index))]
}

function baseOf(folder: BookFolder): Resolution {
  const rules = placed(folder)
  const problems = repeated(rules).map((id) => ({
    book: folder.book.id,
    message: `Two rules are called ${id}: give one of them another name.`,
  }))
  if (problems.length > 0) return { ok: false, problems }
  const { id, title, version, note = '', parameters } = folder.book
  return { ok: true, book: { id, title, version, note, lineage: [id], parameters, rules, off: [] } }
}

function overlayProblems({ book, chapters }: BookFolder, base: ResolvedBook): string[] {
  const known = new Set(base.rules.map(({ record }) => record.id))
  const own = placed({ book, chapters })
  return [
    ...repeated(own).map((id) => `Two rules are called ${id}: give one of them another name.`),
    ...Object.keys(book.parameters)
      .filter((name) => !Object.hasOwn(base.parameters, name))
      .map(
        (name) =>
          `The parameter ${name} is unknown to ${base.id}. It knows: ${Object.keys(base.parameters).join(', ')}.`,
      ),
    ...(book.off ?? [])
      .filter(({ rule }) => !known.has(rule))
      .map(({ rule }) => `Cannot switch off ${rule}: ${base.id} has no such rule.`),
    ...own
      .filter(({ record }) => known.has(record.id) && record.replaces_because === undefined)
      .map(
        ({ record }) =>
          `${record.id} takes the place of the rule of ${base.id} without a reason: add replaces_because.`,
      ),
    ...own
      .filter(({ record }) => !known.has(record.id) && record.replaces_because !== undefined)
      .map(({ record }) => `${record.id} says that it replaces a rule, but ${base.id} has none of that name.`),
  ]
}

/** Puts an overlay on a resolved book: its parameters, what it switches off, replaces and adds. */
export function overlayOn(folder: BookFolder, base: ResolvedBook): Resolution {
  const messages = overlayProblems(folder, base)
  if (messages.length > 0)
    return { ok: false, problems: messages.map((message) => ({ book: folder.book.id, message })) }
  const { book } = folder
  const own = placed(folder)
  const replacing = new Map(own.map((rule) => [rule.record.id, rule]))
  const off = (book.off ?? []).map(({ rule, reason }) => ({ rule, reason, by: book.id }))
  const without = new Set(off.map(({ rule }) => rule))
  const kept = base.rules.filter(({ record }) => !without.has(record.id))
  const inherited = kept.map((rule) => replacing.get(rule.record.id) ?? rule)
  const added = own.filter(({ record }) => record.replaces_because === undefined)
  const parameters = Object.fromEntries(
    Object.entries(base.parameters).map(([name, parameter]) => [name, { ...parameter, ...book.parameters[name] }]),
  )
  return {
    ok: true,
    book: {
      id: book.id,
      title: book.title,
      version: book.version,
      note: book.note ?? '',
      lineage: [...base.lineage, book.id],
      parameters,
      rules: [...inherited, ...added],
      off: [...base.off, ...off],
    },
  }
}

/**
 * Resolves a book: the base it extends, its own parameters, what it replaces, switches off and adds.
 *
 * @param id the book wanted
 * @param folders every folder at hand, by book id
 * @param seen books on the way here, to stop a circle
 */
export function resolveBook(
  id: string,
  folders: ReadonlyMap<string, BookFolder>,
  seen: readonly string[] = [],
): Resolution {
  const folder = folders.get(id)
  if (!folder)
    return {
      ok: false,
      problems: [{ book: id, message: `There is no rule book ${id}. At hand: ${[...folders.keys()].join(', ')}.` }],
    }
  if (seen.includes(id))
    return {
      ok: false,
      problems: [{ book: id, message: `The books extend each other in a circle: ${[...seen, id].join(' → ')}.` }],
    }
  if (folder.book.extends === undefined) return baseOf(folder)
  const base = resolveBook(folder.book.extends, folders, [...seen, id])
  return base.ok ? overlayOn(folder, base.book) : base
}
