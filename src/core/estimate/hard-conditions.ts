import { cosDegrees, sinDegrees } from '..'
import { type Layout, valueAt } from './layout'
import type { PhasorProblem } from './phasor-problem'
import type { Write } from './rows'

/** Writes every sum's real and imaginary part from row 0 on; gives the next row. */
export function writeSums(
  problem: PhasorProblem,
  layout: Layout,
  x: Float64Array,
  write: Write,
  values: Float64Array,
): number {
  problem.sums.forEach((terms, each) => {
    for (const { phasor, sign } of terms) {
      for (const [row, column] of [
        [2 * each, layout.real(phasor)],
        [2 * each + 1, layout.imaginary(phasor)],
      ] as const) {
        values[row] = (values[row] ?? 0) + sign * valueAt(x, column)
        write(row, column, sign)
      }
    }
  })
  return 2 * problem.sums.length
}

/** Writes V − (R + jX) · I of every element, real and imaginary part; gives the next row. */
export function writeElements(
  problem: PhasorProblem,
  layout: Layout,
  x: Float64Array,
  write: Write,
  values: Float64Array,
  first: number,
): number {
  problem.elements.forEach(({ voltage, current }, each) => {
    const row = first + 2 * each
    const resistance = layout.resistance(each)
    const reactance = layout.reactance(each)
    const r = valueAt(x, resistance)
    const s = valueAt(x, reactance)
    const i = { re: valueAt(x, layout.real(current)), im: valueAt(x, layout.imaginary(current)) }
    values[row] = valueAt(x, layout.real(voltage)) - r * i.re + s * i.im
    values[row + 1] = valueAt(x, layout.imaginary(voltage)) - r * i.im - s * i.re
    write(row, layout.real(voltage), 1)
    write(row + 1, layout.imaginary(voltage), 1)
    write(row, layout.real(current), -r)
    write(row, layout.imaginary(current), s)
    write(row + 1, layout.real(current), -s)
    write(row + 1, layout.imaginary(current), -r)
    if (resistance !== undefined) {
      write(row, resistance, -i.re)
      write(row + 1, resistance, -i.im)
    }
    if (reactance !== undefined) {
      write(row, reactance, i.im)
      write(row + 1, reactance, -i.re)
    }
  })
  return first + 2 * problem.elements.length
}

/** Writes how far the reference is off its own angle, where there is one; gives the next row. */
export function writeReference(
  problem: PhasorProblem,
  layout: Layout,
  x: Float64Array,
  write: Write,
  values: Float64Array,
  row: number,
): number {
  if (problem.reference === undefined) return row
  const { phasor, angle } = problem.reference
  const [cosine, sine] = [cosDegrees(angle), sinDegrees(angle)]
  const [real, imaginary] = [layout.real(phasor), layout.imaginary(phasor)]
  values[row] = cosine * valueAt(x, imaginary) - sine * valueAt(x, real)
  write(row, imaginary, cosine)
  write(row, real, -sine)
  return row + 1
}
