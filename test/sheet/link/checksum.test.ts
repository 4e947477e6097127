import { crc32 } from 'node:zlib'
import fc from 'fast-check'
import { expect, test } from 'vitest'
import { checksumOf } from '../../../src/sheet/link/checksum'

test('the checksum of "123456789" is the check value that catalogues of CRC-32 give (from memory)', () => {
  const digits = Uint8Array.from('123456789', (digit) => digit.charCodeAt(0))
  expect(checksumOf(digits)).toBe(0xcbf43926)
})

test('the checksum is the one of an independent library', () => {
  fc.assert(
    fc.property(fc.uint8Array(), (bytes) => {
      expect(checksumOf(bytes)).toBe(crc32(bytes))
    }),
  )
})
