import type { ObjectKey } from './object-key.ts'
import type { ObjectFacts, ObjectStore, Within } from './store.ts'

/** Where store and record differ. */
export type Difference =
  | { readonly is: 'missing'; readonly key: ObjectKey }
  | { readonly is: 'unrecorded'; readonly key: ObjectKey; readonly size: number; readonly written: Date }

/**
 * Walks the store and the record side by side and tells where one has what the other lacks.
 *
 * @param recorded keys that the record refers to, in the order of their bytes (`collate "C"`), within the same part of the store
 * @param before objects written later are left alone: their row may still be on its way
 */
export async function* reconcile(
  store: ObjectStore,
  within: Within,
  recorded: AsyncIterable<ObjectKey>,
  before: Date,
): AsyncGenerator<Difference> {
  const rows = recorded[Symbol.asyncIterator]()
  let row = await rows.next()
  for await (const found of store.list(within)) {
    while (!row.done && row.value < found.key) {
      yield { is: 'missing', key: row.value }
      row = await rows.next()
    }
    const known = !row.done && row.value === found.key
    if (!known && found.written < before) yield unrecorded(found)
    while (!row.done && row.value === found.key) row = await rows.next()
  }
  while (!row.done) {
    yield { is: 'missing', key: row.value }
    row = await rows.next()
  }
}

const unrecorded = ({ key, size, written }: ObjectFacts): Difference => ({ is: 'unrecorded', key, size, written })
