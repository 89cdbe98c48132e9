import { spawn } from 'node:child_process'
import { join } from 'node:path'

/** Runs one of PostgreSQL's programs to its end; an error tells what it said. */
export function runPostgres(bin: string, program: 'pg_dump' | 'pg_restore', args: readonly string[]): Promise<void> {
  return new Promise((resolve, reject) => {
    const child = spawn(join(bin, program), [...args], { stdio: ['ignore', 'ignore', 'pipe'] })
    const said: string[] = []
    child.stderr.on('data', (chunk) => said.push(String(chunk)))
    child.on('error', reject)
    child.on('close', (code) => {
      if (code === 0) resolve()
      else reject(new Error(`${program} ended with ${code}:\n${said.join('').trim()}`))
    })
  })
}
