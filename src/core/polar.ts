import { angleOf, cosDegrees, sinDegrees } from './angle'
import { type Complex, magnitudeOf } from './complex'

/** A phasor by its size and direction: degrees in (−180°, 180°], anticlockwise positive. */
export interface Polar {
  readonly magnitude: number
  readonly angle: number
}

/** Magnitude and angle of a phasor; the angle of zero is 0. */
export function toPolar(z: Complex): Polar {
  return { magnitude: magnitudeOf(z), angle: angleOf(z) }
}

/** The phasor with this magnitude at this angle in degrees; exactly on an axis at a multiple of 90°. */
export function fromPolar(magnitude: number, angleDegrees: number): Complex {
  return {
    re: magnitude * cosDegrees(angleDegrees) + 0,
    im: magnitude * sinDegrees(angleDegrees) + 0,
  }
}
