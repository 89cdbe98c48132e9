import type { Checked, Judged } from '#core/engine.ts'
import type { Check } from '#core/register/signing.ts'
import type { Carried } from './embedded.ts'

/** The engine, handed in: it stands beside what verifies. */
export interface Engine {
  readonly judge: (text: string) => Checked
  readonly facts: (judged: Judged) => string
  readonly verdicts: (judged: Judged) => Readonly<Record<string, string>>
}

/** A quantity or a verdict that came out differently. */
export interface Difference {
  readonly kind: 'quantity' | 'verdict'
  /** `circuit K1: loop_limit`, or the anchor of a finding. */
  readonly about: string
  readonly issued: string
  readonly now: string
}

export interface Recomputed {
  readonly checks: readonly Check[]
  readonly differences: readonly Difference[]
  /** Of a file that could be judged by the very rule book that it was issued by. */
  readonly judged?: Judged
}

type Values = ReadonlyMap<string, string>

const isObject = (value: unknown): value is Readonly<Record<string, unknown>> =>
  typeof value === 'object' && value !== null

function parsed(text: string): unknown {
  try {
    return JSON.parse(text)
  } catch (error) {
    if (error instanceof SyntaxError) return undefined
    throw error
  }
}

const entriesOf = (value: unknown): [string, unknown][] => (isObject(value) ? Object.entries(value) : [])

/** Each quantity by its subject and name, as text; nothing where the text is no such list. */
function quantities(text: string): Values {
  return new Map(
    entriesOf(parsed(text)).flatMap(([subject, facts]) =>
      entriesOf(facts).map(([name, fact]) => [`${subject}: ${name}`, JSON.stringify(fact)] as const),
    ),
  )
}

function differing(kind: Difference['kind'], issued: Values, now: Values): Difference[] {
  return [...new Set([...issued.keys(), ...now.keys()])].flatMap((about) => {
    const [before, after] = [issued.get(about) ?? 'not there', now.get(about) ?? 'not there']
    return before === after ? [] : [{ kind, about, issued: before, now: after }]
  })
}

const counted = (count: number, one: string, many: string): string => `${count} ${count === 1 ? one : many}`

function factsCheck(differences: readonly Difference[], same: boolean): Check {
  const says = same
    ? 'Computed anew, every quantity is as it was issued.'
    : `Computed anew, ${counted(differences.length, 'quantity differs', 'quantities differ')} from what was issued.`
  return { id: 'quantities', holds: same, says }
}

function verdictCheck(differences: readonly Difference[]): Check {
  const holds = differences.length === 0
  const says = holds
    ? 'Judged anew, every verdict is as it was issued.'
    : `Judged anew, ${counted(differences.length, 'verdict differs', 'verdicts differ')} from what was issued.`
  return { id: 'verdicts', holds, says }
}

function bookCheck({ book }: Judged, { rulebook }: Carried['record']): Check {
  if (book.hash === rulebook.hash) {
    return {
      id: 'rulebook',
      holds: true,
      says: `The rule book is that of the issue: ${book.id} ${book.version}, SHA-256 ${book.hash}.`,
    }
  }
  return {
    id: 'rulebook',
    holds: true,
    open: true,
    says: `The report was issued by rule book ${rulebook.id} ${rulebook.version} (SHA-256 ${rulebook.hash}). This version of Skerry has ${book.id} ${book.version} (SHA-256 ${book.hash}), and judged by that.`,
  }
}

/** Computes and judges the embedded file anew, and compares with what was issued. */
export function recompute({ source, facts, record }: Carried, engine: Engine): Recomputed {
  const checked = engine.judge(source.text)
  if (checked.kind !== 'judged') {
    const [first] = checked.problems
    const says = `This version of Skerry cannot judge the embedded file: ${first?.message ?? 'no reason was given'}`
    return { checks: [{ id: 'quantities', holds: false, says }], differences: [] }
  }
  const now = engine.facts(checked)
  const quantitiesDiffering = differing('quantity', quantities(facts.text), quantities(now))
  const verdictsDiffering = differing(
    'verdict',
    new Map(Object.entries(record.verdicts)),
    new Map(Object.entries(engine.verdicts(checked))),
  )
  const book = bookCheck(checked, record)
  return {
    checks: [factsCheck(quantitiesDiffering, now === facts.text), book, verdictCheck(verdictsDiffering)],
    differences: [...quantitiesDiffering, ...verdictsDiffering],
    ...(!book.open && { judged: checked }),
  }
}
