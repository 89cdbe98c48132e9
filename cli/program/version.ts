import { VERSION } from '#cli/version.ts'
import { SHIPPED_BOOKS, shippedBook } from '#core/judge/shipped.ts'

/** The format of the install file that this program reads. */
const FORMAT = 1

/** Versions of the program, the install file's format and the rule books that ship. */
export function versionText(): string {
  const books = SHIPPED_BOOKS.map((id) => `${id} ${shippedBook(id)?.version ?? ''}`)
  return `skerry ${VERSION}, install file format ${FORMAT}, rule books ${books.join(', ')}\n`
}
