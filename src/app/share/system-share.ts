import { type Sheet, serializeLink } from '../../sheet'
import { toSheetFile } from '../export/save-sheet'

/** Some mail programs cut longer links. */
export const warnedLength = 2_000

/** The link to a sheet, upon the address of this page. */
export function linkTo(sheet: Sheet): string {
  return new URL(serializeLink(sheet), window.location.href).href
}

/** Whether the system offers a share sheet to the page. */
export function canShare(): boolean {
  return typeof navigator.share === 'function'
}

/**
 * Hands a sheet to the system's share sheet: its link, or, where the link is too long for mail and the
 * system takes files, its file. Settles with why that failed; undefined where it was shared, or where
 * the user changed their mind.
 */
export async function shareSheet(sheet: Sheet): Promise<string | undefined> {
  const title = sheet.title || 'Untitled sheet'
  const url = linkTo(sheet)
  const files = { title, files: [toSheetFile(sheet)] }
  const isFile = url.length > warnedLength && (navigator.canShare?.(files) ?? false)
  try {
    await navigator.share(isFile ? files : { title, url })
    return undefined
  } catch (error) {
    if (error instanceof Error && error.name === 'AbortError') return undefined
    return 'The system did not take the sheet: copy the link, or save the sheet to a file.'
  }
}
