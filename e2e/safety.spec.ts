import { readFile } from 'node:fs/promises'
import type { Page } from '@playwright/test'
import type { Sheet } from '../src/sheet'
import { benchSheet } from './support/bench'
import { chooseFile, saveDrawing } from './support/files'
import { openPage } from './support/page'
import { cell } from './support/schedule'
import { sheetOf, typed } from './support/sheets'
import { expect, test } from './support/test'

/** Texts that would run, or turn the writing round, in a page that trusts what it shows. */
const attack =
  '"><img src=x onerror=window.ran=1><script>window.ran=1</script><svg onload=window.ran=1>'
const turned = '\u202eabc\u2066'

const hostile: Sheet = sheetOf({
  title: `${attack}${turned}`,
  revision: attack.slice(0, 40),
  job: {
    number: attack,
    site: attack,
    circuit: `${turned}${attack}`,
    testedBy: 'javascript:window.ran=1',
  },
  phasors: [
    typed('V1', '10', '20'),
    // Written as letters, a label may hold what only looks like markup.
    typed('V2', '30', '40', { label: 'V2 & "a" < b' }),
    typed('V3', '30', '40', { label: 'Vא1' }),
  ],
  sums: [{ id: 's1', label: 'S&<1', terms: [{ phasor: 'V1' }, { phasor: 'V2' }] }],
})

test('nothing that a sheet says is run or taken for markup, on screen or in a drawing', async ({
  page,
}) => {
  await openPage(page, hostile)
  await expect(page.getByRole('textbox', { name: 'Title of the sheet' })).toHaveValue(hostile.title)
  await expect(page).toHaveTitle(new RegExp(attack.slice(0, 12)))
  await expect(page.locator('img[src], script:not([src]), [onload], [onerror]')).toHaveCount(0)
  const saved = await saveDrawing(page, /^SVG/)
  expect(saved.name).not.toMatch(/[<>:"/\\|?*\u202e]/)

  await chooseFile(page, saved.path)
  await expect(cell(page, 'Magnitude', 'V1')).toHaveValue('10 V')
  await expectNothingRan(page)

  const drawing = await page.context().newPage()
  await drawing.goto(`file://${saved.path}`)
  await expect(drawing.locator('svg')).toHaveCount(1)
  await expect(
    drawing.locator('img, script, [onload], [onerror], foreignObject, [style]'),
  ).toHaveCount(0)
  await expectNothingRan(drawing)
})

test('a file that holds no sheet is refused in a sentence, and the open sheet stays', async ({
  page,
}) => {
  await openPage(page, benchSheet)
  const files: readonly (readonly [name: string, text: string, says: RegExp])[] = [
    ['note.txt', 'bring the ladder', /sheet/],
    ['drawing.svg', '<svg xmlns="http://www.w3.org/2000/svg" onload="window.ran=1"/>', /no sheet/],
    ['huge.json', JSON.stringify({ ...benchSheet, notes: 'x'.repeat(5_000_001) }), /5 MB/],
    ['infinite.json', JSON.stringify(benchSheet).replace('"value":40', '"value":1e400'), /value/],
    ['later.json', JSON.stringify({ ...benchSheet, version: 2 }), /newer/],
    ['polluted.json', '{"__proto__":{"ran":1},"format":"phasogon-sheet"}', /\.$/m],
  ]
  for (const [name, text, says] of files) {
    await test.step(name, async () => {
      await chooseFile(page, { name, mimeType: 'text/plain', buffer: Buffer.from(text) })
      const notice = page.getByRole('alert').filter({ hasText: `“${name}” was not opened` })
      await expect(notice).toBeVisible()
      await expect(notice.getByRole('paragraph')).toHaveText(says)
      await expect(cell(page, 'Magnitude', 'Vread')).toHaveValue('22.5 V')
      await notice.getByRole('button', { name: 'Put away' }).click()
    })
  }
  await expectNothingRan(page)
})

test('the policy of the page stops code that is made of text, and styles in attributes', async ({
  page,
  faults,
}) => {
  await openPage(page)
  await page.evaluate(() => {
    // From a timer: what the test runner calls itself is not bound by the page's policy.
    setTimeout(() => {
      try {
        Reflect.set(window, 'made', new Function('return 1')())
      } catch (error) {
        Reflect.set(window, 'stopped', String(error))
      }
    }, 0)
    const image = document.createElement('div')
    image.innerHTML = '<i style="color:red" onclick="window.ran=1">x</i>'
    document.body.append(image)
    image.querySelector('i')?.click()
    image.remove()
  })
  await expect.poll(() => page.evaluate(() => Reflect.get(window, 'stopped'))).toMatch(/EvalError/)
  expect(await page.evaluate(() => Reflect.get(window, 'made'))).toBeUndefined()
  await expectNothingRan(page)
  await expect.poll(() => faults.seen.join('\n')).toMatch(/script-src/)
  expect(faults.seen.join('\n')).toMatch(/style-src/)
  faults.seen.length = 0
})

test('the policy stands in the page itself, as strict as the one for servers', async ({ page }) => {
  const response = await page.goto('./')
  const inPage = await page
    .locator('meta[http-equiv="Content-Security-Policy"]')
    .getAttribute('content')
  const headers = JSON.parse(await readFile('.config/headers.json', 'utf8')) as Record<
    string,
    string
  >
  expect(inPage).toBe(headers['Content-Security-Policy'])
  expect(inPage).toContain("default-src 'none'")
  expect(inPage).not.toMatch(/unsafe|\*/)
  expect(response?.headers()['content-security-policy']).toBe(inPage)
})

test('once it has loaded, the page asks for nothing but its own later parts', async ({ page }) => {
  const asked: string[] = []
  page.on('request', (request) => asked.push(request.url()))
  await openPage(page)
  await expect(page.locator('html')).toHaveAttribute('data-settled', 'true')
  const atFirst = asked.length
  expect(atFirst).toBeGreaterThan(3)

  await page.getByRole('button', { name: 'Paste rows' }).click()
  const dialog = page.getByRole('dialog')
  await dialog.getByRole('textbox').fill('V8\t1\t2')
  await dialog.getByRole('button', { name: 'Add rows' }).click()
  await expect(cell(page, 'Magnitude', 'V8')).toHaveValue('1 V')
  await saveDrawing(page, /^SVG/)
  await saveDrawing(page, /^PNG/)
  await page.getByRole('button', { name: 'New sheet', exact: true }).click()

  const later = asked.slice(atFirst).filter((address) => !address.startsWith('blob:'))
  for (const address of later) expect(address).toMatch(/\/jobs\/phasogon\/assets\/[^/]+\.js$/)
})

async function expectNothingRan(page: Page): Promise<void> {
  expect(await page.evaluate(() => Reflect.get(window, 'ran'))).toBeUndefined()
  expect(await page.evaluate(() => Reflect.get({}, 'ran'))).toBeUndefined()
}
