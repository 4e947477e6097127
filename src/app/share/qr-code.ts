import { create } from 'qrcode'

/** A QR code: so many modules a side, dark ones true, row by row, without its quiet zone. */
export interface QrCode {
  readonly size: number
  isDark(row: number, column: number): boolean
}

/** The QR code of a text, with as much of it to spare as its version allows; undefined where it is too long. */
export function maybeQrCode(text: string): QrCode | undefined {
  for (const errorCorrectionLevel of ['M', 'L'] as const) {
    try {
      const { modules, version } = create(text, { errorCorrectionLevel })
      if (version <= largestVersion) {
        return { size: modules.size, isDark: (row, column) => modules.get(row, column) !== 0 }
      }
    } catch {
      // Too long at this level: the next one holds more.
    }
  }
  return undefined
}

/** Telephones read larger codes from a screen only now and then: common practice, no source. */
const largestVersion = 30
