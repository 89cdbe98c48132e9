import { readFile } from 'node:fs/promises'
import { describe, expect, it } from 'vitest'
import { bundle } from '#tools/schema/bundle.ts'
import { generateSchemas } from '#tools/schema/generate.ts'
import { PROJECT } from '#tools/schema/parts.ts'
import { printJson } from '#tools/schema/print-json.ts'

describe('what is generated from the schema', () => {
  it('is what is in the tree, byte for byte', async () => {
    const files = Object.entries(await generateSchemas())
    expect(files.length).toBe(12)
    for (const [path, content] of files) {
      expect(await readFile(`${PROJECT}${path}`, 'utf8'), `${path} is stale: run tools/schema/generate.ts`).toBe(
        content,
      )
    }
  })
  it('carries no import and no trace of the machine it was made on', async () => {
    const files = await generateSchemas()
    // Ajv's helper for counting characters carries, as a text, the call that would load it.
    const code = (files['core/generated/install-validator.js'] ?? '').replace(/'require\("[^"]+"\)\.default'/, '')
    expect(code.length).toBeGreaterThan(100_000)
    expect(code.match(/\bimport\b|\brequire\(|\bprocess\.|\bFunction\(|\beval\(/g)).toBeNull()
    expect(Object.keys(files).filter((path) => files[path]?.includes(PROJECT))).toEqual([])
  })
})

describe('the bundle', () => {
  it('refuses a reference that leads nowhere', () => {
    const top = { properties: { site: { $ref: 'urn:skerry:install:1:site' } } }
    expect(() => bundle({ top, parts: new Map() })).toThrow('which does not exist')
  })
  it('leaves out what nothing refers to', () => {
    const parts = new Map([
      [
        'site',
        {
          $id: 'urn:skerry:install:1:site',
          type: 'object',
          $defs: { used: { type: 'string' } },
          items: { $ref: '#/$defs/used' },
        },
      ],
      ['idle', { $id: 'urn:skerry:install:1:idle' }],
    ])
    const top = { properties: { site: { $ref: 'urn:skerry:install:1:site' } } }
    expect(Object.keys(bundle({ top, parts }).$defs ?? {})).toEqual(['site', 'site-used'])
  })
})

describe('printed JSON', () => {
  it('has a line for each key, and lists on one line where they fit', () => {
    const long = Array.from({ length: 30 }, (_, index) => `entry ${index}`)
    const value = { a: [1, { b: [] }], c: {}, d: long, e: null }
    const text = printJson(value)
    expect(JSON.parse(text)).toEqual(value)
    expect(text).toContain('  "a": [1, { "b": [] }],\n  "c": {},\n  "d": [\n    "entry 0",\n')
  })
})
