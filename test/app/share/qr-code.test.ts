import jsQr from 'jsqr'
import { describe, expect, test } from 'vitest'
import { maybeQrCode, type QrCode } from '../../../src/app/share/qr-code'
import { exampleSheet, serializeLink } from '../../../src/sheet'

/** The picture of a code as a camera would have it, each module so many pixels wide, frame and all. */
function photograph(code: QrCode, module: number) {
  const side = (code.size + 8) * module
  const pixels = new Uint8ClampedArray(side * side * 4).fill(255)
  for (let y = 0; y < side; y += 1) {
    for (let x = 0; x < side; x += 1) {
      const row = Math.floor(y / module) - 4
      const column = Math.floor(x / module) - 4
      const isInside = row >= 0 && column >= 0 && row < code.size && column < code.size
      if (isInside && code.isDark(row, column))
        pixels.fill(0, 4 * (y * side + x), 4 * (y * side + x) + 3)
    }
  }
  return { pixels, side }
}

function scan(code: QrCode): string | undefined {
  const { pixels, side } = photograph(code, 3)
  return jsQr(pixels, side, side)?.data
}

describe('the QR code of a link', () => {
  test('is read back letter for letter by an independent reader', () => {
    const link = `https://sheets.example.org/phasogon/${serializeLink(exampleSheet)}`
    const code = maybeQrCode(link)
    expect(code && scan(code)).toBe(link)
  })

  test('fits up to some 1,700 characters, and is then read back too', () => {
    const link = `https://sheets.example.org/#sheet=1.${'Zx9_-'.repeat(333)}`
    const code = maybeQrCode(link)
    expect(code?.size).toBeGreaterThan(130)
    expect(code && scan(code)).toBe(link)
  })

  test('is none for a link that no camera would read from a screen', () => {
    expect(
      maybeQrCode(`https://sheets.example.org/#sheet=1.${'Zx9_-'.repeat(400)}`),
    ).toBeUndefined()
    expect(maybeQrCode('a'.repeat(20_000))).toBeUndefined()
  })
})
