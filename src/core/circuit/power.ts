import { type Complex, conjugate, magnitudeOf, multiply } from '../complex'

/** Power in W, var and VA. */
export interface Power {
  /** W; negative where it is given back. */
  readonly active: number
  /** var; positive where the current lags (IEC 60375, load convention). */
  readonly reactive: number
  readonly apparent: number
  /** active / apparent; left out where there is no power. */
  readonly factor?: number
  /** What the current does to the voltage; left out where there is no power. */
  readonly sense?: 'leads' | 'lags' | 'in phase'
}

/** Reactive power below this share of the apparent power is rounding. */
const IN_PHASE = 1e-12

/** The power of a voltage with a current, both rms: P + jQ = V · I*. */
export function powerOf(voltage: Complex, current: Complex): Power {
  return powerFrom(multiply(voltage, conjugate(current)))
}

/** The power of several parts together: active and reactive power add up, apparent power does not. */
export function totalPower(parts: readonly Pick<Power, 'active' | 'reactive'>[]): Power {
  let [re, im] = [0, 0]
  for (const { active, reactive } of parts) {
    re += active
    im += reactive
  }
  return powerFrom({ re, im })
}

function powerFrom(complex: Complex): Power {
  const apparent = magnitudeOf(complex)
  const { re: active, im: reactive } = complex
  if (!(apparent > 0)) return { active, reactive, apparent }
  const sense =
    Math.abs(reactive) <= IN_PHASE * apparent ? 'in phase' : reactive > 0 ? 'lags' : 'leads'
  return { active, reactive, apparent, factor: active / apparent, sense }
}
