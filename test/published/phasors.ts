import { describe, it } from 'vitest'
import {
  angleOf,
  type Complex,
  conjugate,
  divide,
  fromPolar,
  magnitudeOf,
  multiply,
  parseCell,
  resultant,
} from '../../src/core'
import { expectPublished, nameOf, outputOf, type PublishedCase, published } from './cases'

/** A phasor or impedance as a source writes it, read by the program's own reader. */
export function read(text: string, unit = ''): Complex {
  const cell = parseCell(text, { unit })
  if (!cell.ok) throw new Error(`${text}: ${cell.problem}`)
  const value = cell.value
  if (value.form === 'polar') return fromPolar(value.magnitude.value, value.angle.value)
  if (value.form === 'rectangular') return { re: value.real.value, im: value.imaginary.value }
  if (value.form === 'number') return { re: value.number.value, im: 0 }
  throw new Error(`${text} is no phasor`)
}

/** The input of that name. */
export function input(from: PublishedCase, name: string): string {
  const text = from.inputs[name]
  if (text === undefined) throw new Error(`case ${from.id} has no input ${name}`)
  return text
}

/** Several phasors on one line, the unit after the last: `6∠0, 8∠90 V`. */
export function readAll(text: string, unit: string): readonly Complex[] {
  return text.split(',').map((each) => read(each.replace(unit, '').trim()))
}

/** The item at an index. Throws where there is none. */
export function at<Item>(items: readonly Item[], index: number): Item {
  const item = items[index]
  if (item === undefined) throw new Error(`there is no item ${index}`)
  return item
}

/** 1 + j0. */
export const ONE: Complex = { re: 1, im: 0 }

/** The resultant of phasors that are all added. */
export function sum(...values: readonly Complex[]): Complex {
  return resultant(values.map((value) => ({ value })))
}

/** 1 / z. */
export function reciprocal(z: Complex): Complex {
  return divide(ONE, z)
}

/** Complex power of a voltage with a current: V · I*. */
export function powerOf(voltage: Complex, current: Complex): Complex {
  return multiply(voltage, conjugate(current))
}

/** A balanced set, first phasor at `angle`; in the sequence abc the second lags the first by 120°. */
export function balanced(
  magnitude: number,
  angle: number,
  step = -120,
): readonly [Complex, Complex, Complex] {
  return [
    fromPolar(magnitude, angle),
    fromPolar(magnitude, angle + step),
    fromPolar(magnitude, angle - step),
  ]
}

/** Magnitude and angle under two output names. */
export function polar(
  magnitudeName: string,
  angleName: string,
  z: Complex,
): { [name: string]: number } {
  return { [magnitudeName]: magnitudeOf(z), [angleName]: angleOf(z) }
}

/** One test for each output that is named, against what is computed and what is printed. */
export function check(
  id: string,
  compute: (from: PublishedCase) => { readonly [name: string]: number },
): void {
  const from = published(id)
  describe(nameOf(from), () => {
    for (const [name, value] of Object.entries(compute(from))) {
      const output = outputOf(from, name)
      const known = output.printed_disagrees === true ? ' (disagrees with its own inputs)' : ''
      it(`${name} is ${output.printed} ${output.unit}${known}`, () =>
        expectPublished(output, value))
    }
  })
}
