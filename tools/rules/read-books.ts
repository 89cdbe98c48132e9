import { readdir, readFile } from 'node:fs/promises'
import { load } from 'js-yaml'
import type { BookFolder, BookRecord } from '#core/judge/book.ts'
import type { RuleRecord } from '#core/judge/rule.ts'

/** Reads one folder of rules: `book.yaml` and the chapters that it lists. */
export async function readBook(folder: string): Promise<BookFolder> {
  const book = load(await readFile(`${folder}/book.yaml`, 'utf8')) as BookRecord
  const chapters = await Promise.all(
    (book.chapters ?? []).map(async (chapter) => {
      const records = load(await readFile(`${folder}/${chapter}.yaml`, 'utf8')) as RuleRecord[]
      return [chapter, records] as const
    }),
  )
  return { book, chapters: Object.fromEntries(chapters) }
}

/** Reads every rule book of a folder, by id. */
export async function readBooks(root: string): Promise<Map<string, BookFolder>> {
  const files = await readdir(root, { recursive: true })
  const names = files.filter((name) => name.endsWith('/book.yaml')).map((name) => name.slice(0, -'/book.yaml'.length))
  const folders = await Promise.all(names.toSorted().map((name) => readBook(`${root}/${name}`)))
  return new Map(folders.map((folder) => [folder.book.id, folder]))
}
