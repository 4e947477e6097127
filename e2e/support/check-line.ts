import type { Locator, Page } from '@playwright/test'
import { quick, type Sheet } from '../../src/sheet'
import { expectFigures, textOf } from './figures'
import { expect } from './test'

/** The line under the drawing. */
export function checkLine(page: Page): Locator {
  return page.getByRole('region', { name: 'Check' })
}

/** A figure of the check line, and the words under it. */
export function checkFigure(page: Page, name: string): Locator {
  return checkLine(page)
    .locator('dl')
    .filter({ has: page.getByText(name, { exact: true }) })
    .getByRole('definition')
}

/** Expects the check line to say of the first sum of a sheet what `quick` says of it in Node. */
export async function expectCheckedAs(page: Page, sheet: Sheet): Promise<void> {
  const [found] = quick(sheet).sums
  const { resultant, measured, closingError } = found ?? {}
  if (!resultant || measured?.magnitude === undefined || measured.angle === undefined) {
    throw new Error('The sheet has no sum with a measured value.')
  }
  if (!closingError) throw new Error('The sheet has no gap.')
  const text = async (name: string, at: number) => textOf(checkFigure(page, name).nth(at))
  expectFigures(await text('Calculated', 0), [resultant.magnitude, resultant.angle])
  expectFigures(await text('Measured', 0), [measured.magnitude, measured.angle])
  expectFigures(await text('Measured less calculated', 0), [
    measured.magnitude - resultant.magnitude,
    measured.angle - resultant.angle,
  ])
  expectFigures(await text('Measured less calculated', 1), [
    closingError.magnitude,
    closingError.percent,
  ])
  await expect(checkLine(page)).toContainText('mm on paper')
}
