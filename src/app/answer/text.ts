import { formatAngle, formatNumber, formatQuantity } from '../../core'
import {
  type Evaluation,
  type Id,
  labelOf,
  type Move,
  movesOf,
  nameOfReading,
  type Sheet,
} from '../../sheet'

/** A row of the list of readings. */
export interface ReadingLine {
  readonly id: Id
  readonly name: string
  readonly moved: string
  readonly share: string
  /** How far it is from the others, where they disagree and something checks it. */
  readonly score: string
}

/** How far each reading moved, and which are suspect where they disagree: these first, largest first. */
export function readingLines(sheet: Sheet, evaluation: Evaluation): readonly ReadingLine[] {
  const isDisagreeing = evaluation.agreement?.verdict === 'disagree'
  const suspects = isDisagreeing ? (evaluation.suspects ?? []) : []
  const rank = (id: Id) => {
    const at = suspects.findIndex(({ reading }) => reading === id)
    return at < 0 ? suspects.length : at
  }
  return movesOf(sheet, evaluation)
    .toSorted((one, other) => rank(one.reading) - rank(other.reading))
    .map((move) => ({
      id: move.reading,
      name: nameOfReading(sheet, move.reading),
      moved: movedText(move),
      share: move.share === undefined ? '–' : `${formatNumber(100 * move.share, 0)} %`,
      score: scoreText(suspects.find(({ reading }) => reading === move.reading)?.score),
    }))
}

/** To two digits of what its limit is, so that no figure looks surer than it is. */
function movedText({ moved, unit, share }: Move): string {
  const limit = share === undefined || share === 0 ? undefined : Math.abs(moved) / share
  const isNothing = Math.abs(moved) < 1e-9 * (limit ?? 1)
  if (isNothing) return 'not moved'
  const text = formatQuantity(moved, unit, limit === undefined ? { digits: 2 } : { limit })
  return moved > 0 ? `+${text}` : text
}

function scoreText(score: number | undefined): string {
  return score === undefined ? '' : `${formatNumber(score, 1)} σ`
}

/** The readings that nothing checks, by name. */
export function uncheckedNames(sheet: Sheet, evaluation: Evaluation): readonly string[] {
  return (evaluation.agreement?.unchecked ?? []).map((id) => nameOfReading(sheet, id))
}

/** What distinguishes one of several drawings: its first phasors of which it settles another value. */
export function describeAlternative(
  sheet: Sheet,
  alternatives: NonNullable<Evaluation['alternatives']>,
  at: number,
): string {
  const [first] = alternatives
  const own = alternatives[at]
  const other = at === 0 ? alternatives[1] : first
  const told = (own?.phasors ?? []).filter(({ id, magnitude, angle }) => {
    const theirs = other?.phasors.find((phasor) => phasor.id === id)
    if (!theirs) return true
    const isTurned = Math.abs(theirs.angle - angle) > 0.05
    return isTurned || Math.abs(theirs.magnitude - magnitude) > 1e-6 * magnitude
  })
  return told
    .slice(0, 2)
    .map(({ id, angle }) => `${labelOf(sheet, id)} at ${formatAngle(angle)}`)
    .join(', ')
}
