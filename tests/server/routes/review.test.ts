import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { inOrganisation } from '#server/db.ts'
import { type Browser, type House, openHouse, source } from '#tests/server/house.ts'
import { act, decideAll, etagOf, remark, revise, upload, well } from '#tests/server/life.ts'

let house: House
let organisation: string
let installer: Browser
let reviewer: Browser
let second: Browser
const dairy = source('fell-side-dairy')
const mended = dairy.replace('customer: M. Fell', 'customer: M. Fell and daughters')

beforeAll(async () => {
  house = await openHouse()
  organisation = await house.organisation()
  installer = await house.signIn(await house.member(organisation, ['installer']))
  reviewer = await house.signIn(await house.member(organisation, ['reviewer']))
  second = await house.signIn(await house.member(organisation, ['reviewer']))
})
afterAll(() => house.close())

async function submitted(text = dairy): Promise<string> {
  const report = well(await upload(installer, text)).body.id
  well(await act(installer, report, 'submit', { reviewer: reviewer.member.id }))
  return report
}

const threadsOf = async (browser: Browser, report: string) =>
  well(await browser.get(`/api/reports/${report}/threads`)).body.threads

const mails = (kind: string): Promise<{ to_person: string; dedupe_key: string }[]> =>
  inOrganisation(house.services.db, organisation, (tx) =>
    tx('mails').where({ organisation_id: organisation, kind }).select('to_person', 'dedupe_key'),
  )

describe('a thread', () => {
  it('needs a place that the report has', async () => {
    const answer = await remark(reviewer, await submitted(), 'remark', 'circuit/K99')
    expect(answer.status).toBe(400)
    expect(answer.body.errors[0].pointer).toBe('/anchor')
  })

  it('is seen by its reviewer only, until the review is submitted', async () => {
    const report = await submitted()
    well(await remark(reviewer, report, 'correction'))
    expect(await threadsOf(installer, report)).toEqual([])
    expect(await threadsOf(second, report)).toEqual([])
    expect(await threadsOf(reviewer, report)).toMatchObject([{ draft: true, quoted: 'Customer M. Fell' }])
    well(await act(reviewer, report, 'review', { decision: 'returned' }))
    expect(await threadsOf(installer, report)).toMatchObject([{ draft: false, state: 'open', placement: 'kept' }])
  })

  it('can be changed and deleted as a draft, and by nobody once it was published', async () => {
    const report = await submitted()
    const thread = well(await remark(reviewer, report, 'remark')).body
    const [said] = thread.remarks
    const path = `/api/reports/${report}/remarks/${said.id}`
    expect((await second.patch(path).send({ body: 'Not mine.' })).status).toBe(404)
    expect((await reviewer.patch(path).send({ body: 'Said better.' })).status).toBe(204)
    expect((await threadsOf(reviewer, report))[0].remarks[0].body).toBe('Said better.')
    expect((await reviewer.delete(path)).status).toBe(204)
    expect(await threadsOf(reviewer, report)).toEqual([])
    const other = well(await remark(reviewer, report, 'remark')).body
    well(await act(reviewer, report, 'review', { decision: 'remarks' }))
    expect(
      (await reviewer.patch(`/api/reports/${report}/remarks/${other.remarks[0].id}`).send({ body: 'x' })).status,
    ).toBe(404)
    expect((await reviewer.delete(`/api/reports/${report}/threads/${other.id}`)).status).toBe(409)
  })

  it('is answered by the installer, opened again by what the reviewer says next, and settled by a reviewer only', async () => {
    const report = await submitted()
    const { id } = well(await remark(reviewer, report, 'correction')).body
    well(await act(reviewer, report, 'review', { decision: 'returned' }))
    const path = `/api/reports/${report}/threads/${id}`
    const answered = well(await installer.post(`${path}/remarks`).send({ body: 'Mended.' }))
    expect(answered.body).toMatchObject({ state: 'answered' })
    expect((await installer.post(`${path}/resolve`).set('if-match', '"2"').send({})).status).toBe(403)
    well(await act(installer, report, 'submit'))
    well(await reviewer.post(`${path}/remarks`).send({ body: 'Not quite.' }))
    expect((await threadsOf(installer, report))[0]).toMatchObject({ state: 'answered', remarks: [{}, {}] })
    well(await act(reviewer, report, 'review', { decision: 'remarks' }))
    const [open] = await threadsOf(installer, report)
    expect(open).toMatchObject({ state: 'open', remarks: [{}, {}, {}] })
    expect((await reviewer.post(`${path}/resolve`).set('if-match', '"1"').send({})).status).toBe(412)
    const settled = await reviewer.post(`${path}/resolve`).set('if-match', `"${open.version}"`).send({})
    expect(settled.body).toMatchObject({ state: 'resolved' })
  })

  it('moves along to the next revision: kept, changed, orphaned, and back', async () => {
    const report = await submitted()
    for (const anchor of ['site/customer', 'site/name', 'site/premises'])
      well(await remark(reviewer, report, 'remark', anchor))
    well(await act(reviewer, report, 'review', { decision: 'returned' }))
    const placements = async () =>
      (await threadsOf(installer, report)).map(({ anchor, placement, placed_on }: Record<string, unknown>) => [
        anchor,
        placement,
        placed_on,
      ])
    well(await revise(installer, report, mended.replace(/^ {2}premises: .*\n/m, '')))
    expect(new Set(await placements())).toEqual(
      new Set([
        ['site/customer', 'changed', 2],
        ['site/name', 'kept', 2],
        ['site/premises', 'orphaned', 2],
      ]),
    )
    well(await revise(installer, report, dairy))
    expect((await placements()).every((placed: unknown[]) => placed[1] === 'kept' && placed[2] === 3)).toBe(true)
  })

  it('can be given to somebody of the organisation', async () => {
    const report = await submitted()
    const { id } = well(await remark(reviewer, report, 'question')).body
    const assign = (person: string, version: number) =>
      reviewer
        .put(`/api/reports/${report}/threads/${id}/assignee`)
        .set('if-match', `"${version}"`)
        .send({ assigned_to: person })
    expect((await assign(crypto.randomUUID(), 1)).status).toBe(400)
    expect(well(await assign(installer.member.id, 1)).body.assigned_to).toBe(installer.member.id)
  })
})

