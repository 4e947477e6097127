import { resolutionOf } from '../../core'
import type { Phasor, Reading, Sheet, Typed } from '../../sheet'

/** How finely a part is known: the place value of its last digit, and the limit that it is held to. */
export interface Digits {
  readonly resolution?: number
  readonly limit?: number
  /** A size whose prefix it is printed with: 1 where it was given as a plain figure in its unit. */
  readonly like?: number
}

/** How finely a phasor is known, in its unit and in degrees. */
export interface PhasorDigits {
  readonly magnitude: Digits
  readonly angle: Digits
}

/** The readings of each phasor that are not struck. */
export type ReadingsByPhasor = ReadonlyMap<string, readonly Reading[]>

/** The readings of a sheet by phasor. */
export function readingsByPhasor(sheet: Sheet): ReadingsByPhasor {
  const found = new Map<string, Reading[]>()
  for (const reading of sheet.readings ?? []) {
    if (reading.struck) continue
    const own = found.get(reading.of)
    if (own) own.push(reading)
    else found.set(reading.of, [reading])
  }
  return found
}

/** How finely a phasor is known: as its digits were typed, or shown where they are what was shown. */
export function digitsOf(phasor: Phasor, readings: ReadingsByPhasor): PhasorDigits {
  const own = readings.get(phasor.id) ?? []
  const rectangular = coarser(ofTyped(phasor.real), ofTyped(phasor.imaginary))
  return {
    magnitude: ofReadings(own, 'magnitude') ?? ofTyped(phasor.magnitude) ?? rectangular,
    angle: ofReadings(own, 'angle') ?? ofTyped(phasor.angle) ?? {},
  }
}

/** The coarser of two; the other where one is not known. */
export function coarser(one: Digits | undefined, other: Digits | undefined): Digits {
  const first = one?.resolution
  const second = other?.resolution
  if (first === undefined || second === undefined) return one ?? other ?? {}
  return { resolution: Math.max(first, second) }
}

function ofTyped(typed: Typed | undefined): Digits | undefined {
  if (!typed) return undefined
  return {
    ...digitsIn(typed.text ?? String(typed.value)),
    ...(typed.limit !== undefined && { limit: typed.limit }),
  }
}

/** A plain figure keeps the unit that it was given in: 0.750 stays 0.750 A. */
function digitsIn(text: string): Digits {
  const resolution = resolutionOf(text)
  return {
    ...(resolution !== undefined && { resolution }),
    ...(/^[\d.,\s]+$/.test(text) && { like: 1 }),
  }
}

/** A figure that was converted, or is a mean, does not show its own digits any more. */
function ofReadings(readings: readonly Reading[], kind: 'magnitude' | 'angle'): Digits | undefined {
  const [reading, second] = readings.filter((each) => each.kind === kind)
  if (reading?.kind !== kind) return undefined
  if (second || isConverted(reading)) return {}
  return {
    ...digitsIn(String(reading.shown)),
    ...(reading.limit !== undefined && { limit: reading.limit }),
  }
}

function isConverted(reading: Reading): boolean {
  if (reading.channel !== undefined) return true
  if (reading.kind !== 'magnitude') return false
  const { turns = 1, ratio = 1, shunt = 1, form = 'rms' } = reading
  return turns !== 1 || ratio !== 1 || shunt !== 1 || form !== 'rms'
}
