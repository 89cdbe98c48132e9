import type { Judged } from '#core/engine.ts'
import type { Section } from './blocks.ts'
import { deadPoints } from './fieldsheet/dead.ts'
import { livePoints } from './fieldsheet/live.ts'
import { looks, whoAndWhen } from './fieldsheet/looks.ts'
import { settingPoints } from './fieldsheet/settings.ts'
import { stringPoints } from './fieldsheet/strings.ts'
import { transferPoints } from './fieldsheet/transfers.ts'
import { numbered, type ReportModel } from './model.ts'
import { capital } from './print.ts'
import { reportScene } from './scene.ts'
import { cautionLines } from './sections/cautions.ts'

/**
 * The sheet for the site: test points in the order of the work (dead, on the grid, in the island, through the
 * changeover), by place, each with the limit that its reading will be held against, and a box where there is none yet.
 */
export function fieldsheetModel(judged: Judged): ReportModel {
  const scene = reportScene(judged, { file: '', hash: '', draft: false })
  const { report, site } = judged.install
  const sections: readonly Section[] = [
    {
      anchor: 'sheet/before',
      title: 'Before you start',
      blocks: [
        { kind: 'notice', anchor: 'sheet/cautions', box: 'box-caution', paragraphs: [], items: cautionLines(scene) },
        whoAndWhen(scene),
      ],
    },
    { anchor: 'sheet/looks', title: 'Look', blocks: looks(scene) },
    { anchor: 'sheet/dead', title: 'Dead', blocks: deadPoints(scene) },
    { anchor: 'sheet/strings', title: 'Strings, inverter off', blocks: stringPoints(scene) },
    { anchor: 'sheet/grid', title: 'On the grid', blocks: livePoints(scene, 'grid') },
    { anchor: 'sheet/settings', title: 'Signals and settings', blocks: settingPoints(scene) },
    { anchor: 'sheet/island', title: 'In the island', blocks: livePoints(scene, 'island') },
    { anchor: 'sheet/transfers', title: 'Through the changeover, both ways', blocks: transferPoints(scene) },
  ]
  return {
    reference: report.reference,
    purpose: capital(report.purpose),
    site: site.name,
    subtitle: 'Field sheet: each test point, its limit, a box for the reading',
    titleLines: [site.address.join(', ')],
    front: [],
    sections: numbered(sections),
    end: `End of field sheet ${report.reference}`,
  }
}
