import { type Reading, type Sheet, wordsOf } from '../src/sheet'
import { expectTermsOnBoard, savedByKeyboard } from './support/agreement'
import { expectCheckedAs } from './support/check-line'
import { press, tabTo } from './support/keyboard'
import { openPage, settledSheet } from './support/page'
import { nextReading, pickForNext, typeReading, wordsOfReading } from './support/readings'
import { cell } from './support/schedule'
import { sheetOf } from './support/sheets'
import { expect, test } from './support/test'

/*
 * An invented job: a feeder that splits into three lines in a switch room, read through one CT after
 * the other: four currents and three voltages, their angles, and the watts of the first line.
 */
const feeder: Sheet = sheetOf({
  title: 'Feeder 4, lower switch room',
  reference: 'V1',
  job: { date: '2026-11-20' },
  phasors: [
    { id: 'V1', label: 'V1', quantity: 'voltage' },
    { id: 'IA', label: 'IA', quantity: 'current' },
    { id: 'IB', label: 'IB', quantity: 'current' },
    { id: 'IC', label: 'IC', quantity: 'current' },
    { id: 'IF', label: 'IF', quantity: 'current' },
  ],
  sums: [
    {
      id: 's1',
      terms: [{ phasor: 'IA' }, { phasor: 'IB' }, { phasor: 'IC' }],
      equals: 'IF',
    },
  ],
  channels: [{ id: 'ct1', label: 'CT 200/5', ratio: { value: 40, text: '40', limit: 0.2 } }],
  instruments: [{ id: 'm1', name: 'Clamp meter', calibrationDue: '2026-10-31' }],
})

/** What the display shows, and for which reading the page stands ready by itself. */
const shown: readonly (readonly [string, string])[] = [
  ['V1, magnitude', '231.4'],
  ['IA, magnitude', '0.512'],
  ['IB, magnitude', '0.498'],
  ['IC, magnitude', '0.275'],
  ['IF, magnitude', '1.271'],
  ['IA, angle', '24.9 lags'],
  ['IB, angle', '31.5 lags'],
  ['IC, angle', '12.0 lags'],
  ['IF, angle', '24.6 lags'],
]

test('a twelve-reading feeder job is typed by keyboard alone', async ({ page }) => {
  // Hundreds of keys, one after the other: a busy machine is no reason to fail.
  test.setTimeout(900_000)
  await openPage(page, feeder)
  const { keyboard } = page
  await expect(page.getByRole('heading', { name: 'Readings' })).toBeVisible()

  await test.step('types what comes next, Enter after Enter', async () => {
    await tabTo(page, nextReading(page))
    for (const [ready, text] of shown.slice(0, 2)) await typeReading(page, ready, text)
    await throughTheTransformer()
    for (const [ready, text] of shown.slice(2)) await typeReading(page, ready, text)
  })

  await test.step('takes down watts, vars and a power factor of the first line', async () => {
    for (const [kind, ready, text] of [
      ['watts', 'V1, watts', '107.4'],
      ['vars', 'V1, vars', '49.9'],
      ['power factor', 'V1, power factor', '0.907 lags'],
    ] as const) {
      await pickForNext(page, 'Kind of the next reading', kind)
      await pickForNext(page, 'Phasor of the next reading', 'V1')
      await expect(page.getByRole('combobox', { name: 'Current of the next reading' })).toHaveValue(
        'IA',
      )
      await typeReading(page, ready, text)
    }
  })

  const sheet = await settledSheet(page, ({ readings }) => readings?.length === 12)
  await test.step('is told the currents in the line, and what each reading comes to', async () => {
    await expect(cell(page, 'Magnitude', 'IF')).toHaveValue(/^50\.8/)
    await expect(cell(page, 'Angle', 'IB')).toHaveValue(/^−31\.5/)
    for (const [index, reading] of (sheet.readings ?? []).entries()) {
      await expect(wordsOfReading(page, index + 1)).toHaveText(wordsOf(sheet, reading))
    }
    await expect(wordsOfReading(page, 6)).toHaveText('IA lags V1 by 24.9° ± 1° assumed')
  })

  await test.step('sees the same in the schedule, on the board, in the link and in the file', async () => {
    await expectCheckedAs(page, sheet)
    await expectTermsOnBoard(page, sheet)
    expect(await savedByKeyboard(page)).toEqual(sheet)
  })

  await test.step('reads where the calibration had lapsed', async () => {
    await tabTo(page, page.locator('summary').filter({ hasText: 'Instruments' }))
    await keyboard.press('Enter')
    await expect(
      page.getByText('was due on 2026-10-31, before the test of 2026-11-20'),
    ).toBeVisible()
  })

  await test.step('changes what is assumed in one place', async () => {
    await tabTo(page, page.locator('summary').filter({ hasText: 'Assumed limits' }), 'Shift+Tab')
    await keyboard.press('Enter')
    await tabTo(page, page.getByRole('textbox', { name: 'Assumed of angles, in degrees' }))
    await keyboard.type('0.5')
    await keyboard.press('Enter')
    await expect(wordsOfReading(page, 6)).toHaveText('IA lags V1 by 24.9° ± 0.5° assumed')
    await expect(wordsOfReading(page, 9)).toHaveText('IF lags V1 by 24.6° ± 0.5° assumed')
  })

  /** Says of the second reading what meter and what transformer it came through; later ones follow. */
  async function throughTheTransformer(): Promise<void> {
    await tabTo(page, page.getByLabel('More of reading 2'), 'Shift+Tab')
    await keyboard.press('Enter')
    await tabTo(page, page.getByRole('combobox', { name: 'Instrument' }))
    await keyboard.type('Clamp')
    await tabTo(page, page.getByRole('combobox', { name: 'Channel' }))
    await keyboard.type('CT')
    await tabTo(page, page.getByLabel('More of reading 2'), 'Shift+Tab')
    await keyboard.press('Enter')
    await tabTo(page, nextReading(page))
  }
})

