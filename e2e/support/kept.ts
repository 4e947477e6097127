import type { Page } from '@playwright/test'

/** A record of the browser's store of sheets, as far as a check looks at it. */
export interface Kept {
  readonly id: string
  readonly title: string
  readonly text: string
  readonly touched: number
  readonly revision: number
}

/** Everything under a sheet's name in the store, the latest change first, read past the page. */
export function keptOf(page: Page): Promise<readonly Kept[]> {
  return page.evaluate(
    () =>
      new Promise<Kept[]>((resolve, reject) => {
        const opening = indexedDB.open('phasogon')
        opening.onerror = () => reject(opening.error)
        opening.onsuccess = () => {
          const database = opening.result
          const range = IDBKeyRange.bound('sheet:', 'sheet:\uffff')
          const reading = database.transaction('sheets').objectStore('sheets').getAll(range)
          reading.onerror = () => reject(reading.error)
          reading.onsuccess = () => {
            database.close()
            const records: Kept[] = reading.result
            resolve(records.sort((one, other) => other.touched - one.touched))
          }
        }
      }),
  )
}

/** Writes into the store past the page, as a hand does with the browser's own tools. */
export function writeKept(page: Page, key: string, value: unknown): Promise<void> {
  return page.evaluate(
    ([name, content]) =>
      new Promise<void>((resolve, reject) => {
        const opening = indexedDB.open('phasogon')
        opening.onerror = () => reject(opening.error)
        opening.onsuccess = () => {
          const database = opening.result
          const transaction = database.transaction('sheets', 'readwrite')
          transaction.objectStore('sheets').put(content, name)
          transaction.oncomplete = () => {
            database.close()
            resolve()
          }
        }
      }),
    [key, value] as const,
  )
}
