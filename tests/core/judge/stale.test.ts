import { expect, it, vi } from 'vitest'

// The rules were changed and only half of what follows from them was generated.
vi.mock('#core/generated/rule-checks.js', async (original) => ({ ...(await original<object>()), c0: undefined }))

it('a book whose compiled checks are missing is not judged by', async () => {
  const { shippedBook } = await import('#core/judge/shipped.ts')
  expect(() => shippedBook('iec')).toThrow(/is missing: generate the rules again/)
})
