import { expect } from 'vitest'
import type {
  CircuitElement,
  CircuitNode,
  Phasor,
  Quantity,
  Reading,
  Sheet,
  Sum,
  Typed,
} from '../../src/sheet'
import { evaluate } from '../../src/sheet/estimate'

type Value = 'resistance' | 'inductance' | 'capacitance' | 'reactance'

/** An element by its kind and values, or others joined. */
export type Part =
  | {
      readonly id: string
      readonly kind: CircuitElement['kind']
      readonly values: Partial<Record<Value, number>>
    }
  | { readonly series: readonly Part[] }
  | { readonly parallel: readonly Part[] }

export const resistor = (id: string, resistance: number): Part => ({
  id,
  kind: 'resistor',
  values: { resistance },
})
export const coil = (id: string, inductance: number, resistance = 0): Part => ({
  id,
  kind: 'coil',
  values: { resistance, inductance },
})
export const capacitor = (id: string, capacitance: number): Part => ({
  id,
  kind: 'capacitor',
  values: { capacitance },
})
export const impedance = (id: string, resistance: number, reactance: number): Part => ({
  id,
  kind: 'impedance',
  values: { resistance, reactance },
})

/** Exactly this value. */
export const exactly = (value: number): Typed => ({ value, limit: 0 })

/** A phasor of which nothing is typed. */
export function unknown(id: string, quantity: Quantity): Phasor {
  return { id, label: id, quantity }
}

/** A phasor typed polar, exactly. */
export function known(id: string, quantity: Quantity, magnitude: number, angle = 0): Phasor {
  return { ...unknown(id, quantity), magnitude: exactly(magnitude), angle: exactly(angle) }
}

/** Terms that make up a phasor, `-` before one that is taken away. */
export function sum(equals: string, ...terms: readonly string[]): Sum {
  return {
    id: `s${equals}`,
    terms: terms.map((term) =>
      term.startsWith('-') ? { phasor: term.slice(1), sign: -1 } : { phasor: term },
    ),
    equals,
  }
}

/** An exact reading. */
export function exactReading(reading: object): Reading {
  return { limit: 0, ...reading } as Reading
}

/** A sheet with these parts, evaluated. */
export function answerTo(parts: Omit<Sheet, 'format' | 'version' | 'title'>) {
  const evaluation = evaluate({ format: 'phasogon-sheet', version: 1, title: 'A case', ...parts })
  const phasor = (id: string) => complete(evaluation.phasors.find((each) => each.id === id))
  const predicted = (id: string) =>
    complete(evaluation.comparison?.find((each) => each.phasor === id)?.predicted)
  const power = (of: string) => {
    const found = evaluation.power?.find((each) => each.of === of)
    return found ?? { active: Number.NaN, reactive: Number.NaN, apparent: Number.NaN }
  }
  const element = (id: string) => evaluation.elements?.find((each) => each.id === id)
  return { evaluation, phasor, predicted, power, element }
}

function complete(
  value: Partial<Record<'magnitude' | 'angle' | 'real' | 'imaginary', number>> = {},
) {
  const {
    magnitude = Number.NaN,
    angle = Number.NaN,
    real = Number.NaN,
    imaginary = Number.NaN,
  } = value
  return { magnitude, angle, real, imaginary }
}

/** What drives a circuit: its voltage `V`, or its current `I`. */
export interface Supply {
  readonly side: 'voltage' | 'current'
  readonly magnitude: number
  readonly angle?: number
}

/**
 * The answer to a sheet of a circuit whose elements are marked with exact values: the whole has the
 * voltage `V` and the current `I`; an element R has VR and IR, but for what it shares with its group.
 */
export function predictedFrom(
  circuit: Part,
  frequency: number | undefined,
  { side, magnitude, angle = 0 }: Supply,
) {
  const laid: Laid = { phasors: [], sums: [], elements: [] }
  const name = side === 'voltage' ? 'V' : 'I'
  laid.phasors.push(known(name, side, magnitude, angle))
  laid.phasors.push(unknown(name === 'V' ? 'I' : 'V', name === 'V' ? 'current' : 'voltage'))
  const node = lay(circuit, 'V', 'I', laid)
  const answer = answerTo({
    ...(frequency === undefined ? {} : { frequency: { value: frequency } }),
    supply: name,
    reference: name,
    circuit: node,
    ...laid,
  })
  const at = (id: string, of: 'voltage' | 'current') => {
    const element = laid.elements.find((each) => each.id === id)
    return answer.predicted(element?.[of] ?? (of === 'voltage' ? 'V' : 'I'))
  }
  const z = (voltage: string, current: string) => {
    const [v, i] = [answer.predicted(voltage), answer.predicted(current)]
    return { magnitude: v.magnitude / i.magnitude, angle: v.angle - i.angle }
  }
  expect(answer.evaluation.agreement?.verdict).not.toBe('disagree')
  return { ...answer, at, z, whole: () => z('V', 'I') }
}

interface Laid {
  readonly phasors: Phasor[]
  readonly sums: Sum[]
  readonly elements: CircuitElement[]
}

function lay(part: Part, voltage: string, current: string, laid: Laid): CircuitNode {
  if ('id' in part) {
    const marked = Object.fromEntries(
      Object.entries(part.values).map(([value, figure]) => [value, exactly(figure)]),
    )
    laid.elements.push({ id: part.id, kind: part.kind, voltage, current, marked })
    return { element: part.id }
  }
  const isSeries = 'series' in part
  const parts = isSeries ? part.series : part.parallel
  const [letter, quantity] = isSeries ? (['V', 'voltage'] as const) : (['I', 'current'] as const)
  const ids = parts.map((each) => `${letter}${'id' in each ? each.id : `g${laid.phasors.length}`}`)
  laid.phasors.push(...ids.map((id) => unknown(id, quantity)))
  laid.sums.push({
    id: `s${laid.sums.length}`,
    terms: ids.map((phasor) => ({ phasor })),
    equals: isSeries ? voltage : current,
  })
  const nodes = parts.map((each, at) => {
    const own = ids[at] ?? ''
    return isSeries ? lay(each, own, current, laid) : lay(each, voltage, own, laid)
  })
  return isSeries ? { series: nodes } : { parallel: nodes }
}
