import { angleOf, differenceDegrees, magnitudeOf, wrapDegrees } from '../core'
import { indicationOf } from './readings/indication'
import { type Lead, leadOf } from './readings/lead'
import { referenceOf } from './reference'
import { indexOf } from './sheet-index'
import type {
  AngleReading,
  EllipseReading,
  MagnitudeReading,
  Phasor,
  PhasorId,
  PowerFactorReading,
  Reading,
  Sheet,
  ShiftReading,
} from './types'

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

/** A reading that may settle an angle by itself. */
export type AngleLikeReading = AngleReading | ShiftReading | EllipseReading | PowerFactorReading

/** The readings of one phasor that are used: struck ones are not. */
export interface ReadingsOfPhasor {
  readonly magnitude: readonly MagnitudeReading[]
  /** Those that settle its angle: each alone says how far it leads another. */
  readonly angle: readonly AngleLikeReading[]
}

const NO_READINGS: ReadingsOfPhasor = { magnitude: [], angle: [] }

/** The readings in use of a magnitude and of an angle, by phasor. */
export function readingsByPhasor(sheet: Sheet): ReadonlyMap<PhasorId, ReadingsOfPhasor> {
  const found = new Map<PhasorId, { magnitude: MagnitudeReading[]; angle: AngleLikeReading[] }>()
  for (const reading of sheet.readings ?? []) {
    if (reading.struck || !isOfOnePhasor(reading)) continue
    let entry = found.get(reading.of)
    if (entry === undefined) {
      entry = { magnitude: [], angle: [] }
      found.set(reading.of, entry)
    }
    if (reading.kind === 'magnitude') entry.magnitude.push(reading)
    else if (reading.kind === 'angle' || leadOf(sheet, reading)) entry.angle.push(reading)
  }
  return found
}

function isOfOnePhasor(reading: Reading): reading is MagnitudeReading | AngleLikeReading {
  return reading.kind !== 'power' && reading.kind !== 'reactive-power'
}

/** The readings in use of one phasor. */
export function readingsOf(sheet: Sheet, id: PhasorId): ReadingsOfPhasor {
  return readingsByPhasor(sheet).get(id) ?? NO_READINGS
}

const answers = new WeakMap<Sheet, AsRead>()

/**
 * What is known of each phasor as it was typed and read. A reading wins over a typed value of the same
 * part; several readings of a part count with their mean. Angles count from the phasor that they were
 * measured against, from the reference where none is named. The angle of the reference is what was
 * typed for it, else 0; one that nobody named as the reference may also be read against another
 * phasor. Where angles were measured in a circle, the first phasor of the circle is as typed. A phasor
 * that nothing was read of, but which another was measured against, is as far behind as that one leads.
 */
export function asReadOf(sheet: Sheet): AsRead {
  const known = answers.get(sheet)
  if (known !== undefined) return known
  const answer = computeAsRead(sheet)
  answers.set(sheet, answer)
  return answer
}

function computeAsRead(sheet: Sheet): AsRead {
  const reference = referenceOf(sheet)
  const { phasors } = indexOf(sheet)
  const readings = readingsByPhasor(sheet)
  if (readings.size === 0) return { reference, values: typedValues(sheet, reference) }
  const angles = anglesOf(sheet, reference, readings)
  const readMagnitude = ({ id }: Phasor): number | undefined => {
    const own = readings.get(id)?.magnitude ?? []
    if (own.length === 0) return undefined
    return mean(own.map((reading) => indicationOf(sheet, reading)?.observed.value))
  }
  const values = new Map<PhasorId, KnownParts>()
  for (const phasor of phasors.values()) {
    const magnitude = readMagnitude(phasor) ?? typedMagnitude(phasor)
    const angle = angles.get(phasor.id)
    values.set(phasor.id, partsOf(magnitude, angle))
  }
  return { reference, values }
}

const typedParts = new WeakMap<Phasor, KnownParts>()

/** Where nothing was read, each phasor is as typed: one that did not change is not looked at again. */
function typedValues(
  sheet: Sheet,
  reference: PhasorId | undefined,
): ReadonlyMap<PhasorId, KnownParts> {
  const values = new Map<PhasorId, KnownParts>()
  for (const phasor of sheet.phasors) {
    let known = typedParts.get(phasor)
    if (known === undefined) {
      known = partsOf(typedMagnitude(phasor), typedAngle(phasor))
      typedParts.set(phasor, known)
    }
    const isOpenReference = phasor.id === reference && known.angle === undefined
    values.set(phasor.id, isOpenReference ? { ...known, angle: 0 } : known)
  }
  return values
}

function partsOf(magnitude: number | undefined, angle: number | undefined): KnownParts {
  return {
    ...(magnitude === undefined ? {} : { magnitude }),
    ...(angle === undefined ? {} : { angle: wrapDegrees(angle) }),
  }
}

function anglesOf(
  sheet: Sheet,
  reference: PhasorId | undefined,
  readings: ReadonlyMap<PhasorId, ReadingsOfPhasor>,
): ReadonlyMap<PhasorId, number | undefined> {
  const { phasors } = indexOf(sheet)
  const angles = new Map<PhasorId, number | undefined>()
  const pending = new Set<PhasorId>()
  const leads: Lead[] = []

  const leadsOf = (id: PhasorId): readonly Lead[] => {
    const own = readings.get(id)?.angle ?? []
    return own.length === 0 ? [] : own.flatMap((reading) => leadOf(sheet, reading) ?? [])
  }

  const readAngle = ({ id }: Phasor): number | undefined => {
    const own = leadsOf(id)
    if (own.length === 0) return undefined
    leads.push(...own)
    return meanAngle(
      own.map(({ against, degrees }) => {
        const from = angleOfPhasor(against ?? reference)
        return from === undefined ? undefined : from + degrees
      }),
    )
  }

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
    leads.length = 0
    leads.push(...leadsOf(origin.id))
    angles.set(origin.id, angle)
  }
  for (const id of phasors.keys()) angleOfPhasor(id)
  followBackwards(angles, leads, reference)
  return angles
}

/** Settles phasors from what was measured against them, one after the other, until nothing is left. */
function followBackwards(
  angles: Map<PhasorId, number | undefined>,
  leads: readonly Lead[],
  reference: PhasorId | undefined,
): void {
  for (let settled = true; settled; ) {
    settled = false
    for (const { of, against = reference ?? '', degrees } of leads) {
      const [own, other] = [angles.get(of), angles.get(against)]
      if ((own === undefined) === (other === undefined) || !angles.has(against)) continue
      if (own !== undefined) angles.set(against, wrapDegrees(own - degrees))
      else angles.set(of, wrapDegrees((other ?? 0) + degrees))
      settled = true
    }
  }
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
  let sum = 0
  let count = 0
  for (const value of values) {
    if (value === undefined) continue
    sum += value
    count += 1
  }
  if (count < 2) return count === 0 ? undefined : sum
  return Number.isFinite(sum) ? sum / count : undefined
}

/** The mean of angles that lie on both sides of ±180°: that of their differences from the first. */
function meanAngle(values: readonly (number | undefined)[]): number | undefined {
  const first = values.find((value) => value !== undefined)
  if (first === undefined || values.length === 1) return first
  const apart = values.map((value) =>
    value === undefined ? undefined : differenceDegrees(value, first),
  )
  return first + (mean(apart) ?? 0)
}
