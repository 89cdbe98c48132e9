import { readFile, writeFile } from 'node:fs/promises'
import { withSettings } from './table.ts'

await writeFile('README.md', withSettings(await readFile('README.md', 'utf8')))
