import type { Sheet } from '../../sheet'
import { frameItem, paperItem } from '../items/paper'
import { frameOf, paperSizeOf } from '../paper'
import type { Scene } from '../scene'
import type { FilledPage } from './flow'
import { footItems } from './foot'
import type { Page, Paper } from './page'
import { stripItems } from './strip'
import { INK } from './style'

/** What is said of a page of text. */
export interface PageNotes {
  /** The document that it is a page of: `Job report`. */
  readonly kind: string
  readonly paper: Paper
  /** Counted from 1. */
  readonly number: number
  readonly count: number
  readonly fingerprint: string | undefined
}

/** The size of a paper in millimetres. */
export function sizeOf({ format, orientation }: Paper): Pick<Scene, 'width' | 'height'> {
  return paperSizeOf({ paper: format, orientation })
}

/** A page of text: what was set in its columns, framed, with a title block along the foot. */
export function textPage(
  sheet: Sheet,
  { items }: FilledPage,
  { kind, paper, number, count, fingerprint }: PageNotes,
): Page {
  const size = sizeOf(paper)
  const frame = frameOf(size)
  return {
    ...paper,
    ...size,
    items: [
      paperItem(size, INK),
      frameItem(frame, INK),
      ...stripItems(sheet, kind, `Sheet ${number} of ${count}`, frame),
      ...items,
      ...footItems(size, fingerprint),
    ],
    title: `${kind}: ${sheet.title.trim() || 'Untitled'}, sheet ${number} of ${count}`,
    description: `Sheet ${number} of ${count} of the ${kind.toLowerCase()}.`,
    number,
    count,
    remarks: [],
  }
}
