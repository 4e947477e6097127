import type { UncertaintyPart } from '../../core/estimate'
import type { PendingObservation } from './pending'

/** How the mean of one observation moves with the independent errors of its set. */
export interface CorrelatedSet {
  readonly name: string
  readonly freedom: number
  /** One a factor of the set: the row of the triangle whose square is the covariance of the means. */
  readonly factors: readonly number[]
}

/** A variance below this share of what it was is rounding: the set's covariance has no such direction. */
const NOTHING_LEFT = 1e-12

function mean(values: readonly number[]): number {
  return values.reduce((sum, value) => sum + value, 0) / values.length
}

/** The covariance of two means of paired indications: Σ (a − ā)(b − b̄) / n(n − 1) (GUM 5.2.3). */
function covarianceOfMeans(a: readonly number[], b: readonly number[]): number {
  const [middleA, middleB] = [mean(a), mean(b)]
  const products = a.map((value, k) => (value - middleA) * ((b[k] ?? middleB) - middleB))
  return products.reduce((sum, value) => sum + value, 0) / (a.length * (a.length - 1))
}

/** The standard uncertainty s / √n of the mean of repeats, where there are any (GUM 4.2.3). */
export function standardErrorOfMean({ repeats }: PendingObservation): readonly UncertaintyPart[] {
  const values = repeats?.values ?? []
  if (values.length < 2) return []
  const uncertainty = Math.sqrt(covarianceOfMeans(values, values))
  return uncertainty > 0 ? [{ uncertainty, shape: 'normal', freedom: values.length - 1 }] : []
}

/** The lower triangle whose square is a covariance, a row an observation; directions without any are left out. */
function triangleOf(sets: readonly (readonly number[])[]): readonly (readonly number[])[] {
  const rows: number[][] = []
  for (const [i, values] of sets.entries()) {
    const row: number[] = []
    for (let j = 0; j <= i; j++) {
      const whole = covarianceOfMeans(values, sets[j] ?? [])
      const other = j === i ? row : (rows[j] ?? [])
      let left = whole
      for (let k = 0; k < j; k++) left -= (row[k] ?? 0) * (other[k] ?? 0)
      if (j < i) row.push((other[j] ?? 0) > 0 ? left / (other[j] ?? 1) : 0)
      else row.push(left > NOTHING_LEFT * whole ? Math.sqrt(left) : 0)
    }
    rows.push(row)
  }
  return rows
}

/**
 * Repeats of one set, a set being several observations with the same pass name and equally many
 * indications, are correlated as they were observed. By observation; those alone are left out.
 */
export function correlatedSets(
  pending: readonly PendingObservation[],
): ReadonlyMap<PendingObservation, CorrelatedSet> {
  const sets = new Map<string, PendingObservation[]>()
  for (const each of pending) {
    const { values, set } = each.repeats ?? { values: [], set: undefined }
    if (set === undefined || values.length < 2) continue
    const name = `repeats ${values.length} ${set}`
    sets.set(name, [...(sets.get(name) ?? []), each])
  }
  const found = new Map<PendingObservation, CorrelatedSet>()
  for (const [name, members] of sets) {
    if (members.length < 2) continue
    const triangle = triangleOf(members.map(({ repeats }) => repeats?.values ?? []))
    for (const [row, member] of members.entries()) {
      const freedom = (member.repeats?.values.length ?? 2) - 1
      found.set(member, { name, freedom, factors: triangle[row] ?? [] })
    }
  }
  return found
}
