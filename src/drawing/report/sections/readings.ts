import { formatNumber, formatQuantity, unitOf } from '../../../core'
import {
  type Evaluation,
  formulasOf,
  labelOf,
  type Move,
  movesOf,
  type Reading,
  readingText,
  type Sheet,
  wordsOf,
} from '../../../sheet'
import { heading, note } from '../blocks'
import type { Column } from '../columns'
import { cell, labelCell, phasorOf } from '../names'
import type { Section } from '../section'
import { table } from '../table'

/** Every reading as its display showed it, what that comes to, and how far the best values moved it. */
export const readings: Section = {
  name: 'readings',
  blocks: ({ sheet, evaluation, width }) => {
    const all = sheet.readings ?? []
    if (all.length === 0) return []
    const moves = new Map(movesOf(sheet, evaluation).map((move) => [move.reading, move]))
    const hasMoves = evaluation.agreement !== undefined
    const hasMeter = all.some(({ instrument }) => instrument !== undefined)
    const columns: readonly Column[] = [
      { title: 'No.', align: 'end' },
      { title: 'Of' },
      { title: 'As shown' },
      { title: 'Comes to' },
      ...(hasMeter ? [{ title: 'With' }] : []),
      ...(hasMoves ? [{ title: 'Best less read', align: 'end' as const }] : []),
    ]
    const rows = all.map((reading, at) => [
      cell(String(at + 1)),
      labelCell(labelOf(sheet, reading.of)),
      cell(shownText(sheet, reading)),
      cell(reading.struck ? 'Struck: kept, not used' : comesTo(sheet, reading)),
      ...(hasMeter ? [cell(meterOf(sheet, reading))] : []),
      ...(hasMoves ? [cell(moveText(moves.get(reading.id)))] : []),
    ])
    return [
      heading('Readings as shown, and what they come to', width),
      ...table(columns, rows, width),
      ...notesOn(sheet, evaluation).map((text) => note(text, width)),
    ]
  },
}

const UNITS: { readonly [kind in Reading['kind']]: string } = {
  magnitude: '',
  angle: '°',
  shift: '',
  ellipse: '',
  power: ' W',
  'reactive-power': ' var',
  'power-factor': '',
}

const NAMES: { readonly [kind in Reading['kind']]: string } = {
  magnitude: '',
  angle: '',
  shift: 'shift ',
  ellipse: 'ellipse ',
  power: '',
  'reactive-power': '',
  'power-factor': 'cos φ ',
}

/** What the display showed, with the unit where the digits do not say it. */
function shownText(sheet: Sheet, reading: Reading): string {
  const text = readingText(reading)
  const shown = 'shown' in reading ? String(reading.shown) : ''
  const isBare = /\d\.?$/.test(shown)
  const figure = `${shown}${isBare ? unitOfReading(sheet, reading) : ''}`.replace(/^-/, '−')
  const whole = shown === '' ? text : `${figure}${text.slice(shown.length)}`
  return `${NAMES[reading.kind]}${whole}${besides(sheet, reading)}`
}

function unitOfReading(sheet: Sheet, reading: Reading): string {
  if (reading.kind !== 'magnitude') return UNITS[reading.kind]
  const quantity = phasorOf(sheet, reading.of)?.quantity ?? 'other'
  const unit = reading.shunt === undefined ? unitOf(quantity) : 'V'
  return unit === '' ? '' : ` ${unit}`
}

/** What it was taken against or with, and how often. */
function besides(sheet: Sheet, reading: Reading): string {
  const other =
    'with' in reading
      ? `, with ${labelOf(sheet, reading.with)}`
      : 'against' in reading && reading.against !== undefined
        ? `, against ${labelOf(sheet, reading.against)}`
        : ''
  const { repeats = [], pass } = reading
  const mean = repeats.length > 1 ? `, mean of ${repeats.length}` : ''
  return `${other}${mean}${pass === undefined ? '' : `, pass ${pass}`}`
}

/** What it comes to alone: how it was taken stands in the column before. */
function comesTo(sheet: Sheet, reading: Reading): string {
  const words = wordsOf(sheet, reading)
  const at = words.lastIndexOf(' shown')
  const colon = at < 0 ? -1 : words.indexOf(': ', at)
  return colon < 0 ? words : words.slice(colon + 2)
}

function meterOf(sheet: Sheet, { instrument, channel }: Reading): string {
  const meters = sheet.instruments ?? []
  const at = meters.findIndex(({ id }) => id === instrument)
  const own = (sheet.channels ?? []).find(({ id }) => id === channel)
  return [...(at < 0 ? [] : [meters[at]?.name ?? '']), ...(own ? [own.label ?? own.id] : [])].join(
    ', ',
  )
}

/** To two digits of what its limit is, so that no figure looks surer than it is. */
function moveText(move: Move | undefined): string | undefined {
  if (move === undefined) return undefined
  const { moved, unit, share } = move
  const limit = share === undefined || share === 0 ? undefined : Math.abs(moved) / share
  if (Math.abs(moved) < 1e-9 * (limit ?? 1)) return 'not moved'
  const text = formatQuantity(moved, unit, limit === undefined ? { digits: 2 } : { limit })
  const size = moved > 0 && !/^[0.]+(\s|°|$)/.test(text) ? `+${text}` : text
  return share === undefined ? size : `${size}; ${formatNumber(100 * share, 0)} %`
}

/** The formulas that were used, each once, and how the last column is to be read. */
function notesOn(sheet: Sheet, evaluation: Evaluation): readonly string[] {
  const used = (sheet.readings ?? []).flatMap((reading) => formulasOf(sheet, reading))
  const formulas = [...new Set(used)]
  return [
    ...(evaluation.agreement === undefined
      ? []
      : ['Best less read: in the unit of the reading, and as a share of its limit.']),
    ...(formulas.length === 0 ? [] : [`Formulas used: ${formulas.join('; ')}.`]),
  ]
}
