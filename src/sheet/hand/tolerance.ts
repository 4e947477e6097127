import { type DrawingTolerance, USUAL_TOLERANCE } from '../../core'
import type { Sheet } from '../types'

/** How well this sheet is to be drawn: as it says, else as is usual. */
export function toleranceOf({ drawing }: Sheet): DrawingTolerance {
  return { ...USUAL_TOLERANCE, ...drawing?.tolerance }
}
