import { readFile } from 'node:fs/promises'
import { withSettings } from '#tools/env/table.ts'
import { generateRules } from '#tools/rules/generate.ts'
import { generateSchemas } from '#tools/schema/generate.ts'
import { generateSheets } from '#tools/sheets/generate.ts'
import { generateTemplates } from '#tools/templates/generate.ts'

/** What lies in the working tree under a path; nothing where there is no such file. */
async function present(path: string): Promise<string | undefined> {
  try {
    return await readFile(path, 'utf8')
  } catch (error) {
    if (error instanceof Error && 'code' in error && error.code === 'ENOENT') return undefined
    throw error
  }
}

const wanted = {
  ...(await generateSchemas()),
  ...(await generateRules()),
  ...generateSheets(),
  ...(await generateTemplates()),
  'README.md': withSettings(await readFile('README.md', 'utf8')),
}
const stale: string[] = []
for (const [path, content] of Object.entries(wanted)) {
  if ((await present(path)) !== content) stale.push(path)
}
process.stdout.write(`${Object.keys(wanted).length} generated files, ${stale.length} stale\n`)
if (stale.length > 0) {
  process.stdout.write(`${stale.map((path) => `  ${path}\n`).join('')}Run: npm run generate\n`)
  process.exitCode = 1
}
