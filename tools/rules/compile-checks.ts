import { Ajv2020 } from 'ajv/dist/2020.js'
import standalone from 'ajv/dist/standalone/index.js'
import { build } from 'esbuild'
import { AJV_RULE_SETTINGS } from '#core/judge/ajv-settings.ts'
import type { SheetSchema } from '#core/judge/rule.ts'

/**
 * JavaScript of the compiled rules, as one module that imports nothing: one exported function a schema.
 *
 * @param schemas JSON Schemas over sheets, by the name of the function wanted
 */
export async function compileChecks(schemas: ReadonlyMap<string, SheetSchema>): Promise<string> {
  const ajv = new Ajv2020({ ...AJV_RULE_SETTINGS, code: { source: true, esm: true, lines: false } })
  for (const [name, schema] of schemas) ajv.addSchema({ ...schema }, name)
  const source = standalone.default(ajv, Object.fromEntries([...schemas.keys()].map((name) => [name, name])))
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
