import { execFileSync, spawnSync } from 'node:child_process'
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { inOrganisation } from '#server/db.ts'
import { drain } from '#tests/server/drain.ts'
import { type Browser, type House, openHouse, source, whole } from '#tests/server/house.ts'
import { act, decideAll, etagOf, issue, remark, revise, upload, well } from '#tests/server/life.ts'
import { soundRegister } from '#tests/server/registers.ts'

let house: House
let organisation: string
let installer: Browser
let reviewer: Browser
let auditor: Browser
let folder: string

beforeAll(async () => {
  house = await openHouse()
  organisation = await house.organisation('ALD')
  installer = await house.signIn(await house.member(organisation, ['installer'], 'W. Sallow'))
  reviewer = await house.signIn(await house.member(organisation, ['reviewer'], 'O. Plover'))
  auditor = await house.signIn(await house.member(organisation, ['auditor'], 'K. Heron'))
  folder = mkdtempSync(join(tmpdir(), 'skerry-story-'))
})
afterAll(async () => {
  rmSync(folder, { recursive: true, force: true })
  await house.close()
})

const written = (name: string, bytes: Buffer): string => {
  const file = join(folder, name)
  writeFileSync(file, bytes)
  return file
}

const mailsTo = (person: Browser): Promise<string[]> =>
  inOrganisation(house.services.db, organisation, async (tx) => {
    const rows: { kind: string }[] = await tx('mails')
      .where({ organisation_id: organisation, to_person: person.member.id })
      .orderBy('created_at')
      .select('kind')
    return rows.map(({ kind }) => kind)
  })

