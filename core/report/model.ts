import type { Judged } from '#core/engine.ts'
import type { Block, Section } from './blocks.ts'
import type { Issue } from './issue.ts'
import { capital, daysText, timeText } from './print.ts'
import { type ReportContext, type ReportScene, reportScene } from './scene.ts'
import { arrays } from './sections/arrays.ts'
import { boards } from './sections/boards.ts'
import { cautions } from './sections/cautions.ts'
import { changeover } from './sections/changeover.ts'
import { circuits } from './sections/circuits.ts'
import { diagram } from './sections/diagram.ts'
import { extent } from './sections/extent.ts'
import { findings } from './sections/findings.ts'
import { frontTiles } from './sections/front.ts'
import { identity } from './sections/identity.ts'
import { inspection } from './sections/inspection.ts'
import { instruments } from './sections/instruments.ts'
import { inverters } from './sections/inverters.ts'
import { island } from './sections/island.ts'
import { issued } from './sections/issue.ts'
import { metering } from './sections/metering.ts'
import { method } from './sections/method.ts'
import { people } from './sections/people.ts'
import { residual } from './sections/residual.ts'
import { rulebook } from './sections/rulebook.ts'
import { rules } from './sections/rules.ts'
import { states } from './sections/states.ts'
import { summary } from './sections/summary.ts'
import { supply } from './sections/supply.ts'
import { tests } from './sections/tests.ts'
import { type Standing, standingOf } from './standing.ts'

/** A section with the number that it is printed under. */
export type NumberedSection = Section & { readonly number: number }

/** A report as the browser shows it and the paper prints it. */
export interface ReportModel {
  readonly reference: string
  readonly purpose: string
  readonly site: string
  readonly subtitle: string
  readonly titleLines: readonly string[]
  /** Of a report that takes the place of another: which, and why. */
  readonly replaces?: string
  readonly front: readonly Block[]
  readonly sections: readonly NumberedSection[]
  readonly end: string
}

const SECTIONS: readonly ((scene: ReportScene, standing: Standing) => Section)[] = [
  summary,
  issued,
  cautions,
  extent,
  supply,
  diagram,
  changeover,
  boards,
  circuits,
  tests,
  residual,
  arrays,
  inverters,
  island,
  metering,
  states,
  inspection,
  findings,
  instruments,
  people,
  method,
  rulebook,
  rules,
]

/** Sections that have something to show, numbered in the order of the page. */
export function numbered(sections: readonly Section[]): NumberedSection[] {
  return sections.filter(({ blocks }) => blocks.length > 0).map((section, index) => ({ ...section, number: index + 1 }))
}

function issueLines(issue: Issue | undefined): string[] {
  return issue ? [`Issued: ${timeText(issue.issued_at)}, by ${issue.organisation.name}`] : []
}

function replacesText({ number, reason }: { readonly number: string; readonly reason: string }): string {
  return `This report replaces ${number}: ${reason}`
}

/**
 * The report on a judged file: blocks with anchors that name what they are about, whatever their place on the page.
 *
 * @param judged a file that was read, computed and judged
 * @param context name and hash of the file, and whether the report is a draft
 */
export function reportModel(judged: Judged, context: ReportContext): ReportModel {
  const scene = reportScene(judged, context)
  const standing = standingOf(judged)
  const { report, site } = judged.install
  const { issue } = context
  return {
    reference: issue?.number ?? report.reference,
    purpose: capital(report.purpose),
    site: site.name,
    subtitle: 'Test report: photovoltaics, battery and automatic changeover',
    titleLines: [site.address.join(', '), `Inspected: ${daysText(report.inspected)}`, ...issueLines(issue)],
    ...(issue?.replaces && { replaces: replacesText(issue.replaces) }),
    front: [frontTiles(scene, standing), identity(scene)],
    sections: numbered(SECTIONS.map((section) => section(scene, standing))),
    end: `End of report ${issue?.number ?? report.reference}`,
  }
}
