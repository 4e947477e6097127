import { parseLink, type SheetResult } from '../../sheet'
import type { Keeping } from '../keep'
import { openFiled, openLinked } from '../keep/open-kept'
import type { Store } from '../store'

/** Opens the sheet that a link carries. A link that cannot be read costs nothing and is said. */
export async function openLink(store: Store, keeping: Keeping, text: string): Promise<boolean> {
  const result = parseLink(text)
  if (result.ok) await openLinked(store, keeping, result.sheet)
  else refuse(store, [describeRefusal(result, 'This link')])
  return result.ok
}

/**
 * Opens the sheets in files: a sheet's own JSON, or a drawing or print that carries its sheet. The first of
 * several is shown, and all are kept; those that hold no sheet are named with the reason.
 */
export async function openFiles(
  store: Store,
  keeping: Keeping,
  files: readonly File[],
): Promise<void> {
  const { readFile } = await import('./read-file')
  const refusals: string[] = []
  let opened = 0
  for (const file of [...files].reverse()) {
    const result = await readFile(file)
    if (result.ok) {
      await openFiled(store, keeping, result.sheet)
      opened += 1
    } else refusals.unshift(describeRefusal(result, `“${file.name}”`))
  }
  if (refusals.length > 0) refuse(store, refusals)
  else if (opened > 1) {
    store.getState().notify({
      tone: 'news',
      text: `${opened} sheets opened. The first is shown, the others are in My sheets.`,
      offer: 'go-back',
    })
  }
}

function describeRefusal(result: SheetResult & { readonly ok: false }, what: string): string {
  const [first] = result.errors
  const where = first?.path ? ` (at ${first.path})` : ''
  const more =
    result.errors.length > 1 ? ` There are ${result.errors.length - 1} more such faults.` : ''
  return `${what} was not opened: ${first?.message ?? 'it holds no sheet.'}${where}${more}`
}

function refuse(store: Store, refusals: readonly string[]): void {
  const text = [...refusals, 'The sheet that was open is still here.'].join(' ')
  store.getState().notify({ tone: 'problem', text })
}
