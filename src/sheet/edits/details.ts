import { success } from '../../core'
import type { Drawing, Job, Sheet, Typed } from '../types'
import { type Change, withChange, without } from './change'
import type { EditKind } from './edit-kind'

/** Changes what holds for the whole sheet; null takes a field away. */
export interface SetDetails {
  readonly kind: 'set-details'
  readonly title?: string
  readonly revision?: string | null
  readonly frequency?: Typed | null
  readonly reference?: string | null
  readonly supply?: string | null
  readonly drift?: number | null
  readonly assumed?: NonNullable<Sheet['assumed']> | null
  readonly safety?: NonNullable<Sheet['safety']> | null
}

/** Changes some fields of the title block; null takes a field away. */
export interface SetJob {
  readonly kind: 'set-job'
  readonly job: Change<Job>
}

/** Changes some fields of how the sheet is drawn; null takes a field away. */
export interface SetDrawing {
  readonly kind: 'set-drawing'
  readonly drawing: Change<Drawing>
}

/** Changes what holds for the whole sheet. */
export const setDetails: EditKind<SetDetails> = {
  apply: (sheet, { kind: _, ...change }) => success(withChange<Sheet>(sheet, change)),
  describe: (_, { kind: __, ...change }) => `Change the ${listed(change, 'details')}`,
}

/** Changes the title block. */
export const setJob: EditKind<SetJob> = {
  apply: (sheet, { job }) => {
    const changed = withChange(sheet.job ?? {}, job)
    return success(isEmpty(changed) ? without(sheet, 'job') : { ...sheet, job: changed })
  },
  describe: (_, { job }) => `Change the title block: ${listed(job, 'nothing')}`,
}

/** Changes how the sheet is drawn. */
export const setDrawing: EditKind<SetDrawing> = {
  apply: (sheet, { drawing }) => {
    const changed = withChange(sheet.drawing ?? {}, drawing)
    return success(isEmpty(changed) ? without(sheet, 'drawing') : { ...sheet, drawing: changed })
  },
  describe: (_, { drawing }) => `Change the drawing: ${listed(drawing, 'nothing')}`,
}

function isEmpty(part: object): boolean {
  return Object.keys(part).length === 0
}

/** The names of the fields in a change as words: `testedBy` reads "tested by". */
function listed(change: object, none: string): string {
  const words = Object.keys(change).map((field) =>
    field.replace(/[A-Z]/g, (letter) => ` ${letter.toLowerCase()}`),
  )
  return words.join(', ') || none
}
