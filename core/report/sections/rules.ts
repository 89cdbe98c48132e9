import type { Finding, Verdict } from '#core/glossary.ts'
import { rulePage } from '#core/judge/pages.ts'
import type { ShippedRule } from '#core/judge/shipped.ts'
import { ruleTitle } from '#core/texts/words.ts'
import { type Names, type Row, type RowGroup, type Section, tables } from '../blocks.ts'
import { citesText } from '../finding-blocks.ts'
import { groupedBy } from '../grouped-by.ts'
import { WORST_FIRST } from '../marks.ts'
import { capital, few } from '../print.ts'
import type { ReportScene } from '../scene.ts'
import { sure } from '../sure.ts'

const MOST = 10

type ByRule = ReadonlyMap<string, readonly Finding[]>

/** Each verdict with its count and what it is about: `2 meets: K1, K2; 1 not applicable`. */
function verdictsText(findings: readonly Finding[]): string {
  const list = (verdict: Verdict): string[] => {
    const found = findings.filter((finding) => finding.verdict === verdict)
    if (found.length === 0) return []
    const names = [...new Set(found.map(({ subject }) => subject))]
    const where = verdict === 'not applicable' ? '' : `: ${few(names, MOST)}`
    return [`${found.length} ${verdict}${where}`]
  }
  return WORST_FIRST.flatMap(list).join('; ')
}

function ruleRow({ id, key, severity }: ShippedRule, found: readonly Finding[]): Row {
  return {
    anchor: `judged/${id}`,
    head: { text: ruleTitle(key), note: severity === 'failure' ? id : `${id} · ${severity}` },
    cells: [{ note: citesText(rulePage(key).record.cites) }, { text: verdictsText(found) }],
  }
}

interface Chapter {
  readonly title: string
  readonly rules: readonly ShippedRule[]
}

function byChapter(rules: readonly ShippedRule[]): Chapter[] {
  return [...groupedBy(rules, ({ key }) => rulePage(key).chapter)].map(([chapter, members]) => ({
    title: capital(chapter.replaceAll('-', ' ')),
    rules: members,
  }))
}

function chapterGroups(rules: readonly ShippedRule[], byRule: ByRule): RowGroup[] {
  return byChapter(rules).map(({ title, rules: members }) => ({
    title,
    rows: members.map((rule) => ruleRow(rule, sure(byRule.get(rule.id), rule.id))),
  }))
}

function idle(rules: readonly ShippedRule[]): Names[] {
  if (rules.length === 0) return []
  const groups = byChapter(rules).map(({ title, rules: members }) => ({
    title,
    names: members.map(({ id, key }) => ({ anchor: `judged/${id}`, name: ruleTitle(key), id })),
  }))
  const lead = 'Rules of the book that were looked at and found to be about nothing that is here.'
  return [{ kind: 'names', anchor: 'rules/idle', title: 'Rules that do not apply', lead, groups }]
}

const COLUMNS = [
  { label: 'Rule', width: 48 },
  { label: 'Source', width: 34 },
  { label: 'Verdicts', width: 18 },
] as const

/** Every rule that was judged, with its verdicts and its source; last those that apply to nothing here. */
export function rules({ judged }: ReportScene): Section {
  const byRule = groupedBy(judged.findings, ({ rule }) => rule)
  const applies = ({ id }: ShippedRule) => byRule.get(id)?.some(({ verdict }) => verdict !== 'not applicable') ?? false
  const judgedRules = judged.book.rules.filter(applies)
  const others = judged.book.rules.filter((rule) => !applies(rule))
  return {
    anchor: 'rules',
    title: 'Every rule judged',
    newPage: true,
    blocks: [...tables('rules/list', COLUMNS, chapterGroups(judgedRules, byRule)), ...idle(others)],
  }
}
