// Writes objects into a folder until it is killed. Says when it begins, so that the killing hits the writing.
import { randomBytes, randomUUID } from 'node:crypto'
import { diskStore } from '#server/files/disk-store.ts'
import { keyFor } from './keys.ts'

const root = process.argv[2] ?? ''
const store = diskStore({ root, newId: randomUUID, limit: 1_000_000 })
process.stdout.write('begun\n')
for (;;) {
  const bytes = randomBytes(150_000)
  await store.put(keyFor(bytes), bytes)
}
