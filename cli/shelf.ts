import type { Shelf } from '#core/engine.ts'
import type { BookFolder, BookRecord } from '#core/judge/book.ts'
import type { RuleRecord } from '#core/judge/rule.ts'
import { shippedShelf } from '#core/judge/shelf.ts'
import { read } from '#core/read/read.ts'
import { readText } from './io.ts'

/** The shipped books, with one of the house where a folder is named. */
export async function shelfFor(folder: string | undefined): Promise<ShelfResult> {
  return folder === undefined ? { ok: true, shelf: shippedShelf() } : shelfWith(folder)
}

export type ShelfResult =
  | { readonly ok: true; readonly shelf: Shelf }
  | { readonly ok: false; readonly message: string }

function parsed(
  file: string,
): { readonly ok: true; readonly tree: unknown } | { readonly ok: false; readonly message: string } {
  const text = readText(file)
  if (!text.ok) return text
  const tree = read(text.text)
  if (tree.ok) return tree
  const [first] = tree.problems
  return { ok: false, message: `${file}:${first?.range?.line ?? 1}: ${first?.message ?? 'not YAML'}` }
}

function folderAt(
  folder: string,
): { readonly ok: true; readonly folder: BookFolder } | { readonly ok: false; readonly message: string } {
  const book = parsed(`${folder}/book.yaml`)
  if (!book.ok) return book
  const record = book.tree as BookRecord
  const chapters: Record<string, readonly RuleRecord[]> = {}
  for (const name of record.chapters ?? []) {
    const chapter = parsed(`${folder}/${name}.yaml`)
    if (!chapter.ok) return chapter
    chapters[name] = chapter.tree as readonly RuleRecord[]
  }
  return { ok: true, folder: { book: { ...record, parameters: record.parameters ?? {} }, chapters } }
}

/** The shipped books and one of the house, which files ask for by its id and which judges all files that ask for its base. */
async function shelfWith(folder: string): Promise<ShelfResult> {
  const found = folderAt(folder)
  if (!found.ok) return found
  const { ownBook } = await import('#core/judge/own-book.ts')
  const own = ownBook(found.folder)
  if (!own.ok)
    return {
      ok: false,
      message: `The rule book in ${folder} cannot be used:\n${own.problems.map((line) => `  ${line}`).join('\n')}`,
    }
  const shipped = shippedShelf()
  const { id, extends: base } = found.folder.book
  return {
    ok: true,
    shelf: {
      names: [...shipped.names, id],
      find: (asked) => (asked === id || asked === base ? own.book : shipped.find(asked)),
    },
  }
}
