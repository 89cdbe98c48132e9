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

const has = (shell: string): boolean => spawnSync(shell, ['--version']).status === 0

describe.skipIf(!has('fish'))('completion for fish, sourced by it', () => {
  writeFileSync(join(folder, 'skerry.fish'), skerry('completion', 'fish').stdout)

  it.each([
    ['commands', 'skerry fi', ['fieldsheet', 'fill']],
    ['flags of the command', 'skerry check --str', ['--strict']],
    ['what a flag takes', 'skerry check --format ', ['github', 'json', 'junit', 'sarif', 'text']],
    ['rule books', 'skerry explain --book ', ['au', 'de', 'gb', 'iec']],
    ['shells', 'skerry completion ', ['bash', 'fish', 'zsh']],
    ['files, with spaces in their names', 'skerry check one', ['one site.yaml']],
  ])('offers %s', (_, line, wanted) => {
    const asked = `source ./skerry.fish; complete --do-complete '${line}'`
    const run = spawnSync('fish', ['--no-config', '-c', asked], { cwd: folder, encoding: 'utf8' })
    expect(run.stderr).toBe('')
    const words = run.stdout.split('\n').filter(Boolean)
    expect(words.map((word) => word.split('\t')[0]?.replaceAll('\\ ', ' ')).toSorted()).toEqual(wanted)
  })
})

/** What stands on the line, and what is listed below it, after a tab in an interactive zsh. */
function afterTab(line: string): string {
  const script = [
    'zmodload zsh/zpty',
    `zpty shell 'PS1="> " TERM=dumb zsh -f -i'`,
    'zpty -w shell "autoload -Uz compinit && compinit -u -D; setopt no_always_last_prompt; LISTMAX=0"',
    'zpty -w shell "source ./_skerry; echo READ\\Y"',
    'zpty -r -m shell seen "*READY*"',
    `zpty -w -n shell ${JSON.stringify(line)}$'\t'`,
    'sleep 1.5',
    // An echo behind the line tells when all of it was shown.
    `zpty -w -n shell $'\x15echo DO\\\\NE\n'`,
    'zpty -r -m shell seen "*DONE*"',
    'print -r -- $seen',
    'zpty -d shell',
  ]
  const run = spawnSync('zsh', ['-f', '-c', script.join('\n')], { cwd: folder, encoding: 'utf8', timeout: 20_000 })
  return `${run.stdout}${run.stderr}`
}

describe.skipIf(!has('zsh'))('completion for zsh, sourced by it', () => {
  writeFileSync(join(folder, '_skerry'), skerry('completion', 'zsh').stdout)

  it.each([
    ['commands', 'skerry fi', ['fieldsheet', 'fill']],
    ['a flag of the command, written out', 'skerry check --str', ['--strict']],
    ['what a flag takes', 'skerry check --format ', ['github', 'json', 'junit', 'sarif', 'text']],
    ['rule books', 'skerry explain --book ', ['au', 'de', 'gb', 'iec']],
    ['a file, with the space in its name held together', 'skerry check one', ['one\\ site.yaml']],
  ])(
    'offers %s',
    (_, line, wanted) => {
      const shown = afterTab(line)
      expect(shown).not.toMatch(/error|not found|can only be called/)
      for (const word of wanted) expect(shown).toContain(word)
    },
    30_000,
  )
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
