import type { CircuitElement, Phasor, Quantity, Sheet, Sum, Typed } from '../../src/sheet'
import { evaluate } from '../../src/sheet/estimate'

const exactly = (value: number): Typed => ({ value, limit: 0 })

/** A phasor of which nothing is typed. */
export function unknown(id: string, quantity: Quantity): Phasor {
  return { id, label: id, quantity }
}

/** Voltages of which nothing is typed. */
export function voltages(...ids: readonly string[]): readonly Phasor[] {
  return ids.map((id) => unknown(id, 'voltage'))
}

/** Currents of which nothing is typed. */
export function currents(...ids: readonly string[]): readonly Phasor[] {
  return ids.map((id) => unknown(id, 'current'))
}

/** A phasor typed polar, in degrees, exactly. */
export function known(id: string, quantity: Quantity, magnitude: number, angle: number): Phasor {
  return { ...unknown(id, quantity), magnitude: exactly(magnitude), angle: exactly(angle) }
}

/** Terms that make up a phasor, `-` before one that is taken away. */
export function sum(equals: string | 0, ...terms: readonly string[]): Sum {
  return {
    id: `sum${equals}${terms.join('').replaceAll('-', '')}`.slice(0, 16),
    terms: terms.map((term) =>
      term.startsWith('-') ? { phasor: term.slice(1), sign: -1 } : { phasor: term },
    ),
    equals,
  }
}

/** Values of an element, in SI units. */
export type Values = Partial<
  Record<'resistance' | 'inductance' | 'capacitance' | 'reactance', number>
>

/** An element whose values are known exactly, as far as any are given. */
export function element(
  kind: CircuitElement['kind'],
  voltage: string,
  current: string,
  values: Values = {},
): CircuitElement {
  const typed = Object.fromEntries(
    Object.entries(values).map(([name, value]) => [name, exactly(value)]),
  )
  return { id: `${kind}${voltage}${current}`.slice(0, 16), kind, voltage, current, ...typed }
}

/** What the program makes of a sheet with these parts; what is open is not a number. */
export function solved(parts: Omit<Sheet, 'format' | 'version' | 'title'>) {
  const evaluation = evaluate({ format: 'phasogon-sheet', version: 1, title: 'A case', ...parts })
  const phasor = (id: string) => {
    const found = evaluation.phasors.find((each) => each.id === id)
    return {
      magnitude: found?.magnitude ?? Number.NaN,
      angle: found?.angle ?? Number.NaN,
      real: found?.real ?? Number.NaN,
      imaginary: found?.imaginary ?? Number.NaN,
    }
  }
  const found = (index: number) => evaluation.elements?.[index]
  return { evaluation, phasor, element: found }
}
