import { afterAll, inject } from 'vitest'

declare module 'vitest' {
  interface ProvidedContext {
    readonly globalNamespace: string
  }
  interface TaskMeta {
    mutantCoverage?: unknown
    hitCount?: unknown
  }
}

/**
 * Hands over what a test file touched. Stryker 9.0 does it in a hook of its own, but takes the hook's first argument for
 * the file, and since Vitest 4.1 the file comes second: without this, every mutant would be tried by every test.
 */
// biome-ignore lint/correctness/noEmptyPattern: Vitest wants its first argument taken apart, and nothing of it is needed
afterAll(({}, file) => {
  const seen: unknown = Reflect.get(globalThis, inject('globalNamespace'))
  if (typeof seen !== 'object' || seen === null) return
  const { mutantCoverage, hitCount } = seen as { mutantCoverage?: unknown; hitCount?: unknown }
  if (mutantCoverage !== undefined) file.meta.mutantCoverage = mutantCoverage
  if (hitCount !== undefined) file.meta.hitCount = hitCount
})
