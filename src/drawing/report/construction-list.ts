import { angleOf, formatAngle, formatNumber } from '../../core'
import { type Evaluation, type Id, labelOf, type Sheet } from '../../sheet'
import type { PlacedArrow, Scene } from '../scene'
import { formatMagnitude } from '../text/phasor-text'
import { digitsOf, readingsByPhasor } from '../text/resolution'
import { heading, note } from './blocks'
import type { Cell } from './columns'
import type { Block } from './flow'
import { cell, labelsOf, nameOfSum, phasorOf, symbolsCell } from './names'
import { table } from './table'

/**
 * What is to be drawn with ruler and protractor, sum by sum in drawing order, then what stands alone: each
 * phasor with its size, its length on the paper in millimetres and its direction. A term that is taken
 * away is listed as it is drawn, turned round.
 */
export function constructionList(
  sheet: Sheet,
  evaluation: Evaluation,
  { arrows }: Scene,
  width: number,
): readonly Block[] {
  const terms = arrows.filter(({ role }) => role === 'term')
  const loose = arrows.filter(({ role }) => role === 'loose')
  const sums = (sheet.sums ?? []).flatMap((sum) => {
    const own = terms.filter((arrow) => arrow.sum === sum.id)
    const how = sum.arrangement === 'from-origin' ? 'from one point' : 'tip to tail'
    return own.length === 0
      ? []
      : listed(sheet, evaluation, `${nameOfSum(sheet, sum)}, ${how}`, own, width)
  })
  const alone = loose.length === 0 ? [] : listed(sheet, evaluation, 'By themselves', loose, width)
  return [
    ...sums,
    ...alone,
    ...(sums.length + alone.length === 0
      ? []
      : [note('Angles are anticlockwise from the level axis.', width)]),
  ]
}

function listed(
  sheet: Sheet,
  evaluation: Evaluation,
  title: string,
  arrows: readonly PlacedArrow[],
  width: number,
): readonly Block[] {
  const readings = readingsByPhasor(sheet)
  const labels = labelsOf(sheet)
  const found = new Map<Id, number | undefined>(
    evaluation.phasors.map(({ id, magnitude, asRead }) => [id, asRead.magnitude ?? magnitude]),
  )
  const rows = arrows.map(({ phasor: id = '', sign, quantity, from, to }): readonly Cell[] => {
    const phasor = phasorOf(sheet, id)
    const magnitude = found.get(id)
    const digits = phasor ? digitsOf(phasor, readings) : { magnitude: {}, angle: {} }
    const along = { re: to.x - from.x, im: to.y - from.y }
    const length = Math.hypot(along.re, along.im)
    return [
      symbolsCell(`${sign < 0 ? '−' : ''}${labelOf(sheet, id)}`, labels),
      cell(
        magnitude === undefined
          ? undefined
          : formatMagnitude(magnitude, quantity, digits.magnitude),
      ),
      cell(`${formatNumber(length, 1)} mm`),
      cell(length === 0 ? undefined : formatAngle(angleOf(along), digits.angle)),
    ]
  })
  return [
    heading(title, width),
    ...table(
      [
        { title: 'Phasor' },
        { title: 'Size', align: 'end' },
        { title: 'Length', align: 'end' },
        { title: 'Angle', align: 'end' },
      ],
      rows,
      width,
    ),
  ]
}
