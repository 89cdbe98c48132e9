import { createHash } from 'node:crypto'
import { buffer } from 'node:stream/consumers'
import { fileURLToPath } from 'node:url'
import { inOrganisation } from '#server/db.ts'
import { displayName } from '#server/files/names.ts'
import { objectKey } from '#server/files/object-key.ts'
import { type PhotoLab, photoLab } from '#server/files/photo.ts'
import type { Photo, Picture } from '#server/files/photo-answer.ts'
import { photoWords } from '#server/files/photo-words.ts'
import { attach, keepFile } from '#server/queries/attachments.ts'
import { findUpload, settleUpload, type UploadRow } from '#server/queries/uploads.ts'
import type { Services } from '#server/services.ts'

const CHILD = fileURLToPath(new URL('../files/photo-child.ts', import.meta.url))

/** Where photos are decoded: in processes of their own, which know nothing of this one. */
export const photographs = (): PhotoLab => photoLab({ args: ['--import', 'tsx', CHILD] })

const sha256Of = (bytes: Uint8Array): string => createHash('sha256').update(bytes).digest('hex')

interface Kept {
  readonly picture: Picture
  readonly kind: 'photo' | 'paper photo'
  readonly sha256: string
}

/** Bytes go to the storage first and only then into the record: a row never names a file that is not there. */
async function store({ store }: Services, organisation: string, photo: Photo): Promise<readonly Kept[]> {
  const kept: Kept[] = [
    { picture: photo.stored, kind: 'photo', sha256: sha256Of(photo.stored.bytes) },
    { picture: photo.paper, kind: 'paper photo', sha256: sha256Of(photo.paper.bytes) },
  ]
  for (const { picture, kind, sha256 } of kept) {
    const key = objectKey({ organisation, kind: kind === 'photo' ? 'photo' : 'photo-paper', sha256 })
    const stored = await store.put(key, picture.bytes)
    if (!stored.ok) throw new Error(`A photo was not stored: ${stored.reason}.`)
  }
  return kept
}

async function record(
  services: Services,
  organisation: string,
  upload: UploadRow,
  taken: string | null,
  kept: readonly Kept[],
): Promise<void> {
  const now = services.clock()
  await inOrganisation(services.db, organisation, async (tx) => {
    // Two workers may have developed the same upload: the second finds it settled.
    const current = await findUpload(tx, organisation, upload.upload_id)
    if (current?.state !== 'complete') return
    const files: string[] = []
    for (const { picture, kind, sha256 } of kept)
      files.push(
        await keepFile(tx, {
          organisation,
          person: upload.person_id,
          sha256,
          kind,
          type: 'image/jpeg',
          bytes: picture.bytes.length,
          width: picture.width,
          height: picture.height,
          received: upload.sha256,
          now,
        }),
      )
    const [file = '', paper = ''] = files
    const attachment = await attach(tx, {
      organisation,
      report: upload.report_id,
      file,
      paper,
      name: displayName(upload.name),
      anchor: upload.anchor,
      taken,
      person: upload.person_id,
      now,
    })
    await settleUpload(tx, organisation, upload.upload_id, { attachment })
  })
}

/** Makes a photo anew from a complete upload and attaches it, or writes down why not. May run twice; has its effect once. */
export async function developPhoto(
  services: Services,
  lab: PhotoLab,
  job: { readonly organisation: string; readonly upload: string },
): Promise<void> {
  const { organisation } = job
  const upload = await inOrganisation(services.db, organisation, (tx) => findUpload(tx, organisation, job.upload))
  if (upload?.state !== 'complete') return
  const object = await services.store.get(objectKey({ organisation, kind: 'upload', sha256: upload.sha256 }))
  if (object === undefined) throw new Error('A complete upload is not in the storage.')
  const answer = await lab.develop(await buffer(object.stream))
  if (answer.ok)
    return await record(
      services,
      organisation,
      upload,
      answer.photo.taken,
      await store(services, organisation, answer.photo),
    )
  if (answer.problem.code === 'busy') throw new Error('Many photos are being read: this one is tried again.')
  const refusal = photoWords(answer.problem)
  await inOrganisation(services.db, organisation, (tx) => settleUpload(tx, organisation, upload.upload_id, { refusal }))
}