test('rows of a spreadsheet become readings, and are copied back as they were', async ({
  page,
}) => {
  await openPage(page, feeder)
  await press(page, 'Paste readings')
  const rows = [
    'phasor\tkind\tshown\tagainst\tchannel\tlimit',
    'IA\tmagnitude\t0.512\t\tCT 200/5\t0.004',
    'V1\tmagnitude\t231.4 V\t\t\t',
    'V1\tshift\t0.55 of 8.00 leads\tIA\t\t',
    'IN\tmagnitude\t0.031 A\t\t\t',
  ]
  const field = page.getByRole('textbox', { name: /^One reading a row/ })
  await field.fill(`${rows.join('\n')}\nV9\tpower\t3 W`)
  await page.getByRole('button', { name: 'Add readings' }).click()
  await expect(page.getByText('Row 6: a power needs the current too.')).toBeVisible()
  await field.fill(rows.join('\n'))
  await page.getByRole('button', { name: 'Add readings' }).click()
  const sheet = await settledSheet(page, ({ readings }) => readings?.length === 4)
  const expected: readonly Omit<Reading, 'id'>[] = [
    { of: 'IA', kind: 'magnitude', shown: '0.512', channel: 'ct1', limit: 0.004 } as Reading,
    { of: 'V1', kind: 'magnitude', shown: '231.4 V' } as Reading,
    {
      of: 'V1',
      kind: 'shift',
      shift: '0.55',
      period: '8.00',
      sense: 'leads',
      against: 'IA',
    } as Reading,
    { of: 'IN', kind: 'magnitude', shown: '0.031 A' } as Reading,
  ]
  expect(sheet.readings?.map(({ id: _, ...reading }) => reading)).toEqual(expected)
  expect(sheet.phasors.find(({ id }) => id === 'IN')).toEqual({
    id: 'IN',
    label: 'IN',
    quantity: 'current',
  })
  await page.context().grantPermissions(['clipboard-read', 'clipboard-write'])
  await page.getByRole('button', { name: 'Copy readings' }).click()
  await expect(page.getByText('4 readings copied')).toBeVisible()
  const copied = await page.evaluate(() => navigator.clipboard.readText())
  expect(copied.split('\n')[3]).toBe('V1\tshift\t0.55 of 8.00 leads\tIA\t\t\t\t\t\t\t\t')
})
