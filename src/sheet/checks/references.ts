import type { SheetError } from '../sheet-result'
import type { CircuitNode, Id, Reading, Sheet } from '../types'

/** What a reference can point to. */
type Kind = 'phasor' | 'instrument' | 'channel' | 'sum' | 'element'

/** A field that names another part of the sheet. */
interface Reference {
  readonly path: string
  readonly id: Id
  readonly to: Kind
}

/** Finds fields that name a part which the sheet does not have. */
export function* checkReferences(sheet: Sheet): Generator<SheetError> {
  const known = {
    phasor: idSet(sheet.phasors),
    instrument: idSet(sheet.instruments),
    channel: idSet(sheet.channels),
    sum: idSet(sheet.sums),
    element: idSet(sheet.elements),
  } satisfies Record<Kind, ReadonlySet<Id>>
  for (const { path, id, to } of referencesOf(sheet)) {
    if (!known[to].has(id)) yield { path, message: `There is no ${to} "${id}" on this sheet.` }
  }
}

function idSet(parts: readonly { readonly id: Id }[] = []): ReadonlySet<Id> {
  return new Set(parts.map((part) => part.id))
}

function* referencesOf(sheet: Sheet): Generator<Reference> {
  yield* maybe('reference', sheet.reference, 'phasor')
  yield* maybe('supply', sheet.supply, 'phasor')
  for (const [index, { tail }] of sheet.phasors.entries()) {
    if (tail !== undefined && 'tipOf' in tail) {
      yield { path: `phasors[${index}].tail.tipOf`, id: tail.tipOf, to: 'phasor' }
    }
  }
  for (const [index, reading] of (sheet.readings ?? []).entries()) {
    yield* referencesOfReading(reading, `readings[${index}]`)
  }
  yield* referencesOfSums(sheet)
  yield* referencesOfCircuit(sheet)
  for (const [index, { phasor }] of (sheet.chosen ?? []).entries()) {
    yield { path: `chosen[${index}].phasor`, id: phasor, to: 'phasor' }
  }
  for (const [index, { sum, stands }] of (sheet.hand ?? []).entries()) {
    yield* maybe(`hand[${index}].sum`, sum, 'sum')
    if (stands !== 'closing') yield { path: `hand[${index}].stands`, id: stands, to: 'phasor' }
  }
}

function* maybe(path: string, id: Id | undefined, to: Kind): Generator<Reference> {
  if (id !== undefined) yield { path, id, to }
}

function* referencesOfReading(reading: Reading, path: string): Generator<Reference> {
  yield { path: `${path}.of`, id: reading.of, to: 'phasor' }
  yield* maybe(`${path}.instrument`, reading.instrument, 'instrument')
  yield* maybe(`${path}.channel`, reading.channel, 'channel')
  if ('against' in reading) yield* maybe(`${path}.against`, reading.against, 'phasor')
  if ('with' in reading) yield { path: `${path}.with`, id: reading.with, to: 'phasor' }
  if ('currentChannel' in reading) {
    yield* maybe(`${path}.currentChannel`, reading.currentChannel, 'channel')
  }
}

function* referencesOfSums(sheet: Sheet): Generator<Reference> {
  for (const [index, sum] of (sheet.sums ?? []).entries()) {
    const path = `sums[${index}]`
    for (const [at, { phasor }] of sum.terms.entries()) {
      yield { path: `${path}.terms[${at}].phasor`, id: phasor, to: 'phasor' }
    }
    if (sum.equals !== 0) yield* maybe(`${path}.equals`, sum.equals, 'phasor')
  }
}

function* referencesOfCircuit(sheet: Sheet): Generator<Reference> {
  for (const [index, { voltage, current }] of (sheet.elements ?? []).entries()) {
    yield { path: `elements[${index}].voltage`, id: voltage, to: 'phasor' }
    yield { path: `elements[${index}].current`, id: current, to: 'phasor' }
  }
  if (sheet.circuit !== undefined) {
    for (const { path, id } of elementsOf(sheet.circuit)) yield { path, id, to: 'element' }
  }
  for (const [index, system] of (sheet.threePhase ?? []).entries()) {
    const path = `threePhase[${index}]`
    for (const list of ['phasors', 'currents'] as const) {
      for (const [at, id] of (system[list] ?? []).entries()) {
        yield { path: `${path}.${list}[${at}]`, id, to: 'phasor' }
      }
    }
    yield* maybe(`${path}.neutral`, system.neutral, 'phasor')
  }
}

/** The elements in a circuit's tree, each with its place. */
export function* elementsOf(
  node: CircuitNode,
  path = 'circuit',
): Generator<{ readonly path: string; readonly id: Id }> {
  if ('element' in node) {
    yield { path: `${path}.element`, id: node.element }
    return
  }
  const branch = 'series' in node ? 'series' : 'parallel'
  const nodes = 'series' in node ? node.series : node.parallel
  for (const [index, child] of nodes.entries()) {
    yield* elementsOf(child, `${path}.${branch}[${index}]`)
  }
}
