import { measureText, type TextRun } from '../src/drawing'
import { allowClipboard } from './support/clipboard'
import { saveDrawing } from './support/files'
import { openPage } from './support/page'
import { sheetOf, typed } from './support/sheets'
import { expect, test } from './support/test'

/** CSS counts 96 pixels to the inch of 25.4 mm. */
const pixelsPerMillimetre = 96 / 25.4
const dotsPerMillimetre = 300 / 25.4

/** Two arrows of 100 mm, at 2 mm to the volt: one along the axis, one upright. */
const rulerSheet = sheetOf({
  title: 'Two arrows of 100 mm',
  reference: 'V1',
  phasors: [
    typed('V1', '50', '0', { tail: { x: 60, y: 60 } }),
    typed('V2', '50', '90', { tail: { x: 200, y: 70 } }),
  ],
  drawing: { origin: { x: 60, y: 60 }, unitsPerCentimetre: { voltage: 5 } },
})

test('a browser shows an arrow of 100 mm in the saved SVG as 100 mm', async ({ page }) => {
  await openPage(page, rulerSheet)
  const saved = await saveDrawing(page, /^SVG/)
  await page.goto(`file://${saved.path}`)
  const sheet = await page.locator('svg').first().boundingBox()
  expect((sheet?.width ?? 0) / pixelsPerMillimetre).toBeCloseTo(297, 1)
  expect((sheet?.height ?? 0) / pixelsPerMillimetre).toBeCloseTo(210, 1)
  const arrows = await page
    .locator('#phasogon-arrow path')
    .evaluateAll((paths) => paths.map((path) => path.getBoundingClientRect().toJSON() as DOMRect))
  const flat = arrows.filter(({ right }) => right < 180 * pixelsPerMillimetre)
  const upright = arrows.filter(({ left }) => left > 180 * pixelsPerMillimetre)
  expect([flat.length, upright.length], 'a shaft and a head each').toEqual([2, 2])
  expect(spanOf(flat, 'left', 'right')).toBeCloseTo(100, 1)
  expect(spanOf(upright, 'top', 'bottom')).toBeCloseTo(100, 1)

  await expect(page.locator('text', { hasText: '10 mm = 5 V' })).toHaveCount(1)
  await expect(page.locator('svg > title')).toHaveText(rulerSheet.title)
  await expect(page.locator('svg > desc')).toContainText('10 mm = 5 V')
  await expect(page.locator('image, foreignObject')).toHaveCount(0)
})

test('the PNG has 300 dots to the inch, and an arrow of 100 mm in it has 1181', async ({
  page,
}) => {
  await openPage(page, rulerSheet)
  const saved = await saveDrawing(page, /^PNG/)
  const { width, height, dots } = await page.evaluate(
    async ({ base64, column }) => {
      const bytes = Uint8Array.from(atob(base64), (character) => character.charCodeAt(0))
      const picture = await createImageBitmap(new Blob([bytes], { type: 'image/png' }))
      const canvas = new OffscreenCanvas(picture.width, picture.height)
      const pen = canvas.getContext('2d')
      if (!pen) throw new Error('The canvas has no context.')
      pen.drawImage(picture, 0, 0)
      const { data } = pen.getImageData(Math.round(column), 0, 1, picture.height)
      const isDark = (y: number) => (data[4 * y] ?? 255) < 110
      let dots = 0
      let run = 0
      for (let y = 0; y < picture.height; y += 1) {
        run = isDark(y) ? run + 1 : 0
        dots = Math.max(dots, run)
      }
      return { width: picture.width, height: picture.height, dots }
    },
    { base64: saved.bytes.toString('base64'), column: 200 * dotsPerMillimetre },
  )
  expect([width, height]).toEqual([
    Math.round(297 * dotsPerMillimetre),
    Math.round(210 * dotsPerMillimetre),
  ])
  expect(Math.abs(dots / dotsPerMillimetre - 100)).toBeLessThan(0.3)
})

test('the picture goes to the clipboard', async ({ page }) => {
  await allowClipboard(page)
  await openPage(page, rulerSheet)
  await page.getByRole('button', { name: 'Save drawing', exact: true }).click()
  await page.getByRole('button', { name: 'Picture to the clipboard' }).click()
  await expect(page.getByText('Picture copied')).toBeVisible()
  const [width, height] = await page.evaluate(async () => {
    const [item] = await navigator.clipboard.read()
    const picture = await createImageBitmap((await item?.getType('image/png')) as Blob)
    return [picture.width, picture.height]
  })
  expect([width, height]).toEqual([3508, 2480])
})

const families: { readonly [face in TextRun['face']]: string } = {
  sans: 'Phasogon Sans',
  bold: 'Phasogon Bold',
  symbol: 'Phasogon Symbol',
}

const texts: { readonly [face in TextRun['face']]: readonly string[] } = {
  sans: [
    '48.34 V ∠ −58.9°',
    '1 234.5 µA ± 0.25 %',
    '6.7 + j47.7 Ω',
    'Pump house, lower gallery: AVATAR, To, fi, Wolf',
    'coil supply Étage Größe φ · × ÷ …',
  ],
  bold: ['Valve actuator 7: cable, choke and motor', 'Übersicht Nr. 12 (V.A.T.)'],
  symbol: ['V', 'I', 'Z', 'S', 'φ'],
}

test('text is as wide on the screen as the layout takes it to be', async ({ page }) => {
  await openPage(page)
  for (const face of ['sans', 'bold', 'symbol'] as const) {
    const family = families[face]
    await expect
      .poll(() => page.evaluate((font) => document.fonts.check(font, 'V'), `100px "${family}"`))
      .toBe(true)
    const widths = await page.evaluate(
      ({ font, lines }) => {
        const pen = document.createElement('canvas').getContext('2d')
        if (!pen) throw new Error('The canvas has no context.')
        pen.font = font
        return lines.map((line) => pen.measureText(line).width)
      },
      { font: `100px "${family}", monospace`, lines: texts[face] },
    )
    for (const [at, text] of texts[face].entries()) {
      const expected = measureText([{ text, face, size: 100 }])
      expect(Math.abs((widths[at] as number) / expected - 1), `${family}: ${text}`).toBeLessThan(
        0.005,
      )
    }
  }
})

/** How far boxes reach together, in millimetres. */
function spanOf(boxes: readonly DOMRect[], from: 'left' | 'top', to: 'right' | 'bottom'): number {
  const start = Math.min(...boxes.map((box) => box[from]))
  const end = Math.max(...boxes.map((box) => box[to]))
  return (end - start) / pixelsPerMillimetre
}
