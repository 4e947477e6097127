import type { Page } from '@playwright/test'
import type { Sheet } from '../src/sheet'
import { expectTermsOnBoard, savedByKeyboard } from './support/agreement'
import { arrowOf, sceneOf } from './support/board'
import { expectCheckedAs } from './support/check-line'
import { addPhasor, choose, press, tabTo } from './support/keyboard'
import { openPage, settledSheet } from './support/page'
import { nextReading, pickForNext, typeReading, wordsOfReading } from './support/readings'
import { cell } from './support/schedule'
import { expect, test } from './support/test'

/*
 * An invented job: a heater bank behind a series choke and a length of cable, on a 48 V control supply.
 * One clamp with four turns through it, one bench meter, and a scope that counts divisions.
 */
const voltages = ['Vcable', 'Vchoke', 'Vheater', 'VS'] as const

test('a four-voltage job is taken down as shown, by keyboard alone', async ({ page }) => {
  // Hundreds of keys, one after the other: a busy machine is no reason to fail.
  test.setTimeout(900_000)
  await openPage(page)
  const { keyboard } = page

  await test.step('names the phasors and the sum', async () => {
    await press(page, 'New sheet')
    await addPhasor(page, 'I', 'current')
    for (const label of voltages) await addPhasor(page, label, 'voltage')
    await addSum(page)
  })

  await test.step('enters the bench meter with what its maker promises', async () => {
    await openPart(page, 'Instruments')
    await press(page, 'Add instrument')
    await tabTo(page, page.getByRole('textbox', { name: 'Name', exact: true }), 'Shift+Tab')
    await keyboard.press('Control+a')
    await keyboard.type('Bench meter')
    await tabTo(page, page.getByRole('textbox', { name: 'As the maker prints it' }))
    await keyboard.type('±(0.7 % + 3 digits)')
    await keyboard.press('Enter')
    await expect(page.getByText('voltage: ±(0.7 % + 3 digits)')).toBeVisible()
  })

  await test.step('types one magnitude after the other', async () => {
    await tabTo(page, nextReading(page), 'Shift+Tab')
    await typeReading(page, 'I, magnitude', '6.20, 4 turns')
    await typeReading(page, 'Vcable, magnitude', '1.55')
    await tabTo(page, page.getByLabel('More of reading 2'), 'Shift+Tab')
    await keyboard.press('Enter')
    await tabTo(page, page.getByRole('combobox', { name: 'Instrument' }))
    await keyboard.type('Bench')
    await tabTo(page, nextReading(page))
    await typeReading(page, 'Vchoke, magnitude', '31.0')
    await typeReading(page, 'Vheater, magnitude', '31.0')
    await typeReading(page, 'VS, magnitude', '46.4')
  })

  await test.step('types the angles as the scope and the phase meter show them', async () => {
    await expect(nextReading(page)).toHaveAccessibleName(/of Vcable, angle$/)
    await typeReading(page, 'Vcable, angle', '0')
    await pickForNext(page, 'Kind of the next reading', 'shift')
    await typeReading(page, 'Vchoke, shift', '1.80 of 8.00 leads')
    await typeReading(page, 'Vheater, shift', '0 of 8.00 lags')
    await typeReading(page, 'VS, shift', '0.97 of 8.00 leads')
  })

  const sheet = await settledSheet(page, ({ readings }) => readings?.length === 9)
  await test.step('is told what each comes to', async () => {
    await expect(wordsOfReading(page, 1)).toHaveText(
      '6.20 A shown, 4 turns: 1.550 A ± 0.016 A assumed',
    )
    await expect(wordsOfReading(page, 3)).toHaveText('31.0 V ± 0.52 V')
    await expect(wordsOfReading(page, 7)).toHaveText(
      '1.80 of 8.00 shown: Vchoke leads I by 81.0° ± 1° assumed',
    )
    expect(sheet.readings?.map(({ instrument }) => instrument)).toEqual([
      undefined,
      ...Array(4).fill(sheet.instruments?.[0]?.id),
      ...Array(4).fill(undefined),
    ])
  })

  await test.step('sees the same in the schedule, on the board, in the link and in the file', async () => {
    await expect(cell(page, 'Magnitude', 'I')).toHaveValue(/^1\.55/)
    await expect(cell(page, 'Angle', 'Vchoke')).toHaveValue(/^81/)
    await expect(cell(page, 'Angle', 'VS')).toHaveValue(/^43\.6/)
    await expectCheckedAs(page, sheet)
    await expectTermsOnBoard(page, sheet)
    expectTrueToScale(sheet)
    expect(await savedByKeyboard(page)).toEqual(sheet)
  })

  await test.step('catches nonsense, and strikes it out', async () => {
    await tabTo(page, nextReading(page), 'Shift+Tab')
    await keyboard.type('9.1 of 8.00 lags')
    await keyboard.press('Enter')
    await expect(page.getByText('is longer than the period of 8.00')).toBeVisible()
    await tabTo(page, page.getByLabel('More of reading 10'), 'Shift+Tab')
    await keyboard.press('Enter')
    await press(page, 'Strike it out')
    await expect(wordsOfReading(page, 10)).toHaveText('Struck out: kept, and not used.')
    await expect(page.getByText('is longer than the period of 8.00')).toHaveCount(0)
  })
})

/** The first three voltages must add up to the last. */
async function addSum(page: Page): Promise<void> {
  await press(page, 'Add sum')
  for (const label of voltages.slice(0, 3)) {
    await tabTo(page, page.getByRole('combobox', { name: 'Add a term to the sum' }), 'Shift+Tab')
    await choose(page, label)
    await tabTo(page, page.getByRole('button', { name: 'Add sum' }))
  }
  await tabTo(page, page.getByRole('combobox', { name: 'What the sum must equal' }), 'Shift+Tab')
  await choose(page, 'VS')
}

async function openPart(page: Page, name: string): Promise<void> {
  await tabTo(page, page.locator('summary').filter({ hasText: name }))
  await page.keyboard.press('Enter')
}

/** What was measured is drawn as long, and at the angle, as it was read. */
function expectTrueToScale(sheet: Sheet): void {
  const scene = sceneOf(sheet)
  const { from, to } = arrowOf(scene, `measured:${sheet.sums?.[0]?.id}`)
  const millimetres = Math.hypot(to.x - from.x, to.y - from.y)
  expect((millimetres / 10) * (scene.unitsPerCentimetre.voltage ?? 0)).toBeCloseTo(46.4, 9)
  expect((Math.atan2(to.y - from.y, to.x - from.x) * 180) / Math.PI).toBeCloseTo(43.65, 9)
}
