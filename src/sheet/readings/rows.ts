import { failure, parseCell, type Result, success } from '../../core'
import type { Change } from '../edits/change'
import { newId } from '../new-id'
import { quantityOfCell } from '../rows'
import type { Id, Phasor, Reading, Sheet } from '../types'
import { createReading } from './create'
import { parseReadingText, readingText } from './text'

/** What rows of a spreadsheet come to: what can be added, and what could not be read, row by row. */
export interface ReadingRows {
  /** Phasors that the rows name and the sheet does not have yet. */
  readonly phasors: readonly Phasor[]
  readonly readings: readonly Reading[]
  /** Whole sentences, each naming its row as the spreadsheet counts it. */
  readonly problems: readonly string[]
}

/** The columns of readings, in their usual order. */
export const READING_COLUMNS = [
  'phasor',
  'kind',
  'shown',
  'against',
  'instrument',
  'range',
  'limit',
  'pass',
  'repeats',
  'channel',
  'current channel',
  'struck',
] as const

type Column = (typeof READING_COLUMNS)[number]

const KINDS: { readonly [word: string]: Reading['kind'] } = {
  magnitude: 'magnitude',
  rms: 'magnitude',
  value: 'magnitude',
  angle: 'angle',
  phase: 'angle',
  shift: 'shift',
  'time shift': 'shift',
  ellipse: 'ellipse',
  power: 'power',
  watts: 'power',
  'reactive-power': 'reactive-power',
  'reactive power': 'reactive-power',
  var: 'reactive-power',
  'power-factor': 'power-factor',
  'power factor': 'power-factor',
  pf: 'power-factor',
}

/**
 * Reads rows of text cells as readings. A first row that names columns settles their order; without one
 * they are in their usual order, and where the second cell names no kind of reading the kind is that of
 * the figure: degrees or a lead make an angle, watts a power. Phasors, instruments and channels go by
 * their label or id; a phasor that is not there yet is added. Empty rows are passed over.
 */
export function readReadingRows(sheet: Sheet, table: readonly (readonly string[])[]): ReadingRows {
  const header = headerOf(table[0] ?? [])
  let room = sheet
  const phasors: Phasor[] = []
  const readings: Reading[] = []
  const problems: string[] = []
  table.forEach((cells, index) => {
    if ((index === 0 && header) || cells.every((cell) => cell.trim() === '')) return
    const row = readRow(room, cellsOf(cells, header))
    if (!row.ok) {
      problems.push(`Row ${index + 1}: ${row.problem}`)
      return
    }
    phasors.push(...row.value.phasors)
    readings.push(row.value.reading)
    room = {
      ...room,
      phasors: [...room.phasors, ...row.value.phasors],
      readings: [...(room.readings ?? []), row.value.reading],
    }
  })
  return { phasors, readings, problems }
}

/** The readings as rows for a spreadsheet, the first naming the columns; `readReadingRows` takes them back. */
export function readingTable(sheet: Sheet): readonly (readonly string[])[] {
  return [
    [...READING_COLUMNS],
    ...(sheet.readings ?? []).map((reading) => {
      const cells = toCells(reading)
      return READING_COLUMNS.map((column) => cells[column] ?? '')
    }),
  ]
}

type Cells = { readonly [column in Column]?: string }

function toCells(reading: Reading): Cells {
  const other =
    'with' in reading ? reading.with : 'against' in reading ? reading.against : undefined
  const current = 'currentChannel' in reading ? reading.currentChannel : undefined
  return {
    phasor: reading.of,
    kind: reading.kind,
    shown: readingText(reading),
    ...(other === undefined ? {} : { against: other }),
    ...(reading.instrument === undefined ? {} : { instrument: reading.instrument }),
    ...(reading.range === undefined ? {} : { range: String(reading.range) }),
    ...(reading.limit === undefined ? {} : { limit: String(reading.limit) }),
    ...(reading.pass === undefined ? {} : { pass: reading.pass }),
    ...(reading.repeats === undefined ? {} : { repeats: reading.repeats.join(' ') }),
    ...(reading.channel === undefined ? {} : { channel: reading.channel }),
    ...(current === undefined ? {} : { 'current channel': current }),
    ...(reading.struck === undefined ? {} : { struck: reading.struck ? 'struck' : 'used' }),
  }
}

function headerOf(cells: readonly string[]): readonly (Column | undefined)[] | undefined {
  const columns = cells.map((cell) =>
    READING_COLUMNS.find((column) => column === cell.trim().toLowerCase()),
  )
  return columns.includes('phasor') && columns.includes('shown') ? columns : undefined
}

function cellsOf(
  cells: readonly string[],
  header: readonly (Column | undefined)[] | undefined,
): Cells {
  const isShort = header === undefined && KINDS[(cells[1] ?? '').trim().toLowerCase()] === undefined
  const columns =
    header ?? (isShort ? READING_COLUMNS.filter((name) => name !== 'kind') : READING_COLUMNS)
  return Object.fromEntries(
    columns.flatMap((column, index) => {
      const text = cells[index]?.trim() ?? ''
      return column === undefined || text === '' ? [] : [[column, text]]
    }),
  )
}

