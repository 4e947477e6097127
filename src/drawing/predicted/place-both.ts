import type { ComparisonEvaluation, Evaluation, Id, Sheet } from '../../sheet'
import type { Box } from '../geometry'
import { type Frozen, type Placement, place } from '../placement/place'
import type { PlacedArrow } from '../scene'
import { type PredictedValues, predictedValues } from './values'

/** The arrows of a sheet, and beside them those that its circuit predicts. */
export interface BothPlaced {
  readonly placement: Placement
  readonly predicted: PredictedArrows
}

/** The arrows of a prediction, drawn from the same starts and to the same scales as what was measured. */
export interface PredictedArrows {
  readonly arrows: readonly PlacedArrow[]
  /** Those of phasors of which nothing is drawn otherwise. */
  readonly alone: readonly PlacedArrow[]
  /** How many reach beyond the frame, and are not drawn. */
  readonly leftOut: number
  readonly evaluation: Evaluation | undefined
}

/** Where nothing is predicted, or the prediction is not asked for. */
export const NO_PREDICTION: PredictedArrows = {
  arrows: [],
  alone: [],
  leftOut: 0,
  evaluation: undefined,
}

/**
 * Places what was measured and what is predicted. The two lie over each other: figures start where they
 * would if the prediction stood for whatever was not measured yet, so that the drawing rests while the
 * readings come in.
 *
 * @param compared What the circuit predicts.
 */
export function placeBoth(
  sheet: Sheet,
  evaluation: Evaluation,
  compared: readonly ComparisonEvaluation[],
  paper: {
    readonly area: Box
    readonly frame: Box
    /** Sums whose prediction is hidden with them. */
    readonly hidden?: ReadonlySet<Id> | undefined
  },
  frozen: Frozen | undefined,
): BothPlaced {
  const { area } = paper
  const values = predictedValues(sheet, evaluation, compared)
  if (values === undefined) {
    return { placement: place(sheet, evaluation, area, frozen), predicted: NO_PREDICTION }
  }
  const { origin, starts, unitsPerCentimetre } = place(sheet, values.filled, area, frozen)
  const settled = { origin, starts, unitsPerCentimetre }
  const { arrows } = place(sheet, evaluation, area, settled)
  const predicted = place(sheet, values.evaluation, area, settled).arrows
  return { placement: { arrows, ...settled }, predicted: shown(predicted, arrows, values, paper) }
}

function shown(
  arrows: readonly PlacedArrow[],
  measured: readonly PlacedArrow[],
  { ids, evaluation }: PredictedValues,
  { frame, hidden }: { readonly frame: Box; readonly hidden?: ReadonlySet<Id> | undefined },
): PredictedArrows {
  const own = arrows.filter(
    ({ phasor, sum }) =>
      phasor !== undefined && ids.has(phasor) && (sum === undefined || !hidden?.has(sum)),
  )
  const onPaper = own.filter((arrow) => isInFrame(arrow, frame))
  const drawn = new Set(measured.map(({ key }) => key))
  return {
    arrows: onPaper,
    alone: onPaper.filter(({ key }) => !drawn.has(key)),
    leftOut: own.length - onPaper.length,
    evaluation,
  }
}

function isInFrame({ from, to }: PlacedArrow, { left, right, bottom, top }: Box): boolean {
  return [from, to].every(({ x, y }) => x >= left && x <= right && y >= bottom && y <= top)
}
