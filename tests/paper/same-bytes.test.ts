import { execFileSync } from 'node:child_process'
import { createHash } from 'node:crypto'
import { fileURLToPath } from 'node:url'
import { expect, test } from 'vitest'
import { page, sample } from './page.ts'

const digest = (bytes: Uint8Array): string => createHash('sha256').update(bytes).digest('hex')

const elsewhere = (zone: string): string => {
  const script = fileURLToPath(new URL('./print-digest.ts', import.meta.url))
  const env = { ...process.env, TZ: zone }
  return execFileSync(process.execPath, ['--import', 'tsx', script], { encoding: 'utf8', env })
}

test('the same page gives the same bytes again, and in another process with another time zone', () => {
  const here = digest(sample())
  expect(digest(sample())).toBe(here)
  expect(elsewhere('Pacific/Auckland')).toBe(here)
  expect(elsewhere('UTC')).toBe(here)
})

test('one changed word changes the identifier', () => {
  const identifier = (html: string) => /\/ID \[<([0-9a-f]{32})>/.exec(Buffer.from(page(html)).toString('latin1'))?.[1]
  expect(identifier('<p>one</p>')).toMatch(/^[0-9a-f]{32}$/)
  expect(identifier('<p>one</p>')).toBe(identifier('<p>one</p>'))
  expect(identifier('<p>one</p>')).not.toBe(identifier('<p>two</p>'))
})
