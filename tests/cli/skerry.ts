import { spawnSync } from 'node:child_process'
import { join } from 'node:path'

export const PROJECT = join(import.meta.dirname, '../..')
/** The bundle is what the tests run. */
export const SKERRY = join(PROJECT, 'dist/skerry.cjs')

/** Runs the command line in the project's folder. */
export function skerry(...words: string[]): {
  readonly stdout: string
  readonly stderr: string
  readonly code: number | null
} {
  const { stdout, stderr, status } = spawnSync(process.execPath, [SKERRY, ...words], {
    cwd: PROJECT,
    encoding: 'utf8',
    env: { ...process.env, NO_COLOR: '1' },
    maxBuffer: 1 << 28,
  })
  return { stdout, stderr, code: status }
}
