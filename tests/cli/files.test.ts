import { spawn, spawnSync } from 'node:child_process'
import {
  appendFileSync,
  chmodSync,
  copyFileSync,
  cpSync,
  lstatSync,
  mkdirSync,
  mkdtempSync,
  readdirSync,
  readFileSync,
  renameSync,
  rmSync,
  statSync,
  symlinkSync,
  truncateSync,
  writeFileSync,
} from 'node:fs'
import { tmpdir } from 'node:os'
import { dirname, join } from 'node:path'
import { afterAll, describe, expect, it } from 'vitest'
import { PROJECT, SKERRY, skerry } from './skerry.ts'

const folder = mkdtempSync(join(tmpdir(), 'skerry-files-'))
afterAll(() => rmSync(folder, { recursive: true, force: true }))
const SOUND = join(PROJECT, 'examples/tern-farm-tt.skerry.yaml')
const WRONG = join(PROJECT, 'examples/wrong-in-twenty-ways.skerry.yaml')

describe('a file that is filled', () => {
  it('stays what it was to the system: a link stays a link, and who may read it does not change', () => {
    const [file, link, readings] = ['own.yaml', 'link.yaml', 'readings.csv'].map((name) => join(folder, name))
    if (!file || !link || !readings) throw new Error('three names')
    copyFileSync(SOUND, file)
    chmodSync(file, 0o640)
    symlinkSync(file, link)
    writeFileSync(readings, 'path,value\nreadings.circuits.K1.continuity,0.33 ohm\n')
    expect(skerry('fill', link, readings).code).toBe(0)
    expect(lstatSync(link).isSymbolicLink()).toBe(true)
    expect(statSync(file).mode & 0o777).toBe(0o640)
    expect(readFileSync(file, 'utf8')).toBe(
      readFileSync(SOUND, 'utf8').replace('K1: { continuity: 0.32 ohm', 'K1: { continuity: 0.33 ohm'),
    )
  })
})

describe('a file that is far too long', () => {
  it('is refused before it is read', () => {
    const file = join(folder, 'giant.yaml')
    writeFileSync(file, '')
    truncateSync(file, 5_000_000_000)
    const { stdout, code } = skerry('check', file)
    expect(stdout).toContain('5000000000 bytes')
    expect(stdout).toContain('too-large')
    expect(code).toBe(2)
  })
})

describe('a reader that goes away', () => {
  it('changes neither the way the command ends nor is it complained about', () => {
    const run = spawnSync(
      'bash',
      ['-c', `${process.execPath} ${SKERRY} check --all ${WRONG} | head -c 1; echo \${PIPESTATUS[0]}`],
      {
        encoding: 'utf8',
      },
    )
    expect(run.stdout.trim().endsWith('1')).toBe(true)
    expect(run.stderr).toBe('')
  })
})

describe('a findings file', () => {
  it('names a file by a whole URI where it was named from the root', () => {
    const odd = join(folder, 'a b#c.skerry.yaml')
    copyFileSync(WRONG, odd)
    const { runs } = JSON.parse(skerry('check', odd, '--format', 'sarif').stdout) as {
      runs: { results: { locations: { physicalLocation: { artifactLocation: { uri: string } } }[] }[] }[]
    }
    const uri = runs[0]?.results[0]?.locations[0]?.physicalLocation.artifactLocation.uri
    expect(uri).toBe(`file://${folder}/a%20b%23c.skerry.yaml`)
  })
})

describe('the bundle', () => {
  /** A copy of what was built, in which something is amiss. */
  function spoiled(name: string, spoil: (dist: string) => void): string {
    const dist = join(folder, name)
    cpSync(dirname(SKERRY), dist, { recursive: true })
    spoil(dist)
    return join(dist, 'skerry.cjs')
  }

  it.each([
    ['is damaged', (file: string) => writeFileSync(file, 'not compiled code')],
    ['is missing', (file: string) => rmSync(file)],
  ])('runs also when the compiled code beside it %s', (name, spoil) => {
    const command = spoiled(name.replaceAll(' ', '-'), (dist) => spoil(join(dist, 'skerry-main.cache')))
    const { stdout, status } = spawnSync(process.execPath, [command, 'check', '-q', SOUND], { encoding: 'utf8' })
    expect(stdout).toContain('Nothing fails.')
    expect(status).toBe(0)
  })

  it('keeps the details of what should not have happened in a file, and shows no stack', () => {
    const command = spoiled('no-pages', (dist) => rmSync(join(dist, 'rule-pages.json')))
    const { stderr, status } = spawnSync(process.execPath, [command, 'explain'], {
      encoding: 'utf8',
      env: { ...process.env, TMPDIR: folder },
    })
    expect(status).toBe(2)
    expect(stderr).toContain('Something went wrong inside Skerry')
    expect(stderr).not.toMatch(/^\s+at /m)
    const kept = /The details are in (\S+);/.exec(stderr)?.[1] ?? ''
    expect(readFileSync(kept, 'utf8')).toMatch(/^\s+at /m)
  })
})

