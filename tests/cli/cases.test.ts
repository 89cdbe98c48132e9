import { spawnSync } from 'node:child_process'
import { cpSync, existsSync, mkdtempSync, readdirSync, readFileSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterEach, describe, expect, it } from 'vitest'
import { PROJECT, SKERRY } from './skerry.ts'

const CASES = join(PROJECT, 'tests/cli/cases')

const made: string[] = []
afterEach(() => {
  for (const folder of made.splice(0)) rmSync(folder, { recursive: true, force: true })
})

/** Each folder is a case: `cmd` is what is typed, the other files lie around, `stdout`, `stderr` and `code` are what comes. */
describe('the command line', () => {
  it.each(readdirSync(CASES))('%s', (name) => {
    const source = join(CASES, name)
    const folder = mkdtempSync(join(tmpdir(), 'skerry-case-'))
    made.push(folder)
    cpSync(source, folder, { recursive: true })
    cpSync(join(PROJECT, 'examples'), join(folder, 'examples'), { recursive: true })
    const words = readFileSync(join(source, 'cmd'), 'utf8').split(/\s+/).filter(Boolean)
    const input = existsSync(join(source, 'stdin')) ? readFileSync(join(source, 'stdin')) : ''
    const run = spawnSync(process.execPath, [SKERRY, ...words], {
      cwd: folder,
      input,
      encoding: 'utf8',
      env: { PATH: process.env['PATH'], NO_COLOR: '1' },
    })
    const wanted = (file: string): string =>
      existsSync(join(source, file)) ? readFileSync(join(source, file), 'utf8') : ''
    expect({ stderr: run.stderr, stdout: run.stdout, code: `${run.status}\n` }).toEqual({
      stderr: wanted('stderr'),
      stdout: wanted('stdout'),
      code: wanted('code'),
    })
    for (const file of readdirSync(source).filter((entry) => entry.endsWith('.after'))) {
      expect(readFileSync(join(folder, file.replace(/\.after$/, '')), 'utf8')).toBe(
        readFileSync(join(source, file), 'utf8'),
      )
    }
  })
})
