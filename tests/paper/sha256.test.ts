import { createHash } from 'node:crypto'
import fc from 'fast-check'
import { expect, test } from 'vitest'
import { sha256 } from '#core/paper/sha256.ts'

const hex = (bytes: Uint8Array): string => Buffer.from(bytes).toString('hex')

// NIST, “Examples with intermediate values” for FIPS 180-4: one block and two blocks.
test.each([
  ['abc', 'ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad'],
  [
    'abcdbcdecdefdefgefghfghighijhijkijkljklmklmnlmnomnopnopq',
    '248d6a61d20638b8e5c026930c3e6039a33ce45964ff2167f6ecedd419db06c1',
  ],
])('SHA-256 of “%s” is the published one', (message, expected) => {
  expect(hex(sha256(new TextEncoder().encode(message)))).toBe(expected)
})

test('SHA-256 agrees with the platform for any bytes', () => {
  fc.assert(
    fc.property(fc.uint8Array({ maxLength: 300 }), (bytes) => {
      expect(hex(sha256(bytes))).toBe(createHash('sha256').update(bytes).digest('hex'))
    }),
  )
})
