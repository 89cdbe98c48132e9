import { atFailureLevel, countVerdicts, type ToldFinding } from '#core/report/told.ts'
import { plainNumber } from '#core/texts/number.ts'
import { joined } from '#core/texts/value.ts'
import type { Block, Section, Tile } from '../model.ts'
import { numberOn, type ReportScene, sheetsOf } from '../scene.ts'

const plural = (count: number, one: string, many: string): string => `${count} ${count === 1 ? one : many}`

/** Findings that fail at failure level. */
export const failing = ({ told }: ReportScene): readonly ToldFinding[] => told.filter(atFailureLevel)

const ofVerdict = ({ told }: ReportScene, verdict: ToldFinding['verdict']): readonly ToldFinding[] =>
  told.filter((finding) => finding.verdict === verdict && finding.severity === 'failure')

/** The three figures that a reader looks for first. */
export function tiles(scene: ReportScene): Tile[] {
  const { findings, install } = scene.judged
  const counts = countVerdicts(findings)
  const bad = failing(scene).length
  const open = ofVerdict(scene, 'not shown').length
  const battery = sheetsOf(scene, 'battery')
    .map((sheet) => numberOn(sheet, 'autonomy'))
    .find((hours) => hours !== undefined)
  const backedUp = sheetsOf(scene, 'circuit').filter(({ values }) => values['backed_up'] === true)
  const first = backedUp.slice(0, 4).map(({ id, values }) => `${id} ${String(values['serves'])}`)
  const more = backedUp.length - first.length
  return [
    {
      label: 'Outcome',
      figure: bad > 0 ? `${plural(bad, 'failure', 'failures')}` : open > 0 ? `${open} not shown` : 'Nothing fails',
      note: `${counts.meets + counts['meets, inside the uncertainty']} of ${findings.length - counts['not applicable']} verdicts met`,
      look: 'box-tint',
    },
    {
      label: 'Hours of supply from the held-back charge',
      figure: battery === undefined ? 'not stated' : `${plainNumber(Math.round(battery * 10) / 10)} h`,
      note: battery === undefined ? 'battery or loads are not stated' : 'at the mean backed-up load, without sun',
      look: 'box',
    },
    {
      label: 'What lives on in the island',
      figure: plural(backedUp.length, 'circuit', 'circuits'),
      note:
        backedUp.length === 0
          ? `Nothing of ${install.site.name} is backed up.`
          : `${joined(first)}${more > 0 ? ` and ${more} more` : ''}`,
      look: 'box-island',
    },
  ]
}

function verdictSentence(scene: ReportScene): string {
  const bad = failing(scene)
  const open = ofVerdict(scene, 'not shown')
  if (bad.length > 0)
    return `The report cannot be issued as it stands: ${plural(bad.length, 'rule fails', 'rules fail')} at failure level${open.length > 0 ? `, and ${open.length} cannot be shown for want of a reading or an entry` : ''}.`
  if (open.length > 0)
    return `Nothing fails. The report cannot be issued yet, since ${plural(open.length, 'rule is', 'rules are')} not shown for want of a reading or an entry.`
  return 'Nothing fails and everything is shown. The report can be issued once a second competent person has reviewed it.'
}

function standing(title: string, anchor: string, findings: readonly ToldFinding[], most: number): Block[] {
  if (findings.length === 0) return []
  const lines = findings
    .slice(0, most)
    .map(
      ({ subject, state, message }) =>
        `${subject}${state === null ? '' : state === 'grid' ? ' on the grid' : ' in the island'}: ${message}`,
    )
  const rest = findings.length - lines.length
  return [
    { anchor, heading: title },
    { anchor: `${anchor}/list`, list: rest > 0 ? [...lines, `and ${rest} more, listed under Findings`] : lines },
  ]
}

/** Whether the report can be issued, and what stands in the way. */
export function summary(scene: ReportScene): Section {
  const { told, judged } = scene
  const departures = told.filter(({ departure }) => departure !== undefined)
  return {
    anchor: 'summary',
    title: 'Summary',
    blocks: [
      { anchor: 'summary/verdict', paragraph: verdictSentence(scene) },
      ...standing('What fails', 'summary/fails', failing(scene), 8),
      ...standing('What is not shown', 'summary/not-shown', ofVerdict(scene, 'not shown'), 6),
      ...standing('What was not tested, with a reason', 'summary/limited', ofVerdict(scene, 'limited'), 8),
      ...standing(
        'What is met, but not over the whole uncertainty',
        'summary/inside',
        ofVerdict(scene, 'meets, inside the uncertainty'),
        6,
      ),
      ...standing('Departures that wait for the reviewer', 'summary/departures', departures, 8),
      ...(judged.install.report.remarks === undefined
        ? []
        : [{ anchor: 'summary/remarks', paragraph: judged.install.report.remarks }]),
    ],
  }
}
