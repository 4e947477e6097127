import {
  asLimit,
  type CellValue,
  failure,
  parseCell,
  type Quantity,
  type Result,
  success,
  type Typed,
  unitOf,
} from '../core'
import type { Evaluation, PhasorEvaluation } from './evaluation'
import { newId } from './new-id'
import type { Phasor, Reading, Sheet } from './types'

/** What rows of a spreadsheet come to: what can be added, and what could not be read, row by row. */
export interface RowsRead {
  readonly phasors: readonly Phasor[]
  readonly readings: readonly Reading[]
  /** Whole sentences, each naming its row as the spreadsheet counts it. */
  readonly problems: readonly string[]
}

type Column =
  | 'label'
  | 'quantity'
  | 'magnitude'
  | 'angle'
  | 'real'
  | 'imaginary'
  | 'limit'
  | 'known'

const names: { readonly [name: string]: Column } = {
  label: 'label',
  name: 'label',
  phasor: 'label',
  quantity: 'quantity',
  magnitude: 'magnitude',
  value: 'magnitude',
  rms: 'magnitude',
  angle: 'angle',
  phase: 'angle',
  degrees: 'angle',
  real: 'real',
  imaginary: 'imaginary',
  limit: 'limit',
  known: 'known',
}

const usualOrder: readonly Column[] = ['label', 'magnitude', 'angle', 'quantity', 'limit', 'known']

const QUANTITIES: readonly Quantity[] = ['voltage', 'current', 'impedance', 'power', 'other']

const quantityOfSymbol: { readonly [symbol: string]: Quantity } = {
  I: 'current',
  i: 'current',
  Z: 'impedance',
  S: 'power',
  P: 'power',
  Q: 'power',
}

/**
 * Reads rows of text cells as phasors. A first row that names columns settles their order; without
 * one they are label, magnitude, angle, quantity, limit, known. The quantity is the one named, else
 * that of the unit in the row, else that of the label's first letter, else voltage. A row marked
 * "read" becomes meter readings. Empty rows are passed over.
 */
export function readRows(sheet: Sheet, table: readonly (readonly string[])[]): RowsRead {
  const header = headerOf(table[0] ?? [])
  const columns = header ?? usualOrder
  const phasors: Phasor[] = []
  const readings: Reading[] = []
  const problems: string[] = []
  table.forEach((cells, index) => {
    if ((index === 0 && header) || cells.every((cell) => cell.trim() === '')) return
    const room = {
      ...sheet,
      phasors: [...sheet.phasors, ...phasors],
      readings: [...(sheet.readings ?? []), ...readings],
    }
    const row = readRow(room, columns, cells)
    if (!row.ok) {
      problems.push(`Row ${index + 1}: ${row.problem}`)
      return
    }
    phasors.push(row.value.phasor)
    readings.push(...row.value.readings)
  })
  return { phasors, readings, problems }
}

function headerOf(cells: readonly string[]): readonly (Column | undefined)[] | undefined {
  const columns = cells.map((cell) => names[cell.trim().toLowerCase().replace(/\s.*$/, '')])
  const known = columns.filter((column) => column !== undefined)
  return known.includes('label') && known.length > 1 ? columns : undefined
}

