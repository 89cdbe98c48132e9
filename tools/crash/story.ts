import type { Answer, Client } from './client.ts'

export interface Cast {
  readonly installer: Client
  readonly reviewer: Client
  readonly password: string
  readonly source: string
}

/** What the people were told in the end. */
export interface Told {
  readonly old: { readonly report: string; readonly number: string }
  readonly fresh: { readonly report: string; readonly number: string }
}

async function step(client: Client, report: string, name: string, json: object = {}): Promise<Answer> {
  const { etag } = await client.do(`/api/reports/${report}`)
  return await client.do(`/api/reports/${report}/${name}`, { method: 'POST', json, etag })
}

interface Standing {
  readonly decisions: readonly { readonly anchor: string; readonly words_sha256: string }[]
}

/** From the desk of the installer to the number: review, acceptances, approval, issue. */
async function brought({ installer, reviewer, password }: Cast, report: string): Promise<string> {
  await step(installer, report, 'submit')
  const { body } = await reviewer.do(`/api/reports/${report}/review`)
  const { decisions } = body as unknown as Standing
  for (const { anchor, words_sha256 } of decisions)
    await reviewer.do(`/api/reports/${report}/acceptances`, {
      method: 'POST',
      json: { anchor, words_sha256, accepted: true, reason: 'agreed' },
    })
  await step(reviewer, report, 'approve')
  const issued = await step(reviewer, report, 'issue', { password })
  return String(issued.body['number'])
}

/** A report is sent, reviewed and issued, then corrected by another one that takes its place. */
export async function tellStory(cast: Cast): Promise<Told> {
  const { installer, source } = cast
  const made = await installer.do('/api/reports?file_name=site.skerry.yaml', { method: 'POST', source })
  const report = String(made.body['id'])
  const number = await brought(cast, report)
  const correction = await step(installer, report, 'correct', { reason: 'The address was wrong.' })
  const fresh = String(correction.body['id'])
  const { etag } = await installer.do(`/api/reports/${fresh}`)
  await installer.do(`/api/reports/${fresh}/revisions?file_name=site.skerry.yaml`, {
    method: 'POST',
    source: source.replace('Fell Side 3', 'Fell Side 5'),
    etag,
  })
  return { old: { report, number }, fresh: { report: fresh, number: await brought(cast, fresh) } }
}
