import { spawn } from 'node:child_process'
import { mkdirSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, describe, expect, it } from 'vitest'
import { synthesize } from '#tools/bench/synthesize.ts'
import { PROJECT, SKERRY, skerry } from './skerry.ts'

const folder = mkdtempSync(join(tmpdir(), 'skerry-many-'))
afterAll(() => rmSync(folder, { recursive: true, force: true }))
const COUNT = 120
mkdirSync(join(folder, 'sites'))
for (let index = 0; index < COUNT; index += 1) {
  writeFileSync(
    join(folder, 'sites', `site-${String(index).padStart(3, '0')}.skerry.yaml`),
    synthesize(3 + (index % 7), index + 1),
  )
}
writeFileSync(join(folder, 'sites', 'site-060.skerry.yaml'), 'skerry: [')

describe('many files', () => {
  it('are checked in several threads, and told in their order with the same findings as one by one', () => {
    const together = JSON.parse(skerry('check', join(folder, 'sites'), '--format', 'json').stdout) as {
      files: { file: string; outcome: string; findings: unknown[] }[]
    }
    expect(together.files).toHaveLength(COUNT)
    expect(together.files.map(({ file }) => file)).toEqual(together.files.map(({ file }) => file).toSorted())
    expect(together.files[60]?.outcome).toBe('unreadable')
    const one = JSON.parse(skerry('check', together.files[7]?.file ?? '', '--format', 'json').stdout) as typeof together
    expect(together.files[7]).toEqual(one.files[0])
  })

  it('can be named by a glob', () => {
    const found = JSON.parse(
      skerry('check', join(folder, 'sites', 'site-00?.skerry.yaml'), '--format', 'json').stdout,
    ) as { files: unknown[] }
    expect(found.files).toHaveLength(10)
  })

  it('are judged by a book of the house in every thread', () => {
    const house = join(PROJECT, 'tests/cli/cases/check-by-a-book-of-ones-own/house')
    const { rulebook, files } = JSON.parse(
      skerry('check', join(folder, 'sites'), '--format', 'json', '--rulebook', house).stdout,
    ) as { rulebook: { id: string }; files: { outcome: string; rulebook?: unknown }[] }
    expect(rulebook.id).toBe('house')
    expect(files).toHaveLength(COUNT)
    expect(files.filter((file) => file.rulebook !== undefined)).toEqual([])
  })

  it('end with 2 when one of them cannot be read', () => {
    expect(skerry('check', '-q', join(folder, 'sites')).code).toBe(2)
  })
})

describe('an interrupted run', () => {
  it('ends at once and leaves nothing half-written', async () => {
    const out = join(folder, 'out')
    mkdirSync(out)
    const child = spawn(process.execPath, [
      SKERRY,
      'check',
      join(folder, 'sites'),
      '--format',
      'json',
      '-o',
      join(out, 'findings.json'),
    ])
    setTimeout(() => child.kill('SIGINT'), 120)
    await new Promise((resolve) => child.on('close', resolve))
    const left = readdirSync(out)
    expect(left.filter((name) => name !== 'findings.json')).toEqual([])
    for (const name of left) expect(JSON.parse(readFileSync(join(out, name), 'utf8')).files).toHaveLength(COUNT)
  })
})
