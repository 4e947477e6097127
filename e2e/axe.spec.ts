import { AxeBuilder } from '@axe-core/playwright'
import { screens, sizes } from './support/screens'
import { expect, test } from './support/test'

for (const colorScheme of ['light', 'dark'] as const) {
  test.describe(`in ${colorScheme}`, () => {
    test.use({ colorScheme })
    for (const { name, part, reach } of screens) {
      // What is a part of the page lies alike on a desk and on a tablet.
      const looks = part === undefined ? sizes : [sizes[0], sizes[2]]
      test(`axe finds nothing on ${name}`, async ({ page }) => {
        test.slow()
        await reach(page)
        for (const size of looks) {
          await page.setViewportSize(size)
          const axe = new AxeBuilder({ page }).setLegacyMode().include(part ?? 'html')
          const { violations, passes } = await axe.analyze()
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
