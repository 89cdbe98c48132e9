import { defineConfig } from 'vitest/config'
import { FOLDERS } from '#tools/mutation/folders.ts'

const folder = FOLDERS[process.env['MUTATED'] ?? '']
if (!folder) throw new Error(`Say which folder of core is mutated: npm run mutate -- ${Object.keys(FOLDERS).join('|')}`)

/**
 * The tests that hold one folder of core, in one thread whose modules are loaded once for all test files. Generated code
 * is loaded by Node itself, and tests that start other programs are left out: a mutant is tried in a second.
 */
export default defineConfig({
  test: {
    include: [...folder.tests],
    setupFiles: ['tests/mutation.setup.ts'],
    exclude: ['tests/paper/preflight.test.ts', 'tests/paper/same-bytes.test.ts'],
    testTimeout: 10_000,
    pool: 'threads',
    isolate: false,
    maxWorkers: 1,
    server: { deps: { external: [/\/core\/generated\/.*\.js$/] } },
  },
})
