/** Names for things that the file may list twice under one name: the second `water pipe` becomes `water pipe/2`. */
export function distinct(names: readonly string[]): string[] {
  const seen = new Map<string, number>()
  return names.map((name) => {
    const count = (seen.get(name) ?? 0) + 1
    seen.set(name, count)
    return count === 1 ? name : `${name}/${count}`
  })
}
