import { spawnSync } from 'node:child_process'
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, describe, expect, it } from 'vitest'
import { pemOf } from '#core/seal/pem.ts'
import { person, root } from '../core/seal/people.ts'
import { proofOf, report, sha256 } from '../core/verify/issued.ts'
import { SKERRY } from './skerry.ts'

const folder = mkdtempSync(join(tmpdir(), 'skerry-verify-'))
afterAll(() => rmSync(folder, { recursive: true }))

const put = (name: string, content: string | Uint8Array): string => {
  const path = join(folder, name)
  writeFileSync(path, content)
  return path
}

put('report.pdf', report)
put(
  'changed.pdf',
  report.map((byte, at) => (at === report.length >> 1 ? byte ^ 1 : byte)),
)
put('proof.json', await proofOf())
put('root.pem', pemOf(root.certificates[0]))
put('stranger.pem', pemOf(person('Stranger', 'authority').certificates[0]))
put('words.txt', 'no certificate\n')

/** Runs the bundle in an empty folder with nothing but the files above: no project, no database, no network is asked for. */
function skerry(...words: string[]): {
  readonly stdout: string
  readonly stderr: string
  readonly code: number | null
} {
  const { stdout, stderr, status } = spawnSync(process.execPath, [SKERRY, 'verify', ...words], {
    cwd: folder,
    encoding: 'utf8',
    env: { PATH: process.env['PATH'], NO_COLOR: '1' },
  })
  return { stdout, stderr, code: status }
}

describe('skerry verify ends with 2', () => {
  it.each([
    ['where the file is not there', ['none.pdf'], 'Cannot read none.pdf: there is no such file.'],
    ['where the file is no PDF', ['words.txt'], 'words.txt is no PDF.'],
    ['where the proof is not there', ['report.pdf', '--proof', 'none.json'], 'Cannot read none.json'],
    ['where the trusted certificate is not there', ['report.pdf', '--trust', 'none.pem'], 'Cannot read none.pem'],
    [
      'where what is to be trusted is no certificate',
      ['report.pdf', '--trust', 'words.txt'],
      'words.txt holds no certificate',
    ],
    ['where the rule book is not there', ['report.pdf', '--rulebook', 'none'], 'none'],
    ['where nothing is named', [], 'missing required argument'],
  ])('%s', (_, words, said) => {
    const { stdout, stderr, code } = skerry(...words)
    expect({ stdout, code }).toEqual({ stdout: '', code: 2 })
    expect(stderr).toContain(said)
  })
})

describe('skerry verify ends with 1', () => {
  it('where the file was changed, and says what does not hold', () => {
    const { stdout, code } = skerry('changed.pdf', '--trust', 'root.pem')
    expect(code).toBe(1)
    expect(stdout).toContain('✗ ')
    expect(stdout).toContain('Do not rely on this file')
  })

  it('where somebody else is trusted', () => {
    const { stdout, code } = skerry('report.pdf', '--trust', 'stranger.pem')
    expect(code).toBe(1)
    expect(stdout).toContain('✗ No certificate that is trusted here has issued that of')
  })

  it('where the proof is none', () => {
    const { stdout, code } = skerry('report.pdf', '--proof', 'words.txt')
    expect(code).toBe(1)
    expect(stdout).toContain('✗ This is no proof file of Skerry')
  })
})

describe('skerry verify ends with 0', () => {
  it('where all holds, with the proof and the root', () => {
    const { stdout, stderr, code } = skerry('report.pdf', '--proof', 'proof.json', '--trust', 'root.pem')
    expect({ stderr, code }).toEqual({ stderr: '', code: 0 })
    expect(stdout).toContain('report.pdf: FEN-2026-0012, issued 2026-10-21T09:30:00Z, sealed 2026-10-21T09:30:05Z')
    expect(stdout).toContain(`SHA-256 ${sha256(report)}`)
    expect(stdout).toContain('✓ Rendered anew from the embedded file, every page is the same to the last byte.')
    expect(stdout).toMatch(/\nIt holds, in \d+ checks\.\n$/)
    expect(stdout).not.toMatch(/[✗○]/)
  })

  it('where nobody is trusted, and leaves that open', () => {
    const { stdout, code } = skerry('report.pdf')
    expect(code).toBe(0)
    expect(stdout).toContain('○ The certificate is that of')
    expect(stdout).toContain('1 of them could not be settled')
  })

  it('and tells programs each check by its name', () => {
    const { stdout, code } = skerry('report.pdf', '--proof', 'proof.json', '--trust', 'root.pem', '--format', 'json')
    const told = JSON.parse(stdout)
    expect(code).toBe(0)
    expect(told).toMatchObject({
      file: 'report.pdf',
      number: 'FEN-2026-0012',
      holds: true,
      sha256: sha256(report),
      differences: [],
    })
    expect(told.checks.map(({ id }: { readonly id: string }) => id)).toContain('pages')
    for (const check of told.checks)
      expect(check).toEqual({ id: expect.any(String), holds: true, open: false, says: expect.any(String) })
  })
})
