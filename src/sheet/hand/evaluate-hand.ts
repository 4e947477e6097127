import {
  angleOf,
  type Complex,
  type DrawingTolerance,
  differenceDegrees,
  magnitudeOf,
  scaleBy,
  subtract,
  tipErrorAllowed,
  toPolar,
  ZERO,
} from '../../core'
import type { HandEvaluation, PolarValue } from '../evaluation'
import type { HandArrow, Id, Sheet } from '../types'
import { type Construction, constructionsOf, type Exact, vectorOf } from './construction'
import { type Seat, seatsOf } from './seats'
import { toleranceOf } from './tolerance'

/** What is off by just the tolerance is within it, whatever the last bits say: parts of a millimetre. */
const ROUNDING = 1e-9

/**
 * Compares each hand arrow with what it stands for.
 *
 * @param exact The exact value of a phasor, and the exact resultant of a sum, in their units.
 */
export function evaluateHand(sheet: Sheet, exact: Exact): readonly HandEvaluation[] {
  if (sheet.hand === undefined) return []
  const seats = seatsOf(sheet)
  const constructions = constructionsOf(seats, sheet.drawing?.unitsPerCentimetre, exact)
  const tolerance = toleranceOf(sheet)
  return seats.map((seat) => {
    const unitsPerCentimetre = sheet.drawing?.unitsPerCentimetre?.[seat.quantity]
    if (unitsPerCentimetre === undefined) return { id: seat.arrow.id }
    const perMillimetre = unitsPerCentimetre / 10
    const construction = seat.sum && constructions.get(seat.sum.id)
    return compare(seat, perMillimetre, exact, construction, tolerance)
  })
}

function compare(
  seat: Seat,
  perMillimetre: number,
  exact: Exact,
  construction: Construction | undefined,
  tolerance: DrawingTolerance,
): HandEvaluation {
  const { arrow, sign } = seat
  const vector = scaleBy(vectorOf(arrow), perMillimetre)
  const drawn = drawnValue(arrow.id, scaleBy(vector, sign))
  const value = exactOf(seat, exact)
  if (value === undefined) return drawn
  const should = scaleBy(value, sign)
  const error = subtract(vector, should)
  const inherited = construction?.inherited.get(arrow.id) ?? ZERO
  const own = seat.position === 'closing' ? subtract(error, inherited) : error
  const millimetres = magnitudeOf(error) / perMillimetre
  const allowed = tipErrorAllowed(magnitudeOf(should) / perMillimetre, tolerance)
  // A scale may be so fine that what it makes of the paper is beyond any figure.
  const figures = [
    millimetres,
    allowed,
    magnitudeOf(vector),
    magnitudeOf(own),
    magnitudeOf(inherited),
  ]
  if (!figures.every(Number.isFinite)) return drawn
  const isPoint = drawn.angle === undefined || magnitudeOf(value) === 0
  return {
    ...drawn,
    magnitudeError: magnitudeOf(vector) - magnitudeOf(should),
    ...(isPoint ? {} : { angleError: differenceDegrees(angleOf(vector), angleOf(should)) }),
    vectorError: magnitudeOf(error),
    ownError: toPolarValue(own),
    inheritedError: toPolarValue(inherited),
    millimetres,
    allowed,
    within: millimetres <= allowed * (1 + ROUNDING) + ROUNDING,
  }
}

function drawnValue(id: HandArrow['id'], value: Complex): HandEvaluation {
  const { magnitude, angle } = toPolar(value)
  if (!Number.isFinite(magnitude)) return { id }
  return magnitude === 0 ? { id, magnitude } : { id, magnitude, angle }
}

function exactOf({ arrow, sum }: Seat, exact: Exact): Complex | undefined {
  if (arrow.stands !== 'closing') return exact.phasor(arrow.stands)
  return exact.resultant(sum?.id ?? ('' as Id))
}

function toPolarValue(value: Complex): PolarValue {
  return { ...toPolar(value), real: value.re, imaginary: value.im }
}
