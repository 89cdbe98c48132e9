import { createHash, randomUUID } from 'node:crypto'
import sharp from 'sharp'
import { developPhoto, photographs } from '#server/commands/develop-photo.ts'
import { inOrganisation } from '#server/db.ts'
import { objectKey } from '#server/files/object-key.ts'
import { CHUNK, wholeOf } from '#server/files/upload.ts'
import { uploadLog } from '#server/queries/uploads.ts'
import type { Services } from '#server/services.ts'
import type { Cue } from './stage.ts'

const WIDTH = 1200
const HEIGHT = 900

/** A drawn board with its breakers and a notice: the demonstration shows nothing that exists. */
const board = (notice: string, breakers: number): string => `
<svg xmlns="http://www.w3.org/2000/svg" width="${WIDTH}" height="${HEIGHT}">
  <rect width="100%" height="100%" fill="#b9b4a7"/>
  <rect x="250" y="80" width="700" height="740" rx="10" fill="#e9e6dd" stroke="#8b8677" stroke-width="6"/>
  <rect x="300" y="140" width="600" height="14" fill="#9a9686"/>
  ${Array.from({ length: breakers }, (_, index) => {
    const x = 310 + (index % 10) * 58
    const y = 180 + Math.floor(index / 10) * 210
    return `<rect x="${x}" y="${y}" width="50" height="150" rx="4" fill="#f7f6f2" stroke="#77735f"/><rect x="${x + 17}" y="${y + 45}" width="16" height="34" fill="#2d3b45"/>`
  }).join('')}
  <g transform="rotate(-1.5 600 720)"><rect x="330" y="660" width="540" height="120" fill="#f4d548" stroke="#5a4d00" stroke-width="3"/>
  <text x="600" y="732" font-family="sans-serif" font-size="34" text-anchor="middle" fill="#222">${notice}</text></g>
</svg>`

export interface Picture {
  readonly report: string
  readonly name: string
  readonly notice: string
  readonly breakers: number
}

/** Sends a drawn photo the way a phone would: declared, in parts, made anew, attached. */
export async function sendPhoto(
  services: Services,
  { organisation, person, at }: Cue,
  { report, name, notice, breakers }: Picture,
): Promise<void> {
  const bytes = await sharp(Buffer.from(board(notice, breakers)))
    .jpeg({ quality: 90 })
    .toBuffer()
  const sha256 = createHash('sha256').update(bytes).digest('hex')
  const upload = {
    id: randomUUID(),
    organisation,
    uploader: person,
    name,
    size: bytes.length,
    sha256,
    state: 'open',
    expires: new Date(at.getTime() + 86_400_000),
    parts: Array.from({ length: Math.ceil(bytes.length / CHUNK) }, () => null),
  } as const
  const stored = await services.store.put(wholeOf(upload), bytes)
  if (!stored.ok) throw new Error(`A photo of the demonstration was not stored: ${stored.reason}.`)
  await inOrganisation(services.db, organisation, async (tx) => {
    const log = uploadLog(tx, { report, anchor: 'inspection' })
    await log.open(upload, at)
    await log.complete({ organisation, uploader: person }, upload.id)
  })
  await developPhoto({ ...services, clock: () => at }, photographs(), { organisation, upload: upload.id })
  await services.store.delete(objectKey({ organisation, kind: 'upload', sha256 }))
}
