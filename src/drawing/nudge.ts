import { failure, type Result, success, wrapDegrees } from '../core'
import { type Edit, type Evaluation, heldBy, type Sheet } from '../sheet'
import { decimalsOfStep, whyTipIsHeld } from './drag'
import { nudgeHand, type RuleAndProtractor } from './hand/redraw'
import type { PlacedArrow, Scene } from './scene'

/** Decimals that no figure needs more of. */
const MOST_DECIMALS = 12

/**
 * The edit that lengthens an arrow by so many millimetres of paper and turns it by so many degrees, one
 * of them 0. What a reading holds is not moved: fails with a sentence.
 */
export function nudge(
  sheet: Sheet,
  evaluation: Evaluation,
  scene: Scene,
  arrow: PlacedArrow,
  by: RuleAndProtractor,
): Result<Edit> {
  const drawn = sheet.hand?.find(({ id }) => id === arrow.hand)
  if (drawn) return success(nudgeHand(sheet, drawn, by))
  const { phasor } = arrow
  if (phasor === undefined) return failure(whyTipIsHeld(sheet, arrow) ?? 'This arrow stays.')
  const held = heldBy(sheet, phasor)
  if ((by.millimetres !== 0 && held.magnitude) || (by.degrees !== 0 && held.angle)) {
    return failure(held.why ?? 'This tip is held where it is.')
  }
  const known = evaluation.phasors.find(({ id }) => id === phasor)?.asRead ?? {}
  const perMillimetre = (scene.unitsPerCentimetre[arrow.quantity] ?? 1) / 10
  const typed = sheet.phasors.find(({ id }) => id === phasor)
  const isFine = Math.abs(by.millimetres + by.degrees) < 1
  const { magnitude: size = 0, angle: turn = 0 } = known
  const magnitude = stepped(
    Math.max(0, size + by.millimetres * perMillimetre),
    Math.max(decimalsOf(size), by.millimetres === 0 ? 0 : decimalsOfStep(perMillimetre, isFine)),
  )
  const angle = stepped(
    wrapDegrees(turn + by.degrees),
    Math.max(decimalsOf(turn), by.degrees !== 0 && isFine ? 1 : 0),
  )
  return success({
    kind: 'drag-tip',
    id: phasor,
    magnitude: by.millimetres === 0 ? size : magnitude.value,
    angle: by.degrees === 0 ? turn : angle.value,
    ...textOf('magnitudeText', by.millimetres === 0 ? typed?.magnitude?.text : magnitude.text),
    ...textOf('angleText', by.degrees === 0 ? typed?.angle?.text : angle.text),
  })
}

function textOf<Field extends string>(
  field: Field,
  text: string | undefined,
): { [field in Field]?: string } {
  return text === undefined ? {} : ({ [field]: text } as { [field in Field]?: string })
}

function stepped(value: number, decimals: number): { value: number; text: string } {
  const text = value.toFixed(Math.min(MOST_DECIMALS, decimals))
  return { value: Number(text), text }
}

function decimalsOf(value: number): number {
  const text = String(value)
  return text.includes('e') ? MOST_DECIMALS : (text.split('.')[1] ?? '').length
}
