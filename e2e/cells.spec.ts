import type { Phasor } from '../src/sheet'
import { openPage, settledSheet } from './support/page'
import { type Column, cell, typeInto } from './support/schedule'
import { sheetOf, typed } from './support/sheets'
import { expect, test } from './support/test'

/** What is typed, into which column, and what the sheet then holds of the phasor. */
interface Accepted {
  readonly text: string
  readonly column: Column
  readonly holds: Partial<Phasor>
}

/** In volts, over a phasor that was typed as 10 V at 20°. */
const accepted: readonly Accepted[] = [
  { text: '48.20', column: 'Magnitude', holds: { magnitude: { value: 48.2, text: '48.20' } } },
  { text: '48,2', column: 'Magnitude', holds: { magnitude: { value: 48.2, text: '48,2' } } },
  { text: '230 mV', column: 'Magnitude', holds: { magnitude: { value: 0.23, text: '230 mV' } } },
  { text: '1.5k', column: 'Magnitude', holds: { magnitude: { value: 1500, text: '1.5k' } } },
  { text: '4k7', column: 'Magnitude', holds: { magnitude: { value: 4700, text: '4k7' } } },
  { text: '0.24/3', column: 'Magnitude', holds: { magnitude: { value: 0.08, text: '0.24/3' } } },
  {
    text: '48.2 ∠ 82°',
    column: 'Magnitude',
    holds: { magnitude: { value: 48.2, text: '48.2' }, angle: { value: 82, text: '82°' } },
  },
  {
    text: '48.2 at 82',
    column: 'Real',
    holds: { magnitude: { value: 48.2, text: '48.2' }, angle: { value: 82, text: '82' } },
  },
  {
    text: '6.7+j47.7',
    column: 'Magnitude',
    holds: { real: { value: 6.7, text: '6.7' }, imaginary: { value: 47.7, text: '47.7' } },
  },
  {
    text: '6.7+47.7j',
    column: 'Real',
    holds: { real: { value: 6.7, text: '6.7' }, imaginary: { value: 47.7, text: '47.7' } },
  },
  {
    text: '-j12',
    column: 'Magnitude',
    holds: { real: { value: 0 }, imaginary: { value: -12 } },
  },
  { text: '-90', column: 'Angle', holds: { angle: { value: -90, text: '-90' } } },
  { text: '−90', column: 'Angle', holds: { angle: { value: -90, text: '−90' } } },
  { text: '1.5/10*360', column: 'Angle', holds: { angle: { value: 54, text: '1.5/10*360' } } },
  {
    text: '1.5 rad',
    column: 'Angle',
    holds: { angle: { value: (1.5 * 180) / Math.PI, text: '1.5 rad' } },
  },
  {
    text: '48.2 ± 0.5',
    column: 'Magnitude',
    holds: { magnitude: { value: 48.2, text: '48.2', limit: 0.5 } },
  },
  {
    text: '± 1 %',
    column: 'Limit',
    holds: { magnitude: { value: 10, text: '10', limit: 0.1 } },
  },
  {
    text: '0.2 V; 1.5°',
    column: 'Limit',
    holds: {
      magnitude: { value: 10, text: '10', limit: 0.2 },
      angle: { value: 20, text: '20', limit: 1.5 },
    },
  },
]

test('a cell accepts every form in which a technician writes a value, and keeps its digits', async ({
  page,
}) => {
  const labels = accepted.map((_, at) => `V${at + 1}`)
  await openPage(page, sheetOf({ phasors: labels.map((label) => typed(label, '10', '20')) }))
  for (const [at, { text, column }] of accepted.entries()) {
    await typeInto(page, column, `V${at + 1}`, text)
  }
  await expect(page.getByRole('alert')).toHaveCount(0)
  const last = labels.length - 1
  const { phasors } = await settledSheet(
    page,
    (sheet) => sheet.phasors[last]?.angle?.limit !== undefined,
  )
  for (const [at, { text, holds }] of accepted.entries()) {
    const { id: _, label: __, quantity: ___, ...parts } = phasors[at] as Phasor
    const untouched =
      'angle' in holds || 'real' in holds ? {} : { angle: { value: 20, text: '20' } }
    const kept =
      'magnitude' in holds || 'real' in holds ? {} : { magnitude: { value: 10, text: '10' } }
    expect(rounded(parts), text).toMatchObject(rounded({ ...kept, ...untouched, ...holds }))
    expect(Object.keys(parts).sort(), text).toEqual(
      Object.keys({ ...kept, ...untouched, ...holds }).sort(),
    )
  }
})

