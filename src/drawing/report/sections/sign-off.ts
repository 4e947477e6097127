import type { Job } from '../../../sheet'
import type { Item } from '../../scene'
import { heading, lines, note } from '../blocks'
import type { Block, Piece } from '../flow'
import { counted } from '../names'
import type { Section } from '../section'
import { INK, STYLES } from '../style'

interface Line {
  readonly role: string
  readonly name: string
  readonly date: string
}

/** Free millimetres above a line to sign on. */
const ROOM_TO_SIGN = 9.5

/** Lines to sign on, with the names and days that the sheet has, and what was voided. */
export const signOff: Section = {
  name: 'sign-off',
  blocks: ({ sheet, width }) => {
    const { job = {} } = sheet
    return [
      heading('Signatures', width),
      ...linesOf(job).map((line): Block => ({ pieces: [signatureLine(line, width)] })),
      ...voidedText(job).map((text) => note(text, width)),
    ]
  },
}

function linesOf(job: Job): readonly Line[] {
  return [
    { role: 'Tested by', name: job.testedBy ?? '', date: job.date ?? '' },
    { role: 'Checked by', name: job.checkedBy ?? '', date: job.checkedDate ?? '' },
    { role: 'Approved by', name: job.approvedBy ?? '', date: job.approvedDate ?? '' },
  ]
}

/** Name, signature and date beside each other, each over its line. */
function signatureLine({ role, name, date }: Line, width: number): Piece {
  const between = 4
  const dateWidth = 26
  const own = (width - dateWidth - 2 * between) / 2
  const cells = [
    { left: 0, width: own, caption: role, text: name },
    { left: own + between, width: own, caption: 'Signature', text: '' },
    { left: 2 * (own + between), width: dateWidth, caption: 'Date', text: date },
  ].map((cell) => ({
    ...cell,
    lines: cell.text.trim() === '' ? [] : lines(cell.text.trim(), STYLES.body, cell.width),
    below: lines(cell.caption, STYLES.caption, cell.width, INK.quiet),
  }))
  const tallest = Math.max(...cells.map((cell) => heightOfLines(cell.lines)))
  const over = Math.max(ROOM_TO_SIGN, tallest + 2)
  return {
    height: over + 5,
    draw: ({ x, y }) => {
      const items: Item[] = []
      for (const cell of cells) {
        const left = x + cell.left
        let top = y - over + 0.6 + heightOfLines(cell.lines)
        for (const line of cell.lines) {
          items.push(...line.draw({ x: left, y: top }))
          top -= line.height
        }
        items.push({
          part: 'report',
          kind: 'lines',
          segments: [left, y - over, left + cell.width, y - over],
          stroke: INK.ink,
          width: 0.2,
        })
        for (const line of cell.below) items.push(...line.draw({ x: left, y: y - over - 0.6 }))
      }
      return items
    },
  }
}

function heightOfLines(pieces: readonly Piece[]): number {
  return pieces.reduce((sum, { height }) => sum + height, 0)
}

/** The signatures that no longer hold, since the sheet was changed after them. */
function voidedText({ voided = [] }: Job): readonly string[] {
  if (voided.length === 0) return []
  const each = voided.map(({ kind, by, date, revision }) =>
    [
      `${kind} by ${by}`,
      ...(date === undefined ? [] : [`on ${date}`]),
      ...(revision === undefined ? [] : [`for revision ${revision}`]),
    ].join(' '),
  )
  return [`${counted(voided.length, 'signature')} voided by later changes: ${each.join('; ')}.`]
}
