import type { ClosedSum, ElementModel, PhasorProblem } from '../../core/estimate'
import { type AsRead, asReadOf } from '../as-read'
import type { CircuitElement, Sheet, Sum, ThreePhase } from '../types'
import { type Names, namesOf } from './names'
import { countObservations } from './observations'
import { observeReading } from './observe-reading'
import { observeElement, observePhasor } from './observe-typed'
import type { PendingObservation } from './pending'

/** A sheet as the estimator takes it, and where everything in it comes from. */
export interface SheetProblem {
  readonly problem: PhasorProblem
  readonly names: Names
  readonly asRead: AsRead
  /** One an observation of the problem, in its order. */
  readonly sources: readonly PendingObservation[]
}

const FREQUENCY = 'frequency'

/** The sum as phasors that add up to nothing; nothing where it is just a resultant, or names what is not there. */
function closedSum(sum: Sum, names: Names): ClosedSum | undefined {
  if (sum.equals === undefined || sum.terms.length === 0) return undefined
  const terms = [
    ...sum.terms.map(({ phasor, sign = 1 }) => ({ id: phasor, sign })),
    ...(sum.equals === 0 ? [] : [{ id: sum.equals, sign: -1 as const }]),
  ]
  return closed(terms, names)
}

function closed(
  terms: readonly { readonly id: string; readonly sign: 1 | -1 }[],
  names: Names,
): ClosedSum | undefined {
  const placed = terms.flatMap(({ id, sign }) => {
    const phasor = names.phasor.get(id)
    return phasor === undefined ? [] : [{ phasor, sign }]
  })
  return placed.length === terms.length ? placed : undefined
}

/** A neutral, positive from load to source, carries the sum of the three currents. */
function neutralSum({ phasors, neutral }: ThreePhase, names: Names): ClosedSum | undefined {
  const place = neutral === undefined ? undefined : names.phasor.get(neutral)
  if (neutral === undefined || place === undefined) return undefined
  if (names.phasors[place]?.quantity !== 'current') return undefined
  return closed(
    [...phasors.map((id) => ({ id, sign: 1 as const })), { id: neutral, sign: -1 }],
    names,
  )
}

function modelOf(element: CircuitElement, names: Names): ElementModel {
  const { kind } = element
  return {
    voltage: names.phasor.get(element.voltage) ?? 0,
    current: names.phasor.get(element.current) ?? 0,
    kind,
    ...(kind === 'capacitor' && element.resistance === undefined ? { lossless: true } : {}),
  }
}

function isThere<Value>(value: Value | undefined): value is Value {
  return value !== undefined
}

/**
 * The sheet as a phasor problem. Hard conditions: sums that must equal something, V = Z · I of every
 * element, the neutral's current, the reference's angle, whatever has a limit of 0. Observations: what
 * was typed, readings that are not struck, elements' values outside their nameplates.
 */
export function problemOfSheet(sheet: Sheet): SheetProblem {
  const names = namesOf(sheet)
  const asRead = asReadOf(sheet)
  const reference = names.phasor.get(asRead.reference ?? '')
  const sources = [
    ...sheet.phasors.flatMap((phasor) =>
      observePhasor(phasor, names, phasor.id === asRead.reference),
    ),
    ...(sheet.readings ?? [])
      .map((reading) => observeReading(reading, names, asRead.reference))
      .filter(isThere),
    ...names.elements.flatMap((element) => observeElement(element, names)),
  ]
  const frequency = sheet.frequency?.value || undefined
  const isFrequencyUncertain = frequency !== undefined && !!sheet.frequency?.limit
  const counted = countObservations(
    sources,
    isFrequencyUncertain && names.elements.length > 0 ? [FREQUENCY] : [],
  )
  const frequencyError = counted.errorOf.get(FREQUENCY)
  const problem: PhasorProblem = {
    phasors: sheet.phasors.length,
    sums: [
      ...(sheet.sums ?? []).map((sum) => closedSum(sum, names)),
      ...(sheet.threePhase ?? []).map((each) => neutralSum(each, names)),
    ].filter(isThere),
    elements: names.elements.map((element) => modelOf(element, names)),
    sharedErrors: counted.sharedErrors,
    observations: counted.observations,
    ...(reference === undefined
      ? {}
      : {
          reference: {
            phasor: reference,
            angle: asRead.values.get(asRead.reference ?? '')?.angle ?? 0,
          },
        }),
    ...(frequency === undefined ? {} : { frequency }),
    ...(frequencyError === undefined
      ? {}
      : {
          frequencyError: {
            error: frequencyError,
            sensitivity: (sheet.frequency?.limit ?? 0) / (frequency ?? 1) / Math.sqrt(3),
          },
        }),
  }
  return { problem, names, asRead, sources }
}
