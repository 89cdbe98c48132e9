import { spawn } from 'node:child_process'
import { GATES, type Gate } from './gates.ts'

interface Outcome {
  readonly gate: Gate
  readonly ok: boolean
  readonly saw: number
  readonly output: string
  readonly seconds: number
}

function run(gate: Gate): Promise<Outcome> {
  const [program = '', ...args] = gate.command
  const start = performance.now()
  return new Promise((resolve) => {
    const child = spawn(program, args, { stdio: ['ignore', 'pipe', 'pipe'] })
    const chunks: Buffer[] = []
    child.stdout.on('data', (chunk: Buffer) => chunks.push(chunk))
    child.stderr.on('data', (chunk: Buffer) => chunks.push(chunk))
    child.on('error', (error) => chunks.push(Buffer.from(error.message)))
    child.on('close', (code) => {
      const output = Buffer.concat(chunks).toString()
      const saw = Number(gate.saw.exec(output)?.[1] ?? 0)
      resolve({ gate, ok: code === 0 && saw > 0, saw, output, seconds: (performance.now() - start) / 1000 })
    })
  })
}

function report({ gate, ok, saw, output, seconds }: Outcome): void {
  process.stdout.write(`${ok ? '✓' : '✗'} ${gate.name}: looked at ${saw} files in ${seconds.toFixed(1)} s\n`)
  if (ok) return
  const reason = saw === 0 ? 'It looked at nothing, or did not say at how much.\n' : ''
  process.stdout.write(`${output.trimEnd()}\n${reason}\n`)
}

const outcomes = await Promise.all(GATES.map(run))
outcomes.forEach(report)
process.exitCode = outcomes.every(({ ok }) => ok) ? 0 : 1
