/** What a capacitor holds when it is switched off at the worst moment. */
export interface Charge {
  /** V: √2 times the rms voltage. */
  readonly peak: number
  /** J: half C times the square of the peak. */
  readonly energy: number
}

/** The charge that may stay on a capacitor in F that an rms voltage in V stood across. */
export function chargeOf(capacitance: number, voltage: number): Charge {
  const peak = Math.SQRT2 * voltage
  return { peak, energy: (capacitance * peak * peak) / 2 }
}

/**
 * The time in s until a capacitor in F, discharged through a resistance in Ω, falls from one voltage to
 * another: R · C · ln(from / to). 0 where it is below already; infinite without a way for the current.
 */
export function dischargeTime(
  capacitance: number,
  resistance: number,
  from: number,
  to: number,
): number {
  if (from <= to) return 0
  return to > 0 ? resistance * capacitance * Math.log(from / to) : Number.POSITIVE_INFINITY
}
