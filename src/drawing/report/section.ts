import type { Evaluation, Sheet, UnitsPerCentimetre } from '../../sheet'
import type { Block } from './flow'
import type { ReportOptions, SectionName } from './page'

/** What a section is made from. */
export interface Report {
  readonly sheet: Sheet
  readonly evaluation: Evaluation
  readonly options: ReportOptions
  /** Units for each 10 mm of the drawing. */
  readonly unitsPerCentimetre: UnitsPerCentimetre
  /** Of a column, in millimetres. */
  readonly width: number
}

/** A part of a report under its own heading. */
export interface Section {
  readonly name: SectionName
  /** Its blocks, in a column of `report.width`; none where there is nothing to say. */
  readonly blocks: (report: Report) => readonly Block[]
}
