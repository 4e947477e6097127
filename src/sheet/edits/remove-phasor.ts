import { success } from '../../core'
import { labelOf, nameOfSum } from '../names'
import type { Phasor, PhasorId, Reading, Sheet, Sum, ThreePhase } from '../types'
import { withChange, without } from './change'
import { prunedCircuit } from './circuit'
import type { EditKind } from './edit-kind'
import { entryOf, orNone } from './lists'
import { withoutSums } from './sums'

/** Removes a phasor and all that cannot be without it: `describeRemoval` says what. */
export interface RemovePhasor {
  readonly kind: 'remove-phasor'
  readonly id: PhasorId
}

/** Removes a phasor and all that cannot be without it. */
export const removePhasor: EditKind<RemovePhasor> = {
  apply: (sheet, { id }) => {
    const found = entryOf(sheet, 'phasors', id)
    return found.ok ? success(withoutPhasor(sheet, id)) : found
  },
  describe: (sheet, { id }) => `Delete ${labelOf(sheet, id)}`,
}

function withoutPhasor(sheet: Sheet, id: PhasorId): Sheet {
  const sums = (sheet.sums ?? []).map((sum) => withoutTerms(sum, id))
  const emptied = sums.filter((sum, index) => {
    const before = sheet.sums?.[index]?.terms.length ?? 0
    return sum.terms.length === 0 && before > 0
  })
  const elements = (sheet.elements ?? []).filter(
    ({ voltage, current }) => voltage !== id && current !== id,
  )
  const left = new Set(elements.map((element) => element.id))
  const freed = withChange<Sheet>(sheet, {
    phasors: sheet.phasors.filter((phasor) => phasor.id !== id).map((phasor) => untied(phasor, id)),
    readings: orNone((sheet.readings ?? []).filter((reading) => !isAbout(reading, id))),
    sums: orNone(sums),
    elements: orNone(elements),
    circuit: prunedCircuit(sheet.circuit, left) ?? null,
    threePhase: orNone((sheet.threePhase ?? []).flatMap((system) => withoutPhase(system, id))),
    chosen: orNone((sheet.chosen ?? []).filter(({ phasor }) => phasor !== id)),
    hand: orNone((sheet.hand ?? []).filter(({ stands }) => stands !== id)),
    ...(sheet.reference === id ? { reference: null } : {}),
    ...(sheet.supply === id ? { supply: null } : {}),
  })
  return withoutSums(freed, new Set(emptied.map((sum) => sum.id)))
}

function untied(phasor: Phasor, id: PhasorId): Phasor {
  const { tail } = phasor
  const hangs = tail !== undefined && 'tipOf' in tail && tail.tipOf === id
  return hangs ? without(phasor, 'tail') : phasor
}

function isAbout(reading: Reading, id: PhasorId): boolean {
  return (
    reading.of === id ||
    ('against' in reading && reading.against === id) ||
    ('with' in reading && reading.with === id)
  )
}

function withoutTerms(sum: Sum, id: PhasorId): Sum {
  const terms = sum.terms.filter(({ phasor }) => phasor !== id)
  return { ...(sum.equals === id ? without(sum, 'equals') : sum), terms }
}

function withoutPhase(system: ThreePhase, id: PhasorId): readonly ThreePhase[] {
  if (system.phasors.includes(id)) return []
  return [
    withChange<ThreePhase>(system, {
      ...(system.neutral === id ? { neutral: null } : {}),
      ...(system.currents?.includes(id) ? { currents: null } : {}),
    }),
  ]
}

/** What goes, or changes, with a phasor when it is removed: short phrases, none where it stands alone. */
export function describeRemoval(sheet: Sheet, id: PhasorId): readonly string[] {
  const after = withoutPhasor(sheet, id)
  const lost = (list: 'readings' | 'elements' | 'threePhase' | 'hand') =>
    (sheet[list]?.length ?? 0) - (after[list]?.length ?? 0)
  const hanging = sheet.phasors.filter(
    ({ tail }) => tail !== undefined && 'tipOf' in tail && tail.tipOf === id,
  )
  return [
    ...(sheet.sums ?? []).flatMap((sum) => describeLoss(sheet, sum, id, after)),
    ...counted(lost('readings'), 'reading'),
    ...counted(lost('elements'), 'element of the circuit', 'elements of the circuit'),
    ...counted(lost('threePhase'), 'three-phase system'),
    ...counted(lost('hand'), 'hand-drawn arrow'),
    ...hanging.map(({ label }) => `${label} no longer hangs on its tip`),
    ...(sheet.reference === id ? ['another phasor becomes the reference'] : []),
    ...(sheet.supply === id ? ['the sheet names no supply any more'] : []),
  ]
}

function describeLoss(sheet: Sheet, sum: Sum, id: PhasorId, after: Sheet): readonly string[] {
  const name = nameOfSum(sheet, sum.id)
  if (!after.sums?.some((other) => other.id === sum.id)) return [`the sum ${name}`]
  const terms = sum.terms.filter(({ phasor }) => phasor === id).length
  return [
    ...counted(terms, `term of the sum ${name}`, `terms of the sum ${name}`),
    ...(sum.equals === id ? [`what the sum ${name} is compared with`] : []),
  ]
}

function counted(count: number, one: string, many = `${one}s`): readonly string[] {
  if (count === 0) return []
  return [count === 1 ? `1 ${one}` : `${count} ${many}`]
}
