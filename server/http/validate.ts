import type { ErrorObject, ValidateFunction } from 'ajv'
import { Ajv2020 } from 'ajv/dist/2020.js'
import ajvFormats from 'ajv-formats'
import type { FieldError } from './problems.ts'

const SETTINGS = { allErrors: true, strict: true, ownProperties: true, allowUnionTypes: true } as const

const bodies = new Ajv2020(SETTINGS)
/** Query texts become numbers and truth values; nothing else is changed. */
const queries = new Ajv2020({ ...SETTINGS, coerceTypes: true, useDefaults: true })
ajvFormats.default(bodies)
ajvFormats.default(queries)

export type Checker = (value: unknown) => readonly FieldError[]

const WORDS: Readonly<Record<string, (error: ErrorObject) => string>> = {
  required: ({ params }) => `“${params['missingProperty']}” is missing.`,
  additionalProperties: ({ params }) => `“${params['additionalProperty']}” is not known here.`,
  enum: ({ params }) => `One of these is expected: ${(params['allowedValues'] as readonly unknown[]).join(', ')}.`,
  minLength: ({ params }) => `At least ${params['limit']} characters are expected.`,
  maxLength: ({ params }) => `At most ${params['limit']} characters are taken.`,
}

function told(error: ErrorObject): FieldError {
  const words = WORDS[error.keyword]?.(error) ?? `It ${error.message ?? 'is not expected here'}.`
  const pointer =
    error.keyword === 'additionalProperties'
      ? `${error.instancePath}/${error.params['additionalProperty']}`
      : error.instancePath
  return { pointer, message: words, code: error.keyword }
}

/** Where a text holds the sign NUL, which the database cannot keep. Looked for in what the schema has found sound, so depth is bounded. */
function nulsIn(value: unknown, pointer = ''): FieldError[] {
  if (typeof value === 'string')
    return value.includes('\0') ? [{ pointer, message: 'The sign NUL is not taken.', code: 'nul' }] : []
  if (typeof value !== 'object' || value === null) return []
  return Object.entries(value).flatMap(([name, member]) => nulsIn(member, `${pointer}/${name}`))
}

/** At most this many problems of one request are told. */
const MOST = 50

/** Compiles a schema once, at the start. */
export function checker(schema: object, part: 'body' | 'query'): Checker {
  const validate: ValidateFunction = (part === 'body' ? bodies : queries).compile(schema)
  return (value) => {
    if (validate(value)) return nulsIn(value).slice(0, MOST)
    return (validate.errors ?? []).slice(0, MOST).map(told)
  }
}
