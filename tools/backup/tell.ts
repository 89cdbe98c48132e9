/** Runs a command of the house and says how it ended; a failure in words, without the trace of our own code. */
export async function tell(work: () => Promise<string>): Promise<void> {
  try {
    process.stdout.write(`${await work()}\n`)
  } catch (error) {
    process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`)
    process.exitCode = 1
  }
}
