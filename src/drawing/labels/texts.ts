import type { TextRun } from '../scene'
import { labelRuns } from '../text/label-runs'

/** The ems of symbols and of all other lettering, in millimetres. */
export const SYMBOL_SIZE = 5.2
export const TEXT_SIZE = 3.7

/** Upright lettering. */
export function words(text: string): TextRun {
  return { text, face: 'sans', size: TEXT_SIZE }
}

/** A subscript as a label's own. */
function subscript(text: string): TextRun {
  return { text, face: 'sans', size: 0.66 * SYMBOL_SIZE, rise: -0.2 * SYMBOL_SIZE }
}

/**
 * A symbol with what stands before and after it, each parted from it by a no-break space, and with its
 * terminals as a further subscript.
 */
export function named(label: string, { before = '', after = '', terminals = '' }): TextRun[] {
  const runs = labelRuns(label, SYMBOL_SIZE)
  if (terminals !== '') runs.push(subscript(runs.length > 1 ? `, ${terminals}` : terminals))
  if (before !== '') runs.unshift(words(before))
  // A plain space at the start of a run is lost where white space is collapsed.
  if (after !== '') runs.push(words(`\u00a0${after}`))
  return runs
}
