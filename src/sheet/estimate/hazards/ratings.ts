import { unitOf } from '../../../core'
import { nameOfElement } from '../../circuit/names'
import type { Caution } from '../../evaluation'
import { plainFigure } from '../../plain-figure'
import type { Sheet } from '../../types'
import { ABOVE, type Figures, LAST_WORD, sizeOf } from './figures'

/** A caution for each voltage and current above the rating that its element states. */
export function ratingCautions(sheet: Sheet, figures: Figures): readonly Caution[] {
  return (sheet.elements ?? []).flatMap((element) =>
    (['voltage', 'current'] as const).flatMap((side) => {
      const rating = element.rating?.[side]
      const size = sizeOf(sheet, figures, element[side])
      if (rating === undefined || size === undefined || size.value <= rating * ABOVE) return []
      const name = nameOfElement(sheet, element.id)
      const rated = plainFigure(rating, unitOf(side))
      return [
        {
          about: element[side],
          text: `The ${side} of ${name}, ${size.text}, is above its rating of ${rated}. ${LAST_WORD}`,
        },
      ]
    }),
  )
}
