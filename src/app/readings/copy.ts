import type { Store } from '../store'

/** Puts rows on the clipboard, tab-separated with their header, as a spreadsheet takes them. */
export async function copyReadings(
  store: Store,
  table: readonly (readonly string[])[],
): Promise<void> {
  const { notify } = store.getState()
  const text = table.map((row) => row.map(onOneLine).join('\t')).join('\n')
  try {
    await navigator.clipboard.writeText(text)
    notify({
      tone: 'news',
      text: `${table.length - 1} readings copied: paste them into a spreadsheet.`,
    })
  } catch {
    notify({
      tone: 'problem',
      text: 'The readings were not copied: the browser keeps the page off the clipboard. Allow it for this page and try again.',
    })
  }
}

/** A cell on one line, and kept from being taken for a formula. */
function onOneLine(text: string): string {
  const line = text.replace(/[\t\r\n]+/g, ' ')
  return /^[=+@]/.test(line) ? `'${line}` : line
}
