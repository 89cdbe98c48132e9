import { defineConfig } from 'vitest/config'

export default defineConfig({
  test: {
    include: ['tests/**/*.test.ts'],
    globalSetup: ['tests/cli/global-setup.ts'],
    testTimeout: 30_000,
    hookTimeout: 120_000,
    pool: 'threads',
    coverage: {
      provider: 'v8',
      include: ['core/**/*.ts'],
      exclude: ['core/generated/**', 'core/**/*.d.ts'],
      reporter: ['text-summary', 'json-summary', 'json'],
      reportsDirectory: 'coverage',
      reportOnFailure: true,
    },
  },
})
