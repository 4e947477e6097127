import { add, type Complex, complex } from 'mathjs'
import { resultantOfPolar } from '../../../src/core'
import { type Measure, millisecondsOf, ratioOfMedians } from '../measure'

const count = 1_000_000

/** A million phasors; the figures are scattered, and the same in every run. */
function million(): { magnitudes: Float64Array; degrees: Float64Array } {
  const magnitudes = new Float64Array(count)
  const degrees = new Float64Array(count)
  for (let index = 0; index < count; index += 1) {
    magnitudes[index] = 1 + ((index * 7919) % 1000) / 10
    degrees[index] = ((index * 104_729) % 36_000) / 100 - 180
  }
  return { magnitudes, degrees }
}

/** What one would write down first: a loop that adds the parts. */
function plainLoop(magnitudes: Float64Array, degrees: Float64Array): { re: number; im: number } {
  let re = 0
  let im = 0
  for (let index = 0; index < magnitudes.length; index += 1) {
    const magnitude = magnitudes[index] ?? 0
    const radians = ((degrees[index] ?? 0) * Math.PI) / 180
    re += magnitude * Math.cos(radians)
    im += magnitude * Math.sin(radians)
  }
  return { re, im }
}

/** The same with the complex numbers of a general library. */
function withMathjs(magnitudes: Float64Array, degrees: Float64Array): Complex {
  let sum = complex(0, 0)
  for (let index = 0; index < magnitudes.length; index += 1) {
    const phi = ((degrees[index] ?? 0) * Math.PI) / 180
    sum = add(sum, complex({ r: magnitudes[index] ?? 0, phi }))
  }
  return sum
}

async function ratioTo(
  other: (magnitudes: Float64Array, degrees: Float64Array) => { re: number; im: number },
): Promise<number> {
  const { magnitudes, degrees } = million()
  const ours = resultantOfPolar(magnitudes, degrees)
  const theirs = other(magnitudes, degrees)
  // A race between different results would mean nothing.
  if (Math.hypot(ours.re - theirs.re, ours.im - theirs.im) > 1e-3) {
    throw new Error('The two resultants are not the same.')
  }
  return ratioOfMedians(
    {
      ours: () => millisecondsOf(() => resultantOfPolar(magnitudes, degrees)),
      theirs: () => millisecondsOf(() => other(magnitudes, degrees)),
    },
    9,
  )
}

export const resultantAgainstLoop: Measure = {
  name: 'resultant of 1,000,000 phasors : plain loop over typed arrays',
  goal: 1.5,
  measure: () => ratioTo(plainLoop),
}

export const resultantAgainstMathjs: Measure = {
  name: 'resultant of 1,000,000 phasors : mathjs',
  goal: 0.25,
  measure: () => ratioTo(withMathjs),
}
