import type { Step } from '#core/policy/states.ts'
import { addRevision } from '#server/commands/add-revision.ts'
import { answerThread, beginThread } from '#server/commands/annotate.ts'
import { decide } from '#server/commands/decide.ts'
import { correctReport, withdrawReport } from '#server/commands/end-report.ts'
import { issueReport } from '#server/commands/issue-report.ts'
import { judgeSource } from '#server/commands/judge-source.ts'
import { reviewStanding } from '#server/commands/review-standing.ts'
import { askForReview, type Stage, step } from '#server/commands/step-report.ts'
import { submitReview } from '#server/commands/submit-review.ts'
import { writing } from '#server/db.ts'
import { isRefused, type Refused } from '#server/http/problems.ts'
import type { Answer } from '#server/http/route.ts'
import { enterAs } from '#server/queries/actor.ts'
import { writeAudit } from '#server/queries/audit.ts'
import { findReport, insertReport, insertRevision } from '#server/queries/reports.ts'
import { findThread, listThreads } from '#server/queries/threads.ts'
import type { Services } from '#server/services.ts'

/** Who acts, and when. */
export interface Cue {
  readonly organisation: string
  readonly person: string
  readonly at: Date
}

type Deed = (stage: Stage) => Promise<Answer | Refused | string | undefined>

/** Plays what people do, by the server's own commands and at moments of the past, one transaction and audit event each. */
export class Stagehand {
  constructor(readonly services: Services) {}

  /** Does one thing to a report as one person. A refusal is a fault of the story. */
  async act({ organisation, person, at }: Cue, report: string, action: string, deed: Deed): Promise<Answer> {
    return await writing(this.services.db, async (tx) => {
      const actor = await enterAs(tx, organisation, person)
      const subject = await findReport(tx, organisation, report)
      if (actor === undefined || subject === undefined)
        throw new Error(`The story names somebody or something unknown: ${report}`)
      const services = { ...this.services, clock: () => at }
      const done = await deed({ tx, actor, subject, now: at, services })
      if (typeof done === 'object' && isRefused(done))
        throw new Error(
          `${action}: ${done.refused} ${done.detail ?? ''} ${JSON.stringify(done.more ?? done.errors ?? '')}`,
        )
      const answer = typeof done === 'object' ? done : {}
      await writeAudit(tx, {
        organisation,
        person,
        roles: actor.roles,
        action,
        subject: `report/${report}`,
        at,
        request: 'seed',
        address: 'seed',
        details: answer.audit ?? {},
      })
      return answer
    })
  }

  async upload({ organisation, person, at }: Cue, text: string, fileName: string): Promise<string> {
    const source = Buffer.from(text)
    const judged = judgeSource(source)
    if (!judged.ok) throw new Error(`${fileName}: ${judged.errors.map(({ message }) => message).join(' ')}`)
    const { lifted } = judged
    return await writing(this.services.db, async (tx) => {
      const actor = await enterAs(tx, organisation, person)
      const report = await insertReport(tx, { organisation, person, lifted, now: at })
      await insertRevision(tx, { organisation, report, revision: 1, person, source, fileName, lifted, now: at })
      await writeAudit(tx, {
        organisation,
        person,
        roles: actor?.roles ?? [],
        action: 'create-report',
        subject: `report/${report}`,
        at,
        request: 'seed',
        address: 'seed',
        details: { sha256: lifted.sha256 },
      })
      return report
    })
  }

  revise = (cue: Cue, report: string, text: string): Promise<Answer> =>
    this.act(cue, report, 'create-revision', async ({ tx, actor, subject, now }) => {
      const added = await addRevision(tx, {
        organisation: actor.organisation,
        person: actor.person,
        report: subject,
        source: Buffer.from(text),
        fileName: 'site.skerry.yaml',
        now,
      })
      return 'refused' in added ? added : { audit: { revision: added.revision } }
    })

  submit = (cue: Cue, report: string): Promise<Answer> =>
    this.act(cue, report, 'submit-report', async (stage) => {
      const done = await step(stage, 'submit' satisfies Step)
      await askForReview(stage)
      return done
    })

  remark = (
    cue: Cue,
    report: string,
    anchor: string,
    kind: 'remark' | 'question' | 'correction',
    body: string,
  ): Promise<Answer> =>
    this.act(cue, report, 'begin-thread', (stage) =>
      beginThread(stage, { anchor, kind, region: null, body, assignedTo: null }),
    )

  /** Answers the first thread of a report that is still open. */
  answer = (cue: Cue, report: string, body: string): Promise<Answer> =>
    this.act(cue, report, 'answer-thread', async (stage) => {
      const { tx, actor } = stage
      const [first] = await listThreads(tx, actor.organisation, report, actor.person)
      const thread =
        first &&
        (await findThread(tx, {
          organisation: actor.organisation,
          report,
          thread: first.thread_id,
          viewer: actor.person,
        }))
      return thread === undefined ? undefined : await answerThread(stage, thread, body)
    })

  review = (
    cue: Cue,
    report: string,
    decision: 'remarks' | 'returned' | 'approved',
    summary: string,
  ): Promise<Answer> => this.act(cue, report, 'submit-review', (stage) => submitReview(stage, { decision, summary }))

  /** Accepts every limitation and departure in the words that the file has. */
  acceptAll = (cue: Cue, report: string): Promise<Answer> =>
    this.act(cue, report, 'decide-departure', async (stage) => {
      const { decisions } = await reviewStanding(stage.tx, stage.actor.organisation, stage.subject)
      for (const { anchor, wordsSha256 } of decisions) {
        const refused = await decide(stage, { anchor, wordsSha256, accepted: true, reason: '' })
        if (refused !== undefined) return refused
      }
      return undefined
    })

  issue = (cue: Cue, report: string): Promise<Answer> => this.act(cue, report, 'issue-report', issueReport)

  withdraw = (cue: Cue, report: string, reason: string): Promise<Answer> =>
    this.act(cue, report, 'withdraw-report', (stage) => withdrawReport(stage, reason))

  async correct(cue: Cue, report: string, reason: string): Promise<string> {
    const { audit } = await this.act(cue, report, 'correct-report', (stage) => correctReport(stage, reason))
    return String(audit?.['correction'])
  }
}
