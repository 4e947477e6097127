import { degreesFromRadians, sinDegrees, wrapDegrees } from './angle'

/** Which way an ellipse of one trace against another leans: rising to the right, or falling. */
export type Tilt = 'rising' | 'falling'

/**
 * The angle of a shift along a time base, 360° · shift / period: in degrees, not wrapped; both in one
 * unit, divisions or seconds. NaN where the period is not above 0.
 */
export function degreesOfShift(shift: number, period: number): number {
  return period > 0 ? (360 * shift) / period : Number.NaN
}

/** The shift that an angle in degrees makes on a time base: the inverse of `degreesOfShift`. */
export function shiftOfDegrees(degrees: number, period: number): number {
  return (degrees / 360) * period
}

/**
 * The angle between two traces from the ellipse that one draws against the other, in degrees from 0 to
 * 180: sin φ = intercept / height, both full widths or both halves, with φ up to 90° where the ellipse
 * rises to the right and from 90° on where it falls. NaN where the intercept is above the height.
 */
export function degreesOfEllipse(intercept: number, height: number, tilt: Tilt): number {
  const acute = degreesFromRadians(Math.asin(intercept / height))
  return tilt === 'rising' ? acute : 180 - acute
}

/** The intercept of the ellipse of two traces that many degrees apart: never negative. */
export function interceptOfDegrees(degrees: number, height: number): number {
  return height * Math.abs(sinDegrees(degrees))
}

/** How the ellipse of two traces that many degrees apart leans. */
export function tiltOfDegrees(degrees: number): Tilt {
  return Math.abs(wrapDegrees(degrees)) <= 90 ? 'rising' : 'falling'
}

/**
 * The angle between a voltage and a current by a power factor, in degrees from 0 to 180; negative ones
 * are above 90°. Which of the two leads is not in it. NaN where it is above 1 or below −1.
 */
export function degreesOfPowerFactor(factor: number): number {
  return degreesFromRadians(Math.acos(factor))
}

/** The angle between a voltage and a current by their power, cos φ = P / (V · I): as by a power factor. */
export function degreesOfPower(power: number, voltage: number, current: number): number {
  return degreesOfPowerFactor(power / (voltage * current))
}

/** How an alternating value is given. */
export type Form = 'rms' | 'peak' | 'peak-to-peak'

/** How much of a figure in that form is its rms value, of a sine: 1/√2 of a peak, 1/(2√2) of peak to peak. */
export function rmsOfForm(form: Form): number {
  return RMS_OF_FORM[form]
}

const RMS_OF_FORM = { rms: 1, peak: Math.SQRT1_2, 'peak-to-peak': Math.SQRT1_2 / 2 }

/** Waves whose form factor is known. */
export type Wave = 'sine' | 'square' | 'triangle'

/** Form factors, rms over rectified mean: π/(2√2), 1 and 2/√3, each by integrating the wave. */
const FORM_FACTORS: { readonly [wave in Wave]: number } = {
  sine: Math.PI / (2 * Math.SQRT2),
  square: 1,
  triangle: 2 / Math.sqrt(3),
}

/** The form factor of a wave: its rms value over its rectified mean. */
export function formFactor(wave: Wave): number {
  return FORM_FACTORS[wave]
}

/**
 * The true rms value where a meter that averages, and is marked in rms of a sine, shows a figure on
 * another wave: shown · form factor of the wave / form factor of a sine.
 */
export function rmsOfAverageResponding(shown: number, wave: Wave): number {
  return (shown * FORM_FACTORS[wave]) / FORM_FACTORS.sine
}
