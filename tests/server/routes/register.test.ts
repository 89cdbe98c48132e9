import { createHash } from 'node:crypto'
import { hexToBytes } from '@noble/hashes/utils.js'
import { unzipSync } from 'fflate'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { parseCheckpoint } from '#core/register/checkpoint.ts'
import { continues } from '#core/register/consistency.ts'
import { parseProof } from '#core/register/proof.ts'
import { objectKey } from '#server/files/object-key.ts'
import { leads } from '#server/register/proof-now.ts'
import { type Browser, type House, openHouse, source, whole } from '#tests/server/house.ts'
import { act, approved, issue, well } from '#tests/server/life.ts'
import { pdfOf, sealWith } from '#tests/server/sealed.ts'
import { asOwner } from '#tests/server/tamper.ts'

let house: House
let organisation: string
let installer: Browser
let reviewer: Browser
let auditor: Browser
let stranger: Browser
const dairy = source('fell-side-dairy')
const farm = source('tern-farm-tt')
/** Documents in the order of issue. */
const documents: { document: string; report: string; number: string }[] = []
let pdf: Buffer

async function issued(text: string) {
  const report = await approved(installer, reviewer, text)
  well(await issue(reviewer, report))
  const { number } = well(await auditor.get(`/api/reports/${report}`)).body
  const [row] = well(await auditor.get(`/api/register?prefix=${number}`)).body.documents
  documents.push({ document: row.document, report, number })
  return row
}

const one = (place: number) => {
  const found = documents[place]
  if (found === undefined) throw new Error(`There is no document ${place}.`)
  return found
}

beforeAll(async () => {
  house = await openHouse()
  organisation = await house.organisation('REG')
  installer = await house.signIn(await house.member(organisation, ['installer']))
  reviewer = await house.signIn(await house.member(organisation, ['reviewer']))
  auditor = await house.signIn(await house.member(organisation, ['auditor']))
  stranger = await house.signIn(await house.member(await house.organisation('OTH'), ['auditor']))
  for (const hour of ['09:00', '09:10', '09:20']) {
    house.now = new Date(`2026-11-02T${hour}:00Z`)
    await issued(dairy)
  }
  house.now = new Date('2026-11-02T09:25:00Z')
  await issued(farm)
  pdf = pdfOf(dairy)
  await sealWith(house, organisation, one(0).document, pdf)
}, 60_000)
afterAll(() => house.close())

const numbers = async (query: string): Promise<string[]> =>
  well(await auditor.get(`/api/register?${query}`)).body.documents.map(({ number }: { number: string }) => number)

describe('the register', () => {
  it('shows nothing of another house, and answers as if it were not there', async () => {
    expect(well(await stranger.get('/api/register')).body.documents).toEqual([])
    const missing = await stranger.get(`/api/register/${crypto.randomUUID()}`)
    for (const path of ['', '/pdf', '/source', '/proof']) {
      const foreign = await stranger.get(`/api/register/${one(0).document}${path}`)
      expect(foreign.status).toBe(404)
      expect({ ...foreign.body, instance: '' }).toEqual({ ...missing.body, instance: '' })
    }
    const zip = await stranger.post('/api/register/download').send({ documents: [one(0).document] })
    expect(zip.status).toBe(404)
    const again = await stranger.post('/api/register/recompute').send({ documents: [one(0).document] })
    expect(again.status).toBe(404)
  })

  it('is searched by time, by place and operator, and by how a number begins', async () => {
    expect(await numbers('')).toEqual(['REG-2026-0004', 'REG-2026-0003', 'REG-2026-0002', 'REG-2026-0001'])
    expect(await numbers('from=2026-11-02T09:05:00Z&to=2026-11-02T09:20:00Z')).toEqual(['REG-2026-0002'])
    expect(await numbers('search=fell+side')).toHaveLength(3)
    expect(await numbers('search=FENNMARK+GRID')).toHaveLength(4)
    expect(await numbers('search=%25')).toEqual([])
    expect(await numbers('prefix=reg-2026-0004')).toEqual(['REG-2026-0004'])
    expect(await numbers('state=withdrawn')).toEqual([])
  })

  it('comes page by page, each document once', async () => {
    const seen: string[] = []
    let after: string | null = ''
    while (after !== null) {
      const query: string = after === '' ? '' : `&after=${encodeURIComponent(after)}`
      const page = well(await auditor.get(`/api/register?limit=3${query}`)).body
      seen.push(...page.documents.map(({ number }: { number: string }) => number))
      after = page.next
    }
    expect(seen).toEqual(await numbers(''))
  })

  it('goes out as a table', async () => {
    const table = (await whole(auditor.get('/api/register.csv?search=tern'))).toString('utf8')
    expect(table.split('\r\n')).toHaveLength(3)
    expect(table).toContain('REG-2026-0004,issued,2026-11-02T09:25:00.000Z')
  })

  it('shows each entry of a document with its way to the newest checkpoint, and who did what with it', async () => {
    const shown = well(await auditor.get(`/api/register/${one(0).document}`)).body
    expect(shown.entries.map(({ kind }: { kind: string }) => kind)).toEqual(['issued', 'sealed'])
    expect(shown.checkpoint.size).toBe(5)
    for (const { proof, leaf_hash, canonical } of shown.entries) {
      expect(leads(proof, shown.checkpoint.root)).toBe(true)
      const leaf = createHash('sha256')
        .update(Buffer.from([0]))
        .update(canonical)
        .digest('hex')
      expect(leaf).toBe(leaf_hash)
    }
    expect(shown.issue.number).toBe('REG-2026-0001')
    expect(shown.events.map(({ action }: { action: string }) => action)).toContain('issue-report')
    expect(well(await installer.get(`/api/register/${one(0).document}`)).body.events).toBeNull()
    const { events } = well(await auditor.get(`/api/audit?subject=document/${one(0).document}`)).body
    expect(events[0]).toMatchObject({ action: 'show-register-document', person: { id: installer.member.id } })
  })
})

