import {
  add,
  angleOf,
  type Complex,
  fromPolar,
  magnitudeOf,
  multiply,
  wrapDegrees,
} from '../../../src/core'
import type { Random } from '../../../src/core/estimate'
import type { CircuitElement, Phasor, Quantity, Reading, Sheet, Sum } from '../../../src/sheet'

/** How the readings of a job were taken. */
export type Metering = (typeof METERINGS)[number]
/** How its elements are connected. */
export type Circuit = (typeof CIRCUITS)[number]

const METERINGS = ['own meter for each', 'one meter for all', 'with drift'] as const
const CIRCUITS = ['series', 'parallel', 'mixed'] as const

/** A job whose readings are all within their limits, and what is true of it. */
export interface SoundJob {
  readonly sheet: Sheet
  readonly metering: Metering
  readonly circuit: Circuit
  readonly phasors: ReadonlyMap<string, Complex>
  readonly impedances: ReadonlyMap<string, Complex>
}

interface Truth {
  readonly phasors: Map<string, { value: Complex; quantity: Quantity }>
  readonly sums: Sum[]
  readonly elements: CircuitElement[]
  readonly impedances: Map<string, Complex>
}

function between(random: Random, low: number, high: number): number {
  return low + (high - low) * random()
}

function oneOf<Value>(random: Random, values: readonly [Value, ...Value[]]): Value {
  return values[Math.floor(random() * values.length)] ?? values[0]
}

function divided(a: Complex, b: Complex): Complex {
  const square = b.re * b.re + b.im * b.im
  return multiply(a, { re: b.re / square, im: -b.im / square })
}

const KINDS = ['resistor', 'coil', 'capacitor', 'impedance'] as const

function valuesOf(random: Random, kind: (typeof KINDS)[number]): Complex {
  switch (kind) {
    case 'resistor':
      return { re: between(random, 5, 100), im: 0 }
    case 'coil':
      return { re: between(random, 2, 20), im: between(random, 10, 100) }
    case 'capacitor':
      return { re: 0, im: -between(random, 10, 100) }
    case 'impedance':
      return { re: between(random, 5, 60), im: between(random, -40, 60) }
  }
}

/** Two to four elements, the first two of different kinds. */
function someElements(random: Random): readonly (typeof KINDS)[number][] {
  const count = 2 + Math.floor(3 * random())
  const start = Math.floor(4 * random())
  return Array.from({ length: count }, (_, each) => KINDS[(start + each) % 4] ?? 'resistor')
}

function addPhasor(truth: Truth, id: string, quantity: Quantity, value: Complex): Complex {
  truth.phasors.set(id, { value, quantity })
  return value
}

function addElement(
  truth: Truth,
  kind: (typeof KINDS)[number],
  voltage: string,
  current: string,
  impedance: Complex,
): void {
  const id = `Z${truth.elements.length + 1}`
  truth.elements.push({ id, kind, voltage, current })
  truth.impedances.set(id, impedance)
}

function addSum(truth: Truth, equals: string, terms: readonly string[]): void {
  truth.sums.push({
    id: `s${truth.sums.length + 1}`,
    terms: terms.map((phasor) => ({ phasor })),
    equals,
  })
}

const NOTHING: Complex = { re: 0, im: 0 }

function series(random: Random, truth: Truth, name: string, current: string, i: Complex): Complex {
  const ids: string[] = []
  const values: Complex[] = []
  for (const kind of someElements(random)) {
    const impedance = valuesOf(random, kind)
    const id = `V${name}${ids.length + 1}`
    values.push(addPhasor(truth, id, 'voltage', multiply(i, impedance)))
    addElement(truth, kind, id, current, impedance)
    ids.push(id)
  }
  const whole = addPhasor(truth, `V${name}`, 'voltage', values.reduce(add, NOTHING))
  addSum(truth, `V${name}`, ids)
  if (ids.length > 2 && random() < 0.5) {
    addPhasor(truth, `V${name}12`, 'voltage', values.slice(0, 2).reduce(add, NOTHING))
    addSum(truth, `V${name}12`, ids.slice(0, 2))
  }
  return whole
}

function parallel(
  random: Random,
  truth: Truth,
  name: string,
  voltage: string,
  v: Complex,
): Complex {
  const ids: string[] = []
  const values: Complex[] = []
  for (const kind of someElements(random)) {
    const impedance = valuesOf(random, kind)
    const id = `I${name}${ids.length + 1}`
    values.push(addPhasor(truth, id, 'current', divided(v, impedance)))
    addElement(truth, kind, voltage, id, impedance)
    ids.push(id)
  }
  addSum(truth, `I${name}`, ids)
  return addPhasor(truth, `I${name}`, 'current', values.reduce(add, NOTHING))
}

/** A true circuit: its first phasor is the reference. */
function circuitOf(random: Random, circuit: Circuit): Truth {
  const truth: Truth = {
    phasors: new Map(),
    sums: [],
    elements: [],
    impedances: new Map(),
  }
  if (circuit === 'series') {
    const i = addPhasor(truth, 'I', 'current', fromPolar(between(random, 0.2, 10), 0))
    series(random, truth, '', 'I', i)
  } else if (circuit === 'parallel') {
    const v = addPhasor(truth, 'V', 'voltage', fromPolar(between(random, 20, 400), 0))
    parallel(random, truth, '', 'V', v)
  } else {
    const v = addPhasor(truth, 'Vp', 'voltage', fromPolar(between(random, 20, 200), 0))
    const i = parallel(random, truth, '', 'Vp', v)
    const before = series(random, truth, 'a', 'I', i)
    addPhasor(truth, 'VS', 'voltage', add(v, before))
    addSum(truth, 'VS', ['Vp', 'Va'])
  }
  return truth
}

