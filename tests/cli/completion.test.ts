import { spawnSync } from 'node:child_process'
import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, describe, expect, it } from 'vitest'
import { skerry } from './skerry.ts'

const folder = mkdtempSync(join(tmpdir(), 'skerry-completion-'))
afterAll(() => rmSync(folder, { recursive: true, force: true }))
mkdirSync(join(folder, 'old sites'))
writeFileSync(join(folder, 'one site.yaml'), '')
writeFileSync(join(folder, 'completion.bash'), skerry('completion', 'bash').stdout)

/** What bash offers for the last of the words. */
function offered(...words: string[]): string[] {
  const script = `source ./completion.bash; COMP_WORDS=("$@"); COMP_CWORD=$(($# - 1)); _skerry; printf '%s\\n' "\${COMPREPLY[@]}"`
  const run = spawnSync('bash', ['-c', script, 'bash', ...words], { cwd: folder, encoding: 'utf8' })
  expect(run.stderr).toBe('')
  return run.stdout.split('\n').filter(Boolean)
}

describe('completion for bash', () => {
  it.each<[string, string[], string[]]>([
    ['commands', ['skerry', 'fi'], ['fill', 'fieldsheet']],
    ['flags of the command', ['skerry', 'check', '--str'], ['--strict']],
    ['what a flag takes', ['skerry', 'check', '--format', ''], ['text', 'json', 'sarif', 'junit', 'github']],
    ['what its short form takes', ['skerry', 'facts', '-f', 'j'], ['json']],
    ['rule books', ['skerry', 'explain', '--book', ''], ['au', 'de', 'gb', 'iec']],
    ['rules by name', ['skerry', 'explain', 'no-defect'], ['no-defect-is-left']],
    ['shells', ['skerry', 'completion', ''], ['bash', 'zsh', 'fish']],
    ['files, with spaces in their names', ['skerry', 'check', 'one'], ['one site.yaml']],
    ['folders only where a folder is wanted', ['skerry', 'check', '--rulebook', 'o'], ['old sites']],
    ['nothing where anything may be typed', ['skerry', 'new', '--name', ''], []],
    ['nothing for a command that is none', ['skerry', 'chek', ''], []],
  ])('offers %s', (_, words, wanted) => {
    expect(offered(...words)).toEqual(wanted)
  })
})

describe.each(['zsh', 'fish'])('completion for %s', (shell) => {
  it('knows every command that help lists, and its flags', () => {
    const script = skerry('completion', shell).stdout
    const commands = [...skerry('--help').stdout.matchAll(/^ {2}([a-z]+) .*(?:options|<|\[)/gm)].map(([, name]) => name)
    expect(commands.length).toBeGreaterThanOrEqual(10)
    for (const command of commands) expect(script).toContain(command)
    for (const flag of ['strict', 'stdin-filename', 'dry-run', 'no-input', 'draft-07']) expect(script).toContain(flag)
  })
})
