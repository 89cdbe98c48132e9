import type { SheetSchema } from '#core/judge/rule.ts'

/**
 * Writes one keyword as a JavaScript expression over the value at `at`, which can be asked again and again; undefined
 * where it uses the keyword in a way that is not known here.
 */
type Emit = (given: unknown, at: string, schema: SheetSchema) => string | undefined

const isSchema = (value: unknown): value is SheetSchema =>
  typeof value === 'object' && value !== null && !Array.isArray(value)

const isList = (at: string): string => `Array.isArray(${at})`

function property(at: string, name: string): string {
  return /^[A-Za-z_$][\w$]*$/.test(name) ? `${at}.${name}` : `${at}[${JSON.stringify(name)}]`
}

/** The place in the sheet that `{ $data: /book/unbalance }` points to. */
function reference(given: unknown): string | undefined {
  const pointer = isSchema(given) ? given['$data'] : undefined
  if (typeof pointer !== 'string' || !pointer.startsWith('/') || pointer.includes('~')) return undefined
  const [field = '', ...inner] = pointer.slice(1).split('/')
  return inner.reduce((at, name) => property(`${at}?`, name), property('s', field))
}

/** All of them hold; no condition at all always does. */
function every(conditions: readonly (string | undefined)[]): string | undefined {
  return conditions.includes(undefined) ? undefined : conditions.length === 0 ? 'true' : conditions.join('&&')
}

/** A keyword says nothing about values of other types, and nothing where what it points to is not stated. */
function limit(beyond: string): Emit {
  return (given, at) => {
    const isNumber = `typeof ${at}!=="number"`
    if (typeof given === 'number') return `(${isNumber}||!(${at}${beyond}${given}||${at}!==${at}))`
    const other = reference(given)
    return (
      other &&
      `(${isNumber}||${other}===undefined||typeof ${other}==="number"&&!(${at}${beyond}${other}||${at}!==${at}))`
    )
  }
}

function size(type: string, length: string, beyond: string): Emit {
  return (given, at) =>
    typeof given === 'number'
      ? `(!${type.replaceAll('@', at)}||!(${length.replaceAll('@', at)}${beyond}${given}))`
      : undefined
}

/** Items have names of their own at every depth. */
const itemOf = (at: string): string => `i${at.length}`

function items(method: 'some' | 'every'): Emit {
  return (given, at) => {
    const holds = isSchema(given) ? emitted(given, itemOf(at)) : undefined
    return holds && `(!${isList(at)}||${at}.${method}((${itemOf(at)})=>${holds}))`
  }
}

const TYPES: Readonly<Record<string, string>> = {
  number: 'typeof @==="number"',
  string: 'typeof @==="string"',
  boolean: 'typeof @==="boolean"',
  array: 'Array.isArray(@)',
}

const isPrimitive = (value: unknown): boolean => value === null || typeof value !== 'object'

function all(given: unknown, at: string): string | undefined {
  return Array.isArray(given) ? every(given.map((inner) => emitted(inner, at))) : undefined
}

/** The sheet itself is an object; anything in it may be something else, of which `properties` and `required` say nothing. */
function ifObject(at: string, holds: string | undefined): string | undefined {
  return at === 's' ? holds : holds && `(typeof ${at}!=="object"||${at}===null||${isList(at)}||${holds})`
}

const KEYWORDS: Readonly<Record<string, Emit>> = {
  properties: (given, at) => {
    const conditions = Object.entries(isSchema(given) ? given : {}).map(([name, inner]) => {
      const here = property(at, name)
      const holds = isSchema(inner) ? emitted(inner, here) : undefined
      return holds && `(${here}===undefined||${holds})`
    })
    return ifObject(at, every(conditions))
  },
  required: (given, at) =>
    Array.isArray(given)
      ? ifObject(at, every(given.map((name) => `${property(at, String(name))}!==undefined`)))
      : undefined,
  const: (given, at) => {
    if (isPrimitive(given)) return `${at}===${JSON.stringify(given)}`
    const other = reference(given)
    return other && `(${other}===undefined||equal(${at},${other}))`
  },
  enum: (given, at) =>
    Array.isArray(given) && given.every(isPrimitive)
      ? `(${given.map((value) => `${at}===${JSON.stringify(value)}`).join('||')})`
      : undefined,
  type: (given, at) => (typeof given === 'string' ? TYPES[given]?.replace('@', at) : undefined),
  maximum: limit('>'),
  minimum: limit('<'),
  exclusiveMaximum: limit('>='),
  exclusiveMinimum: limit('<='),
  minItems: size('Array.isArray(@)', '@.length', '<'),
  maxItems: size('Array.isArray(@)', '@.length', '>'),
  minLength: size('(typeof @==="string")', '[...@].length', '<'),
  contains: items('some'),
  items: items('every'),
  pattern: (given, at) =>
    typeof given === 'string'
      ? `(typeof ${at}!=="string"||new RegExp(${JSON.stringify(given)},"u").test(${at}))`
      : undefined,
  not: (given, at) => {
    const holds = isSchema(given) ? emitted(given, at) : undefined
    return holds && `!(${holds})`
  },
  allOf: all,
  anyOf: (given, at) => {
    const choices = Array.isArray(given) ? given.map((inner) => emitted(inner, at)) : [undefined]
    return choices.includes(undefined) ? undefined : `(${choices.map((choice) => `(${choice})`).join('||')})`
  },
  if: (given, at, { then: so = {}, else: otherwise = {} }) => {
    const [condition, yes, no] = [given, so, otherwise].map((inner) =>
      isSchema(inner) ? emitted(inner, at) : undefined,
    )
    return condition && yes && no && `((${condition})?(${yes}):(${no}))`
  },
}

/** Written where `if` is. */
const UNDER_IF: ReadonlySet<string> = new Set(['then', 'else'])

function emitted(schema: SheetSchema, at: string): string | undefined {
  return every(
    Object.entries(schema)
      .filter(([keyword]) => !UNDER_IF.has(keyword))
      .map(([keyword, given]) =>
        Object.hasOwn(KEYWORDS, keyword) ? KEYWORDS[keyword]?.(given, at, schema) : undefined,
      ),
  )
}

/**
 * A rule's schema as one JavaScript expression over a sheet `s`, true where it is met. It says the same as the
 * validator compiled from the schema, without the errors that nobody reads; `equal` compares two values in it.
 *
 * @returns undefined for a schema with a keyword, or a use of one, that is not known here
 */
export function emitCheck(schema: SheetSchema): string | undefined {
  return emitted(schema, 's')
}
