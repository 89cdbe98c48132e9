import type { PhotoProblem } from './photo-answer.ts'

/** What each problem tells besides its code. */
const DETAILS: Readonly<Record<PhotoProblem['code'], Readonly<Record<string, 'number' | 'string'>>>> = {
  empty: {},
  'too-large': { bytes: 'number' },
  'not-a-photo': { kind: 'string' },
  'not-readable-here': { kind: 'string' },
  'too-many-pixels': { width: 'number', height: 'number' },
  moving: {},
  damaged: {},
  'too-heavy': {},
  'too-slow': {},
  busy: {},
}

/** Whether a value read from elsewhere is a problem of a photo. */
export function isProblem(value: unknown): value is PhotoProblem {
  if (typeof value !== 'object' || value === null || !('code' in value)) return false
  const { code, ...details } = value
  if (typeof code !== 'string' || !Object.hasOwn(DETAILS, code)) return false
  const wanted = Object.entries(DETAILS[code as PhotoProblem['code']])
  const given = new Map(Object.entries(details))
  return given.size === wanted.length && wanted.every(([name, type]) => typeof given.get(name) === type)
}
