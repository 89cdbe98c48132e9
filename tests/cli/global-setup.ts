import { spawnSync } from 'node:child_process'
import { existsSync, readdirSync, statSync } from 'node:fs'
import { join } from 'node:path'
import { PROJECT } from './skerry.ts'

/** What the bundle is made of. */
const SOURCES = ['cli', 'core', 'schemas', 'tools/build', 'package.json', 'package-lock.json']
/** What a build writes last. */
const NEWEST = join(PROJECT, 'dist/skerry-main.cache')

function changedAfter(time: number, path: string): boolean {
  const status = statSync(path)
  if (!status.isDirectory()) return status.mtimeMs > time
  return readdirSync(path).some((name) => changedAfter(time, join(path, name)))
}

const stale = (): boolean =>
  !existsSync(NEWEST) || SOURCES.some((source) => changedAfter(statSync(NEWEST).mtimeMs, join(PROJECT, source)))

/** Builds the bundle that the tests of the command line run, where a source is newer than it. */
export default function setup(): void {
  if (!stale()) return
  const built = spawnSync('npm', ['run', '--silent', 'build'], { cwd: PROJECT, encoding: 'utf8' })
  if (built.status !== 0) throw new Error(`The bundle could not be built:\n${built.stderr}`)
}
