import { defineConfig } from 'vitest/config'

/** The tests that hold core itself, without those that start other programs: a mutant is tried in seconds. */
export default defineConfig({
  test: { include: ['tests/core/**/*.test.ts'], testTimeout: 10_000, pool: 'threads' },
})
