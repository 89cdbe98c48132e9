import type { Departure, Finding, Sheet, Span, State, Verdict } from '#core/glossary.ts'
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

function judgeOne(rule: Rule, sheet: Sheet, state: State | null, view: View, { tree, departures }: Case): Finding {
  const shown = rule.needs.every((name) => view.values[name] !== undefined)
  const missing = shown ? NONE : rule.needs.filter((name) => view.values[name] === undefined)
  const reason = missing.map((name) => limitationAt(tree, view.pathOf(name))).find((found) => found !== undefined)
  const verdict = shown ? verdictOf(rule, view) : reason === undefined ? 'not shown' : 'limited'
  const departure =
    verdict === 'meets'
      ? undefined
      : departures.find((candidate) => candidate.rule === rule.id && candidate.subject === sheet.id)
  return {
    ...plainly(rule, sheet, state, verdict),
    ...(verdict !== 'meets' && placesOf(shown || rule.at.length === 0 ? rule.at : missing, sheet, view)),
    ...(!shown && { missing }),
    ...(reason !== undefined && { reason }),
    ...(departure && { departure }),
  }
}

const NONE: readonly never[] = []

/** A finding that nobody needs to be led to: it points to its subject. */
function plainly(rule: Rule, sheet: Sheet, state: State | null, verdict: Verdict): Finding {
  const { id, severity } = rule
  return { rule: id, subject: sheet.id, state, verdict, severity, path: sheet.path, related: NONE, missing: NONE }
}

function placesOf(names: readonly string[], sheet: Sheet, view: View): Pick<Finding, 'path' | 'related'> {
  const [path = sheet.path, ...others] = names.map((name) => view.pathOf(name))
  const same = path.join('/')
  return { path, related: others.filter((other) => other.join('/') !== same) }
}

const statesOf = (rule: Rule): readonly (State | null)[] =>
  rule.state === 'each' ? STATES : rule.state === 'none' ? [null] : [rule.state]

/**
 * Judges every sheet by every rule of its subject.
 *
 * A rule that touches readings is judged at their values and at both ends of their intervals; where a needed field is
 * missing the verdict is `not shown`, or `limited` where the file states why. Rules whose `when` does not match leave a
 * finding `not applicable`, so that the counts add up to all that was looked at.
 */
export function judge(book: RuleBook, facts: Case): Finding[] {
  const bySubject = rulesBySubject(book)
  return facts.sheets.flatMap((sheet) => {
    const views = new Map<State | null, View>()
    const view = (state: State | null): View => {
      const made = views.get(state) ?? viewOf(sheet, state, book.parameters)
      views.set(state, made)
      return made
    }
    return (bySubject.get(sheet.subject) ?? []).flatMap((rule) =>
      statesOf(rule).map((state) => {
        const seen = view(state)
        if (!applies(rule, seen)) return plainly(rule, sheet, state, 'not applicable')
        return judgeOne(rule, sheet, state, seen, facts)
      }),
    )
  })
}

function applies({ when }: Rule, view: View): boolean {
  if (!when) return true
  const known = view.applies.get(when)
  if (known !== undefined) return known
  const holds = when(view.values)
  view.applies.set(when, holds)
  return holds
}

/** Rules by the subject that they are about. */
function rulesBySubject({ rules }: RuleBook): Map<Rule['subject'], Rule[]> {
  const groups = new Map<Rule['subject'], Rule[]>()
  for (const rule of rules) {
    const group = groups.get(rule.subject)
    if (group) group.push(rule)
    else groups.set(rule.subject, [rule])
  }
  return groups
}
