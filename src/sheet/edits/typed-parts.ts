import type { Typed } from '../../core'
import { typedAngle, typedMagnitude } from '../as-read'
import type { Phasor } from '../types'
import { without } from './change'

/** A typed value with a new figure: the limit stays where none is given with it. */
export function renewed(before: Typed | undefined, typed: Typed): Typed {
  const limit = typed.limit ?? before?.limit
  const kept = before === undefined ? {} : without(before, 'text', 'limit')
  return { ...kept, ...typed, ...(limit === undefined ? {} : { limit }) }
}

/** The phasor typed as magnitude and angle; from rectangular form its digits and limits do not carry over. */
export function asTypedPolar(phasor: Phasor): Phasor {
  if (phasor.real === undefined) return phasor
  const magnitude = typedMagnitude(phasor)
  const angle = typedAngle(phasor)
  return {
    ...without(phasor, 'real', 'imaginary'),
    ...(magnitude === undefined ? {} : { magnitude: { value: magnitude } }),
    ...(angle === undefined ? {} : { angle: { value: angle } }),
  }
}

/** The phasor with one polar part typed anew; null: not typed. */
export function withTypedPolar(
  phasor: Phasor,
  part: 'magnitude' | 'angle',
  typed: Typed | null,
): Phasor {
  const polar = asTypedPolar(phasor)
  if (typed === null) return without(polar, part)
  return { ...polar, [part]: renewed(polar[part], typed) }
}

/** The phasor typed in rectangular form; the limits of what was typed so before stay. */
export function withTypedRectangular(phasor: Phasor, real: Typed, imaginary: Typed): Phasor {
  return {
    ...without(phasor, 'magnitude', 'angle'),
    real: renewed(phasor.real, real),
    imaginary: renewed(phasor.imaginary, imaginary),
  }
}
