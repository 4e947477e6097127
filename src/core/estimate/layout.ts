import type { ElementIndex, PhasorIndex, PhasorProblem, SharedErrorIndex } from './phasor-problem'

/** Which unknown is which: real and imaginary parts, then elements' values, then shared errors. */
export interface Layout {
  readonly unknowns: number
  readonly real: (phasor: PhasorIndex) => number
  readonly imaginary: (phasor: PhasorIndex) => number
  /** Undefined where the element has none by its kind. */
  readonly resistance: (element: ElementIndex) => number | undefined
  /** Undefined where the element has none by its kind. */
  readonly reactance: (element: ElementIndex) => number | undefined
  readonly error: (error: SharedErrorIndex) => number
}

/** The layout of a problem's unknowns. */
export function layoutOf(problem: PhasorProblem): Layout {
  let next = 2 * problem.phasors
  const resistances: (number | undefined)[] = []
  const reactances: (number | undefined)[] = []
  for (const element of problem.elements) {
    resistances.push(element.lossless === true ? undefined : next++)
    reactances.push(element.kind === 'resistor' ? undefined : next++)
  }
  const firstError = next
  return {
    unknowns: firstError + problem.sharedErrors.length,
    real: (phasor) => 2 * phasor,
    imaginary: (phasor) => 2 * phasor + 1,
    resistance: (element) => resistances[element],
    reactance: (element) => reactances[element],
    error: (error) => firstError + error,
  }
}

/** The value of an unknown; 0 for one that is not there. */
export function valueAt(x: Float64Array, column: number | undefined): number {
  return column === undefined ? 0 : (x[column] ?? 0)
}
