import { readFileSync } from 'node:fs'
import { createRequire } from 'node:module'
import { Ajv } from 'ajv'
import { Ajv2020 } from 'ajv/dist/2020.js'
import { describe, expect, it } from 'vitest'
import { ANNOTATIONS } from '#core/shape/schema-node.ts'
import { checkShape } from '#core/shape/shape.ts'
import { SETTINGS } from '#tools/schema/compile.ts'
import { readParts } from '#tools/schema/parts.ts'
import { EXAMPLES, example, mutants } from './corpus.ts'

const require = createRequire(import.meta.url)

/** The schema as it is written, part by part, judged by the 2020-12 build. */
async function norm(): Promise<(tree: unknown) => boolean> {
  const ajv = new Ajv2020(SETTINGS)
  ajv.addVocabulary([...ANNOTATIONS])
  const { top, parts } = await readParts()
  for (const part of parts.values()) ajv.addSchema(part)
  return ajv.compile(top)
}

const TWIN: object = JSON.parse(
  readFileSync(new URL('../../schemas/install.draft-07.schema.json', import.meta.url), 'utf8'),
)
const EDITOR_WORDS = ['markdownDescription', 'enumDescriptions', 'patternErrorMessage']

function twin(): (tree: unknown) => boolean {
  const ajv = new Ajv(SETTINGS)
  ajv.addVocabulary([...ANNOTATIONS, ...EDITOR_WORDS])
  return ajv.compile(TWIN)
}

interface LanguageService {
  configure(settings: object): void
  doValidation(document: unknown, isKubernetes: boolean): Promise<readonly { message: string }[]>
}

/** The language server that editors use for YAML, without an editor. */
function editor(): (text: string) => Promise<boolean> {
  const { getLanguageService } = require('yaml-language-server') as {
    getLanguageService(parts: object): LanguageService
  }
  const { TextDocument } = require('vscode-languageserver-textdocument') as {
    TextDocument: { create(uri: string, language: string, version: number, text: string): unknown }
  }
  const silent = { send: () => {}, sendError: () => {}, sendTrack: () => {} }
  const service = getLanguageService({
    schemaRequestService: (uri: string) => Promise.reject(new Error(`The twin must need no other file: ${uri}`)),
    workspaceContext: { resolveRelativePath: (path: string) => path },
    telemetry: silent,
  })
  const schemas = [{ uri: 'urn:skerry:install:1:draft-07', fileMatch: ['*'], schema: TWIN }]
  service.configure({ validate: true, yamlVersion: '1.2', customTags: [], schemas })
  let version = 0
  return async (text) => {
    version++
    const document = TextDocument.create(`file:///${version}.skerry.yaml`, 'yaml', version, text)
    return (await service.doValidation(document, false)).length === 0
  }
}

describe('the schema, its draft-07 twin, the compiled validator and the editor give the same verdict', () => {
  const corpus = [
    ...EXAMPLES,
    ...mutants(example('alder-mill-bakery').tree),
    ...mutants(example('reed-hall-design').tree),
    ...mutants(example('wrong-in-shape').tree),
  ]

  it('on every example and on a change at every place of three of them', async () => {
    const [byNorm, byTwin, byEditor] = [await norm(), twin(), editor()]
    const verdicts = { right: 0, wrong: 0 }
    for (const { name, text, tree } of corpus) {
      const right = byNorm(tree)
      const others = { twin: byTwin(tree), compiled: checkShape(tree).length === 0, editor: await byEditor(text) }
      expect(others, name).toEqual({ twin: right, compiled: right, editor: right })
      verdicts[right ? 'right' : 'wrong']++
    }
    expect(verdicts.right).toBeGreaterThan(40)
    expect(verdicts.wrong).toBeGreaterThan(300)
  }, 120_000)
})