function readRow(
  sheet: Sheet,
  columns: readonly (Column | undefined)[],
  cells: readonly string[],
): Result<{ phasor: Phasor; readings: readonly Reading[] }> {
  const cell = (column: Column) => cells[columns.indexOf(column)]?.trim() ?? ''
  const label = cell('label').replace(/^'(?=[=+\-@])/, '')
  if (label === '') return failure('it has no label. Give the phasor a name, such as V1.')
  const quantity = quantityOf(cell('quantity'), cell('magnitude'), label)
  if (!quantity.ok) return quantity
  const value = valuesIn(quantity.value, cell)
  if (!value.ok) return value
  const id = newId(sheet, label)
  const base = { id, label, quantity: quantity.value }
  if (!/^read\b/i.test(cell('known')))
    return success({ phasor: { ...base, ...value.value }, readings: [] })
  return success({ phasor: base, readings: readingsOf(sheet, id, value.value) })
}

function quantityOf(named: string, magnitude: string, label: string): Result<Quantity> {
  if (named !== '') {
    const found = QUANTITIES.find((quantity) => quantity === named.toLowerCase())
    return found
      ? success(found)
      : failure(`“${named}” is no quantity. Use ${QUANTITIES.join(', ')}.`)
  }
  return success(quantityOfCell(magnitude, label))
}

/** The quantity of the unit in a cell, else that of a label's first letter, else voltage. */
export function quantityOfCell(magnitude: string, label: string): Quantity {
  const fits = QUANTITIES.find(
    (quantity) =>
      unitOf(quantity) !== '' &&
      magnitude.includes(unitOf(quantity)) &&
      parseCell(magnitude, { unit: unitOf(quantity) }).ok,
  )
  return fits ?? quantityOfSymbol[label[0] ?? ''] ?? 'voltage'
}

interface Values {
  readonly magnitude?: Typed
  readonly angle?: Typed
  readonly real?: Typed
  readonly imaginary?: Typed
}

function valuesIn(quantity: Quantity, cell: (column: Column) => string): Result<Values> {
  const unit = unitOf(quantity)
  const values: { -readonly [part in keyof Values]: Typed } = {}
  for (const part of ['magnitude', 'angle', 'real', 'imaginary'] as const) {
    const text = cell(part)
    if (text === '') continue
    const parsed = parseCell(text, { unit: part === 'angle' ? '°' : unit })
    if (!parsed.ok) return failure(`its ${part}: ${parsed.problem}`)
    const taken = takeInto(values, part, parsed.value)
    if (!taken.ok) return taken
  }
  if (values.real && values.imaginary && !(values.magnitude && values.angle)) {
    return limited({ real: values.real, imaginary: values.imaginary }, unit, cell('limit'))
  }
  const { real: _, imaginary: __, ...polar } = values
  if (polar.magnitude && polar.magnitude.value < 0) {
    return failure('its magnitude is negative. Type it positive and turn the angle by 180°.')
  }
  return limited(polar, unit, cell('limit'))
}

function takeInto(
  values: { -readonly [part in keyof Values]: Typed },
  part: keyof Values,
  value: CellValue,
): Result<true> {
  if (value.form === 'number') values[part] = value.number
  else if (value.form === 'polar')
    Object.assign(values, { magnitude: value.magnitude, angle: value.angle })
  else if (value.form === 'rectangular')
    Object.assign(values, { real: value.real, imaginary: value.imaginary })
  else return failure('a limit stands where a value should. Type the value, then ± and the limit.')
  return success(true)
}

function limited(values: Values, unit: string, text: string): Result<Values> {
  if (text === '') return success(values)
  const parsed = parseCell(asLimit(text), { unit })
  if (!parsed.ok) return failure(`its limit: ${parsed.problem}`)
  if (parsed.value.form !== 'limit')
    return failure('its limit cannot be read. Type it as 0.5 or 1 %.')
  const { limit } = parsed.value
  const widen = (typed: Typed): Typed => ({
    ...typed,
    limit: 'absolute' in limit ? limit.absolute : (Math.abs(typed.value) * limit.percent) / 100,
  })
  if (values.magnitude) return success({ ...values, magnitude: widen(values.magnitude) })
  if (values.real && values.imaginary) {
    return success({ real: widen(values.real), imaginary: widen(values.imaginary) })
  }
  return success(values)
}

/** A row that was read on meters: a magnitude and an angle, each as the display showed it. */
function readingsOf(sheet: Sheet, of: string, values: Values): readonly Reading[] {
  const taken: Reading[] = []
  const add = (kind: 'magnitude' | 'angle', typed: Typed | undefined) => {
    if (!typed) return
    const id = newId({ ...sheet, readings: [...(sheet.readings ?? []), ...taken] }, 'r')
    taken.push({
      id,
      of,
      kind,
      shown: typed.text ?? typed.value,
      ...(typed.limit === undefined ? {} : { limit: typed.limit }),
    })
  }
  add('magnitude', values.magnitude)
  add('angle', values.angle)
  return taken
}

/**
 * The phasors as rows for a spreadsheet, the first naming the columns; figures are plain numbers in
 * SI units, and `readRows` takes them back. Tabs and line ends in labels become spaces.
 */
export function tableOf(sheet: Sheet, evaluation: Evaluation): readonly (readonly string[])[] {
  const header = ['label', 'quantity', 'magnitude', 'angle', 'real', 'imaginary', 'limit', 'known']
  return [
    header,
    ...sheet.phasors.map((phasor, index) => rowOf(sheet, phasor, evaluation.phasors[index])),
  ]
}

function rowOf(
  sheet: Sheet,
  phasor: Phasor,
  evaluation: PhasorEvaluation | undefined,
): readonly string[] {
  const shown = (kind: 'magnitude' | 'angle') =>
    sheet.readings?.some(
      (reading) => reading.of === phasor.id && reading.kind === kind && !reading.struck,
    ) ?? false
  const read = shown('magnitude') || shown('angle')
  const limit = phasor.magnitude?.limit ?? phasor.real?.limit
  return [
    plainText(phasor.label),
    phasor.quantity,
    figure(evaluation?.magnitude),
    figure(evaluation?.angle),
    figure(evaluation?.real),
    figure(evaluation?.imaginary),
    figure(limit),
    read ? 'read' : 'typed',
  ]
}

function figure(value: number | undefined): string {
  return value === undefined ? '' : String(value)
}

/** A label as a cell: on one line, and kept from being taken for a formula. */
function plainText(label: string): string {
  const line = label.replace(/[\t\r\n]+/g, ' ')
  return /^[=+\-@]/.test(line) ? `'${line}` : line
}
