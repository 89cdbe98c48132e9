import { spawn } from 'node:child_process'
import { copyFileSync, mkdtempSync, readdirSync, readFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { describe, expect, it } from 'vitest'
import { PROJECT, SKERRY } from './skerry.ts'

interface Shown {
  readonly text: string
  readonly code: number | null
}

/**
 * Runs the command line at a terminal that `script` (util-linux) makes, typing each answer when its question is there.
 */
function atTerminal(
  words: string,
  typed: readonly (readonly [question: string, answer: string])[] = [],
  { cwd = PROJECT, env = {} }: { readonly cwd?: string; readonly env?: Record<string, string> } = {},
): Promise<Shown> {
  const command = `stty cols 80; exec ${process.execPath} ${SKERRY} ${words}`
  const child = spawn('script', ['-qefc', command, '/dev/null'], {
    cwd,
    env: { PATH: process.env['PATH'], TERM: 'xterm', SHELL: '/bin/sh', ...env },
  })
  const waiting = [...typed]
  let [text, seen] = ['', 0]
  child.stdout.on('data', (chunk: Buffer) => {
    text += chunk.toString()
    const [next] = waiting
    if (!next || !text.slice(seen).includes(next[0])) return
    seen = text.length
    waiting.shift()
    child.stdin.write(next[1])
  })
  return new Promise((resolve) => child.on('close', (code) => resolve({ text, code })))
}

const ESCAPE = '\u001b['
const empty = (): string => mkdtempSync(join(tmpdir(), 'skerry-terminal-'))

describe('at a terminal', () => {
  it('is painted, and no line of words is wider than the terminal', async () => {
    const { text, code } = await atTerminal('check examples/wrong-in-twenty-ways.skerry.yaml')
    expect(code).toBe(1)
    expect(text).toContain(ESCAPE)
    const wide = text
      .replaceAll(/\u001b\[\d+m/g, '')
      .split(/\r?\n/)
      .filter((line) => line.startsWith('  ') && line.length > 80)
    expect(wide).toEqual([])
  })

  it.each([
    ['NO_COLOR is set', '', { NO_COLOR: '1' }],
    ['the terminal is dumb', '', { TERM: 'dumb' }],
    ['told so', '--no-color', {}],
  ])('is not painted when %s', async (_, flag, env) => {
    const { text } = await atTerminal(`check ${flag} examples/tern-farm-tt.skerry.yaml`, [], { env })
    expect(text).toContain('Nothing fails.')
    expect(text).not.toContain(ESCAPE)
  })

  it('does not wait for typed text where a file was to be piped in', async () => {
    const { text, code } = await atTerminal('check -')
    expect(text).toContain('pipe a file in')
    expect(code).toBe(2)
  })

  it('does not pour a PDF out', async () => {
    const { text, code } = await atTerminal('render examples/tern-farm-tt.skerry.yaml -o -')
    expect(text).toContain('A terminal cannot show a PDF')
    expect(code).toBe(2)
  })
})

describe('a long run', () => {
  const cwd = empty()
  const sites = Array.from({ length: 60 }, (_, index) => `site-${index}.skerry.yaml`)
  for (const site of sites) copyFileSync(join(PROJECT, 'examples/tern-farm-tt.skerry.yaml'), join(cwd, site))
  const CLEAR = '\u001b[K'

  it('tells on the terminal how far it has come where its results go elsewhere, and wipes that out at the end', async () => {
    const { text, code } = await atTerminal('check . -q > found.txt', [], { cwd })
    expect(text).toContain(`${CLEAR}16 of 60 files\r`)
    expect(text.endsWith(CLEAR)).toBe(true)
    expect(readFileSync(join(cwd, 'found.txt'), 'utf8')).toContain('60 files, 0 with something at failure level.')
    expect(code).toBe(0)
  })

  it('tells nothing between results that are shown as they come', async () => {
    const { text } = await atTerminal('check . -q', [], { cwd })
    expect(text).toContain('60 files, 0 with something at failure level.')
    expect(text).not.toContain('of 60 files')
  })
})

describe('the questions of new', () => {
  it('ask again for what is none of the choices, and take what is usual for an empty answer', async () => {
    const cwd = empty()
    const { text, code } = await atTerminal(
      'new site.skerry.yaml',
      [
        ['Name of the site', 'Mill\r'],
        ['Grid operator', '\r'],
        ['Earthing system', 'TX\r'],
        ['TX is none of TN-S, TN-C-S, TT', 'tt\r'],
        ['Line conductors', '1\r'],
        ['Rated current', '40\r'],
        ['Rule book', 'de\r'],
      ],
      { cwd },
    )
    expect(text).toContain('Wrote site.skerry.yaml')
    expect(code).toBe(0)
    const made = readFileSync(join(cwd, 'site.skerry.yaml'), 'utf8')
    for (const line of [
      'name: "Mill"',
      'operator: "Fennmark Grid"',
      'earthing: TT',
      'rated_current: 40 A',
      'rulebook: "de"',
    ])
      expect(made).toContain(line)
  })

  it.each([
    ['Ctrl-C', '\u0003'],
    ['the end of input', '\u0004'],
  ])('are left by %s with nothing written', async (_, key) => {
    const cwd = empty()
    const { text, code } = await atTerminal('new site.skerry.yaml', [['Name of the site', key]], { cwd })
    expect(text).toContain('Nothing was written.')
    expect(code).toBe(130)
    expect(readdirSync(cwd)).toEqual([])
  })

  it('are not asked when told so', async () => {
    const { text, code } = await atTerminal('new --no-input')
    expect(text).not.toContain('Name of the site')
    expect(code).toBe(0)
  })
})
