import type { Sheet } from '../../sheet'
import { named } from '../labels/texts'
import type { Wish } from '../labels/wish'
import { createVectors, partsOf } from '../placement/vectors'
import { formatPhasor } from '../text/phasor-text'
import type { Palette } from '../theme'
import type { PredictedArrows } from './place-both'

/** The labels of predicted arrows beside which nothing was measured yet; the others bear their own. */
export function predictedWishes(
  { phasors }: Sheet,
  { alone, evaluation }: PredictedArrows,
  palette: Palette,
): readonly Wish[] {
  if (evaluation === undefined) return []
  const vectors = createVectors(evaluation)
  return alone.flatMap(({ key, from, to, phasor: id, quantity, sign }) => {
    const phasor = phasors.find((each) => each.id === id)
    if (phasor === undefined) return []
    const { magnitude = 0, angle = 0 } = partsOf(vectors, phasor.id)
    const value = formatPhasor({ magnitude, angle }, quantity, { magnitude: {}, angle: {} })
    const before = sign === 1 ? '' : '−'
    const label = phasor.label || phasor.id
    return [
      {
        arrow: `predicted:${key}`,
        from,
        to,
        full: named(label, { before, after: `${value} predicted` }),
        short: named(label, { before, after: 'predicted' }),
        fill: palette.quiet,
        along: 0.65,
        isBestAtTip: true,
        side: 0,
        reach: 0.11,
      },
    ]
  })
}
