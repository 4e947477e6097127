import {
  type CellValue,
  type Complex,
  failure,
  fromPolar,
  type Result,
  success,
  type Typed,
} from '../../core'
import { asReadOf } from '../as-read'
import { labelOf } from '../names'
import type { Phasor, PhasorId, Sheet } from '../types'
import type { EditKind } from './edit-kind'
import { withLimit } from './limits'
import { entryOf } from './lists'
import { isRead, withPart, withPolar, withRectangular } from './parts'

/** A part of a phasor that has a cell of its own; `whole`: a cell for all of it. */
export type ValuePart = 'magnitude' | 'angle' | 'real' | 'imaginary' | 'whole'

/**
 * Settles a part of a phasor by what was typed into its cell; null clears it. A cell that says a whole
 * phasor, polar or rectangular, settles both parts whichever cell it stands in; one that says a limit
 * alone changes the limit alone.
 */
export interface SetValue {
  readonly kind: 'set-value'
  readonly id: PhasorId
  readonly part: ValuePart
  readonly value: CellValue | null
}

/**
 * Settles a part of a phasor. Where the part was read, the reading changes; otherwise it is typed. A
 * limit stays where none is given. A real or imaginary part makes of a phasor that is typed polar one
 * that is typed rectangular, and the reverse; where nothing is known yet of the other part, it is 0.
 */
export const setValue: EditKind<SetValue> = {
  apply: (sheet, { id, part, value }) => {
    if (value === null) return cleared(sheet, id, part)
    switch (value.form) {
      case 'polar':
        return withPolar(sheet, id, value.magnitude, value.angle)
      case 'rectangular':
        return withRectangular(sheet, id, value.real, value.imaginary)
      case 'limit':
        return withLimit(sheet, id, part, value.limit)
      case 'number':
        return withNumber(sheet, id, part, value.number)
    }
  },
  describe: (sheet, { id, part, value }) => {
    const verb = value === null ? 'Clear' : 'Change'
    const what = value?.form === 'limit' ? 'limit' : part === 'whole' ? 'value' : NAMES[part]
    return `${verb} the ${what} of ${labelOf(sheet, id)}`
  },
}

const NAMES = {
  magnitude: 'magnitude',
  angle: 'angle',
  real: 'real part',
  imaginary: 'imaginary part',
}

function withNumber(sheet: Sheet, id: PhasorId, part: ValuePart, number: Typed): Result<Sheet> {
  if (part === 'angle') return withPart(sheet, id, 'angle', number)
  if (part === 'magnitude' || part === 'whole') return withPart(sheet, id, 'magnitude', number)
  const found = entryOf(sheet, 'phasors', id)
  if (!found.ok) return found
  const other = otherPart(sheet, found.value, part)
  if (!other.ok) return other
  return part === 'real'
    ? withRectangular(sheet, id, number, other.value)
    : withRectangular(sheet, id, other.value, number)
}

/** The rectangular part that is not being typed: as typed where it was, else what polar parts make of it. */
function otherPart(sheet: Sheet, phasor: Phasor, part: 'real' | 'imaginary'): Result<Typed> {
  const typed = part === 'real' ? phasor.imaginary : phasor.real
  const isAnyRead = isRead(sheet, phasor, 'magnitude') || isRead(sheet, phasor, 'angle')
  if (typed !== undefined && !isAnyRead) return success(typed)
  const known = asReadOf(sheet).values.get(phasor.id) ?? {}
  const value = complexOf(known)
  if (value === undefined) {
    return failure(
      `Only one part of ${phasor.label} is known: type both at once, such as 3 + j4 or 5 ∠ 53°.`,
    )
  }
  return success({ value: part === 'real' ? value.im : value.re })
}

function complexOf(known: {
  readonly magnitude?: number
  readonly angle?: number
}): Complex | undefined {
  if (known.magnitude === undefined) return known.angle ? undefined : fromPolar(0, 0)
  if (known.angle === undefined) return known.magnitude === 0 ? fromPolar(0, 0) : undefined
  return fromPolar(known.magnitude, known.angle)
}

function cleared(sheet: Sheet, id: PhasorId, part: ValuePart): Result<Sheet> {
  if (part === 'magnitude' || part === 'angle') return withPart(sheet, id, part, null)
  const sized = withPart(sheet, id, 'magnitude', null)
  return sized.ok ? withPart(sized.value, id, 'angle', null) : sized
}
