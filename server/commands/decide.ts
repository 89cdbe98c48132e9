import { type Refused, refuse } from '#server/http/problems.ts'
import { insertAcceptance } from '#server/queries/acceptances.ts'
import { reviewStanding } from './review-standing.ts'
import type { Stage } from './step-report.ts'

export interface Word {
  readonly anchor: string
  readonly wordsSha256: string
  readonly accepted: boolean
  readonly reason: string
}

/** Accepts or refuses one limitation or departure, in exactly the words that the newest revision has. */
export async function decide(stage: Stage, word: Word): Promise<Refused | undefined> {
  const { tx, actor, subject, now } = stage
  const { organisation, person } = actor
  if (!word.accepted && word.reason === '')
    return refuse('bad-request', undefined, {
      errors: [{ pointer: '/reason', message: 'A refusal needs its reason.' }],
    })
  const { decisions } = await reviewStanding(tx, organisation, subject)
  const meant = decisions.find(({ anchor }) => anchor === word.anchor)
  if (meant === undefined)
    return refuse('bad-request', undefined, {
      errors: [{ pointer: '/anchor', message: 'The newest revision has no limitation or departure at this place.' }],
    })
  if (meant.wordsSha256 !== word.wordsSha256)
    return refuse('conflict', 'The words have changed since they were read. Read them again and decide on them.', {
      more: { words: meant.words, words_sha256: meant.wordsSha256 },
    })
  await insertAcceptance(tx, {
    organisation,
    report: subject.report_id,
    revision: subject.revision,
    anchor: meant.anchor,
    words: meant.words,
    wordsSha256: meant.wordsSha256,
    accepted: word.accepted,
    reason: word.reason,
    person,
    now,
  })
  return undefined
}
