import { AxeBuilder } from '@axe-core/playwright'
import { screens, sizes } from './support/screens'
import { expect, test } from './support/test'

for (const colorScheme of ['light', 'dark'] as const) {
  test.describe(`in ${colorScheme}`, () => {
    test.use({ colorScheme })
    for (const { name, part = 'html', reach } of screens) {
      test(`axe finds nothing on ${name}`, async ({ page }) => {
        test.slow()
        await reach(page)
        for (const size of sizes) {
          await page.setViewportSize(size)
          const { violations, passes } = await new AxeBuilder({ page }).include(part).analyze()
          expect(passes.length, 'axe looked').toBeGreaterThan(5)
          const found = violations.flatMap(({ id, nodes }) =>
            nodes.map(({ target, failureSummary }) => ({ id, target, failureSummary })),
          )
          expect(found, `at ${size.width} × ${size.height}`).toEqual([])
        }
      })
    }
  })
}
