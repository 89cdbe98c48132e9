import { gate } from './gate.ts'
import type { PhotoAnswer, PhotoProblem } from './photo-answer.ts'
import { photoKind } from './photo-kind.ts'
import { PHOTO_LIMITS } from './photo-limits.ts'
import { inOwnProcess, type PhotoProgram } from './photo-process.ts'

export interface PhotoLab {
  /** Makes a photo anew from what was uploaded, or says why not. Rejects when the signal is given. */
  develop(bytes: Uint8Array, signal?: AbortSignal): Promise<PhotoAnswer>
}

const refuse = (problem: PhotoProblem): PhotoAnswer => ({ ok: false, problem })

/** What can be told without a process: size, and kind by the first bytes. */
function atTheDoor(bytes: Uint8Array): PhotoProblem | undefined {
  if (bytes.length === 0) return { code: 'empty' }
  if (bytes.length > PHOTO_LIMITS.bytes) return { code: 'too-large', bytes: bytes.length }
  const kind = photoKind(bytes)
  return 'other' in kind ? { code: 'not-a-photo', kind: kind.other } : undefined
}

/** Photos are parsed in processes of their own, few at once; this server itself never decodes a picture. */
export function photoLab(program: PhotoProgram): PhotoLab {
  const { run } = gate(PHOTO_LIMITS.processes, PHOTO_LIMITS.waiting)
  return {
    async develop(bytes, signal) {
      const problem = atTheDoor(bytes)
      if (problem) return refuse(problem)
      const done = await run(() => inOwnProcess(bytes, program, signal))
      return done?.result ?? refuse({ code: 'busy' })
    },
  }
}
