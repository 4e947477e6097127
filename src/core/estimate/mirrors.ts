import { type Complex, cosDegrees, magnitudeOf, sinDegrees, subtract } from '..'
import type { PhasorEquations } from './equations'
import { mirrored } from './geometry'
import { type Layout, valueAt } from './layout'
import type { PhasorIndex, PhasorProblem } from './phasor-problem'

/** A mirrored pair must move by this share of its length to be worth a look. */
const WORTH = 1e-4

function phasorAt(x: Float64Array, layout: Layout, phasor: PhasorIndex): Complex {
  return { re: valueAt(x, layout.real(phasor)), im: valueAt(x, layout.imaginary(phasor)) }
}

function put(x: Float64Array, layout: Layout, phasor: PhasorIndex, value: Complex): void {
  x[layout.real(phasor)] = value.re
  x[layout.imaginary(phasor)] = value.im
}

/** The whole drawing mirrored about the reference: every lead a lag, every coil a capacitor. */
function wholeMirror(problem: PhasorProblem, layout: Layout, x: Float64Array): Float64Array {
  const mirror = x.slice()
  const twice = 2 * (problem.reference?.angle ?? 0)
  const axis = { re: cosDegrees(twice), im: sinDegrees(twice) }
  for (let phasor = 0; phasor < problem.phasors; phasor++) {
    const { re, im } = phasorAt(x, layout, phasor)
    put(mirror, layout, phasor, {
      re: axis.re * re + axis.im * im,
      im: axis.im * re - axis.re * im,
    })
  }
  problem.elements.forEach((_, each) => {
    const reactance = layout.reactance(each)
    if (reactance !== undefined) mirror[reactance] = -valueAt(x, reactance)
  })
  return mirror
}

/** Elements' values as the phasors of a place have them. */
function withValuesFromPhasors(
  problem: PhasorProblem,
  layout: Layout,
  x: Float64Array,
): Float64Array {
  problem.elements.forEach(({ voltage, current }, each) => {
    const [v, i] = [phasorAt(x, layout, voltage), phasorAt(x, layout, current)]
    const square = i.re * i.re + i.im * i.im
    if (square === 0) return
    const [resistance, reactance] = [layout.resistance(each), layout.reactance(each)]
    if (resistance !== undefined) x[resistance] = (v.re * i.re + v.im * i.im) / square
    if (reactance !== undefined) x[reactance] = (v.im * i.re - v.re * i.im) / square
  })
  return x
}

function anglesRead(problem: PhasorProblem): ReadonlySet<PhasorIndex> {
  const read = new Set<PhasorIndex>()
  if (problem.reference) read.add(problem.reference.phasor)
  for (const { of } of problem.observations) {
    if (of.kind === 'angle' || of.kind === 'real' || of.kind === 'imaginary') read.add(of.phasor)
  }
  return read
}

/**
 * Where other solutions may lie, given one: the whole drawing mirrored, and in every sum each two
 * terms of unread angle mirrored about their own sum, which keeps their lengths and the loop closed.
 */
export function mirrorsOf(
  problem: PhasorProblem,
  { layout }: PhasorEquations,
  x: Float64Array,
  most: number,
): readonly Float64Array[] {
  const places = [wholeMirror(problem, layout, x)]
  const read = anglesRead(problem)
  for (const sum of problem.sums) {
    const open = sum.filter(({ phasor }) => !read.has(phasor))
    for (let one = 0; one < open.length; one++) {
      for (let other = one + 1; other < open.length && places.length < most; other++) {
        const [first, second] = [open[one], open[other]]
        if (first === undefined || second === undefined) continue
        const a = phasorAt(x, layout, first.phasor)
        const b = phasorAt(x, layout, second.phasor)
        const same = first.sign * second.sign
        const [flipped, rest] = mirrored(a, { re: same * b.re, im: same * b.im })
        if (magnitudeOf(subtract(flipped, a)) <= WORTH * magnitudeOf(a)) continue
        const place = x.slice()
        put(place, layout, first.phasor, flipped)
        put(place, layout, second.phasor, { re: same * rest.re, im: same * rest.im })
        places.push(withValuesFromPhasors(problem, layout, place))
      }
    }
  }
  return places
}
