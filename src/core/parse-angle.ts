import { degreesFromRadians, wrapDegrees } from './angle'
import { readCellText, splitUnit } from './cell-text'
import { type Figure, readFigure } from './figure'
import { readLimited, toTyped } from './parse-number'
import { failure, type Result, success } from './result'
import type { Typed } from './typed'

/** Reads the figures of an angle as degrees, without taking whole turns off: 82, 82°, 1.43 rad. */
export function readDegrees(text: string): Result<Figure> {
  const { figure, word, meaning } = splitUnit(text)
  if (figure === '' || word === '' || meaning?.unit === '°') {
    return readFigure(word === '' || figure === '' ? text : figure, 0)
  }
  if (meaning?.unit !== 'rad') {
    return failure(
      `An angle is in degrees or rad, so “${word}” does not fit: write 82° or 1.43 rad.`,
    )
  }
  const radians = readFigure(figure, 0)
  if (!radians.ok) return radians
  return success({ value: degreesFromRadians(radians.value.value) })
}

/** Reads an angle with or without a limit, in (−180°, 180°]; a percentage is no limit of an angle. */
export function readAngle(text: string): Result<Typed> {
  const read = readLimited(text, readDegrees)
  if (!read.ok) return read
  const { value, limit } = read.value
  if (limit !== undefined && 'percent' in limit) {
    return failure('The limit of an angle is in degrees, not in percent: write it like ± 1°.')
  }
  return success(toTyped({ ...read.value, value: wrapDegrees(value) }))
}

/**
 * Reads an angle: 82, 82°, −90, 1.43 rad, 1.5/10*360, 82 ± 1. Degrees unless it says rad; the value is
 * in degrees in (−180°, 180°], anticlockwise positive. The digits are kept in `text`, without the
 * limit: it reads as the same value again. What cannot be read is refused in one sentence.
 */
export function parseAngle(text: string): Result<Typed> {
  const cell = readCellText(text, '82 or −90')
  return cell.ok ? readAngle(cell.value) : cell
}
