import type { Citation, Finding } from '#core/glossary.ts'
import { rulePage } from '#core/judge/pages.ts'
import { fieldsOf } from '#core/sheets/plans.ts'
import { labelOf, STATE_WORDS } from '#core/texts/label.ts'
import { joined } from '#core/texts/value.ts'
import { ruleTitle, ruleWordsFor } from '#core/texts/words.ts'
import { anchorOf } from './anchor.ts'
import type { FindingBlock } from './blocks.ts'
import { groupedBy } from './grouped-by.ts'
import { findingMark, isFailing } from './marks.ts'
import { capital, dateText, held } from './print.ts'
import type { ReportScene } from './scene.ts'
import { sure } from './sure.ts'

/** A source as printed: `IEC 60364-4-41:2005+A1:2017, 411.4.4`. */
export function citesText(cites: readonly Citation[]): string {
  return cites
    .map(({ publication, clause, note }) => {
      const place = clause === undefined ? publication : `${publication}, ${clause}`
      return note === undefined ? place : `${place} (${note})`
    })
    .join('; ')
}

/** The name under which a finding can be pointed at through all revisions. */
export function findingAnchor({ rule, subject, state }: Pick<Finding, 'rule' | 'subject' | 'state'>): string {
  return `rule/${rule}/${subject}/${state ?? 'always'}`
}

function missingWords({ sheet }: ReportScene, { subject, missing }: Finding): string {
  const fields = fieldsOf(sheet(subject).subject)
  return joined(missing.map((name) => sure(fields.get(name), `The field ${name}`).title))
}

function saysOf(scene: ReportScene, finding: Finding, key: string): { readonly says: string; readonly remedy: string } {
  const { parameters, units } = scene.judged.book
  if (isFailing(finding.verdict)) {
    const sheet = scene.sheet(finding.subject)
    const words = ruleWordsFor(key, { sheet, state: finding.state, parameters, units })
    const inside = finding.verdict === 'fails' ? '' : ' The limit lies inside the uncertainty of the reading.'
    return { says: held(capital(`${words.says}${inside}`)), remedy: held(words.do) }
  }
  if (finding.verdict === 'not shown') return { says: `Missing: ${missingWords(scene, finding)}.`, remedy: '' }
  if (finding.reason !== undefined) return { says: `Not tested: ${finding.reason}.`, remedy: '' }
  return { says: 'It holds as read, but not over the whole uncertainty of the reading.', remedy: '' }
}

/** What a finding is about, in words: `Circuit K1 (Cold store), in the island`. */
export function about({ sheet }: ReportScene, { subject, state }: Finding): string {
  const name = capital(labelOf(sheet(subject)))
  return state === null ? name : `${name}, ${STATE_WORDS[state]}`
}

function departureText({ departure }: Finding): string | undefined {
  return (
    departure && `Departs on purpose: ${departure.reason} (agreed by ${departure.agreed_by}, ${dateText(departure.on)})`
  )
}

function block(scene: ReportScene, finding: Finding): FindingBlock {
  const key = scene.ruleKey(finding.rule)
  const departure = departureText(finding)
  return {
    anchor: findingAnchor(finding),
    mark: findingMark(finding),
    about: about(scene, finding),
    subjects: [],
    title: `${ruleTitle(key)}.`,
    ...saysOf(scene, finding, key),
    rule: finding.rule,
    cites: citesText(rulePage(key).record.cites),
    place: `file, line ${scene.judged.locate(finding.path).line}`,
    ...(departure !== undefined && { departure }),
  }
}

/** Findings one by one, in words. */
export function findingBlocks(scene: ReportScene, findings: readonly Finding[]): FindingBlock[] {
  return findings.map((finding) => block(scene, finding))
}

const sameWords = ({ rule, verdict, missing, reason = '' }: Finding): string =>
  [rule, verdict, missing.join('+'), reason].join('\n')

/** Findings that would say the same, once for all their subjects. */
export function gatheredBlocks(scene: ReportScene, findings: readonly Finding[]): FindingBlock[] {
  return [...groupedBy(findings, sameWords).values()].map((group) => {
    const [first] = group
    if (group.length === 1) return block(scene, first)
    const subjects = group.map((finding) => ({
      anchor: findingAnchor(finding),
      name: finding.state === null ? finding.subject : `${finding.subject} ${STATE_WORDS[finding.state]}`,
    }))
    const missing = `${first.missing.join('+')}${first.reason ?? ''}`
    const anchor = anchorOf('rule', first.rule, first.verdict.replaceAll(/[ ,]+/g, '-'), missing)
    return { ...block(scene, first), anchor, about: `${group.length} subjects`, subjects, place: '' }
  })
}
