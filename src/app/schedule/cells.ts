import {
  formatAngle,
  formatEstimate,
  formatLimit,
  formatQuantity,
  resolutionOf,
  unitOf,
} from '../../core'
import { digitsOf, type PhasorDigits, type ReadingsByPhasor } from '../../drawing'
import {
  assumedOf,
  limitOf,
  type Phasor,
  type PhasorEvaluation,
  type Reading,
  type ReadingLimit,
  type Sheet,
  type Typed,
} from '../../sheet'

/** What one cell of the schedule shows, and what is edited in it. */
export interface CellText {
  readonly shown: string
  readonly typed: string
  /** Worked out from other cells, or assumed. */
  readonly derived: boolean
  /** Nobody gave it: it was solved. */
  readonly solved?: boolean
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

/** The texts of a phasor's row: as typed or read where it was, worked out from the rest where not. */
export function rowText(
  sheet: Sheet,
  phasor: Phasor,
  evaluation: PhasorEvaluation,
  readings: ReadingsByPhasor,
): RowText {
  const own = readings.get(phasor.id) ?? []
  const magnitudes = own.filter(({ kind }) => kind === 'magnitude')
  const angles = own.filter(({ kind }) => isOfAngle(kind))
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
  return typed === undefined
    ? derived(shown, evaluation.magnitudeState === 'solved')
    : { shown, typed, derived: false }
}

function angleCell({ phasor, evaluation, digits }: Row, readings: readonly Reading[]): CellText {
  const shown = printed(evaluation.angle, (angle) => formatAngle(angle, digits.angle))
  const direct = readings.filter(({ kind }) => kind === 'angle')
  const isWorkedOut = readings.length > direct.length
  const typed = isWorkedOut ? undefined : typedText(direct, phasor.angle)
  return typed === undefined
    ? derived(shown, evaluation.angleState === 'solved')
    : { shown, typed, derived: false }
}

/** Whether a reading of this kind says something of its phasor's angle, shown as degrees or not. */
function isOfAngle(kind: Reading['kind']): boolean {
  return kind === 'angle' || kind === 'shift' || kind === 'ellipse' || kind === 'power-factor'
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
    evaluation.magnitudeState === 'solved' || evaluation.angleState === 'solved',
  )
}

function derived(shown: string, solved: boolean): CellText {
  if (shown === '') return nothing
  return { shown, typed: shown, derived: true, ...(solved && { solved }) }
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
  const parts = [
    { found: limitOfPart(sheet, magnitude, (phasor.magnitude ?? phasor.real)?.limit), unit },
    { found: limitOfPart(sheet, angle, phasor.angle?.limit), unit: '°' },
  ]
  const textOf = (from: readonly ReadingLimit['from'][]) =>
    parts
      .flatMap(({ found, unit: of }) =>
        found && from.includes(found.from) ? [formatLimit(found.limit, of).replace('± ', '')] : [],
      )
      .join('; ')
  const shown = textOf(['stated', 'instrument'])
  const typed = textOf(['stated'])
  if (shown !== '') return { shown, typed, derived: typed === '' }
  if (evaluation.magnitude === undefined) return nothing
  const { percent } = assumedOf(sheet)
  const assumed = formatLimit((evaluation.magnitude * percent) / 100, unit).replace('± ', '')
  return { shown: `${assumed} assumed`, typed: '', derived: true }
}

/** The limit of a part of a phasor: of its reading where it was read, else as typed. */
function limitOfPart(
  sheet: Sheet,
  reading: Reading | undefined,
  typed: number | undefined,
): Pick<ReadingLimit, 'from' | 'limit'> | undefined {
  if (reading !== undefined) return limitOf(sheet, reading)
  return typed === undefined ? undefined : { from: 'stated', limit: typed }
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

/** The best values of a row, for its cells Limit and Known. */
export interface BestText {
  /** Each best value with its limit. */
  readonly values: readonly string[]
  /** How each part came to be; one line where both came to be alike. */
  readonly states: readonly { readonly of: string; readonly state: string }[]
}

/** What was worked out of a phasor; undefined where nothing was. */
export function bestText(phasor: Phasor, best: PhasorEvaluation | undefined): BestText | undefined {
  if (best === undefined) return undefined
  const { magnitude, angle, magnitudeLimit, angleLimit, magnitudeState, angleState } = best
  const unit = unitOf(phasor.quantity)
  const values = [
    ...(magnitude === undefined || magnitudeLimit === undefined
      ? []
      : [formatEstimate(magnitude, magnitudeLimit, unit)]),
    ...(angle === undefined || angleLimit === undefined
      ? []
      : [formatEstimate(angle, angleLimit, '°')]),
  ]
  const states =
    magnitudeState === angleState
      ? [{ of: '', state: magnitudeState }]
      : [
          { of: 'magnitude', state: magnitudeState },
          { of: 'angle', state: angleState },
        ]
  return { values, states }
}
