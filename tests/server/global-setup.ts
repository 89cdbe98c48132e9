import { spawnSync } from 'node:child_process'
import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import type { TestProject } from 'vitest/node'
import { homeFor, startCluster, stopCluster } from '#tools/setup/postgres.mjs'

declare module 'vitest' {
  interface ProvidedContext {
    /** The administrator's address of this run's own PostgreSQL. */
    postgres: string
  }
}

/** The database that every test file clones: migrated once, used by nobody. */
export const TEMPLATE = 'skerry_template'

/** Starts a PostgreSQL that lasts as long as the run, and migrates the template. */
export default async function setup(project: TestProject): Promise<() => void> {
  const home = homeFor(mkdtempSync(join(tmpdir(), 'skerry-tests-')))
  const { url } = await startCluster(home, { quick: true })
  // The migrations are TypeScript, which the migrator imports by itself: it runs where that is understood.
  const prepared = spawnSync(process.execPath, ['--import', 'tsx', 'tools/setup/prepare.ts', TEMPLATE], {
    env: { ...process.env, SKERRY_ADMIN_URL: url },
    encoding: 'utf8',
  })
  if (prepared.status !== 0) stopCluster(home, 'immediate')
  if (prepared.status !== 0) throw new Error(`The test database could not be made:\n${prepared.stderr}`)
  project.provide('postgres', url)
  return () => {
    stopCluster(home, 'immediate')
    rmSync(home, { recursive: true, force: true })
  }
}
