const WIDTH = 120

/**
 * JSON as the project's formatter leaves it: objects with a line for each key, lists on one line where they fit.
 *
 * @param value what JSON can hold
 */
export function printJson(value: unknown): string {
  return `${print(value, '', 0)}\n`
}

/** @param before how many characters stand before the value on its line */
function print(value: unknown, indent: string, before: number): string {
  if (typeof value !== 'object' || value === null) return JSON.stringify(value)
  if (Array.isArray(value)) return printList(value, indent, before)
  const inner = `${indent}  `
  const lines = Object.entries(value).map(([key, part]) => {
    const name = `${JSON.stringify(key)}: `
    return `${inner}${name}${print(part, inner, inner.length + name.length + 1)}`
  })
  return lines.length === 0 ? '{}' : `{\n${lines.join(',\n')}\n${indent}}`
}

function printList(list: readonly unknown[], indent: string, before: number): string {
  const flat = oneLine(list)
  if (before + flat.length <= WIDTH) return flat
  const inner = `${indent}  `
  return `[\n${list.map((part) => `${inner}${print(part, inner, inner.length + 1)}`).join(',\n')}\n${indent}]`
}

function oneLine(value: unknown): string {
  if (Array.isArray(value)) return `[${value.map(oneLine).join(', ')}]`
  if (typeof value !== 'object' || value === null) return JSON.stringify(value)
  const entries = Object.entries(value).map(([key, part]) => `${JSON.stringify(key)}: ${oneLine(part)}`)
  return entries.length === 0 ? '{}' : `{ ${entries.join(', ')} }`
}
