import { endWith, print, readText, say, writeWhole } from '#cli/io.ts'
import { readingEdits } from '#cli/readings.ts'
import { shippedShelf } from '#cli/shelf.ts'
import { check } from '#core/engine.ts'
import { normalise } from '#core/normalise/normalise.ts'
import { setValues } from '#core/read/edit.ts'
import { read } from '#core/read/read.ts'

function stop(lines: readonly string[]): void {
  say(`${lines.join('\n')}\nNothing was changed.\n`)
  endWith(2)
}

/** Lines that differ, with their numbers: edits never move a line beyond the ones they add. */
function changes(before: string, after: string): string {
  const [old, made] = [before.split('\n'), after.split('\n')]
  const gone = new Set(old)
  const kept = new Set(made)
  return [
    ...old.flatMap((line, index) => (kept.has(line) ? [] : [`- ${index + 1}: ${line.trim()}`])),
    ...made.flatMap((line, index) => (gone.has(line) ? [] : [`+ ${index + 1}: ${line.trim()}`])),
  ].join('\n')
}

/** Writes the readings of a CSV file into an install file: all of them or none, and nothing else. */
export async function fill(file: string, readings: string, { dryRun }: { readonly dryRun?: true }): Promise<void> {
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
  const checked = check(filled.text, shippedShelf())
  if (checked.kind !== 'judged')
    return stop(checked.problems.map(({ path, message }) => `${path.join('.')}: ${message}`))
  if (dryRun) return print(`${changes(text.text, filled.text)}\n`)
  const written = writeWhole(file, filled.text)
  if (!written.ok) return stop([written.message])
  say(`Wrote ${edits.edits.length} readings into ${file}.\n`)
}
