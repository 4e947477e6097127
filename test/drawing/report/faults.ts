import { type Box, boundsOf, frameOf, type Item } from '../../../src/drawing'
import type { Page } from '../../../src/drawing/report'

/** What a rounding error may add, in millimetres. */
const ROUNDING = 0.01
/** How near the paper's edge ink may come: what printers leave free. */
const PRINTERS_MARGIN = 4.2

/** What is wrong with a page of text: texts that lie on each other or leave the frame; none where all is well. */
export function faultsOf(page: Page): string[] {
  const frame = frameOf(page)
  const texts = page.items.flatMap((item) =>
    item.kind === 'text' ? [{ name: nameOf(item), box: inkOf(item) }] : [],
  )
  const codes = page.items.flatMap((item) =>
    item.part === 'qr-code' ? [{ name: 'the code', box: boundsOf(item) }] : [],
  )
  const all = [...texts, ...codes]
  const found = all.flatMap(({ name, box }, at) => [
    ...(isWithin(box, frame) || isFoot(box, frame, page) ? [] : [`${name} leaves the frame`]),
    ...all
      .slice(at + 1)
      .filter((other) => isMeeting(box, other.box))
      .map((other) => `${name} lies on ${other.name}`),
  ])
  return [...found, ...strokesOutside(page, frame)]
}

function nameOf(item: Item & { kind: 'text' }): string {
  return `“${item.runs.map(({ text }) => text).join('')}”`
}

/** The box of a line's letters: of capitals and of what reaches below the line. */
function inkOf(item: Item & { kind: 'text' }): Box {
  const { left, right } = boundsOf(item)
  const size = Math.max(...item.runs.map((run) => run.size))
  return { left, right, bottom: item.at.y - 0.24 * size, top: item.at.y + 0.76 * size }
}

function isWithin(box: Box, frame: Box): boolean {
  return (
    box.left >= frame.left - ROUNDING &&
    box.right <= frame.right + ROUNDING &&
    box.bottom >= frame.bottom - ROUNDING &&
    box.top <= frame.top + ROUNDING
  )
}

/** Check line and fingerprint stand below the frame, where a printer still reaches. */
function isFoot(box: Box, frame: Box, { width }: Page): boolean {
  return (
    box.top <= frame.bottom &&
    box.bottom >= PRINTERS_MARGIN - ROUNDING &&
    box.left >= PRINTERS_MARGIN &&
    box.right <= width - PRINTERS_MARGIN
  )
}

function isMeeting(one: Box, other: Box): boolean {
  return (
    one.left < other.right - ROUNDING &&
    other.left < one.right - ROUNDING &&
    one.bottom < other.top - ROUNDING &&
    other.bottom < one.top - ROUNDING
  )
}

function strokesOutside(page: Page, frame: Box): string[] {
  return page.items
    .filter(({ kind, part }) => kind !== 'text' && part !== 'paper')
    .map(boundsOf)
    .filter((box) => !isWithin(box, frame) && !isFoot(box, frame, page))
    .map(({ left, bottom }) => `a stroke at ${left}, ${bottom} leaves the frame`)
}
