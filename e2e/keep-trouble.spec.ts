import { exampleSheet, serializeLink } from '../src/sheet'
import { keptOf, writeKept } from './support/kept'
import { isDrawn, openPage } from './support/page'
import { expect, test } from './support/test'

const titleField = 'Title of the sheet'

test('a full store is said in one sentence, and the sheet can be saved to a file', async ({
  page,
}) => {
  await page.addInitScript(() => {
    const { put } = IDBObjectStore.prototype
    IDBObjectStore.prototype.put = function (...given) {
      if (document.documentElement.dataset.full) {
        throw new DOMException('There is no room.', 'QuotaExceededError')
      }
      return put.apply(this, given)
    }
  })
  const setFull = (isFull: boolean) =>
    page.evaluate((full) => {
      document.documentElement.dataset.full = full ? 'true' : ''
    }, isFull)
  await openPage(page)
  await setFull(true)
  await page.getByLabel(titleField).fill('No room left')
  await page.getByLabel(titleField).press('Enter')
  const problem = page.locator('[data-keep-problem]')
  await expect(problem).toContainText("The browser's store is full")
  await expect(page.getByLabel(titleField)).toHaveValue('No room left')
  const coming = page.waitForEvent('download')
  await problem.getByRole('button', { name: 'Save to a file' }).click()
  expect((await coming).suggestedFilename()).toBe('V-118 No room left.phasogon.json')

  await setFull(false)
  await page.getByLabel(titleField).fill('Room again')
  await page.getByLabel(titleField).press('Enter')
  await expect(problem).toHaveCount(0)
  await expect
    .poll(async () => (await keptOf(page)).map(({ title }) => title))
    .toEqual(['Room again'])
})

test('a browser that keeps nothing is said in one sentence, and the page works', async ({
  page,
}) => {
  await page.addInitScript(() => {
    Object.defineProperty(window, 'indexedDB', {
      get: () => {
        throw new DOMException('The page may not keep anything.', 'SecurityError')
      },
    })
  })
  await openPage(page)
  await page.getByLabel(titleField).fill('Private')
  await page.getByLabel(titleField).press('Enter')
  await expect(page.locator('[data-keep-problem]')).toContainText('keeps nothing for the page')
  await expect(page).toHaveTitle(/^Private/)
})

test('a spoiled record is left as it is, said, and can be saved', async ({ page }) => {
  await openPage(page)
  await page.getByLabel(titleField).fill('Sound')
  await page.getByLabel(titleField).press('Enter')
  await expect.poll(async () => (await keptOf(page)).length).toBe(1)
  await writeKept(page, 'sheet:spoiled', { id: 'spoiled', text: '{"title":"Half a sheet' })
  await page.reload()
  await isDrawn(page)
  await expect(page.getByLabel(titleField)).toHaveValue('Sound')
  await expect(page.getByText('A kept sheet cannot be read and was left untouched')).toBeVisible()
  await page.getByRole('button', { name: 'My sheets', exact: true }).click()
  const coming = page.waitForEvent('download')
  await page.getByRole('button', { name: 'Save what there is' }).click()
  expect((await coming).suggestedFilename()).toBe('Unreadable sheet spoiled.json')
})

test('a store of a newer version is left alone, and said', async ({ page }) => {
  await openPage(page)
  await page.getByLabel(titleField).fill('Kept by the newer one')
  await page.getByLabel(titleField).press('Enter')
  await expect.poll(async () => (await keptOf(page)).length).toBe(1)
  await writeKept(page, 'store', { version: 7 })
  const before = await keptOf(page)
  await page.goto('about:blank')
  await openPage(page)
  await expect(page.locator('[data-keep-problem]')).toContainText('a newer version of the page')
  await page.getByLabel(titleField).fill('Made by the old one')
  await page.getByLabel(titleField).press('Enter')
  await page.waitForTimeout(300)
  expect(await keptOf(page)).toEqual(before)
})

test('a clock that was set back is said, and the order stays right', async ({ page }) => {
  await openPage(page)
  await page.getByLabel(titleField).fill('Before')
  await page.getByLabel(titleField).press('Enter')
  await expect.poll(async () => (await keptOf(page)).length).toBe(1)
  await page.clock.setFixedTime(new Date('2001-02-03T04:05:06Z'))
  await page.reload()
  await isDrawn(page)
  await expect(page.getByText('The clock of this device stands before')).toBeVisible()
  await page.getByRole('button', { name: 'New sheet', exact: true }).click()
  await page.getByLabel(titleField).fill('After')
  await page.getByLabel(titleField).press('Enter')
  await expect
    .poll(async () => (await keptOf(page)).map(({ title }) => title))
    .toEqual(['After', 'Before'])
})

test('anyone else’s link shows first what was concluded, replaces nothing, and can be made one’s own', async ({
  page,
}) => {
  await openPage(page)
  await page.getByLabel(titleField).fill('My own')
  await page.getByLabel(titleField).press('Enter')
  await expect.poll(async () => (await keptOf(page)).length).toBe(1)
  const theirs = {
    ...exampleSheet,
    title: 'Their sheet',
    job: { ...exampleSheet.job, testedBy: 'N. Example' },
    report: { conclusion: 'The choke is sound.' },
  }
  await page.goto('about:blank')
  await openPage(page, theirs)
  const banner = page.getByRole('region', { name: 'Copy' })
  await expect(banner).toContainText('“Their sheet” (job V-118), tested by N. Example')
  const concluded = banner.getByRole('list', { name: 'What was concluded' }).getByRole('listitem')
  await expect(concluded.first()).toHaveText('The choke is sound.')
  await expect(concluded.nth(1)).toContainText('VS: calculated 48.34 V')
  expect((await keptOf(page)).map(({ title }) => title)).toEqual(['My own'])
  await banner.getByRole('button', { name: 'Make it mine' }).click()
  await expect(banner).toHaveCount(0)
  await expect
    .poll(async () => (await keptOf(page)).map(({ title }) => title))
    .toEqual(['Their sheet', 'My own'])
})

test('one’s own stale link shows the newer state that was kept', async ({ page }) => {
  await openPage(page)
  await page.getByLabel(titleField).fill('Newer')
  await page.getByLabel(titleField).press('Enter')
  await page.getByLabel(titleField).fill('Newest')
  await page.getByLabel(titleField).press('Enter')
  await expect.poll(async () => (await keptOf(page))[0]?.title).toBe('Newest')
  const link = serializeLink({ ...exampleSheet, title: 'Newer' })
  await page.goto('about:blank')
  await page.goto(`./${link}`)
  await isDrawn(page)
  await expect(page.getByLabel(titleField)).toHaveValue('Newest')
  await page.getByRole('button', { name: 'Open the earlier state as a copy' }).click()
  await expect(page.getByLabel(titleField)).toHaveValue('Newer')
  expect((await keptOf(page)).map(({ title }) => title)).toEqual(['Newest'])
})
