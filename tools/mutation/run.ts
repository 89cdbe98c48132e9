// npm run mutate -- FOLDER …: the mutation score of folders of core, each tried by its own tests.
import { Stryker } from '@stryker-mutator/core'
import { FOLDERS, type Mutated } from './folders.ts'

const names = process.argv.slice(2)
const unknown = names.filter((name) => !Object.hasOwn(FOLDERS, name))
if (names.length === 0 || unknown.length > 0) {
  const found = unknown.length > 0 ? `There is no ${unknown.join(', ')}. ` : ''
  process.stderr.write(`${found}Say which folders of core to mutate, of: ${Object.keys(FOLDERS).join(' ')}\n`)
  process.exit(2)
}

for (const name of names) {
  const folder = FOLDERS[name]
  if (folder) await mutate(name, folder)
}

/** What survives is in reports/mutation/NAME.json; a second run tries again only what changed. */
async function mutate(name: string, { sources, wordy }: Mutated): Promise<void> {
  // The tests' own settings (tests/mutation.config.ts) look here for what to run.
  process.env['MUTATED'] = name
  const stryker = new Stryker({
    packageManager: 'npm',
    testRunner: 'vitest',
    vitest: { configFile: 'tests/mutation.config.ts' },
    mutate: [...sources, '!core/**/*.d.ts'],
    mutator: { plugins: null, excludedMutations: wordy ? ['StringLiteral'] : [] },
    coverageAnalysis: 'perTest',
    // A table of a module is built before any test: it would take a fresh process for each of its mutants.
    ignoreStatic: true,
    concurrency: 1,
    timeoutMS: 4000,
    reporters: ['clear-text', 'json'],
    clearTextReporter: { logTests: false, reportTests: false, reportMutants: false, reportScoreTable: true },
    jsonReporter: { fileName: `reports/mutation/${name}.json` },
    incremental: true,
    incrementalFile: `reports/mutation/${name}-incremental.json`,
    tempDirName: `.stryker-tmp/${name}`,
    ignorePatterns: ['dist', 'coverage', '.data'],
    disableTypeChecks: false,
  })
  await stryker.runMutationTest()
}
