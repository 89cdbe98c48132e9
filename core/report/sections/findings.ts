import type { Finding } from '#core/glossary.ts'
import type { Block, FindingBlock, Section } from '../blocks.ts'
import { findingBlocks, gatheredBlocks } from '../finding-blocks.ts'
import type { ReportScene } from '../scene.ts'
import type { Standing } from '../standing.ts'

const GROUPS: readonly {
  readonly name: keyof Pick<
    Standing,
    'failing' | 'departing' | 'notShown' | 'limited' | 'insideUncertainty' | 'cautions' | 'notes'
  >
  readonly title: string
  readonly lead: string
  /** The same in an issued report, where the reviewer has decided. */
  readonly decided?: string
  readonly tell: (scene: ReportScene, findings: readonly Finding[]) => FindingBlock[]
}[] = [
  { name: 'failing', title: 'Not met', lead: 'Each of these keeps the report from being issued.', tell: findingBlocks },
  {
    name: 'departing',
    title: 'Departures',
    lead: 'Not met on purpose. The reviewer accepts or refuses each.',
    decided: 'Not met on purpose, and accepted by the reviewer.',
    tell: findingBlocks,
  },
  {
    name: 'notShown',
    title: 'Not shown',
    lead: 'A reading or an entry is missing, and no reason is stated.',
    tell: gatheredBlocks,
  },
  {
    name: 'limited',
    title: 'Limited',
    lead: 'Missing for a stated reason, which the reviewer accepts or refuses.',
    decided: 'Missing for a stated reason, which the reviewer accepted.',
    tell: gatheredBlocks,
  },
  {
    name: 'insideUncertainty',
    title: 'Met, inside the uncertainty',
    lead: 'Met as read; the true value may lie beyond the limit.',
    tell: findingBlocks,
  },
  {
    name: 'cautions',
    title: 'Cautions',
    lead: 'An opinion for the reviewer to weigh. They do not keep the report from being issued.',
    tell: findingBlocks,
  },
  { name: 'notes', title: 'Notes', lead: 'An opinion, for information.', tell: findingBlocks },
]

/** Every finding that is not simply met, in words, with what to do and the source. */
export function findings(scene: ReportScene, standing: Standing): Section {
  const blocks = GROUPS.flatMap(({ name, title, lead, decided = lead, tell }): Block[] => {
    const found = standing[name]
    return found.length === 0
      ? []
      : [
          {
            kind: 'findings',
            anchor: `findings/${name}`,
            title,
            lead: scene.context.issue ? decided : lead,
            findings: tell(scene, found),
          },
        ]
  })
  const none: Block = { kind: 'prose', anchor: 'findings/none', paragraphs: ['Every rule that applies is met.'] }
  return { anchor: 'findings', title: 'Findings', blocks: blocks.length === 0 ? [none] : blocks }
}
