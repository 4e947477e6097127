import type { PhasorId, Sheet } from './types'

/**
 * The phasor from which angles count: the one that is named; else the first that is typed at 0° and
 * is not said to be uncertain; else the first. Undefined on a sheet without phasors.
 */
export function referenceOf(sheet: Sheet): PhasorId | undefined {
  if (sheet.reference !== undefined) return sheet.reference
  const typedAtZero = sheet.phasors.find(({ angle }) => angle?.value === 0 && !angle.limit)
  return (typedAtZero ?? sheet.phasors[0])?.id
}
