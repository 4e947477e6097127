import { splitUnit } from './cell-text'
import { readAngle } from './parse-angle'
import { readLimited, toTyped } from './parse-number'
import { readQuantity } from './quantity'
import { failure, type Result, success } from './result'
import type { Typed } from './typed'

const ANGLE_MARK = /\s*∠\s*|\s+at\s+/

/** Whether a text is meant as magnitude and angle: it holds ∠ or the word at. */
export function isPolarText(text: string): boolean {
  return /∠|(?:^|\s)at(?:\s|$)/.test(text)
}

/** Why a magnitude below zero is refused, and what to do instead. */
export function negativeMagnitude(): { readonly ok: false; readonly problem: string } {
  return failure('A magnitude cannot be negative: leave the minus out and turn the angle by 180°.')
}

/** In 48.2 ∠ 82° V, as textbooks print it, the unit at the end is the magnitude's. */
function moveUnit(magnitude: string, angle: string): readonly [string, string] {
  const { figure, word, meaning } = splitUnit(angle)
  const unit = meaning?.unit
  const isOwn =
    figure === '' || unit === undefined || unit === '°' || unit === 'rad' || unit === '%'
  return isOwn || splitUnit(magnitude).word !== ''
    ? [magnitude, angle]
    : [`${magnitude} ${word}`, figure]
}

/** Reads magnitude and angle, such as 48.2 ∠ 82° or 48.2 V ± 0.5 V at 82 ± 1; the magnitude in `unit`. */
export function readPolar(
  text: string,
  unit: string,
): Result<{ readonly magnitude: Typed; readonly angle: Typed }> {
  const parts = ` ${text} `.split(ANGLE_MARK)
  const [before = '', after = ''] = parts.map((part) => part.trim())
  if (parts.length !== 2 || before === '' || after === '') {
    return failure('Write one magnitude and one angle, such as 48.2 ∠ 82° or 48.2 at 82.')
  }
  const [magnitudeText, angleText] = moveUnit(before, after)
  const magnitude = readLimited(magnitudeText, (figures) => readQuantity(figures, unit))
  if (!magnitude.ok) return magnitude
  const angle = readAngle(angleText)
  if (!angle.ok) return angle
  if (magnitude.value.value < 0) return negativeMagnitude()
  return success({ magnitude: toTyped(magnitude.value), angle: angle.value })
}
