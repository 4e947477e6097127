import type { Locator, Page } from '@playwright/test'
import { quick, type Sheet } from '../src/sheet'
import { benchSheet } from './support/bench'
import { figuresIn, textOf } from './support/figures'
import { openPage, settledSheet } from './support/page'
import { cell, typeInto } from './support/schedule'
import { sheetOf, typed } from './support/sheets'
import { expect, test } from './support/test'

test('a screen reader hears every phasor with its value', async ({ page }) => {
  await openPage(page, benchSheet)
  await expect(page.getByRole('table', { name: 'Phasors' })).toMatchAriaSnapshot(`
    - rowgroup:
      - row:
        - cell:
          - textbox "Label of I": I
        - cell "current"
        - cell "2.0 A":
          - textbox "Magnitude of I": 2.0 A
        - cell "0°":
          - textbox "Angle of I": 0°
      - row:
        - cell:
          - textbox "Label of V1": V1
        - cell "voltage"
        - cell "40 V":
          - textbox "Magnitude of V1": 40 V
        - cell "10°":
          - textbox "Angle of V1": 10°
      - row:
        - cell:
          - textbox "Label of V2": V2
        - cell "voltage"
        - cell "30 V":
          - textbox "Magnitude of V2": 30 V
        - cell "75°":
          - textbox "Angle of V2": 75°
      - row:
        - cell:
          - textbox "Label of V3": V3
        - cell "voltage"
        - cell "25 V":
          - textbox "Magnitude of V3": 25 V
        - cell "−60°":
          - textbox "Angle of V3": −60°
      - row:
        - cell:
          - textbox "Label of Vhung": Vhung
        - cell "voltage"
        - cell "15 V":
          - textbox "Magnitude of Vhung": 15 V
        - cell "150°":
          - textbox "Angle of Vhung": 150°
      - row:
        - cell:
          - textbox "Label of Vfree": Vfree
        - cell "voltage"
        - cell "20 V":
          - textbox "Magnitude of Vfree": 20 V
        - cell "90°":
          - textbox "Angle of Vfree": 90°
      - row:
        - cell:
          - textbox "Label of Vread": Vread
        - cell "voltage"
        - cell "22.5 V":
          - textbox "Magnitude of Vread": 22.5 V
        - cell "60°":
          - textbox "Angle of Vread": 60°
  `)
  const picture = page.getByRole('img', { name: 'Phasor diagram' })
  for (const { id, magnitude, angle } of quick(benchSheet).phasors) {
    const said = await picture.evaluate((image) => {
      const id = image.getAttribute('aria-describedby') ?? ''
      return document.getElementById(id)?.textContent ?? ''
    })
    const own = said.split(/[;.] /).find((part) => part.startsWith(`${id} `)) ?? ''
    const figures = figuresIn(own.slice(id.length))
    expect(figures[0]?.value, said).toBeCloseTo(magnitude as number, 3)
    expect(figures[1]?.value, said).toBeCloseTo(angle as number, 1)
  }
})

test('the result is announced after each edit', async ({ page }) => {
  const start = sheetOf({
    phasors: [typed('V1', '30', '0'), typed('V2', '40', '90'), typed('V3', '50', '53')],
    sums: [{ id: 's1', terms: [{ phasor: 'V1' }, { phasor: 'V2' }], equals: 'V3' }],
  })
  await openPage(page, start)
  const edits: readonly (readonly [string, () => Promise<void>])[] = [
    ['typing a magnitude', () => typeInto(page, 'Magnitude', 'V1', '35')],
    ['typing a limit', () => typeInto(page, 'Limit', 'V1', '0.5')],
    [
      'saying how a value is known',
      async () =>
        void (await page.getByRole('combobox', { name: 'How V3 is known' }).selectOption('read')),
    ],
    ['turning a sign', () => page.getByRole('button', { name: 'Sign of V2' }).click()],
    ['giving a label', () => typeInto(page, 'Label', 'V2', 'Vcoil')],
    ['moving a term', () => page.getByRole('button', { name: 'Move Vcoil earlier' }).click()],
    ['undoing', () => page.getByRole('button', { name: 'Undo', exact: true }).first().click()],
    ['redoing', () => page.getByRole('button', { name: 'Redo', exact: true }).click()],
    ['adding a phasor', () => page.getByRole('button', { name: 'Add phasor' }).click()],
    ['duplicating it', () => page.getByRole('button', { name: 'Duplicate' }).click()],
    ['deleting it', () => page.getByRole('button', { name: 'Delete', exact: true }).click()],
  ]
  const region = page.locator('[data-announcer]')
  await expect(region).toHaveAttribute('aria-live', 'polite')
  let sheet: Sheet = start
  let said = ''
  for (const [name, edit] of edits) {
    await test.step(name, async () => {
      const before = JSON.stringify(sheet)
      await edit()
      sheet = await settledSheet(page, (now) => JSON.stringify(now) !== before)
      await expect(region).not.toHaveText(said)
      said = await textOf(region)
      const { resultant, closingError } = quick(sheet).sums[0] ?? {}
      const heard = figuresIn(said.slice(said.indexOf('calculated')))
      expect(heard[0]?.value, said).toBeCloseTo(resultant?.magnitude as number, 1)
      expect(heard[1]?.value, said).toBeCloseTo(resultant?.angle as number, 0)
      expect(heard[2]?.value, said).toBeCloseTo(closingError?.magnitude as number, 1)
    })
  }
})

