import { formatNumber, magnitudeOf, toPolar } from '../../../src/core'
import { type Flow, flowsIn, impedanceOf } from '../../../src/core/circuit'
import { apply, type Edit, emptySheet, type Reading, type Sheet } from '../../../src/sheet'

/** A sheet after some edits. Throws where one is refused. */
export function edited(sheet: Sheet, ...edits: readonly Edit[]): Sheet {
  return edits.reduce((before, edit) => {
    const after = apply(before, edit)
    if (!after.ok) throw new Error(`${edit.kind}: ${after.problem}`)
    return after.value
  }, sheet)
}

/** What the elements of the invented job really are. */
export interface Truth {
  readonly resistance: number
  readonly winding: number
  readonly inductance: number
  readonly capacitance: number
}

/** As it is marked: a resistor, a choke and a capacitor in series on 48 V, 50 Hz. */
export const MARKED: Truth = {
  resistance: 100,
  winding: 12,
  inductance: 0.15,
  capacitance: 16e-6,
}

/** The circuit of the job, with its marks and without readings. */
export function seriesJob(marks: Truth = MARKED): Sheet {
  const add = (kind: 'resistor' | 'coil' | 'capacitor', marked: object, label?: string): Edit => ({
    kind: 'add-element',
    element: { kind, marked, ...(label === undefined ? {} : { label }) },
    at: [],
    form: 'series',
  })
  return edited(
    emptySheet(),
    { kind: 'set-details', title: 'Fan in store 3', frequency: { value: 50, text: '50' } },
    { kind: 'start-circuit', form: 'series' },
    add('resistor', { resistance: { value: marks.resistance, limit: marks.resistance / 100 } }),
    add('coil', {
      resistance: { value: marks.winding, limit: 0.6 },
      inductance: { value: marks.inductance, limit: marks.inductance / 20 },
    }),
    add(
      'capacitor',
      { capacitance: { value: marks.capacitance, text: '16 µF', limit: marks.capacitance / 20 } },
      'run capacitor',
    ),
    { kind: 'set-details', reference: 'I' },
  )
}

/** What flows in the job as its elements really are, from 48 V. */
export function trueFlow(truth: Truth): Flow {
  const { resistance, winding, inductance, capacitance } = truth
  const series = [
    impedanceOf({ kind: 'resistor', resistance }, 50),
    impedanceOf({ kind: 'coil', resistance: winding, inductance }, 50),
    impedanceOf({ kind: 'capacitor', resistance: 0, capacitance }, 50),
  ].map((impedance) => ({ impedance }))
  const flow = flowsIn({ series }, { path: [], side: 'voltage', value: { re: 48, im: 0 } })
  if (!flow.ok) throw new Error(flow.problem)
  return flow.value
}

/** The readings that good meters give of the job: 0.5 % of each magnitude, 0.5° of each angle. */
export function readingsOf(truth: Truth): readonly Reading[] {
  const flow = trueFlow(truth)
  const current = toPolar(flow.current ?? { re: 0, im: 0 })
  const voltages = { VS: flow, VR: flow.branches[0], Vcoil: flow.branches[1], VC: flow.branches[2] }
  const size = (id: string, of: string, value: number): Reading => {
    const shown = formatNumber(value, value < 1 ? 4 : 2)
    return { id, of, kind: 'magnitude', shown, limit: value / 200 }
  }
  return [
    size('rI', 'I', magnitudeOf(flow.current ?? { re: 0, im: 0 })),
    ...Object.entries(voltages).flatMap(([id, part]) => {
      const { magnitude, angle } = toPolar(part?.voltage ?? { re: 0, im: 0 })
      const turn = formatNumber(angle - current.angle, 1)
      return [
        size(`m${id}`, id, magnitude),
        { id: `a${id}`, of: id, kind: 'angle', shown: turn, limit: 0.5 } satisfies Reading,
      ]
    }),
  ]
}

/** The job with the readings of what it really is. */
export function measuredJob(truth: Truth, marks: Truth = MARKED): Sheet {
  return { ...seriesJob(marks), readings: readingsOf(truth) }
}
