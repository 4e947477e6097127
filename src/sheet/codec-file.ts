import { toCanonical } from './canonical'
import type { Sheet } from './types'

/**
 * The sheet as a file: JSON text, indented, fields in canonical order, with a line end behind it. The
 * same sheet always gives the same bytes, and `parseSheetText` gives the sheet back.
 */
export function serializeSheet(sheet: Sheet): string {
  return `${escapeUnsafe(JSON.stringify(toCanonical(sheet), null, 2))}\n`
}

/** What is written as an escape, so that XML can hold it and no editor turns the figures around it. */
const UNSAFE = /\p{Bidi_Control}|\p{Noncharacter_Code_Point}|(?!\n)\p{Cc}|\p{Zl}|\p{Zp}/gu

function escapeUnsafe(json: string): string {
  return json.replace(UNSAFE, (character) =>
    character
      .split('')
      .map((unit) => `\\u${unit.charCodeAt(0).toString(16).padStart(4, '0')}`)
      .join(''),
  )
}
