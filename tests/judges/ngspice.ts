import { execFileSync } from 'node:child_process'
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'

/**
 * Solves an a.c. circuit at 50 Hz with ngspice, a simulator that shares nothing with our code.
 *
 * @param elements netlist lines: `R1 a b 0.35`, `V1 a 0 dc 0 ac 230 0` (magnitude, phase in degrees)
 * @param wanted expressions that ngspice understands: `mag(v(a))`, `mag(i(V1))`
 * @returns one number for each expression, in the same order
 */
export function solve(elements: readonly string[], wanted: readonly string[]): number[] {
  const folder = mkdtempSync(join(tmpdir(), 'skerry-ngspice-'))
  try {
    const file = join(folder, 'circuit.cir')
    const prints = wanted.map((expression) => `print ${expression}`)
    const control = ['.control', 'set numdgt=10', 'ac lin 1 50 50', ...prints, 'quit', '.endc', '.end']
    writeFileSync(file, ['* circuit', ...elements, ...control, ''].join('\n'))
    const output = execFileSync('ngspice', ['-b', file], { encoding: 'utf8', stdio: ['ignore', 'pipe', 'pipe'] })
    return wanted.map((expression) => printedValue(expression, output))
  } finally {
    rmSync(folder, { recursive: true })
  }
}

function printedValue(expression: string, output: string): number {
  const line = output.split('\n').find((candidate) => candidate.trim().startsWith(`${expression.toLowerCase()} = `))
  const value = Number(line?.split(' = ')[1])
  if (line === undefined || !Number.isFinite(value)) throw new Error(`ngspice printed no ${expression}:\n${output}`)
  return value
}
