import { visible } from '#cli/formats/visible.ts'
import { asker, endWith, exists, isTerminal, print, say, writeWhole } from '#cli/io.ts'
import { check } from '#core/engine.ts'
import { shippedShelf } from '#core/judge/shelf.ts'
import { SHIPPED_BOOKS } from '#core/judge/shipped.ts'
import { type StartAnswers, startFile } from '#core/report/start-file.ts'

interface Question {
  readonly key: keyof StartAnswers
  readonly asks: string
  readonly usual: string
  /** What can be answered, where not everything can. */
  readonly choices?: readonly string[]
}

const QUESTIONS: readonly Question[] = [
  { key: 'name', asks: 'Name of the site', usual: 'New site' },
  { key: 'operator', asks: 'Grid operator', usual: 'Fennmark Grid' },
  { key: 'earthing', asks: 'Earthing system', usual: 'TN-S', choices: ['TN-S', 'TN-C-S', 'TT'] },
  { key: 'phases', asks: 'Line conductors of the supply', usual: '3', choices: ['1', '3'] },
  { key: 'rating', asks: 'Rated current of the changeover in A', usual: '35' },
  { key: 'rulebook', asks: 'Rule book', usual: 'iec', choices: SHIPPED_BOOKS },
]

type Options = Readonly<Record<string, string | boolean>>
type Ask = (question: string) => Promise<string | undefined>

/** Asks until the answer is one of the choices; nothing where the person left. */
async function answerTo({ asks, usual, choices }: Question, ask: Ask): Promise<string | undefined> {
  const among = choices === undefined ? '' : ` (${choices.join(', ')})`
  for (;;) {
    const told = await ask(`${asks}${among} [${usual}]: `)
    if (told === undefined) return undefined
    const answer = told.trim() === '' ? usual : told.trim()
    const known = choices?.find((choice) => choice.toLowerCase() === answer.toLowerCase())
    if (choices === undefined || known !== undefined) return known ?? answer
    say(`${visible(answer)} is none of ${choices.join(', ')}.\n`)
  }
}

/** What was given by flags, asked for at a terminal, or is usual; nothing where the person left the questions. */
async function answers(options: Options): Promise<StartAnswers | undefined> {
  const asks = options['input'] !== false && isTerminal('stdin') ? await asker() : undefined
  const given: Record<string, string> = {}
  for (const question of QUESTIONS) {
    const flagged = options[question.key]
    if (typeof flagged === 'string') given[question.key] = flagged
    else {
      const told = asks ? await answerTo(question, asks.ask) : question.usual
      if (told === undefined) return undefined
      given[question.key] = told
    }
  }
  asks?.close()
  return given as unknown as StartAnswers
}

const INTERRUPTED = 130

/** Writes a commented file to start from. */
export async function newFile(file: string | undefined, options: Options): Promise<void> {
  if (file !== undefined && file !== '-' && exists(file) && options['force'] !== true) {
    say(`${file} is already there, and was left as it is. Choose another name, or add --force.\n`)
    return endWith(2)
  }
  const given = await answers(options)
  if (!given) {
    say('\nNothing was written.\n')
    return endWith(INTERRUPTED)
  }
  const text = startFile(given)
  const checked = check(text, shippedShelf())
  if (checked.kind !== 'judged') {
    say(
      `These answers make no file:\n${checked.problems.map(({ path, message }) => `  ${path.join('.')}: ${message}`).join('\n')}\n`,
    )
    return endWith(2)
  }
  if (file === undefined || file === '-') return print(text)
  const written = writeWhole(file, text)
  if (!written.ok) {
    say(`${written.message}\n`)
    return endWith(2)
  }
  say(`Wrote ${file}. Next: fill in what is marked, then skerry check ${file}.\n`)
}
