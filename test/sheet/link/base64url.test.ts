import { Buffer } from 'node:buffer'
import fc from 'fast-check'
import { expect, test } from 'vitest'
import { fromBase64Url, toBase64Url } from '../../../src/sheet/link/base64url'

test('bytes come back, and their text is that of an independent library', () => {
  fc.assert(
    fc.property(fc.uint8Array({ maxLength: 40 }), (bytes) => {
      const text = toBase64Url(bytes)
      expect(text).toBe(Buffer.from(bytes).toString('base64url'))
      expect(fromBase64Url(text)).toEqual(bytes)
    }),
  )
})

test('text that ends within a byte gives the whole bytes before', () => {
  expect(fromBase64Url('QQ')).toEqual(Uint8Array.of(65))
  expect(fromBase64Url('QUJDR')).toEqual(Uint8Array.of(65, 66, 67))
})
