import { type Block, type Row, type Section, table } from '../blocks.ts'
import type { Issue } from '../issue.ts'
import { dateText } from '../print.ts'
import type { ReportContext, ReportScene } from '../scene.ts'

const ROLES = [
  ['designed_by', 'Designed by'],
  ['installed_by', 'Installed by'],
  ['tested_by', 'Tested by'],
] as const

const SIGNING = [
  ['reviewed_by', 'Reviewed by'],
  ['issued_by', 'Authorised by'],
] as const satisfies readonly (readonly [keyof Issue, string])[]

function signingRow(role: (typeof SIGNING)[number][0], title: string, { draft, issue }: ReportContext): Row {
  const signatory = issue?.[role]
  const name = signatory?.name ?? (draft ? 'not yet: this is a draft' : '')
  const cells = [{ text: name }, { text: signatory?.licence ?? '–' }, { text: issue?.organisation.name ?? '–' }]
  return { anchor: `person/${title.toLowerCase().replace(' ', '_')}`, head: { text: title }, cells }
}

/** Readings of another company are marked as such: the issuing body answers for them, but did not take them. */
function foreignReadings({ install, context: { issue } }: ReportScene): Block[] {
  const company = install.people?.tested_by?.company
  if (!issue || company === undefined || company === issue.organisation.name) return []
  const words = `The readings were taken by ${company}, not by the issuing body ${issue.organisation.name}.`
  return [{ kind: 'prose', anchor: 'people/readings', paragraphs: [words] }]
}

/** Who did what, who has still to sign, and what was handed over. */
export function people(scene: ReportScene): Section {
  const { install, context } = scene
  const named = ROLES.flatMap(([role, title]) => {
    const person = install.people?.[role]
    if (!person) return []
    const { name, licence, company } = person
    return [
      {
        anchor: `person/${role}`,
        head: { text: title },
        cells: [{ text: name }, { text: licence ?? '–' }, { text: company ?? '–' }],
      },
    ]
  })
  const signing = SIGNING.map(([role, title]) => signingRow(role, title, context))
  const columns = [
    { label: 'Role', width: 22 },
    { label: 'Name', width: 30 },
    { label: 'Licence', width: 20 },
    { label: 'Company', width: 28 },
  ]
  const { handover } = install
  const told: Block[] = handover
    ? [
        {
          kind: 'particulars',
          anchor: 'handover',
          title: 'Handover',
          beside: false,
          lists: [
            {
              entries: [
                {
                  anchor: 'handover/explained_to',
                  term: 'Explained to',
                  detail: handover.explained_to ?? 'not stated',
                },
                {
                  anchor: 'handover/on',
                  term: 'On',
                  detail: handover.on === undefined ? 'not stated' : dateText(handover.on),
                },
                {
                  anchor: 'handover/documents',
                  term: 'Documents',
                  detail: handover.documents?.join(', ') ?? 'none stated',
                },
              ],
            },
          ],
        },
      ]
    : []
  return {
    anchor: 'people',
    title: 'People',
    blocks: [table('people/list', columns, [{ rows: [...named, ...signing] }]), ...foreignReadings(scene), ...told],
  }
}
