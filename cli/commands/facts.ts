import { inks } from '#cli/formats/ink.ts'
import { colourOf, print } from '#cli/io.ts'
import { judgedFile } from '#cli/judged.ts'
import type { Sheet } from '#core/glossary.ts'
import { type Facts, factsOf } from '#core/report/facts.ts'
import { labelOf } from '#core/texts/label.ts'
import { shown } from '#core/texts/value.ts'

function table(facts: Facts, sheets: readonly Sheet[]): string {
  const ink = inks(colourOf('stdout'))
  const width = Math.max(...Object.values(facts).flatMap((known) => Object.keys(known).map((name) => name.length)))
  return sheets
    .filter(({ id }) => facts[id] !== undefined)
    .map((sheet) => {
      const rows = Object.entries(facts[sheet.id] ?? {}).map(
        ([name, { value, unit, formula }]) =>
          `  ${name.padEnd(width)}  ${shown(value, unit)}  ${ink.faint(`= ${formula}`)}`,
      )
      return `${ink.strong(labelOf(sheet))}\n${rows.join('\n')}\n`
    })
    .join('\n')
}

/** Prints every computed quantity of a file. */
export async function facts(
  file: string,
  { format, rulebook }: { readonly format: string; readonly rulebook?: string },
): Promise<void> {
  const found = await judgedFile(file, rulebook)
  if (!found) return
  const known = factsOf(found.judged)
  print(format === 'json' ? `${JSON.stringify(known, null, 2)}\n` : table(known, found.judged.sheets))
}
