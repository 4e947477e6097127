import { formatAngle, formatLimit, formatQuantity, resolutionOf, unitOf } from '../../core'
import { digitsOf, type PhasorDigits, type ReadingsByPhasor } from '../../drawing'
import type { Phasor, PhasorEvaluation, Reading, Sheet, Typed } from '../../sheet'

/** What one cell of the schedule shows, and what is edited in it. */
export interface CellText {
  readonly shown: string
  readonly typed: string
  /** Worked out from other cells, or assumed. */
  readonly derived: boolean
}

/** How a phasor's values came to be known, in the schedule's words. */
export type Known = 'typed' | 'read' | 'partly' | 'open'

/** The cells of one row of the schedule. */
export interface RowText {
  readonly magnitude: CellText
  readonly angle: CellText
  readonly real: CellText
  readonly imaginary: CellText
  readonly limit: CellText
  readonly known: Known
}

const nothing: CellText = { shown: '', typed: '', derived: false }
/** Limits where none is stated, in per cent and degrees (common practice, no source). */
const usual = { percent: 1, degrees: 1 }

/** The texts of a phasor's row: as typed or read where it was, worked out from the rest where not. */
export function rowText(
  sheet: Sheet,
  phasor: Phasor,
  evaluation: PhasorEvaluation,
  readings: ReadingsByPhasor,
): RowText {
  const own = readings.get(phasor.id) ?? []
  const magnitudes = own.filter(({ kind }) => kind === 'magnitude')
  const angles = own.filter(({ kind }) => kind === 'angle')
  const row = {
    phasor,
    evaluation,
    digits: digitsOf(phasor, readings),
    unit: unitOf(phasor.quantity),
  }
  return {
    magnitude: magnitudeCell(row, magnitudes),
    angle: angleCell(row, angles),
    real: rectangularCell(row, 'real'),
    imaginary: rectangularCell(row, 'imaginary'),
    limit: limitCell(row, sheet, magnitudes, angles),
    known: knownOf(phasor, magnitudes, angles),
  }
}

interface Row {
  readonly phasor: Phasor
  readonly evaluation: PhasorEvaluation
  readonly digits: PhasorDigits
  readonly unit: string
}

function magnitudeCell(
  { phasor, evaluation, digits, unit }: Row,
  readings: readonly Reading[],
): CellText {
  const shown = printed(evaluation.magnitude, (size) =>
    formatQuantity(size, unit, digits.magnitude),
  )
  const typed = typedText(readings, phasor.magnitude)
  return typed === undefined ? derived(shown) : { shown, typed, derived: false }
}

function angleCell({ phasor, evaluation, digits }: Row, readings: readonly Reading[]): CellText {
  const shown = printed(evaluation.angle, (angle) => formatAngle(angle, digits.angle))
  const typed = typedText(readings, phasor.angle)
  return typed === undefined ? derived(shown) : { shown, typed, derived: false }
}

function rectangularCell(
  { phasor, evaluation, digits, unit }: Row,
  part: 'real' | 'imaginary',
): CellText {
  const typed = phasor[part]
  if (typed) {
    const text = typed.text ?? String(typed.value)
    return {
      shown: formatQuantity(typed.value, unit, { resolution: resolutionOf(text) }),
      typed: text,
      derived: false,
    }
  }
  return derived(
    printed(evaluation[part], (value) => formatQuantity(value, unit, digits.magnitude)),
  )
}

function derived(shown: string): CellText {
  return shown === '' ? nothing : { shown, typed: shown, derived: true }
}

function printed(value: number | undefined, print: (value: number) => string): string {
  return value === undefined ? '' : print(value)
}

/** What is edited: the display of the reading, with its sense as a sign, else what was typed. */
function typedText([reading]: readonly Reading[], typed: Typed | undefined): string | undefined {
  if (reading && 'shown' in reading) {
    const sign = 'sense' in reading && reading.sense === 'lags' ? '−' : ''
    return `${sign}${reading.shown}`
  }
  return typed && (typed.text ?? String(typed.value))
}

function limitCell(
  { phasor, evaluation, unit }: Row,
  sheet: Sheet,
  [magnitude]: readonly Reading[],
  [angle]: readonly Reading[],
): CellText {
  const size = magnitude ? magnitude.limit : (phasor.magnitude ?? phasor.real)?.limit
  const turn = angle ? angle.limit : phasor.angle?.limit
  const stated = [
    ...(size === undefined ? [] : [formatLimit(size, unit)]),
    ...(turn === undefined ? [] : [formatLimit(turn, '°')]),
  ].map((limit) => limit.replace('± ', ''))
  if (stated.length > 0) {
    return { shown: stated.join('; '), typed: stated.join('; '), derived: false }
  }
  if (evaluation.magnitude === undefined) return nothing
  const { percent = usual.percent } = sheet.assumed ?? {}
  const assumed = formatLimit((evaluation.magnitude * percent) / 100, unit).replace('± ', '')
  return { shown: `${assumed} assumed`, typed: '', derived: true }
}

function knownOf(
  phasor: Phasor,
  magnitudes: readonly Reading[],
  angles: readonly Reading[],
): Known {
  const read = magnitudes.length + angles.length > 0
  const typed = phasor.magnitude ?? phasor.angle ?? phasor.real
  if (!read) return typed ? 'typed' : 'open'
  return typed ? 'partly' : 'read'
}
