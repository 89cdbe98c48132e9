import type { Section } from '../blocks.ts'
import type { ReportScene } from '../scene.ts'

/** Cautions by what the installation has. Common practice; the one on the main switch is published by a trade body. */
export function cautionLines({ install }: Pick<ReportScene, 'install'>): string[] {
  const array = Object.keys(install.arrays ?? {}).length > 0
  const battery = Object.keys(install.batteries ?? {}).length > 0
  return [
    'Main switch off does not mean dead: when the grid is off, the changeover starts the island and the backed-up side stays live.',
    'Two sources: prove dead on both sides of the changeover, all poles, before touching anything.',
    ...(array ? ['Photovoltaics are live as long as it is light. Never part d.c. connectors under load.'] : []),
    ...(battery ? ['A battery is always live, and so are its terminals with the inverter switched off.'] : []),
    'Live work and d.c. work are for skilled persons, and never alone.',
    'After an outage, reset only as instructed at handover.',
  ]
}

/** What everybody who opens a board has to know first. */
export function cautions(scene: ReportScene): Section {
  return {
    anchor: 'cautions',
    title: 'Cautions',
    blocks: [
      {
        kind: 'notice',
        anchor: 'cautions/list',
        box: 'box-caution',
        paragraphs: [],
        items: cautionLines(scene),
      },
      {
        kind: 'prose',
        anchor: 'cautions/scope',
        quiet: true,
        paragraphs: ['Local codes and licensed practice come before anything printed here.'],
      },
    ],
  }
}
