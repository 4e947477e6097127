import { Matrix, SingularValueDecomposition } from 'ml-matrix'
import { createRandom, type Random } from '../../../src/core/estimate'
import { equationsOf } from '../../../src/core/estimate/equations'
import type { CircuitElement, Phasor, Reading, Sheet, Sum } from '../../../src/sheet'
import { evaluate, problemOfSheet } from '../../../src/sheet/estimate'
import { type Measure, millisecondsOf, ratioOfMedians } from '../measure'

/** A matrix with as many rows as a sheet has observations and conditions, and a column an unknown. */
function systemOf(sheet: Sheet, random: Random): Matrix {
  const { unknowns, residuals, conditions } = equationsOf(problemOfSheet(sheet).problem)
  return Matrix.rand(residuals.count + conditions.count, unknowns, { random })
}

/** Solving a whole sheet against one singular value decomposition of its system. */
function againstDecomposition(name: string, goal: number, sheet: Sheet, rounds: number): Measure {
  return {
    name,
    goal,
    measure: () => {
      const system = systemOf(sheet, createRandom(1))
      return ratioOfMedians(
        {
          ours: () => millisecondsOf(() => evaluate(sheet)),
          theirs: () =>
            millisecondsOf(() => new SingularValueDecomposition(system, { autoTranspose: true })),
        },
        rounds,
      )
    },
  }
}

function phasor(id: string, quantity: 'voltage' | 'current'): Phasor {
  return { id, label: id, quantity }
}

function magnitude(of: string, shown: number): Reading {
  return { id: `r${of}`, of, kind: 'magnitude', shown, limit: 0.01 * shown }
}

/** A resistor, a coil and a capacitor in series: six phasors, eight readings. */
const sixPhasors: Sheet = {
  format: 'phasogon-sheet',
  version: 1,
  title: 'Six phasors',
  frequency: { value: 50 },
  reference: 'I',
  phasors: [
    phasor('I', 'current'),
    ...['V', 'VR', 'VL', 'VC', 'VRL'].map((id) => phasor(id, 'voltage')),
  ],
  sums: [
    { id: 's1', terms: ['VR', 'VL', 'VC'].map((id) => ({ phasor: id })), equals: 'V' },
    { id: 's2', terms: ['VR', 'VL'].map((id) => ({ phasor: id })), equals: 'VRL' },
  ],
  elements: [
    { id: 'R', kind: 'resistor', voltage: 'VR', current: 'I' },
    { id: 'L', kind: 'coil', voltage: 'VL', current: 'I' },
    { id: 'C', kind: 'capacitor', voltage: 'VC', current: 'I' },
  ],
  // 2 A through 30 Ω, 10 + j42 Ω and −j20 Ω, each reading a little off.
  readings: [
    magnitude('I', 2.004),
    magnitude('VR', 59.9),
    magnitude('VL', 86.6),
    magnitude('VC', 40.1),
    magnitude('VRL', 116.3),
    magnitude('V', 91.1),
    { id: 'rA', of: 'V', kind: 'angle', shown: 28.6, limit: 1 },
    { id: 'rP', of: 'V', kind: 'power', with: 'I', shown: 160.9, limit: 2 },
  ],
}

/** Branches of a resistor and a coil beside each other, four phasors each, with two for the supply. */
function branches(count: number): Sheet {
  const phasors: Phasor[] = [phasor('V', 'voltage'), phasor('I', 'current')]
  const sums: Sum[] = []
  const elements: CircuitElement[] = []
  const readings: Reading[] = [magnitude('V', 230)]
  const total = { re: 0, im: 0 }
  for (let k = 0; k < count; k++) {
    const [r, x] = [20 + k, 30 + 3 * k]
    const square = r * r + x * x
    const current = 230 / Math.sqrt(square)
    total.re += (230 * r) / square
    total.im -= (230 * x) / square
    const [i, vr, vl, v] = [`I${k}`, `VR${k}`, `VL${k}`, `V${k}`] as const
    phasors.push(phasor(i, 'current'), ...[vr, vl, v].map((id) => phasor(id, 'voltage')))
    sums.push({ id: `s${k}`, terms: [{ phasor: vr }, { phasor: vl }], equals: v })
    sums.push({ id: `t${k}`, terms: [{ phasor: v }], equals: 'V' })
    elements.push({ id: `R${k}`, kind: 'resistor', voltage: vr, current: i })
    elements.push({ id: `L${k}`, kind: 'coil', voltage: vl, current: i })
    readings.push(
      magnitude(i, 1.002 * current),
      magnitude(vr, current * r),
      magnitude(vl, 0.998 * current * x),
      magnitude(v, 230.2),
    )
  }
  const currents = Array.from({ length: count }, (_, k) => ({ phasor: `I${k}` }))
  sums.push({ id: 'node', terms: currents, equals: 'I' })
  readings.push(magnitude('I', Math.hypot(total.re, total.im)), {
    id: 'rA',
    of: 'I',
    kind: 'angle',
    shown: (Math.atan2(total.im, total.re) * 180) / Math.PI,
  })
  return {
    format: 'phasogon-sheet',
    version: 1,
    title: `${phasors.length} phasors`,
    frequency: { value: 50 },
    reference: 'V',
    phasors,
    sums,
    elements,
    readings,
  }
}

/** A job of six phasors and eight readings. */
export const estimateSix = againstDecomposition(
  'a six-phasor, eight-reading job solved, against one SVD of its system',
  30,
  sixPhasors,
  60,
)

/** A job of forty-two phasors. */
export const estimateForty = againstDecomposition(
  'a job of forty-two phasors solved, against one SVD of its system',
  60,
  branches(10),
  5,
)

/** How the time to solve a job grows with it: by phasors, milliseconds each in this one run. */
export function growthOfEstimate(): readonly { readonly phasors: number; readonly ms: number }[] {
  return [1, 2, 4, 8, 12].map((count) => {
    const sheet = branches(count)
    evaluate(sheet)
    return { phasors: sheet.phasors.length, ms: millisecondsOf(() => evaluate(sheet)) }
  })
}
