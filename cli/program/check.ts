import { type Command, Option } from 'commander'
import { FORMAT_NAMES } from '#cli/formats/formats.ts'
import { Outputs } from './outputs.ts'

interface Raw {
  readonly strict?: true
  readonly all?: true
  readonly quiet?: true
  readonly verbose?: true
  readonly watch?: true
  readonly color?: boolean
  readonly stdinFilename?: string
  readonly rulebook?: string
  readonly errorOnUnmatched: boolean
}

/** `skerry check`. */
export function addCheck(skerry: Command): void {
  const outputs = new Outputs()
  skerry
    .command('check')
    .summary('validate, compute and judge install files')
    .description(
      'Validates, computes and judges install files. Ends with 0 when nothing fails, 1 when something does, 2 when a file cannot be read or the command is used wrongly.',
    )
    .argument('<paths...>', 'files, folders, globs, or - for standard input')
    .addOption(
      new Option('-f, --format <name>', `${FORMAT_NAMES.join(', ')}; several, each with its own -o`).argParser((word) =>
        outputs.format(word),
      ),
    )
    .addOption(
      new Option('-o, --output <file>', 'write the format before it to a file').argParser((file) =>
        outputs.output(file),
      ),
    )
    .option('--json', 'the same as --format json')
    .on('option:json', () => outputs.format('json'))
    .option('--strict', 'also end with 1 for what is not shown or lies inside the uncertainty')
    .option('--all', 'tell also what is met and what does not apply')
    .option('-q, --quiet', 'one line a file')
    .option('-v, --verbose', 'tell everything that is not shown, and every place involved')
    .option('-w, --watch', 'check again whenever a file changes')
    .option('--color', 'paint, also where the output is no terminal')
    .option('--no-color', 'do not paint')
    .option('--stdin-filename <name>', 'what to call standard input')
    .option('--rulebook <folder>', 'a rule book of your own, which extends one that ships')
    .option('--no-error-on-unmatched', 'do not mind a path that matches nothing')
    .addHelpText(
      'after',
      '\nExamples:\n  skerry check site.skerry.yaml\n  skerry check sites/ --format sarif -o findings.sarif --format text\n  cat site.yaml | skerry check - --stdin-filename site.yaml\n',
    )
    .action(async (paths: string[], raw: Raw, command: Command) => {
      const { check, usualFormat } = await import('#cli/commands/check.ts')
      const formats = outputs.all(usualFormat())
      if (typeof formats === 'string') return command.error(`error: ${formats}`)
      await check(paths, {
        formats,
        strict: raw.strict ?? false,
        all: raw.all ?? false,
        quiet: raw.quiet ?? false,
        verbose: raw.verbose ?? false,
        watch: raw.watch ?? false,
        color: raw.color,
        stdinFilename: raw.stdinFilename,
        rulebook: raw.rulebook,
        errorOnUnmatched: raw.errorOnUnmatched,
      })
    })
}
