import { type Complex, conjugate, divide, fromPolar, isFiniteComplex, multiply } from '../../core'
import {
  type Evaluation,
  type Id,
  nameOfElement,
  type Sheet,
  type WiredNode,
  wiredNodes,
  wiringOf,
} from '../../sheet'

/** What a triangle shows: impedance in Ω, or power in VA. */
export type TriangleKind = 'impedance' | 'power'

/** An element, or all of the circuit, of which triangles can be drawn. */
export interface TriangleSubject {
  readonly of: Id | 'total'
  /** As it is called: `Run capacitor`, `the whole circuit`. */
  readonly name: string
  /** Whether its voltage and current are the best values of the readings, or what the circuit predicts. */
  readonly basis: 'found' | 'predicted'
  /** V · I* in VA: reactive power is positive where the current lags. */
  readonly power: Complex
  /** V / I in Ω; left out where no current flows. */
  readonly impedance?: Complex
}

type Basis = TriangleSubject['basis']

/** The circuit as a whole and its elements, those of which both voltage and current are known. */
export function triangleSubjects(sheet: Sheet, evaluation: Evaluation): readonly TriangleSubject[] {
  const wiring = wiringOf(sheet)
  if (wiring === undefined) return []
  const known = { found: foundIn(evaluation), predicted: predictedIn(evaluation) }
  const subject = (of: Id | 'total', name: string, node: WiredNode) =>
    subjectOf(node, known.found, 'found', of, name) ??
    subjectOf(node, known.predicted, 'predicted', of, name) ??
    []
  return [
    subject('total', 'the whole circuit', wiring),
    ...[...wiredNodes(wiring)].map((node) =>
      node.element === undefined
        ? []
        : subject(node.element.id, nameOfElement(sheet, node.element.id), node),
    ),
  ].flat()
}

function subjectOf(
  { voltage = '', current = '' }: WiredNode,
  known: ReadonlyMap<Id, Complex>,
  basis: Basis,
  of: Id | 'total',
  name: string,
): TriangleSubject | undefined {
  const [across, through] = [known.get(voltage), known.get(current)]
  if (across === undefined || through === undefined) return undefined
  const power = multiply(across, conjugate(through))
  const impedance = divide(across, through)
  return {
    of,
    name,
    basis,
    power,
    ...(isFiniteComplex(impedance) && { impedance }),
  }
}

function foundIn({ phasors }: Evaluation): ReadonlyMap<Id, Complex> {
  return vectorsOf(phasors.map(({ id, magnitude, angle }) => [id, magnitude, angle]))
}

function predictedIn({ comparison = [] }: Evaluation): ReadonlyMap<Id, Complex> {
  return vectorsOf(
    comparison.map(({ phasor, predicted }) => [phasor, predicted.magnitude, predicted.angle]),
  )
}

function vectorsOf(
  values: readonly (readonly [Id, number | undefined, number | undefined])[],
): ReadonlyMap<Id, Complex> {
  return new Map(
    values.flatMap(([id, magnitude, angle]) =>
      magnitude === undefined || angle === undefined
        ? []
        : [[id, fromPolar(magnitude, angle)] as const],
    ),
  )
}
