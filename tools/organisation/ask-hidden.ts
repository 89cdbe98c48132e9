import { readFileSync } from 'node:fs'

/** Asks on the terminal without showing what is typed. */
async function askHidden(question: string): Promise<string> {
  const { stdin, stderr } = process
  stderr.write(question)
  stdin.setRawMode(true)
  stdin.setEncoding('utf8')
  let typed = ''
  try {
    for await (const chunk of stdin)
      for (const sign of String(chunk)) {
        if (sign === '\r' || sign === '\n') return typed
        if (sign === '\u0003') throw new Error('Given up.')
        typed = sign === '\u007f' ? typed.slice(0, -1) : typed + sign
      }
    return typed
  } finally {
    stdin.setRawMode(false)
    stdin.pause()
    stderr.write('\n')
  }
}

/** A password from a file, without the line's end, or typed on a terminal; never from a flag, which everybody could read. */
export async function secretFrom(file: string | undefined): Promise<string | undefined> {
  if (file !== undefined) return readFileSync(file, 'utf8').replace(/\r?\n$/, '')
  return process.stdin.isTTY ? await askHidden('Password of the first administrator: ') : undefined
}
