import { readFileSync } from 'node:fs'
import { describe, expect, inject, it } from 'vitest'
import { addressesOf } from '#server/setup/databases.ts'
import { dumpSchema, SCHEMA_FILE } from '#tools/database/schema.ts'

describe('the committed schema', () => {
  it('is what the migrations make (npm run schema writes it anew)', () => {
    const { owner } = addressesOf(inject('postgres'), 'skerry_template')
    expect(readFileSync(SCHEMA_FILE, 'utf8')).toBe(dumpSchema(owner))
  })
})
