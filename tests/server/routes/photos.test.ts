import { createHash } from 'node:crypto'
import sharp from 'sharp'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { developPhoto, photographs } from '#server/commands/develop-photo.ts'
import { inOrganisation } from '#server/db.ts'
import { type Browser, type House, openHouse, source, whole } from '#tests/server/house.ts'

const PART = 262_144
const lab = photographs()

let house: House
let installer: Browser
let reviewer: Browser
let stranger: Browser
let report: string

const sha256 = (bytes: Uint8Array): string => createHash('sha256').update(bytes).digest('hex')

/** A drawn photo of a notice at a board, with noise so that it takes several parts, and with a place in its metadata. */
async function photo(): Promise<Buffer> {
  const noise = {
    create: {
      width: 700,
      height: 500,
      channels: 3 as const,
      background: '#ddd',
      noise: { type: 'gaussian' as const, mean: 128, sigma: 60 },
    },
  }
  return await sharp(noise)
    .withExif({ IFD3: { GPSLatitudeRef: 'N', GPSLatitude: '47/1 18/1 0/1' } })
    .jpeg({ quality: 98 })
    .toBuffer()
}

const declare = (browser: Browser, bytes: Uint8Array, name = 'notice-mb.jpg') =>
  browser
    .post(`/api/reports/${report}/uploads`)
    .send({ name, size: bytes.length, sha256: sha256(bytes), anchor: 'inspection/dual-supply notices' })

const sendPart = (browser: Browser, upload: string, bytes: Buffer, offset: number) =>
  browser
    .put(`/api/uploads/${upload}/parts/${offset}`)
    .set('content-type', 'application/octet-stream')
    .send(bytes.subarray(offset, offset + PART))

const develop = (upload: string) =>
  developPhoto(house.services, lab, { organisation: installer.member.organisation, upload })

async function sendAll(bytes: Buffer, name?: string): Promise<string> {
  const begun = await declare(installer, bytes, name)
  expect(begun.status).toBe(201)
  for (const offset of begun.body.missing.toReversed())
    expect((await sendPart(installer, begun.body.id, bytes, offset)).status).toBe(200)
  expect((await installer.post(`/api/uploads/${begun.body.id}/complete`)).status).toBe(200)
  return begun.body.id
}

beforeAll(async () => {
  house = await openHouse()
  const organisation = await house.organisation()
  installer = await house.signIn(await house.member(organisation, ['installer']))
  reviewer = await house.signIn(await house.member(organisation, ['reviewer']))
  stranger = await house.signIn(await house.member(await house.organisation(), ['installer']))
  const made = await installer
    .post('/api/reports?file_name=site.skerry.yaml')
    .set('content-type', 'application/yaml')
    .set('idempotency-key', 'photos of a site')
    .send(source('alder-mill-bakery'))
  report = made.body.id
})
afterAll(() => house.close())

describe('a photo from site', () => {
  it('is refused where the report is not to be seen, and the same as where there is none', async () => {
    const bytes = await photo()
    const answer = await declare(stranger, bytes)
    expect(answer.status).toBe(404)
  })

  it('is refused when it is larger than one may be, before a byte is sent', async () => {
    const answer = await installer
      .post(`/api/reports/${report}/uploads`)
      .send({ name: 'roof.jpg', size: 15_000_001, sha256: 'a'.repeat(64) })
    expect(answer.status).toBe(413)
    expect(answer.body.detail).toContain('15.0 MB')
  })

  it('cannot be completed while parts are missing, and says which', async () => {
    const bytes = await photo()
    const begun = await declare(installer, bytes, 'half.jpg')
    await sendPart(installer, begun.body.id, bytes, 0)
    const answer = await installer.post(`/api/uploads/${begun.body.id}/complete`)
    expect(answer.status).toBe(409)
    expect(answer.body.missing[0]).toBe(PART)
  })

  it('of which the bytes are others than declared is asked for again', async () => {
    const bytes = await photo()
    const begun = await declare(installer, bytes, 'other.jpg')
    const spoilt = Buffer.from(bytes)
    spoilt[1000] = (spoilt[1000] ?? 0) ^ 1
    for (const offset of begun.body.missing) await sendPart(installer, begun.body.id, spoilt, offset)
    const answer = await installer.post(`/api/uploads/${begun.body.id}/complete`)
    expect(answer.body).toMatchObject({ state: 'open', missing: begun.body.missing })
    const after = await installer.get(`/api/uploads/${begun.body.id}`)
    expect(after.body).toMatchObject({ state: 'open', missing: begun.body.missing })
  })

  it('that is no photo is refused in words, and is not attached', async () => {
    const upload = await sendAll(Buffer.from('%PDF-1.7\n'.padEnd(400)), 'really.jpg')
    await develop(upload)
    const after = await installer.get(`/api/uploads/${upload}`)
    expect(after.body.state).toBe('refused')
    expect(after.body.refusal).toContain('This is not a photo but')
    const list = await installer.get(`/api/reports/${report}/attachments`)
    expect(list.body.attachments).toEqual([])
  })

  it('comes in parts, in any order, is made anew without its place, and is attached once', async () => {
    const bytes = await photo()
    expect(bytes.length).toBeGreaterThan(PART)
    const upload = await sendAll(bytes)
    await develop(upload)
    await develop(upload)
    const after = await installer.get(`/api/uploads/${upload}`)
    expect(after.body).toMatchObject({ state: 'attached', missing: [], refusal: null })
    const list = await reviewer.get(`/api/reports/${report}/attachments`)
    expect(list.body.attachments).toMatchObject([
      { name: 'notice-mb.jpg', anchor: 'inspection/dual-supply notices', width: 700, height: 500 },
    ])
    const [attachment] = list.body.attachments
    const shown = await whole(reviewer.get(`/api/attachments/${attachment.id}/photo`))
    expect(sha256(shown)).toBe(attachment.sha256)
    expect((await sharp(shown).metadata()).exif).toBeUndefined()
    expect((await stranger.get(`/api/attachments/${attachment.id}/photo`)).status).toBe(404)
  })

  it('that was sent before is not sent again', async () => {
    const [row] = (await installer.get(`/api/reports/${report}/attachments`)).body.attachments
    expect(row).toBeDefined()
    const known = await inOrganisation(house.services.db, installer.member.organisation, (tx) =>
      tx('uploads').where('state', 'attached').first<{ sha256: string; size: number }>('sha256', 'size'),
    )
    const again = await installer
      .post(`/api/reports/${report}/uploads`)
      .send({ name: 'notice-mb.jpg', size: known.size, sha256: known.sha256 })
    expect(again.body).toMatchObject({ state: 'attached', missing: [] })
  })

  it('is taken out by who may change the report, and by nobody else', async () => {
    const [attachment] = (await installer.get(`/api/reports/${report}/attachments`)).body.attachments
    expect((await stranger.delete(`/api/attachments/${attachment.id}`)).status).toBe(404)
    expect((await installer.delete(`/api/attachments/${attachment.id}`)).status).toBe(204)
    expect((await installer.get(`/api/reports/${report}/attachments`)).body.attachments).toEqual([])
    expect((await installer.get(`/api/attachments/${attachment.id}/photo`)).status).toBe(404)
  })
})