describe('a review', () => {
  it('is refused when it says nothing', async () => {
    expect((await act(reviewer, await submitted(), 'review', { decision: 'returned' })).status).toBe(400)
  })

  it('does not approve while something stands in the way, and keeps its drafts then', async () => {
    const report = await submitted()
    well(await remark(reviewer, report, 'correction'))
    const answer = await act(reviewer, report, 'approve')
    expect(answer.status).toBe(409)
    const kinds = answer.body.blockers.map(({ kind }: { kind: string }) => kind)
    expect(new Set(kinds)).toEqual(new Set(['not decided', 'correction']))
    expect(await threadsOf(installer, report)).toEqual([])
    expect((await installer.get(`/api/reports/${report}`)).body.state).toBe('in review')
  })

  it('tells the author side by one mail, however many remarks it has, and nobody about their own', async () => {
    const before = (await mails('review submitted')).length
    const report = await submitted()
    for (let count = 0; count < 5; count++) well(await remark(reviewer, report, 'remark'))
    well(await act(reviewer, report, 'review', { decision: 'returned', summary: 'Five things.' }))
    const told = (await mails('review submitted')).slice(before)
    expect(told.map(({ to_person }) => to_person)).toEqual([installer.member.id])
    const asked = await mails('review asked')
    expect(new Set(asked.map(({ to_person }) => to_person))).toEqual(new Set([reviewer.member.id]))
  })

  it('can take an approval back', async () => {
    const report = await submitted()
    await decideAll(reviewer, report)
    well(await act(reviewer, report, 'approve'))
    expect((await act(installer, report, 'recall')).status).toBe(409)
    expect(well(await act(second, report, 'return', { summary: 'Look again.' })).body.state).toBe('returned')
  })
})

