/** One gate: a command that must end well, and where its output says how much it looked at. */
export interface Gate {
  readonly name: string
  readonly command: readonly string[]
  /** A number in the output: a gate that saw nothing has not passed. */
  readonly saw: RegExp
}

const bin = (name: string): string => `node_modules/.bin/${name}`

/** A type check that remembers what it found: files that did not change, nor anything they lean on, are not checked again. */
const types = (project: string, memory: string): string[] => [
  bin('tsc'),
  '-p',
  project,
  '--extendedDiagnostics',
  '--incremental',
  '--tsBuildInfoFile',
  `node_modules/.cache/skerry/${memory}.tsbuildinfo`,
]

/** Everything that holds the line, cheap things first. */
export const GATES: readonly Gate[] = [
  { name: 'format and lint', command: [bin('biome'), 'check', '--error-on-warnings', '.'], saw: /Checked (\d+) files/ },
  {
    name: 'promises',
    command: [bin('oxlint'), '--type-aware', 'core', 'cli', 'server', 'tools', 'tests'],
    saw: /on (\d+) files/,
  },
  { name: 'types', command: types('.', 'types'), saw: /^Files:\s+(\d+)/m },
  { name: 'pure core', command: types('core', 'pure-core'), saw: /^Files:\s+(\d+)/m },
  {
    name: 'arrows and licences',
    command: [
      bin('depcruise'),
      '--config',
      '.dependency-cruiser.cjs',
      'core',
      'cli',
      'server',
      'migrations',
      'tools',
      'tests',
    ],
    saw: /\((\d+) modules/,
  },
  { name: 'dead code', command: ['node', '--import', 'tsx', 'tools/gates/dead-code.ts'], saw: /(\d+) files/ },
  {
    name: 'generated files are fresh',
    command: ['node', '--import', 'tsx', 'tools/gates/freshness.ts'],
    saw: /(\d+) generated files/,
  },
]
