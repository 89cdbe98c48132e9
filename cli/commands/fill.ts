import { endWith, print, readText, say, writeWhole } from '#cli/io.ts'
import { lineChanges } from '#cli/line-changes.ts'
import { readingEdits } from '#cli/readings.ts'
import { shelfFor } from '#cli/shelf.ts'
import { check } from '#core/engine.ts'
import { normalise } from '#core/normalise/normalise.ts'
import { setValues } from '#core/read/edit.ts'
import { read } from '#core/read/read.ts'

function stop(lines: readonly string[]): void {
  say(`${lines.join('\n')}\nNothing was changed.\n`)
  endWith(2)
}

const changes = (before: string, after: string): string =>
  lineChanges(before, after)
    .map(({ sign, number, text }) => `${sign} ${number}: ${text}\n`)
    .join('')

/** Writes the readings of a CSV file into an install file: all of them or none, and nothing else. */
export async function fill(
  file: string,
  readings: string,
  { dryRun, rulebook }: { readonly dryRun?: true; readonly rulebook?: string },
): Promise<void> {
  const [text, csv] = [readText(file), readText(readings)]
  if (!text.ok) return stop([text.message])
  if (!csv.ok) return stop([csv.message])
  const tree = read(text.text)
  if (!tree.ok) return stop(tree.problems.map(({ range, message }) => `${file}:${range?.line ?? 1}: ${message}`))
  const edits = readingEdits(csv.text, normalise(tree.tree).install)
  if (!edits.ok) return stop(edits.faults.map((fault) => `${readings}, ${fault}`))
  const { explain } = await import('#core/read/explain.ts')
  const filled = setValues(text.text, edits.edits, explain)
  if (!filled.ok) return stop(filled.problems.map(({ path, message }) => `${path.join('.')}: ${message}`))
  const shelf = await shelfFor(rulebook)
  if (!shelf.ok) return stop([shelf.message])
  const checked = check(filled.text, shelf.shelf)
  if (checked.kind !== 'judged')
    return stop(checked.problems.map(({ path, message }) => `${path.join('.')}: ${message}`))
  if (dryRun) return print(changes(text.text, filled.text))
  const written = writeWhole(file, filled.text)
  if (!written.ok) return stop([written.message])
  say(`Wrote ${edits.edits.length} readings into ${file}.\n`)
}
