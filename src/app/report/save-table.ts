import { readingsTable, scheduleTable, sumsTable, type Table } from '../../sheet'
import { download, fileNameOf } from '../export'
import { toCsv, toTabbed } from '../export/table-text'
import { answerOf, type Store } from '../store'
import { settledAnswer } from '../worker'

/** The tables that leave the page. */
export const tables: readonly Table['name'][] = ['schedule', 'readings', 'sums']

/** How long a table waits for the best values, in milliseconds. */
const PATIENCE_OF_TABLE = 10_000

/** Saves a table as a CSV file. */
export async function saveTable(store: Store, name: Table['name']): Promise<void> {
  const table = await settledTable(store, name)
  const file = fileNameOf(store.getState().history.sheet, `${name}.csv`)
  download(new Blob([await toCsv(table)], { type: 'text/csv;charset=utf-8' }), file)
  store.getState().notify({
    tone: 'news',
    text: `Saved “${file}”. Its figures are numbers with a decimal point, in SI units.`,
  })
}

/** Puts a table on the clipboard, tab-separated. */
export async function copyTable(store: Store, name: Table['name']): Promise<void> {
  const { notify } = store.getState()
  try {
    // Some browsers let a page write only at once after the click, so the text itself is waited for.
    const text = settledTable(store, name).then(
      (table) => new Blob([toTabbed(table)], { type: 'text/plain' }),
    )
    await navigator.clipboard.write([new ClipboardItem({ 'text/plain': text })])
    notify({ tone: 'news', text: `Copied the ${name}: paste into a spreadsheet.` })
  } catch {
    notify({
      tone: 'problem',
      text: `Nothing was copied of the ${name}: the browser keeps the page off the clipboard. Save a CSV file instead.`,
    })
  }
}

async function settledTable(store: Store, name: Table['name']): Promise<Table> {
  await settledAnswer(store, PATIENCE_OF_TABLE)
  const { sheet, evaluation } = answerOf(store.getState().history.sheet)
  return name === 'readings'
    ? readingsTable(sheet)
    : name === 'sums'
      ? sumsTable(sheet, evaluation)
      : scheduleTable(sheet, evaluation)
}
