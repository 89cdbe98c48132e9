// npm start: sets everything up, then does the main job on every example: checks it and writes its report.
import { spawnSync } from 'node:child_process'
import { mkdirSync, readdirSync } from 'node:fs'
import { ready, run } from './setup/ready.mjs'

ready()
run('npm', ['run', '--silent', 'build'])

const OUT = 'dist/reports'
mkdirSync(OUT, { recursive: true })
const examples = readdirSync('examples')
  .filter((name) => name.endsWith('.skerry.yaml'))
  .toSorted()

function skerry(...args) {
  return spawnSync(process.execPath, ['dist/skerry.cjs', ...args], { encoding: 'utf8' })
}

process.stdout.write('\nSkerry checks its examples and writes their reports.\n\n')
for (const name of examples) {
  const file = `examples/${name}`
  const report = `${OUT}/${name.replace('.skerry.yaml', '.pdf')}`
  const { status, stdout } = skerry('check', file)
  const summary =
    stdout
      .trimEnd()
      .split('\n')
      .filter((line) => /rule book/.test(line))
      .at(-1) ?? ''
  const rendered = skerry('render', file, '-o', report)
  const paper = rendered.status === 0 ? `report: ${report}` : 'no report: the file must be mended first'
  process.stdout.write(`${file}\n  check ended with ${status}. ${summary.trim()}\n  ${paper}\n`)
}
process.stdout.write(`
Next:
  npx skerry check examples/alder-mill-bakery.skerry.yaml    what is wrong, and what to do
  npx skerry facts examples/alder-mill-bakery.skerry.yaml    every computed quantity
  npx skerry new my-site.skerry.yaml                         a file of your own
  npx skerry --help                                          everything else

Verification is work for skilled persons. Local codes and licensed practice come before anything that Skerry prints.
`)
