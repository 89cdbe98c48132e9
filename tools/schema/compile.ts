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
  const source = quickPatterns(standalone.default(ajv, ajv.compile(mapSchema(bundled, bare))))
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

const PATTERN = /new RegExp\(("(?:[^"\\]|\\.)*"), "u"\)/g

/** Units as they are written nearly always; the full pattern judges every other spelling. */
const USUAL_UNITS = [
  '',
  'V',
  'mV',
  'kV',
  'A',
  'mA',
  'kA',
  'ohm',
  'Ω',
  'mΩ',
  'MΩ',
  'kΩ',
  'W',
  'kW',
  'VA',
  'kVA',
  'Wh',
  'kWh',
  's',
  'ms',
  'min',
  'h',
  'm',
  'mm',
  'mm²',
  'mm2',
  '°C',
  '%',
  '%/K',
  'Hz',
  'W/m²',
  'W/m2',
  '°',
  'x',
  'A²s',
  'Ah',
  'mA/Ah',
] as const

const NUMBERS = ['0', '1', '1.5', '250', '0.42'] as const
/** What may stand before the number, and after the unit: below zero, beyond the instrument, at a test voltage. */
const BEFORE = ['', '-', '<', '>'] as const
const AFTER = ['', ' at 1000 V'] as const

/** The usual forms that a pattern takes whatever the number is: what stands around the number alone decides. */
function takenForms(pattern: string): readonly string[] {
  const full = new RegExp(pattern, 'u')
  const forms = BEFORE.flatMap((before) =>
    USUAL_UNITS.flatMap((unit) => AFTER.map((after) => ({ before, unit, after }))),
  )
  return forms
    .filter(({ before, unit, after }) =>
      NUMBERS.every((number) =>
        [`${number} ${unit}`.trim(), `${number}${unit}`].every((text) => full.test(`${before}${text}${after}`)),
      ),
    )
    .map(({ before, unit, after }) => `${before}${unit}${after === '' ? '' : '@'}`)
}

/**
 * A pattern is compiled by the engine when it is first used, and the patterns of quantities are long: a number in its
 * usual form with a usual unit is told by one short pattern that all of them share. What that one does not know goes to
 * the pattern of the schema, so the verdict is the same.
 */
function quickPatterns(source: string): string {
  const replaced = source.replace(PATTERN, (all, literal: string) => {
    const forms = takenForms(JSON.parse(literal) as string)
    return forms.length < 2 ? all : `usual(${literal}, ${JSON.stringify(forms)})`
  })
  return `${USUAL}\n${replaced}`
}

const USUAL = `const number = /^([-<>]?)(?:0|[1-9][0-9]*)(?:\\.[0-9]+)? ?([A-Za-z%/°Ω²2]*?)( at [1-9][0-9]{1,3} V)?$/
function usual(source, forms) {
  const taken = new Set(forms)
  let full
  return {
    test(text) {
      const match = number.exec(text)
      if (match && taken.has(match[1] + match[2] + (match[3] ? '@' : ''))) return true
      full ??= new RegExp(source, 'u')
      return full.test(text)
    },
  }
}`

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
