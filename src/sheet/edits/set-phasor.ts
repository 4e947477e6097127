import { type Quantity, success, type Typed, unitOf } from '../../core'
import { parseDigits, parseShown } from '../digits'
import { unitOfMagnitude } from '../figures'
import { labelOf } from '../names'
import type { MagnitudeReading, Phasor, PhasorId, Reading, Sheet, Shown } from '../types'
import { type Change, withChange, without } from './change'
import type { EditKind } from './edit-kind'
import { entryOf, withList, withReplaced } from './lists'

/** Changes what a phasor is, but for its value; null takes a field away. */
export interface SetPhasor {
  readonly kind: 'set-phasor'
  readonly id: PhasorId
  readonly change: Change<Pick<Phasor, 'from' | 'to' | 'tail'>> & {
    readonly label?: string
    readonly quantity?: Quantity
  }
}

/**
 * Changes what a phasor is. The phasors of a sum are of one quantity, so another quantity goes to all
 * that it adds up with; their figures stay, with the new unit.
 */
export const setPhasor: EditKind<SetPhasor> = {
  apply: (sheet, { id, change }) => {
    const found = entryOf(sheet, 'phasors', id)
    if (!found.ok) return found
    const { quantity, ...rest } = change
    const changed = withReplaced(sheet, 'phasors', withChange<Phasor>(found.value, rest))
    return success(quantity === undefined ? changed : withQuantity(changed, id, quantity))
  },
  describe: (sheet, { id, change }) => {
    const label = labelOf(sheet, id)
    if (change.label !== undefined) return `Rename ${label} to ${change.label}`
    if (change.quantity === undefined) return `Change ${label}`
    const labels = [...inSumsWith(sheet, id)].map((other) => labelOf(sheet, other))
    return `Make ${labels.join(', ')} ${labels.length > 1 ? 'of the quantity' : 'a'} ${change.quantity}`
  },
}

/** The phasors that stand, directly or through others, in sums with this one, itself among them. */
function inSumsWith(sheet: Sheet, id: PhasorId): ReadonlySet<PhasorId> {
  const group = new Set([id])
  const members = (sheet.sums ?? []).map(({ terms, equals }) => [
    ...terms.map((term) => term.phasor),
    ...(typeof equals === 'string' ? [equals] : []),
  ])
  for (let size = 0; size < group.size; ) {
    size = group.size
    for (const ids of members) {
      if (ids.some((member) => group.has(member))) for (const member of ids) group.add(member)
    }
  }
  return group
}

function withQuantity(sheet: Sheet, id: PhasorId, quantity: Quantity): Sheet {
  const group = inSumsWith(sheet, id)
  const before = new Map(sheet.phasors.map((phasor) => [phasor.id, phasor.quantity]))
  const phasors = sheet.phasors.map((phasor) =>
    group.has(phasor.id) ? { ...withUnit(phasor, quantity), quantity } : phasor,
  )
  const readings = (sheet.readings ?? []).map((reading) =>
    group.has(reading.of) && reading.kind === 'magnitude'
      ? withShownUnit(reading, before.get(reading.of) ?? 'other', quantity)
      : reading,
  )
  return withList(withList(sheet, 'phasors', phasors), 'readings', readings)
}

function withUnit(phasor: Phasor, quantity: Quantity): Phasor {
  const units = [unitOf(phasor.quantity), unitOf(quantity)] as const
  const typed = (['magnitude', 'real', 'imaginary'] as const).flatMap((part) => {
    const value = phasor[part]
    return value === undefined ? [] : [[part, withTextIn(value, ...units)] as const]
  })
  return { ...phasor, ...Object.fromEntries(typed) }
}

function withTextIn(typed: Typed, from: string, to: string): Typed {
  if (typed.text === undefined) return typed
  const text = inUnit(typed.text, from, to)
  const parsed = parseDigits(text, to)
  return parsed.ok && parsed.value === typed.value ? { ...typed, text } : without(typed, 'text')
}

function withShownUnit(reading: MagnitudeReading, from: Quantity, to: Quantity): Reading {
  if (typeof reading.shown === 'number') return reading
  const units = [unitOfMagnitude(reading, from), unitOfMagnitude(reading, to)] as const
  const value = parseShown(reading.shown, units[0])
  const shown: Shown = inUnit(reading.shown, ...units)
  const parsed = parseShown(shown, units[1])
  if (!value.ok || (parsed.ok && parsed.value === value.value)) return { ...reading, shown }
  return { ...reading, shown: value.value }
}

/** Digits with the unit behind them exchanged, where they have one: "230 mV" → "230 mA". */
function inUnit(text: string, from: string, to: string): string {
  return from !== '' && text.endsWith(from) ? (text.slice(0, -from.length) + to).trimEnd() : text
}
