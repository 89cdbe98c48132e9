/**
 * A value that is there because of what was checked before: an entry that the tree of supply names, the sheet behind a
 * finding. To print nothing in its place would hide a mistake of ours.
 *
 * @param name what is looked up
 * @throws Error when it is missing, which no file can bring about
 */
export function sure<Value>(value: Value | undefined, name: string): Value {
  if (value === undefined) throw new Error(`${name} is taken for granted in a report, and is missing.`)
  return value
}
