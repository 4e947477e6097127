import { absoluteLimit, asLimit, parseCell, parseNumber, type Result, success } from '../../core'
import {
  apply,
  type Edit,
  numbersIn,
  type Phasor,
  parseReadingText,
  parseShownValue,
  type Reading,
  type Sheet,
  shownFigures,
} from '../../sheet'
import type { Store } from '../store'

/** Makes an edit; returns why the sheet refuses it, for the sentence under the field. */
export function tryEdit(store: Store, edit: Edit): string | undefined {
  const result = apply(store.getState().history.sheet, edit)
  if (!result.ok) return result.problem
  store.getState().edit(edit)
  return undefined
}

type ReadingChange = Extract<Edit, { kind: 'set-reading' }>['change']

/** Changes one reading; returns why the sheet refuses it. */
export function changeReading(
  store: Store,
  { id }: Reading,
  change: ReadingChange,
): string | undefined {
  return tryEdit(store, { kind: 'set-reading', id, change })
}

/** The quantity of the phasor that a reading is of. */
export function quantityOf(sheet: Sheet, of: Phasor['id']): Phasor['quantity'] {
  return sheet.phasors.find(({ id }) => id === of)?.quantity ?? 'other'
}

/** The unit in which a reading was shown. */
export function unitOfReading(sheet: Sheet, reading: Reading): string {
  return shownFigures(reading, quantityOf(sheet, reading.of))[0]?.unit ?? ''
}

/** Takes what the display showed and how it was taken. */
export function commitFigures(
  store: Store,
  sheet: Sheet,
  reading: Reading,
  text: string,
): string | undefined {
  const parsed = parseReadingText(reading.kind, text, quantityOf(sheet, reading.of))
  return parsed.ok ? changeReading(store, reading, parsed.value) : parsed.problem
}

/** Takes a limit in the unit of what was shown, or as a percentage of it; an empty text takes it back. */
export function commitReadingLimit(
  store: Store,
  sheet: Sheet,
  reading: Reading,
  text: string,
): string | undefined {
  if (text === '') return changeReading(store, reading, { limit: null })
  const unit = unitOfReading(sheet, reading)
  const parsed = parseCell(asLimit(text), { unit })
  if (!parsed.ok) return parsed.problem
  if (parsed.value.form !== 'limit') return 'Type the limit as half a width, such as 0.5 or 1 %.'
  const shown = shownValue(sheet, reading)
  const limit = absoluteLimit(parsed.value.limit, shown)
  return changeReading(store, reading, { limit })
}

function shownValue(sheet: Sheet, reading: Reading): number {
  const [figure] = shownFigures(reading, quantityOf(sheet, reading.of))
  const value = figure && parseShownValue(figure.shown, figure.unit)
  return value?.ok ? value.value : 0
}

/** Takes the end of the range on which the meter was; an empty text takes it back. */
export function commitRange(
  store: Store,
  sheet: Sheet,
  reading: Reading,
  text: string,
): string | undefined {
  const range = maybeNumber(text, unitOfReading(sheet, reading))
  return range.ok ? changeReading(store, reading, { range: range.value }) : range.problem
}

/** Takes the indications of several passes, parted by spaces; an empty text takes them back. */
export function commitRepeats(store: Store, reading: Reading, text: string): string | undefined {
  const repeats = numbersIn(text)
  if (!repeats.ok) return repeats.problem
  return changeReading(store, reading, { repeats: repeats.value ?? null })
}

/** A figure in a unit, or null where nothing was typed. */
export function maybeNumber(text: string, unit: string): Result<number | null> {
  if (text === '') return success(null)
  const parsed = parseNumber(text, { unit })
  return parsed.ok ? success(parsed.value.value) : parsed
}
