import { formatQuantity } from '../../../core'
import { nameOfElement } from '../../circuit/names'
import type { Caution } from '../../evaluation'
import type { Sheet } from '../../types'
import { type Figures, LAST_WORD } from './figures'

/** Active power below this share of the apparent power is rounding. */
const NOTHING = 1e-9

/** A caution for each element, and for the whole, that gives active power back. */
export function exportCautions(sheet: Sheet, { power }: Figures): readonly Caution[] {
  return power
    .filter(({ active, apparent }) => active < -NOTHING * apparent)
    .map(({ of, active }) => {
      const isWhole = of === 'total'
      const name = isWhole ? 'The circuit as a whole' : nameOfElement(sheet, of)
      const figure = formatQuantity(-active, 'W', { digits: 3 })
      return {
        about: isWhole ? 'sheet' : of,
        text: `${name} gives back ${figure} of active power: an export, not an import. If no source is there, a clamp or a pair of leads is reversed. ${LAST_WORD}`,
      }
    })
}
