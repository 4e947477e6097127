import { tableOf } from '../../sheet'
import { answerOf, type Store } from '../store'

/** Puts all rows on the clipboard, tab-separated with a header, as a spreadsheet takes them. */
export async function copyRows(store: Store): Promise<void> {
  const { history, notify } = store.getState()
  const table = tableOf(history.sheet, answerOf(history.sheet).evaluation)
  const text = table.map((row) => row.join('\t')).join('\n')
  try {
    await navigator.clipboard.writeText(text)
    notify({
      tone: 'news',
      text: `${table.length - 1} rows copied: paste them into a spreadsheet.`,
    })
  } catch {
    notify({
      tone: 'problem',
      text: 'The rows were not copied: the browser keeps the page off the clipboard. Allow it for this page and try again.',
    })
  }
}
