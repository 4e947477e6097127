import type { SheetError } from '../sheet-result'
import type { Id, Phasor, PhasorId, Quantity, Sheet } from '../types'
import { elementsOf } from './references'

/** Finds parts that contradict each other, on a sheet whose ids and references are right. */
export function* checkRelations(sheet: Sheet): Generator<SheetError> {
  yield* checkTails(sheet.phasors)
  yield* checkSums(sheet)
  yield* checkPairs(sheet)
  yield* checkCircuit(sheet)
}

/** Finds phasors that hang, through however many others, on their own tip. */
function* checkTails(phasors: readonly Phasor[]): Generator<SheetError> {
  const hangsOn = new Map<PhasorId, PhasorId>()
  for (const { id, tail } of phasors) {
    if (tail !== undefined && 'tipOf' in tail) hangsOn.set(id, tail.tipOf)
  }
  const free = new Set<PhasorId>()
  for (const [index, { id, label }] of phasors.entries()) {
    const chain = new Set<PhasorId>()
    let next: PhasorId | undefined = id
    while (next !== undefined && !free.has(next) && !chain.has(next)) {
      chain.add(next)
      next = hangsOn.get(next)
    }
    if (next !== undefined && chain.has(next)) {
      if (next !== id) continue
      const message = `${label} would hang on its own tip: hang it on another phasor.`
      yield { path: `phasors[${index}].tail.tipOf`, message }
    } else {
      for (const clear of chain) free.add(clear)
    }
  }
}

function* checkSums(sheet: Sheet): Generator<SheetError> {
  const phasors = new Map(sheet.phasors.map((phasor) => [phasor.id, phasor]))
  for (const [index, sum] of (sheet.sums ?? []).entries()) {
    const path = `sums[${index}]`
    let quantity: Quantity | undefined
    for (const [at, { phasor: id }] of sum.terms.entries()) {
      const phasor = phasors.get(id)
      if (phasor === undefined) continue
      quantity ??= phasor.quantity
      if (phasor.quantity !== quantity) {
        const message = mixture(phasor, quantity)
        yield { path: `${path}.terms[${at}].phasor`, message }
      }
      if (sum.equals === id) {
        const message = `${phasor.label} is a term of this sum: what the sum must equal is another phasor.`
        yield { path: `${path}.equals`, message }
      }
    }
    const measured = sum.equals === 0 ? undefined : phasors.get(sum.equals ?? '')
    if (measured !== undefined && quantity !== undefined && measured.quantity !== quantity) {
      yield { path: `${path}.equals`, message: mixture(measured, quantity) }
    }
  }
}

function mixture({ label, quantity }: Phasor, others: Quantity): string {
  return `${label} (${quantity}) cannot stand in a sum of another quantity (${others}).`
}

/** Finds readings of a phasor against itself. */
function* checkPairs(sheet: Sheet): Generator<SheetError> {
  for (const [index, reading] of (sheet.readings ?? []).entries()) {
    const path = `readings[${index}]`
    if ('against' in reading && reading.against === reading.of) {
      const message = 'An angle is measured against another phasor, not against itself.'
      yield { path: `${path}.against`, message }
    }
    if ('with' in reading && reading.with === reading.of) {
      const message = 'A power reading needs a voltage and a current: this names one phasor twice.'
      yield { path: `${path}.with`, message }
    }
  }
}

function* checkCircuit(sheet: Sheet): Generator<SheetError> {
  const seen = new Set<Id>()
  for (const { path, id } of sheet.circuit === undefined ? [] : elementsOf(sheet.circuit)) {
    if (seen.has(id)) yield { path, message: `The element "${id}" is in the circuit twice.` }
    seen.add(id)
  }
  for (const [index, system] of (sheet.threePhase ?? []).entries()) {
    for (const list of ['phasors', 'currents'] as const) {
      const ids = system[list]
      if (ids !== undefined && new Set(ids).size < ids.length) {
        const message = 'Three phases are three different phasors.'
        yield { path: `threePhase[${index}].${list}`, message }
      }
    }
  }
}
