import { failure, type Result, success, type Typed, toPolar, wrapDegrees } from '../../core'
import { readingsOf } from '../as-read'
import type { Phasor, PhasorId, Sheet } from '../types'
import { entryOf, withReplaced } from './lists'
import {
  isDirect,
  onlyReading,
  type PolarPart,
  refuseIndirect,
  withShownAngle,
  withShownMagnitude,
} from './read-parts'
import { withoutReadings } from './readings'
import { withTypedPolar, withTypedRectangular } from './typed-parts'

/**
 * The sheet with one polar part of a phasor settled: where it was read, the reading shows something
 * else; otherwise it is typed. The limit stays where none is given. Null takes it away: the reading,
 * or what was typed.
 */
export function withPart(
  sheet: Sheet,
  id: PhasorId,
  part: PolarPart,
  typed: Typed | null,
): Result<Sheet> {
  const found = entryOf(sheet, 'phasors', id)
  if (!found.ok) return found
  const phasor = found.value
  const problem = typed === null ? undefined : problemOf(sheet, phasor, part, typed)
  if (problem !== undefined) return failure(problem)
  if (isRead(sheet, phasor, part)) return withReadPart(sheet, phasor, part, typed)
  const value = typed !== null && part === 'angle' ? wrapped(typed) : typed
  return success(withReplaced(sheet, 'phasors', withTypedPolar(phasor, part, value)))
}

/** The sheet with both polar parts of a phasor settled. */
export function withPolar(
  sheet: Sheet,
  id: PhasorId,
  magnitude: Typed,
  angle: Typed,
): Result<Sheet> {
  const sized = withPart(sheet, id, 'magnitude', magnitude)
  return sized.ok ? withPart(sized.value, id, 'angle', angle) : sized
}

/**
 * The sheet with a phasor settled by its real and imaginary part: typed so, or, where a part of it was
 * read, as the magnitude and angle that come of them.
 */
export function withRectangular(
  sheet: Sheet,
  id: PhasorId,
  real: Typed,
  imaginary: Typed,
): Result<Sheet> {
  const found = entryOf(sheet, 'phasors', id)
  if (!found.ok) return found
  const phasor = found.value
  const { magnitude, angle } = toPolar({ re: real.value, im: imaginary.value })
  if (isRead(sheet, phasor, 'magnitude') || isRead(sheet, phasor, 'angle')) {
    return withPolar(sheet, id, { value: magnitude }, { value: angle })
  }
  const problem = problemOf(sheet, phasor, 'angle', { value: angle })
  if (problem !== undefined) return failure(problem)
  return success(withReplaced(sheet, 'phasors', withTypedRectangular(phasor, real, imaginary)))
}

/** Whether a part of a phasor is settled by readings; the angle of the named reference never is. */
export function isRead(sheet: Sheet, { id }: Phasor, part: PolarPart): boolean {
  if (part === 'angle' && sheet.reference === id) return false
  return readingsOf(sheet, id)[part].length > 0
}

function withReadPart(
  sheet: Sheet,
  phasor: Phasor,
  part: PolarPart,
  typed: Typed | null,
): Result<Sheet> {
  const reading = onlyReading(readingsOf(sheet, phasor.id), part, phasor)
  if (!reading.ok) return reading
  if (typed === null) return success(withoutReadings(sheet, new Set([reading.value.id])))
  if (!isDirect(reading.value)) return refuseIndirect(sheet, reading.value)
  if (reading.value.repeats !== undefined && reading.value.repeats.length > 0) {
    return failure(`The ${part} of ${phasor.label} is the mean of repeated readings: change those.`)
  }
  return reading.value.kind === 'magnitude'
    ? withShownMagnitude(sheet, phasor, reading.value, typed)
    : withShownAngle(sheet, reading.value, typed)
}

function problemOf(
  sheet: Sheet,
  { id, label }: Phasor,
  part: PolarPart,
  { value, limit = 0 }: Typed,
): string | undefined {
  if (!Number.isFinite(value)) return 'That is too large to be drawn: type a smaller value.'
  if (limit < 0 || !Number.isFinite(limit)) return 'A limit is not negative: type ± and its size.'
  if (part === 'magnitude' && value < 0) {
    return 'A magnitude is not negative: type it without its sign and turn the angle by 180°.'
  }
  if (part === 'angle' && sheet.reference === id && wrapDegrees(value) !== 0) {
    return `${label} is the reference: its angle is 0° by definition. Name another reference first.`
  }
  return undefined
}

/** An angle in (−180°, 180°]; its digits stay, since 270° reads as −90°. */
function wrapped(typed: Typed): Typed {
  return { ...typed, value: wrapDegrees(typed.value) }
}
