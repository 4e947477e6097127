import { differenceDegrees, fromPolar } from '../../core'
import { type Drawing, type Found, regionOf } from '../../core/estimate'
import type { PartState, PhasorEvaluation } from '../evaluation'
import type { Phasor } from '../types'
import type { SheetProblem } from './sheet-problem'
import { observablesAt, type Place, type SolvedSheet } from './solved-sheet'

/** A best value this near to what was read, relative to it, was not adjusted. */
const UNMOVED = 1e-9

interface Part {
  readonly value?: number
  readonly limit?: number
  readonly state: PartState
}

/** A part of a phasor as it was read, beside its best value. */
function partOf(
  read: number | undefined,
  found: Found | undefined,
  isOpen: boolean,
  apart: (a: number, b: number) => number,
  unit: number,
): Part {
  if (isOpen || (found === undefined && read === undefined)) return { state: 'open' }
  if (found === undefined) return { value: read ?? 0, state: 'given' }
  if (read === undefined) return { value: found.value, limit: found.expanded, state: 'solved' }
  const isMoved = Math.abs(apart(found.value, read)) > UNMOVED * unit
  // What was not moved is shown as it was read, without the rounding of a solver.
  return {
    value: isMoved ? found.value : read,
    limit: found.expanded,
    state: isMoved ? 'adjusted' : 'given',
  }
}

/** Whether a solved phasor's angle is open: it has none where it may be nothing. */
function hasNoAngle(drawing: Drawing, place: number): boolean {
  return drawing.find(observablesAt(place).angle) === undefined
}

/** A phasor's best values with their limits and states, beside what was read. */
export function evaluatePhasor(
  phasor: Phasor,
  { names, asRead }: SheetProblem,
  solved: SolvedSheet,
): PhasorEvaluation {
  const read = asRead.values.get(phasor.id) ?? {}
  const place = solved.phasor(names.phasor.get(phasor.id))
  const at = observablesAt(place?.place ?? 0)
  const size = place?.drawing.find(at.magnitude)
  const direction = place?.drawing.find(at.angle)
  const magnitude = partOf(read.magnitude, size, false, (a, b) => a - b, read.magnitude ?? 1)
  const isNothing = magnitude.value === 0 || (place && hasNoAngle(place.drawing, place.place))
  const angle = partOf(read.angle, direction, isNothing === true, differenceDegrees, 180)
  return {
    id: phasor.id,
    ...(magnitude.value === undefined ? {} : { magnitude: magnitude.value }),
    ...(angle.value === undefined ? {} : { angle: angle.value }),
    ...rectangularOf(phasor, magnitude, angle),
    ...(magnitude.limit === undefined ? {} : { magnitudeLimit: magnitude.limit }),
    ...(angle.limit === undefined ? {} : { angleLimit: angle.limit }),
    ...regionIn(place, magnitude.value ?? 0),
    asRead: read,
    magnitudeState: magnitude.state,
    angleState: angle.state,
  }
}

/** What is exact has no region: what is left is the solver's rounding. */
function regionIn(place: Place | undefined, size: number): Pick<PhasorEvaluation, 'region'> {
  const covariance = place?.drawing.tipCovariance(place.place)
  const region = covariance && regionOf(covariance)
  return region && region.major > UNMOVED * size ? { region } : {}
}

function rectangularOf(phasor: Phasor, magnitude: Part, angle: Part) {
  if (magnitude.value === 0) return { real: 0, imaginary: 0 }
  if (magnitude.value === undefined || angle.value === undefined) return {}
  const { real, imaginary } = phasor
  if (real && imaginary && magnitude.state === 'given' && angle.state === 'given') {
    return { real: real.value, imaginary: imaginary.value }
  }
  const { re, im } = fromPolar(magnitude.value, angle.value)
  return { real: re, imaginary: im }
}
