import type { Departure, Finding, Sheet, Span, State, Subject, Verdict } from '#core/glossary.ts'
import { STATES } from '#core/glossary.ts'
import { limitationAt } from './limitation.ts'
import type { Rule, RuleBook } from './rule.ts'
import { type View, viewOf } from './view.ts'

/** What judging needs to know of the file beside its sheets. */
export interface Case {
  readonly sheets: readonly Sheet[]
  /** The normalised file, in which stated reasons for missing readings are looked up. */
  readonly tree: unknown
  readonly departures: readonly Departure[]
}

/** How many readings of one rule are tried at both ends: 2^4 corners are the most that a rule has needed. */
const MOST_CORNERS = 4

/** Whether `must` holds at every corner, and at some corner, of the readings' intervals. The values are restored. */
function atTheEnds(
  rule: Rule,
  view: View,
  spans: readonly (readonly [string, Span])[],
): { all: boolean; some: boolean } {
  const { values } = view
  const kept = spans.map(([name]) => values[name])
  let [all, some] = [true, false]
  for (let corner = 0; corner < 2 ** spans.length; corner += 1) {
    spans.forEach(([name, span], index) => {
      values[name] = (corner >> index) % 2 === 0 ? span.low : span.high
    })
    const holds = rule.must(values)
    all &&= holds
    some ||= holds
  }
  spans.forEach(([name], index) => {
    const value = kept[index]
    if (value !== undefined) values[name] = value
  })
  return { all, some }
}

function verdictOf(rule: Rule, view: View): Verdict {
  const holds = rule.must(view.values)
  if (!rule.reads.some((name) => view.spanOf(name) !== undefined)) return holds ? 'meets' : 'fails'
  const spans = rule.reads.flatMap((name) => {
    const span = view.spanOf(name)
    return span ? [[name, span] as const] : []
  })
  const ends = atTheEnds(rule, view, spans.slice(0, MOST_CORNERS))
  if (holds) return ends.all ? 'meets' : 'meets, inside the uncertainty'
  return ends.some ? 'fails, inside the uncertainty' : 'fails'
}

/** One judgement to be made: a rule, in one of the states that it is about. */
interface Turn {
  readonly rule: Rule
  readonly state: State | null
}

const NONE: readonly never[] = []

/** A finding that nobody needs to be led to: it points to its subject. */
function plainly({ rule, state }: Turn, sheet: Sheet, verdict: Verdict): Finding {
  const { id, severity } = rule
  return { rule: id, subject: sheet.id, state, verdict, severity, path: sheet.path, related: NONE, missing: NONE }
}

function judgeOne(turn: Turn, sheet: Sheet, view: View, facts: Case): Finding {
  const { rule } = turn
  const { values } = view
  if (rule.when && !rule.when(values)) return plainly(turn, sheet, 'not applicable')
  if (rule.needs.some((name) => values[name] === undefined)) return notShown(turn, sheet, view, facts)
  const verdict = verdictOf(rule, view)
  if (verdict === 'meets') return plainly(turn, sheet, verdict)
  return { ...plainly(turn, sheet, verdict), ...placesOf(rule.at, sheet, view), ...departed(rule, sheet, facts) }
}

/** A needed field is missing, with a stated reason or without. */
function notShown(turn: Turn, sheet: Sheet, view: View, facts: Case): Finding {
  const { rule } = turn
  const missing = rule.needs.filter((name) => view.values[name] === undefined)
  const reason = missing.map((name) => limitationAt(facts.tree, view.pathOf(name))).find((found) => found !== undefined)
  return {
    ...plainly(turn, sheet, reason === undefined ? 'not shown' : 'limited'),
    ...placesOf(rule.at.length === 0 ? rule.at : missing, sheet, view),
    missing,
    ...(reason !== undefined && { reason }),
    ...departed(rule, sheet, facts),
  }
}

function departed(rule: Rule, sheet: Sheet, { departures }: Case): Pick<Finding, 'departure'> {
  const departure = departures.find((candidate) => candidate.rule === rule.id && candidate.subject === sheet.id)
  return departure ? { departure } : {}
}

function placesOf(names: readonly string[], sheet: Sheet, view: View): Pick<Finding, 'path' | 'related'> {
  const [path = sheet.path, ...others] = names.map((name) => view.pathOf(name))
  const same = path.join('/')
  return { path, related: others.filter((other) => other.join('/') !== same) }
}

const statesOf = ({ state }: Rule): readonly (State | null)[] =>
  state === 'each' ? STATES : state === 'none' ? [null] : [state]

const prepared = new WeakMap<RuleBook, ReadonlyMap<Subject, readonly Turn[]>>()

/** What a sheet of each kind is judged by, in the order of the book; worked out once for each book. */
function turnsOf(book: RuleBook): ReadonlyMap<Subject, readonly Turn[]> {
  const known = prepared.get(book)
  if (known) return known
  const turns = new Map<Subject, Turn[]>()
  for (const rule of book.rules) {
    const own = turns.get(rule.subject) ?? []
    turns.set(rule.subject, own)
    for (const state of statesOf(rule)) own.push({ rule, state })
  }
  prepared.set(book, turns)
  return turns
}

/**
 * Judges every sheet by every rule of its subject.
 *
 * A rule that touches readings is judged at their values and at both ends of their intervals; where a needed field is
 * missing the verdict is `not shown`, or `limited` where the file states why. Rules whose `when` does not match leave a
 * finding `not applicable`, so that the counts add up to all that was looked at.
 */
export function judge(book: RuleBook, facts: Case): Finding[] {
  const turns = turnsOf(book)
  const findings: Finding[] = []
  for (const sheet of facts.sheets) {
    const views = new Map<State | null, View>()
    for (const turn of turns.get(sheet.subject) ?? []) {
      const view = views.get(turn.state) ?? viewOf(sheet, turn.state, book.parameters)
      views.set(turn.state, view)
      findings.push(judgeOne(turn, sheet, view, facts))
    }
  }
  return findings
}
