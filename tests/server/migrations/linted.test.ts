import { spawnSync } from 'node:child_process'
import { existsSync, readdirSync } from 'node:fs'
import { describe, expect, it } from 'vitest'

const SQUAWK = 'node_modules/@squawk-cli/linux-x64/bin/squawk'

/** Rules of the linter that do not fit, each with its reason. */
const LEFT_OUT = {
  'prefer-robust-stmts': 'each migration is one transaction: it is done whole or not at all',
  'require-concurrent-index-creation': 'every index is made on a table that the same migration made, and that is empty',
  'prefer-bigint-over-int': 'what is an integer here counts revisions, years and versions',
  'require-lock-timeout': 'set for the whole connection in server/setup/owner.ts',
  'require-statement-timeout': 'set for the whole connection in server/setup/owner.ts',
} as const

/** What a migration sends to the database. */
async function statementsOf(name: string): Promise<string> {
  const sent: string[] = []
  const { up } = await import(`../../../migrations/${name}.ts`)
  await up({
    raw: async (sql: string) => {
      sent.push(sql)
    },
  })
  return sent.join(';\n')
}

const names = readdirSync('migrations').flatMap((file) => (file.endsWith('.ts') ? [file.slice(0, -3)] : []))

// squawk, an independent linter of migrations; its program comes for Linux on x64 only.
describe.skipIf(!existsSync(SQUAWK))('each migration', () => {
  it.each(names)('%s locks nothing for long and breaks nothing that runs', async (name) => {
    const sql = await statementsOf(name)
    expect(sql.length).toBeGreaterThan(100)
    const linted = spawnSync(
      SQUAWK,
      [
        '--pg-version',
        '15',
        '--reporter',
        'gcc',
        '--exclude',
        Object.keys(LEFT_OUT).join(','),
        '--stdin-filepath',
        name,
      ],
      { input: sql, encoding: 'utf8' },
    )
    expect(linted.stdout + linted.stderr.replace(/Found 0 issues.*/s, '')).toBe('')
    expect(linted.status).toBe(0)
  })

  it('would be told of a careless one', () => {
    const linted = spawnSync(SQUAWK, ['--pg-version', '15', '--reporter', 'gcc'], {
      input: 'alter table people add column age integer not null;',
      encoding: 'utf8',
    })
    expect(linted.status).not.toBe(0)
  })
})
