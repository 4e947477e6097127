import fc from 'fast-check'
import { fromPolar, wrapDegrees } from '../../../src/core'
import {
  type HandArrow,
  type HandEvaluation,
  type Phasor,
  type Place,
  quick,
  type Sheet,
} from '../../../src/sheet'
import { sheetOf } from '../sheets'

/** A term, and what the hand drew for it: off by a vector, from a tail that is off by another. */
interface Stroke {
  readonly magnitude: number
  readonly angle: number
  readonly sign: 1 | -1
  readonly off: Place
  readonly aside: Place
}

/** A sum that was constructed by hand, at so many volts to 10 mm. */
export interface Built {
  readonly strokes: readonly Stroke[]
  readonly start: Place
  readonly scale: number
  /** How far the closing arrow misses what it joins. */
  readonly off: Place
  readonly arrangement: 'tip-to-tail' | 'from-origin'
}

const length = (least: number, most: number) =>
  fc.double({ min: least, max: most, noNaN: true, noDefaultInfinity: true })
const place = (reach: number) => fc.record({ x: length(-reach, reach), y: length(-reach, reach) })

const stroke: fc.Arbitrary<Stroke> = fc.record({
  magnitude: length(0.5, 60),
  angle: length(-179.9, 180),
  sign: fc.constantFrom(1 as const, -1 as const),
  off: place(2),
  aside: place(1),
})

/** Any construction of up to six terms. */
export const anyBuilt: fc.Arbitrary<Built> = fc.record({
  strokes: fc.array(stroke, { minLength: 1, maxLength: 6 }),
  start: place(100),
  scale: length(0.2, 50),
  off: place(2),
  arrangement: fc.constantFrom('tip-to-tail' as const, 'from-origin' as const),
})

/** The sheet of a construction, with all of it turned by so many degrees and grown by a factor. */
export function sheetOfBuilt(built: Built, degrees = 0, factor = 1): Sheet {
  const { strokes, start, scale, arrangement } = built
  const turned = ({ x, y }: Place): Place => {
    const { re, im } = fromPolar(1, degrees)
    return { x: (x * re - y * im) * factor, y: (x * im + y * re) * factor }
  }
  const hand: HandArrow[] = []
  let tip = start
  strokes.forEach(({ magnitude, angle, sign, off, aside }, index) => {
    const tail = arrangement === 'from-origin' ? start : tip
    const from = index === 0 ? start : { x: tail.x + aside.x, y: tail.y + aside.y }
    const { re, im } = fromPolar((10 * magnitude * sign) / scale, angle)
    const to = { x: from.x + re + off.x, y: from.y + im + off.y }
    hand.push({
      id: `h${index}`,
      sum: 's1',
      stands: `V${index}`,
      from: turned(from),
      to: turned(to),
    })
    tip =
      arrangement === 'from-origin' ? { x: tip.x + to.x - from.x, y: tip.y + to.y - from.y } : to
  })
  const to = { x: tip.x + built.off.x, y: tip.y + built.off.y }
  hand.push({ id: 'h', sum: 's1', stands: 'closing', from: turned(start), to: turned(to) })
  return sheetOf({
    phasors: strokes.map(
      (each, index): Phasor => ({
        id: `V${index}`,
        label: `V${index}`,
        quantity: 'voltage',
        magnitude: { value: each.magnitude },
        angle: { value: wrapDegrees(each.angle + degrees) },
      }),
    ),
    reference: 'V0',
    sums: [
      {
        id: 's1',
        terms: strokes.map(({ sign }, index) => ({ phasor: `V${index}`, sign })),
        arrangement,
      },
    ],
    hand,
    drawing: {
      unitsPerCentimetre: { voltage: scale / factor },
      tolerance: { millimetres: 0.5 * factor, degrees: 0.5 },
    },
  })
}

/** What is said of one hand arrow. Throws where nothing is. */
export function saidOf(sheet: Sheet, id: string): Required<HandEvaluation> {
  const found = quick(sheet).hand.find((each) => each.id === id)
  if (found?.ownError === undefined) throw new Error(`nothing is compared for ${id}`)
  return found as Required<HandEvaluation>
}
