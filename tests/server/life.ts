import type { Response } from 'supertest'
import { type Browser, PASSWORD } from './house.ts'

/** What a person does with a report, each step with the version that the server has told last. */
export const key = (): string => crypto.randomUUID()

/** Fails with the server's own words when a step that the story needs is refused. */
export function well<R extends Pick<Response, 'status' | 'text'>>(answer: R): R {
  if (answer.status >= 300) throw new Error(`Refused with ${answer.status}: ${answer.text}`)
  return answer
}

export async function upload(browser: Browser, text: string, idempotency = key()): Promise<Response> {
  return await browser
    .post('/api/reports?file_name=site.skerry.yaml')
    .set('content-type', 'application/yaml')
    .set('idempotency-key', idempotency)
    .send(text)
}

export async function etagOf(browser: Browser, report: string): Promise<string> {
  return well(await patiently(async () => await browser.get(`/api/reports/${report}`))).headers['etag'] ?? ''
}

export async function revise(browser: Browser, report: string, text: string): Promise<Response> {
  return await browser
    .post(`/api/reports/${report}/revisions?file_name=site.skerry.yaml`)
    .set('content-type', 'application/yaml')
    .set('idempotency-key', key())
    .set('if-match', await etagOf(browser, report))
    .send(text)
}

/** A step that changes the report: `submit`, `recall`, `review`, `issue` … */
export async function act(
  browser: Browser,
  report: string,
  step: string,
  body: object = {},
  idempotency = key(),
): Promise<Response> {
  return await browser
    .post(`/api/reports/${report}/${step}`)
    .set('if-match', await etagOf(browser, report))
    .set('idempotency-key', idempotency)
    .send(body)
}

/** Accepts (or refuses) everything that the newest revision asks the reviewer to decide. */
export async function decideAll(reviewer: Browser, report: string, accepted = true): Promise<number> {
  const { decisions } = well(await reviewer.get(`/api/reports/${report}/review`)).body
  for (const { anchor, words_sha256 } of decisions)
    well(
      await reviewer
        .post(`/api/reports/${report}/acceptances`)
        .send({ anchor, words_sha256, accepted, reason: 'as agreed on site' }),
    )
  return decisions.length
}

export async function remark(
  reviewer: Browser,
  report: string,
  kind: 'remark' | 'question' | 'correction',
  anchor = 'site/customer',
): Promise<Response> {
  return await reviewer
    .post(`/api/reports/${report}/threads`)
    .send({ anchor, kind, body: `A ${kind} of the reviewer.` })
}

/** Brings a file through review: sent, everything accepted, approved. */
export async function approved(installer: Browser, reviewer: Browser, text: string): Promise<string> {
  const report = well(await upload(installer, text)).body.id
  well(await act(installer, report, 'submit'))
  await decideAll(reviewer, report)
  well(await act(reviewer, report, 'approve'))
  return report
}

export async function issue(reviewer: Browser, report: string, idempotency = key()): Promise<Response> {
  return await act(reviewer, report, 'issue', { password: PASSWORD }, idempotency)
}

/** Sends again with the same key while the server says that it is busy, as a patient client does. */
export async function patiently(send: () => Promise<Response>): Promise<Response> {
  for (let left = 40; ; left--) {
    const answer = await send()
    if (answer.status !== 503 || left === 0) return answer
    await new Promise((resolve) => setTimeout(resolve, 250))
  }
}
