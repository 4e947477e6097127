import { readFile } from 'node:fs/promises'
import { comparisonRows, powerRows } from '../src/drawing/circuit'
import { foundBesideMark, type Sheet } from '../src/sheet'
import { evaluate } from '../src/sheet/estimate'
import {
  addElement,
  brakeSheet,
  circuitOf,
  comparedRow,
  readOff,
  typeInCircuit,
} from './support/circuit'
import { openPage, settledSheet } from './support/page'
import { expect, test } from './support/test'

/** The sentences about what was found of an element, as Node has them. */
function foundOf(sheet: Sheet, id: string): readonly string[] {
  const element = sheet.elements?.find((each) => each.id === id)
  const found = evaluate(sheet).elements?.find((each) => each.id === id)
  if (!element || !found) throw new Error(`Nothing was found of ${id}.`)
  return foundBesideMark(sheet, element, found).map(({ text }) => text)
}

test('a circuit is built with words, readings are typed, and verdicts and values are read', async ({
  page,
}) => {
  // Many fields, one after the other: a busy machine is no reason to fail.
  test.setTimeout(600_000)
  await openPage(page)
  await page.getByRole('button', { name: 'New sheet' }).click()
  const circuit = circuitOf(page)

  await test.step('builds it, part by part, and nests one in the other', async () => {
    await circuit.getByRole('button', { name: 'Start in series' }).click()
    await addElement(page, 'resistor', 'series', 'the whole circuit')
    await page.keyboard.type('47 ± 1 %')
    await page.keyboard.press('Enter')
    await addElement(page, 'coil', 'series', 'the whole circuit')
    await page.keyboard.type('8.2')
    await page.keyboard.press('Enter')
    await typeInCircuit(page, 'Inductance of coil', '150 mH')
    await addElement(page, 'capacitor', 'parallel', 'coil')
    await page.keyboard.type('16 µF ± 5 %')
    await page.keyboard.press('Enter')
    await typeInCircuit(page, 'Frequency of the supply, in Hz', '50')
    await typeInCircuit(page, 'Magnitude of VS, typed', '230')
    const { circuit: built } = await settledSheet(page, ({ elements }) => elements?.length === 3)
    expect(built).toEqual({
      series: [{ element: 'R' }, { parallel: [{ element: 'coil' }, { element: 'C' }] }],
    })
  })

  await test.step('reads what the meters should show', async () => {
    await expect(comparedRow(page, 'VR')).toContainText('125.3 V ± ')
    await expect(comparedRow(page, 'VR')).toContainText('not measured')
    await expect(comparedRow(page, 'VS')).toContainText('drives it')
  })

  await readOff(page, [
    ['I', 'magnitude', '2.66'],
    ['I', 'angle', '45.1 lags'],
    ['VR', 'magnitude', '125.0'],
    ['Vcoil', 'magnitude', '166.5'],
    ['IC', 'magnitude', '0.840'],
    ['Icoil', 'magnitude', '3.48'],
  ])
  const sheet = await settledSheet(page, ({ readings }) => readings?.length === 6)
  const evaluation = evaluate(sheet)

  await test.step('reads a verdict for each quantity, as Node has it', async () => {
    for (const { label, verdict, parts } of comparisonRows(sheet, evaluation)) {
      await expect(comparedRow(page, label)).toContainText(verdict)
      for (const { predicted, measured } of parts) {
        await expect(comparedRow(page, label)).toContainText(predicted)
        await expect(comparedRow(page, label)).toContainText(measured)
      }
    }
    expect(evaluation.comparison?.filter(({ agrees }) => agrees)).toHaveLength(5)
  })

  await test.step('reads what was found beside each mark, and the powers', async () => {
    expect(foundOf(sheet, 'C').join()).toMatch(/found, 16 µF ± 5 % marked: within tolerance/)
    for (const id of ['R', 'coil', 'C']) {
      for (const text of foundOf(sheet, id)) await expect(circuit.getByText(text)).toBeVisible()
    }
    const total = powerRows(sheet, evaluation).at(-1)
    await expect(comparedRow(page, 'Total').last()).toContainText(total?.active ?? '?')
    await expect(comparedRow(page, 'Total').last()).toContainText('lags')
  })

  await test.step('is told where an edit by hand parts the sheet from its circuit', async () => {
    const sum = page.getByRole('group', { name: /VS/ }).first()
    await sum.getByRole('button', { name: /^Delete sum/ }).click()
    await expect(circuit.getByText(/^No sum adds up the voltages of R and/)).toBeVisible()
    await page.getByRole('button', { name: 'Undo', exact: true }).first().click()
    await expect(circuit.getByText(/^No sum adds up/)).toHaveCount(0)
  })

  await test.step('prints the comparison', async () => {
    await page.getByRole('button', { name: 'Report', exact: true }).click()
    const pages = page.getByRole('dialog').locator('.page-paper')
    const printed = async () => (await pages.allTextContents()).join('\n')
    await expect.poll(printed).toContain('Predicted and measured')
    const text = await printed()
    for (const { parts, verdict } of comparisonRows(sheet, evaluation)) {
      expect(text).toContain(verdict)
      for (const { predicted } of parts) expect(text).toContain(predicted)
    }
  })
})

