import { failure, success } from '../../core'
import { withPhasorFor } from '../circuit/names'
import { type Form, groupOf } from '../circuit/tree'
import type { EditKind } from './edit-kind'

/** Starts a circuit without elements; `add-element` at the path `[]` adds the first. */
export interface StartCircuit {
  readonly kind: 'start-circuit'
  readonly form: Form
}

/**
 * Starts a circuit on the sheet's supply; where it names none, a voltage `VS` becomes the supply.
 * Refused where the sheet has a circuit already.
 */
export const startCircuit: EditKind<StartCircuit> = {
  apply: (sheet, { form }) => {
    if (sheet.circuit !== undefined) {
      return failure('This sheet has a circuit already: add to it, or delete it first.')
    }
    const circuit = groupOf(form, [])
    if (sheet.supply !== undefined) return success({ ...sheet, circuit })
    const measured = sheet.phasors.find(
      ({ label, quantity }) => label === 'VS' && quantity === 'voltage',
    )
    const supplied = measured ? { sheet, id: measured.id } : withPhasorFor(sheet, 'voltage', 'VS')
    return success({ ...supplied.sheet, supply: supplied.id, circuit })
  },
  describe: (_, { form }) => `Start a ${form} circuit`,
}
