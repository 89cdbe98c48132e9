import { spawnSync } from 'node:child_process'
import { chmodSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { Ajv2020 } from 'ajv/dist/2020.js'
import addFormats from 'ajv-formats'
import { afterAll, describe, expect, it } from 'vitest'
import { PROJECT, skerry } from './skerry.ts'

const FILES = [
  'examples/wrong-in-twenty-ways.skerry.yaml',
  'examples/wrong-in-shape.skerry.yaml',
  'examples/tern-farm-tt.skerry.yaml',
]
const folder = mkdtempSync(join(tmpdir(), 'skerry-formats-'))
afterAll(() => rmSync(folder, { recursive: true, force: true }))

interface JsonOutput {
  readonly version: string
  readonly rulebook: { readonly id: string; readonly version: string; readonly hash: string }
  readonly files: readonly {
    readonly file: string
    readonly outcome: string
    readonly findings: readonly Record<string, unknown>[]
    readonly counts: Record<string, number>
  }[]
}

const jsonOf = (...words: string[]): JsonOutput => JSON.parse(skerry('check', '--format', 'json', ...words).stdout)

describe('json', () => {
  const output = jsonOf(...FILES)

  it('names program, rule book and files', () => {
    expect(output.version).toMatch(/^\d+\.\d+\.\d+$/)
    expect(output.rulebook).toMatchObject({ id: 'iec', version: '1.0.0' })
    expect(output.rulebook.hash).toMatch(/^[0-9a-f]{64}$/)
    expect(output.files.map(({ file, outcome }) => [file, outcome])).toEqual([
      [FILES[0], 'fails'],
      [FILES[1], 'unreadable'],
      [FILES[2], 'meets'],
    ])
  })

  it('gives each finding its place and words', () => {
    const [finding] = output.files[0]?.findings ?? []
    expect(Object.keys(finding ?? {})).toEqual(
      expect.arrayContaining([
        'rule',
        'subject',
        'state',
        'verdict',
        'severity',
        'message',
        'path',
        'line',
        'column',
        'related',
      ]),
    )
  })

  it('counts all verdicts, and tells those that are met only when asked', () => {
    const plain = output.files[2]
    const all = jsonOf('--all', FILES[2] ?? '').files[0]
    expect(all?.counts).toEqual(plain?.counts)
    const total = Object.values(all?.counts ?? {}).reduce((sum, count) => sum + count, 0)
    expect(all?.findings.length).toBe(total)
    expect(plain?.findings.some(({ verdict }) => verdict === 'meets')).toBe(false)
  })
})

describe('sarif', () => {
  it('passes the multitool of its makers without a single result', () => {
    const file = join(folder, 'findings.sarif')
    skerry('check', ...FILES, '--format', 'sarif', '-o', file)
    const tool = join(PROJECT, 'node_modules/@microsoft/sarif-multitool-linux/Sarif.Multitool')
    chmodSync(tool, 0o755)
    const report = join(folder, 'report.sarif')
    const run = spawnSync(tool, ['validate', file, '--output', report, '--log', 'ForceOverwrite'], {
      encoding: 'utf8',
      env: { ...process.env, DOTNET_SYSTEM_GLOBALIZATION_INVARIANT: '1' },
    })
    expect(run.stdout).toContain('1 files scanned')
    const { runs } = JSON.parse(readFileSync(report, 'utf8')) as { runs: { results: unknown[] }[] }
    expect(runs.flatMap(({ results }) => results)).toEqual([])
  })

  it('is valid by the schema that is published for it', () => {
    const ajv = new Ajv2020({ strict: false, allErrors: true })
    addFormats.default(ajv)
    // The multitool's package brings the schema along.
    const published = readFileSync(
      join(PROJECT, 'node_modules/@microsoft/sarif-multitool-linux/sarif-2.1.0.json'),
      'utf8',
    )
    const validate = ajv.compile(JSON.parse(published))
    const log = JSON.parse(
      skerry('check', ...FILES, 'nowhere/else.yaml', '--no-error-on-unmatched', '--format', 'sarif', '--all').stdout,
    )
    expect([validate(log), validate.errors]).toEqual([true, null])
    expect(log.runs[0].results.length).toBeGreaterThan(100)
    delete log.runs[0].tool
    expect(validate(log)).toBe(false)
  })

  it('holds a departure back with its reason', () => {
    const departing = join(folder, 'departs.yaml')
    const text = readFileSync(join(PROJECT, 'examples/alder-mill-bakery.skerry.yaml'), 'utf8')
    writeFileSync(
      departing,
      text.replace(
        'departures: []',
        'departures: [ { rule: no-defect-is-left, subject: installation, reason: gland ordered, agreed_by: customer, on: 2026-10-13 } ]',
      ),
    )
    const { runs } = JSON.parse(skerry('check', departing, '--format', 'sarif').stdout) as {
      runs: { results: { ruleId: string; suppressions?: { justification: string }[] }[] }[]
    }
    const held = runs[0]?.results.find(({ ruleId }) => ruleId === 'no-defect-is-left')
    expect(held?.suppressions?.[0]?.justification).toContain('gland ordered')
  })
})

describe('junit', () => {
  it('is valid by its schema', () => {
    const file = join(folder, 'findings.xml')
    skerry('check', ...FILES, '--format', 'junit', '-o', file)
    const run = spawnSync('xmllint', ['--noout', '--schema', join(PROJECT, 'tests/judges/junit.xsd'), file], {
      encoding: 'utf8',
    })
    expect(run.stderr).toContain('validates')
  })
})

describe('github', () => {
  it('caps each kind of annotation and says so, worst first', () => {
    const lines = skerry('check', FILES[0] ?? '', '--format', 'github').stdout.split('\n')
    expect(lines.filter((line) => line.startsWith('::error file'))).toHaveLength(10)
    expect(lines[10]).toMatch(/^::error::and \d+ more/)
  })
})

describe('several formats in one run', () => {
  it('go each to its own file', () => {
    const [one, two] = [join(folder, 'a.json'), join(folder, 'b.xml')]
    const { stdout, code } = skerry(
      'check',
      FILES[2] ?? '',
      '--format',
      'json',
      '-o',
      one,
      '--format',
      'junit',
      '-o',
      two,
    )
    expect([stdout, code]).toEqual(['', 0])
    expect(JSON.parse(readFileSync(one, 'utf8')).files).toHaveLength(1)
    expect(readFileSync(two, 'utf8')).toContain('<testsuites>')
  })
})