describe('what is downloaded', () => {
  it('is the very bytes, and leaves an event', async () => {
    const { document, report, number } = one(0)
    expect((await whole(auditor.get(`/api/register/${document}/pdf`))).equals(pdf)).toBe(true)
    expect((await whole(auditor.get(`/api/register/${document}/source`))).toString()).toBe(dairy)
    const proof = parseProof((await whole(auditor.get(`/api/register/${document}/proof`))).toString())
    expect(proof).toMatchObject({ ok: true, proof: { entry: { kind: 'sealed', number } } })
    const { events } = well(await auditor.get(`/api/audit?action=download-register-pdf`)).body
    expect(events[0]).toMatchObject({ subject: `document/${document}`, details: { file: `${number}.pdf` } })
    expect(report).toBeDefined()
  })

  it('waits for the seal', async () => {
    const answer = await auditor.get(`/api/register/${one(1).document}/pdf`)
    expect(answer.status).toBe(503)
    expect(answer.headers['retry-after']).toBe('5')
  })

  it('comes as an archive with file and proof of each document', async () => {
    await sealWith(house, organisation, one(1).document, pdfOf(farm))
    const request = auditor.post('/api/register/download').send({ documents: [one(0).document, one(1).document] })
    const files = unzipSync(await whole(request))
    expect(Object.keys(files).toSorted()).toEqual(
      ['REG-2026-0001', 'REG-2026-0002'].flatMap((number) =>
        ['.pdf', '.proof.json', '.skerry.yaml'].map((ending) => `${number}/${number}${ending}`),
      ),
    )
    expect(Buffer.from(files['REG-2026-0001/REG-2026-0001.pdf'] ?? []).equals(pdf)).toBe(true)
  })

  it('is refused once the stored bytes are not those of the register', async () => {
    const { document } = one(2)
    const bytes = pdfOf(dairy.replace('M. Fell', 'M. Fell the younger'))
    await sealWith(house, organisation, document, bytes)
    const sha256 = createHash('sha256').update(bytes).digest('hex')
    await asOwner(house, organisation, ['seals'], (tx) =>
      tx('seals')
        .where({ document_id: document })
        .update({ pdf_sha256: 'ab'.repeat(32) }),
    )
    expect((await auditor.get(`/api/register/${document}/pdf`)).status).toBe(500)
    await asOwner(house, organisation, ['seals'], (tx) =>
      tx('seals').where({ document_id: document }).update({ pdf_sha256: sha256 }),
    )
    await house.services.store.delete(objectKey({ organisation, kind: 'document', sha256 }))
    expect((await auditor.get(`/api/register/${document}/pdf`)).status).toBe(500)
    await asOwner(house, organisation, ['documents'], (tx) =>
      tx('documents')
        .where({ document_id: document })
        .update({ source_sha256: 'cd'.repeat(32) }),
    )
    const answer = await auditor.get(`/api/register/${document}/source`)
    expect(answer.status).toBe(500)
    expect(answer.body.detail).toContain('does not have the hash that stands in the register')
  })
})

describe('checkpoints', () => {
  it('continue each other, by proofs that need no trust in the server', async () => {
    const { checkpoints } = well(await auditor.get('/api/checkpoints')).body
    expect(checkpoints.length).toBeGreaterThan(4)
    const roots = new Map<number, string>(
      checkpoints.map(({ signed }: { signed: string }) => {
        const parsed = parseCheckpoint(signed)
        if (!parsed.ok) throw new Error(parsed.message)
        return [parsed.checkpoint.size, parsed.checkpoint.root]
      }),
    )
    const newest = Math.max(...roots.keys())
    for (const from of roots.keys()) {
      const { path } = well(await auditor.get(`/api/consistency?from=${from}&to=${newest}`)).body
      const proof = {
        first: from,
        firstRoot: hexToBytes(roots.get(from) ?? ''),
        second: newest,
        secondRoot: hexToBytes(roots.get(newest) ?? ''),
        path: path.map(hexToBytes),
      }
      expect(continues(proof)).toBe(true)
      if (from !== newest) expect(continues({ ...proof, firstRoot: new Uint8Array(32) })).toBe(false)
    }
    expect((await auditor.get(`/api/consistency?from=1&to=${newest + 1}`)).status).toBe(400)
    expect((await auditor.get('/api/consistency?from=3&to=2')).status).toBe(400)
    expect((await stranger.get('/api/consistency?from=1&to=2')).status).toBe(400)
  })
})

describe('a withdrawn document', () => {
  it('stays in the register with its reason', async () => {
    const { report, document } = one(3)
    well(
      await act(reviewer, report, 'withdraw', {
        reason: 'Wrong building.',
        password: 'a long password for tests only',
      }),
    )
    expect(await numbers('state=withdrawn')).toEqual(['REG-2026-0004'])
    const shown = well(await auditor.get(`/api/register/${document}`)).body
    expect(shown.entries.at(-1)).toMatchObject({ kind: 'withdrawn', entry: { reason: 'Wrong building.' } })
  })
})
