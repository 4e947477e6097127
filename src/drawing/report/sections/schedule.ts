import { formatAngle, formatEstimate, formatQuantity, unitOf } from '../../../core'
import type { Phasor, PhasorEvaluation } from '../../../sheet'
import { digitsOf, type ReadingsByPhasor, readingsByPhasor } from '../../text/resolution'
import { heading, note } from '../blocks'
import type { Cell } from '../columns'
import { cell, labelCell, NOTHING } from '../names'
import type { Section } from '../section'
import { table } from '../table'

const BEST_VALUES =
  'Best values are those that fit all readings together; ± is their expanded uncertainty, coverage 95 %.'

/** Every phasor: as read or typed, and its best value with its limits. */
export const schedule: Section = {
  name: 'schedule',
  blocks: ({ sheet, evaluation, width }) => {
    if (sheet.phasors.length === 0) return []
    const readings = readingsByPhasor(sheet)
    const found = new Map(evaluation.phasors.map((phasor) => [phasor.id, phasor]))
    const hasTerminals = sheet.phasors.some(({ from, to }) => from ?? to)
    const rows = sheet.phasors.map((phasor) => {
      const [label, ...rest] = rowOf(phasor, found.get(phasor.id), readings)
      const terminals = hasTerminals ? [cell(terminalsOf(phasor))] : []
      return [label ?? NOTHING, ...terminals, ...rest]
    })
    return [
      heading('Schedule of phasors', width),
      ...table(
        [
          { title: 'Phasor' },
          ...(hasTerminals ? [{ title: 'From – to' }] : []),
          { title: 'As read, rms', align: 'end' as const },
          { title: 'Angle', align: 'end' as const },
          { title: 'Best value', align: 'end' as const },
          { title: 'Best angle', align: 'end' as const },
          { title: 'State' },
        ],
        rows,
        width,
      ),
      note(BEST_VALUES, width),
    ]
  },
}

function rowOf(
  phasor: Phasor,
  found: PhasorEvaluation | undefined,
  readings: ReadingsByPhasor,
): readonly Cell[] {
  const digits = digitsOf(phasor, readings)
  const unit = unitOf(phasor.quantity)
  const { magnitude, angle } = found?.asRead ?? {}
  return [
    labelCell(phasor.label),
    cell(magnitude === undefined ? undefined : formatQuantity(magnitude, unit, digits.magnitude)),
    cell(angle === undefined ? undefined : formatAngle(angle, digits.angle)),
    cell(bestOf(found?.magnitude, found?.magnitudeLimit, unit)),
    cell(bestOf(found?.angle, found?.angleLimit, '°')),
    cell(found && stateOf(found)),
  ]
}

/** A best value is one that has a limit: what was merely read stands under "as read". */
function bestOf(
  value: number | undefined,
  limit: number | undefined,
  unit: string,
): string | undefined {
  return value === undefined || limit === undefined ? undefined : formatEstimate(value, limit, unit)
}

function stateOf({ magnitudeState, angleState }: PhasorEvaluation): string {
  return magnitudeState === angleState
    ? magnitudeState
    : `size ${magnitudeState}, angle ${angleState}`
}

function terminalsOf({ from = '', to = '' }: Phasor): string {
  return from === '' && to === '' ? '' : `${from || '?'} – ${to || '?'}`
}
