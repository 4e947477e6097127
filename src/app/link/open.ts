import { extractSheetText, parseLink, parseSheetText, type SheetResult } from '../../sheet'
import type { Origin, Store } from '../store'

const largestFile = 5_000_000

/** Opens the sheet that a link carries. A link that cannot be read costs nothing and is said. */
export function openLink(store: Store, text: string): boolean {
  return openResult(store, parseLink(text), 'link', 'This link was not opened')
}

/** Opens the sheet in a file: the sheet's own JSON, or a drawing that carries its sheet. */
export async function openFile(store: Store, file: File): Promise<boolean> {
  const { notify } = store.getState()
  if (file.size > largestFile) {
    notify({
      tone: 'problem',
      text: `“${file.name}” was not opened: it is larger than 5 MB, and no sheet is. Choose a drawing or sheet that Phasogon saved.`,
    })
    return false
  }
  const text = await file.text()
  const carried = extractSheetText(text)
  if (carried === undefined && text.trimStart().startsWith('<')) {
    notify({
      tone: 'problem',
      text: `“${file.name}” was not opened: it is a drawing that carries no sheet. Choose an SVG that Phasogon saved.`,
    })
    return false
  }
  return openResult(store, parseSheetText(carried ?? text), 'file', `“${file.name}” was not opened`)
}

function openResult(store: Store, result: SheetResult, origin: Origin, refusal: string): boolean {
  if (result.ok) {
    store.getState().open(result.sheet, origin)
    return true
  }
  const [first] = result.errors
  const where = first?.path ? ` (at ${first.path})` : ''
  const more =
    result.errors.length > 1 ? ` There are ${result.errors.length - 1} more such faults.` : ''
  store.getState().notify({
    tone: 'problem',
    text: `${refusal}: ${first?.message ?? 'it holds no sheet.'}${where}${more} The sheet that was open is still here.`,
  })
  return false
}
