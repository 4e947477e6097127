import { type Box, distanceToBox, growBox, isOverlapping } from '../geometry'
import { isCrossingBox } from './clip'
import type { Occupancy } from './occupancy'
import type { Leader, Stand } from './spot'

/** What stays free between two labels, and between a leader and a label that is not its own. */
const BETWEEN = 0.8
const BESIDE_LEADER = 0.5

/** The free room of a drawing: what arrows leave, less the labels placed so far and their leaders. */
export class Room {
  private readonly boxes = new BoxIndex()
  private readonly leaders: Leader[] = []

  /**
   * @param occupancy What labels never cover.
   * @param fences Boxes that leaders never cross either.
   */
  constructor(
    private readonly occupancy: Occupancy,
    private readonly fences: readonly Box[],
  ) {}

  /** Whether a box is clear of all that is drawn and of the labels placed so far, leaders apart. */
  isClear(box: Box): boolean {
    return this.occupancy.isFree(box) && !this.boxes.isOverlapping(growBox(box, BETWEEN))
  }

  /** Whether a label can stand there. */
  isFree({ box, leader }: Stand): boolean {
    return (
      this.isClear(box) &&
      !this.isOnLeader(growBox(box, BESIDE_LEADER)) &&
      (leader === undefined || this.isFreeLeader(leader))
    )
  }

  /** How crowded the surroundings of a box are, from 0 to 1. */
  crowd(box: Box): number {
    return this.occupancy.share(growBox(box, 3))
  }

  /** Takes a place: no other label will stand on it or on its leader. */
  take({ box, leader }: Stand): void {
    this.boxes.add(box)
    if (leader) this.leaders.push(leader)
  }

  private isOnLeader(box: Box): boolean {
    for (const { from, to } of this.leaders) if (isCrossingBox(from, to, box)) return true
    return false
  }

  private isFreeLeader({ from, to }: Leader): boolean {
    for (const box of this.boxes.all) {
      if (isCrossingBox(from, to, growBox(box, BESIDE_LEADER))) return false
    }
    for (const fence of this.fences) {
      // What starts behind a fence has to cross it.
      const isAhead = distanceToBox(from, fence) > BESIDE_LEADER
      if (isAhead && isCrossingBox(from, to, growBox(fence, BESIDE_LEADER))) return false
    }
    return true
  }
}

/** The side of the cells in which boxes are looked up, in millimetres. */
const CELL = 20
const CELLS_IN_ROW = 4096

/** Boxes by the cells that they reach into. */
class BoxIndex {
  readonly all: Box[] = []
  private readonly cells = new Map<number, Box[]>()

  add(box: Box): void {
    this.all.push(box)
    this.visit(box, (cell) => {
      const known = this.cells.get(cell)
      if (known) known.push(box)
      else this.cells.set(cell, [box])
      return false
    })
  }

  isOverlapping(box: Box): boolean {
    return this.visit(box, (cell) => {
      for (const other of this.cells.get(cell) ?? []) if (isOverlapping(box, other)) return true
      return false
    })
  }

  /** Goes through the cells of a box until one of them gives true. */
  private visit({ left, bottom, right, top }: Box, isEnough: (cell: number) => boolean): boolean {
    const [first, last] = [Math.floor(left / CELL), Math.floor(right / CELL)]
    for (let row = Math.floor(bottom / CELL); row <= Math.floor(top / CELL); row += 1) {
      for (let column = first; column <= last; column += 1) {
        if (isEnough(row * CELLS_IN_ROW + column)) return true
      }
    }
    return false
  }
}
