/** Prints medians as a table with their ratio to the first row. */
export function printTable(title: string, medians: ReadonlyMap<string, number>, unit = 'ms'): void {
  const base = [...medians.values()][0] ?? Number.NaN
  const width = Math.max(...[...medians.keys()].map((name) => name.length))
  process.stdout.write(`\n${title}\n`)
  for (const [name, value] of medians) {
    process.stdout.write(
      `  ${name.padEnd(width)}  ${value.toFixed(1).padStart(9)} ${unit}  ${(value / base).toFixed(2).padStart(6)} ×\n`,
    )
  }
}
