import { indexOf } from '../sheet-index'
import type { Reading, Sheet } from '../types'
import { type LimitPart, type SharedLimitPart, sharedWithinLimit, withinLimit } from './limit-part'
import type { Indication } from './observed'

/** How voltages, currents and powers follow the supply: powers with its square. */
const POWER_OF_SUPPLY = { voltage: 1, current: 1, impedance: 0, power: 2, other: 0 }

/**
 * What the supply makes uncertain of a reading by moving between passes, in proportion to it: common
 * to the readings of a pass; a reading without one was taken at a time of its own.
 */
export function driftPart(
  sheet: Sheet,
  reading: Reading,
  { observed }: Indication,
): { readonly own: readonly LimitPart[]; readonly shared: readonly SharedLimitPart[] } {
  const none = { own: [], shared: [] }
  const { drift = 0 } = sheet
  const move = (exponentOf(sheet, reading) * observed.value * drift) / 100
  if (move === 0) return none
  if (reading.pass === undefined) {
    return { ...none, own: [withinLimit('drift of the supply', Math.abs(move))] }
  }
  const words = `drift of the supply, common to the pass ${reading.pass}`
  return { ...none, shared: [sharedWithinLimit(words, `drift:${reading.pass}`, move)] }
}

function exponentOf(sheet: Sheet, reading: Reading): number {
  if (reading.kind === 'power' || reading.kind === 'reactive-power') return 2
  if (reading.kind !== 'magnitude') return 0
  return POWER_OF_SUPPLY[indexOf(sheet).phasors.get(reading.of)?.quantity ?? 'other']
}
