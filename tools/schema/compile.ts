import { Ajv } from 'ajv'
import standalone from 'ajv/dist/standalone/index.js'
import { build } from 'esbuild'
import type { SchemaNode } from '#core/shape/schema-node.ts'
import { mapSchema } from './map-schema.ts'
import { PROJECT } from './parts.ts'

/** The settings that every judge of the install file shares. */
export const SETTINGS = {
  allErrors: true,
  strict: true,
  // `if` asks for a key that the schema around it describes.
  strictRequired: false,
  allowUnionTypes: true,
  ownProperties: true,
  unicodeRegExp: true,
} as const

/**
 * JavaScript of a validator for the bundled schema, as one module that imports nothing. It is compiled by the plain Ajv:
 * the 2020 build keeps books about keywords that this schema does not use. Tests hold the result against that build.
 */
export async function compileValidator(bundled: SchemaNode): Promise<string> {
  const ajv = new Ajv({
    ...SETTINGS,
    messages: false,
    inlineRefs: false,
    code: { source: true, esm: true, lines: false },
  })
  const source = standalone.default(ajv, ajv.compile(mapSchema(bundled, bare)))
  const { outputFiles } = await build({
    stdin: { contents: slim(source), resolveDir: PROJECT, loader: 'js' },
    bundle: true,
    write: false,
    format: 'esm',
    platform: 'neutral',
    target: 'es2023',
    minify: true,
    charset: 'utf8',
    mainFields: ['main'],
  })
  const [file] = outputFiles
  if (!file) throw new Error('esbuild gave no output for the validator')
  return file.text
}

/**
 * The code without what nobody asks of an error: whoever explains it knows the schema at its place. What is left of an
 * error is its place, its keyword, and the key that it is about. A third of the code goes, and with it a third of the
 * time that the first file waits for it to be compiled.
 */
function slim(source: string): string {
  const text = String.raw`"(?:[^"\\]|\\.)*"`
  return source
    .replaceAll(new RegExp(`schemaPath:${text},`, 'g'), '')
    .replaceAll(
      new RegExp(
        `params:\\{(?:pattern: ?${text}|(?:allowedValues|type|limit|comparison|i|allowedValue):[^{}]*)\\}`,
        'g',
      ),
      'params:{}',
    )
}

/** The schema without what only people read: the code carries its schema along. */
function bare(node: SchemaNode): SchemaNode {
  const judging = Object.entries(node).filter(([keyword]) => !WORDS.has(keyword) && !keyword.startsWith('x-'))
  return Object.fromEntries(judging)
}

const WORDS: ReadonlySet<string> = new Set(['$schema', 'title', 'description', 'examples', 'default'])

/** Its declaration for TypeScript. */
export const VALIDATOR_TYPES = `/** Keywords that the schema judges by. */
export type ShapeKeyword =
  | 'type'
  | 'enum'
  | 'const'
  | 'not'
  | 'pattern'
  | 'minLength'
  | 'maxLength'
  | 'minimum'
  | 'exclusiveMinimum'
  | 'maximum'
  | 'minItems'
  | 'maxItems'
  | 'uniqueItems'
  | 'maxProperties'
  | 'required'
  | 'additionalProperties'
  | 'propertyNames'
  | 'false schema'
  | 'if'

/** One thing that the schema does not allow. */
export interface ShapeError {
  readonly instancePath: string
  readonly keyword: ShapeKeyword
  /** The key that it is about, where it is about one. */
  readonly params: Readonly<Record<string, unknown>>
}

declare const validate: {
  (data: unknown): boolean
  /** Of the last call that said false. */
  errors: readonly ShapeError[]
}
export default validate
`
