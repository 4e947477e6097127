import type { HandArrow, HandEvaluation, Id, Phasor, Quantity, Sum } from '../../sheet'
import { formatMagnitude, formatPhasor } from './phasor-text'
import type { Digits } from './resolution'

/** A tenth of a millimetre is read off a rule: finer digits were not drawn. */
const FINEST_MILLIMETRES = 0.1

/** The digits of a magnitude that was read off a drawing, at so many units to 10 mm. */
export function digitsOfDrawn(unitsPerCentimetre: number): Digits {
  return {
    resolution: 10 ** Math.floor(Math.log10((FINEST_MILLIMETRES * unitsPerCentimetre) / 10)),
  }
}

/** What a hand arrow stands for, as it is called: a phasor's label, or what the sum is called. */
export function nameOfDrawn(
  { stands, sum }: HandArrow,
  phasors: ReadonlyMap<Id, Phasor>,
  sums: ReadonlyMap<Id, Sum>,
): string {
  if (stands !== 'closing') return phasors.get(stands)?.label ?? stands
  const closed = sums.get(sum ?? '') ?? [...sums.values()][0]
  if (closed?.label) return closed.label
  const equals = typeof closed?.equals === 'string' ? phasors.get(closed.equals) : undefined
  return equals?.label ?? 'closing arrow'
}

/** The value of a hand arrow as it was read off: `24.3 V ∠ 0.5°`; empty without a scale. */
export function formatDrawn(
  found: HandEvaluation | undefined,
  quantity: Quantity,
  unitsPerCentimetre: number | undefined,
): string {
  if (found?.magnitude === undefined || unitsPerCentimetre === undefined) return ''
  const magnitude = digitsOfDrawn(unitsPerCentimetre)
  return found.angle === undefined
    ? formatMagnitude(found.magnitude, quantity, magnitude)
    : formatPhasor({ magnitude: found.magnitude, angle: found.angle }, quantity, {
        magnitude,
        angle: { resolution: 0.1 },
      })
}
