import type { Drawing } from '../sheet'
import type { Box } from './geometry'
import type { Scene } from './scene'

/** How far the frame lies inside the paper's edge, in millimetres. */
export const FRAME_INSET = 10

/** Portrait width and height in millimetres (ISO 216, ANSI/ASME Y14.1). */
const PAPERS = {
  A4: [210, 297],
  A3: [297, 420],
  Letter: [215.9, 279.4],
} as const

/** The size of a sheet's paper in millimetres; A4 landscape where nothing is said. */
export function paperSizeOf(drawing: Drawing | undefined): { width: number; height: number } {
  const [short, long] = PAPERS[drawing?.paper ?? 'A4']
  return drawing?.orientation === 'portrait'
    ? { width: short, height: long }
    : { width: long, height: short }
}

/** The frame of a paper, in millimetres. */
export function frameOf({ width, height }: { width: number; height: number }): Box {
  return {
    left: FRAME_INSET,
    bottom: FRAME_INSET,
    right: width - FRAME_INSET,
    top: height - FRAME_INSET,
  }
}

/** Whether an arrow of the scene reaches beyond the frame. */
export function isOffPaper(scene: Scene): boolean {
  const { left, right, top, bottom } = frameOf(scene)
  return scene.arrows.some(({ from, to }) =>
    [from, to].some(({ x, y }) => x < left || x > right || y < bottom || y > top),
  )
}
