import { formatNumber } from '../../../core'
import type { HandEvaluation, Sheet, UnitsPerCentimetre } from '../../../sheet'
import { formatDrawn, nameOfDrawn } from '../../text/hand-text'
import { formatPhasor } from '../../text/phasor-text'
import { heading, note } from '../blocks'
import type { Cell } from '../columns'
import { cell, labelCell, phasorOf, quantityOfSum } from '../names'
import type { Section } from '../section'
import { table } from '../table'

/** What was drawn by hand, read off through the scale, beside the exact values. */
export const hand: Section = {
  name: 'hand',
  blocks: ({ sheet, evaluation, unitsPerCentimetre, width }) => {
    const arrows = sheet.hand ?? []
    if (arrows.length === 0) return []
    const phasors = new Map(sheet.phasors.map((phasor) => [phasor.id, phasor]))
    const sums = new Map((sheet.sums ?? []).map((sum) => [sum.id, sum]))
    const rows = arrows.map((arrow): readonly Cell[] => {
      const found = evaluation.hand.find(({ id }) => id === arrow.id)
      const quantity = quantityOfArrow(sheet, arrow)
      const scale = unitsPerCentimetre[quantity]
      return [
        labelCell(nameOfDrawn(arrow, phasors, sums)),
        cell(formatDrawn(found, quantity, scale)),
        cell(exactText(found, quantity, scale)),
        cell(offText(found)),
      ]
    })
    return [
      heading('Drawn by hand, beside the exact values', width),
      ...table(
        [
          { title: 'Arrow' },
          { title: 'Drawn', align: 'end' },
          { title: 'Exact', align: 'end' },
          { title: 'Off on the paper' },
        ],
        rows,
        width,
      ),
      note('Drawn values are read off the paper to a tenth of a millimetre.', width),
    ]
  },
}

function quantityOfArrow(
  sheet: Sheet,
  { stands, sum }: NonNullable<Sheet['hand']>[number],
): keyof UnitsPerCentimetre {
  const closed = (sheet.sums ?? []).find(({ id }) => id === sum) ?? sheet.sums?.[0]
  if (stands !== 'closing') return phasorOf(sheet, stands)?.quantity ?? 'other'
  return closed ? quantityOfSum(sheet, closed) : 'other'
}

function exactText(
  found: HandEvaluation | undefined,
  quantity: keyof UnitsPerCentimetre,
  scale: number | undefined,
): string | undefined {
  const { magnitude, angle, magnitudeError, angleError } = found ?? {}
  if (magnitude === undefined || magnitudeError === undefined || scale === undefined)
    return undefined
  if (angle === undefined || angleError === undefined) return undefined
  const resolution = 10 ** Math.floor(Math.log10(scale / 100))
  const exact = { magnitude: magnitude - magnitudeError, angle: angle - angleError }
  return formatPhasor(exact, quantity, {
    magnitude: { resolution },
    angle: { resolution: 0.1 },
  })
}

function offText(found: HandEvaluation | undefined): string | undefined {
  const { millimetres, allowed, within } = found ?? {}
  if (millimetres === undefined) return undefined
  const of = allowed === undefined ? '' : ` of ${formatNumber(allowed, 2)} mm allowed`
  const verdict = within === undefined ? '' : within ? ': within' : ': not within'
  return `${formatNumber(millimetres, 2)} mm${of}${verdict}`
}
