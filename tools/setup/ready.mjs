// What both commands of the README do first. Plain Node: it runs before anything is installed.
import { spawnSync } from 'node:child_process'
import { createHash } from 'node:crypto'
import { existsSync, readFileSync, writeFileSync } from 'node:fs'

const STAMP = 'node_modules/.installed-from'
const OLDEST = [20, 19]

/** Stops with words for the person at the terminal. */
export function stop(message) {
  process.stderr.write(`${message}\n`)
  process.exit(1)
}

/** Runs a command with its output in view; stops when it fails. */
export function run(program, args, options = {}) {
  const { status, error } = spawnSync(program, args, { stdio: 'inherit', ...options })
  if (error) stop(`Could not start ${program}: ${error.message}`)
  if (status !== 0) stop(`${program} ${args.join(' ')} ended with ${status}.`)
}

function checkNode() {
  const [major, minor] = process.versions.node.split('.').map(Number)
  const enough = major > OLDEST[0] || (major === OLDEST[0] && minor >= OLDEST[1])
  if (!enough) stop(`Skerry needs Node.js ${OLDEST.join('.')} or newer; this is ${process.versions.node}.`)
}

/** Installs the npm packages when the lock file is not the one they were installed from. */
function installPackages() {
  const hash = createHash('sha256').update(readFileSync('package-lock.json')).digest('hex')
  if (existsSync(STAMP) && readFileSync(STAMP, 'utf8') === hash) return
  process.stderr.write('Installing the npm packages …\n')
  run('npm', ['ci', '--ignore-scripts', '--no-fund', '--no-audit'], { stdio: ['ignore', 'ignore', 'inherit'] })
  writeFileSync(STAMP, hash)
}

/** Goes to the project's folder, and makes sure of Node.js and the packages. */
export function ready() {
  process.chdir(new URL('../..', import.meta.url).pathname)
  checkNode()
  installPackages()
}

const found = (program) => spawnSync('sh', ['-c', `command -v ${program}`]).status === 0

/** Installs the Debian packages of programs that are missing; without the right to, prints the one command to run. */
export function needPrograms(packageOf) {
  const missing = Object.entries(packageOf)
    .filter(([program]) => !found(program))
    .map(([, name]) => name)
  if (missing.length > 0) debianPackage([...new Set(missing)])
}

/** Installs Debian packages; without the right to, prints the one command to run. */
export function debianPackage(names) {
  const command = `apt-get install -y --no-install-recommends ${names.join(' ')}`
  if (process.getuid?.() !== 0)
    stop(`Some programs are missing. Install them with:\n  sudo ${command}\nand start again.`)
  process.stderr.write(`Installing ${names.join(', ')} …\n`)
  run('apt-get', ['update', '-qq'], { stdio: ['ignore', 'ignore', 'inherit'] })
  run('sh', ['-c', `DEBIAN_FRONTEND=noninteractive ${command}`], { stdio: ['ignore', 'ignore', 'inherit'] })
}