describe('limitations and departures', () => {
  it('are decided in the words that stand there now', async () => {
    const report = await submitted()
    const [decision] = well(await reviewer.get(`/api/reports/${report}/review`)).body.decisions
    const decide = (body: object) => reviewer.post(`/api/reports/${report}/acceptances`).send(body)
    const { anchor, words_sha256 } = decision
    expect((await decide({ anchor: 'limitation/none', words_sha256, accepted: true })).status).toBe(400)
    expect((await decide({ anchor, words_sha256: 'ab'.repeat(32), accepted: true })).status).toBe(409)
    expect((await decide({ anchor, words_sha256, accepted: false })).status).toBe(400)
    const refused = well(await decide({ anchor, words_sha256, accepted: false, reason: 'Measure it.' })).body
    expect(refused.blockers.map(({ kind }: { kind: string }) => kind)).toEqual(['refused'])
    expect(well(await decide({ anchor, words_sha256, accepted: true })).body.blockers).toEqual([])
  })

  it('must be decided again when a later revision says it in other words', async () => {
    const report = await submitted()
    await decideAll(reviewer, report)
    well(await act(reviewer, report, 'return', { summary: 'Once more.' }))
    well(await revise(installer, report, dairy.replaceAll('Rain and unsteady light', 'Hail and thunder')))
    const { blockers } = well(await reviewer.get(`/api/reports/${report}/review`)).body
    expect(blockers.map(({ kind }: { kind: string }) => kind)).toEqual(['not decided'])
  })
})

describe('four eyes', () => {
  const decisive = async (browser: Browser, report: string): Promise<number[]> => [
    (await act(browser, report, 'approve')).status,
    (await act(browser, report, 'review', { decision: 'approved' })).status,
    (await act(browser, report, 'return', { summary: 'x' })).status,
    (await remark(browser, report, 'remark')).status,
    (
      await browser
        .post(`/api/reports/${report}/acceptances`)
        .send({ anchor: 'x', words_sha256: 'ab'.repeat(32), accepted: true })
    ).status,
  ]
  const refusedAll = [403, 403, 403, 403, 403]

  it('keep an uploader from deciding, also after becoming a reviewer, also when somebody else uploads the next revision', async () => {
    const changing = await house.signIn(await house.member(organisation, ['installer']))
    const report = well(await upload(changing, dairy)).body.id
    await inOrganisation(house.services.db, organisation, (tx) =>
      tx('people')
        .where({ organisation_id: organisation, person_id: changing.member.id })
        .update({ roles: ['reviewer'] }),
    )
    well(await revise(installer, report, mended))
    well(await act(installer, report, 'submit'))
    expect(await decisive(changing, report)).toEqual(refusedAll)
  })

  it('keep whoever the file names from deciding, also when a later file leaves the name out', async () => {
    const named = await house.signIn(await house.member(organisation, ['reviewer'], 'A. Fenn'))
    const report = well(await upload(installer, dairy)).body.id
    well(await revise(installer, report, dairy.replaceAll('name: A. Fenn, licence: FM-1182', 'name: B. Other')))
    well(await act(installer, report, 'submit'))
    expect(await decisive(named, report)).toEqual(refusedAll)
  })

  it('do not count what somebody accepted who uploaded a revision afterwards', async () => {
    const report = await submitted()
    await decideAll(second, report)
    well(await act(reviewer, report, 'return', { summary: 'Once more.' }))
    well(await revise(second, report, mended))
    well(await act(installer, report, 'submit'))
    const answer = await act(reviewer, report, 'approve')
    expect(answer.status).toBe(409)
    expect(answer.body.blockers.map(({ kind }: { kind: string }) => kind)).toEqual(['not decided'])
  })

  it('hold in the database itself, whatever a query says', async () => {
    const report = await submitted()
    const db = house.services.db
    const attempt = (work: Parameters<typeof inOrganisation>[2]) => inOrganisation(db, organisation, work)
    const review = { organisation_id: organisation, report_id: report, revision: 1, reviewer_id: installer.member.id }
    await expect(attempt((tx) => tx('reviews').insert(review))).rejects.toThrow(/cannot decide/)
    await expect(
      attempt((tx) =>
        tx('reports').where({ organisation_id: organisation, report_id: report }).update({ state: 'approved' }),
      ),
    ).rejects.toThrow(/approved by a review/)
    await expect(
      attempt((tx) =>
        tx('reports')
          .where({ organisation_id: organisation, report_id: report })
          .update({ state: 'issued', number: 'X-2026-0001' }),
      ),
    ).rejects.toThrow(/has a document/)
    expect(await etagOf(installer, report)).toBe('"3"')
  })
})
