import { browserFlags } from '../src/command/browser.mjs'
import { openPage, sheetInAddress } from './support/page'
import { cell } from './support/schedule'
import { sheetOf, typed } from './support/sheets'
import { expect, test } from './support/test'

// A browser limits how often a page may write its address, and the test runner lifts that limit unless
// its flag is left out.
test.use({
  launchOptions: {
    executablePath: process.env.PLAYWRIGHT_CHROMIUM_EXECUTABLE_PATH ?? '',
    args: browserFlags,
    ignoreDefaultArgs: ['--disable-ipc-flooding-protection'],
  },
})

const edits = 250

test('this browser ignores an address that is written too often', async ({ page }) => {
  await openPage(page)
  // Until one is ignored: how many it takes within the ten seconds depends on the machine.
  const ignored = await page.evaluate(() => {
    for (let at = 1; at <= 20_000; at += 1) {
      history.replaceState(null, '', `#${at}`)
      if (location.hash !== `#${at}`) return at
    }
    return undefined
  })
  expect(ignored).toBeGreaterThan(1)
})

test(`after ${edits} quick edits the address carries the last one`, async ({ page }) => {
  await openPage(
    page,
    sheetOf({
      phasors: [typed('V1', '10', '20'), typed('V2', '30', '-40')],
      sums: [{ id: 's1', terms: [{ phasor: 'V1' }, { phasor: 'V2' }] }],
    }),
  )
  // By the page's own button, as fast as the browser goes: a plus and a minus in turn.
  const sign = page.getByRole('button', { name: 'Sign of V1' })
  await sign.evaluate((button: HTMLButtonElement, count) => {
    for (let at = 1; at < count; at += 1) button.click()
  }, edits)
  await page.getByRole('combobox', { name: 'Quantity of V2' }).selectOption('current')
  await expect
    .poll(() => sheetInAddress(page)?.phasors[1]?.quantity, 'the last edit is in the address')
    .toBe('current')
  expect(sheetInAddress(page)?.sums?.[0]?.terms[0]).toMatchObject({ phasor: 'V1', sign: -1 })
  await expect(cell(page, 'Magnitude', 'V2')).toHaveValue('30 A')
  expect(await page.evaluate(() => history.length), 'steps back in the browser').toBeLessThan(3)
})
