import { Command, CommanderError, Option } from 'commander'
import { endWith, keepDetails, leave, onUncaught, print, say } from './io.ts'
import { addCheck } from './program/check.ts'
import { addOthers } from './program/others.ts'
import { versionText } from './program/version.ts'

const EXAMPLES = `
Examples:
  skerry new my-site.skerry.yaml          a commented file to start from
  skerry check my-site.skerry.yaml        what is wrong, where, and what to do
  skerry fieldsheet my-site.skerry.yaml -o sheet.pdf
  skerry render my-site.skerry.yaml -o draft.pdf
  skerry explain loop-was-read-on-the-grid

Verification is work for skilled persons. Local codes and licensed practice come before anything printed here.
`

/** The command that is called most is made without the others, which only help and suggestions would need. */
function program(called: string | undefined): Command {
  const skerry = new Command('skerry')
    .description(
      'Computes, judges and typesets test reports for buildings with photovoltaics, a battery and automatic changeover.',
    )
    .configureOutput({ writeOut: print, writeErr: say })
    .addOption(new Option('-V, --version', 'print the versions of program, format and rule books'))
    .on('option:version', () => {
      print(versionText())
      throw new CommanderError(0, 'skerry.version', '')
    })
    .addHelpText('after', EXAMPLES)
    .showSuggestionAfterError()
    .showHelpAfterError('Add --help to see what this command takes.')
    .helpCommand(false)
    .exitOverride()
  addCheck(skerry)
  if (called !== 'check') addOthers(skerry)
  return skerry
}

/** Wrong use and asked-for help end the parsing; everything else that is thrown is a fault of ours. */
function ended(error: unknown): void {
  if (error instanceof CommanderError) {
    endWith(error.exitCode === 0 ? 0 : 2)
    return
  }
  const file = keepDetails(error)
  const where =
    file === undefined
      ? 'The details could not be written anywhere.'
      : `The details are in ${file}; please send them along when you report this.`
  // Node.js adds lines of its own to some messages.
  const [message = ''] = (error instanceof Error ? error.message : String(error)).split('\n')
  say(`Something went wrong inside Skerry: ${message}\nYour files are as they were. ${where}\n`)
  endWith(2)
}

/** Runs the command line. */
export async function main(words: readonly string[]): Promise<void> {
  onUncaught((error) => {
    ended(error)
    leave()
  })
  const skerry = program(words[0])
  try {
    if (words.length === 0) {
      skerry.outputHelp({ error: true })
      endWith(2)
      leave()
    }
    await skerry.parseAsync([...words], { from: 'user' })
  } catch (error) {
    ended(error)
  }
  leave()
}