describe('watching', () => {
  interface Watching {
    /** Output of the run of that number, once it is there. */
    readonly run: (number: number) => Promise<string>
    readonly said: () => string
    readonly end: () => Promise<string | null>
  }

  function watching(...words: string[]): Watching {
    const child = spawn(process.execPath, [SKERRY, 'check', ...words, '-q', '--watch', '--json'], { cwd: folder })
    let [outputs, talk] = ['', '']
    child.stdout.on('data', (chunk: Buffer) => {
      outputs += chunk.toString()
    })
    child.stderr.on('data', (chunk: Buffer) => {
      talk += chunk.toString()
    })
    const pause = (time: number): Promise<void> => new Promise((resolve) => setTimeout(resolve, time))
    return {
      async run(number) {
        for (;;) {
          const found = outputs.split('\n}\n').filter(Boolean)[number - 1]
          if (found !== undefined && talk.includes('Watching')) {
            await pause(150)
            return found
          }
          await pause(30)
        }
      },
      said: () => talk,
      async end() {
        child.kill('SIGINT')
        const [, signal] = await new Promise<[number | null, string | null]>((resolve) =>
          child.on('close', (...how) => resolve(how)),
        )
        return signal
      },
    }
  }

  /** The first run from a number on whose output is as meant: a slow disk may tell of one change in two runs. */
  async function first(
    run: (count: number) => Promise<string>,
    from: number,
    meant: (output: string) => boolean,
  ): Promise<number> {
    for (let count = from; ; count += 1) if (meant(await run(count))) return count
  }

  it('checks again when a file is changed, replaced or new, and ends by Ctrl-C', async () => {
    const sites = join(folder, 'sites')
    mkdirSync(sites)
    const file = join(sites, 'a.skerry.yaml')
    copyFileSync(SOUND, file)
    const { run, end } = watching(sites)
    await run(1)
    writeFileSync(join(folder, 'draft'), 'skerry: [')
    renameSync(join(folder, 'draft'), file)
    expect(await run(2)).toContain('"outcome": "unreadable"')
    copyFileSync(SOUND, join(sites, 'b.skerry.yaml'))
    expect(await run(3)).toContain('b.skerry.yaml')
    expect(await end()).toBe('SIGINT')
    expect(readdirSync(sites)).toEqual(['a.skerry.yaml', 'b.skerry.yaml'])
  }, 15_000)

  it('notices files in folders below, in folders made later, and their going away; not what is no install file', async () => {
    const valley = join(folder, 'valley')
    mkdirSync(join(valley, 'north'), { recursive: true })
    copyFileSync(SOUND, join(valley, 'a.skerry.yaml'))
    const { run, said, end } = watching(valley)
    await run(1)
    writeFileSync(join(valley, 'north', 'notes.txt'), 'nothing')
    copyFileSync(SOUND, join(valley, 'north', 'b.skerry.yaml'))
    expect(await run(2)).toContain('north/b.skerry.yaml')
    expect(said()).toContain('north/b.skerry.yaml changed.')
    expect(said()).not.toContain('notes.txt')
    mkdirSync(join(valley, 'south', 'lower'), { recursive: true })
    copyFileSync(SOUND, join(valley, 'south', 'lower', 'c.skerry.yaml'))
    const third = await first(run, 3, (output) => output.includes('south/lower/c.skerry.yaml'))
    rmSync(join(valley, 'south'), { recursive: true })
    await first(run, third + 1, (output) => !output.includes('c.skerry.yaml'))
    expect(await end()).toBe('SIGINT')
  }, 30_000)

  it('looks at what a glob means, and at a file that is named whatever its name', async () => {
    const mixed = join(folder, 'mixed')
    mkdirSync(mixed)
    for (const name of ['one.yaml', 'two.yml', 'odd.txt']) copyFileSync(SOUND, join(mixed, name))
    const { run, said, end } = watching('mixed/*.yaml', 'mixed/odd.txt')
    await run(1)
    appendFileSync(join(mixed, 'two.yml'), '# not meant\n')
    copyFileSync(SOUND, join(mixed, 'three.yaml'))
    expect(await run(2)).toContain('three.yaml')
    appendFileSync(join(mixed, 'odd.txt'), '# meant\n')
    await run(3)
    expect(said()).toContain('odd.txt changed.')
    expect(said()).not.toContain('two.yml')
    expect(await end()).toBe('SIGINT')
  }, 15_000)
})
