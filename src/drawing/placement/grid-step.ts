/** The stronger lines of the grid, in millimetres. */
export const GRID_STEP = 10

/** The nearest stronger grid line. */
export function snap(millimetres: number): number {
  return Math.round(millimetres / GRID_STEP) * GRID_STEP
}

/** The next stronger grid line at or below. */
export function snapDown(millimetres: number): number {
  return Math.floor(millimetres / GRID_STEP) * GRID_STEP
}

/** The next stronger grid line at or above. */
export function snapUp(millimetres: number): number {
  return Math.ceil(millimetres / GRID_STEP) * GRID_STEP
}
