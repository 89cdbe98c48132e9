import type { Path } from '#core/glossary.ts'

/** The path that a JSON Pointer (RFC 6901) names in the tree: steps into lists become numbers. */
export function locate(pointer: string, tree: unknown): Path {
  const path: (string | number)[] = []
  let value = tree
  for (const part of pointer.split('/').slice(1)) {
    const key = part.replaceAll('~1', '/').replaceAll('~0', '~')
    const step = Array.isArray(value) ? Number(key) : key
    path.push(step)
    value = stepInto(value, step)
  }
  return path
}

/** The value at a path; undefined where there is none. */
export function valueAt(tree: unknown, path: Path): unknown {
  return path.reduce(stepInto, tree)
}

function stepInto(value: unknown, step: string | number): unknown {
  return isObject(value) && Object.hasOwn(value, step) ? value[step] : undefined
}

/** Whether a value is a group of keys or a list. */
export function isObject(value: unknown): value is Readonly<Record<string | number, unknown>> {
  return typeof value === 'object' && value !== null
}
