import { createHash } from 'node:crypto'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { drawSample } from '#core/register/sample.ts'
import { factsText } from '#core/report/facts.ts'
import { judgeSource } from '#server/commands/judge-source.ts'
import { type Browser, type House, openHouse, source } from '#tests/server/house.ts'
import { approved, issue, well } from '#tests/server/life.ts'
import { pdfOf, sealWith } from '#tests/server/sealed.ts'
import { asOwner } from '#tests/server/tamper.ts'

let house: House
let organisation: string
let installer: Browser
let reviewer: Browser
let auditor: Browser
const dairy = source('fell-side-dairy')
const ids: string[] = []

beforeAll(async () => {
  house = await openHouse()
  organisation = await house.organisation('SAM')
  installer = await house.signIn(await house.member(organisation, ['installer']))
  reviewer = await house.signIn(await house.member(organisation, ['reviewer']))
  auditor = await house.signIn(await house.member(organisation, ['auditor']))
  for (let count = 0; count < 4; count += 1) well(await issue(reviewer, await approved(installer, reviewer, dairy)))
  const { documents } = well(await auditor.get('/api/register')).body
  ids.push(...documents.map(({ document }: { document: string }) => document).toReversed())
}, 60_000)
afterAll(() => house.close())

const draw = (body: object) => auditor.post('/api/register/sample').send(body)
const numbersIn = ({ documents }: { documents: { number: string }[] }) => documents.map(({ number }) => number)
const recomputed = async (document: string | undefined) =>
  well(await auditor.post('/api/register/recompute').send({ documents: [document] })).body.documents[0]

describe('a sample of the register', () => {
  it('is drawn by auditors, not by those whose work it is', async () => {
    expect((await installer.post('/api/register/sample').send({ size: 1 })).status).toBe(403)
  })

  it('states seed, method and population, and is drawn again from them', async () => {
    const first = well(await draw({ size: 2 })).body
    expect(first).toMatchObject({
      method: 'skerry-sample/1',
      size: 2,
      population: { count: 4, first: 'SAM-2026-0001', last: 'SAM-2026-0004' },
    })
    const population = ['0001', '0002', '0003', '0004'].map((number) => `SAM-2026-${number}`)
    expect(numbersIn(first)).toEqual(drawSample(population, first.seed, 2))
    const { seed } = first
    const again = well(await draw({ size: 2, seed, population_sha256: first.population.sha256 })).body
    expect(again).toEqual(first)
    expect(well(await draw({ size: 2 })).body.seed).not.toBe(seed)
  })

  it('says when the population is another one by now', async () => {
    const answer = await draw({ size: 2, seed: 'seed-2026', population_sha256: 'ab'.repeat(32) })
    expect(answer.status).toBe(409)
  })

  it('leaves an event with everything that it takes to draw it again', async () => {
    const { seed } = well(await draw({ size: 1, prefix: 'SAM-2026-000' })).body
    const { events } = well(await auditor.get('/api/audit?action=draw-sample&limit=1')).body
    expect(events[0].details).toMatchObject({ seed, population: { count: 4, filters: { prefix: 'SAM-2026-000' } } })
  })
})

describe('recomputing', () => {
  it('finds nothing where file, engine and record agree', async () => {
    const all = well(await auditor.post('/api/register/recompute').send({ documents: ids })).body
    expect(all.same).toBe(4)
    expect(all.documents[0]).toMatchObject({
      same: true,
      rulebook: { same: true },
      facts: { same: true, differences: [] },
      verdicts: [],
    })
  })

  it('lists subject, quantity and both values where another engine had computed', async () => {
    const other = dairy.replace('loop_impedance: 0.31 ohm', 'loop_impedance: 0.29 ohm')
    expect(other).not.toBe(dairy)
    const judged = judgeSource(Buffer.from(other))
    if (!judged.ok) throw new Error('The other file cannot be judged.')
    const facts_sha256 = createHash('sha256').update(factsText(judged.judged)).digest('hex')
    await asOwner(house, organisation, ['documents'], (tx) =>
      tx('documents').where({ document_id: ids[0] }).update({ facts_sha256 }),
    )
    const unsealed = await recomputed(ids[0])
    expect(unsealed).toMatchObject({ same: false, facts: { same: false, differences: null } })
    await sealWith(house, organisation, ids[0] ?? '', pdfOf(other))
    const { facts, same } = await recomputed(ids[0])
    expect(same).toBe(false)
    expect(facts.differences.length).toBeGreaterThan(0)
    for (const one of facts.differences) {
      expect(one.issued).not.toEqual(one.now)
      expect(one).toMatchObject({ subject: expect.any(String), quantity: expect.any(String) })
    }
  })

  it('lists verdicts that came out otherwise, and says whether the rule book is the same', async () => {
    const { report } = well(await auditor.get(`/api/register/${ids[1]}`)).body
    await asOwner(house, organisation, ['revisions'], async (tx) => {
      await tx.raw(
        `update revisions set rulebook_hash = 'older', counts = counts || jsonb_build_object('meets', (counts->>'meets')::int - 1, 'fails', (counts->>'fails')::int + 1), outcome = 'fails' where report_id = ?`,
        [report],
      )
    })
    const found = await recomputed(ids[1])
    expect(found).toMatchObject({ same: false, rulebook: { same: false, issued: { hash: 'older' } } })
    const changes = found.verdicts.map(
      ({ verdict, issued: was, now: is }: { verdict: string; issued: number; now: number }) => [verdict, is - was],
    )
    expect(changes).toEqual([
      ['fails', -1],
      ['meets', 1],
    ])
    expect(found.outcome).toMatchObject({ issued: 'fails' })
  })

  it('tells a stored file that is not the one that was issued', async () => {
    const { report } = well(await auditor.get(`/api/register/${ids[2]}`)).body
    const bytes = Buffer.from(dairy.replace('M. Fell', 'M. Hill'))
    await asOwner(house, organisation, ['revisions'], (tx) =>
      tx('revisions')
        .where({ report_id: report })
        .update({ source: bytes, sha256: createHash('sha256').update(bytes).digest('hex') }),
    )
    const found = await recomputed(ids[2])
    expect(found.same).toBe(false)
    expect(found.source.stored).not.toBe(found.source.registered)
  })
})
