import { formatQuantity } from '../../../core'
import { nameOfElement } from '../../circuit/names'
import { countedValue, markedValue } from '../../circuit/values'
import type { Caution } from '../../evaluation'
import type { Sheet } from '../../types'
import { LAST_WORD } from './figures'

/**
 * What the prediction takes for something that it is not: a winding's dc resistance for its ac
 * resistance, and the value of an `impedance`, such as a running motor, for a constant.
 */
export function standInCautions(sheet: Sheet): readonly Caution[] {
  if (sheet.circuit === undefined) return []
  return (sheet.elements ?? []).flatMap((element) => {
    const name = nameOfElement(sheet, element.id)
    const direct = countedValue(element, 'dcResistance')
    const isStandIn =
      direct && !countedValue(element, 'resistance') && !markedValue(element, 'resistance')
    if (isStandIn) {
      const figure = direct.text ?? formatQuantity(direct.value, 'Ω')
      return [
        {
          about: element.id,
          text: `The prediction takes ${figure}, measured with direct current, for the ac resistance of ${name}. That is the least it can be at the same temperature: losses in iron, eddy currents and a warm winding come on top. ${LAST_WORD}`,
        },
      ]
    }
    const isStated =
      element.kind === 'impedance' &&
      (element.marked !== undefined || element.resistance || element.reactance)
    if (!isStated) return []
    return [
      {
        about: element.id,
        text: `${name} is predicted with the impedance that is stated for it, which holds for one state only: that of a running motor changes with its load and speed. ${LAST_WORD}`,
      },
    ]
  })
}
