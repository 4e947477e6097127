import fc from 'fast-check'
import { expect, test } from 'vitest'
import { seal, unseal } from '../../../src/sheet/link/envelope'

const content = fc.uint8Array({ minLength: 1, maxLength: 200 })

test('what was sealed comes out, also where something stands behind it', () => {
  fc.assert(
    fc.property(content, fc.uint8Array(), (bytes, behind) => {
      const opened = unseal(Uint8Array.from([...seal(bytes), ...behind]))
      expect(opened.ok && Uint8Array.from(opened.content)).toEqual(bytes)
    }),
  )
})

test('whatever is cut off is missed', () => {
  fc.assert(
    fc.property(content, fc.nat(), (bytes, at) => {
      const sealed = seal(bytes)
      const opened = unseal(sealed.subarray(0, at % sealed.length))
      expect(opened).toEqual({ ok: false, problem: 'cut' })
    }),
  )
})

test('any altered byte is noticed', () => {
  fc.assert(
    fc.property(content, fc.nat(), fc.integer({ min: 1, max: 255 }), (bytes, at, change) => {
      const sealed = seal(bytes)
      const place = at % sealed.length
      sealed[place] = (sealed[place] ?? 0) ^ change
      expect(unseal(sealed).ok).toBe(false)
    }),
  )
})
