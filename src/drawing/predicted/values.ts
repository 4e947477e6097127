import {
  asAlternative,
  type ComparisonEvaluation,
  type Evaluation,
  type Id,
  type Sheet,
} from '../../sheet'

/** A phasor as the circuit predicts it. */
interface PredictedValue {
  readonly id: Id
  readonly magnitude: number
  readonly angle: number
}

/** The evaluations that a drawing with its prediction is placed from. */
export interface PredictedValues {
  readonly ids: ReadonlySet<Id>
  /** Every phasor as predicted, where it is. */
  readonly evaluation: Evaluation
  /** As read, with the prediction where nothing was: every figure is whole in it. */
  readonly filled: Evaluation
}

/** What a circuit predicts, ready to be drawn; undefined where it predicts nothing whole. */
export function predictedValues(
  sheet: Sheet,
  evaluation: Evaluation,
  compared: readonly ComparisonEvaluation[],
): PredictedValues | undefined {
  const values = compared.flatMap(({ phasor, predicted }): readonly PredictedValue[] => {
    const { magnitude, angle } = predicted
    if (magnitude === undefined || (angle === undefined && magnitude !== 0)) return []
    return [{ id: phasor, magnitude, angle: angle ?? 0 }]
  })
  if (values.length === 0) return undefined
  const known = new Set(
    evaluation.phasors.flatMap(({ id, magnitude, angle }) =>
      magnitude !== undefined && (angle !== undefined || magnitude === 0) ? [id] : [],
    ),
  )
  const missing = values.filter(({ id }) => !known.has(id))
  return {
    ids: new Set(values.map(({ id }) => id)),
    evaluation: asAlternative(sheet, evaluation, { phasors: values }),
    filled: asAlternative(sheet, evaluation, { phasors: missing }),
  }
}
