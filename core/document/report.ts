import type { Judged } from '#core/engine.ts'
import { toldFindings } from '#core/report/told.ts'
import type { ReportModel, Section } from './model.ts'
import type { ReportScene } from './scene.ts'
import { arrays, circuits, residualCurrent } from './sections/circuits.ts'
import { cautions, departures, findings, method, parameters, rules } from './sections/findings.ts'
import { diagram, island, premises, sources } from './sections/installation.ts'
import { inspection, states } from './sections/states.ts'
import { summary, tiles } from './sections/summary.ts'

/** What a report is told beside the judged file. */
export interface ReportContext {
  /** The file's name, without folders. */
  readonly file: string
  /** SHA-256 of its text, in hex. */
  readonly sourceHash: string
}

const PURPOSES = {
  'initial verification': 'Initial verification',
  'periodic verification': 'Periodic verification',
  alteration: 'Verification of an alteration',
} as const

/** The report as blocks with stable anchors. */
export function reportModel(judged: Judged, { file, sourceHash }: ReportContext): ReportModel {
  const scene: ReportScene = { judged, told: toldFindings(judged), file, sourceHash }
  const { report, site, readings } = judged.install
  const sections: readonly (Section | undefined)[] = [
    summary(scene),
    cautions(),
    premises(scene),
    diagram(scene),
    sources(scene),
    circuits(scene),
    residualCurrent(scene),
    arrays(scene),
    states(scene),
    island(scene),
    inspection(scene),
    findings(scene),
    departures(scene),
    method(scene),
    rules(scene),
    parameters(scene),
  ]
  const half = readings === undefined ? 'Design report' : 'Test report'
  return {
    title: site.name,
    kicker: `${PURPOSES[report.purpose]} · ${report.reference}`,
    lead: `${half} for an installation with photovoltaics, a battery and automatic changeover`,
    place: `${site.address.join(', ')}${report.inspected ? ` · inspected ${report.inspected.from}${report.inspected.to ? ` to ${report.inspected.to}` : ''}` : ''}`,
    tiles: tiles(scene),
    sections: sections.filter((section) => section !== undefined).filter(({ blocks }) => blocks.length > 0),
    end: 'End of the report',
  }
}
