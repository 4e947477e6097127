import { formatNumber, formatQuantity } from '../../../core'
import type { Caution } from '../../evaluation'
import { plainFigure } from '../../plain-figure'
import type { Sheet } from '../../types'
import { type Figures, LAST_WORD } from './figures'

/** How near is near, as a share of the working frequency (common practice, no source). */
const NEAR = 0.1

/** A caution where the circuit resonates within a tenth of the working frequency, or within its own band. */
export function resonanceCautions(sheet: Sheet, { resonance }: Figures): readonly Caution[] {
  const working = sheet.frequency?.value
  if (resonance === undefined || working === undefined) return []
  const { frequency, quality, bandwidth = 0 } = resonance
  const apart = Math.abs(frequency - working)
  const isSharp = quality === undefined || quality >= 1
  if (apart > NEAR * working && !(isSharp && apart <= bandwidth / 2)) return []
  const [at, works] = [formatQuantity(frequency, 'Hz'), plainFigure(working, 'Hz')]
  const rise =
    quality === undefined
      ? 'nothing in its values holds voltages and currents down there'
      : `voltages or currents inside it may reach ${formatNumber(quality, 1)} times those of the supply there`
  return [
    {
      about: 'sheet',
      text: `By its values the circuit resonates at ${at}, near the working frequency of ${works}: ${rise}. ${LAST_WORD}`,
    },
  ]
}
