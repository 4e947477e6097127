import { formatNumber, formatQuantity } from '../../core'
import { asReadOf } from '../as-read'
import { parseShown } from '../digits'
import { labelOf } from '../names'
import { indicationOf } from '../readings/indication'
import { limitOf } from '../readings/limit'
import { isMagnitudeOf } from '../readings/magnitude'
import type { PhasorId, PowerReading, Reading, Sheet } from '../types'
import type { Remark } from './remark'

/** Figures that cannot be, in words. */
export function nonsenseRemarks(sheet: Sheet, reading: Reading): readonly Remark[] {
  const text = nonsenseIn(sheet, reading)
  const repeats = repeatsProblem(reading)
  return [text, repeats].flatMap((each) =>
    each === undefined ? [] : [{ about: reading.id, text: each }],
  )
}

function nonsenseIn(sheet: Sheet, reading: Reading): string | undefined {
  switch (reading.kind) {
    case 'shift': {
      const [shift, period] = [parseShown(reading.shift, 's'), parseShown(reading.period, 's')]
      if (!shift.ok || !period.ok || shift.value <= period.value) return undefined
      return `The shift of ${reading.shift} is longer than the period of ${reading.period}: a trace is never more than one period behind. Check which figure is which.`
    }
    case 'ellipse': {
      const [across, whole] = [parseShown(reading.intercept, ''), parseShown(reading.height, '')]
      if (!across.ok || !whole.ok || across.value <= whole.value) return undefined
      return `The intercept of ${reading.intercept} is above the height of ${reading.height}: no ellipse is wider at its middle than as a whole. Check which figure is which, and that both are full widths.`
    }
    case 'power':
    case 'reactive-power':
      return powerAboveApparent(sheet, reading)
    case 'magnitude':
    case 'angle':
    case 'power-factor':
      return undefined
  }
}

/** More power than voltage times current, beyond what the limits of all three allow. */
function powerAboveApparent(sheet: Sheet, reading: PowerReading): string | undefined {
  const indication = indicationOf(sheet, reading)
  const { values } = asReadOf(sheet)
  const voltage = values.get(reading.of)?.magnitude
  const current = values.get(reading.with)?.magnitude
  if (indication === undefined || voltage === undefined || current === undefined) return undefined
  const power = Math.abs(indication.observed.value)
  const most =
    (voltage + magnitudeLimit(sheet, reading.of)) * (current + magnitudeLimit(sheet, reading.with))
  if (power - (limitOf(sheet, reading)?.limit ?? 0) <= most) return undefined
  const unit = reading.kind === 'power' ? 'W' : 'var'
  const [size, apparent] = [
    formatQuantity(power, unit, { digits: 4 }),
    formatQuantity(voltage * current, 'VA', { digits: 4 }),
  ]
  return `${size} is more than ${labelOf(sheet, reading.of)} times ${labelOf(sheet, reading.with)}, which is ${apparent}: there cannot be more. Check ratios, turns and decimal points.`
}

/** How far off a magnitude may be: by its readings, else as typed, else as assumed. */
function magnitudeLimit(sheet: Sheet, id: PhasorId): number {
  const limits = (sheet.readings ?? [])
    .filter((reading) => isMagnitudeOf(reading, id))
    .map((reading) => limitOf(sheet, reading)?.limit ?? 0)
  if (limits.length > 0) return Math.max(...limits)
  const phasor = sheet.phasors.find((other) => other.id === id)
  const size = asReadOf(sheet).values.get(id)?.magnitude ?? 0
  const stated = phasor?.magnitude?.limit
  return stated ?? (size * (sheet.assumed?.percent ?? 1)) / 100
}

/** What is shown is the mean of the repeats. */
function repeatsProblem(reading: Reading): string | undefined {
  const { repeats = [] } = reading
  if (repeats.length === 0) return undefined
  const shown =
    'shown' in reading
      ? reading.shown
      : reading.kind === 'shift'
        ? reading.shift
        : reading.intercept
  const value = parseShown(shown, unitOfRepeats(reading))
  const mean = repeats.reduce((sum, repeat) => sum + repeat / repeats.length, 0)
  const [least, most] = [Math.min(...repeats), Math.max(...repeats)]
  if (!value.ok || (value.value >= least && value.value <= most)) return undefined
  return `${shown} is not the mean of the ${repeats.length} repeats, which is ${formatNumber(mean, 4)}: correct one or the other.`
}

function unitOfRepeats(reading: Reading): string {
  if (reading.kind === 'angle') return '°'
  if (reading.kind === 'shift') return 's'
  if (reading.kind === 'power') return 'W'
  return reading.kind === 'reactive-power' ? 'var' : ''
}
