import { createHash } from 'node:crypto'
import fc from 'fast-check'
import { expect, test } from 'vitest'
import { sha256 } from '../../src/sheet/sha-256'

const bytesOf = (text: string) => new TextEncoder().encode(text)

test('SHA-256 of "abc" and of the two-block message are those of FIPS 180-4 (from memory)', () => {
  expect(sha256(bytesOf('abc'))).toBe(
    'ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad',
  )
  expect(sha256(bytesOf('abcdbcdecdefdefgefghfghighijhijkijkljklmklmnlmnomnopnopq'))).toBe(
    '248d6a61d20638b8e5c026930c3e6039a33ce45964ff2167f6ecedd419db06c1',
  )
})

test('SHA-256 of any bytes is what the runtime says', () => {
  const digestOf = (bytes: Uint8Array) => createHash('sha256').update(bytes).digest('hex')
  for (let length = 0; length < 200; length += 1) {
    const bytes = new Uint8Array(length).fill(length)
    expect(sha256(bytes)).toBe(digestOf(bytes))
  }
  fc.assert(
    fc.property(fc.uint8Array({ maxLength: 3_000 }), (bytes) => {
      expect(sha256(bytes)).toBe(digestOf(bytes))
    }),
  )
})
