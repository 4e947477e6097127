import { cosDegrees, differenceDegrees, sinDegrees, unitOf } from '../core'
import type { Evaluation, PhasorEvaluation } from './evaluation'
import { observedOf } from './readings/indication'
import { limitOf } from './readings/limit'
import type { Observed } from './readings/observed'
import { referenceOf } from './reference'
import type { Id, PhasorId, Reading, Sheet } from './types'

/** How far the best values are from what a reading came to. */
export interface Move {
  readonly reading: Id
  /** Best less read, in `unit`. */
  readonly moved: number
  /** That of the reading's quantity: V, A, °, W, var; empty for a bare figure. */
  readonly unit: string
  /** The size of the move as a share of the reading's limit; undefined where that is 0 or unknown. */
  readonly share?: number
}

/**
 * How far each reading of a sheet moved to its best value, in the reading's own unit, in the sheet's
 * order. Readings that are struck, that say nothing, or whose best value is open are left out.
 */
export function movesOf(sheet: Sheet, evaluation: Evaluation): readonly Move[] {
  const phasors = new Map(evaluation.phasors.map((phasor) => [phasor.id, phasor]))
  return (sheet.readings ?? []).flatMap((reading) => {
    const observed = reading.struck ? undefined : observedOf(sheet, reading)
    const moved = observed && moveOf(sheet, reading, observed, phasors)
    if (observed === undefined || moved === undefined || !Number.isFinite(moved)) return []
    const limit = limitOf(sheet, reading)?.limit
    const share = limit === undefined || limit === 0 ? undefined : Math.abs(moved) / limit
    return [
      {
        reading: reading.id,
        moved,
        unit: unitOfMove(sheet, reading, observed),
        ...(share === undefined ? {} : { share }),
      },
    ]
  })
}

function unitOfMove(sheet: Sheet, { kind, of }: Reading, observed: Observed): string {
  switch (kind) {
    case 'magnitude':
      return unitOf(sheet.phasors.find(({ id }) => id === of)?.quantity ?? 'other')
    case 'power':
      return 'W'
    case 'reactive-power':
      return 'var'
    case 'power-factor':
      return ''
    case 'angle':
    case 'shift':
      return '°'
    case 'ellipse':
      return observed.kind === 'sine' ? '' : '°'
  }
}

type Phasors = ReadonlyMap<PhasorId, PhasorEvaluation>

function moveOf(
  sheet: Sheet,
  { of }: Reading,
  observed: Observed,
  phasors: Phasors,
): number | undefined {
  const best = phasors.get(of)
  switch (observed.kind) {
    case 'magnitude':
      return best?.magnitude === undefined ? undefined : best.magnitude - observed.value
    case 'angle': {
      const lead = leadOver(sheet, of, observed.against, phasors)
      return lead === undefined ? undefined : differenceDegrees(lead, observed.value)
    }
    case 'sine': {
      const lead = leadOver(sheet, of, observed.against, phasors)
      return lead === undefined ? undefined : moveOfSine(lead + observed.turn, observed)
    }
    case 'power':
    case 'reactive-power':
    case 'power-factor':
      return moveOfPower(of, observed, phasors)
  }
}

/** By how many degrees a phasor's best angle leads another's. */
function leadOver(
  sheet: Sheet,
  of: PhasorId,
  against: PhasorId | undefined,
  phasors: Phasors,
): number | undefined {
  const angle = phasors.get(of)?.angle
  const from = against ?? referenceOf(sheet)
  const other = from === of ? 0 : phasors.get(from ?? '')?.angle
  return angle === undefined || other === undefined ? undefined : differenceDegrees(angle, other)
}

/** As a bare figure, like the limit of a reading whose angle is open. */
function moveOfSine(lead: number, { value, either }: Extract<Observed, { kind: 'sine' }>): number {
  const move = sinDegrees(lead) - value
  const other = -sinDegrees(lead) - value
  return either && Math.abs(other) < Math.abs(move) ? other : move
}

function moveOfPower(
  of: PhasorId,
  observed: Extract<Observed, { with: PhasorId }>,
  phasors: Phasors,
): number | undefined {
  const [voltage, current] = [phasors.get(of), phasors.get(observed.with)]
  if (voltage?.angle === undefined || current?.angle === undefined) return undefined
  const apart = differenceDegrees(voltage.angle, current.angle) + observed.turn
  if (observed.kind === 'power-factor') return cosDegrees(apart) - observed.value
  if (voltage.magnitude === undefined || current.magnitude === undefined) return undefined
  const apparent = voltage.magnitude * current.magnitude
  const share = observed.kind === 'power' ? cosDegrees(apart) : sinDegrees(apart)
  return apparent * share - observed.value
}
