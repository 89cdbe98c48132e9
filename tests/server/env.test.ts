import { describe, expect, it } from 'vitest'
import { readEnv } from '#server/env.ts'

const sound = {
  NODE_ENV: 'production',
  BASE_URL: 'https://reports.fennmark.example',
  DATABASE_URL: 'postgres://web:x@127.0.0.1:5432/skerry',
  SESSION_SECRET: 'kept by the house and by nobody else at all',
}

const problemsOf = (change: Readonly<Record<string, string>>): string => {
  const read = readEnv({ ...sound, ...change })
  return read.ok ? '' : read.problems.join('\n')
}

describe('a server in production', () => {
  it('starts on a sound configuration', () => {
    expect(problemsOf({})).toBe('')
  })

  it.each([
    ['no secret for sessions', { SESSION_SECRET: '' }, 'SESSION_SECRET'],
    ['a short one', { SESSION_SECRET: 'x'.repeat(31) }, 'SESSION_SECRET'],
    [
      'the demonstration’s',
      { SESSION_SECRET: 'a demonstration secret that no production server accepts' },
      'SESSION_SECRET',
    ],
    ['an address without TLS', { BASE_URL: 'http://reports.fennmark.example' }, 'BASE_URL'],
    [
      'a database on another machine without TLS',
      { DATABASE_URL: 'postgres://web:x@db.fennmark.example/skerry' },
      'DATABASE_URL',
    ],
    ['no database', { DATABASE_URL: '' }, 'DATABASE_URL'],
    ['a port beyond all ports', { PORT: '65536' }, 'PORT'],
    ['a level of the log that does not exist', { LOG_LEVEL: 'chatty' }, 'LOG_LEVEL'],
  ])('does not start on %s', (_, change, name) => {
    expect(problemsOf(change)).toContain(name)
  })

  it('takes a database on another machine over TLS', () => {
    expect(problemsOf({ DATABASE_URL: 'postgres://web:x@db.fennmark.example/skerry?sslmode=verify-full' })).toBe('')
  })
})

describe('a server in development', () => {
  it('needs a database, and nothing else', () => {
    expect(readEnv({ DATABASE_URL: sound.DATABASE_URL }).ok).toBe(true)
    expect(readEnv({}).ok).toBe(false)
  })
})
