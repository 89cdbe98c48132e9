import type { End, History } from './histories.ts'
import { sendPhoto } from './photos.ts'
import { after, fileOf } from './sites.ts'
import type { Stagehand } from './stage.ts'

/** Who does what in an organisation. */
export interface Cast {
  readonly organisation: string
  readonly mark: string
  readonly installer: string
  readonly reviewer: string
  readonly administrator: string
  /** Names and licences in the examples' files, and who stands for them here. */
  readonly names: Readonly<Record<string, string>>
}

/** One step of a report's life, at its moment. */
export interface Scene {
  readonly at: Date
  readonly play: () => Promise<unknown>
}

const REMARKS = [
  ['circuit/K1/loop/grid', 'question', 'Was the loop on the grid read at the far end of the cable?'],
  ['circuit/K1/continuity', 'remark', 'Please say where this was measured from.'],
  ['circuit/K1/insulation', 'question', 'Were the surge protective devices disconnected for this reading?'],
] as const

const wanted = (end: End, ...ends: readonly End[]): boolean => ends.includes(end)

/**
 * The scenes of one report, from its upload to where the demonstration leaves it. Scenes of all reports are played in
 * the order of time, since numbers and register follow it.
 */
export function scenesOf(
  stage: Stagehand,
  cast: Cast,
  [example, name, street, on, end]: History,
  index: number,
): Scene[] {
  const reference = `${cast.mark.slice(0, 2)}-${on.slice(0, 4)}-${String(index + 1).padStart(3, '0')}`
  const text = Object.entries(cast.names).reduce(
    (file, [name, other]) => file.replaceAll(name, other),
    fileOf({ example, reference, name, street, on }),
  )
  const by = (person: string, days: number, hour: number) => ({
    organisation: cast.organisation,
    person,
    at: after(on, days, hour),
  })
  const installer = (days: number, hour: number) => by(cast.installer, days, hour)
  const reviewer = (days: number, hour: number) => by(cast.reviewer, days, hour)
  let report = ''
  let second = ''
  const scenes: Scene[] = []
  const scene = (cue: { at: Date }, play: () => Promise<unknown>): void => {
    scenes.push({ at: cue.at, play })
  }
  const uploading = installer(1, 8)
  scene(uploading, async () => {
    report = await stage.upload(uploading, text, `${reference.toLowerCase()}.skerry.yaml`)
  })
  if (wanted(end, 'in review', 'returned', 'remarked')) {
    const photographing = installer(1, 8.5)
    scene(photographing, () =>
      sendPhoto(stage.services, photographing, {
        report,
        name: 'notice-mb.jpg',
        notice: 'Two supplies: island',
        breakers: 12 + index,
      }),
    )
  }
  if (end === 'draft') return scenes
  const sending = installer(1, 9)
  scene(sending, () => stage.submit(sending, report))
  if (end === 'in review') return scenes
  const reviewing = reviewer(3, 10)
  if (wanted(end, 'returned', 'remarked')) {
    const [anchor, kind, body] = REMARKS[index % REMARKS.length] ?? REMARKS[0]
    scene(reviewing, () => stage.remark(reviewing, report, anchor, end === 'returned' ? 'correction' : kind, body))
    scene(reviewing, () =>
      stage.review(reviewing, report, end === 'returned' ? 'returned' : 'remarks', 'Nearly there.'),
    )
    if (end === 'remarked') {
      const answering = installer(4, 7)
      scene(answering, () => stage.answer(answering, report, 'Yes: at the last socket, with the neutral link closed.'))
    }
    return scenes
  }
  scene(reviewing, () => stage.acceptAll(reviewing, report))
  scene(reviewing, () => stage.review(reviewing, report, 'approved', ''))
  if (end === 'approved') return scenes
  const issuing = reviewer(3, 11)
  scene(issuing, () => stage.issue(issuing, report))
  if (end === 'withdrawn') {
    const ending = by(cast.administrator, 40, 9)
    scene(ending, () => stage.withdraw(ending, report, 'The installation was taken down before it went into service.'))
  }
  if (end === 'corrected') {
    const correcting = installer(20, 8)
    scene(correcting, async () => {
      second = await stage.correct(correcting, report, 'The serial number of an instrument was mistyped.')
    })
    scene(correcting, () =>
      stage.revise(correcting, second, `${text}\n# Corrected: serial number read again from the instrument.\n`),
    )
    scene(correcting, () => stage.submit(correcting, second))
    const again = reviewer(22, 10)
    scene(again, () => stage.acceptAll(again, second))
    scene(again, () => stage.review(again, second, 'approved', ''))
    scene(again, () => stage.issue(again, second))
  }
  return scenes
}
