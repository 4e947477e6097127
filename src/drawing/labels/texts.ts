import type { TextRun } from '../scene'
import { labelRuns } from '../text/label-runs'

/** The ems of symbols and of all other lettering, in millimetres. */
export const SYMBOL_SIZE = 5.2
export const TEXT_SIZE = 3.7

/** Upright lettering. */
export function words(text: string): TextRun {
  return { text, face: 'sans', size: TEXT_SIZE }
}

/** A symbol with what stands before and after it, each parted from it by a no-break space. */
export function named(label: string, { before = '', after = '' }): TextRun[] {
  const runs = labelRuns(label, SYMBOL_SIZE)
  if (before !== '') runs.unshift(words(before))
  // A plain space at the start of a run is lost where white space is collapsed.
  if (after !== '') runs.push(words(`\u00a0${after}`))
  return runs
}
