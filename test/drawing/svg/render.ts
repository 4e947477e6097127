import { Resvg } from '@resvg/resvg-js'

/** A picture, pixel by pixel: red, green, blue and opacity from 0 to 255. */
export interface Picture {
  readonly width: number
  readonly height: number
  readonly at: (x: number, y: number) => readonly number[]
}

/**
 * Draws an SVG, but for its texts, by a renderer that knows nothing of this program; fails where it is
 * not well-formed.
 */
export function render(svg: string, width: number): Picture {
  const font = { loadSystemFonts: false }
  const image = new Resvg(svg, { fitTo: { mode: 'width', value: width }, font }).render()
  const { pixels } = image
  return {
    width: image.width,
    height: image.height,
    at: (x, y) => [...pixels.subarray(4 * (y * image.width + x), 4 * (y * image.width + x) + 4)],
  }
}
