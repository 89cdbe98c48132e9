import { defineConfig } from 'vitest/config'

const shared = { testTimeout: 30_000, hookTimeout: 120_000 }

export default defineConfig({
  test: {
    projects: [
      {
        test: {
          ...shared,
          name: 'engine',
          include: ['tests/**/*.test.ts'],
          exclude: ['tests/server/**'],
          globalSetup: ['tests/cli/global-setup.ts'],
          pool: 'threads',
        },
      },
      {
        test: {
          ...shared,
          name: 'server',
          include: ['tests/server/**/*.test.ts'],
          globalSetup: ['tests/cli/global-setup.ts', 'tests/server/global-setup.ts'],
          pool: 'forks',
        },
      },
    ],
    coverage: {
      provider: 'v8',
      include: ['core/**/*.ts'],
      exclude: ['core/generated/**', 'core/**/*.d.ts', 'tests/**'],
      reporter: ['text-summary', 'json-summary', 'json'],
      reportsDirectory: 'coverage',
      reportOnFailure: true,
    },
  },
})