test('what was typed in one form is shown in the other', async ({ page }) => {
  await openPage(page, sheetOf({ phasors: [typed('V1', '10', '20')] }))
  await typeInto(page, 'Magnitude', 'V1', '3.0 + j4.0')
  await expect(cell(page, 'Magnitude', 'V1')).toHaveValue('5.0 V')
  await expect(cell(page, 'Angle', 'V1')).toHaveValue('53.1°')
  await typeInto(page, 'Magnitude', 'V1', '20.0 at -90')
  await expect(cell(page, 'Real', 'V1')).toHaveValue('0.0 V')
  await expect(cell(page, 'Imaginary', 'V1')).toHaveValue('−20.0 V')
})

const refused: readonly (readonly [Column, string])[] = [
  ['Magnitude', 'twelve'],
  ['Magnitude', '-5'],
  ['Magnitude', '48.2 A'],
  ['Magnitude', '1e400'],
  ['Magnitude', '5/0'],
  ['Angle', 'NaN'],
  ['Angle', '3 V'],
  ['Limit', '± 5 A'],
  ['Label', '<b>V1</b>'],
  ['Label', 'V\u202e1'],
]

test('what a cell cannot read stays in it, with a sentence below, and the old value stays', async ({
  page,
}) => {
  await openPage(page, sheetOf({ phasors: [typed('V1', '10', '20'), typed('V2', '10', '20')] }))
  const undo = page.getByRole('button', { name: 'Undo', exact: true })
  for (const [column, text] of refused) {
    await test.step(`${column}: ${JSON.stringify(text)}`, async () => {
      const field = cell(page, column, 'V1')
      const old = await field.inputValue()
      await field.click()
      await field.fill(text)
      await field.press('Enter')
      const sentence = page.getByRole('alert')
      await expect(sentence).toHaveText(/^[\p{Lu}“].{12,}\.$/u)
      await expect(field).toBeFocused()
      await expect(field).toHaveValue(text)
      await expect(field).toHaveAttribute('aria-invalid', 'true')
      await expect(field).toHaveAccessibleDescription(/.{12,}\.$/)
      const [above, below] = [await field.boundingBox(), await sentence.boundingBox()]
      expect(below?.y).toBeGreaterThanOrEqual((above?.y ?? 0) + (above?.height ?? 0) - 2)
      expect(below?.x).toBeGreaterThanOrEqual(0)

      await page.getByRole('heading', { name: 'Phasors' }).click()
      await expect(field).toHaveValue(text)
      await expect(sentence).toBeVisible()
      await field.click()
      await field.press('Escape')
      await expect(sentence).toHaveCount(0)
      await field.blur()
      await expect(field).toHaveValue(old)
      await expect(undo).toBeDisabled()
    })
  }
})

test('undo works in a cell: what is being typed first, then the last edit', async ({ page }) => {
  await openPage(page, sheetOf({ phasors: [typed('V1', '10', '20'), typed('V2', '30', '40')] }))
  await typeInto(page, 'Magnitude', 'V1', '12')
  await expect(cell(page, 'Magnitude', 'V2')).toBeFocused()
  await page.keyboard.type('99')
  await page.keyboard.press('Control+z')
  await expect(cell(page, 'Magnitude', 'V1')).toHaveValue('12 V')
  await page.keyboard.press('Escape')
  await page.keyboard.press('Control+z')
  await expect(cell(page, 'Magnitude', 'V1')).toHaveValue('10 V')
  await expect(cell(page, 'Magnitude', 'V2')).toBeFocused()
  await expect(page.getByRole('button', { name: 'Undo', exact: true })).toBeDisabled()
  await page.keyboard.press('Control+Shift+z')
  await expect(cell(page, 'Magnitude', 'V1')).toHaveValue('12 V')
  await cell(page, 'Magnitude', 'V2').blur()
  await expect(cell(page, 'Magnitude', 'V2')).toHaveValue('30 V')
})

test('a value that is read again replaces the reading and stays a reading', async ({ page }) => {
  await openPage(page, sheetOf({ phasors: [typed('V1', '10', '20'), typed('V2', '30', '40')] }))
  const known = page.getByRole('combobox', { name: 'How V2 is known' })
  await known.selectOption('read')
  await typeInto(page, 'Magnitude', 'V2', '31.5')
  const { phasors, readings } = await settledSheet(
    page,
    (sheet) =>
      sheet.readings?.some((reading) => 'shown' in reading && reading.shown === '31.5') ?? false,
  )
  expect(phasors[1]).toEqual({ id: 'V2', label: 'V2', quantity: 'voltage' })
  expect(readings?.map(({ kind, of }) => [kind, of])).toEqual([
    ['magnitude', 'V2'],
    ['angle', 'V2'],
  ])
  await expect(known).toHaveValue('read')
})

/** The same with figures to twelve digits, which is how far radians and quotients go. */
function rounded<Value>(value: Value): Value {
  return JSON.parse(
    JSON.stringify(value, (_, part) =>
      typeof part === 'number' ? Number(part.toPrecision(12)) : part,
    ),
  ) as Value
}
