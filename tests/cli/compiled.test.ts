import { readFileSync } from 'node:fs'
import { join } from 'node:path'
import { Script } from 'node:vm'
import { expect, it } from 'vitest'
import { PROJECT } from './skerry.ts'

it.each(['skerry-main', 'skerry-paper'])('the code that was compiled of %s is of this build and taken', (name) => {
  const filename = join(PROJECT, 'dist', `${name}.cjs`)
  const source = readFileSync(filename, 'latin1')
  const cachedData = readFileSync(join(PROJECT, 'dist', `${name}.cache`))
  expect(new Script(source, { filename, cachedData }).cachedDataRejected).toBe(false)
  expect(new Script(`${source} `, { filename, cachedData }).cachedDataRejected).toBe(true)
})
