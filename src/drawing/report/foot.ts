import { shorten } from '../font/shorten'
import { FRAME_INSET } from '../paper'
import type { Item } from '../scene'
import { isolate } from '../text/label-runs'
import { textItem } from './blocks'
import { INK } from './style'
import { widthOf } from './wrap'

/** How long the check line is, in millimetres. */
export const CHECK_LENGTH = 100
/** How far the check line lies above the paper's edge: what printers leave free is less. */
const HEIGHT = 5.6
const TICK = 1.1
const STYLE = { face: 'sans', size: 2.2 } as const
const ADVICE = '100 mm: print at 100 %, no scaling'

/**
 * What stands below the frame of every page: a line of exactly 100 mm to hold a ruler to, and the
 * fingerprint of the sheet's data.
 */
export function footItems(
  { width }: { readonly width: number },
  fingerprint: string | undefined,
): readonly Item[] {
  const [left, right] = [FRAME_INSET, FRAME_INSET + CHECK_LENGTH]
  const y = HEIGHT - 0.36 * STYLE.size
  const text = right + 2.5
  const line: Item = {
    part: 'check-line',
    kind: 'lines',
    segments: [
      ...[left, HEIGHT, right, HEIGHT],
      ...[left, HEIGHT - TICK, left, HEIGHT + TICK],
      ...[right, HEIGHT - TICK, right, HEIGHT + TICK],
      ...Array.from({ length: 9 }, (_, at) => left + 10 * (at + 1)).flatMap((x) => [
        ...[x, HEIGHT, x, HEIGHT + TICK * (x === left + 50 ? 0.8 : 0.5)],
      ]),
    ],
    stroke: INK.ink,
    width: 0.2,
  }
  const advice = textItem({ x: text, y }, [{ ...STYLE, text: ADVICE }], INK.ink)
  if (fingerprint === undefined || fingerprint.trim() === '') return [line, advice]
  const room = width - FRAME_INSET - text - widthOf(ADVICE, STYLE) - 4
  const mark = shorten(`Fingerprint ${fingerprint.trim()}`, STYLE, room)
  const at = { x: width - FRAME_INSET, y }
  return [line, advice, textItem(at, [{ ...STYLE, text: isolate(mark) }], INK.quiet, 'end')]
}
