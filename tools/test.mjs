// npm test: sets everything up, then runs every gate and every test, and ends with one line of counts.
import { spawnSync } from 'node:child_process'
import { readFileSync, rmSync } from 'node:fs'
import { postgresBin } from './setup/postgres.mjs'
import { needPrograms, ready, run } from './setup/ready.mjs'

ready()
needPrograms({
  pdftotext: 'poppler-utils',
  qpdf: 'qpdf',
  ngspice: 'ngspice',
  xmllint: 'libxml2-utils',
  exiftool: 'libimage-exiftool-perl',
  'heif-enc': 'libheif-examples',
  unzip: 'unzip',
  python3: 'python3',
  openssl: 'openssl',
  certutil: 'libnss3-tools',
})
postgresBin()
run('npm', ['run', '--silent', 'build'])

const gates = spawnSync('npm', ['run', '--silent', 'check'], { stdio: 'inherit' })

const RESULTS = 'reports/tests.json'
rmSync(RESULTS, { force: true })
const tests = spawnSync(
  'node_modules/.bin/vitest',
  ['run', '--reporter=default', '--reporter=json', `--outputFile.json=${RESULTS}`, '--coverage'],
  {
    stdio: 'inherit',
    env: { ...process.env, TZ: 'UTC', CI: '1' },
  },
)
const { numPassedTests, numFailedTests, numPendingTests } = JSON.parse(readFileSync(RESULTS, 'utf8'))
const ok = gates.status === 0 && tests.status === 0 && numPassedTests > 0
process.stdout.write(
  `\n${gates.status === 0 ? 'All gates passed.' : 'A gate failed, see above.'}${numPendingTests > 0 ? ` ${numPendingTests} tests did not run.` : ''}\n`,
)
process.stdout.write(`${numPassedTests} passed, ${numFailedTests} failed\n`)
process.exitCode = ok ? 0 : 1
