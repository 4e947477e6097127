import { type Complex, fromPolar } from '../../../src/core'
import type {
  ElementModel,
  Observable,
  Observation,
  PhasorProblem,
} from '../../../src/core/estimate'

/** A circuit by its true values, from which readings are taken exactly. */
export interface Truth {
  readonly phasors: readonly Complex[]
  readonly resistances?: readonly number[]
  readonly reactances?: readonly number[]
}

/** An observation within ± limit, 1 % of its value where that is omitted. */
export function read(of: Observable, value: number, limit = 0.01 * Math.abs(value)): Observation {
  const parts =
    limit > 0 ? [{ uncertainty: limit / Math.sqrt(3), shape: 'rectangular' } as const] : []
  return { of, value, parts }
}

/** A magnitude, by 1 %. */
export function magnitude(phasor: number, value: number, limit?: number): Observation {
  return read({ kind: 'magnitude', phasor }, value, limit)
}

/** An angle in degrees, by 1°. */
export function angle(phasor: number, value: number, limit = 1, against?: number): Observation {
  return read(
    against === undefined ? { kind: 'angle', phasor } : { kind: 'angle', phasor, against },
    value,
    limit,
  )
}

/** A phasor problem with what is omitted left empty; the first phasor is the reference at 0°. */
export function problemWith(
  parts: Partial<PhasorProblem> & Pick<PhasorProblem, 'phasors'>,
): PhasorProblem {
  return {
    reference: { phasor: 0, angle: 0 },
    sums: [],
    elements: [],
    sharedErrors: [],
    observations: [],
    ...parts,
  }
}

/** Terms that add up to nothing: the first one is what the others make. */
export function total(whole: number, ...terms: readonly number[]) {
  return [
    { phasor: whole, sign: 1 } as const,
    ...terms.map((phasor) => ({ phasor, sign: -1 }) as const),
  ]
}

/** An element by its kind. */
export function element(
  kind: ElementModel['kind'],
  voltage: number,
  current: number,
): ElementModel {
  return kind === 'capacitor'
    ? { kind, voltage, current, lossless: true }
    : { kind, voltage, current }
}

/** A phasor by magnitude and degrees. */
export const at = fromPolar
