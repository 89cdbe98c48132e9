import { spawnSync } from 'node:child_process'
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { openapi } from '#server/http/openapi.ts'
import { ROUTES } from '#server/routes/all.ts'

const document = openapi(ROUTES, 'https://skerry.example') as {
  paths: Record<string, Record<string, { operationId: string }>>
}
let folder: string

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'skerry-openapi-'))
})
afterAll(() => rmSync(folder, { recursive: true }))

describe('the OpenAPI document', () => {
  it('has every route once, under a name of its own', () => {
    const operations = Object.values(document.paths).flatMap((methods) => Object.values(methods))
    expect(operations.map(({ operationId }) => operationId).toSorted()).toEqual(ROUTES.map(({ id }) => id).toSorted())
    expect(new Set(operations.map(({ operationId }) => operationId)).size).toBe(ROUTES.length)
  })

  // Redocly's recommended rules, as an outside judge.
  it('is found sound by an independent linter', () => {
    const file = join(folder, 'openapi.json')
    writeFileSync(file, JSON.stringify(document))
    writeFileSync(
      join(folder, 'redocly.yaml'),
      'extends: [recommended]\nrules:\n  tag-description: off\n  operation-4xx-response: error\n',
    )
    const linted = spawnSync(
      'node_modules/.bin/redocly',
      ['lint', file, '--config', join(folder, 'redocly.yaml'), '--format', 'json'],
      {
        encoding: 'utf8',
        env: { ...process.env, REDOCLY_TELEMETRY: 'off', REDOCLY_SUPPRESS_UPDATE_NOTICE: 'true' },
      },
    )
    const { totals, problems } = JSON.parse(linted.stdout)
    expect(problems).toEqual([])
    expect(totals).toMatchObject({ errors: 0, warnings: 0 })
  })
})
