import { cp, mkdtemp, readFile, rm, writeFile } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { expect, type Page, test } from '@playwright/test'
import { projectFolder } from '../src/command/run.mjs'
import { serve } from './support/own-server'

async function openSettled(page: Page, address: string): Promise<void> {
  await page.goto(address)
  await expect(page.locator('html')).toHaveAttribute('data-settled', 'true', { timeout: 20_000 })
}

async function typeTitle(page: Page, text: string): Promise<void> {
  const field = page.getByLabel('Title of the sheet')
  await field.fill(text)
  await field.press('Enter')
}

function verb(page: Page, name: string) {
  return page.getByRole('button', { name, exact: true })
}

test('asks for nothing at all once it is loaded', async ({ page, context }) => {
  const server = await serve()
  try {
    await openSettled(page, server.address)
    const before = server.requests.length
    expect(before).toBeGreaterThan(5)
    const asked: string[] = []
    context.on('request', (request) => {
      if (!/^(blob|data):/.test(request.url())) asked.push(request.url())
    })

    await typeTitle(page, 'Quiet')
    await page.getByRole('textbox', { name: 'Magnitude of Vcable' }).fill('2.20')
    await page.getByRole('textbox', { name: 'Magnitude of Vcable' }).press('Enter')
    await verb(page, 'Undo').click()
    await verb(page, 'Redo').click()
    await verb(page, 'Copy link').click()
    // Either the link is copied, or a dialog shows it: it comes once the browser has answered.
    await expect(
      page
        .getByRole('dialog')
        .or(page.getByText(/link .*copied/i))
        .first(),
    ).toBeVisible()
    await page.keyboard.press('Escape')
    await expect(page.getByRole('dialog')).toHaveCount(0)
    await verb(page, 'Share').click()
    await verb(page, 'QR code of the link').click()
    await expect(page.locator('canvas.qr-code')).toBeVisible()
    await verb(page, 'Done').click()
    for (const [menu, entry] of [
      ['Share', 'Save to a file'],
      ['Save drawing', 'SVG, true to scale'],
      ['Save drawing', 'PDF, true to scale'],
      ['Save drawing', 'PNG picture'],
    ] as const) {
      const coming = page.waitForEvent('download')
      await verb(page, menu).click()
      await verb(page, entry).click()
      await (await coming).path()
    }
    await verb(page, 'Paste rows').click()
    await page.getByRole('dialog').getByRole('textbox').fill('V9\t12\t30')
    await page.keyboard.press('Escape')
    await verb(page, 'Report').click()
    await expect(page.locator('.page-paper > svg').first()).toBeVisible()
    await verb(page, 'Close').click()
    await page.getByText('Title block', { exact: true }).click()
    await page.getByText('Before you measure', { exact: true }).click()
    await verb(page, 'Add the usual ones').click()
    await verb(page, 'My sheets').click()
    await expect(page.locator('.sheet-title')).toHaveText(['Quiet'])
    await verb(page, 'Done').click()
    await verb(page, 'New sheet').click()
    await verb(page, 'Add phasor').click()
    // What would be fetched late, such as the address written after a pause, is waited for.
    await page.waitForTimeout(1_500)

    expect(asked).toEqual([])
    expect(server.requests.slice(before)).toEqual([])
  } finally {
    server.stop()
  }
})

test('a newer version waits until the user agrees, and never reloads over work', async ({
  page,
}) => {
  const folder = await mkdtemp(join(tmpdir(), 'phasogon-page-'))
  await cp(join(projectFolder, 'dist'), folder, { recursive: true })
  const server = await serve(folder)
  try {
    await openSettled(page, server.address)
    await typeTitle(page, 'Before the new version')
    await page.waitForTimeout(600)

    await changeVersion(folder)
    await page.reload()
    const note = page.getByText('A newer version of Phasogon is ready.')
    await expect(note).toBeVisible({ timeout: 20_000 })
    await expect(page.locator('meta[name="test-version"]')).toHaveCount(0)
    await page.evaluate(() => {
      document.documentElement.dataset.sameDocument = 'true'
    })
    await typeTitle(page, 'While it waited')
    await page.waitForTimeout(1_000)
    await expect(page.locator('html')).toHaveAttribute('data-same-document', 'true')

    // The last change is made in the very moment in which the user agrees.
    await typeTitle(page, 'Just before it came')
    await verb(page, 'Use the new version').click()
    await expect(page.locator('meta[name="test-version"]')).toHaveCount(1, { timeout: 20_000 })
    await expect(page.getByLabel('Title of the sheet')).toHaveValue('Just before it came')
  } finally {
    server.stop()
    await rm(folder, { recursive: true, force: true })
  }
})

/** Makes the next version of a built page: another byte in the page, another version to its worker. */
async function changeVersion(folder: string): Promise<void> {
  const pageFile = join(folder, 'index.html')
  const html = await readFile(pageFile, 'utf8')
  await writeFile(pageFile, html.replace('</head>', '<meta name="test-version"></head>'))
  const workerFile = join(folder, 'service-worker.js')
  const worker = await readFile(workerFile, 'utf8')
  const changed = worker.replace(/const version = "\w+"/, 'const version = "0123456789abcdef"')
  expect(changed).not.toBe(worker)
  await writeFile(workerFile, changed)
}
