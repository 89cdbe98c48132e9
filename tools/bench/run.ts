// npm run bench: everything in one run, as ratios to a baseline of the same run.
import { spawnSync } from 'node:child_process'
import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { buildSync } from 'esbuild'
import { compare, once } from './measure.ts'
import { synthesize } from './synthesize.ts'
import { printTable } from './table.ts'

const NODE = process.execPath
const SKERRY = 'dist/skerry.cjs'
const SCHEMA = 'core/generated/install-schema.json'
const AJV_CLI = ['node_modules/ajv-cli/dist/index.js', 'validate', '--spec=draft2020', '--strict=false', '-s', SCHEMA]
const ROUNDS = 21
const MANY = Number(process.env['BENCH_FILES'] ?? 2000)
/** About 300 lines, as the target names it. */
const CIRCUITS_OF_300_LINES = 32

const work = mkdtempSync(join(tmpdir(), 'skerry-bench-'))

function writeFiles(folder: string, count: number, circuits: number): string[] {
  mkdirSync(join(work, folder))
  return Array.from({ length: count }, (_, index) => {
    const path = join(work, folder, `${folder}-${index + 1}.skerry.yaml`)
    writeFileSync(path, synthesize(circuits, index + 1))
    return path
  })
}

function bundleBaseline(): string {
  const outfile = join(work, 'parse-and-shape.cjs')
  buildSync({
    entryPoints: ['tools/bench/parse-and-shape.ts'],
    bundle: true,
    platform: 'node',
    format: 'cjs',
    minify: true,
    outfile,
  })
  return outfile
}

async function oneFile(): Promise<void> {
  const [file = ''] = writeFiles('one', 1, CIRCUITS_OF_300_LINES)
  const medians = await compare(
    [
      { name: 'node -e 0', command: [NODE, '-e', '0'] },
      { name: 'skerry check, 300 lines', command: [NODE, SKERRY, 'check', file] },
      { name: 'skerry check, the example', command: [NODE, SKERRY, 'check', 'examples/alder-mill-bakery.skerry.yaml'] },
      { name: 'npm schema validator, same 300 lines', command: [NODE, ...AJV_CLI, '-d', file] },
    ],
    ROUNDS,
  )
  printTable('One file, from start to end', medians)
}

async function manyFiles(baseline: string): Promise<void> {
  const files = writeFiles('many', MANY, CIRCUITS_OF_300_LINES)
  const folder = join(work, 'many')
  const check = { name: `skerry check, ${MANY} files`, command: [NODE, SKERRY, 'check', folder] }
  const medians = await compare(
    [
      { name: 'npm schema validator alone', command: [NODE, ...AJV_CLI, '-d', `${folder}/*.yaml`] },
      check,
      { name: 'parsing and precompiled Ajv alone, 1 thread', command: [NODE, baseline, ...files] },
    ],
    3,
  )
  printTable(`${MANY} files of 300 lines`, medians)
  const { megabytes } = await once(check, true)
  process.stdout.write(`  memory at its highest: ${megabytes.toFixed(0)} MB\n`)
  const half = {
    name: `skerry check, ${MANY / 2} files`,
    command: [NODE, SKERRY, 'check', ...files.slice(0, MANY / 2)],
  }
  printTable('Growth with files', await compare([half, check], 3))
}

async function growth(): Promise<void> {
  const sizes = [10, 100, 1000] as const
  const medians = await compare(
    [
      { name: 'skerry --version', command: [NODE, SKERRY, '--version'] },
      ...sizes.map((size) => ({
        name: `${size} circuits`,
        command: [NODE, SKERRY, 'check', '--quiet', ...writeFiles(`of-${size}`, 1, size)],
      })),
    ],
    9,
  )
  printTable('Growth with circuits, whole command', medians)
  const start = medians.get('skerry --version') ?? 0
  const cost = (size: number): number => (medians.get(`${size} circuits`) ?? Number.NaN) - start
  process.stdout.write(`  beyond the start: 1,000 circuits cost ${(cost(1000) / cost(100)).toFixed(1)} × what 100 do\n`)
}

spawnSync('npm', ['run', '--silent', 'build'], { stdio: 'inherit' })
try {
  await oneFile()
  await growth()
  await manyFiles(bundleBaseline())
  spawnSync(NODE, ['--import', 'tsx', 'tools/bench/paper.ts'], { stdio: 'inherit' })
} finally {
  rmSync(work, { recursive: true, force: true })
}
