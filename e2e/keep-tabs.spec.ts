import type { Page } from '@playwright/test'
import { addDrivers, createRandom } from './support/drive'
import { keptOf } from './support/kept'
import { isDrawn, unfold } from './support/page'
import { expect, test } from './support/test'

const edits = 500
const rounds = 10

async function openPage(page: Page): Promise<void> {
  await page.goto('./')
  await isDrawn(page)
  await unfold(page, 'Title block')
  await expect(page.getByRole('textbox', { name: 'Conditions' })).toBeVisible()
}

/** Appends marks to a field of the title block, one edit each, with random pauses between them. */
function append(page: Page, marks: readonly string[], pauses: readonly number[]): Promise<void> {
  return page.evaluate(
    async ([list, waits]) => {
      for (const [index, mark] of list.entries()) {
        await window.drive.wait(waits[index] as number)
        await window.drive.type('Conditions', `${window.drive.read('Conditions')} ${mark};`)
      }
    },
    [marks, pauses] as const,
  )
}

/** Opens a kept sheet in a page that shows another one, through the list. */
async function openKept(page: Page, id: string): Promise<void> {
  await page.getByRole('button', { name: 'My sheets', exact: true }).click()
  const row = page.locator(`[data-sheet="${id}"]`)
  await row.getByRole('button', { name: /^Open / }).click()
  await expect(page.getByRole('dialog')).toHaveCount(0)
}

test('two tabs on one sheet lose none of 500 interleaved changes', async ({ context }) => {
  test.setTimeout(1_800_000)
  await addDrivers(context)
  const seed = 4_711
  const random = createRandom(seed)
  const [first, second] = [await context.newPage(), await context.newPage()]
  await openPage(first)
  await first.evaluate(() => window.drive.type('Title of the sheet', 'Two tabs'))
  await expect.poll(async () => (await keptOf(first)).length).toBe(1)
  await openPage(second)

  const perTab = edits / rounds / 2
  const all: string[] = []
  for (let round = 0; round < rounds; round += 1) {
    const working = [first, second].map((page, tab) => {
      const marks = Array.from({ length: perTab }, (_, index) => `r${round}t${tab}e${index}`)
      all.push(...marks)
      return append(
        page,
        marks,
        marks.map(() => Math.floor(random() ** 2 * 60)),
      )
    })
    await Promise.all(working)
    // Both go on together, with the sheet that was changed last.
    await expect.poll(() => journalOf(first)).toEqual([])
    const [latest] = await keptOf(first)
    for (const page of [first, second]) await openKept(page, latest?.id ?? '')
  }

  expect(all).toHaveLength(edits)
  const kept = (await keptOf(first)).map(({ text }) => text).join('\n')
  expect(
    all.filter((mark) => !kept.includes(` ${mark};`)),
    `seed ${seed}`,
  ).toEqual([])
})

/** What the pages have noted and do not know to be kept yet. */
function journalOf(page: Page): Promise<readonly string[]> {
  return page.evaluate(() => Object.keys(localStorage).filter((key) => key.includes('unsaved')))
}

test('a tab shows what the other one typed, and takes it back on undo', async ({ context }) => {
  const [first, second] = [await context.newPage(), await context.newPage()]
  await openPage(first)
  const title = (page: Page) => page.getByLabel('Title of the sheet')
  await title(first).fill('One')
  await title(first).press('Enter')
  await expect.poll(async () => (await keptOf(first)).length).toBe(1)
  await openPage(second)
  await expect(title(second)).toHaveValue('One')
  await title(first).fill('Two')
  await title(first).press('Enter')
  await expect(title(second)).toHaveValue('Two')
  await second.getByRole('button', { name: 'Undo', exact: true }).click()
  await expect(title(first)).toHaveValue('One')
})
