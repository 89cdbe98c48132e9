import { execFileSync } from 'node:child_process'

/**
 * Runs a short Python program, whose standard library shares nothing with our code.
 *
 * @param program reads standard input, prints JSON
 */
export function python(program: string, input: string | Uint8Array): unknown {
  const output = execFileSync('python3', ['-c', program], { input, encoding: 'utf8', maxBuffer: 64_000_000 })
  return JSON.parse(output)
}
