import { fromPolar } from '../core'
import { evaluateSum } from './evaluate'
import type { Alternative, Evaluation, PhasorEvaluation, SumEvaluation } from './evaluation'
import type { Sheet } from './types'

/** A gap below this share of the largest term is rounding. */
const ROUNDING = 1e-9

/**
 * The evaluation as the adjusted diagram shows it: every phasor at its best value, as if it had been
 * read so, and the sums of these. A sum that closes has no gap in it; where the readings contradict each
 * other outright, the nearest drawing may keep one.
 */
export function asAdjusted(sheet: Sheet, evaluation: Evaluation): Evaluation {
  return withPhasors(
    sheet,
    evaluation,
    evaluation.phasors.map((phasor) => ({
      ...phasor,
      asRead: {
        ...(phasor.magnitude === undefined ? {} : { magnitude: phasor.magnitude }),
        ...(phasor.angle === undefined ? {} : { angle: phasor.angle }),
      },
    })),
  )
}

/**
 * The adjusted diagram until a new answer comes: best values of an older answer where it has them, what
 * is known at once of the rest.
 */
export function asFormerlyAdjusted(
  sheet: Sheet,
  quick: Evaluation,
  former: Evaluation,
): Evaluation {
  const before = new Map(former.phasors.map((phasor) => [phasor.id, phasor]))
  const phasors = quick.phasors.map((phasor) => {
    const best = before.get(phasor.id)
    return best?.real === undefined ? phasor : best
  })
  return asAdjusted(sheet, { ...quick, phasors })
}

/** The evaluation as another drawing that the readings allow would have it. */
export function asAlternative(
  sheet: Sheet,
  evaluation: Evaluation,
  alternative: Alternative,
): Evaluation {
  const values = new Map(alternative.phasors.map((value) => [value.id, value]))
  return withPhasors(
    sheet,
    evaluation,
    evaluation.phasors.map((phasor) => {
      const value = values.get(phasor.id)
      if (value === undefined) return phasor
      const { magnitude, angle } = value
      const { re, im } = fromPolar(magnitude, angle)
      const asRead = { magnitude, angle }
      return { ...phasor, magnitude, angle, real: re, imaginary: im, asRead }
    }),
  )
}

/**
 * What is known of a sheet at once, with the best values of an older answer for what is solved: the
 * drawing keeps its arrows until the new answer comes. Sums are those of the values shown.
 */
export function withFormerValues(
  sheet: Sheet,
  quick: Evaluation,
  former: Evaluation | undefined,
): Evaluation {
  if (former === undefined) return quick
  const before = phasorsById(former)
  let isChanged = false
  const phasors = quick.phasors.map((phasor) => {
    const filled = fillOnce(phasor, before.get(phasor.id))
    if (filled !== phasor) isChanged = true
    return filled
  })
  if (!isChanged) return quick
  const known = new Map(phasors.map((phasor) => [phasor.id, phasor]))
  const sums = (sheet.sums ?? []).map((sum) => {
    const found = evaluateSum(sum, known)
    const isRead = quick.sums.some(({ id, closingError }) => id === sum.id && closingError)
    // A gap against an old value says nothing of the new readings.
    return isRead ? found : withoutGap(found)
  })
  return { ...quick, phasors, sums }
}

const byId = new WeakMap<Evaluation, ReadonlyMap<string, PhasorEvaluation>>()

/** In a drag the former answer stays the same from frame to frame. */
function phasorsById(evaluation: Evaluation): ReadonlyMap<string, PhasorEvaluation> {
  const known = byId.get(evaluation)
  if (known) return known
  const phasors = new Map(evaluation.phasors.map((phasor) => [phasor.id, phasor]))
  byId.set(evaluation, phasors)
  return phasors
}

interface Fill {
  readonly former: PhasorEvaluation
  readonly filled: PhasorEvaluation
}

const fills = new WeakMap<PhasorEvaluation, Fill>()

/** In a drag nearly all phasors stay the same, the objects themselves: so do the filled ones. */
function fillOnce(
  phasor: PhasorEvaluation,
  former: PhasorEvaluation | undefined,
): PhasorEvaluation {
  if (former === undefined) return phasor
  const known = fills.get(phasor)
  if (known?.former === former) return known.filled
  const filled = fill(phasor, former)
  fills.set(phasor, { former, filled })
  return filled
}

function fill(phasor: PhasorEvaluation, former: PhasorEvaluation): PhasorEvaluation {
  const takesSize = phasor.magnitude === undefined && former.magnitudeState === 'solved'
  const takesAngle =
    phasor.angle === undefined && phasor.magnitude !== 0 && former.angleState === 'solved'
  if (!takesSize && !takesAngle) return phasor
  const magnitude = takesSize ? former.magnitude : phasor.magnitude
  const angle = takesAngle ? former.angle : phasor.angle
  return {
    ...phasor,
    ...(magnitude === undefined ? {} : { magnitude }),
    ...(angle === undefined ? {} : { angle }),
    ...rectangularOf(magnitude, angle),
    ...(takesSize && { magnitudeState: 'solved' as const }),
    ...(takesAngle && { angleState: 'solved' as const }),
  }
}

function rectangularOf(magnitude: number | undefined, angle: number | undefined) {
  if (magnitude === undefined || angle === undefined) return {}
  const { re, im } = fromPolar(magnitude, angle)
  return { real: re, imaginary: im }
}

function withPhasors(
  sheet: Sheet,
  evaluation: Evaluation,
  phasors: readonly PhasorEvaluation[],
): Evaluation {
  const known = new Map(phasors.map((phasor) => [phasor.id, phasor]))
  const sums = (sheet.sums ?? []).map((sum) => {
    const found = evaluateSum(sum, known)
    const largest = Math.max(
      ...sum.terms.map(({ phasor }) => known.get(phasor)?.magnitude ?? 0),
      found.measured?.magnitude ?? 0,
    )
    const isClosed = (found.closingError?.magnitude ?? 0) <= ROUNDING * largest
    return isClosed ? withoutGap(found) : found
  })
  return { ...evaluation, phasors, sums }
}

function withoutGap({
  closingError: _gap,
  closes: _closes,
  ...rest
}: SumEvaluation): SumEvaluation {
  return rest
}
