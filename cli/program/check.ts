import { type Command, InvalidArgumentError, Option } from 'commander'
import type { CheckOptions } from '#cli/commands/check.ts'
import { FORMAT_NAMES, type FormatName } from '#cli/formats/formats.ts'
import { nearest } from '#core/texts/nearest.ts'

interface Raw {
  readonly format: readonly FormatName[]
  readonly output: readonly string[]
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

function format(word: string, before: readonly FormatName[]): readonly FormatName[] {
  const known = FORMAT_NAMES.find((name) => name === word)
  if (known) return [...before, known]
  const hint = nearest(word, FORMAT_NAMES)
  throw new InvalidArgumentError(
    `There is no format ${word}${hint === undefined ? '' : `: did you mean ${hint}?`} Formats: ${FORMAT_NAMES.join(', ')}.`,
  )
}

const collect = (word: string, before: readonly string[]): readonly string[] => [...before, word]

/** Each --format takes the --output of the same turn; the last ones without a file go to standard output. */
function pairs(formats: readonly FormatName[], outputs: readonly string[]): CheckOptions['formats'] {
  return formats.map((name, index) => ({ format: name, output: outputs[index] }))
}

/** `skerry check`. */
export function addCheck(skerry: Command): void {
  skerry
    .command('check')
    .summary('validate, compute and judge install files')
    .description(
      'Validates, computes and judges install files. Ends with 0 when nothing fails, 1 when something does, 2 when a file cannot be read or the command is used wrongly.',
    )
    .argument('<paths...>', 'files, folders, globs, or - for standard input')
    .addOption(
      new Option('-f, --format <name>', `${FORMAT_NAMES.join(', ')}; several, each with its own -o`)
        .argParser(format)
        .default([], 'text'),
    )
    .addOption(
      new Option('-o, --output <file>', 'write the format to a file instead')
        .argParser(collect)
        .default([], 'standard output'),
    )
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
    .action(async (paths: string[], raw: Raw) => {
      const { check, usualFormat } = await import('#cli/commands/check.ts')
      await check(paths, {
        formats: pairs(raw.format.length === 0 ? [usualFormat()] : raw.format, raw.output),
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
