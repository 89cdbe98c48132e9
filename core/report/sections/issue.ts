import { parseCheckpoint } from '#core/register/checkpoint.ts'
import { type Block, type Entry, type Section, table } from '../blocks.ts'
import type { Issue } from '../issue.ts'
import { capital, timeText } from '../print.ts'
import type { ReportScene } from '../scene.ts'
import { grouped } from './identity.ts'

function acceptedBlocks({ accepted }: Issue): Block[] {
  const rows = accepted.map(({ kind, anchor, words, by, on, reason }) => ({
    anchor: `accepted/${anchor}`,
    head: { text: capital(kind) },
    cells: [
      { text: words, ...(reason !== undefined && { note: `The reviewer: “${reason}”` }) },
      { text: by, note: timeText(on) },
    ],
  }))
  const columns = [
    { label: 'Kind', width: 14 },
    { label: 'What was accepted, in these words', width: 62 },
    { label: 'Accepted by', width: 24 },
  ]
  if (rows.length > 0) return [table('issue/accepted', columns, [{ rows }], 'Accepted by the reviewer')]
  const paragraphs = ['There was no departure and no limitation to accept.']
  return [{ kind: 'prose', anchor: 'issue/accepted', title: 'Accepted by the reviewer', paragraphs }]
}

function registerEntries({ register }: Issue): Entry[] {
  const { entry, index } = register
  const parsed = parseCheckpoint(register.checkpoint)
  const head: Entry[] = parsed.ok
    ? [
        {
          anchor: 'issue/checkpoint',
          term: 'Checkpoint',
          detail: `${parsed.checkpoint.size} entries at ${timeText(parsed.checkpoint.at)}`,
          note: `Root ${grouped(parsed.checkpoint.root)}`,
        },
      ]
    : []
  return [
    { anchor: 'issue/register', term: 'Register', detail: entry.organisation },
    { anchor: 'issue/entry', term: 'Entry', detail: `number ${index + 1}: issued, revision ${entry.revision}` },
    ...head,
  ]
}

function howToCheck({ check_address }: Issue): string[] {
  return [
    `At ${check_address} anybody can check this report by its number or its file, and see whether another has taken its place.`,
    'Without a network, “skerry verify” checks the seal over every byte, the embedded file and quantities, the verdicts, and the place in the register. The seal is a signature (PAdES) that common readers and OpenSSL verify too. A printed copy proves nothing: ask for the file.',
  ]
}

/** What was accepted and by whom, where the report stands in the register, and how to prove it genuine. */
export function issued({ context: { issue } }: ReportScene): Section {
  const blocks: Block[] = issue
    ? [
        ...acceptedBlocks(issue),
        {
          kind: 'particulars',
          anchor: 'issue/place',
          title: 'Place in the register',
          beside: false,
          lists: [{ entries: registerEntries(issue) }],
        },
        { kind: 'prose', anchor: 'issue/check', title: 'How to check it', paragraphs: howToCheck(issue) },
      ]
    : []
  return { anchor: 'issue', title: 'Acceptance, register and check', blocks }
}