/** A report's whole life, told once from the upload to the auditor's desk. */
describe('the life of a report', () => {
  const dairy = source('fell-side-dairy')
  const mended = dairy.replace('fault_current: 1.4 kA', 'fault_current: 1.45 kA')
  let report: string
  let number: string
  let pdf: Buffer

  it('the installer sends it to review', async () => {
    report = well(await upload(installer, dairy)).body.id
    expect(well(await act(installer, report, 'submit', { reviewer: reviewer.member.id })).body.state).toBe('in review')
    expect(await mailsTo(reviewer)).toEqual(['review asked'])
  })

  it('the reviewer returns it with remarks, told by one mail', async () => {
    well(await remark(reviewer, report, 'correction', 'supply/fault-current'))
    well(await remark(reviewer, report, 'remark', 'site/name'))
    well(await act(reviewer, report, 'review', { decision: 'returned', summary: 'The fault current was read again.' }))
    expect(await mailsTo(installer)).toEqual(['review submitted'])
  })

  it('the installer mends it: the remark is shown as changed, the other one as kept', async () => {
    well(await revise(installer, report, mended))
    const { threads } = well(await installer.get(`/api/reports/${report}/threads`)).body
    const placed = threads.map(({ anchor, placement }: Record<string, string>) => [anchor, placement])
    expect(new Map(placed)).toEqual(
      new Map([
        ['supply/fault-current', 'changed'],
        ['site/name', 'kept'],
      ]),
    )
    well(await act(installer, report, 'submit'))
  })

  it('the reviewer settles the correction, accepts the limitation, approves', async () => {
    expect((await act(reviewer, report, 'approve')).status).toBe(409)
    const { threads } = well(await reviewer.get(`/api/reports/${report}/threads`)).body
    for (const { id, version, kind } of threads)
      if (kind === 'correction')
        well(
          await reviewer.post(`/api/reports/${report}/threads/${id}/resolve`).set('if-match', `"${version}"`).send({}),
        )
    expect(await decideAll(reviewer, report)).toBe(1)
    expect(well(await act(reviewer, report, 'approve')).body.state).toBe('approved')
  })

  it('and issues it: the auditor sees it only now', async () => {
    expect((await auditor.get(`/api/reports/${report}`)).status).toBe(403)
    number = well(await issue(reviewer, report)).body.number
    expect(number).toBe('ALD-2026-0001')
    const waiting = await auditor.get(`/api/reports/${report}/document.pdf`)
    expect(waiting.status).toBe(503)
    expect(waiting.headers['retry-after']).toBe('5')
  })

  it('the worker seals it once, however often its job runs', async () => {
    expect(await drain(house.services)).toBeGreaterThan(2)
    const { seal } = well(await auditor.get(`/api/reports/${report}/document`)).body
    const entries = await soundRegister(house.services, organisation)
    expect(entries.map(({ kind }) => kind)).toEqual(['issued', 'sealed'])
    expect(entries[1]).toMatchObject({ pdf_sha256: seal.pdf_sha256, number })
  })

  it('the auditor downloads it, which leaves an event, and other programs find it sound', async () => {
    pdf = await whole(auditor.get(`/api/reports/${report}/document.pdf`))
    const file = written('report.pdf', pdf)
    expect(spawnSync('qpdf', ['--check', file]).status).toBe(0)
    const signature = execFileSync('pdfsig', [file], { encoding: 'utf8' })
    expect(signature).toMatch(/Signature is Valid/)
    expect(signature).toMatch(/Total document signed/)
    const text = execFileSync('pdftotext', [file, '-'], { encoding: 'utf8' })
    for (const words of [number, 'O. Plover', 'ALD', 'Rain and unsteady light']) expect(text).toContain(words)
    expect(text).not.toContain('DRAFT')
    execFileSync('pdfdetach', ['-saveall', '-o', folder, file])
    expect(readFileSync(join(folder, 'site.skerry.yaml'), 'utf8')).toBe(mended)
    const events: { action: string }[] = await inOrganisation(house.services.db, organisation, (tx) =>
      tx('audit_events').where({ organisation_id: organisation, person_id: auditor.member.id }).select('action'),
    )
    expect(events.map(({ action }) => action)).toContain('download-document')
  })

  it('a byte that is changed in the file makes other programs and the download refuse it', async () => {
    const forged = Buffer.from(pdf)
    const at = Math.floor(forged.length / 3)
    forged[at] = (forged[at] ?? 0) ^ 1
    expect(execFileSync('pdfsig', [written('forged.pdf', forged)], { encoding: 'utf8' })).not.toMatch(
      /Signature is Valid/,
    )
    const { seal } = well(await auditor.get(`/api/reports/${report}/document`)).body
    const stored = join(house.services.env.DATA_DIR, organisation, 'document', seal.pdf_sha256)
    execFileSync('chmod', ['u+w', stored])
    writeFileSync(stored, forged)
    const answer = await auditor.get(`/api/reports/${report}/document.pdf`)
    expect(answer.status).toBe(500)
    expect(answer.body.type).toBe('/problems/damaged')
    writeFileSync(stored, pdf)
    expect((await whole(auditor.get(`/api/reports/${report}/document.pdf`))).equals(pdf)).toBe(true)
  })

  it('a correction takes its place; the old document stays byte for byte what it was', async () => {
    const fresh = well(await act(installer, report, 'correct', { reason: 'The address was that of the neighbour.' }))
      .body.id
    well(await revise(installer, fresh, mended.replace('Fell Side 3', 'Fell Side 5')))
    well(await act(installer, fresh, 'submit'))
    await decideAll(reviewer, fresh)
    well(await act(reviewer, fresh, 'approve'))
    expect(well(await issue(reviewer, fresh)).body.number).toBe('ALD-2026-0002')
    await drain(house.services)
    const corrected = written('corrected.pdf', await whole(auditor.get(`/api/reports/${fresh}/document.pdf`)))
    const text = execFileSync('pdftotext', [corrected, '-'], { encoding: 'utf8' })
    for (const words of [number, 'The address was that of the neighbour.']) expect(text).toContain(words)
    expect((await whole(auditor.get(`/api/reports/${report}/document.pdf`))).equals(pdf)).toBe(true)
    expect((await auditor.get(`/api/reports/${report}`)).body.state).toBe('replaced')
    const kinds = (await soundRegister(house.services, organisation)).map(({ kind }) => kind)
    expect(kinds).toEqual(['issued', 'sealed', 'issued', 'replaced', 'sealed'])
    expect(await etagOf(auditor, report)).toMatch(/^"\d+"$/)
  })
})
