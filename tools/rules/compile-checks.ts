import { Ajv2020 } from 'ajv/dist/2020.js'
import standalone from 'ajv/dist/standalone/index.js'
import { build } from 'esbuild'
import { AJV_RULE_SETTINGS } from '#core/judge/ajv-settings.ts'
import type { SheetSchema } from '#core/judge/rule.ts'
import { emitCheck } from './emit-check.ts'

/** Schemas with keywords that rules seldom use: as the validator itself writes them. */
function byValidator(schemas: ReadonlyMap<string, SheetSchema>): string {
  if (schemas.size === 0) return ''
  const ajv = new Ajv2020({ ...AJV_RULE_SETTINGS, code: { source: true, esm: true, lines: false } })
  for (const [name, schema] of schemas) ajv.addSchema({ ...schema }, name)
  return standalone.default(ajv, Object.fromEntries([...schemas.keys()].map((name) => [name, name])))
}

/**
 * JavaScript of the compiled rules, as one module that imports nothing: one exported function a schema.
 *
 * @param schemas JSON Schemas over sheets, by the name of the function wanted
 */
export async function compileChecks(schemas: ReadonlyMap<string, SheetSchema>): Promise<string> {
  const emitted = [...schemas].map(([name, schema]) => [name, emitCheck(schema)] as const)
  const plain = emitted.flatMap(([name, code]) => (code === undefined ? [] : [`export const ${name}=(s)=>${code}\n`]))
  const others = new Set(emitted.filter(([, code]) => code === undefined).map(([name]) => name))
  const source = [
    'import equal from "ajv/dist/runtime/equal.js"\n',
    ...plain,
    byValidator(new Map([...schemas].filter(([name]) => others.has(name)))),
  ].join('')
  const { outputFiles } = await build({
    stdin: { contents: source, resolveDir: import.meta.dirname, loader: 'js' },
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
  if (!file) throw new Error('esbuild gave no output for the rules')
  return file.text
}
