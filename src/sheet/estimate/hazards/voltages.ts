import { nameOfElement } from '../../circuit/names'
import type { Caution } from '../../evaluation'
import { plainFigure } from '../../plain-figure'
import type { Sheet } from '../../types'
import { ABOVE, type Figures, LAST_WORD, listed, sizeOf } from './figures'

/** V ac: the usual limit of touch voltage (IEC 61140, IEC 60364-4-41; from memory). */
export const TOUCH_LIMIT = 50

/** The voltage in V ac above which a caution is due: 50 V, or the lower value that the sheet sets. */
export function touchLimitOf({ safety }: Sheet): number {
  return Math.min(TOUCH_LIMIT, safety?.voltageLimit ?? TOUCH_LIMIT)
}

/** One caution for all voltages that are dangerous to touch, the highest first. */
export function touchCautions(sheet: Sheet, figures: Figures): readonly Caution[] {
  const limit = touchLimitOf(sheet)
  const above = sheet.phasors
    .filter(({ quantity }) => quantity === 'voltage')
    .flatMap(({ id }) => sizeOf(sheet, figures, id) ?? [])
    .filter(({ value }) => value > limit * ABOVE)
    .sort((one, other) => other.value - one.value)
  const [highest] = above
  if (highest === undefined) return []
  const told = above.slice(0, 3).map(({ label, text }) => `${label} at ${text}`)
  const more = above.length > 3 ? [...told, `${above.length - 3} more`] : told
  const whose =
    limit < TOUCH_LIMIT
      ? `the ${plainFigure(limit, 'V')} that this sheet sets for the place`
      : 'the 50 V ac up to which touch is usually taken for safe in dry places (IEC 61140, IEC 60364)'
  const verb = above.length === 1 ? 'is' : 'are'
  return [{ about: highest.id, text: `${listed(more)} ${verb} above ${whose}. ${LAST_WORD}` }]
}

/** A caution for each element whose voltage is above that of the supply. */
export function stepUpCautions(sheet: Sheet, figures: Figures): readonly Caution[] {
  const supply = sheet.phasors.find(({ id }) => id === sheet.supply)
  const source = supply?.quantity === 'voltage' && sizeOf(sheet, figures, supply.id)
  if (!source) return []
  return (sheet.elements ?? []).flatMap(({ id, voltage }) => {
    const own = voltage === source.id ? undefined : sizeOf(sheet, figures, voltage)
    if (own === undefined || own.value <= source.value * ABOVE) return []
    const name = nameOfElement(sheet, id)
    return [
      {
        about: voltage,
        text: `The voltage of ${name}, ${own.text}, is above that of the supply, ${source.text}: meters, leads and insulation there must bear it. ${LAST_WORD}`,
      },
    ]
  })
}
