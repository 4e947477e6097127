import { formatQuantity } from '../../../core'
import { chargeOf, dischargeTime } from '../../../core/circuit'
import { nameOfElement } from '../../circuit/names'
import { predictingValue } from '../../circuit/values'
import type { Caution } from '../../evaluation'
import { plainFigure } from '../../plain-figure'
import type { CircuitElement, Sheet } from '../../types'
import { type Figures, LAST_WORD, sizeOf } from './figures'
import { touchLimitOf } from './voltages'

/**
 * A caution for each capacitor: the peak to which it may stay charged after switching off, the energy of
 * that, and how long it takes to fall to the sheet's touch voltage through the sheet's resistor.
 */
export function chargeCautions(sheet: Sheet, figures: Figures): readonly Caution[] {
  return (sheet.elements ?? []).flatMap((element) => {
    const size = sizeOf(sheet, figures, element.voltage)
    const capacitance = capacitanceOf(element, figures)
    if (element.kind !== 'capacitor' || !size || !capacitance || size.value === 0) return []
    const { peak, energy } = chargeOf(capacitance, size.value)
    const [volts, joules] = [
      formatQuantity(peak, 'V', { digits: 3 }),
      formatQuantity(energy, 'J', { digits: 2 }),
    ]
    const name = nameOfElement(sheet, element.id)
    return [
      {
        about: element.id,
        text: `${name}, at ${size.text}, may stay charged to a peak of ${volts} after switching off, which is ${joules}. ${discharge(sheet, capacitance, peak)} ${LAST_WORD}`,
      },
    ]
  })
}

/** The larger of what was found and what it is marked with: the caution must not be too small. */
function capacitanceOf(element: CircuitElement, { elements }: Figures): number | undefined {
  const found = elements.find(({ id }) => id === element.id)?.found?.capacitance?.value
  const stated = predictingValue(element, 'capacitance')?.value
  const known = [found, stated].filter((value) => value !== undefined)
  return known.length === 0 ? undefined : Math.max(...known)
}

function discharge(sheet: Sheet, capacitance: number, peak: number): string {
  const limit = touchLimitOf(sheet)
  const resistance = sheet.safety?.dischargeResistance
  if (resistance === undefined || resistance === 0 || limit === 0) {
    return 'Discharge it through a resistor that bears it, and measure that it is discharged.'
  }
  const seconds = dischargeTime(capacitance, resistance, peak, limit)
  const [through, below] = [plainFigure(resistance, 'Ω'), plainFigure(limit, 'V')]
  if (seconds === 0) return `That is not above ${below}.`
  const time = formatQuantity(seconds, 's', { digits: 2 })
  return `Through ${through} it falls to ${below} in ${time}: measure that it has.`
}
