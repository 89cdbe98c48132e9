import { spawn } from 'node:child_process'
import { describe, expect, it } from 'vitest'

/** Runs the loop as `npm run crash` does, and gives back what it said. */
function crash(rounds: number): Promise<{ readonly code: number | null; readonly said: string }> {
  const child = spawn(process.execPath, ['--import', 'tsx', 'tools/crash/run.ts', '--rounds', String(rounds)])
  const said: string[] = []
  child.stdout.on('data', (chunk) => said.push(String(chunk)))
  child.stderr.on('data', (chunk) => said.push(String(chunk)))
  return new Promise((resolve) => child.on('close', (code) => resolve({ code, said: said.join('') })))
}

describe('whatever dies while reports are sent, reviewed, issued and replaced', () => {
  it('numbers have no gap, nothing is issued twice, register and files hold, and nothing is left half done', async () => {
    const { code, said } = await crash(12)
    expect(said).toContain('12 rounds, 24 reports issued')
    expect(said).toContain('0 things broken')
    expect(code).toBe(0)
  }, 900_000)
})
