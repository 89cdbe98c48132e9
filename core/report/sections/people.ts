import { type Block, type Section, table } from '../blocks.ts'
import { capital, dateText } from '../print.ts'
import type { ReportScene } from '../scene.ts'

const ROLES = [
  ['designed_by', 'Designed by'],
  ['installed_by', 'Installed by'],
  ['tested_by', 'Tested by'],
] as const

/** Who did what, who has still to sign, and what was handed over. */
export function people({ install, context }: ReportScene): Section {
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
  const open = { text: context.draft ? 'not yet: this is a draft' : '' }
  const signing = ['reviewed by', 'authorised by'].map((role) => ({
    anchor: `person/${role.replace(' ', '_')}`,
    head: { text: capital(role) },
    cells: [open, { text: '–' }, { text: '–' }],
  }))
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
    blocks: [table('people/list', columns, [{ rows: [...named, ...signing] }]), ...told],
  }
}
