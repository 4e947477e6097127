import { type Complex, cosDegrees, magnitudeOf, radiansFromDegrees, sinDegrees } from '../../core'
import { chiSquarePoint, coverageFactor, type Drawing, uncertaintyOf } from '../../core/estimate'
import type { PhasorId, Sum } from '../types'
import type { SheetProblem } from './sheet-problem'
import { observablesAt, type Place, type SolvedSheet } from './solved-sheet'

/** How a gap would scatter: what each residual does to its real and to its imaginary part. */
interface Scatter {
  readonly re: Float64Array
  readonly im: Float64Array
}

/** A variance below this share of the squares that make it up is rounding. */
const NOTHING = 1e-18
/** Below this share of the larger variance across, the region is a line. */
const LINE = 1e-12
const OUTSIDE = 0.05

/** What a sum's gap comes to be held against. */
export interface GapLimit {
  /** How far the 95 % region of the gap reaches in the gap's own direction. */
  readonly allowed: number
  /** Whether the gap can be anything but nothing. */
  readonly isChecked: boolean
}

/** Which observations of the whole give a part of a phasor as it is read: readings before what was typed. */
function givers(
  { sources }: SheetProblem,
  phasor: PhasorId,
  isGiving: (source: SheetProblem['sources'][number]) => boolean,
): readonly number[] {
  const all = sources.flatMap((source, place) =>
    source.source.kind !== 'element' && source.source.phasor === phasor && isGiving(source)
      ? [place]
      : [],
  )
  const readings = all.filter((place) => sources[place]?.source.kind === 'reading')
  return readings.length > 0 ? readings : all
}

/** Adds to a row what the error of an observation does, as shares of the part's residuals. */
function addError(row: Float64Array, drawing: Drawing, observation: number, factor: number): void {
  const { rows, exactRows, layout } = drawing.candidate.equations
  const firstError = layout.error(0)
  for (const [index, each] of [
    ...rows.entries(),
    ...exactRows.map((each) => [-1, each] as const),
  ]) {
    if (each.observation !== observation) continue
    if (index >= 0) row[index] = (row[index] ?? 0) + factor * each.uncertainty
    for (const { error, sensitivity } of each.shared) {
      const column = rows.length + layout.error(error) - firstError
      row[column] = (row[column] ?? 0) - factor * sensitivity
    }
  }
}

/** The mean of the errors of some observations. */
function errorOfMean(observations: readonly number[], { drawing, part }: Place): Float64Array {
  const row = new Float64Array(drawing.candidate.solution.residuals.length)
  for (const observation of observations) {
    const place = part.part.observations.indexOf(observation)
    addError(row, drawing, place, 1 / observations.length)
  }
  return row
}

/** What is in the sum for a phasor: its value as read, else its best, and how that scatters. */
function scatterOf(
  phasor: PhasorId,
  value: { readonly magnitude: number; readonly angle: number },
  problem: SheetProblem,
  place: Place,
): Scatter {
  const [real, imaginary] = (['real', 'imaginary'] as const).map((kind) =>
    givers(problem, phasor, ({ of }) => of.kind === kind),
  )
  const sizes = givers(problem, phasor, ({ gives }) => gives === 'magnitude')
  const angles = givers(problem, phasor, ({ gives }) => gives === 'angle')
  if (real?.length && imaginary?.length && sizes.length + angles.length === 0) {
    return { re: errorOfMean(real, place), im: errorOfMean(imaginary, place) }
  }
  const at = observablesAt(place.place)
  const size = sizes.length > 0 ? errorOfMean(sizes, place) : errorOfBest(place, at.magnitude)
  const isReference = problem.asRead.reference === phasor
  const angle =
    angles.length > 0 && !isReference ? errorOfMean(angles, place) : errorOfBest(place, at.angle)
  const [cosine, sine] = [cosDegrees(value.angle), sinDegrees(value.angle)]
  const perDegree = radiansFromDegrees(value.magnitude)
  return {
    re: size.map((each, k) => cosine * each - perDegree * sine * (angle[k] ?? 0)),
    im: size.map((each, k) => sine * each + perDegree * cosine * (angle[k] ?? 0)),
  }
}

function errorOfBest(
  { drawing }: Place,
  of: ReturnType<typeof observablesAt>['magnitude' | 'angle'],
): Float64Array {
  return drawing.sharesOf(drawing.candidate.gradientOf(of).gradient)
}

function dot(a: Float64Array, b: Float64Array): number {
  return a.reduce((sum, value, k) => sum + value * (b[k] ?? 0), 0)
}

/** How far the 95 % region reaches in a direction: an ellipse, or a line where all scatter is along it. */
function reach({ re, im }: Scatter, direction: Complex, drawing: Drawing): number {
  const along = re.map((each, k) => direction.re * each + direction.im * (im[k] ?? 0))
  const across = re.map((each, k) => direction.re * (im[k] ?? 0) - direction.im * each)
  const [whole, other, both] = [dot(along, along), dot(across, across), dot(along, across)]
  const left = whole * other - both * both
  if (left <= LINE * Math.max(whole, other) ** 2) {
    if (whole <= LINE * other) return 0
    const parts = drawing.partsOf(along)
    return coverageFactor(parts) * uncertaintyOf(along)
  }
  return Math.sqrt((chiSquarePoint(OUTSIDE, 2) * left) / other)
}

/**
 * How far a sum's gap may reach. The gap is made of values as read, and of best values where a term
 * was not read; where that makes it nothing whatever the readings are, nothing checks the sum.
 */
export function limitOfGap(
  sum: Sum,
  gap: Complex,
  values: ReadonlyMap<PhasorId, { readonly magnitude: number; readonly angle: number }>,
  problem: SheetProblem,
  solved: SolvedSheet,
): GapLimit | undefined {
  const terms = [
    ...sum.terms.map(({ phasor, sign = 1 }) => ({ phasor, factor: -sign })),
    ...(typeof sum.equals === 'string' ? [{ phasor: sum.equals, factor: 1 }] : []),
  ]
  let drawing: Drawing | undefined
  let whole: Scatter | undefined
  let squares = 0
  for (const { phasor, factor } of terms) {
    const place = solved.phasor(problem.names.phasor.get(phasor))
    const value = values.get(phasor)
    if (place === undefined || value === undefined) return undefined
    const { re, im } = scatterOf(phasor, value, problem, place)
    squares += dot(re, re) + dot(im, im)
    drawing = place.drawing
    const before = whole
    whole = {
      re: re.map((each, k) => (before?.re[k] ?? 0) + factor * each),
      im: im.map((each, k) => (before?.im[k] ?? 0) + factor * each),
    }
  }
  if (whole === undefined || drawing === undefined) return undefined
  const isChecked = dot(whole.re, whole.re) + dot(whole.im, whole.im) > NOTHING * squares
  if (!isChecked) return { allowed: 0, isChecked }
  const size = magnitudeOf(gap)
  const direction = size > 0 ? { re: gap.re / size, im: gap.im / size } : { re: 1, im: 0 }
  return { allowed: reach(whole, direction, drawing), isChecked }
}
