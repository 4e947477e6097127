import type { Complex } from '../../core'
import type { Id, Phasor, Place, Quantity } from '../../sheet'
import type { PlacedArrow } from '../scene'
import type { Vectors } from './vectors'

/** An arrow of a figure before it has a scale. */
export interface Member {
  readonly key: string
  readonly role: PlacedArrow['role']
  readonly phasor?: Id
  readonly sum?: Id
  readonly sign: 1 | -1
  readonly quantity: Quantity
  /** The member at whose tip its tail lies; −1: at the figure's start. */
  readonly after: number
  /** From tail to tip in the quantity's unit, turned round where the sign is negative. */
  readonly vector: Complex
}

/** Arrows that hang together: a sum with what hangs on its tips, or a loose phasor. */
export interface Figure {
  readonly key: string
  readonly isSum: boolean
  readonly quantity: Quantity
  /** Where the sheet says that it starts. */
  readonly start?: Place
  readonly members: Member[]
}

/** Where a phasor is drawn first. */
export interface Home {
  readonly figure: Figure
  readonly index: number
}

/** What the builders of figures share. */
export interface Workshop {
  readonly phasors: ReadonlyMap<Id, Phasor>
  readonly vectors: Vectors
  readonly figures: Figure[]
  readonly homes: Map<Id, Home>
  /** Phasors that a sum names: they are not loose, drawn or not. */
  readonly summed: Set<Id>
}

/** Puts an arrow into a figure and remembers where its phasor is drawn first. */
export function addMember({ homes }: Workshop, figure: Figure, member: Member): number {
  const index = figure.members.push(member) - 1
  if (member.phasor !== undefined && !homes.has(member.phasor)) {
    homes.set(member.phasor, { figure, index })
  }
  return index
}
