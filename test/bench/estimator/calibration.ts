import { angleOf, differenceDegrees, magnitudeOf } from '../../../src/core'
import { createRandom, type Random } from '../../../src/core/estimate'
import type { Evaluation, MagnitudeReading, Reading, Sheet } from '../../../src/sheet'
import { evaluate } from '../../../src/sheet/estimate'
import { type SoundJob, soundJob } from './sound-jobs'

/** So many of so many. */
export interface Share {
  readonly hits: number
  readonly of: number
}

/** How the estimator did on random sound jobs. */
export interface Calibration {
  /** Sound jobs with something to check that were said not to agree. */
  readonly falseAlarms: Share
  /** Solved values, one drawn from each job, that lie within their limits of the truth. */
  readonly coverage: Share
  /** All solved values: they hang together within a job. */
  readonly coverageOfAll: Share
  /** Jobs with one reading five limits off, checked by others, that were said not to agree. */
  readonly noticed: Share
  /** Of those, the ones whose first suspect is that reading. */
  readonly pointedAt: Share
  /** Jobs whose limits came from draws. */
  readonly byDraws: Share
}

/** Draws of a Monte Carlo propagation: fewer than on the page, to keep the run short. */
const DRAWS = 200
const OFF = 5

interface Judged {
  readonly what: string
  readonly isCovered: boolean
}

/** Every solved value of an evaluation, and whether the truth is within its limits. */
function judged({ phasors, impedances }: SoundJob, evaluation: Evaluation): readonly Judged[] {
  const all: Judged[] = []
  for (const each of evaluation.phasors) {
    const truth = phasors.get(each.id)
    if (truth === undefined) continue
    if (each.magnitudeState === 'solved' && each.magnitude !== undefined) {
      const off = Math.abs(each.magnitude - magnitudeOf(truth))
      all.push({ what: `${each.id} magnitude`, isCovered: off <= (each.magnitudeLimit ?? 0) })
    }
    if (each.angleState === 'solved' && each.angle !== undefined) {
      const off = Math.abs(differenceDegrees(each.angle, angleOf(truth)))
      all.push({ what: `${each.id} angle`, isCovered: off <= (each.angleLimit ?? 0) })
    }
  }
  for (const { id, found } of evaluation.elements ?? []) {
    const truth = impedances.get(id)
    if (truth === undefined) continue
    for (const [value, estimate] of [
      [truth.re, found?.resistance],
      [truth.im, found?.reactance],
    ] as const) {
      if (estimate === undefined) continue
      const isCovered = Math.abs(estimate.value - value) <= estimate.expanded
      all.push({ what: `${id}`, isCovered })
    }
  }
  return all
}

/** A limit of what a magnitude reading shows: as stated, or as the meter's maker has it. */
function limitOf(reading: MagnitudeReading): number {
  if (reading.limit !== undefined) return reading.limit
  const places = `${reading.shown}`.split('.')[1]?.length ?? 0
  return 0.008 * Number(reading.shown) + 3 * 10 ** -places
}

/** The same job with one of its checked magnitudes five limits off; nothing where none is checked. */
function spoiled(
  { sheet }: SoundJob,
  evaluation: Evaluation,
  random: Random,
): { readonly sheet: Sheet; readonly reading: string } | undefined {
  const unchecked = new Set(evaluation.agreement?.unchecked)
  const candidates = (sheet.readings ?? []).filter(
    (each): each is MagnitudeReading => each.kind === 'magnitude' && !unchecked.has(each.id),
  )
  const picked = candidates[Math.floor(random() * candidates.length)]
  if (picked === undefined) return undefined
  const off = OFF * limitOf(picked) * (random() < 0.5 ? 1 : -1)
  const shown = Number(picked.shown) + off
  const readings = (sheet.readings ?? []).map((each): Reading => {
    if (each.id !== picked.id) return each
    const digits = `${picked.shown}`.split('.')[1]?.length ?? 0
    return { ...picked, shown: typeof picked.shown === 'string' ? shown.toFixed(digits) : shown }
  })
  return { sheet: { ...sheet, readings }, reading: picked.id }
}

function plus(share: Share, isHit: boolean): Share {
  return { hits: share.hits + (isHit ? 1 : 0), of: share.of + 1 }
}

const NONE: Share = { hits: 0, of: 0 }

/** What is left out to be quicker. */
export interface CalibrationOptions {
  readonly withSpoiled?: boolean
  readonly draws?: number
}

/** Evaluates so many random sound jobs from a seed, and each once more with one reading spoiled. */
export function calibrate(
  jobs: number,
  seed: number,
  { withSpoiled = true, draws = DRAWS }: CalibrationOptions = {},
): Calibration {
  const random = createRandom(seed)
  let [falseAlarms, coverage, coverageOfAll] = [NONE, NONE, NONE]
  let [noticed, pointedAt, byDraws] = [NONE, NONE, NONE]
  for (let each = 0; each < jobs; each++) {
    const job = soundJob(random)
    const evaluation = evaluate(job.sheet, { draws, seed: each })
    const values = judged(job, evaluation)
    for (const { isCovered } of values) coverageOfAll = plus(coverageOfAll, isCovered)
    const drawn = values[Math.floor(random() * values.length)]
    if (drawn) coverage = plus(coverage, drawn.isCovered)
    byDraws = plus(
      byDraws,
      (evaluation.cautions ?? []).some(({ text }) => text.includes('draws')),
    )
    const { verdict, degreesOfFreedom = 0 } = evaluation.agreement ?? {}
    if (degreesOfFreedom > 0) falseAlarms = plus(falseAlarms, verdict === 'disagree')
    const other = withSpoiled ? spoiled(job, evaluation, random) : undefined
    if (other === undefined) continue
    const again = evaluate(other.sheet, { draws: 0 })
    const isNoticed = again.agreement?.verdict === 'disagree'
    noticed = plus(noticed, isNoticed)
    if (isNoticed) pointedAt = plus(pointedAt, again.suspects?.[0]?.reading === other.reading)
  }
  return { falseAlarms, coverage, coverageOfAll, noticed, pointedAt, byDraws }
}
