import { differenceDegrees, failure, fromPolar, success, unitOf, wrapDegrees } from '../../core'
import { asReadOf } from '../as-read'
import { type FigureUnit, parseDigits } from '../digits'
import { type Held, heldBy } from '../held'
import { labelOf } from '../names'
import type { Phasor, PhasorId, Sheet, Typed } from '../types'
import type { EditKind } from './edit-kind'
import { entryOf, withReplaced } from './lists'
import { withTypedPolar, withTypedRectangular } from './typed-parts'

/**
 * Drags the tip of a phasor to another magnitude and angle. The texts keep the digits that the drag
 * snapped to; they count only where they say the values.
 */
export interface DragTip {
  readonly kind: 'drag-tip'
  readonly id: PhasorId
  readonly magnitude: number
  /** Degrees, anticlockwise positive. */
  readonly angle: number
  readonly magnitudeText?: string
  readonly angleText?: string
}

/**
 * Drags the tip of a phasor: its typed values change, in the form in which they were typed, and their
 * limits stay. A part that is held keeps its value, so a drag that would change it fails and says why.
 */
export const dragTip: EditKind<DragTip> = {
  apply: (sheet, edit) => {
    const found = entryOf(sheet, 'phasors', edit.id)
    if (!found.ok) return found
    if (!Number.isFinite(edit.magnitude) || !Number.isFinite(edit.angle) || edit.magnitude < 0) {
      return failure('The tip cannot be dragged there.')
    }
    const held = heldBy(sheet, edit.id)
    if (movesWhatIsHeld(sheet, edit, held)) {
      return failure(held.why ?? 'This tip is held where it is.')
    }
    return success(withReplaced(sheet, 'phasors', dragged(found.value, edit, held)))
  },
  describe: (sheet, { id }) => `Drag the tip of ${labelOf(sheet, id)}`,
  isLight: true,
}

function movesWhatIsHeld(sheet: Sheet, edit: DragTip, held: Held): boolean {
  if (!held.magnitude && !held.angle) return false
  const { magnitude, angle = 0 } = asReadOf(sheet).values.get(edit.id) ?? {}
  return (
    (held.magnitude && edit.magnitude !== magnitude) ||
    (held.angle && differenceDegrees(edit.angle, angle) !== 0)
  )
}

function dragged(phasor: Phasor, edit: DragTip, held: Held): Phasor {
  if (phasor.real !== undefined && !held.magnitude && !held.isAngleRead) {
    const { re, im } = fromPolar(edit.magnitude, edit.angle)
    return withTypedRectangular(phasor, { value: re }, { value: im })
  }
  const magnitude = withText(edit.magnitude, edit.magnitudeText, unitOf(phasor.quantity))
  const sized = held.magnitude ? phasor : withTypedPolar(phasor, 'magnitude', magnitude)
  const angle = withText(wrapDegrees(edit.angle), edit.angleText, '°')
  return held.angle ? sized : withTypedPolar(sized, 'angle', angle)
}

function withText(value: number, text: string | undefined, unit: FigureUnit): Typed {
  if (text === undefined) return { value }
  const parsed = parseDigits(text, unit)
  return parsed.ok && parsed.value === value ? { value, text } : { value }
}
