import { type RefObject, useEffect, useRef } from 'react'
import type { Place } from '../../sheet'

/** How wide the loupe is, how much it enlarges, and how far above the finger it hangs: CSS pixels. */
const width = 116
const power = 2
const above = 96

/** What lies under the finger, enlarged and out of its way, with a cross at the very point. */
export function Loupe(properties: {
  readonly at: Place
  readonly board: RefObject<HTMLElement | null>
}) {
  const { at, board } = properties
  const canvas = useRef<HTMLCanvasElement>(null)

  useEffect(() => {
    // In the same frame as the board, after it: it has asked for the frame before.
    const frame = requestAnimationFrame(() => {
      const pen = canvas.current?.getContext('2d')
      if (canvas.current && pen && board.current) copyUnder(pen, board.current, at)
    })
    return () => cancelAnimationFrame(frame)
  }, [at, board])

  const ratio = window.devicePixelRatio
  const room = at.y > above + width / 2
  const top = room ? at.y - above - width / 2 : at.y + above - width / 2
  const across = board.current?.clientWidth ?? width
  const left = Math.min(across - width, Math.max(0, at.x - width / 2))
  return (
    <canvas
      className="loupe"
      ref={canvas}
      width={width * ratio}
      height={width * ratio}
      style={{ transform: `translate(${left}px, ${top}px)` }}
    />
  )
}

function copyUnder(pen: CanvasRenderingContext2D, board: HTMLElement, at: Place): void {
  const { width: across, height: down } = pen.canvas
  pen.fillStyle = getComputedStyle(board).backgroundColor
  pen.fillRect(0, 0, across, down)
  const seen = width / power
  for (const layer of board.querySelectorAll<HTMLCanvasElement>('.konvajs-content canvas')) {
    const ratio = layer.width / layer.clientWidth
    pen.drawImage(
      layer,
      (at.x - seen / 2) * ratio,
      (at.y - seen / 2) * ratio,
      seen * ratio,
      seen * ratio,
      0,
      0,
      across,
      down,
    )
  }
  pen.strokeStyle = getComputedStyle(board).color
  pen.lineWidth = across / width
  pen.beginPath()
  pen.moveTo(across / 2, 0.35 * down)
  pen.lineTo(across / 2, 0.65 * down)
  pen.moveTo(0.35 * across, down / 2)
  pen.lineTo(0.65 * across, down / 2)
  pen.stroke()
}
