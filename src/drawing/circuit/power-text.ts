import { formatQuantity } from '../../core'
import { type Evaluation, type Id, nameOfElement, type Sheet } from '../../sheet'

/** The powers of an element, or of all of the circuit, as they are printed. */
export interface PowerRow {
  readonly of: Id | 'total'
  readonly name: string
  readonly active: string
  readonly reactive: string
  readonly apparent: string
  /** With what the current does: `0.82, lags`; export is said here. */
  readonly factor: string
  /** By what the circuit predicts: the readings do not give it. */
  readonly isPredicted: boolean
}

const DIGITS = { digits: 4 } as const
/** What is below this share of the largest power is rounding. */
const NOTHING = 1e-9

/** The powers of a sheet's elements and last of the whole, as they are printed. */
export function powerRows(sheet: Sheet, evaluation: Evaluation): readonly PowerRow[] {
  const { power = [] } = evaluation
  const largest = Math.max(0, ...power.map(({ apparent }) => apparent))
  const text = (value: number, unit: string) =>
    formatQuantity(Math.abs(value) < NOTHING * largest ? 0 : value, unit, DIGITS)
  return power.map(({ of, active, reactive, apparent, factor, sense, predicted }) => ({
    isPredicted: predicted === true,
    of,
    name: of === 'total' ? 'Total' : nameOfElement(sheet, of),
    active: text(active, 'W'),
    reactive: text(reactive, 'var'),
    apparent: text(apparent, 'VA'),
    factor: [
      factor === undefined ? '' : formatQuantity(factor, '', { resolution: 0.001 }),
      sense ?? '',
      active < -NOTHING * largest ? 'given back' : '',
    ]
      .filter(Boolean)
      .join(', '),
  }))
}
