import { STATES } from '#core/glossary.ts'
import { STATE_WORDS } from '#core/texts/label.ts'
import type { Section } from '../blocks.ts'
import { capital } from '../print.ts'
import type { ReportScene } from '../scene.ts'
import { singleLine } from '../single-line.ts'

const CAPTIONS = {
  grid: 'Everything is fed by the public grid; inverters run beside it.',
  island: 'The changeover is open. Dead parts are dashed; what the island feeds is in ink.',
} as const

/** The installation as a single-line diagram, in both states. */
export function diagram({ install, topology }: ReportScene): Section {
  return {
    anchor: 'diagram',
    title: 'Single-line diagram',
    blocks: [
      {
        kind: 'figures',
        anchor: 'diagram/states',
        figures: STATES.map((state) => ({
          kind: 'figure',
          anchor: `diagram/${state}`,
          svg: singleLine({ install, topology }, state),
          caption: `${capital(STATE_WORDS[state])}. ${CAPTIONS[state]}`,
        })),
      },
    ],
  }
}
