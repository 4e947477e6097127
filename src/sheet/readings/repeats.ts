import { wrapDegrees } from '../../core'
import type { Reading } from '../types'
import type { LimitPart, SharedLimitPart } from './limit-part'
import type { Indication } from './observed'

/**
 * What the scatter of repeats makes uncertain of their mean: s / √n with n − 1 degrees of freedom.
 * Repeats that were taken in the same passes go together as they were observed: the deviations of each
 * pass are a share that all readings of the set have in common, so that the products of two readings'
 * shares add up to the covariance of their means (JCGM 100:2008, 5.2.3, formula 17).
 */
export function repeatParts(
  reading: Reading,
  { moves }: Indication,
): { readonly own: readonly LimitPart[]; readonly shared: readonly SharedLimitPart[] } {
  const { repeats = [], pass } = reading
  const count = repeats.length
  if (count < 2) return { own: [], shared: [] }
  const freedom = count - 1
  const shares = deviationsOf(repeats, reading.kind === 'angle').map(
    (deviation) => moves(deviation) / Math.sqrt(count * freedom),
  )
  const name = `scatter of ${count} repeats`
  if (pass === undefined) {
    const uncertainty = Math.hypot(...shares)
    return { own: [{ name, uncertainty, shape: 'normal', freedom }], shared: [] }
  }
  const group = `repeats:${pass}:${count}`
  return {
    own: [],
    shared: shares.map((sensitivity, index) => ({
      name,
      uncertainty: Math.abs(sensitivity),
      shape: 'normal',
      freedom,
      error: `${group}:${index + 1}`,
      sensitivity,
      group,
    })),
  }
}

/** By how much each repeat is off their mean; angles on both sides of ±180° the short way round. */
function deviationsOf(repeats: readonly number[], areAngles: boolean): readonly number[] {
  const [first = 0] = repeats
  const steps = repeats.map((repeat) => (areAngles ? wrapDegrees(repeat - first) : repeat - first))
  const mean = steps.reduce((sum, step) => sum + step / steps.length, 0)
  return steps.map((step) => step - mean)
}
