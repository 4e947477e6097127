import type { Sheet } from '../../sheet'
import { shorten } from '../font/shorten'
import type { Box } from '../geometry'
import { shareOut } from '../items/share-out'
import { WIDTHS } from '../items/style'
import type { Item } from '../scene'
import { isolate } from '../text/label-runs'
import { textItem } from './blocks'
import { INK } from './style'
import { widthOf } from './wrap'

/** How high the strip stands above the lower edge of the frame, in millimetres. */
export const STRIP_HEIGHT = 9.4
const PADDING = 1.8
const CAPTION = { face: 'sans', size: 2.1 } as const
const VALUE = { face: 'sans', size: 3 } as const
const TITLE = { face: 'bold', size: 3.2 } as const

/**
 * The title block of a page of text: the fields that ISO 7200 asks for (from memory), in one row along
 * the lower edge of the frame. What is too long for its cell is shortened: the page on which the report
 * begins has it in full.
 */
export function stripItems(
  sheet: Sheet,
  kind: string,
  sheetNumber: string,
  frame: Box,
): readonly Item[] {
  const fields = fieldsOf(sheet, kind, sheetNumber)
  const top = frame.bottom + STRIP_HEIGHT
  const widths = widthsOf(fields, frame.right - frame.left)
  const rules = [frame.left, top, frame.right, top]
  const texts: Item[] = []
  let left = frame.left
  fields.forEach(({ caption, value, style }, at) => {
    const own = widths[at] ?? 0
    const room = own - 2 * PADDING
    if (at > 0) rules.push(left, top, left, frame.bottom)
    const x = left + PADDING
    texts.push(
      textItem(
        { x, y: top - 2.8 },
        [{ ...CAPTION, text: shorten(caption, CAPTION, room) }],
        INK.quiet,
      ),
      textItem({ x, y: frame.bottom + 1.9 }, [
        { ...style, text: isolate(shorten(value, style, room)) },
      ]),
    )
    left += own
  })
  const lines: Item = {
    part: 'title-block',
    kind: 'lines',
    segments: rules,
    stroke: INK.ink,
    width: WIDTHS.thin,
  }
  return [lines, ...texts.filter(hasText)]
}

interface Field {
  readonly caption: string
  readonly value: string
  readonly style: typeof VALUE | typeof TITLE
  /** Is never shortened. */
  readonly isWhole?: true
}

/** The title takes what the others leave, and at least its share; what is never shortened comes first. */
function widthsOf(fields: readonly Field[], width: number): readonly number[] {
  const needs = fields.map(
    ({ caption, value, style }) =>
      Math.max(widthOf(caption, CAPTION), widthOf(value, style)) + 2 * PADDING,
  )
  const wholes = needs.filter((_, at) => fields[at]?.isWhole)
  const others = needs.filter((_, at) => at > 0 && !fields[at]?.isWhole)
  const room = width - sum(wholes)
  const title = Math.min(needs[0] ?? 0, 0.3 * width)
  const shared = shareOut(Math.min(room - title, sum(others)), others)
  const left = [room - sum(shared), ...shared]
  return fields.map((field, at) => (field.isWhole ? (needs[at] ?? 0) : (left.shift() ?? 0)))
}

function fieldsOf(
  { title, revision, job = {} }: Sheet,
  kind: string,
  sheetNumber: string,
): Field[] {
  const optional: readonly (readonly [string, string | undefined])[] = [
    ['Identification number', job.number],
    ['Creator', job.testedBy],
    ['Approval person', job.approvedBy],
    ['Date of issue', job.date],
  ]
  return [
    { caption: 'Title', value: oneLine(title) || 'Untitled', style: TITLE },
    { caption: 'Document type', value: kind, style: VALUE, isWhole: true },
    ...optional.flatMap(([caption, value = '']) =>
      value.trim() === '' ? [] : [{ caption, value: oneLine(value), style: VALUE }],
    ),
    { caption: 'Revision index', value: oneLine(revision ?? '') || '0', style: VALUE },
    { caption: 'Sheet number', value: sheetNumber, style: VALUE, isWhole: true },
  ]
}

function hasText(item: Item): boolean {
  return item.kind === 'text' && item.runs.some(({ text }) => text !== '')
}

function oneLine(text: string): string {
  return text.replace(/\s+/gu, ' ').trim()
}

function sum(numbers: readonly number[]): number {
  return numbers.reduce((total, each) => total + each, 0)
}
