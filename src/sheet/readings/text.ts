import {
  failure,
  parseAngle,
  parseNumber,
  type Quantity,
  type Result,
  success,
  type Typed,
} from '../../core'
import type { Change } from '../edits/change'
import { unitOfMagnitude } from '../figures'
import type { Reading, Sense } from '../types'

/** What the cell of a reading says: its figures and how they were taken; null where a part is not said. */
export type ReadingFigures = Change<Reading>

/**
 * What a display showed and how it was taken, as one line that `parseReadingText` takes back: 1.26 A,
 * 4 turns; 37.1 leads; 1.3 of 8 lags; 2.1 of 4.0 rising leads; 0.83 lags.
 */
export function readingText(reading: Reading): string {
  switch (reading.kind) {
    case 'magnitude':
      return listed(
        `${reading.shown}${reading.form === undefined || reading.form === 'rms' ? '' : ` ${reading.form}`}`,
        reading.turns === undefined
          ? ''
          : `${reading.turns} ${reading.turns === 1 ? 'turn' : 'turns'}`,
        reading.ratio === undefined ? '' : `ratio ${reading.ratio}`,
        reading.shunt === undefined ? '' : `shunt ${reading.shunt}`,
      )
    case 'angle':
    case 'power-factor':
      return spaced(String(reading.shown), reading.sense)
    case 'shift':
      return `${reading.shift} of ${reading.period} ${reading.sense}`
    case 'ellipse':
      return spaced(`${reading.intercept} of ${reading.height}`, reading.tilt, reading.sense)
    case 'power':
    case 'reactive-power':
      return listed(
        String(reading.shown),
        reading.ratio === undefined ? '' : `ratio ${reading.ratio}`,
      )
  }
}

function listed(...parts: readonly string[]): string {
  return parts.filter((part) => part !== '').join(', ')
}

function spaced(...parts: readonly (string | undefined)[]): string {
  return parts.filter((part) => part !== undefined).join(' ')
}

/**
 * Reads what was typed for a reading of a kind: the figures as the display showed them, with or without
 * a unit and a limit after ±, and the words for how they were taken. Refused in one sentence.
 */
export function parseReadingText(
  kind: Reading['kind'],
  text: string,
  quantity: Quantity,
): Result<ReadingFigures> {
  switch (kind) {
    case 'magnitude':
      return parseMagnitude(text, quantity)
    case 'power':
    case 'reactive-power':
      return parsePower(text, kind === 'power' ? 'W' : 'var')
    case 'angle':
      return parseSensed(text, '°', 'such as 37.1 leads')
    case 'power-factor':
      return parseSensed(text, '', 'such as 0.83 lags')
    case 'shift':
      return parseShift(text)
    case 'ellipse':
      return parseEllipse(text)
  }
}

type Modifier = 'form' | 'turns' | 'ratio' | 'shunt'

const MODIFIERS: readonly (readonly [Modifier, RegExp])[] = [
  ['turns', /^(.*?)[,;]?\s*(?<=[\s,;])(-?[\d.]+)\s*turns?$/i],
  ['ratio', /^(.*?)[,;]?\s*(?<=[\s,;])(?:ratio\s*|×\s*|x\s+)([\d.,:/e+-]+)$/i],
  ['shunt', /^(.*?)[,;]?\s*(?<=[\s,;])shunt\s+(.+)$/i],
  ['form', /^(.*?)[,;]?\s*(?<=[\s,;])(peak[ -]to[ -]peak|p-p|pk-pk|pp|peak|pk|rms)$/i],
]

/** Takes the words for how a figure was taken off its end, in whatever order they stand. */
function takeModifiers(text: string): {
  readonly figure: string
  readonly said: ReadonlyMap<Modifier, string>
} {
  const said = new Map<Modifier, string>()
  let figure = text.trim()
  for (let found = true; found; ) {
    found = false
    for (const [name, pattern] of MODIFIERS) {
      const [, before, value] = pattern.exec(figure) ?? []
      if (before === undefined || value === undefined || said.has(name)) continue
      said.set(name, value)
      figure = before.trim()
      found = true
    }
  }
  return { figure, said }
}

