import { createHash } from 'node:crypto'
import { sample } from './page.ts'

process.stdout.write(createHash('sha256').update(sample()).digest('hex'))
