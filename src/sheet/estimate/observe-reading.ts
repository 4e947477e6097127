import type { Observable } from '../../core/estimate'
import { observedOf } from '../readings/indication'
import { limitOf } from '../readings/limit'
import type { Observed } from '../readings/observed'
import type { PhasorId, Reading } from '../types'
import type { Names } from './names'
import type { PendingObservation } from './pending'

/** What was observed, by the places of phasors; nothing where one of them is not there. */
function observableOf(
  observed: Observed,
  phasor: number,
  reference: PhasorId | undefined,
  names: Names,
): Observable | undefined {
  if (observed.kind === 'magnitude') return { kind: 'magnitude', phasor }
  if (observed.kind === 'angle' || observed.kind === 'sine') {
    const against = names.phasor.get(observed.against ?? reference ?? '')
    if (against === undefined || against === phasor) return undefined
    if (observed.kind === 'angle') return { kind: 'angle', phasor, against }
    const { either, turn } = observed
    return { kind: 'sine', phasor, against, either, turn }
  }
  const current = names.phasor.get(observed.with)
  if (current === undefined) return undefined
  const pair = { voltage: phasor, current, turn: observed.turn }
  if (observed.kind !== 'power-factor') return { kind: observed.kind, ...pair }
  const { sense } = observed
  return sense === undefined
    ? { kind: 'power-factor', ...pair }
    : { kind: 'power-factor', ...pair, sense }
}

/** Nearer to upright than this, an ellipse's tilt says nothing that its errors would not undo. */
const UPRIGHT = 0.1

/**
 * An ellipse whose tilt was noted, but not which trace leads, gives the cosine of the angle: its tilt is
 * the cosine's sign, and one drawing and its mirror are left. Nothing where it stands nearly upright.
 */
function cosineByTilt(
  { phasor, against, turn = 0 }: Observable & { kind: 'sine' },
  sine: number,
  tilt: 'rising' | 'falling' | undefined,
) {
  const size = Math.sqrt(Math.max(0, 1 - sine * sine))
  if (tilt === undefined || size < UPRIGHT) return undefined
  return {
    of: { kind: 'power-factor', voltage: phasor, current: against, turn },
    value: tilt === 'rising' ? size : -size,
    slope: Math.abs(sine) / size,
  } as const
}

/**
 * What a reading observes, with its limit and what it shares with others. Nothing where its figures
 * say nothing, where it is struck out, or where it names a phasor that is not there.
 */
export function observeReading(
  reading: Reading,
  names: Names,
  reference: PhasorId | undefined,
): PendingObservation | undefined {
  const phasor = names.phasor.get(reading.of)
  const observed = observedOf(names.sheet, reading)
  const limit = limitOf(names.sheet, reading)
  if (phasor === undefined || reading.struck === true) return undefined
  if (observed === undefined || limit === undefined) return undefined
  const of = observableOf(observed, phasor, reference, names)
  if (of === undefined) return undefined
  if (of.kind === 'sine' && reading.kind === 'ellipse' && reading.sense === undefined) {
    const byTilt = cosineByTilt(of, observed.value, reading.tilt)
    if (byTilt !== undefined) {
      const scaled = (value: number) => value * byTilt.slope
      return {
        of: byTilt.of,
        value: byTilt.value,
        source: { kind: 'reading', reading: reading.id, phasor: reading.of },
        own: limit.own.map((part) => ({ ...part, uncertainty: scaled(part.uncertainty) })),
        shared: limit.shared.map((part) => ({
          ...part,
          uncertainty: scaled(part.uncertainty),
          sensitivity: -scaled(part.sensitivity),
        })),
      }
    }
  }
  const gives = of.kind === 'magnitude' || of.kind === 'angle' ? { gives: of.kind } : {}
  return {
    of,
    value: observed.value,
    source: { kind: 'reading', reading: reading.id, phasor: reading.of },
    own: limit.own.filter(({ uncertainty }) => uncertainty > 0),
    shared: limit.shared,
    ...gives,
  }
}