function parseMagnitude(text: string, quantity: Quantity): Result<ReadingFigures> {
  const { figure, said } = takeModifiers(text)
  const turns = numberIn(said.get('turns'), '')
  const ratio = numberIn(said.get('ratio')?.replace(':', '/'), '')
  const shunt = numberIn(said.get('shunt'), 'Ω')
  for (const part of [turns, ratio, shunt]) if (!part.ok) return part
  const unit = unitOfMagnitude(said.has('shunt') ? { shunt: 1 } : {}, quantity)
  const shown = parseNumber(figure, { unit })
  if (!shown.ok) return shown
  return success({
    ...figuresOf('shown', shown.value),
    form: formOf(said.get('form')),
    turns: turns.ok ? turns.value : null,
    ratio: ratio.ok ? ratio.value : null,
    shunt: shunt.ok ? shunt.value : null,
  })
}

function formOf(word: string | undefined): 'peak' | 'peak-to-peak' | null {
  if (word === undefined || /^rms$/i.test(word)) return null
  return /^(?:peak|pk)$/i.test(word) ? 'peak' : 'peak-to-peak'
}

function numberIn(text: string | undefined, unit: string): Result<number | null> {
  if (text === undefined) return success(null)
  const parsed = parseNumber(text, { unit })
  return parsed.ok ? success(parsed.value.value) : parsed
}

function parsePower(text: string, unit: string): Result<ReadingFigures> {
  const { figure, said } = takeModifiers(text)
  const ratio = numberIn(said.get('ratio')?.replace(':', '/'), '')
  if (!ratio.ok) return ratio
  const shown = parseNumber(figure, { unit })
  return shown.ok ? success({ ...figuresOf('shown', shown.value), ratio: ratio.value }) : shown
}

const SENSE = /^(.*?)[,;]?\s*(?<=^|[\s,;\d°])(leads?|leading|ahead|lags?|lagging|behind)$/i

/** Takes the word for lead or lag off the end. */
function takeSense(text: string): { readonly rest: string; readonly sense: Sense | null } {
  const [, rest, word] = SENSE.exec(text.trim()) ?? []
  if (rest === undefined || word === undefined) return { rest: text.trim(), sense: null }
  return { rest: rest.trim(), sense: /^(?:lead|ahead)/i.test(word) ? 'leads' : 'lags' }
}

function parseSensed(text: string, unit: '°' | '', example: string): Result<ReadingFigures> {
  const { rest, sense } = takeSense(text)
  if (rest === '') return failure(`Type what the display showed, ${example}.`)
  const shown = unit === '°' ? parseAngle(rest) : parseNumber(rest, { unit })
  return shown.ok ? success({ ...figuresOf('shown', shown.value), sense }) : shown
}

/** Parts two figures at the word "of" or at a slash. */
function takeTwo(text: string): readonly [string, string] | undefined {
  const parts = text.split(/\s+of\s+|\s*\/\s*/i)
  const [first, second] = parts
  return parts.length === 2 && first && second ? [first.trim(), second.trim()] : undefined
}

function parseShift(text: string): Result<ReadingFigures> {
  const { rest, sense } = takeSense(text)
  const two = takeTwo(rest)
  if (two === undefined || sense === null) {
    return failure(
      'Type the shift, the period and whether it leads or lags, such as 1.3 of 8 lags; both in divisions or both in seconds.',
    )
  }
  const shift = parseNumber(two[0], { unit: 's' })
  if (!shift.ok) return shift
  const period = parseNumber(two[1], { unit: 's' })
  if (!period.ok) return period
  return success({
    ...figuresOf('shift', shift.value),
    period: period.value.text ?? period.value.value,
    sense,
  })
}

function parseEllipse(text: string): Result<ReadingFigures> {
  const { rest, sense } = takeSense(text)
  const [, bare = rest, word] = /^(.*?)[,;]?\s+(rising|falling)$/i.exec(rest) ?? []
  const two = takeTwo(bare)
  if (two === undefined) {
    return failure(
      'Type the intercept and the height of the ellipse, such as 2.1 of 4.0 rising leads.',
    )
  }
  const intercept = parseNumber(two[0], { unit: '' })
  if (!intercept.ok) return intercept
  const height = parseNumber(two[1], { unit: '' })
  if (!height.ok) return height
  return success({
    ...figuresOf('intercept', intercept.value),
    height: height.value.text ?? height.value.value,
    tilt: word === undefined ? null : /^rising$/i.test(word) ? 'rising' : 'falling',
    sense,
  })
}

function figuresOf(
  field: 'shown' | 'shift' | 'intercept',
  { value, text, limit }: Typed,
): ReadingFigures {
  return { [field]: text ?? value, ...(limit === undefined ? {} : { limit }) }
}
