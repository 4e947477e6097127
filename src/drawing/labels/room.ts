import { type Box, growBox, isOverlapping } from '../geometry'
import { clipToBox } from './clip'
import type { Occupancy } from './occupancy'
import type { Leader, Stand } from './spot'

/** The side of the cells in which placed labels are looked up, in millimetres. */
const CELL = 20
/** What stays free between two labels, and between a leader and a label that is not its own. */
const BETWEEN = 0.8
const BESIDE_LEADER = 0.5

/** The free room of a drawing: what arrows leave, less the labels placed so far and their leaders. */
export class Room {
  private readonly cells = new Map<number, Box[]>()
  private readonly boxes: Box[] = []
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
    return this.occupancy.isFree(box) && !this.isOnLabel(box)
  }

  /** Whether a label can stand there. */
  isFree({ box, leader }: Stand): boolean {
    return (
      this.isClear(box) &&
      !this.leaders.some((other) => isCrossing(other, box)) &&
      (leader === undefined || this.isFreeLeader(leader))
    )
  }

  /** How crowded the surroundings of a box are, from 0 to 1. */
  crowd(box: Box): number {
    return this.occupancy.share(growBox(box, 3))
  }

  /** Takes a place: no other label will stand on it or on its leader. */
  take({ box, leader }: Stand): void {
    this.boxes.push(box)
    for (const cell of cellsOf(box)) {
      const known = this.cells.get(cell)
      if (known) known.push(box)
      else this.cells.set(cell, [box])
    }
    if (leader) this.leaders.push(leader)
  }

  private isOnLabel(box: Box): boolean {
    const wide = growBox(box, BETWEEN)
    for (const cell of cellsOf(wide)) {
      for (const other of this.cells.get(cell) ?? []) if (isOverlapping(wide, other)) return true
    }
    return false
  }

  private isFreeLeader(leader: Leader): boolean {
    const isBlocked = (box: Box) => isCrossing(leader, box)
    return !this.boxes.some(isBlocked) && !this.fences.some(isBlocked)
  }
}

function* cellsOf({ left, bottom, right, top }: Box): Generator<number> {
  for (let row = Math.floor(bottom / CELL); row <= Math.floor(top / CELL); row += 1) {
    for (let column = Math.floor(left / CELL); column <= Math.floor(right / CELL); column += 1) {
      yield row * 4096 + column
    }
  }
}

function isCrossing({ from, to }: Leader, box: Box): boolean {
  return clipToBox(from, to, growBox(box, BESIDE_LEADER)) !== undefined
}
