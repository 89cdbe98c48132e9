import { readdir, readFile, writeFile } from 'node:fs/promises'
import { pathToFileURL } from 'node:url'
import Handlebars from 'handlebars'

type PrecompileOptions = Parameters<typeof Handlebars.precompile>[1]

const PROJECT = new URL('../../', import.meta.url).pathname
const ROOT = `${PROJECT}templates`

const TYPES = `/** Precompiled pages and their partials by name, each behind a function so that only those in use are made. */
declare const templates: Readonly<Record<'pages' | 'partials', Readonly<Record<string, () => TemplateSpecification>>>>
export default templates
`

/** Mails name only fields that their views have: with `strict`, a missing one is an error instead of a gap. */
const MAILS = {
  strict: true,
  knownHelpersOnly: true,
  knownHelpers: { address: true, count: true, day: true, line: true, list: true, moment: true },
}

async function compiled(
  folder: string,
  settings: PrecompileOptions = { knownHelpersOnly: true, knownHelpers: { words: true } },
): Promise<string> {
  const names = (await readdir(folder)).filter((name) => name.endsWith('.hbs')).sort()
  const entries = names.map(async (name) => {
    const source = await readFile(`${folder}/${name}`, 'utf8')
    const specification = Handlebars.precompile(source, settings)
    return `${JSON.stringify(name.slice(0, -'.hbs'.length))}: () => (${specification}),\n`
  })
  return (await Promise.all(entries)).join('')
}

/** The pages and partials of `templates/` as functions: path in the project, and content. Writes nothing. */
export async function generateTemplates(root = ROOT): Promise<Record<string, string>> {
  const pages = await compiled(root)
  const partials = await compiled(`${root}/partials`)
  const mails = await compiled(`${root}/mails`, MAILS)
  const mailPartials = await compiled(`${root}/mails/partials`, MAILS)
  return {
    'core/generated/templates.js': `export default {\npages: {\n${pages}},\npartials: {\n${partials}},\n}\n`,
    'core/generated/templates.d.ts': TYPES,
    'server/generated/mails.js': `export default {\npages: {\n${mails}},\npartials: {\n${mailPartials}},\n}\n`,
    'server/generated/mails.d.ts': TYPES,
  }
}

async function main(): Promise<void> {
  for (const [path, content] of Object.entries(await generateTemplates())) {
    await writeFile(`${PROJECT}${path}`, content)
    process.stderr.write(`wrote ${path} (${content.length} characters)\n`)
  }
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? '').href) await main()
