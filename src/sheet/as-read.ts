import { angleOf, differenceDegrees, magnitudeOf, wrapDegrees } from '../core'
import { leadOfReading } from './readings/angle'
import { magnitudeOfReading } from './readings/magnitude'
import { referenceOf } from './reference'
import type { AngleReading, Id, MagnitudeReading, Phasor, PhasorId, Sheet } from './types'

/** The values of the phasors as typed and read, before anything is solved or adjusted. */
export interface AsRead {
  readonly reference: PhasorId | undefined
  /** By phasor; a part that is neither typed nor read is left out. Degrees in (−180, 180]. */
  readonly values: ReadonlyMap<PhasorId, KnownParts>
}

/** What is known of one phasor. */
export interface KnownParts {
  readonly magnitude?: number
  readonly angle?: number
}

/** The readings of one phasor that are used: struck ones are not. */
export interface ReadingsOfPhasor {
  readonly magnitude: readonly MagnitudeReading[]
  readonly angle: readonly AngleReading[]
}

const NO_READINGS: ReadingsOfPhasor = { magnitude: [], angle: [] }

/** The readings in use of a magnitude and of an angle, by phasor. */
export function readingsByPhasor(sheet: Sheet): ReadonlyMap<PhasorId, ReadingsOfPhasor> {
  const found = new Map<PhasorId, { magnitude: MagnitudeReading[]; angle: AngleReading[] }>()
  for (const reading of sheet.readings ?? []) {
    if (reading.struck || (reading.kind !== 'magnitude' && reading.kind !== 'angle')) continue
    let entry = found.get(reading.of)
    if (entry === undefined) {
      entry = { magnitude: [], angle: [] }
      found.set(reading.of, entry)
    }
    if (reading.kind === 'magnitude') entry.magnitude.push(reading)
    else entry.angle.push(reading)
  }
  return found
}

/** The readings in use of one phasor. */
export function readingsOf(sheet: Sheet, id: PhasorId): ReadingsOfPhasor {
  return readingsByPhasor(sheet).get(id) ?? NO_READINGS
}

/**
 * What is known of each phasor as it was typed and read. A reading wins over a typed value of the same
 * part; several readings of a part count with their mean. Angles count from the phasor that they were
 * measured against, from the reference where none is named. The angle of the reference is what was
 * typed for it, else 0; one that nobody named as the reference may also be read against another
 * phasor. Where angles were measured in a circle, the first phasor of the circle is as typed.
 */
export function asReadOf(sheet: Sheet): AsRead {
  const reference = referenceOf(sheet)
  const phasors = byId(sheet.phasors)
  const instruments = byId(sheet.instruments)
  const channels = byId(sheet.channels)
  const readings = readingsByPhasor(sheet)
  const angles = new Map<PhasorId, number | undefined>()
  const pending = new Set<PhasorId>()

  const readMagnitude = ({ id, quantity }: Phasor): number | undefined =>
    mean(
      (readings.get(id)?.magnitude ?? []).map((reading) =>
        magnitudeOfReading(reading, quantity, channels.get(reading.channel ?? '')),
      ),
    )

  const readAngle = ({ id }: Phasor): number | undefined =>
    meanAngle(
      (readings.get(id)?.angle ?? []).map((reading) => {
        const from = angleOfPhasor(reading.against ?? reference)
        const lead = leadOfReading(
          reading,
          instruments.get(reading.instrument ?? ''),
          channels.get(reading.channel ?? ''),
        )
        return from === undefined || lead === undefined ? undefined : from + lead
      }),
    )

  const angleOfPhasor = (id: PhasorId | undefined): number | undefined => {
    const phasor = phasors.get(id ?? '')
    if (phasor === undefined || pending.has(phasor.id)) return undefined
    if (angles.has(phasor.id)) return angles.get(phasor.id)
    pending.add(phasor.id)
    const angle = readAngle(phasor) ?? typedAngle(phasor)
    pending.delete(phasor.id)
    angles.set(phasor.id, angle)
    return angle
  }

  const origin = phasors.get(reference ?? '')
  if (origin !== undefined) {
    const named = sheet.reference !== undefined
    const angle = typedAngle(origin) ?? (named ? undefined : angleOfPhasor(origin.id)) ?? 0
    angles.clear()
    angles.set(origin.id, angle)
  }
  const values = new Map<PhasorId, KnownParts>()
  for (const phasor of sheet.phasors) {
    const magnitude = readMagnitude(phasor) ?? typedMagnitude(phasor)
    const angle = angleOfPhasor(phasor.id)
    values.set(phasor.id, {
      ...(magnitude === undefined ? {} : { magnitude }),
      ...(angle === undefined ? {} : { angle: wrapDegrees(angle) }),
    })
  }
  return { reference, values }
}

function byId<Part extends { readonly id: Id }>(
  parts: readonly Part[] = [],
): ReadonlyMap<Id, Part> {
  return new Map(parts.map((part) => [part.id, part]))
}

/** The magnitude as typed, in polar or rectangular form. */
export function typedMagnitude({ magnitude, real, imaginary }: Phasor): number | undefined {
  if (magnitude !== undefined) return magnitude.value
  if (real === undefined || imaginary === undefined) return undefined
  const value = magnitudeOf({ re: real.value, im: imaginary.value })
  return Number.isFinite(value) ? value : undefined
}

/** The angle as typed, in polar or rectangular form; the angle of a rectangular zero is open. */
export function typedAngle({ angle, real, imaginary }: Phasor): number | undefined {
  if (angle !== undefined) return angle.value
  if (real === undefined || imaginary === undefined) return undefined
  if (real.value === 0 && imaginary.value === 0) return undefined
  return angleOf({ re: real.value, im: imaginary.value })
}

function mean(values: readonly (number | undefined)[]): number | undefined {
  const known = values.filter((value) => value !== undefined)
  if (known.length === 0) return undefined
  return known.reduce((sum, value) => sum + value / known.length, 0)
}

/** The mean of angles that lie on both sides of ±180°: that of their differences from the first. */
function meanAngle(values: readonly (number | undefined)[]): number | undefined {
  const [first, ...others] = values.filter((value) => value !== undefined)
  if (first === undefined) return undefined
  const differences = others.map((value) => differenceDegrees(value, first))
  return first + (mean([0, ...differences]) ?? 0)
}
