import type { Box } from '../geometry'

/** The side of a cell in millimetres. */
const CELL = 0.5

/**
 * What of a region is taken, in small cells, and how much of any box is: the sums of all cells below
 * and to the left of each (a summed-area table) answer for a box of any size in four look-ups. What is
 * taken errs on the large side, so that a box that is free is free.
 */
export class Occupancy {
  private readonly columns: number
  private readonly rows: number
  /** Steps along each row at first, the sums once sealed; one more column and row than there are cells. */
  private readonly cells: Int32Array

  constructor(private readonly region: Box) {
    this.columns = Math.ceil((region.right - region.left) / CELL)
    this.rows = Math.ceil((region.top - region.bottom) / CELL)
    this.cells = new Int32Array((this.columns + 1) * (this.rows + 1))
  }

  /** Takes the strip within `reach` of a segment. */
  addSegment(x1: number, y1: number, x2: number, y2: number, reach: number): void {
    const { bottom, top } = this.region
    const isBeside = Math.max(y1, y2) + reach < bottom || Math.min(y1, y2) - reach > top
    if (isBeside || !Number.isFinite(x1 + y1 + x2 + y2)) return
    const first = this.rowOf(Math.min(y1, y2) - reach)
    const last = this.rowOf(Math.max(y1, y2) + reach)
    for (let row = first; row <= last; row += 1) {
      const low = this.region.bottom + row * CELL - reach
      const high = low + CELL + 2 * reach
      // The part of the segment that lies level with the row, give or take the reach.
      const [from, to] = y1 === y2 ? [0, 1] : partBetween(y1, y2, low, high)
      if (from > to) continue
      const [xFrom, xTo] = [x1 + (x2 - x1) * from, x1 + (x2 - x1) * to]
      this.addRun(row, Math.min(xFrom, xTo) - reach, Math.max(xFrom, xTo) + reach)
    }
  }

  /** Takes a box. */
  addBox({ left, bottom, right, top }: Box): void {
    for (let row = this.rowOf(bottom); row <= this.rowOf(top); row += 1) {
      this.addRun(row, left, right)
    }
  }

  /** Ends the adding: only then can be asked. */
  seal(): void {
    const { cells, columns, rows } = this
    const stride = columns + 1
    let above = new Int32Array(stride)
    for (let row = 0; row <= rows; row += 1) {
      const sums = new Int32Array(stride)
      let depth = 0
      let taken = 0
      for (let column = 0; column <= columns; column += 1) {
        const index = row * stride + column
        depth += cells[index] as number
        sums[column] = taken + (above[column] as number)
        cells[index] = above[column] as number
        if (depth > 0) taken += 1
      }
      above = sums
    }
  }

  /** Whether a box lies in the region and nothing in it is taken. */
  isFree(box: Box): boolean {
    const { left, bottom, right, top } = this.region
    if (box.left < left || box.bottom < bottom || box.right > right || box.top > top) return false
    return this.taken(box) === 0
  }

  /** Which share of a box is taken, from 0 to 1; what lies outside the region is not. */
  share(box: Box): number {
    const area = ((box.right - box.left) * (box.top - box.bottom)) / (CELL * CELL)
    return area > 0 ? Math.min(1, this.taken(box) / area) : 0
  }

  private taken({ left, bottom, right, top }: Box): number {
    const { cells } = this
    const stride = this.columns + 1
    const [first, last] = [this.columnOf(left), this.columnOf(right) + 1]
    const [lowest, highest] = [this.rowOf(bottom) * stride, (this.rowOf(top) + 1) * stride]
    return (
      (cells[highest + last] as number) -
      (cells[highest + first] as number) -
      (cells[lowest + last] as number) +
      (cells[lowest + first] as number)
    )
  }

  private addRun(row: number, left: number, right: number): void {
    if (right < this.region.left || left > this.region.right) return
    const start = row * (this.columns + 1)
    const { cells } = this
    const [first, after] = [start + this.columnOf(left), start + this.columnOf(right) + 1]
    cells[first] = (cells[first] as number) + 1
    cells[after] = (cells[after] as number) - 1
  }

  private columnOf(x: number): number {
    const column = Math.floor((x - this.region.left) / CELL)
    return Math.min(this.columns - 1, Math.max(0, column))
  }

  private rowOf(y: number): number {
    const row = Math.floor((y - this.region.bottom) / CELL)
    return Math.min(this.rows - 1, Math.max(0, row))
  }
}

/** From where to where along a segment, 0 to 1, its y lies between two heights. */
function partBetween(y1: number, y2: number, low: number, high: number): [number, number] {
  const [one, other] = [(low - y1) / (y2 - y1), (high - y1) / (y2 - y1)]
  return [Math.max(0, Math.min(one, other)), Math.min(1, Math.max(one, other))]
}