/** A figure with four digits, and the step of the last one. */
function fourDigits(value: number): { text: (shown: number) => string; step: number } {
  const places = Math.max(0, 3 - Math.floor(Math.log10(Math.abs(value))))
  return { text: (shown) => shown.toFixed(places), step: 10 ** -places }
}

const PERCENT_OF_READING = 0.8
const DIGITS = 3
const INSTRUMENTS = [
  {
    id: 'dmm',
    name: 'A multimeter',
    accuracy: (['voltage', 'current', 'power'] as const).map((of) => ({
      of,
      text: `±(${PERCENT_OF_READING} % + ${DIGITS} digits)`,
    })),
  },
]

/** What goes wrong in a whole job: one error for each function of the meter and for each pass. */
interface CommonErrors {
  readonly gains: { readonly [of: string]: number }
  readonly drifts: readonly number[]
}

const DRIFT = 1
const PASSES = ['first', 'second'] as const

/** One indication: the true value, with the errors that a metering of its kind has. */
function indicationOf(
  random: Random,
  metering: Metering,
  errors: CommonErrors,
  of: string,
  value: number,
  driftPower: number,
): Pick<Reading, 'limit' | 'instrument' | 'pass'> & { shown: number | string } {
  const pass = metering === 'with drift' ? Math.floor(random() * PASSES.length) : undefined
  const drift = pass === undefined ? 0 : (errors.drifts[pass] ?? 0) * driftPower
  const there = value * (1 + drift / 100)
  const passed = pass === undefined ? {} : { pass: PASSES[pass] ?? 'first' }
  if (metering !== 'one meter for all') {
    const limit = Math.abs(value) * between(random, 0.003, 0.015)
    return { shown: there + between(random, -limit, limit), limit, ...passed }
  }
  const { text, step } = fourDigits(value)
  // Half a step is left for the rounding of the display.
  const own = between(random, -1, 1) * (DIGITS - 0.5) * step
  const shown = there * (1 + (errors.gains[of] ?? 0) / 100) + own
  return { shown: text(shown), instrument: 'dmm', ...passed }
}

function readingsOf(
  random: Random,
  truth: Truth,
  metering: Metering,
  reference: string,
): readonly Reading[] {
  const gain = () => between(random, -PERCENT_OF_READING, PERCENT_OF_READING) / 1.008
  const errors: CommonErrors = {
    gains: { voltage: gain(), current: gain(), power: gain() },
    drifts: PASSES.map(() => between(random, -DRIFT, DRIFT)),
  }
  const readings: Reading[] = []
  const nextId = () => `r${readings.length + 1}`
  for (const [of, { value, quantity }] of truth.phasors) {
    readings.push({
      id: nextId(),
      of,
      kind: 'magnitude',
      ...indicationOf(random, metering, errors, quantity, magnitudeOf(value), 1),
    })
    if (of === reference || random() > 0.35) continue
    const limit = between(random, 0.5, 2)
    const shown = wrapDegrees(angleOf(value) + between(random, -limit, limit))
    readings.push({ id: nextId(), of, kind: 'angle', shown, limit })
  }
  for (const { voltage, current } of truth.elements) {
    if (random() > 0.3) continue
    const [v, i] = [truth.phasors.get(voltage)?.value, truth.phasors.get(current)?.value]
    const power = v && i ? v.re * i.re + v.im * i.im : 0
    const apparent = v && i ? magnitudeOf(v) * magnitudeOf(i) : 1
    // Nobody reads a wattmeter near the bottom of its scale.
    if (power < 0.2 * apparent) continue
    readings.push({
      id: nextId(),
      of: voltage,
      with: current,
      kind: 'power',
      ...indicationOf(random, metering, errors, 'power', power, 2),
    })
  }
  return readings
}

/** A random sound job: a circuit, its true values, and readings within their limits. */
export function soundJob(random: Random): SoundJob {
  const metering = oneOf(random, METERINGS)
  const circuit = oneOf(random, CIRCUITS)
  const truth = circuitOf(random, circuit)
  const [reference = ''] = truth.phasors.keys()
  const phasors: Phasor[] = [...truth.phasors].map(([id, { quantity }]) => ({
    id,
    label: id,
    quantity,
  }))
  const sheet: Sheet = {
    format: 'phasogon-sheet',
    version: 1,
    title: `${circuit}, ${metering}`,
    reference,
    phasors,
    readings: readingsOf(random, truth, metering, reference),
    sums: truth.sums,
    elements: truth.elements,
    // Whoever stood there knows which of two drawings it was.
    chosen: [...truth.phasors].map(([phasor, { value }]) => ({
      phasor,
      magnitude: magnitudeOf(value),
      angle: angleOf(value),
    })),
    ...(metering === 'one meter for all' ? { instruments: INSTRUMENTS } : {}),
    ...(metering === 'with drift' ? { drift: DRIFT } : {}),
  }
  return {
    sheet,
    metering,
    circuit,
    phasors: new Map([...truth.phasors].map(([id, { value }]) => [id, value])),
    impedances: truth.impedances,
  }
}
