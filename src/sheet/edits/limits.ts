import { absoluteLimit, failure, type Limit, type Result, success } from '../../core'
import { asReadOf, readingsOf } from '../as-read'
import type { Phasor, PhasorId, Sheet } from '../types'
import { entryOf, withReplaced } from './lists'
import { isRead } from './parts'
import { isDirect, onlyReading, type PolarPart, refuseIndirect, withReadLimit } from './read-parts'

/**
 * The sheet with another limit for a part of a phasor, `whole` meaning its magnitude: of the reading
 * where it was read, else of what was typed. A percentage is of the part's value.
 */
export function withLimit(
  sheet: Sheet,
  id: PhasorId,
  part: PolarPart | 'real' | 'imaginary' | 'whole',
  limit: Limit,
): Result<Sheet> {
  const found = entryOf(sheet, 'phasors', id)
  if (!found.ok) return found
  const phasor = found.value
  const named = part === 'whole' ? 'magnitude' : part
  if (named === 'real' || named === 'imaginary' || !isRead(sheet, phasor, named)) {
    return withTypedLimit(sheet, phasor, named, limit)
  }
  const reading = onlyReading(readingsOf(sheet, id), named, phasor)
  if (!reading.ok) return reading
  if (!isDirect(reading.value)) return refuseIndirect(sheet, reading.value)
  const value = asReadOf(sheet).values.get(id)?.[named] ?? 0
  return success(withReadLimit(sheet, reading.value, absoluteLimit(limit, value)))
}

function withTypedLimit(
  sheet: Sheet,
  phasor: Phasor,
  part: PolarPart | 'real' | 'imaginary',
  limit: Limit,
): Result<Sheet> {
  const typed = phasor[part]
  if (typed !== undefined) {
    const limited = { ...typed, limit: absoluteLimit(limit, typed.value) }
    return success(withReplaced(sheet, 'phasors', { ...phasor, [part]: limited }))
  }
  const { label } = phasor
  if (phasor.real !== undefined) {
    return failure(`${label} is typed as real and imaginary part: state the limits of those.`)
  }
  return phasor.magnitude !== undefined || phasor.angle !== undefined
    ? failure(`${label} is typed as magnitude and angle: state the limits of those.`)
    : failure(`Type the value of ${label} first, then its limit.`)
}
