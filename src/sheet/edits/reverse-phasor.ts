import {
  decimalPlacesOf,
  failure,
  formatNumber,
  type Result,
  resolutionOf,
  success,
  type Typed,
  wrapDegrees,
} from '../../core'
import { parseDigits } from '../digits'
import { labelOf } from '../names'
import { turnsWith, withLeadsExchanged } from '../readings/reverse'
import { referenceOf } from '../reference'
import { indexOf } from '../sheet-index'
import type { HandArrow, Phasor, PhasorId, Sheet, Sum } from '../types'
import { withChange } from './change'
import type { EditKind } from './edit-kind'
import { entryOf } from './lists'

/** Counts a phasor the other way round: from its head to its tail, negated wherever it stands. */
export interface ReversePhasor {
  readonly kind: 'reverse-phasor'
  readonly id: PhasorId
}

/**
 * Counts a phasor the other way round. Its terminals change places; its typed value, its sign in every
 * sum, and every reading that compares it with another turn with it, as if the meter's leads had been
 * exchanged: all else on the sheet stays what it was. A sum that must equal it is negated as a whole.
 * Refused for the reference, which lies at 0° by definition, and where its direction is tied to that of
 * another phasor, by an element of the circuit or a three-phase system.
 */
export const reversePhasor: EditKind<ReversePhasor> = {
  apply: (sheet, { id }) => {
    const found = entryOf(sheet, 'phasors', id)
    if (!found.ok) return found
    const problem = whyNot(sheet, found.value)
    return problem === undefined ? reversed(sheet, found.value) : failure(problem)
  },
  describe: (sheet, { id }) => `Reverse ${labelOf(sheet, id)}`,
}

function whyNot(sheet: Sheet, { id, label }: Phasor): string | undefined {
  if (referenceOf(sheet) === id) {
    return `${label} is the reference, at 0° by definition: make another phasor the reference first, then reverse ${label}.`
  }
  const element = (sheet.elements ?? []).find(
    ({ voltage, current }) => voltage === id || current === id,
  )
  if (element !== undefined) {
    const name = element.label ?? element.id
    return `${label} is the voltage or the current of ${name}, and the two count in one direction: take ${name} out of the circuit first.`
  }
  const system = (sheet.threePhase ?? []).find(
    ({ phasors, currents, neutral }) =>
      neutral === id || phasors.includes(id) || currents?.includes(id),
  )
  if (system !== undefined) {
    const name = system.label ?? system.id
    return `${label} belongs to the three-phase system ${name}, which counts all its phasors in one direction: take it out of that first.`
  }
  const drawn = (sheet.sums ?? []).find(
    (sum) => sum.equals === id && (sheet.hand ?? []).some((arrow) => arrow.sum === sum.id),
  )
  if (drawn === undefined) return undefined
  return `The sum that ${label} must equal was drawn by hand, and would run the other way: delete the hand-drawn arrows first.`
}

function reversed(sheet: Sheet, phasor: Phasor): Result<Sheet> {
  const { id } = phasor
  const reference = referenceOf(sheet)
  const { instruments } = indexOf(sheet)
  const changed = withChange<Sheet>(sheet, {
    phasors: sheet.phasors.map((other) => (other.id === id ? negated(other) : other)),
    ...(sheet.readings && {
      readings: sheet.readings.map((reading) =>
        turnsWith(reading, id, reference)
          ? withLeadsExchanged(reading, instruments.get(reading.instrument ?? ''))
          : reading,
      ),
    }),
    ...(sheet.sums && { sums: sheet.sums.map((sum) => withSigns(sum, id)) }),
    ...(sheet.chosen && {
      chosen: sheet.chosen.map((choice) =>
        choice.phasor === id ? { ...choice, angle: wrapDegrees(choice.angle + 180) } : choice,
      ),
    }),
    ...(sheet.hand && { hand: sheet.hand.map((arrow) => withEnds(arrow, id)) }),
  })
  return success(withSameReference(changed, reference))
}

/** A phasor that comes to lie at 0° may take the place of a reference that nobody named. */
function withSameReference(sheet: Sheet, reference: PhasorId | undefined): Sheet {
  if (reference === undefined || referenceOf(sheet) === reference) return sheet
  return { ...sheet, reference }
}

function negated({ from, to, ...phasor }: Phasor): Phasor {
  const { angle, real, imaginary } = phasor
  return {
    ...phasor,
    ...(to === undefined ? {} : { from: to }),
    ...(from === undefined ? {} : { to: from }),
    ...(angle === undefined ? {} : { angle: stepped(angle, '°', wrapDegrees(angle.value + 180)) }),
    ...(real === undefined ? {} : { real: stepped(real, '', -real.value + 0) }),
    ...(imaginary === undefined ? {} : { imaginary: stepped(imaginary, '', -imaginary.value + 0) }),
  }
}

/** A typed value with another figure; its digits stay as fine, where they can say it exactly. */
function stepped({ text, ...typed }: Typed, unit: '°' | '', value: number): Typed {
  const resolution = text === undefined ? undefined : resolutionOf(text)
  if (resolution === undefined) return { ...typed, value }
  const digits = formatNumber(value, decimalPlacesOf(resolution))
  const parsed = parseDigits(digits, unit)
  const isSame = parsed.ok && Math.abs(parsed.value - value) <= 1e-12 * Math.abs(value)
  return isSame && resolutionOf(digits) === resolution
    ? { ...typed, value: parsed.value, text: digits }
    : { ...typed, value }
}

function withSigns(sum: Sum, id: PhasorId): Sum {
  const isWhole = sum.equals === id
  if (!isWhole && !sum.terms.some(({ phasor }) => phasor === id)) return sum
  return {
    ...sum,
    terms: sum.terms.map((term) => {
      if (!isWhole && term.phasor !== id) return term
      const { sign, ...rest } = term
      return sign === -1 ? rest : { ...rest, sign: -1 }
    }),
  }
}

/** An arrow that was drawn as a term of a sum stays: the term is what it was. */
function withEnds(arrow: HandArrow, id: PhasorId): HandArrow {
  if (arrow.stands !== id || arrow.sum !== undefined) return arrow
  return { ...arrow, from: arrow.to, to: arrow.from }
}
