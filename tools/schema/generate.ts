import { mkdir, readFile, writeFile } from 'node:fs/promises'
import { dirname } from 'node:path'
import { pathToFileURL } from 'node:url'
import type { SchemaNode } from '#core/shape/schema-node.ts'
import { bundle } from './bundle.ts'
import { compileValidator, VALIDATOR_TYPES } from './compile.ts'
import { makeDraft07 } from './make-draft07.ts'
import { makePlan } from './make-plan.ts'
import { PROJECT, readParts } from './parts.ts'
import { printJson } from './print-json.ts'
import { quantitiesPart } from './quantities-part.ts'
import { writePlan } from './write-plan.ts'

const QUANTITIES = 'quantities'

/** Everything that is generated from the schemas: path in the project, and content. Writes nothing. */
export async function generateSchemas(): Promise<Record<string, string>> {
  const written = await readParts()
  const quantities = quantitiesPart(written)
  const bundled = bundle({ top: written.top, parts: new Map(written.parts).set(QUANTITIES, quantities) })
  const [proof, issue] = [await readSchema('proof'), await readSchema('issue')]
  return {
    [`schemas/parts/${QUANTITIES}.schema.json`]: printJson(quantities),
    'schemas/install.draft-07.schema.json': printJson(makeDraft07(bundled)),
    'core/generated/install-schema.json': printJson(bundled),
    'core/generated/install-schema.js': `export default () => ${JSON.stringify(JSON.stringify(bundled))}\n`,
    'core/generated/install-schema.d.ts': TEXT_TYPES,
    'core/generated/install-validator.js': await compileValidator(bundled),
    'core/generated/install-validator.d.ts': VALIDATOR_TYPES,
    'core/generated/proof-validator.js': await compileValidator(proof),
    'core/generated/proof-validator.d.ts': PROOF_TYPES,
    'core/generated/issue-validator.js': await compileValidator(issue),
    'core/generated/issue-validator.d.ts': ISSUE_TYPES,
    'core/generated/install-plan.ts': writePlan(makePlan(bundled)),
  }
}

const TEXT_TYPES = `/** The bundled schema as JSON text: it is parsed only where a file has errors to explain. */
declare const text: () => string
export default text
`

async function readSchema(name: string): Promise<SchemaNode> {
  return JSON.parse(await readFile(`${PROJECT}schemas/${name}.schema.json`, 'utf8'))
}

const ISSUE_TYPES = `import type { IssueFile } from '#core/report/issue.ts'

/** Whether a value is the record of an issue, as schemas/issue.schema.json has it. */
declare const validate: (value: unknown) => value is IssueFile
export default validate
`

const PROOF_TYPES = `import type { Proof } from '#core/register/proof.ts'

/** Whether a value is a proof of a place in a register, as schemas/proof.schema.json has it. */
declare const validate: (value: unknown) => value is Proof
export default validate
`

async function main(): Promise<void> {
  const files = await generateSchemas()
  for (const [path, content] of Object.entries(files)) {
    await mkdir(dirname(`${PROJECT}${path}`), { recursive: true })
    await writeFile(`${PROJECT}${path}`, content)
    process.stderr.write(`wrote ${path} (${content.length} characters)\n`)
  }
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? '').href) await main()
