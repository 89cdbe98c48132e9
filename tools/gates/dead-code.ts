import { spawnSync } from 'node:child_process'

/** knip says nothing when all is well, so what it was given to look at is counted here. */
const tracked = spawnSync('git', ['ls-files', '-co', '--exclude-standard', '*.ts'], { encoding: 'utf8' })
const files = tracked.stdout.split('\n').filter(Boolean).length
const knip = spawnSync('node_modules/.bin/knip', ['--no-progress'], { encoding: 'utf8' })
process.stdout.write(`${knip.stdout}${knip.stderr}${files} files\n`)
process.exitCode = knip.status ?? 1