test('undoing twice is announced twice', async ({ page }) => {
  await openPage(page, sheetOf({ phasors: [typed('V1', '30', '0')] }))
  await typeInto(page, 'Magnitude', 'V1', '35')
  await typeInto(page, 'Magnitude', 'V1', '36')
  const region = page.locator('[data-announcer]')
  const undo = page.getByRole('button', { name: 'Undo', exact: true })
  await undo.click()
  await expect(cell(page, 'Magnitude', 'V1')).toHaveValue('35 V')
  await expect(region).toHaveText(/Und/)
  const changes = await region.evaluateHandle((element) => {
    const seen = { count: 0 }
    new MutationObserver((records) => {
      seen.count += records.length
    }).observe(element, { childList: true, characterData: true, subtree: true })
    return seen
  })
  await undo.click()
  await expect(cell(page, 'Magnitude', 'V1')).toHaveValue('30 V')
  await expect.poll(() => changes.evaluate(({ count }) => count)).toBeGreaterThan(0)
})

test('a dialog holds the focus, Escape closes it, and the focus returns to its verb', async ({
  page,
}) => {
  await openPage(page, benchSheet)
  for (const [verb, heading] of [
    ['Open', 'Open a sheet'],
    ['Paste rows', 'Rows from a spreadsheet'],
  ] as const) {
    const button = page.getByRole('button', { name: verb, exact: true })
    await button.focus()
    await page.keyboard.press('Enter')
    const dialog = page.getByRole('dialog', { name: heading })
    await expect(dialog).toBeVisible()
    expect(await holdsFocus(dialog)).toBe(true)
    for (let stop = 0; stop < 4; stop += 1) {
      await page.keyboard.press('Tab')
      const isOutside = await page.evaluate(
        () =>
          !document.activeElement?.closest('dialog') && document.activeElement !== document.body,
      )
      expect(isOutside, `Tab ${stop + 1} stays in “${heading}”`).toBe(false)
    }
    await page.keyboard.press('Escape')
    await expect(dialog).toHaveCount(0)
    await expect(button).toBeFocused()
  }
})

test('what moves with the focus is in sight: nothing is focused off the screen', async ({
  page,
}) => {
  await page.setViewportSize({ width: 390, height: 844 })
  await openPage(page, benchSheet)
  for (let stop = 0; stop < 25; stop += 1) {
    await page.keyboard.press('Tab')
    const box = await focusBox(page)
    expect(box.right, box.name).toBeGreaterThan(0)
    expect(box.left, box.name).toBeLessThan(390)
    expect(box.bottom, box.name).toBeGreaterThan(0)
    expect(box.top, box.name).toBeLessThan(844)
  }
})

async function holdsFocus(element: Locator): Promise<boolean> {
  return element.evaluate((found) => found.contains(document.activeElement))
}

async function focusBox(page: Page) {
  return page.evaluate(() => {
    const focused = document.activeElement ?? document.body
    const { left, right, top, bottom } = focused.getBoundingClientRect()
    const name = focused.getAttribute('aria-label') ?? focused.textContent ?? ''
    return { left, right, top, bottom, name }
  })
}
