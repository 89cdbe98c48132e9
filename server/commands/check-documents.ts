import { createHash } from 'node:crypto'
import type { Tx } from '#server/db.ts'
import { objectKey } from '#server/files/object-key.ts'
import { DamagedObject, type ObjectStore } from '#server/files/store.ts'
import { listAudit } from '#server/queries/audit-chain.ts'
import { listCounters, listDocumentStates, listSeals } from '#server/queries/record-checks.ts'
import type { Damage } from './check-register.ts'

const damage = (where: string, what: string): Damage => ({ where, what })

/** Numbers of each year must run from 1 to the counter without a gap. */
export async function checkNumbers(tx: Tx, organisation: string): Promise<Damage[]> {
  const counters = await listCounters(tx, organisation)
  return counters
    .filter(({ last, most, count }) => last !== most || last !== count)
    .map(({ year, last, most, count }) =>
      damage(`numbers/${year}`, `the counter stands at ${last}, the highest is ${most}, there are ${count}`),
    )
}

/** What the register says last of a document, and the state that its report must then have. */
const STATES = { issued: 'issued', sealed: 'issued', replaced: 'replaced', withdrawn: 'withdrawn' } as const

/** Each document has its entry and its report the state that the register tells. */
export async function checkStates(tx: Tx, organisation: string): Promise<Damage[]> {
  const documents = await listDocumentStates(tx, organisation)
  return documents.flatMap(({ number, state, kinds }) => {
    const end = kinds.find((kind) => kind === 'replaced' || kind === 'withdrawn') ?? 'issued'
    if (!kinds.includes('issued')) return [damage(number, 'it is not in the register')]
    return STATES[end] === state ? [] : [damage(number, `its report is ${state}, the register says ${STATES[end]}`)]
  })
}

async function whole(store: ObjectStore, organisation: string, sha256: string): Promise<number | undefined> {
  const object = await store.get(objectKey({ organisation, kind: 'document', sha256 }))
  if (object === undefined) return undefined
  let size = 0
  // The store itself fails the stream when the bytes do not have the hash that names them.
  for await (const chunk of object.stream) size += chunk.length
  return size
}

/** Each sealed file must be there, whole. */
export async function checkFiles(tx: Tx, store: ObjectStore, organisation: string): Promise<Damage[]> {
  const found: Damage[] = []
  for (const { number, pdf_sha256, bytes } of await listSeals(tx, organisation)) {
    try {
      const size = await whole(store, organisation, pdf_sha256)
      if (size === undefined) found.push(damage(number, 'its sealed file is missing'))
      else if (size !== bytes) found.push(damage(number, `its sealed file has ${size} bytes instead of ${bytes}`))
    } catch (error) {
      if (!(error instanceof DamagedObject)) throw error
      found.push(damage(number, 'its sealed file was changed'))
    }
  }
  return found
}

/** Events read at a time. */
const PAGE = 2000

/** Each audit event must hash to its link. */
export async function checkAudit(tx: Tx, organisation: string): Promise<Damage[]> {
  let [sequence, hash] = [0, '']
  for (;;) {
    const rows = await listAudit(tx, organisation, sequence, PAGE)
    for (const row of rows) {
      hash = createHash('sha256').update(`${hash}${row.body}`).digest('hex')
      sequence += 1
      if (row.sequence !== sequence || row.hash !== hash) return [damage(`audit/${sequence}`, 'the chain breaks here')]
    }
    if (rows.length < PAGE) return []
  }
}
