// What the bundle runs: the command line, or a thread of it that checks the files it is handed.
import { main } from './main.ts'

const words = process.argv.slice(2)
if (words[0] === '--thread') void import('./threads.ts').then(({ workInThread }) => workInThread())
else void main(words)
