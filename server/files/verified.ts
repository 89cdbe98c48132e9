import { createHash } from 'node:crypto'
import { Transform } from 'node:stream'
import { type ObjectKey, partsOf } from './object-key.ts'
import { DamagedObject } from './store.ts'

/** Passes bytes on, the last chunk only once the hash of all of them is right. */
export function verified(key: ObjectKey): Transform {
  const { sha256 } = partsOf(key)
  const hash = createHash('sha256')
  let held: Buffer | undefined
  return new Transform({
    transform(chunk: Buffer, _encoding, done) {
      hash.update(chunk)
      const before = held
      held = chunk
      done(null, before)
    },
    flush(done) {
      if (hash.digest('hex') !== sha256) return done(new DamagedObject(key))
      done(null, held)
    },
  })
}