function readRow(
  sheet: Sheet,
  cells: Cells,
): Result<{ readonly phasors: readonly Phasor[]; readonly reading: Reading }> {
  const { phasor: named, shown } = cells
  if (named === undefined) return failure('it names no phasor. Say what was read, such as V1.')
  if (shown === undefined) return failure('nothing was shown. Type what the display showed.')
  const kind = cells.kind === undefined ? kindOf(shown) : KINDS[cells.kind.toLowerCase()]
  if (kind === undefined) {
    return failure(
      `“${cells.kind}” is no kind of reading. Use magnitude, angle, shift, ellipse, power, reactive-power or power-factor.`,
    )
  }
  const known = idOf(sheet.phasors, named)
  const added = known === undefined ? newPhasor(sheet, named, kind, shown) : undefined
  if (added !== undefined && !added.ok) return added
  const phasors = added?.ok ? [added.value] : []
  const phasor = added?.ok ? added.value : sheet.phasors.find(({ id }) => id === known)
  const figures = parseReadingText(kind, shown, phasor?.quantity ?? 'other')
  if (!figures.ok) return figures
  const other = namedId(sheet.phasors, cells.against, 'phasor')
  if (!other.ok) return other
  const taken = takenIn(sheet, cells)
  if (!taken.ok) return taken
  const isPower = kind === 'power' || kind === 'reactive-power' || kind === 'power-factor'
  if (isPower && other.value === undefined) {
    return failure(`a ${kind.replace('-', ' ')} needs the current too. Name it under "against".`)
  }
  const subject = {
    id: newId({ ...sheet, phasors: [...sheet.phasors, ...phasors] }, 'r1'),
    of: phasor?.id ?? named,
    kind,
    ...(other.value === undefined
      ? {}
      : isPower
        ? { with: other.value }
        : { against: other.value }),
  }
  return success({ phasors, reading: createReading(subject, figures.value, taken.value) })
}

/** The kind that a figure alone says. */
function kindOf(shown: string): Reading['kind'] {
  if (/\bof\b/i.test(shown)) return /rising|falling/i.test(shown) ? 'ellipse' : 'shift'
  if (/°|deg|rad\b|lead|lag/i.test(shown)) return 'angle'
  if (/[\dkM\s]W\b/.test(shown)) return 'power'
  return /var/i.test(shown) ? 'reactive-power' : 'magnitude'
}

function newPhasor(
  sheet: Sheet,
  label: string,
  kind: Reading['kind'],
  shown: string,
): Result<Phasor> {
  const quantity = quantityOfCell(kind === 'magnitude' ? shown : '', label)
  return success({ id: newId(sheet, label), label, quantity })
}

function idOf(
  parts: readonly { readonly id: Id; readonly label?: string; readonly name?: string }[] = [],
  named: string,
): Id | undefined {
  return (
    parts.find(({ id }) => id === named) ??
    parts.find(({ label, name }) => label === named || name === named)
  )?.id
}

function namedId(
  parts:
    | readonly { readonly id: Id; readonly label?: string; readonly name?: string }[]
    | undefined,
  named: string | undefined,
  what: string,
): Result<Id | undefined> {
  if (named === undefined) return success(undefined)
  const id = idOf(parts, named)
  return id === undefined
    ? failure(`there is no ${what} “${named}” on this sheet. Add it first, or leave it out.`)
    : success(id)
}

function takenIn(sheet: Sheet, cells: Cells): Result<Change<Reading>> {
  const instrument = namedId(sheet.instruments, cells.instrument, 'instrument')
  if (!instrument.ok) return instrument
  const channel = namedId(sheet.channels, cells.channel, 'channel')
  if (!channel.ok) return channel
  const current = namedId(sheet.channels, cells['current channel'], 'channel')
  if (!current.ok) return current
  const [range, limit] = [numberIn(cells.range), numberIn(cells.limit)]
  if (!range.ok) return failure(`its range: ${range.problem}`)
  if (!limit.ok) return failure(`its limit: ${limit.problem}`)
  const repeats = numbersIn(cells.repeats)
  if (!repeats.ok) return failure(`its repeats: ${repeats.problem}`)
  const known: { readonly [field: string]: unknown } = {
    instrument: instrument.value,
    channel: channel.value,
    currentChannel: current.value,
    range: range.value,
    limit: limit.value,
    repeats: repeats.value,
    pass: cells.pass,
    struck: cells.struck === undefined ? undefined : /^(struck|yes|true|x)$/i.test(cells.struck),
  }
  return success(
    Object.fromEntries(Object.entries(known).filter(([, value]) => value !== undefined)),
  )
}

function numberIn(text: string | undefined): Result<number | undefined> {
  if (text === undefined) return success(undefined)
  const parsed = parseCell(text.replace(/^(±|\+\/-)\s*/, ''), { unit: '' })
  if (!parsed.ok) return parsed
  return parsed.value.form === 'number'
    ? success(parsed.value.number.value)
    : failure('write one figure.')
}

/** Figures that spaces or semicolons part. */
export function numbersIn(text: string | undefined): Result<readonly number[] | undefined> {
  if (text === undefined || text.trim() === '') return success(undefined)
  const numbers: number[] = []
  for (const piece of text.trim().split(/[\s;]+/)) {
    const number = numberIn(piece)
    if (!number.ok) return number
    if (number.value !== undefined) numbers.push(number.value)
  }
  return success(numbers)
}
