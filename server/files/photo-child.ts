// Runs by itself, once for each photo: bytes on standard input, the answer on standard output.
import { buffer } from 'node:stream/consumers'
import { develop } from './photo-develop.ts'
import { packed } from './photo-frame.ts'

process.stdout.write(packed(await develop(await buffer(process.stdin))))