test('a bad capacitor is found as such, and the drawings say so', async ({ page }) => {
  test.setTimeout(600_000)
  await openPage(page, brakeSheet())
  const circuit = circuitOf(page)
  await expect(comparedRow(page, 'VC')).toContainText('283')
  await readOff(page, [
    ['I', 'magnitude', '1.130'],
    ['I', 'angle', '74.3 leads'],
    ['VR', 'magnitude', '53.1'],
    ['VC', 'magnitude', '274.6'],
  ])
  const sheet = await settledSheet(page, ({ readings }) => readings?.length === 4)

  const [text = ''] = foundOf(sheet, 'C')
  expect(text).toMatch(
    /^Run capacitor: 13\.1\d? µF ± [\d.]+ µF found, 16 µF ± 5 % marked: below tolerance\.$/,
  )
  await expect(circuit.getByText(text)).toBeVisible()
  await expect(comparedRow(page, 'I')).toContainText('differs')
  await expect(
    page
      .getByRole('region', { name: 'Best values' })
      .getByText(/^The voltage of Run capacitor, 28\d[.\d]* V.*, is above/),
  ).toBeVisible()
  await expect(
    circuit.getByText(/^Run capacitor, at 28.*licensed practice have the last word\.$/),
  ).toBeVisible()

  await test.step('counts the mark in the check instead, and the readings do not agree with it', async () => {
    await circuit.getByRole('checkbox', { name: 'Run capacitor counts in the check' }).check()
    await expect(page.getByRole('region', { name: 'Best values' })).toContainText(
      'READINGS DO NOT AGREE',
    )
    await page.getByRole('button', { name: 'Undo', exact: true }).first().click()
  })

  await test.step('is told how far the readings are from a mark with the wrong prefix', async () => {
    await typeInCircuit(page, 'Inductance of coil', '150 H')
    await expect(
      circuit.getByText(/150 H .*by a factor of about 1.?000: look at the prefix/),
    ).toBeVisible()
    await page.getByRole('button', { name: 'Undo', exact: true }).first().click()
  })

  await test.step('takes the power triangle and the schematic away as drawings', async () => {
    await circuit.getByRole('radio', { name: 'Power triangle' }).check()
    await expect(circuit.getByRole('img', { name: /^Power of the whole circuit/ })).toBeVisible()
    const coming = page.waitForEvent('download')
    await circuit.getByRole('button', { name: 'Save this diagram, SVG' }).click()
    expect(await readFile(await (await coming).path(), 'utf8')).toContain('the current leads')
    const whole = page.waitForEvent('download')
    await page.getByRole('button', { name: 'Save drawing' }).click()
    await page.getByRole('button', { name: 'SVG, true to scale' }).click()
    const drawn = await readFile(await (await whole).path(), 'utf8')
    expect(drawn).toContain('>Run capacitor<')
    expect(drawn).toContain('id="phasogon-predicted"')
  })
})
