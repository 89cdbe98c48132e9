import { readdir, readFile, writeFile } from 'node:fs/promises'
import { pathToFileURL } from 'node:url'
import Handlebars from 'handlebars'

const PROJECT = new URL('../../', import.meta.url).pathname
const ROOT = `${PROJECT}templates/document`

const TYPES = `/** Precompiled templates by name, each behind a function so that only those in use are made. */
declare const templates: Readonly<Record<string, () => TemplateSpecification>>
export default templates
`

/** The templates of the paper as functions: path in the project, and content. Writes nothing. */
export async function generateTemplates(): Promise<Record<string, string>> {
  const names = (await readdir(ROOT)).filter((name) => name.endsWith('.hbs')).toSorted()
  const entries = await Promise.all(
    names.map(async (name) => {
      const specification = Handlebars.precompile(await readFile(`${ROOT}/${name}`, 'utf8'), { knownHelpersOnly: true })
      return `${JSON.stringify(name.slice(0, -'.hbs'.length))}: () => (${specification}),\n`
    }),
  )
  return {
    'core/generated/document-templates.js': `export default {\n${entries.join('')}}\n`,
    'core/generated/document-templates.d.ts': TYPES,
  }
}

async function main(): Promise<void> {
  for (const [path, content] of Object.entries(await generateTemplates())) {
    await writeFile(`${PROJECT}${path}`, content)
    process.stderr.write(`wrote ${path} (${content.length} characters)\n`)
  }
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? '').href) await main()
