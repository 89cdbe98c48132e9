import { type Command, Option } from 'commander'
import { nearest } from '#core/texts/nearest.ts'

interface FileOptions {
  readonly format: 'text' | 'json'
  readonly rulebook?: string
}

interface VerifyOptions extends FileOptions {
  readonly proof?: string
  readonly trust?: readonly string[]
}

const textOrJson = (): Option =>
  new Option('-f, --format <name>', 'how to print it').choices(['text', 'json']).default('text')
const ownBook = (): Option => new Option('--rulebook <folder>', 'a rule book of your own, which extends one that ships')
const VERIFY_EXAMPLE =
  '\nExample:\n  skerry verify FEN-2026-0012.pdf --proof FEN-2026-0012.proof.json --trust root.pem\n'
const CSV_EXAMPLE = '\nExample:\n  skerry fill site.skerry.yaml readings.csv --dry-run\n'

function help(skerry: Command, name: string | undefined): void {
  const asked = name === undefined ? skerry : skerry.commands.find((command) => command.name() === name)
  if (asked) return asked.help()
  const hint = nearest(
    name ?? '',
    skerry.commands.map((command) => command.name()),
  )
  skerry.error(`error: unknown command '${name}'${hint === undefined ? '' : `\n(Did you mean ${hint}?)`}`)
}

/** Every other command; each is loaded when it is called. */
export function addOthers(skerry: Command): void {
  skerry
    .command('facts')
    .summary('print every computed quantity')
    .argument('<file>', 'an install file, or -')
    .addOption(textOrJson())
    .addOption(ownBook())
    .action(async (file: string, options: FileOptions) => (await import('#cli/commands/facts.ts')).facts(file, options))
  skerry
    .command('explain')
    .summary("a rule's words, schema, source and examples; without a name, the list")
    .argument('[rule]', 'the name of a rule')
    .addOption(textOrJson())
    .option('-b, --book <id>', 'the rule book to list or to look in', 'iec')
    .action(async (rule: string | undefined, options: { format: string; book: string }) =>
      (await import('#cli/commands/explain.ts')).explain(rule, options),
    )
  skerry
    .command('new')
    .summary('a commented install file, from questions or flags')
    .argument('[file]', 'where to write it; standard output when left out')
    .option('--name <text>', 'name of the site')
    .option('--operator <text>', 'grid operator')
    .option('--earthing <system>', 'TN-S, TN-C-S or TT')
    .option('--phases <count>', '1 or 3')
    .option('--rating <ampere>', 'rated current of the changeover')
    .option('--rulebook <id>', 'rule book')
    .option('--force', 'write over a file that is there')
    .option('--no-input', 'ask nothing')
    .action(async (file: string | undefined, options: Record<string, string | boolean>) =>
      (await import('#cli/commands/new.ts')).newFile(file, options),
    )
  skerry
    .command('fill')
    .summary('readings from a CSV file into an install file')
    .description(
      'Writes readings into an install file; everything else stays byte for byte. Columns: path,value (readings.circuits.K1.loop.grid,0.55 ohm) or subject,reading,state,value (K1,loop,grid,0.55 ohm).',
    )
    .argument('<file>', 'an install file')
    .argument('<readings>', 'a CSV file with a head line')
    .option('-n, --dry-run', 'show what would change')
    .addOption(ownBook())
    .addHelpText('after', CSV_EXAMPLE)
    .action(async (file: string, readings: string, options: { dryRun?: true; rulebook?: string }) =>
      (await import('#cli/commands/fill.ts')).fill(file, readings, options),
    )
  skerry
    .command('diff')
    .summary('what changed between two files, by subject and value, and which verdicts flipped')
    .argument('<before>', 'an install file')
    .argument('<after>', 'an install file')
    .addOption(textOrJson())
    .addOption(ownBook())
    .action(async (before: string, after: string, options: FileOptions) =>
      (await import('#cli/commands/diff.ts')).diff(before, after, options),
    )
  for (const [name, summary] of [
    ['render', 'the report as a draft PDF'],
    ['fieldsheet', 'a sheet for the site: each test point, its limit, a box'],
  ] as const) {
    skerry
      .command(name)
      .summary(summary)
      .argument('<file>', 'an install file')
      .requiredOption('-o, --output <file>', 'the PDF to write, or - for standard output')
      .addOption(ownBook())
      .action(async (file: string, options: { output: string; rulebook?: string }) =>
        (await import('#cli/commands/render.ts')).render(name, file, options),
      )
  }
  skerry
    .command('verify')
    .summary('whether an issued report is genuine, with no server and no network')
    .description(
      'Verifies an issued report: its seal over every byte, the certificate, the file and the quantities inside, its place in the register; then computes, judges and renders the file inside anew and compares. Ends with 0 when all holds, 1 when something does not, 2 when a file cannot be read.',
    )
    .argument('<file>', 'an issued report, as PDF')
    .option('--proof <file>', 'the proof file that was handed out with it')
    .option(
      '--trust <file...>',
      'certificates that you trust, as PEM; get them from the issuer by another way than the report',
    )
    .addOption(textOrJson())
    .addOption(ownBook())
    .addHelpText('after', VERIFY_EXAMPLE)
    .action(async (file: string, options: VerifyOptions) =>
      (await import('#cli/commands/verify.ts')).verify(file, options),
    )
  skerry
    .command('send')
    .summary('send files to a server, each as a report or as the next revision of one')
    .description(
      'Sends install files to a server. What was sent already is not sent twice, so a broken line does no harm: send again. The token comes from SKERRY_TOKEN, --token-file, or the file skerry/token in your configuration folder.',
    )
    .argument('<file...>', 'install files')
    .option('--server <address>', 'the server; otherwise SKERRY_SERVER')
    .option('--token-file <file>', 'a file with the token')
    .action(async (files: readonly string[], options: { server?: string; tokenFile?: string }) =>
      (await import('#cli/commands/send.ts')).send(files, options),
    )
  skerry
    .command('schema')
    .summary('print the JSON Schema of the install file')
    .option('--draft-07', 'the twin for editors')
    .action(async (options: { draft07?: true }) => (await import('#cli/commands/schema.ts')).schema(options))
  skerry
    .command('help')
    .summary('what a command takes')
    .argument('[command]', 'the name of a command')
    .action((name: string | undefined) => help(skerry, name))
  skerry
    .command('completion')
    .summary('print a script that completes commands in a shell')
    .argument('<shell>', 'bash, zsh or fish')
    .action(async (shell: string) => (await import('#cli/commands/completion.ts')).completion(shell, skerry))
}
