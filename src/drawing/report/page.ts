import type { Id, Sheet } from '../../sheet'
import type { Item } from '../scene'

/** A paper that a page is printed on, and which way round it lies. */
export interface Paper {
  readonly format: 'A4' | 'A3' | 'Letter'
  readonly orientation: 'portrait' | 'landscape'
}

/** One page, as it is printed: its paper, and what is on it in painting order. */
export interface Page extends Paper {
  /** Paper size in millimetres. */
  readonly width: number
  readonly height: number
  readonly items: readonly Item[]
  /** What the page is called: `Job report: Bakery oven, sheet 2 of 3`. */
  readonly title: string
  /** What is on it, in words. */
  readonly description: string
  /** Counted from 1. */
  readonly number: number
  /** How many pages belong together. */
  readonly count: number
  /** What does not fit on it, each a whole sentence; none where all is well. */
  readonly remarks: readonly string[]
}

/** A QR code: so many modules a side, without its quiet zone. */
export interface ModuleMatrix {
  readonly size: number
  isDark(row: number, column: number): boolean
}

/** The sections of a report, in the order in which they stand on its pages. */
export type SectionName =
  | 'job'
  | 'hazards'
  | 'verdict'
  | 'sums'
  | 'schedule'
  | 'readings'
  | 'instruments'
  | 'hand'
  | 'comparison'
  | 'elements'
  | 'power'
  | 'corrections'
  | 'cautions'
  | 'conclusion'
  | 'sign-off'
  | 'link'

/** How a report is made. */
export interface ReportOptions {
  /** Of the pages beside the drawing, which keeps its own; that of the drawing where nothing is said. */
  readonly paper?: Partial<Paper>
  /** Printed at the foot of every page, to be checked from the file. */
  readonly fingerprint?: string
  /** The QR code of the link to the sheet; without it that section is left out. */
  readonly code?: ModuleMatrix
  /** Whether the terminals of each phasor stand in its subscript on the drawing. */
  readonly terminals?: boolean
  /** Sections that are left out. */
  readonly without?: ReadonlySet<SectionName>
  /** Sums whose exact drawing is hidden. */
  readonly hidden?: ReadonlySet<Id>
}

/** The paper of a sheet's drawing: A4 landscape where nothing is said. */
export function paperOf({ drawing }: Pick<Sheet, 'drawing'>): Paper {
  return {
    format: drawing?.paper ?? 'A4',
    orientation: drawing?.orientation ?? 'landscape',
  }
}
