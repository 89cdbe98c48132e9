import { asker, endWith, exists, isTerminal, print, say, writeWhole } from '#cli/io.ts'
import { shippedShelf } from '#cli/shelf.ts'
import { check } from '#core/engine.ts'
import { type StartAnswers, startFile } from '#core/report/start-file.ts'

interface Question {
  readonly key: keyof StartAnswers
  readonly flag: string
  readonly asks: string
  readonly usual: string
}

const QUESTIONS: readonly Question[] = [
  { key: 'name', flag: 'name', asks: 'Name of the site', usual: 'New site' },
  { key: 'operator', flag: 'operator', asks: 'Grid operator', usual: 'Fennmark Grid' },
  { key: 'earthing', flag: 'earthing', asks: 'Earthing system (TN-S, TN-C-S, TT)', usual: 'TN-S' },
  { key: 'phases', flag: 'phases', asks: 'Line conductors of the supply (1 or 3)', usual: '3' },
  { key: 'rating', flag: 'rating', asks: 'Rated current of the changeover in A', usual: '35' },
  { key: 'rulebook', flag: 'rulebook', asks: 'Rule book (iec, gb, de, au)', usual: 'iec' },
]

type Options = Readonly<Record<string, string | boolean>>

async function answers(options: Options): Promise<StartAnswers> {
  const asks = options['input'] !== false && isTerminal('stdin') ? await asker() : undefined
  const given: Record<string, string> = {}
  for (const { key, flag, asks: question, usual } of QUESTIONS) {
    const flagged = options[flag]
    const told = typeof flagged === 'string' ? flagged : await asks?.ask(`${question} [${usual}]: `)
    given[key] = told === undefined || told.trim() === '' ? usual : told.trim()
  }
  asks?.close()
  return given as unknown as StartAnswers
}

/** Writes a commented file to start from. */
export async function newFile(file: string | undefined, options: Options): Promise<void> {
  if (file !== undefined && exists(file) && options['force'] !== true) {
    say(`${file} is already there, and was left as it is. Choose another name, or add --force.\n`)
    return endWith(2)
  }
  const text = startFile(await answers(options))
  const checked = check(text, shippedShelf())
  if (checked.kind !== 'judged') {
    say(
      `These answers make no file:\n${checked.problems.map(({ path, message }) => `  ${path.join('.')}: ${message}`).join('\n')}\n`,
    )
    return endWith(2)
  }
  if (file === undefined) return print(text)
  const written = writeWhole(file, text)
  if (!written.ok) {
    say(`${written.message}\n`)
    return endWith(2)
  }
  say(`Wrote ${file}. Next: fill in what is marked, then skerry check ${file}.\n`)
}
