import type { Locator, Page } from '@playwright/test'
import { type Place, quick, type Sheet } from '../../src/sheet'
import { arrowOf, sceneOf } from './board'
import { checkFigure } from './check-line'
import { expectFigures, textOf } from './figures'
import { sheetOf, typed } from './sheets'
import { expect } from './test'

/**
 * A sum to be constructed by hand: three voltages tip to tail and what a meter showed of the whole, at
 * 1 mm to 0.5 V from 60 mm, 60 mm.
 */
export const constructionSheet: Sheet = sheetOf({
  reference: 'I',
  phasors: [
    typed('I', '2.0', '0'),
    typed('VR', '20.0', '0'),
    typed('VL', '45.0', '80'),
    typed('VC', '25.0', '-90'),
    typed('VS', '33.5', '34'),
  ],
  sums: [
    {
      id: 's1',
      terms: [{ phasor: 'VR' }, { phasor: 'VL' }, { phasor: 'VC' }],
      equals: 'VS',
    },
  ],
  drawing: { origin: { x: 60, y: 60 }, unitsPerCentimetre: { voltage: 5, current: 1 } },
})

/** Where a hand that draws a little wrong puts the ends of the construction, in millimetres. */
export function drawnEnds(): readonly Place[] {
  const scene = sceneOf(constructionSheet)
  const [first, second, third] = [0, 1, 2].map((at) => arrowOf(scene, `term:s1:${at}`))
  if (!first || !second || !third) throw new Error('The construction has three terms.')
  return [
    first.from,
    { x: first.to.x + 0.8, y: first.to.y },
    { x: second.to.x - 0.5, y: second.to.y + 1.2 },
    { x: third.to.x - 0.4, y: third.to.y + 0.2 },
  ]
}

/** The panel in which a construction stands in figures. */
export function handRow(page: Page, name: string): Locator {
  return page.getByRole('form', { name: `${name}, drawn by hand`, exact: true })
}

/** The board's verb that puts the pen into the hand. */
export function drawByHand(page: Page): Locator {
  return page.getByRole('button', { name: 'Draw by hand', exact: true })
}

/** Answers what was drawn with what the page suggests. */
export async function drawIt(page: Page): Promise<void> {
  await page.getByRole('button', { name: 'Draw it', exact: true }).click()
  await expect(page.getByRole('dialog', { name: 'What did you draw?' })).toHaveCount(0)
}

/** Expects the page to say of each hand arrow, and of the whole, what `quick` says in Node. */
export async function expectVerifiedAs(page: Page, sheet: Sheet): Promise<void> {
  const { hand, sums } = quick(sheet)
  const names = ['VR', 'VL', 'VC', 'closing arrow of VS']
  expect(sheet.hand?.map(({ stands }) => stands)).toEqual(['VR', 'VL', 'VC', 'closing'])
  for (const [at, name] of names.entries()) {
    const said = hand[at]
    if (said?.magnitudeError === undefined || said.angleError === undefined) throw new Error(name)
    const exact = (said.magnitude ?? 0) - said.magnitudeError
    const text = await textOf(handRow(page, name).locator('.hand-result'))
    expectFigures(text, [
      said.magnitudeError,
      (100 * said.magnitudeError) / exact,
      said.angleError,
      said.millimetres ?? 0,
      said.allowed ?? 0,
    ])
    expect(text).toContain(said.within ? ': within' : ': not within')
  }
  const closing = hand[3]
  const [{ resultant, measured } = {}] = sums
  if (closing?.magnitude === undefined || closing.angle === undefined) throw new Error('no closing')
  if (!resultant || measured?.magnitude === undefined || measured.angle === undefined) {
    throw new Error('no resultant')
  }
  const figure = (name: string) => textOf(checkFigure(page, name).first())
  expectFigures(await figure('Drawn by hand'), [closing.magnitude, closing.angle])
  expectFigures(await figure('Calculated'), [resultant.magnitude, resultant.angle])
  expectFigures(await figure('Measured'), [measured.magnitude, measured.angle])
  expectFigures(await figure('Hand less calculated'), [
    closing.magnitude - resultant.magnitude,
    closing.angle - resultant.angle,
  ])
  expectFigures(await figure('Hand less measured'), [
    closing.magnitude - measured.magnitude,
    closing.angle - measured.angle,
  ])
  expectFigures(await figure('Measured less calculated'), [
    measured.magnitude - resultant.magnitude,
    measured.angle - resultant.angle,
  ])
}
