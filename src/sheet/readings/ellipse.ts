import { degreesOfEllipse, wrapDegrees } from '../../core'
import { parseShown, resolutionOfShown } from '../digits'
import type { Channel, EllipseReading } from '../types'
import { againstOf, channelTurn } from './angle'
import type { Indication } from './observed'

/**
 * The angle from 0 to 180° that an ellipse shows, and whether it is a lead or a lag: known where its
 * tilt and the sense were noted, or where there is only one. Undefined where it is open.
 */
function settledAngle(
  { tilt, sense }: EllipseReading,
  intercept: number,
  height: number,
): { readonly sign: 1 | -1; readonly tilt: 'rising' | 'falling' } | undefined {
  const isUpright = intercept === height
  const isLine = intercept === 0
  if (tilt === undefined && !isUpright) return undefined
  if (sense === undefined && !isLine) return undefined
  return { sign: sense === 'lags' ? -1 : 1, tilt: tilt ?? 'rising' }
}

/**
 * An ellipse of one trace against another, understood: an angle where it is settled, else its sine.
 * Undefined where the intercept is above the height, as no ellipse has it.
 */
export function indicationOfEllipse(
  reading: EllipseReading,
  channel: Channel | undefined,
): Indication | undefined {
  const intercept = parseShown(reading.intercept, '')
  const height = parseShown(reading.height, '')
  if (!intercept.ok || !height.ok || height.value <= 0) return undefined
  const [across, whole] = [intercept.value, height.value]
  if (across < 0 || across > whole) return undefined
  const turn = channelTurn(channel)
  const figure = { value: across, ...resolutionOfShown(reading.intercept) }
  const settled = settledAngle(reading, across, whole)
  if (settled === undefined) {
    const sign = reading.sense === 'lags' ? -1 : 1
    return {
      ...figure,
      moves: (error) => (sign * error) / whole,
      observed: {
        kind: 'sine',
        value: (sign * across) / whole,
        ...againstOf(reading),
        either: reading.sense === undefined,
        turn: wrapDegrees(-turn),
      },
      assumed: 'degrees',
    }
  }
  const angleAt = (size: number) =>
    settled.sign * degreesOfEllipse(Math.min(Math.max(size, 0), whole), whole, settled.tilt)
  return {
    ...figure,
    moves: (error) => angleAt(across + error) - angleAt(across),
    observed: {
      kind: 'angle',
      value: wrapDegrees(angleAt(across) + turn),
      ...againstOf(reading),
    },
    assumed: 'degrees',
  }
}
