import { AxeBuilder } from '@axe-core/playwright'
import type { Page } from '@playwright/test'
import { type Screen, screens, sizes } from './support/screens'
import { expect, test } from './support/test'

/** The rules whose answer hangs on colours: all that a dark page can break. */
const rulesOfColour = ['color-contrast', 'link-in-text-block']

for (const { name, part, reach } of screens) {
  // What is a part of the page lies alike on a desk and on a tablet.
  const looks = part === undefined ? sizes : [sizes[0], sizes[2]]
  test(`axe finds nothing on ${name}, in light and in dark`, async ({ page }) => {
    await reach(page)
    for (const size of looks) {
      await page.setViewportSize(size)
      await page.emulateMedia({ colorScheme: 'light' })
      await expectNothing(axeOn(page, part), `in light at ${size.width} × ${size.height}`, 5)
      await page.emulateMedia({ colorScheme: 'dark' })
      const inColour = axeOn(page, part).withRules(rulesOfColour)
      await expectNothing(inColour, `in dark at ${size.width} × ${size.height}`, 0)
    }
  })
}

function axeOn(page: Page, part: Screen['part']): AxeBuilder {
  return new AxeBuilder({ page }).setLegacyMode().include(part ?? 'html')
}

/** Axe looked, by more rules than so many, and nothing that it can hold against the page was found. */
async function expectNothing(axe: AxeBuilder, where: string, rules: number): Promise<void> {
  const { violations, passes } = await axe.analyze()
  expect(passes.length, `axe looked ${where}`).toBeGreaterThan(rules)
  const found = violations.flatMap(({ id, nodes }) =>
    nodes.map(({ target, failureSummary }) => ({ id, target, failureSummary })),
  )
  expect(found, where).toEqual([])
}
