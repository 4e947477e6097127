import { readFile } from 'node:fs/promises'
import type { Page } from '@playwright/test'

/** A file that the page gave out. */
export interface Saved {
  readonly name: string
  readonly path: string
  readonly bytes: Buffer
}

/** Saves the drawing by a verb of the menu. */
export async function saveDrawing(page: Page, verb: RegExp): Promise<Saved> {
  await page.getByRole('button', { name: 'Save drawing', exact: true }).click()
  const coming = page.waitForEvent('download')
  await page.getByRole('button', { name: verb }).click()
  const download = await coming
  const path = await download.path()
  return { name: download.suggestedFilename(), path, bytes: await readFile(path) }
}

/** Opens a file with the Open dialog's file chooser. */
export async function chooseFile(
  page: Page,
  file: string | { name: string; mimeType: string; buffer: Buffer },
): Promise<void> {
  await page.getByRole('button', { name: 'Open', exact: true }).click()
  const coming = page.waitForEvent('filechooser')
  await page.getByText('Choose a file', { exact: true }).click()
  const chooser = await coming
  await chooser.setFiles(file)
}

/** What a hand drops on the page: files by their path, or a link. */
interface Dropped {
  readonly files?: string[]
  readonly items?: { readonly mimeType: string; readonly data: string }[]
}

/** Drops something on the middle of the page, through the browser's own dragging. */
export async function drop(page: Page, { files = [], items = [] }: Dropped): Promise<void> {
  const session = await page.context().newCDPSession(page)
  const { width, height } = page.viewportSize() ?? { width: 800, height: 600 }
  for (const type of ['dragEnter', 'dragOver', 'drop'] as const) {
    await session.send('Input.dispatchDragEvent', {
      type,
      x: width / 2,
      y: height / 2,
      data: { items, files, dragOperationsMask: 1 },
    })
  }
  await session.detach()
}
