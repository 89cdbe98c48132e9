// What is measured against: the fast parser and the precompiled schema validator alone, over every file named.
import { readFileSync } from 'node:fs'
import { load } from 'js-yaml'
import validate from '#core/generated/install-validator.js'

let sound = 0
for (const file of process.argv.slice(2)) {
  if (validate(load(readFileSync(file, 'utf8')))) sound += 1
}
process.stdout.write(`${sound} sound\n`)
