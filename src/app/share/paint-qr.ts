import type { QrCode } from './qr-code'

/** The light frame that ISO/IEC 18004 asks for, in modules. */
const quietZone = 4

/**
 * Paints a QR code, dark on white whatever the theme, its modules as large as a side of `room` CSS
 * pixels allows: at most 8, and never less than 3, so that a camera can tell them apart on a screen.
 */
export function paintQrCode(canvas: HTMLCanvasElement, code: QrCode, room: number): void {
  const modules = code.size + 2 * quietZone
  const module = Math.min(8, Math.max(3, Math.floor(room / modules)))
  canvas.width = modules * module
  canvas.height = modules * module
  const pen = canvas.getContext('2d')
  if (!pen) return
  pen.fillStyle = '#ffffff'
  pen.fillRect(0, 0, canvas.width, canvas.height)
  pen.fillStyle = '#000000'
  for (let row = 0; row < code.size; row += 1) {
    for (let column = 0; column < code.size; column += 1) {
      if (!code.isDark(row, column)) continue
      pen.fillRect((column + quietZone) * module, (row + quietZone) * module, module, module)
    }
  }
}
